namespace Plant.Register.WorkOrders;

/// <summary>What a work order has done.</summary>
public enum WorkOrderKind
{
    Drain,
    Dehydrate,
    Repair,
    ChangeFluid,
    SampleAgain,
}
