using Plant.Advice;
using Plant.Physics;
using Plant.Physics.Fluids;
using Plant.Web.Shared.Drawing;

namespace Plant.Web.Features.Reservoir;

/// <summary>The saturation curve with the samples as series.</summary>
internal static class CurveShape
{
    public static IEnumerable<ChartSeries> Of(ReservoirView view)
    {
        if (FluidModel.TryCreate(view.History.Fluid, []) is not { HasSaturation: true } fluid)
        {
            yield break;
        }

        var low = Math.Floor(Math.Min(view.Fields.ColdestTemperatureC ?? 10, 10));
        var high = Math.Ceiling(Math.Max(view.Fields.OperatingTemperatureC ?? 60, 40) + 10);
        var places = Enumerable.Range(0, 41).Select(i => low + ((high - low) * i / 40)).ToList();
        yield return new("saturated", SeriesStyle.Line, [.. places.Select(t => (object)t)], [.. places.Select(t => (double?)fluid.SaturationPpm(t + Constants.ZeroCelsiusK))]);
        var samples = view.History.Samples.Where(s => s.WaterPpm is not null && s.Point is SamplePoint.Return or SamplePoint.Tank).ToList();
        List<object> at = [.. samples.Select(s => (object)(s.OilTemperatureC ?? view.Fields.OperatingTemperatureC ?? 40))];
        List<double?> water = [.. samples.Select(s => s.WaterPpm)];
        yield return new("their order", SeriesStyle.Path, at, water);
        yield return new("sample", SeriesStyle.Rings, at, water);
    }
}
