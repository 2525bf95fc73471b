namespace Plant.Physics.Ingress;

/// <summary>A kind of water that may have got into oil, with what is expected of it. Priors and ranges are judgement, meant to be edited.</summary>
/// <param name="Name">Name.</param>
/// <param name="Prior">Weight before anything is measured [0 to 1].</param>
/// <param name="Ranges">Expected range of each tracer.</param>
public sealed record WaterSource(string Name, double Prior, IReadOnlyDictionary<WaterTracer, TracerRange> Ranges)
{
    /// <summary>Name of the class for all that is not listed.</summary>
    public const string Other = "other";

    /// <summary>What is taken where the plant has no measurements of its own waters (all judgement).</summary>
    public static IReadOnlyList<WaterSource> Defaults { get; } =
    [
        Of("condensate or steam", 0.35, (0.05, 5), (0.05, 5), (0.2, 5), (1, 3), (0.02, 4), (5, 3)),
        Of("cooling tower", 0.30, (150, 2.5), (200, 2.5), (500, 2), (1, 3), (0.3, 3), (1500, 2)),
        Of("potable or wash water", 0.15, (20, 2.5), (30, 2.5), (150, 2), (1, 3), (0.05, 4), (400, 2)),
        Of("glycol coolant", 0.10, (2000, 2.5), (30, 4), (10, 5), (3e5, 2), (200, 5), (3000, 2)),
        Of("sea water", 0.05, (10_800, 2), (19_000, 2), (6300, 2), (1, 3), (4.5, 2), (50_000, 1.8)),
        AnyOther(0.05),
    ];

    /// <summary>The class for all that is not listed: it expects nothing in particular.</summary>
    /// <param name="prior">Weight before anything is measured [0 to 1].</param>
    /// <returns>The class.</returns>
    public static WaterSource AnyOther(double prior) => Of(Other, prior, (50, 30), (50, 30), (50, 30), (10, 100), (1, 30), (500, 20));

    private static WaterSource Of(string name, double prior, params (double Median, double Deviation)[] ranges) =>
        new(name, prior, Enum.GetValues<WaterTracer>().Zip(ranges).ToDictionary(pair => pair.First, pair => new TracerRange(pair.Second.Median, pair.Second.Deviation)));
}
