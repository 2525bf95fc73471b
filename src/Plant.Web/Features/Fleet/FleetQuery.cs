using Microsoft.AspNetCore.WebUtilities;
using Plant.Advice;
using Plant.Physics;

namespace Plant.Web.Features.Fleet;

/// <summary>What of the fleet is shown: filters, order and page, as they stand in the address.</summary>
public sealed record FleetQuery
{
    public const int PageSize = 40;

    public static readonly IReadOnlyList<string> Orders = ["drain", "tag", "condition", "water", "ingress", "sample", "dehydrate"];

    public string? Condition { get; init; }

    public string? Area { get; init; }

    public string? Fluid { get; init; }

    public string? Search { get; init; }

    /// <summary>due, overdue-sample or dehydrate.</summary>
    public string? Only { get; init; }

    public string Order { get; init; } = "drain";

    public bool Descending { get; init; }

    public int Page { get; init; } = 1;

    /// <summary>Tags that are chosen, with commas between them.</summary>
    public string? Chosen { get; init; }

    /// <summary>The chosen tags.</summary>
    public IReadOnlyList<string> ChosenTags => Chosen?.Split(',', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries) ?? [];

    /// <summary>The same list with a tag chosen, or no more.</summary>
    public FleetQuery Toggled(string tag) => this with { Chosen = string.Join(',', ChosenTags.Contains(tag) ? ChosenTags.Where(t => t != tag) : [.. ChosenTags, tag]) };

    /// <summary>The address of the page with this state.</summary>
    public string Address(string path = "/")
    {
        var query = new Dictionary<string, string?>();
        void Add(string name, string? value)
        {
            if (!string.IsNullOrEmpty(value))
            {
                query[name] = value;
            }
        }

        Add("condition", Condition);
        Add("area", Area);
        Add("fluid", Fluid);
        Add("q", Search);
        Add("only", Only);
        Add("order", Order == "drain" ? null : Order);
        Add("desc", Descending ? "true" : null);
        Add("page", Page > 1 ? Page.ToString(System.Globalization.CultureInfo.InvariantCulture) : null);
        Add("chosen", Chosen);
        return QueryHelpers.AddQueryString(path, query);
    }

    /// <summary>The rows that are meant, in order.</summary>
    public IReadOnlyList<FleetRow> Apply(IReadOnlyCollection<FleetRow> rows)
    {
        var found = rows.Where(Matches);
        var ordered = Order switch
        {
            "tag" => found.OrderBy(r => r.Tag, StringComparer.Ordinal),
            "condition" => found.OrderBy(r => r.Assessment.Condition),
            "water" => found.OrderBy(r => r.Assessment.WaterPpm ?? double.MaxValue),
            "ingress" => found.OrderBy(r => r.Assessment.IngressGPerDay ?? double.MaxValue),
            "sample" => found.OrderBy(r => r.SampleAgeDays ?? double.MaxValue),
            "dehydrate" => found.OrderBy(r => r.Assessment.DehydrateBy ?? DateTime.MaxValue),
            _ => found.OrderBy(r => r.Assessment.DrainBy ?? DateTime.MaxValue).ThenBy(r => Urgency(r.Assessment.Condition)),
        };
        var stable = ordered.ThenBy(r => r.Tag, StringComparer.Ordinal).ToList();
        if (Descending)
        {
            stable.Reverse();
        }

        return stable;
    }

    private static int Urgency(Condition condition) => condition switch
    {
        Advice.Condition.FreeWater => 0,
        Advice.Condition.FreeWaterWhenCold => 1,
        Advice.Condition.Unknown => 2,
        Advice.Condition.NearSaturation => 3,
        _ => 4,
    };

    private bool Matches(FleetRow row) =>
        (string.IsNullOrEmpty(Condition) || Code.Of(row.Assessment.Condition) == Condition)
        && (string.IsNullOrEmpty(Area) || row.Area == Area)
        && (string.IsNullOrEmpty(Fluid) || row.FluidCode == Fluid)
        && (string.IsNullOrEmpty(Search) || row.Tag.Contains(Search, StringComparison.OrdinalIgnoreCase) || row.Name.Contains(Search, StringComparison.OrdinalIgnoreCase))
        && (Only switch
        {
            "due" => row.Due,
            "overdue-sample" => row.Assessment.SampleOverdue,
            "dehydrate" => row.Assessment.Dehydration is not null,
            _ => true,
        });
}
