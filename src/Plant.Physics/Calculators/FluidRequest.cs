using Plant.Physics.Fluids;

namespace Plant.Physics.Calculators;

/// <summary>A fluid as it comes in a request: the columns of a data sheet, all but the family optional.</summary>
public sealed record FluidRequest
{
    /// <summary>Code of the fluid.</summary>
    public string? Code { get; init; }

    /// <summary>Name of the fluid.</summary>
    public string? Name { get; init; }

    /// <summary>Code of the family.</summary>
    public string? Family { get; init; }

    /// <summary>ISO viscosity grade [mm²/s].</summary>
    public double? IsoVg { get; init; }

    /// <summary>Kinematic viscosity at 40 °C [mm²/s].</summary>
    public double? Viscosity40Mm2S { get; init; }

    /// <summary>Kinematic viscosity at 100 °C [mm²/s].</summary>
    public double? Viscosity100Mm2S { get; init; }

    /// <summary>Density at 15 °C [kg/m³].</summary>
    public double? Density15KgM3 { get; init; }

    /// <summary>Expansion [1/K].</summary>
    public double? ExpansionPerK { get; init; }

    /// <summary>A of the solubility curve [1].</summary>
    public double? SolubilityA { get; init; }

    /// <summary>B of the solubility curve [K].</summary>
    public double? SolubilityB { get; init; }

    /// <summary>Interfacial tension against water [mN/m].</summary>
    public double? InterfacialTensionMNM { get; init; }

    /// <summary>Relative permittivity [1].</summary>
    public double? RelativePermittivity { get; init; }

    /// <summary>Conductivity [pS/m].</summary>
    public double? ConductivityPSM { get; init; }

    /// <summary>Demulsibility [min].</summary>
    public double? DemulsibilityMin { get; init; }

    /// <summary>Limit for water [mg/kg].</summary>
    public double? WaterLimitPpm { get; init; }

    /// <summary>Builds the model, or refuses; fields are named below <c>fluid.</c>.</summary>
    /// <param name="request">The fluid; null is refused.</param>
    /// <param name="refusals">Receives the refusals.</param>
    /// <returns>The model, or null.</returns>
    internal static FluidModel? Model(FluidRequest? request, List<Refusal> refusals)
    {
        if (request is null)
        {
            refusals.Add(new Refusal("fluid", "", "is missing: give at least its family"));
            return null;
        }

        if (request.Family is null || !Physics.Code.TryParse<FluidFamily>(request.Family, out var family))
        {
            refusals.Add(new Refusal("fluid.family", request.Family ?? "", $"must be one of {string.Join(", ", Physics.Code.All<FluidFamily>())}"));
            return null;
        }

        var found = new List<Refusal>();
        var model = FluidModel.TryCreate(request.ToSheet(family), found);
        refusals.AddRange(found.Select(refusal => refusal with { Field = "fluid." + refusal.Field }));
        return model;
    }

    private FluidSheet ToSheet(FluidFamily family) => new()
    {
        Family = family,
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
