namespace Plant.Physics.Fluids;

/// <summary>Kinematic viscosity against temperature through two points.</summary>
/// <remarks>
/// Equation: log10 log10 Z = A − B·log10 T with Z = ν + 0.7 + exp(−1.47 − 1.84ν − 0.51ν²).
/// Source: ASTM D341 (read). Valid for: cloud point to initial boiling point; not below the pour point.
/// </remarks>
public readonly struct ViscosityTemperature : IEquatable<ViscosityTemperature>
{
    private readonly double b;
    private readonly double a;

    private ViscosityTemperature(double a, double b)
    {
        this.a = a;
        this.b = b;
    }

    /// <summary>Constant A [1].</summary>
    public double A => a;

    /// <summary>Constant B [1].</summary>
    public double B => b;

    /// <summary>The line through two measured points.</summary>
    /// <param name="temperature1K">First temperature [K].</param>
    /// <param name="viscosity1Mm2S">Kinematic viscosity there [mm²/s].</param>
    /// <param name="temperature2K">Second temperature [K].</param>
    /// <param name="viscosity2Mm2S">Kinematic viscosity there [mm²/s].</param>
    /// <returns>The line.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A value is not above 0.</exception>
    public static ViscosityTemperature Through(double temperature1K, double viscosity1Mm2S, double temperature2K, double viscosity2Mm2S)
    {
        var x1 = Math.Log10(Guard.Positive(temperature1K));
        var x2 = Math.Log10(Guard.Positive(temperature2K));
        var y1 = Math.Log10(Math.Log10(Z(Guard.Positive(viscosity1Mm2S))));
        var y2 = Math.Log10(Math.Log10(Z(Guard.Positive(viscosity2Mm2S))));
        var slope = (y1 - y2) / (x2 - x1);
        return new ViscosityTemperature(y1 + (slope * x1), slope);
    }

    /// <summary>Kinematic viscosity at a temperature.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Kinematic viscosity [mm²/s].</returns>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is not above 0.</exception>
    public double AtMm2S(double temperatureK)
    {
        var z = Math.Pow(10, Math.Pow(10, a - (b * Math.Log10(Guard.Positive(temperatureK)))));
        var x = z - 0.7;
        return x - Math.Exp(-0.7487 + (x * (-3.295 + (x * (0.6119 - (0.3193 * x))))));
    }

    /// <inheritdoc/>
    public bool Equals(ViscosityTemperature other) => a.Equals(other.a) && b.Equals(other.b);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is ViscosityTemperature other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(a, b);

    /// <summary>Equality.</summary>
    /// <param name="left">Left.</param>
    /// <param name="right">Right.</param>
    /// <returns>True where both lines are the same.</returns>
    public static bool operator ==(ViscosityTemperature left, ViscosityTemperature right) => left.Equals(right);

    /// <summary>Inequality.</summary>
    /// <param name="left">Left.</param>
    /// <param name="right">Right.</param>
    /// <returns>True where the lines differ.</returns>
    public static bool operator !=(ViscosityTemperature left, ViscosityTemperature right) => !left.Equals(right);

    private static double Z(double viscosityMm2S) =>
        viscosityMm2S + 0.7 + Math.Exp(-1.47 - (1.84 * viscosityMm2S) - (0.51 * viscosityMm2S * viscosityMm2S));
}
