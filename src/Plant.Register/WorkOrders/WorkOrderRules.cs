using Plant.Physics;
using Plant.Register.Access;

namespace Plant.Register.WorkOrders;

/// <summary>The one state machine of work orders: whatever is not written here is refused.</summary>
public static class WorkOrderRules
{
    private static readonly Dictionary<(WorkOrderState, WorkOrderStep), WorkOrderState> Moves = new()
    {
        [(WorkOrderState.Draft, WorkOrderStep.Submit)] = WorkOrderState.Submitted,
        [(WorkOrderState.AskedBack, WorkOrderStep.Submit)] = WorkOrderState.Submitted,
        [(WorkOrderState.Submitted, WorkOrderStep.Approve)] = WorkOrderState.Approved,
        [(WorkOrderState.Submitted, WorkOrderStep.Reject)] = WorkOrderState.Rejected,
        [(WorkOrderState.Submitted, WorkOrderStep.AskBack)] = WorkOrderState.AskedBack,
        [(WorkOrderState.Approved, WorkOrderStep.WithdrawApproval)] = WorkOrderState.Submitted,
        [(WorkOrderState.Approved, WorkOrderStep.Begin)] = WorkOrderState.Begun,
        [(WorkOrderState.Approved, WorkOrderStep.Finish)] = WorkOrderState.Done,
        [(WorkOrderState.Begun, WorkOrderStep.Finish)] = WorkOrderState.Done,
        [(WorkOrderState.Done, WorkOrderStep.Verify)] = WorkOrderState.Verified,
        [(WorkOrderState.Done, WorkOrderStep.Close)] = WorkOrderState.Closed,
        [(WorkOrderState.Verified, WorkOrderStep.Close)] = WorkOrderState.Closed,
        [(WorkOrderState.Draft, WorkOrderStep.Withdraw)] = WorkOrderState.Withdrawn,
        [(WorkOrderState.AskedBack, WorkOrderStep.Withdraw)] = WorkOrderState.Withdrawn,
        [(WorkOrderState.Submitted, WorkOrderStep.Withdraw)] = WorkOrderState.Withdrawn,
        [(WorkOrderState.Approved, WorkOrderStep.Withdraw)] = WorkOrderState.Withdrawn,
    };

    /// <summary>Where the step leads; null where it is not possible from here.</summary>
    public static WorkOrderState? Next(WorkOrderState state, WorkOrderStep step) => Moves.TryGetValue((state, step), out var next) ? next : null;

    /// <summary>True where the step needs a reason in words.</summary>
    public static bool NeedsReason(WorkOrderState state, WorkOrderStep step) => step switch
    {
        WorkOrderStep.Reject or WorkOrderStep.AskBack or WorkOrderStep.WithdrawApproval or WorkOrderStep.Withdraw => true,
        WorkOrderStep.Close => state == WorkOrderState.Done,
        _ => false,
    };

    /// <summary>The duty that the step takes.</summary>
    public static Duty DutyOf(WorkOrderStep step) => step switch
    {
        WorkOrderStep.Approve or WorkOrderStep.Reject or WorkOrderStep.AskBack or WorkOrderStep.WithdrawApproval => Duty.ApproveWork,
        WorkOrderStep.Begin or WorkOrderStep.Finish => Duty.RecordWork,
        _ => Duty.PlanWork,
    };

    /// <summary>Why this actor may not take this step now; null where it may.</summary>
    public static string? Refusal(string number, WorkOrderState state, string author, WorkOrderStep step, Actor actor)
    {
        if (!actor.May(DutyOf(step)))
        {
            return $"{actor.Name} may not {Words(step)} work orders";
        }

        if (Next(state, step) is null)
        {
            return $"{number} is {Words(state)}: one cannot {Words(step)} it";
        }

        var own = author == actor.Name;
        return step switch
        {
            WorkOrderStep.Approve or WorkOrderStep.Reject or WorkOrderStep.AskBack when own => $"{number} is your own: somebody else must decide",
            WorkOrderStep.Submit when !own => $"{number} is of {author}: only its author submits it",
            WorkOrderStep.Withdraw when !own && !actor.Is(PlantRole.Administrator) => $"{number} is of {author}: only its author withdraws it",
            _ => null,
        };
    }

    /// <summary>Why this actor may not change what the order says; null where it may.</summary>
    public static string? AmendRefusal(string number, WorkOrderState state, string author, Actor actor) => state switch
    {
        WorkOrderState.Draft or WorkOrderState.AskedBack when author == actor.Name || actor.Is(PlantRole.Administrator) => null,
        WorkOrderState.Draft or WorkOrderState.AskedBack => $"{number} is of {author}: only its author changes it",
        // whoever changes what is to be decided becomes its author, and cannot decide it
        WorkOrderState.Submitted when actor.May(Duty.ApproveWork) || author == actor.Name => null,
        WorkOrderState.Submitted => $"{number} waits for a decision: only its author or a supervisor changes it",
        _ => $"{number} is {Words(state)}: it is not changed any more",
    };

    /// <summary>A state in words.</summary>
    public static string Words(WorkOrderState state) => Code.Of(state).Replace('-', ' ');

    /// <summary>A step in words.</summary>
    public static string Words(WorkOrderStep step) => step switch
    {
        WorkOrderStep.AskBack => "ask back about",
        WorkOrderStep.WithdrawApproval => "withdraw the approval of",
        _ => Code.Of(step),
    };
}
