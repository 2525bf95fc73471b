using Plant.Advice;

namespace Plant.Register.Laboratory;

/// <summary>A bottle at the bench with what was typed so far.</summary>
public sealed class BenchRow
{
    public required Guid Id { get; init; }

    public required Guid BatchId { get; init; }

    /// <summary>Place in the batch, from 1.</summary>
    public required int Ordinal { get; init; }

    public required string Bottle { get; init; }

    public required Guid ReservoirId { get; init; }

    public required string Tag { get; init; }

    public required SamplePoint Point { get; init; }

    public required DateTime TakenAt { get; init; }

    public double? OilTemperatureC { get; init; }

    /// <summary>What the ledger expects [mg/kg], before the result is known.</summary>
    public double? ExpectedLowPpm { get; init; }

    public double? ExpectedHighPpm { get; init; }

    /// <summary>What the oil holds at its running temperature [mg/kg].</summary>
    public double? SaturationPpm { get; init; }

    /// <summary>The cells as they were typed.</summary>
    public List<string> Cells { get; set; } = [];

    /// <summary>True where the bottle is set aside as dirty: no result comes of it.</summary>
    public bool SetAside { get; set; }

    public DateTime SavedAt { get; set; }

    public DateTime? ReleasedAt { get; set; }
}
