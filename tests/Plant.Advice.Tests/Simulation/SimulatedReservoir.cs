namespace Plant.Advice.Tests.Simulation;

/// <summary>One hour of truth.</summary>
/// <param name="WaterPpm">Water in the circulating oil [mg/kg].</param>
/// <param name="SettledL">Settled water [L].</param>
/// <param name="UsualIngressGPerDay">Ingress without the scatter of the hour [g/day].</param>
internal readonly record struct TrueHour(double WaterPpm, double SettledL, double UsualIngressGPerDay);

/// <summary>An invented reservoir: what is recorded of it, and what is true.</summary>
internal sealed class SimulatedReservoir
{
    /// <summary>The first hour.</summary>
    public static readonly DateTime Start = new(2024, 1, 1, 0, 0, 0, DateTimeKind.Utc);

    private const double WaterKgPerL = 0.998;
    private const double AirK = 293.15;

    private readonly Draw draw;
    private readonly PlantKind kind;
    private readonly double saturationShift, exchangePerDay, clearingPerDay, slowShare, slowClearingPerDay, redissolvingPerDay, drainShare, swingK;
    private readonly double usualPpmPerDay, runningC, coldestC, humidity, massKg, volumeL;
    private readonly List<WaterSample> samples = [];
    private readonly List<Drain> drains = [];
    private readonly List<TrueHour> hours = [];
    private readonly double sampleEveryDays;
    private readonly int drainEveryDays;
    private double dissolvedPpm, fastPpm, slowPpm, settledL, scatter, leak = 1, standUntil = -1, leakUntil = -1, nextSample, nextDrain;
    private int bottles;

    public SimulatedReservoir(PlantKind kind, int seed)
    {
        this.kind = kind;
        draw = new Draw(seed);
        volumeL = 200 * Math.Exp(draw.Uniform() * 3.5);
        massKg = volumeL * 0.87;
        runningC = 35 + (30 * draw.Uniform());
        coldestC = 5 + (17 * draw.Uniform());
        humidity = 0.3 + (0.5 * draw.Uniform());
        var open = draw.Uniform() < 0.6;
        saturationShift = Math.Pow(10, 0.06 * draw.Normal());
        exchangePerDay = open ? 0.01 * Math.Exp(draw.Normal()) : 0.0008 * Math.Exp(1.2 * draw.Normal());
        clearingPerDay = 2 * Math.Exp(1.2 * draw.Normal());
        slowShare = kind.FastPools ? Math.Min(0.5, 0.06 * Math.Exp(0.9 * draw.Normal())) : 0;
        slowClearingPerDay = 0.25 * Math.Exp(0.8 * draw.Normal());
        redissolvingPerDay = 0.15 * Math.Exp(0.9 * draw.Normal());
        drainShare = Math.Clamp(0.9 + (0.08 * draw.Normal()), 0.4, 1);
        swingK = kind.SwingK * draw.Uniform();
        usualPpmPerDay = kind.IngressMedianPpmPerDay * Math.Exp(1.3 * draw.Normal());
        sampleEveryDays = new[] { 14.0, 30, 30, 60 }[draw.Index(4)];
        drainEveryDays = kind.DrainDays[draw.Index(kind.DrainDays.Length)];
        nextSample = 24 * sampleEveryDays * draw.Uniform();
        nextDrain = drainEveryDays == 0 ? double.PositiveInfinity : 24 * drainEveryDays * draw.Uniform();
        dissolvedPpm = Saturation(runningC) * (0.2 + (0.6 * draw.Uniform()));
        Blank = new ReservoirHistory
        {
            Tag = FormattableString.Invariant($"S-{seed}"),
            Fluid = Oils.Turbine,
            Shape = Plant.Physics.Tanks.TankShape.Rectangular,
            OilVolumeL = volumeL,
            OperatingTemperatureC = runningC,
            ColdestTemperatureC = coldestC,
            HeadspaceRhPercent = 100 * humidity,
            Breather = open ? Breather.Open : Breather.Sealed,
            WaterCapacityL = 0.01 * volumeL,
            WaterLimitPpm = 300,
        };
    }

    /// <summary>The reservoir without any record.</summary>
    public ReservoirHistory Blank { get; }

    /// <summary>What is recorded so far.</summary>
    public ReservoirHistory History => Blank with { Samples = [.. samples], Drains = [.. drains] };

    /// <summary>Truth by the hour.</summary>
    public IReadOnlyList<TrueHour> Hours => hours;

    /// <summary>Settled water that does harm [L].</summary>
    public double CapacityL => Blank.WaterCapacityL!.Value;

    /// <summary>The time now.</summary>
    public DateTime Now => Start.AddHours(hours.Count);

    /// <summary>Water held and given away so far against water put in [mg/kg of oil]; zero when nothing is lost.</summary>
    public double Imbalance => Held + GoneOut - CameIn;

    /// <summary>True where the plant drains by its own habit; false where somebody else decides.</summary>
    public bool DrainsByHabit { get; private set; } = true;

    /// <summary>From now on somebody else decides on drains.</summary>
    public void StopHabit() => DrainsByHabit = false;

    private double GoneOut { get; set; }

    private double CameIn { get; set; }

    private double Held => dissolvedPpm + fastPpm + slowPpm + (settledL * WaterKgPerL / massKg * 1e6);

