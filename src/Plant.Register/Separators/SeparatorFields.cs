using Plant.Advice;
using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.Separators;

/// <summary>Columns of separators.csv.</summary>
public sealed record SeparatorFields : IFields
{
    public string? Code { get; set; }

    public string? Tag { get; set; }

    public string? Kind { get; set; }

    public double? FlowLPerMin { get; set; }

    public double? Efficiency { get; set; }

    public double? CutSizeUm { get; set; }

    public double? PressureKPa { get; set; }

    public double? OilTemperatureC { get; set; }

    public double? CapacityL { get; set; }

    public bool? Portable { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("code", Code);
        refusals.Text("tag", Tag);
        refusals.Required("kind", Kind);
        refusals.OneOf<SeparatorKind>("kind", string.IsNullOrWhiteSpace(Kind) ? null : Kind);
        refusals.Positive("flowLPerMin", FlowLPerMin, 1e6, "L/min");
        refusals.Range("efficiency", Efficiency, 0, 1, string.Empty);
        refusals.Positive("cutSizeUm", CutSizeUm, 1e5, "µm");
        refusals.Positive("pressureKPa", PressureKPa, 1000, "kPa");
        refusals.Temperature("oilTemperatureC", OilTemperatureC);
        refusals.Positive("capacityL", CapacityL, 1e6, "L");
        if (Portable == true && Tag is not null)
        {
            refusals.Add(new Refusal("tag", Tag, "must be empty for a portable separator: its runs say where it works"));
        }
    }
}
