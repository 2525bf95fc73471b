namespace Plant.Register.WorkOrders;

/// <summary>Where a work order stands; <see cref="WorkOrderRules"/> says how it moves.</summary>
public enum WorkOrderState
{
    /// <summary>Being written by its author.</summary>
    Draft,

    /// <summary>Waits for a decision.</summary>
    Submitted,

    /// <summary>Back with its author, who was asked something.</summary>
    AskedBack,

    /// <summary>May be begun.</summary>
    Approved,

    /// <summary>Was refused.</summary>
    Rejected,

    /// <summary>Is being done.</summary>
    Begun,

    /// <summary>The work was recorded; a following sample is to verify it.</summary>
    Done,

    /// <summary>A following sample was held against the expectation.</summary>
    Verified,

    /// <summary>Nothing is left to do.</summary>
    Closed,

    /// <summary>Will not be done.</summary>
    Withdrawn,
}
