using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>What a step carries.</summary>
public sealed record WorkOrderStepFields : IFields
{
    /// <summary>Which step.</summary>
    public string? Step { get; set; }

    /// <summary>Why, or what is asked: for the steps that need a reason.</summary>
    public string? Note { get; set; }

    /// <summary>For finish: what was found.</summary>
    public string? Findings { get; set; }

    /// <summary>For finish: when the work ended; empty: now.</summary>
    public DateTimeOffset? DoneAt { get; set; }

    /// <summary>For finish: water drained [L].</summary>
    public double? DrainedWaterL { get; set; }

    /// <summary>For finish: oil lost with it [L].</summary>
    public double? DrainedOilL { get; set; }

    /// <summary>For finish: code of the separator that ran.</summary>
    public string? Separator { get; set; }

    /// <summary>For finish: how long it ran [h].</summary>
    public double? RunHours { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("step", Step);
        refusals.OneOf<WorkOrderStep>("step", string.IsNullOrWhiteSpace(Step) ? null : Step);
        refusals.Text("note", Note, 2000);
        refusals.Text("findings", Findings, 4000);
        refusals.Time("doneAt", DoneAt);
        refusals.Range("drainedWaterL", DrainedWaterL, 0, 1e6, "L");
        refusals.Range("drainedOilL", DrainedOilL, 0, 1e6, "L");
        refusals.Text("separator", Separator);
        refusals.Range("runHours", RunHours, 0, 8784, "h");
        if (RunHours is not null && string.IsNullOrWhiteSpace(Separator))
        {
            refusals.Add(new Refusal("separator", string.Empty, "name the separator that ran"));
        }
    }
}
