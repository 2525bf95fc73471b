using System.Globalization;
using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>A drain round as it is planned.</summary>
public sealed record RoundFields : IFields
{
    public string? Code { get; set; }

    public string? Name { get; set; }

    /// <summary>The day, as yyyy-MM-dd.</summary>
    public string? PlannedFor { get; set; }

    public IReadOnlyList<string>? Tags { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("code", Code, 40);
        refusals.Required("name", Name, 200);
        refusals.Required("plannedFor", PlannedFor);
        if (PlannedFor is not null && !DateOnly.TryParseExact(PlannedFor, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out _))
        {
            refusals.Add(new Refusal("plannedFor", PlannedFor, "must be a day as yyyy-MM-dd"));
        }

        if (Tags is null || Tags.Count == 0)
        {
            refusals.Add(new Refusal("tags", string.Empty, "a round needs at least one tag"));
        }
    }
}
