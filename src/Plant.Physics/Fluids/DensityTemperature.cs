namespace Plant.Physics.Fluids;

/// <summary>Density of petroleum liquids against temperature by ASTM D1250 at base 15 °C.</summary>
public static class DensityTemperature
{
    /// <summary>Constants of one product group of ASTM D1250-80.</summary>
    /// <param name="K0">K0 at base 15 °C [kg²/(m⁶·K)].</param>
    /// <param name="K1">K1 at base 15 °C [kg/(m³·K)].</param>
    /// <param name="K2">K2 at base 15 °C [1/K].</param>
    public readonly record struct Group(double K0, double K1, double K2);

    /// <summary>Lubricating oils.</summary>
    public static readonly Group LubricatingOil = new(0, 0.6278, 0);

    /// <summary>Crude oils.</summary>
    public static readonly Group CrudeOil = new(613.9723, 0, 0);

    /// <summary>The group of a fuel by its density.</summary>
    /// <param name="density15KgM3">Density at 15 °C [kg/m³].</param>
    /// <returns>Its constants.</returns>
    /// <remarks>Source: ASTM D1250-80 (read). Valid for: 653 to 1075 kg/m³.</remarks>
    public static Group FuelOil(double density15KgM3) => Guard.Positive(density15KgM3) switch
    {
        < 770.5 => new(346.4228, 0.4388, 0),
        < 787.5 => new(2680.3206, 0, -0.00336312),
        < 839 => new(594.5418, 0, 0),
        _ => new(186.9696, 0.4862, 0),
    };

    /// <summary>Thermal expansion at 15 °C.</summary>
    /// <param name="group">Product group.</param>
    /// <param name="density15KgM3">Density at 15 °C [kg/m³].</param>
    /// <returns>Expansion α [1/K].</returns>
    /// <remarks>Equation: α = K0/ρ² + K1/ρ + K2. Source: ASTM D1250-80 (read). Valid for: the densities of the group.</remarks>
    public static double ExpansionPerK(Group group, double density15KgM3)
    {
        Guard.Positive(density15KgM3);
        return (((group.K0 / density15KgM3) + group.K1) / density15KgM3) + group.K2;
    }

    /// <summary>Volume correction factor to 15 °C.</summary>
    /// <param name="expansionPerK">Expansion α at 15 °C [1/K].</param>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Volume at 15 °C over volume at the temperature [1].</returns>
    /// <remarks>Equation: exp(−αΔ(1 + 0.8αΔ)), Δ = t − 15 °C. Source: ASTM D1250-80 (read). Valid for: about −20 to 150 °C.</remarks>
    public static double VolumeCorrection(double expansionPerK, double temperatureK)
    {
        var x = Guard.NotNegative(expansionPerK) * (Guard.Finite(temperatureK) - Constants.ZeroCelsiusK - 15);
        return Math.Exp(-x * (1 + (0.8 * x)));
    }

    /// <summary>Density at 15 °C of a liquid whose density was measured at another temperature.</summary>
    /// <param name="group">Product group.</param>
    /// <param name="densityKgM3">Density measured [kg/m³].</param>
    /// <param name="temperatureK">Temperature of the measurement [K].</param>
    /// <returns>Density at 15 °C [kg/m³].</returns>
    /// <remarks>Equation: fixed point of ρ15 = ρ/VCF(ρ15). Source: ASTM D1250-80 (read). Valid for: the densities of the group, about −20 to 150 °C.</remarks>
    public static double Density15KgM3(Group group, double densityKgM3, double temperatureK)
    {
        var density15 = Guard.Positive(densityKgM3);
        for (var i = 0; i < 30; i++)
        {
            var next = densityKgM3 / VolumeCorrection(ExpansionPerK(group, density15), temperatureK);
            if (Math.Abs(next - density15) < 1e-10)
            {
                return next;
            }

            density15 = next;
        }

        return density15;
    }
}
