namespace Skarrow;

/// <summary>One row of samples.csv; the number is given when all rows are known.</summary>
public sealed record SampleRow(string Tag, DateTime TakenAt, int Replicate)
{
    public DateTime? ReceivedAt { get; init; }

    public required string Point { get; init; }

    public double? OilTemperatureC { get; init; }

    public required string Method { get; init; }

    public double? WaterPpm { get; init; }

    public double? WaterActivity { get; init; }

    public string? Analyst { get; init; }

    public string? Remark { get; init; }
}

/// <summary>Bottles and titrators: what a sample of one reservoir says, with its errors.</summary>
public sealed class Laboratory(Unit unit, Reservoir water, Chance chance)
{
    private static readonly string[] Analysts = ["lab 1", "lab 1", "lab 2", "lab 2", "shift lab"];
    private readonly string mainPoint = unit.CirculationLPerMin is null ? "tank" : chance.Pick(["tank", "tank", "return"]);
    private bool dirtyTaken;

    public IEnumerable<SampleRow> Take(DateTime at, double daysBeforeEnd)
    {
        var point = Point();
        var method = Method();
        var received = at.Date.AddDays(chance.Whole(1, 6)).AddMinutes(chance.Whole(7 * 60, 16 * 60));
        var row = new SampleRow(unit.Tag, at, 1)
        {
            ReceivedAt = method is "activity-sensor" or "crackle" ? null : received,
            Point = point,
            OilTemperatureC = method == "activity-sensor" || chance.Yes(0.7) ? Math.Round(water.TemperatureC + (0.8 * chance.Normal()), 1) : null,
            Method = method,
            Analyst = chance.Yes(0.92) ? chance.Pick(Analysts) : null,
        };
        return method switch
        {
            "crackle" => [row with { Remark = water.FastPpm + water.FinePpm > 350 ? "crackles" : "clear", Analyst = "shift lab" }],
            "activity-sensor" => [row with { WaterActivity = Math.Round(Math.Clamp((water.DissolvedPpm / water.SaturationPpm) + (0.02 * chance.Normal()), 0.01, 1), 2) }],
            _ => Titrate(row, daysBeforeEnd),
        };
    }

    private IEnumerable<SampleRow> Titrate(SampleRow row, double daysBeforeEnd)
    {
        // syringes and dry gas for transformers; bottles on the mill floor for the rest
        var (share, floor) = unit.Rhythm == Rhythm.Always ? (0.04, 1.0) : (0.06, 4.0);
        var inBottle = Math.Max(2, (InBottlePpm(row.Point) * (1 + (share * chance.Normal()))) + (floor * chance.Normal())) + Dirt(daysBeforeEnd);
        var hazy = inBottle > 1.35 * water.SaturationPpm && chance.Yes(0.6);
        var replicates = chance.Yes(0.03) ? 3 : chance.Yes(0.2) ? 2 : 1;
        for (var replicate = 1; replicate <= replicates; replicate++)
        {
            var ppm = Math.Max(1, (inBottle * (1 + (0.02 * chance.Normal()))) + (1.2 * chance.Normal()));
            yield return row with
            {
                Replicate = replicate,
                WaterPpm = ppm < 100 ? Math.Round(ppm, 1) : ppm < 10_000 ? Math.Round(ppm) : Fleet.Step(ppm, 10),
                Remark = hazy ? "hazy" : chance.Yes(0.015) ? "label smeared, tag read from the list" : null,
            };
        }
    }

    /// <summary>The bottle of the story, and one in a hundred and twenty besides; none among the newest, so that the stories stay apart.</summary>
    private double Dirt(double daysBeforeEnd)
    {
        if (!dirtyTaken && daysBeforeEnd <= unit.DirtyBottleDay)
        {
            dirtyTaken = true;
            return 860;
        }

        return chance.Yes(0.008) && daysBeforeEnd > 1.5 * unit.SampleDays ? chance.Between(80, 600) : 0;
    }

    private double InBottlePpm(string point)
    {
        var suspended = water.FastPpm + water.FinePpm;
        var slug = point switch
        {
            // the bottle may catch some of what stands below
            "bottom" when water.SettledL > 0.004 * unit.OilL && chance.Yes(0.35) => chance.Between(300, 2500),
            "drain" when water.SettledL > 0.001 * unit.OilL => chance.Between(3000, 20_000),
            _ => 0,
        };
        return water.DissolvedPpm + (suspended * point switch { "return" => 1.15, "bottom" => 1.4, "drain" => 1.5, _ => 1 }) + slug;
    }

    private string Point()
    {
        if (chance.Yes(unit.Rhythm == Rhythm.Standing ? 0.6 : 0.8))
        {
            return mainPoint;
        }

        return unit.CirculationLPerMin is null ? "bottom" : unit.DrainDays > 0 ? chance.Pick(["tank", "return", "bottom", "drain"]) : chance.Pick(["tank", "return", "bottom"]);
    }

    private string Method()
    {
        var family = Fluids.Of(unit.Fluid).Family;
        if (unit.OilL < 100 && family is "mineral" or "pao" && chance.Yes(0.14))
        {
            return "crackle";
        }

        if (unit.Service.EndsWith("hydraulics", StringComparison.Ordinal) && chance.Yes(0.1))
        {
            return "activity-sensor";
        }

        return family switch
        {
            "pag" or "phosphate-ester" => chance.Yes(0.7) ? "kf-volumetric" : "kf-evaporator",
            "ester" => chance.Yes(0.5) ? "kf-volumetric" : "kf-evaporator",
            "mineral" or "pao" when unit.Fluid.Contains('G', StringComparison.Ordinal) || unit.Fluid.StartsWith("CIRC", StringComparison.Ordinal) => chance.Yes(0.75) ? "kf-evaporator" : "kf-coulometric",
            _ => chance.Yes(0.9) ? "kf-coulometric" : "kf-volumetric",
        };
    }
}
