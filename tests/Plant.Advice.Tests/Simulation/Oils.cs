using Plant.Physics.Fluids;

namespace Plant.Advice.Tests.Simulation;

/// <summary>Invented fluid sheets.</summary>
internal static class Oils
{
    /// <summary>A turbine oil with its own solubility curve: 80 mg/kg at 20 °C.</summary>
    public static FluidSheet Turbine { get; } = new()
    {
        Family = FluidFamily.Mineral, IsoVg = 46, Viscosity40Mm2S = 46, Viscosity100Mm2S = 6.8, Density15KgM3 = 870, SolubilityA = 7.0199, SolubilityB = 1500,
        InterfacialTensionMNM = 30, DemulsibilityMin = 10,
    };
}
