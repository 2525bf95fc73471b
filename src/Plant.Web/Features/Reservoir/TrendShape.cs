using Plant.Advice.Ledger;
using Plant.Web.Shared.Drawing;

namespace Plant.Web.Features.Reservoir;

/// <summary>The trend as series.</summary>
internal static class TrendShape
{
    private const double Z90 = 1.645;

    public static IEnumerable<ChartSeries> Of(ReservoirView view)
    {
        var now = view.Assessment.AsOf;
        var end = now.AddDays(ReservoirQueries.ForecastDays);
        var begin = view.Observations.Count > 0 ? view.Observations[0].At : now.AddDays(-30);
        if (view.Assessment.WaterPpm is not null)
        {
            var days = view.Forecast.Select(f => (object)now.AddDays(f.Day)).ToList();
            yield return new("90 %, lower", SeriesStyle.BandFloor, days, [.. view.Forecast.Select(f => f.WaterLow90Ppm)]);
            yield return new("90 %, upper", SeriesStyle.WideBand, days, [.. view.Forecast.Select(f => f.WaterHigh90Ppm)]);
            yield return new("50 %, lower", SeriesStyle.BandFloor, days, [.. view.Forecast.Select(f => f.WaterLow50Ppm)]);
            yield return new("50 %, upper", SeriesStyle.NarrowBand, days, [.. view.Forecast.Select(f => f.WaterHigh50Ppm)]);
        }

        if (view.Assessment.SaturationNowPpm is { } warm)
        {
            yield return new($"holds at {Figures.Of(view.Fields.OperatingTemperatureC)} °C", SeriesStyle.Line, [begin, end], [warm, warm]);
        }

        if (view.Assessment.SaturationColdestPpm is { } cold)
        {
            yield return new($"holds at {Figures.Of(view.Fields.ColdestTemperatureC)} °C", SeriesStyle.Dashed, [begin, end], [cold, cold]);
        }

        if (view.Assessment.LimitPpm is { } limit)
        {
            yield return new("limit", SeriesStyle.Dashed, [begin, end], [limit, limit]);
        }

        if (view.Assessment.IngressChangedAt is { } changed)
        {
            yield return ChartSeries.At($"ingress rose, {Figures.ShortDay(changed)}", changed);
        }

        yield return ChartSeries.At($"as of {Figures.ShortDay(now)}", now, today: true);

        yield return Points("result", SeriesStyle.Rings, [.. view.Observations.Where(o => !o.Outlying)]);
        var odd = view.Observations.Where(o => o.Outlying).ToList();
        if (odd.Count > 0)
        {
            yield return Points("out of range, kept", SeriesStyle.Triangles, odd);
        }
    }

    private static ChartSeries Points(string name, SeriesStyle style, List<Observation> points) =>
        new(name, style, [.. points.Select(o => (object)o.At)], [.. points.Select(o => (double?)o.WaterPpm)], [.. points.Select(o => Z90 * o.StandardUncertaintyPpm)]);
}
