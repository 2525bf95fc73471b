using Plant.Advice;

namespace Plant.Register.Laboratory;

/// <summary>Drafts of one sitting at the bench, with what holds for all of them. Drafts are no records: results become records when they are released.</summary>
public sealed class BenchBatch
{
    public required Guid Id { get; init; }

    public required string Owner { get; init; }

    public required DateTime OpenedAt { get; init; }

    public DateTime? ClosedAt { get; set; }

    public WaterMethod Method { get; set; } = WaterMethod.KfCoulometric;

    public BenchEntry Entry { get; set; }

    public bool Duplicates { get; set; } = true;

    public string Instrument { get; set; } = "";

    /// <summary>What the check standard holds [mg/kg].</summary>
    public double? StandardPpm { get; set; }

    /// <summary>What was found in it [mg/kg].</summary>
    public double? StandardFoundPpm { get; set; }

    public double? BlankUg { get; set; }

    public double? DriftUgPerMin { get; set; }

    public double? Minutes { get; set; }

    public List<BenchRow> Rows { get; init; } = [];
}
