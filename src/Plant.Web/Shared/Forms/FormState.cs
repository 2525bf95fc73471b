using Plant.Register;

namespace Plant.Web.Shared.Forms;

/// <summary>What a form knows of its last save.</summary>
public sealed class FormState
{
    /// <summary>What was refused, by field.</summary>
    public Dictionary<string, string> Refused { get; private set; } = [];

    /// <summary>One sentence on top of the form.</summary>
    public string? Message { get; private set; }

    /// <summary>True once something was typed that is not saved.</summary>
    public bool Dirty { get; set; }

    /// <summary>Takes the outcome of a save; true where it was saved.</summary>
    public bool Take<T>(Outcome<T> outcome)
    {
        Refused = outcome.Refusals.GroupBy(r => r.Field).ToDictionary(g => g.Key, g => string.Join("; ", g.Select(r => r.Reason)));
        Message = outcome.IsDone ? null : outcome.Message ?? $"Not saved: {Refused.Count} {(Refused.Count == 1 ? "field needs" : "fields need")} mending. What you typed is kept here.";
        Dirty &= !outcome.IsDone;
        return outcome.IsDone;
    }
}
