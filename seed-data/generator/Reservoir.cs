namespace Skarrow;

/// <summary>Where the water of one reservoir is, followed in steps of two hours. Water is conserved but for rounding.</summary>
public sealed class Reservoir
{
    public const int StepHours = 2;
    private const double StepDays = StepHours / 24.0;
    private const double GramsPerLitre = 998;

    private readonly Unit unit;
    private readonly FluidSheet fluid;
    private readonly Chance chance;
    private readonly DateTime end;
    private readonly double saturationScale;
    private readonly double exchangePerDay;
    private readonly double usualGPerDay;
    private readonly double capacityL;
    private readonly IReadOnlyList<(SeparatorSheet Sheet, Run Run)> runs;
    private double burst = 1;
    private double absorbedL;
    private int side = 1;

    public Reservoir(Unit unit, DateTime start, DateTime end, IReadOnlyList<(SeparatorSheet Sheet, Run Run)> runs)
    {
        this.unit = unit;
        this.end = end;
        this.runs = runs;
        fluid = Fluids.Of(unit.Fluid);
        chance = new Chance(unit.Tag + " water");
        MassKg = unit.OilL * fluid.DensityKgM3(unit.OperatingC) / 1000;
        saturationScale = chance.LogNormal(1, 0.08);
        exchangePerDay = chance.LogNormal(unit.Breather switch { "open" => 0.02, "dry-purge" => 0.03, "desiccant" => 0.006, _ => 0.0008 }, 0.4) * (unit.Rhythm == Rhythm.Always ? 0.15 : 1);
        var usualRisePpm = unit.Fill * Math.Min(fluid.SaturationPpm(unit.ColdestC), 1200);
        usualGPerDay = exchangePerDay * usualRisePpm * MassKg / 1000;
        capacityL = unit.SuctionMm is { } suction ? unit.OilL * suction / (0.72 * unit.HeightMm) : 0.12 * unit.OilL;
        TemperatureC = unit.OperatingC;
        SettledL = unit.SettledAtStartL;
        DissolvedPpm = Math.Min((SaturationPpm * HeadspaceActivity(start)) + usualRisePpm, 0.97 * SaturationPpm);
    }

    public double MassKg { get; }

    public double TemperatureC { get; private set; }

    public double DissolvedPpm { get; private set; }

    public double FastPpm { get; private set; }

    public double FinePpm { get; private set; }

    public double SettledL { get; private set; }

    public double TotalPpm => DissolvedPpm + FastPpm + FinePpm;

    public double SaturationPpm => fluid.SaturationPpm(TemperatureC) * saturationScale;

    public double SaturationColdPpm => fluid.SaturationPpm(unit.ColdestC) * saturationScale;

    private double LitresPerPpm => MassKg / 1000 / GramsPerLitre;

    public void Step(DateTime time)
    {
        if (time.Hour == 0)
        {
            burst = chance.LogNormal(0.9, 0.5);
        }

        var runs = MillCalendar.Runs(unit.Rhythm, time);
        Warm(time, runs);
        ComeIn(time, runs);
        Breathe(time);
        Dissolve(runs);
        Settle(runs);
        Separate(time);
    }

    /// <summary>Takes most of what stands there.</summary>
    public double Drain()
    {
        var taken = SettledL * Math.Clamp(0.9 + (0.04 * chance.Normal()), 0.7, 0.99);
        SettledL -= taken;
        return taken;
    }

    public void TopUp(double litres, double ppm)
    {
        var kept = 1 - (litres / unit.OilL);
        DissolvedPpm = (DissolvedPpm * kept) + (ppm * (1 - kept));
        FastPpm *= kept;
        FinePpm *= kept;
    }

    private void Warm(DateTime time, bool runs)
    {
        var season = MillCalendar.Season(time);
        var target = unit.Rhythm == Rhythm.Standing
            ? unit.OperatingC + ((unit.OperatingC - unit.ColdestC) * 0.93 * season) + (0.4 * Math.Sin(2 * Math.PI * time.TimeOfDay.TotalDays))
            : runs ? unit.OperatingC + (1.5 * season) + (0.8 * Math.Sin(2 * Math.PI * (time.TimeOfDay.TotalDays - 0.4))) : unit.ColdestC + 3 + (3 * season);
        var days = 0.25 * Math.Pow(unit.OilL / 500, 0.3);
        TemperatureC += (target - TemperatureC) * (1 - Math.Exp(-StepDays / days));
    }

    private void ComeIn(DateTime time, bool runs)
    {
        var working = runs || unit.Rhythm == Rhythm.Standing ? 1 : 0.15;
        var before = (end - time).TotalDays;
        var grams = usualGPerDay * burst * (0.7 + (0.6 * MillCalendar.Wetness(time)));
        foreach (var leak in unit.Leaks.Where(l => before <= l.FromDay && before > l.ToDay))
        {
            var passed = (leak.FromDay - before) / (leak.FromDay - leak.ToDay);
            grams += leak.StartGPerDay * Math.Pow(leak.EndGPerDay / leak.StartGPerDay, passed) * (0.8 + (0.2 * burst));
        }

        var ppm = grams * working * StepDays / MassKg * 1000;
        FinePpm += ppm * unit.FineShare;
        FastPpm += ppm * (1 - unit.FineShare);
    }

