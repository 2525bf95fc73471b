using Plant.Web.Shared.Drawing;

namespace Plant.Web.Features.Reservoir;

/// <summary>Settled or floating water run forward, against what may stand.</summary>
internal static class SettledShape
{
    private const double WorthAChart = 0.02;

    public static IEnumerable<ChartSeries> Of(ReservoirView view)
    {
        if (view.Forecast[^1] is not { SettledHigh90L: > WorthAChart and { } most })
        {
            yield break;
        }

        var now = view.Assessment.AsOf;
        var days = view.Forecast.Select(f => (object)now.AddDays(f.Day)).ToList();
        yield return new("90 %, lower", SeriesStyle.BandFloor, days, [.. view.Forecast.Select(f => f.SettledLow90L)], Water: true);
        yield return new("90 %, upper", SeriesStyle.WideBand, days, [.. view.Forecast.Select(f => f.SettledHigh90L)], Water: true);
        yield return new("likeliest", SeriesStyle.Line, days, [.. view.Forecast.Select(f => f.SettledL)], Water: true);
        if (view.Assessment.CapacityL is { } capacity && capacity < 2 * most)
        {
            yield return new("capacity", SeriesStyle.Dashed, [days[0], days[^1]], [capacity, capacity]);
        }
    }
}
