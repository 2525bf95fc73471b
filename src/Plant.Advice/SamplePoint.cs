namespace Plant.Advice;

/// <summary>Where a sample was taken.</summary>
public enum SamplePoint
{
    /// <summary>Return line: the circulating oil.</summary>
    Return,

    /// <summary>Middle of the tank.</summary>
    Tank,

    /// <summary>Near the bottom of the tank.</summary>
    Bottom,

    /// <summary>From the drain: sees the settled water too.</summary>
    Drain,
}