    private double HeadspaceActivity(DateTime time)
    {
        var outdoors = unit.Area is "Tank farm" or "Transformers" || unit.ColdestC < 8;
        var air = outdoors ? MillCalendar.OutdoorC(time) : 23 + (4 * MillCalendar.Season(time));
        var humidity = unit.Breather switch { "dry-purge" => 0.04, "desiccant" => 0.2, _ => (unit.RhPercent ?? 50) / 100 };
        if ((end - time).TotalDays <= unit.BreatherFailsDay)
        {
            // mist of the wet end, thicker in the wet season
            (air, humidity) = (31.5, 0.55 + (0.42 * MillCalendar.Wetness(time)));
        }

        return Math.Min(1, humidity * VapourPressurePa(air) / VapourPressurePa(TemperatureC));
    }

    private void Breathe(DateTime time)
    {
        var rate = (end - time).TotalDays <= unit.BreatherFailsDay ? 0.06 : exchangePerDay;
        DissolvedPpm += rate * StepDays * ((SaturationPpm * HeadspaceActivity(time)) - DissolvedPpm);
    }

    private void Dissolve(bool runs)
    {
        var saturation = SaturationPpm;
        var lack = Math.Max(0, 1 - (DissolvedPpm / saturation));
        var taken = 1 - Math.Exp(-5 * lack * StepDays);
        var up = Math.Min((FastPpm + FinePpm) * taken, saturation * lack);
        var share = FastPpm + FinePpm > 0 ? up / (FastPpm + FinePpm) : 0;
        FastPpm *= 1 - share;
        FinePpm *= 1 - share;
        var fromBelow = Math.Min(SettledL / LitresPerPpm, (runs ? 0.04 : 0.01) * saturation * lack * StepDays);
        SettledL -= fromBelow * LitresPerPpm;
        DissolvedPpm += up + fromBelow;
        var surplus = DissolvedPpm - saturation;
        if (surplus > 0)
        {
            DissolvedPpm = saturation;
            FinePpm += surplus * unit.FineShare;
            FastPpm += surplus * (1 - unit.FineShare);
        }
    }

    private void Settle(bool runs)
    {
        var difference = fluid.DensityDifference(TemperatureC);
        var thickness = Math.Min(1, 46 / fluid.ViscosityMm2S(TemperatureC));
        var stability = Math.Min(1, 30 / (fluid.Demulsibility ?? 30));
        var rate = Math.Abs(difference) < 5 ? 0 : Math.Min(8, 4 * unit.Clearing * stability * thickness * Math.Abs(difference) / 130 * (runs ? 1 : 1.6));
        var fast = FastPpm * (1 - Math.Exp(-rate * StepDays));
        var fine = FinePpm * (1 - Math.Exp(-0.1 * rate * StepDays));
        FastPpm -= fast;
        FinePpm -= fine;
        SettledL += (fast + fine) * LitresPerPpm;

        // a layer that finds itself on the wrong side breaks up; so does what stands above the suction
        var now = Math.Sign(difference);
        var stirred = now != side && Math.Abs(difference) >= 5 ? SettledL * (1 - Math.Exp(-2 * StepDays)) : Math.Max(0, SettledL - capacityL) * 0.3;
        side = SettledL - stirred < 0.01 ? now : side;
        SettledL -= stirred;
        FastPpm += stirred / LitresPerPpm;
    }

    private void Separate(DateTime time)
    {
        var before = (end - time).TotalDays;
        foreach (var (sheet, run) in runs)
        {
            if (before > run.FromDay || before <= (run.ToDay ?? double.NegativeInfinity))
            {
                continue;
            }

            var passes = (sheet.Efficiency ?? 0.6) * (sheet.FlowLPerMin ?? 0) * 1440 / unit.OilL * StepDays;
            var stays = Math.Exp(-passes);
            switch (sheet.Kind)
            {
                case "vacuum-dehydrator":
                    var hot = sheet.OilTemperatureC ?? 60;
                    var floor = fluid.SaturationPpm(hot) * Math.Min(1, (sheet.PressureKPa ?? 6) * 1000 / VapourPressurePa(hot));
                    DissolvedPpm = Math.Min(DissolvedPpm, floor + ((DissolvedPpm - floor) * stays));
                    Catch(stays, stays);
                    break;
                case "absorbent" when absorbedL < (sheet.CapacityL ?? 10):
                    var had = TotalPpm;
                    DissolvedPpm = Math.Min(DissolvedPpm, (0.5 * SaturationPpm) + ((DissolvedPpm - (0.5 * SaturationPpm)) * stays));
                    Catch(stays, stays);
                    absorbedL += (had - TotalPpm) * LitresPerPpm;
                    break;
                case "dry-air-purge":
                    DissolvedPpm += 0.2 * StepDays * ((0.05 * SaturationPpm) - DissolvedPpm);
                    break;
                case "coalescer" or "electrostatic-coalescer" or "centrifuge":
                    Catch(stays, Math.Exp(-0.3 * passes));
                    break;
            }
        }
    }

    private void Catch(double fastStays, double fineStays)
    {
        FastPpm *= fastStays;
        FinePpm *= fineStays;
    }

    /// <summary>Magnus, with the constants of the WMO: good to half a percent up to 60 °C, enough for weather and sumps.</summary>
    private static double VapourPressurePa(double celsius) => 611.2 * Math.Exp(17.62 * celsius / (243.12 + celsius));
}
