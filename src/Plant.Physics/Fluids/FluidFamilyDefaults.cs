namespace Plant.Physics.Fluids;

/// <summary>What is taken for a fluid of a family where its data sheet says nothing. All from memory, unverified: a sheet always wins.</summary>
/// <param name="Viscosity40Mm2S">Kinematic viscosity at 40 °C [mm²/s].</param>
/// <param name="Viscosity100Mm2S">Kinematic viscosity at 100 °C [mm²/s].</param>
/// <param name="Density15KgM3">Density at 15 °C [kg/m³].</param>
/// <param name="ExpansionPerK">Expansion about 15 °C [1/K]; null where ASTM D1250 gives it.</param>
/// <param name="SolubilityA">A of the solubility curve [1]; null where there is no saturation.</param>
/// <param name="SolubilityB">B of the solubility curve [K]; null where there is no saturation.</param>
/// <param name="ViscosityIndex">Typical viscosity index [1].</param>
/// <param name="RelativePermittivity">Relative permittivity [1].</param>
/// <param name="InterfacialTensionMNM">Interfacial tension of an oil in service against water [mN/m].</param>
/// <param name="ConductivityPSM">Conductivity, to the nearest decade or so [pS/m].</param>
public sealed record FluidFamilyDefaults(
    double Viscosity40Mm2S, double Viscosity100Mm2S, double Density15KgM3, double? ExpansionPerK, double? SolubilityA, double? SolubilityB, double ViscosityIndex,
    double RelativePermittivity, double InterfacialTensionMNM, double ConductivityPSM)
{
    private static readonly Dictionary<FluidFamily, FluidFamilyDefaults> ByFamily = new()
    {
        [FluidFamily.Mineral] = new(46, 6.8, 870, null, 6.8897, 1400, 97, 2.2, 30, 100),
        [FluidFamily.Pao] = new(46, 7.8, 835, null, 7.0711, 1500, 138, 2.1, 30, 50),
        [FluidFamily.Ester] = new(46, 8.0, 950, 7.5e-4, 5.6889, 700, 145, 3.3, 20, 1000),
        [FluidFamily.PhosphateEster] = new(46, 5.4, 1145, 6.9e-4, 5.4447, 600, 20, 7.0, 20, 1e4),
        [FluidFamily.Pag] = new(150, 26, 1000, 7.8e-4, null, null, 200, 6.0, 10, 1e6),
        [FluidFamily.NaturalEster] = new(36, 8.0, 920, 7.3e-4, 5.3318, 684, 200, 3.1, 25, 20),
        [FluidFamily.Silicone] = new(38, 16, 963, 1.0e-3, 7.3956, 1500, 400, 2.7, 40, 1),
        [FluidFamily.TransformerMineral] = new(9.5, 2.5, 880, null, 7.0895, 1567, 80, 2.2, 40, 1),
        [FluidFamily.Diesel] = new(2.7, 1.15, 838, null, 6.9619, 1500, 80, 2.1, 25, 50),
    };

    /// <summary>The defaults of a family.</summary>
    /// <param name="family">The family.</param>
    /// <returns>Its defaults.</returns>
    public static FluidFamilyDefaults Of(FluidFamily family) => ByFamily[family];
}
