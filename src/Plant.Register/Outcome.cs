using Plant.Physics;

namespace Plant.Register;

/// <summary>How a write ended. Expected refusals are values; exceptions are for bugs and broken machines.</summary>
public enum OutcomeKind
{
    /// <summary>Done; the same request repeated ends like this too, with no second effect.</summary>
    Done,

    /// <summary>The input is refused; nothing was written.</summary>
    Invalid,

    /// <summary>There is no such record.</summary>
    NotFound,

    /// <summary>Somebody changed the record since it was read; nothing was written.</summary>
    Stale,

    /// <summary>The record exists already with other values; nothing was written.</summary>
    Conflict,

    /// <summary>The actor may not do this.</summary>
    Forbidden,
}

/// <summary>The outcome of a write.</summary>
public sealed record Outcome<T>(OutcomeKind Kind, T? Value, IReadOnlyList<Refusal> Refusals, string? Message)
{
    public bool IsDone => Kind == OutcomeKind.Done;

    public static Outcome<T> Done(T value) => new(OutcomeKind.Done, value, [], null);

    public static Outcome<T> Invalid(params IReadOnlyList<Refusal> refusals) => new(OutcomeKind.Invalid, default, refusals, null);

    public static Outcome<T> Refused(OutcomeKind kind, string message) => new(kind, default, [], message);
}
