namespace Plant.Register.WorkOrders;

/// <summary>When a person last looked at an order: what changed since is told.</summary>
public sealed class OrderLook
{
    public required Guid OrderId { get; init; }

    public required string Person { get; init; }

    public required DateTime At { get; set; }
}
