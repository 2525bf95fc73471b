namespace Plant.Register.WorkOrders;

/// <summary>What a person does to a work order.</summary>
public enum WorkOrderStep
{
    /// <summary>The author asks for a decision.</summary>
    Submit,

    /// <summary>Somebody else than the author agrees.</summary>
    Approve,

    /// <summary>Somebody else than the author refuses, with a reason.</summary>
    Reject,

    /// <summary>Somebody else than the author asks the author something.</summary>
    AskBack,

    /// <summary>The approval is taken back before the work began, with a reason.</summary>
    WithdrawApproval,

    /// <summary>The work begins.</summary>
    Begin,

    /// <summary>The work was done: what was found and drained enters the register.</summary>
    Finish,

    /// <summary>A sample taken since is held against the expectation.</summary>
    Verify,

    /// <summary>The order is put away.</summary>
    Close,

    /// <summary>The order will not be done, with a reason.</summary>
    Withdraw,
}
