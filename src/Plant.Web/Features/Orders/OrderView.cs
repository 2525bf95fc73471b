using Plant.Register.WorkOrders;

namespace Plant.Web.Features.Orders;

/// <summary>A line of the list of orders.</summary>
public sealed record OrderLine(string Number, string Tag, string Name, WorkOrderKind Kind, WorkOrderState State, string Task, string Author, DateTime CreatedAt, DateTime? DueAt, int? Criticality);

/// <summary>An order with its story.</summary>
/// <param name="Order">The order.</param>
/// <param name="Evidence">What stood when it was drafted; null for one by hand.</param>
/// <param name="Story">Who did what when.</param>
/// <param name="Since">What the register recorded of the reservoir since the order was drafted.</param>
/// <param name="Now">What is true now; null where it cannot be told.</param>
/// <param name="History">The records now.</param>
public sealed record OrderView(
    WorkOrder Order, WorkOrderEvidence? Evidence, IReadOnlyList<OrderEvent> Story, IReadOnlyList<OrderEvent> Since, Plant.Advice.Assessment? Now, Plant.Advice.ReservoirHistory? History);

/// <summary>Something that happened.</summary>
public sealed record OrderEvent(DateTime At, string Who, string What);
