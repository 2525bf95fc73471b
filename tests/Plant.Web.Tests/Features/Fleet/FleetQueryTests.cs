using Plant.Advice;
using Plant.Web.Features.Fleet;
using Plant.Web.Shared.Drawing;

namespace Plant.Web.Tests.Features.Fleet;

public sealed class FleetQueryTests
{
    private static readonly DateTime Now = new(2026, 3, 2, 8, 0, 0, DateTimeKind.Utc);

    [Fact]
    public void Address_HoldsEachFilterOrderAndPage()
    {
        var query = new FleetQuery { Condition = "free-water", Area = "Wet end & more", Fluid = "M 46", Search = "pump #1", Only = "due", Order = "water", Descending = true, Page = 3 };
        var address = new Uri("http://localhost" + query.Address());
        var told = Microsoft.AspNetCore.WebUtilities.QueryHelpers.ParseQuery(address.Query);
        Assert.Equal("free-water", told["condition"].ToString());
        Assert.Equal("Wet end & more", told["area"].ToString());
        Assert.Equal("M 46", told["fluid"].ToString());
        Assert.Equal("pump #1", told["q"].ToString());
        Assert.Equal("due", told["only"].ToString());
        Assert.Equal("water", told["order"].ToString());
        Assert.Equal("true", told["desc"].ToString());
        Assert.Equal("3", told["page"].ToString());
    }

    [Fact]
    public void Address_WithoutFilters_IsThePage() => Assert.Equal("/", new FleetQuery().Address());

    [Fact]
    public void Apply_UsualOrder_PutsTheEarliestDrainFirstAndTheUndatedByUrgency()
    {
        var rows = new[]
        {
            Row("D", Condition.Dry), Row("C", Condition.FreeWaterWhenCold), Row("B", Condition.FreeWater, Now.AddDays(9)), Row("A", Condition.FreeWater, Now.AddDays(20)), Row("U", Condition.Unknown),
        };
        Assert.Equal(["B", "A", "C", "U", "D"], new FleetQuery().Apply(rows).Select(r => r.Tag));
        Assert.Equal(["D", "U", "C", "A", "B"], new FleetQuery { Descending = true }.Apply(rows).Select(r => r.Tag));
    }

    [Theory]
    [InlineData("a-1", "A-1")]
    [InlineData("NAME OF B", "B")]
    public void Apply_Search_MatchesTagOrNameInAnyCase(string search, string tag)
    {
        var rows = new[] { Row("A-1", Condition.Dry) with { Name = "first" }, Row("B", Condition.Dry) with { Name = "name of b" } };
        Assert.Equal(tag, Assert.Single(new FleetQuery { Search = search }.Apply(rows)).Tag);
    }

    [Fact]
    public void Apply_Due_KeepsOnlyWhatIsDueNow()
    {
        var rows = new[] { Row("A", Condition.FreeWater, Now), Row("B", Condition.FreeWater, Now.AddDays(1)), Row("C", Condition.FreeWater) };
        Assert.Equal(["A"], new FleetQuery { Only = "due" }.Apply(rows).Select(r => r.Tag));
    }

    private static FleetRow Row(string tag, Condition condition, DateTime? drainBy = null) => new(tag, tag, "", "M", "", new SectionState(), new Assessment
    {
        Tag = tag, AsOf = Now, Condition = condition, DrainBy = drainBy, Reason = "", Basis = Basis.Measured, Actions = [], Cautions = [],
    });
}
