using Plant.Advice;
using Plant.Register.Reservoirs;
using Plant.Register.Storage;

namespace Plant.Register.Samples;

/// <summary>One laboratory result: a replicate of a sample (bottle). Replicates share <see cref="Code"/>.</summary>
public sealed class Sample : IRecord
{
    public Guid Id { get; init; }

    public Guid Token { get; set; }

    public DateTime? WithdrawnAt { get; set; }

    public required string Code { get; init; }

    public required int Replicate { get; init; }

    public required Guid ReservoirId { get; set; }

    public Reservoir? Reservoir { get; set; }

    public required DateTime TakenAt { get; set; }

    public DateTime? ReceivedAt { get; set; }

    public required SamplePoint Point { get; set; }

    public double? OilTemperatureC { get; set; }

    public required WaterMethod Method { get; set; }

    public double? WaterPpm { get; set; }

    public double? WaterActivity { get; set; }

    public string? Analyst { get; set; }

    /// <summary>Free text; for a crackle test <c>clear</c> or <c>crackles</c>.</summary>
    public string? Remark { get; set; }

    public string NaturalKey => $"{Code}, replicate {Replicate}";
}
