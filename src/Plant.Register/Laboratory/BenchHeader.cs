using Plant.Advice;
using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.Laboratory;

/// <summary>What holds for a whole batch, as it is typed.</summary>
public sealed record BenchHeader : IFields
{
    public string? Method { get; set; }

    public string? Entry { get; set; }

    public bool Duplicates { get; set; }

    public string? Instrument { get; set; }

    public double? StandardPpm { get; set; }

    public double? StandardFoundPpm { get; set; }

    public double? BlankUg { get; set; }

    public double? DriftUgPerMin { get; set; }

    public double? Minutes { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("method", Method);
        refusals.OneOf<WaterMethod>("method", string.IsNullOrWhiteSpace(Method) ? null : Method);
        if (Method is not null && Plant.Physics.Laboratory.Repeatability.Of(Method) is null)
        {
            refusals.Add(new Refusal("method", Method, "is no Karl Fischer method"));
        }

        refusals.Required("entry", Entry);
        refusals.OneOf<BenchEntry>("entry", string.IsNullOrWhiteSpace(Entry) ? null : Entry);
        refusals.Text("instrument", Instrument);
        refusals.Ppm("standardPpm", StandardPpm);
        refusals.Ppm("standardFoundPpm", StandardFoundPpm);
        refusals.Range("blankUg", BlankUg, 0, 1e6, "µg");
        refusals.Range("driftUgPerMin", DriftUgPerMin, 0, 1e5, "µg/min");
        refusals.Range("minutes", Minutes, 0, 1e4, "min");
    }
}
