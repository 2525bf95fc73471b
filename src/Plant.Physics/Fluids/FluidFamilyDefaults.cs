namespace Plant.Physics.Fluids;

/// <summary>What is taken for a fluid of a family where its data sheet says nothing. All from memory, unverified: a sheet always wins.</summary>
/// <param name="Viscosity40Mm2S">Kinematic viscosity at 40 °C [mm²/s].</param>
/// <param name="Viscosity100Mm2S">Kinematic viscosity at 100 °C [mm²/s].</param>
/// <param name="Density15KgM3">Density at 15 °C [kg/m³].</param>
/// <param name="ExpansionPerK">Expansion about 15 °C [1/K]; null where ASTM D1250 gives it.</param>
/// <param name="SolubilityA">A of the solubility curve [1]; null where there is no saturation.</param>
/// <param name="SolubilityB">B of the solubility curve [K]; null where there is no saturation.</param>
/// <param name="ViscosityIndex">Typical viscosity index [1].</param>
public sealed record FluidFamilyDefaults(
    double Viscosity40Mm2S, double Viscosity100Mm2S, double Density15KgM3, double? ExpansionPerK, double? SolubilityA, double? SolubilityB, double ViscosityIndex)
{
    private static readonly Dictionary<FluidFamily, FluidFamilyDefaults> ByFamily = new()
    {
        [FluidFamily.Mineral] = new(46, 6.8, 870, null, 6.8897, 1400, 97),
        [FluidFamily.Pao] = new(46, 7.8, 835, null, 7.0711, 1500, 138),
        [FluidFamily.Ester] = new(46, 8.0, 950, 7.5e-4, 5.6889, 700, 145),
        [FluidFamily.PhosphateEster] = new(46, 5.4, 1145, 6.9e-4, 5.4447, 600, 20),
        [FluidFamily.Pag] = new(150, 26, 1000, 7.8e-4, null, null, 200),
        [FluidFamily.NaturalEster] = new(36, 8.0, 920, 7.3e-4, 5.3318, 684, 200),
        [FluidFamily.Silicone] = new(38, 16, 963, 1.0e-3, 7.3956, 1500, 400),
        [FluidFamily.TransformerMineral] = new(9.5, 2.5, 880, null, 7.0895, 1567, 80),
        [FluidFamily.Diesel] = new(2.7, 1.15, 838, null, 6.9619, 1500, 80),
    };

    /// <summary>The defaults of a family.</summary>
    /// <param name="family">The family.</param>
    /// <returns>Its defaults.</returns>
    public static FluidFamilyDefaults Of(FluidFamily family) => ByFamily[family];
}
