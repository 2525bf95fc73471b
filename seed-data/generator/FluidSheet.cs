namespace Skarrow;

/// <summary>One row of fluids.csv; empty where the sheet does not say.</summary>
public sealed record FluidSheet(string Code, string Name, string Family)
{
    public double? Vg { get; init; }

    public required double V40 { get; init; }

    public required double V100 { get; init; }

    public required double Density15 { get; init; }

    public double? Expansion { get; init; }

    public double? A { get; init; }

    public double? B { get; init; }

    public double? Tension { get; init; }

    public double? Permittivity { get; init; }

    public double? Conductivity { get; init; }

    public double? Demulsibility { get; init; }

    public double? LimitPpm { get; init; }

    /// <summary>The curve that the simulation uses where the sheet is empty.</summary>
    public (double A, double B) TrueCurve { get; init; }

    /// <summary>Only what the simulation needs: saturation in mg/kg. A water-soluble fluid has none; a large number stands for it.</summary>
    public double SaturationPpm(double celsius)
    {
        var (a, b) = A is { } sheetA && B is { } sheetB ? (sheetA, sheetB) : TrueCurve;
        return a == 0 ? 120_000 : Math.Pow(10, a - (b / (celsius + 273.15)));
    }

    /// <summary>Straight line through the two points on the log–log chart.</summary>
    public double ViscosityMm2S(double celsius)
    {
        static double Chart(double v) => Math.Log10(Math.Log10(v + 0.7));
        var slope = (Chart(V40) - Chart(V100)) / (Math.Log10(373.15) - Math.Log10(313.15));
        return Math.Pow(10, Math.Pow(10, Chart(V40) - (slope * (Math.Log10(celsius + 273.15) - Math.Log10(313.15))))) - 0.7;
    }

    public double DensityKgM3(double celsius) => Density15 * (1 - ((Expansion ?? 7.2e-4) * (celsius - 15)));

    /// <summary>Water minus oil; the water by a parabola that is good to 0.5 kg/m³ from 0 to 90 °C.</summary>
    public double DensityDifference(double celsius) => 1000.3 - (0.00384 * celsius * celsius) - (0.0488 * celsius) - DensityKgM3(celsius);
}