    /// <summary>Lives on for some days.</summary>
    public SimulatedReservoir Live(double days)
    {
        if (hours.Count == 0)
        {
            CameIn = Held;
        }

        for (var end = hours.Count + (int)(24 * days); hours.Count < end;)
        {
            Hour();
        }

        return this;
    }

    /// <summary>Lets the water out.</summary>
    public void DrainNow()
    {
        var taken = settledL * Math.Clamp(drainShare + (0.05 * draw.Normal()), 0.3, 1);
        settledL -= taken;
        GoneOut += taken * WaterKgPerL / massKg * 1e6;
        drains.Add(new Drain(Now, Math.Max(0, Math.Round(taken * (1 + (0.04 * draw.Normal())), 2)), 0.3));
    }

    private void Hour()
    {
        var hour = hours.Count;
        Events(hour);
        var cold = hour < standUntil;
        var temperatureC = cold ? coldestC : runningC + (swingK * Math.Sin(hour * Math.PI / 12));
        ComeIn(temperatureC);
        Settle(Saturation(temperatureC), cold);
        hours.Add(new TrueHour(dissolvedPpm + fastPpm + slowPpm, settledL, usualPpmPerDay * leak * massKg / 1000));
        if (hour >= nextSample && !cold)
        {
            Sample();
            nextSample += 24 * sampleEveryDays * (0.8 + (0.4 * draw.Uniform()));
        }

        if (hour >= nextDrain && DrainsByHabit)
        {
            DrainNow();
            nextDrain += 24 * drainEveryDays * (0.9 + (0.2 * draw.Uniform()));
        }
    }

    private void Events(int hour)
    {
        if (hour > standUntil && draw.Uniform() < 1 / (24 * kind.StandEveryDays))
        {
            standUntil = hour + (kind.StandHours * (0.5 + draw.Uniform()));
        }

        if (hour > leakUntil)
        {
            leak = 1;
            if (draw.Uniform() < kind.LeakPerYear / 8760)
            {
                leak = 2 * Math.Exp(draw.Uniform() * Math.Log(30));
                leakUntil = hour + (24 * 150 * -Math.Log(1 - draw.Uniform()));
            }
        }
    }

    private void ComeIn(double temperatureC)
    {
        scatter = (0.994 * scatter) + (0.3 * Math.Sqrt(1 - (0.994 * 0.994)) * draw.Normal());
        var ingress = usualPpmPerDay * leak * Math.Exp(scatter) / 24;
        var rest = Saturation(temperatureC) * humidity * VapourPa(AirK) / VapourPa(temperatureC + 273.15);
        var breathed = exchangePerDay / 24 * (dissolvedPpm - rest);
        dissolvedPpm += ingress - breathed;
        CameIn += ingress;
        GoneOut += breathed;
    }

    private void Settle(double saturationPpm, bool cold)
    {
        if (dissolvedPpm > saturationPpm)
        {
            var excess = dissolvedPpm - saturationPpm;
            dissolvedPpm = saturationPpm;
            slowPpm += slowShare * excess;
            fastPpm += (1 - slowShare) * excess;
        }
        else
        {
            var want = (saturationPpm - dissolvedPpm) * redissolvingPerDay / 24;
            var fromHaze = Math.Min(want * 4, fastPpm + slowPpm);
            var share = fastPpm + slowPpm > 0 ? fromHaze / (fastPpm + slowPpm) : 0;
            fastPpm -= share * fastPpm;
            slowPpm -= share * slowPpm;
            var fromBottom = cold ? 0 : Math.Min(want * 0.3, settledL * WaterKgPerL / massKg * 1e6);
            settledL -= fromBottom * massKg / 1e6 / WaterKgPerL;
            dissolvedPpm += fromHaze + fromBottom;
        }

        var still = cold ? 2 : 1;
        var fast = fastPpm * (1 - Math.Exp(-clearingPerDay * still / 24));
        var slow = slowPpm * (1 - Math.Exp(-slowClearingPerDay * still / 24));
        fastPpm -= fast;
        slowPpm -= slow;
        settledL += (fast + slow) * massKg / 1e6 / WaterKgPerL;
    }

    private void Sample()
    {
        var truth = dissolvedPpm + fastPpm + slowPpm;
        var found = (truth * (1 + (0.07 * draw.Normal()))) + (5 * draw.Normal());
        if (draw.Uniform() < kind.GrossErrorShare)
        {
            found += 1000 * draw.Uniform();
        }

        samples.Add(new WaterSample(FormattableString.Invariant($"b{++bottles}"), 1, Now, Now.AddDays(1 + (4 * draw.Uniform())), SamplePoint.Return,
            null, WaterMethod.KfCoulometric, Math.Max(1, Math.Round(found, 1)), null, null));
    }

    private double Saturation(double temperatureC) => saturationShift * Math.Pow(10, Oils.Turbine.SolubilityA!.Value - (Oils.Turbine.SolubilityB!.Value / (temperatureC + 273.15)));

    // Magnus form: only the ratio of two pressures matters here
    private static double VapourPa(double temperatureK) => 611.2 * Math.Exp(17.62 * (temperatureK - 273.15) / (temperatureK - 273.15 + 243.12));
}
