using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>A planned walk past several reservoirs.</summary>
public sealed class DrainRound : IRecord
{
    public Guid Id { get; init; }

    public Guid Token { get; set; }

    public DateTime? WithdrawnAt { get; set; }

    public required string Code { get; init; }

    public required string Name { get; set; }

    public DateOnly PlannedFor { get; set; }

    /// <summary>Tags of the stops in walking order.</summary>
    public List<string> Tags { get; set; } = [];

    public string NaturalKey => Code;
}
