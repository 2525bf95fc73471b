using System.Globalization;
using System.Text;

namespace Skarrow;

/// <summary>The whole mill over the two years that end on one day, and its files.</summary>
public sealed class Mill
{
    private readonly DateTime end;
    private readonly List<(Unit Unit, Keeper Keeper)> reservoirs = [];

    public Mill(DateTime lastDay)
    {
        end = lastDay.Date.AddDays(1);
        var start = end.AddMonths(-24);
        foreach (var unit in Fleet.Build(end).Select(Stories.Apply).Select(New))
        {
            var keeper = new Keeper(unit, start, end);
            keeper.Live();
            reservoirs.Add((unit, keeper));
        }
    }

    public void Write(string folder)
    {
        Directory.CreateDirectory(folder);
        Csv.Write(folder, "fluids.csv", "code,name,family,isoVg,viscosity40Mm2S,viscosity100Mm2S,density15KgM3,expansionPerK,solubilityA,solubilityB,interfacialTensionMNM,relativePermittivity,conductivityPSM,demulsibilityMin,waterLimitPpm",
            Fluids.All.Select(f => new object?[] { f.Code, f.Name, f.Family, f.Vg, f.V40, f.V100, f.Density15, f.Expansion, f.A, f.B, f.Tension, f.Permittivity, f.Conductivity, f.Demulsibility, f.LimitPpm }));
        Csv.Write(folder, "reservoirs.csv", "tag,name,area,service,fluid,shape,lengthMm,widthMm,heightMm,oilVolumeL,suctionHeightMm,circulationLPerMin,operatingTemperatureC,coldestTemperatureC,headspaceRhPercent,breather,waterLimitPpm,waterCapacityL,criticality,commissionedAt",
            reservoirs.Select(r => r.Unit).Select(u => new object?[]
            {
                u.Tag, u.Name, u.Area, u.Service, u.Fluid, u.Shape, u.LengthMm, u.WidthMm, u.HeightMm, u.OilL, u.SuctionMm, u.CirculationLPerMin,
                u.OperatingC, u.ColdestC, u.RhPercent, u.Breather, u.LimitPpm, u.CapacityL, u.Criticality, u.CommissionedAt,
            }));
        WriteSamples(folder);
        Csv.Write(folder, "drains.csv", "tag,drainedAt,waterL,oilL", reservoirs.SelectMany(r => r.Keeper.Drains.Select(d => new object?[] { r.Unit.Tag, d.At, d.WaterL, d.OilL })));
        Csv.Write(folder, "topups.csv", "tag,addedAt,oilL,waterPpm", reservoirs.SelectMany(r => r.Keeper.TopUps.Select(t => new object?[] { r.Unit.Tag, t.At, t.OilL, t.Ppm })));
        Csv.Write(folder, "readings.csv", "tag,readAt,oilTemperatureC,waterActivity", reservoirs.SelectMany(r => r.Keeper.Readings.Select(x => new object?[] { r.Unit.Tag, x.At, x.Celsius, x.Activity })));
        Csv.Write(folder, "separators.csv", "code,tag,kind,flowLPerMin,efficiency,cutSizeUm,pressureKPa,oilTemperatureC,capacityL,portable",
            Separators.All.Select(s => new object?[] { s.Code, s.Tag, s.Kind, s.FlowLPerMin, s.Efficiency, s.CutSizeUm, s.PressureKPa, s.OilTemperatureC, s.CapacityL, s.Tag is null }));
        Csv.Write(folder, "separator-runs.csv", "separator,tag,startedAt,endedAt",
            Separators.Runs.OrderBy(r => r.Separator, StringComparer.Ordinal).ThenByDescending(r => r.FromDay).Select(r => new object?[] { r.Separator, r.Tag, Back(r.FromDay), r.ToDay is { } to ? Back(to) : null }));
        WriteStories(folder);
    }

