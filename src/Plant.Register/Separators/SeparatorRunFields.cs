using System.Globalization;
using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.Separators;

/// <summary>Columns of separator-runs.csv.</summary>
public sealed record SeparatorRunFields : IFields
{
    public string? Separator { get; set; }

    public string? Tag { get; set; }

    public DateTimeOffset? StartedAt { get; set; }

    public DateTimeOffset? EndedAt { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("separator", Separator);
        refusals.Required("tag", Tag);
        refusals.Required("startedAt", StartedAt);
        refusals.Time("startedAt", StartedAt);
        refusals.Time("endedAt", EndedAt);
        if (EndedAt < StartedAt)
        {
            refusals.Add(new Refusal("endedAt", EndedAt.Value.ToString("O", CultureInfo.InvariantCulture), "must not be before startedAt"));
        }
    }
}
