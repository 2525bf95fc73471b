namespace Plant.Register.WorkOrders;

/// <summary>Where a work order stands. An order starts as a draft; only its author or an administrator withdraws it.</summary>
public enum WorkOrderState
{
    Draft,
    Submitted,
    Approved,
    Rejected,
    Done,
    Verified,
    Closed,
    Withdrawn,
}
