using Plant.Web.Shared.Drawing;
using Plotly.Blazor.Traces;

namespace Plant.Web.Tests.Shared.Drawing;

public sealed class ChartShapeTests
{
    private static readonly ChartLook Look = new("#111", "#222", "#333", "#444", "#055", "#066", "#077", "#888", "#999", "#fff", false);
    private static readonly DateTime Day = new(2026, 1, 1, 0, 0, 0, DateTimeKind.Utc);

    [Fact]
    public void Of_NamesThatLookLikeMarkup_StayText()
    {
        var (layout, data) = ChartShape.Of([new("<b onclick=x>oil</b> &lt;", SeriesStyle.Line, [Day, Day.AddDays(1)], [1, 2])], Look, "date", "ppm");
        Assert.DoesNotContain("<b", Assert.IsType<Scatter>(data[0]).Name, StringComparison.Ordinal);
        Assert.DoesNotContain("<b", layout.Annotations[0].Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_WideForecast_DoesNotFlattenWhatIsBelieved()
    {
        List<ChartSeries> series = [new("low", SeriesStyle.BandFloor, [Day], [10]), new("high", SeriesStyle.WideBand, [Day], [5000]), new("result", SeriesStyle.Rings, [Day], [100], [5])];
        Assert.InRange(ChartScale.Top(series), 105, 300);
    }

    [Fact]
    public void Of_OutOfRange_StandsAtTheEdgeWithItsValue()
    {
        List<ChartSeries> series = [new("result", SeriesStyle.Rings, [Day], [100], [5]), new("odd", SeriesStyle.Triangles, [Day], [7000])];
        var odd = Assert.IsType<Scatter>(ChartShape.Of(series, Look, "date", "ppm").Data[1]);
        Assert.True((double)odd.Y[0] < 150);
        Assert.Equal("7,000 ppm", odd.TextArray[0]);
    }

    [Fact]
    public void Of_Phone_PutsNamesIntoTheChart()
    {
        List<ChartSeries> series = [new("limit", SeriesStyle.Dashed, [Day, Day.AddDays(9)], [200, 200])];
        Assert.Equal(124, ChartShape.Of(series, Look, "date", "ppm").Layout.Margin.R);
        Assert.Equal(10, ChartShape.Of(series, Look with { Narrow = true }, "date", "ppm").Layout.Margin.R);
    }
}
