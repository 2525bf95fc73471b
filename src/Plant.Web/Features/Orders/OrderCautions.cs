using Plant.Advice;
using Plant.Register.WorkOrders;

namespace Plant.Web.Features.Orders;

/// <summary>What to keep in mind for a kind of work, and what to isolate; local rules come first.</summary>
public static class OrderCautions
{
    /// <summary>Cautions for the work on this reservoir.</summary>
    public static IReadOnlyList<string> For(WorkOrderKind kind, ReservoirHistory? history, SeparatorKind? dehydration) => history is null
        ? [Cautions.Advisory]
        : Cautions.For(history, kind is WorkOrderKind.Drain or WorkOrderKind.ChangeFluid or WorkOrderKind.Repair, kind == WorkOrderKind.Dehydrate ? dehydration ?? SeparatorKind.VacuumDehydrator : null);

    /// <summary>Isolation points: common practice, to be held against the plant's own list.</summary>
    public static IReadOnlyList<string> Isolate(WorkOrderKind kind) => kind switch
    {
        WorkOrderKind.Drain => ["drain valve: crack it open slowly, never leave it", "pump may run; keep the suction covered"],
        WorkOrderKind.Dehydrate => ["rig: earth it, check hoses and return below the oil's surface", "drain the settled water first", "heater and vacuum interlocks tested"],
        WorkOrderKind.Repair => ["machine stopped, locked and tagged", "cooling water and steam shut and drained on both sides", "pressure relieved, oil below 45 °C"],
        WorkOrderKind.ChangeFluid => ["machine stopped, locked and tagged", "pump, heater and circulation isolated", "compatibility of old and new fluid checked"],
        _ => ["sampling valve flushed; eye protection", "machine running at its usual temperature"],
    };
}
