using Plant.Physics.Fluids;
using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>A working fluid of the plant: the columns of fluids.csv, each group of values with its origin.</summary>
public sealed class Fluid : IRecord
{
    public Guid Id { get; init; }

    public Guid Token { get; set; }

    public DateTime? WithdrawnAt { get; set; }

    public required string Code { get; init; }

    public required string Name { get; set; }

    public required FluidFamily Family { get; set; }

    public double? IsoVg { get; set; }

    public double? Viscosity40Mm2S { get; set; }

    public double? Viscosity100Mm2S { get; set; }

    public double? Density15KgM3 { get; set; }

    public double? ExpansionPerK { get; set; }

    public double? SolubilityA { get; set; }

    public double? SolubilityB { get; set; }

    public double? InterfacialTensionMNM { get; set; }

    public double? RelativePermittivity { get; set; }

    public double? ConductivityPSM { get; set; }

    public double? DemulsibilityMin { get; set; }

    public double? WaterLimitPpm { get; set; }

    public ValueOrigin ViscosityOrigin { get; set; }

    public ValueOrigin DensityOrigin { get; set; }

    public ValueOrigin SolubilityOrigin { get; set; }

    public ValueOrigin LimitOrigin { get; set; }

    public string NaturalKey => Code;

    /// <summary>The values as the physics takes them.</summary>
    public FluidSheet ToSheet() => new()
    {
        Family = Family,
        IsoVg = IsoVg,
        Viscosity40Mm2S = Viscosity40Mm2S,
        Viscosity100Mm2S = Viscosity100Mm2S,
        Density15KgM3 = Density15KgM3,
        ExpansionPerK = ExpansionPerK,
        SolubilityA = SolubilityA,
        SolubilityB = SolubilityB,
        InterfacialTensionMNM = InterfacialTensionMNM,
        RelativePermittivity = RelativePermittivity,
        ConductivityPSM = ConductivityPSM,
        DemulsibilityMin = DemulsibilityMin,
        WaterLimitPpm = WaterLimitPpm,
    };
}
