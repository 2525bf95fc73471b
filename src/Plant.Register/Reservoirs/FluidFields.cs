using Plant.Physics;
using Plant.Physics.Fluids;
using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>Columns of fluids.csv, and the origin of each group of values.</summary>
public sealed record FluidFields : IFields
{
    public string? Code { get; set; }

    /// <summary>Where it has none, it is called by its key.</summary>
    public string? Name
    {
        get => string.IsNullOrEmpty(field) ? Code : field;
        set;
    }

    public string? Family { get; set; }

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

    public string? ViscosityOrigin { get; set; }

    public string? DensityOrigin { get; set; }

    public string? SolubilityOrigin { get; set; }

    public string? LimitOrigin { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("code", Code);
        refusals.Text("name", Name, 200);
        refusals.Required("family", Family);
        refusals.OneOf<FluidFamily>("family", string.IsNullOrWhiteSpace(Family) ? null : Family);
        refusals.Positive("isoVg", IsoVg, 10000, "mm²/s");
        refusals.Positive("viscosity40Mm2S", Viscosity40Mm2S, 100000, "mm²/s");
        refusals.Positive("viscosity100Mm2S", Viscosity100Mm2S, 10000, "mm²/s");
        refusals.Range("density15KgM3", Density15KgM3, 500, 2000, "kg/m³");
        refusals.Range("expansionPerK", ExpansionPerK, 0, 0.01, "1/K");
        refusals.Range("solubilityA", SolubilityA, 0, 20, string.Empty);
        refusals.Range("solubilityB", SolubilityB, -1000, 5000, "K");
        refusals.Positive("interfacialTensionMNM", InterfacialTensionMNM, 80, "mN/m");
        refusals.Range("relativePermittivity", RelativePermittivity, 1, 100, string.Empty);
        refusals.Range("conductivityPSM", ConductivityPSM, 0, 1e15, "pS/m");
        refusals.Range("demulsibilityMin", DemulsibilityMin, 0, 10000, "min");
        refusals.Ppm("waterLimitPpm", WaterLimitPpm);
        foreach (var (field, origin) in new[]
        {
            ("viscosityOrigin", ViscosityOrigin), ("densityOrigin", DensityOrigin), ("solubilityOrigin", SolubilityOrigin), ("limitOrigin", LimitOrigin),
        })
        {
            refusals.OneOf<ValueOrigin>(field, origin);
        }

        if (Viscosity100Mm2S >= Viscosity40Mm2S)
        {
            refusals.Add(new Refusal("viscosity100Mm2S", Viscosity100Mm2S.Value.ToString("R", System.Globalization.CultureInfo.InvariantCulture),
                "must be below viscosity40Mm2S: oil thins when it warms"));
        }

        if (SolubilityA is null != SolubilityB is null)
        {
            refusals.Add(new Refusal(SolubilityA is null ? "solubilityA" : "solubilityB", string.Empty, "solubilityA and solubilityB go together: give both or neither"));
        }
    }
}