    /// <summary>What the simulation knows and the files do not say.</summary>
    public string Summary()
    {
        var state = reservoirs.Select(r => (r.Unit, r.Keeper.Water)).ToList();
        var free = state.Where(s => s.Water.SettledL > 0.0001 * s.Unit.OilL || s.Water.TotalPpm > 1.02 * s.Water.SaturationPpm).ToList();
        var cold = state.Except(free).Where(s => s.Water.TotalPpm > s.Water.SaturationColdPpm).ToList();
        var near = state.Except(free).Except(cold).Count(s => s.Water.TotalPpm > 0.8 * s.Water.SaturationColdPpm);
        var lines = new StringBuilder().AppendLine(CultureInfo.InvariantCulture,
            $"{state.Count} reservoirs; in truth {free.Count} with free water, {cold.Count} when cold, {near} near saturation, {state.Count - free.Count - cold.Count - near} dry");
        foreach (var (unit, water) in free)
        {
            lines.AppendLine(CultureInfo.InvariantCulture, $"  free  {unit.Tag,-10} {water.TotalPpm,6:0} mg/kg of {water.SaturationPpm:0}, {water.SettledL:0.00} L settled");
        }

        foreach (var (unit, water) in cold)
        {
            lines.AppendLine(CultureInfo.InvariantCulture, $"  cold  {unit.Tag,-10} {water.TotalPpm,6:0} mg/kg of {water.SaturationColdPpm:0}");
        }

        return lines.ToString().TrimEnd();
    }

    private Unit New(Unit unit) => unit.SampleDays == 0 ? unit with { CommissionedAt = end.AddDays(-45).AddHours(8) } : unit;

    private DateTime Back(double days) => end.AddDays(-Math.Floor(days)).AddMinutes(Math.Round((Math.Floor(days) - days) * 48) * 30).AddHours(9);

    private void WriteSamples(string folder)
    {
        var rows = reservoirs.SelectMany(r => r.Keeper.Samples).OrderBy(s => s.TakenAt).ThenBy(s => s.Tag, StringComparer.Ordinal).ThenBy(s => s.Replicate).ToList();
        var numbers = rows.Select(s => (s.Tag, s.TakenAt)).Distinct().GroupBy(s => s.TakenAt.Year)
            .SelectMany(year => year.Select((key, i) => (key, Number: FormattableString.Invariant($"SK{year.Key % 100:00}-{i + 1:0000}")))).ToDictionary(x => x.key, x => x.Number);
        Csv.Write(folder, "samples.csv", "sample,tag,takenAt,receivedAt,point,oilTemperatureC,method,waterPpm,waterActivity,replicate,analyst,remark",
            rows.Select(s => new object?[] { numbers[(s.Tag, s.TakenAt)], s.Tag, s.TakenAt, s.ReceivedAt, s.Point, s.OilTemperatureC, s.Method, s.WaterPpm, s.WaterActivity, s.Replicate, s.Analyst, s.Remark }));
    }

    private void WriteStories(string folder)
    {
        var text = new StringBuilder("# What is hidden in the demo plant\n\n")
            .Append("Skarrow Board Mill is invented. Its records were made by `dotnet run seed-data/generate.cs`; the list below is its `generator/Stories.cs`.\n\n")
            .Append("| tag | since | what happens | what the program should say |\n|---|---|---|---|\n");
        foreach (var story in Stories.All)
        {
            text.Append(CultureInfo.InvariantCulture, $"| {story.Tag} | {(story.SinceDay is { } day ? Back(day).ToString("yyyy-MM-dd", CultureInfo.InvariantCulture) : "always")} | {story.Happens} | {story.Says} |\n");
        }

        text.Append(CultureInfo.InvariantCulture, $"\nSampling stopped early on {string.Join(", ", Stories.SamplingStopped.Keys)}: these samples are overdue.\n");
        File.WriteAllText(Path.Combine(folder, "STORIES.md"), text.ToString());
    }
}
