namespace Plant.Web.Shared.Drawing;

/// <summary>The scales of a chart, from its series.</summary>
public static class ChartScale
{
    private const double Room = 1.08;
    private const double Margin = 0.015;
    private const double BandMayDouble = 2;

    /// <summary>Top of the vertical scale: all that is believed is seen, and a wide forecast does not flatten the rest.</summary>
    public static double Top(IReadOnlyList<ChartSeries> series)
    {
        var believed = series.Where(s => s.Tells && s.Style != SeriesStyle.Triangles).SelectMany(s => s.Y.Select((y, i) => (y ?? 0) + (s.Error?[i] ?? 0))).DefaultIfEmpty(0).Max();
        var bands = series.Where(s => s.Style is SeriesStyle.WideBand or SeriesStyle.NarrowBand).SelectMany(s => s.Y).Max() ?? 0;
        var top = believed > 0 ? Math.Max(believed, Math.Min(bands, BandMayDouble * believed)) : bands;
        return top > 0 ? Room * top : 1;
    }

    /// <summary>Both ends of the horizontal scale; null without a place.</summary>
    public static (object From, object To)? Across(IReadOnlyList<ChartSeries> series)
    {
        var places = series.SelectMany(s => s.X).Order().ToList();
        return places.Count == 0 ? null : (places[0], places[^1]) switch
        {
            (DateTime from, DateTime to) => (from - (to - from) * Margin, to),
            (double from, double to) => (from - ((to - from) * Margin), to),
            var ends => ends,
        };
    }
}
