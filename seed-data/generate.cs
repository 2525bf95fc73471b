#:property RestorePackagesWithLockFile=false
// Makes the demo plant: an invented board mill with its own power house. Deterministic; independent of the program's formulas, so that
// the data are not made by what judges them.
//
//   dotnet run seed-data/generate.cs                          writes the CSV files beside this one
//   dotnet run seed-data/generate.cs -- --end 2026-11-30      with another last day
//
// Each reservoir is run in steps of six hours: water comes in, is breathed in and out, dissolves up to the saturation at the actual
// temperature, hazes above it, settles, is drained; the laboratory sees it late, with scatter and now and then a dirty bottle.
// The stories worth finding are told in STORIES.md.
using System.Globalization;
using System.Text;

var folder = Path.GetDirectoryName(Environment.GetCommandLineArgs()[0]) is { Length: > 0 } ? "seed-data" : ".";
var end = new DateTime(2026, 11, 30, 0, 0, 0, DateTimeKind.Utc);
for (var i = 0; i < args.Length - 1; i++)
{
    if (args[i] == "--out")
    {
        folder = args[i + 1];
    }
    else if (args[i] == "--end")
    {
        end = DateTime.ParseExact(args[i + 1], "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal | DateTimeStyles.AdjustToUniversal);
    }
}

Directory.CreateDirectory(folder);
var plant = new Mill(end);
plant.Build();
plant.Write(folder);
Console.WriteLine($"{plant.ReservoirCount} reservoirs, {plant.SampleCount} results written to {folder}");

sealed record Fluid(string Code, string Name, string Family, double? Vg, double? V40, double? V100, double? Rho, double? Gamma, double? A, double? B, double? Ift, double? Eps, double? Sigma, double? Demuls, double? Limit)
{
    // what the fluid truly holds: a little off its sheet
    public double TrueA { get; init; } = A ?? 6.9;

    public double TrueB { get; init; } = B ?? 1400;

    public double Saturation(double celsius) => Math.Pow(10, TrueA - (TrueB / (celsius + 273.15)));
}

/// <summary>One kind of reservoir of the mill.</summary>
sealed record Kind(string Prefix, string Name, string Area, string Service, string Fluid, string Shape, double VolumeLow, double VolumeHigh, double Warm, double Cold, double Humidity, string Breather, double IngressPpmPerDay, int Criticality, double ClearingPerDay, bool Circulates = true);

sealed class Tank
{
    public required string Tag;
    public required Kind Kind;
    public required Fluid Fluid;
    public double Volume, Length, Width, Height, Suction, Warm, Cold, Humidity, Ingress, Clearing;
    public double? Limit, Capacity, Circulation;
    public string Breather = "open";
    public double DrainEveryDays = 30, SampleEveryDays = 31;
    public DateTime LastSampleBy = DateTime.MaxValue;
    public DateTime Commissioned;
    public bool Sensor, Floats, NeverSampled, DirtyBottle;
    public Func<double, double> IngressFactor = _ => 1; // by day
    public Func<double, double> HumidityFactor = _ => 1;
}

sealed class Mill(DateTime end)
{
    private const int Days = 730;
    private readonly Random random = new(20261130);
    private readonly DateTime start = end.AddDays(-Days);
    private readonly List<Tank> tanks = [];
    private readonly List<(string Key, string Row)> samples = [], drains = [], topUps = [], runs = [], readings = [];
    private readonly List<string> separators = [];
    private readonly Dictionary<string, Fluid> fluids = new()
    {
        ["TB32"] = new("TB32", "Turbine oil 32", "mineral", 32, 31.6, 5.4, 864, null, 7.02, 1500, 34, 2.2, 4, 8, 300) { TrueA = 7.04 },
        ["TB46"] = new("TB46", "Turbine oil 46", "mineral", 46, 45.8, 6.8, 868, null, 7.02, 1500, 33, 2.2, 5, 10, 300),
        ["HL46"] = new("HL46", "Hydraulic oil 46", "mineral", 46, 46.2, 6.9, 874, null, 6.89, 1400, 27, 2.2, 60, 18, 400) { TrueA = 6.86 },
        ["CP220"] = new("CP220", "Circulating oil 220", "mineral", 220, 218, 18.9, 892, null, 6.62, 1240, 24, 2.3, 120, 22, 500),
        ["GL320"] = new("GL320", "Gear oil 320", "mineral", 320, 322, 24.1, 899, null, null, null, 20, 2.3, 300, 28, 600),
        ["GL320X"] = new("GL320X", "Gear oil 320, aged", "mineral", 320, 331, 24.6, 902, null, 6.62, 1200, 9, 2.4, 900, 75, 600),
        ["PA46"] = new("PA46", "Synthetic compressor oil 46", "pao", 46, 46.5, 7.9, 838, null, 7.07, 1500, 31, 2.1, 3, 9, 250),
        ["ES46"] = new("ES46", "Ester hydraulic fluid 46", "ester", 46, 47, 9.3, 921, 7.5e-4, 5.69, 700, 14, 3.2, 1500, 25, 1000),
        ["PE46"] = new("PE46", "Phosphate ester control fluid", "phosphate-ester", 46, 44, 5.3, 1142, 6.9e-4, 5.4447, 600, 18, 6.0, 9000, null, 1000),
        ["PG460"] = new("PG460", "Polyglycol 460, dense", "pag", 460, 455, 72, 1056, 7.4e-4, 5.84, 400, 8, 6.0, 20000, null, 8000),
        ["PG220"] = new("PG220", "Polyglycol 220, not water-soluble", "pag", 220, 222, 41, 1005, 7.8e-4, 5.84, 400, 9, 5.8, 18000, null, 8000),
        ["PG46S"] = new("PG46S", "Polyglycol 46, water-soluble", "pag", 46, 46, 9.5, 1042, 7.4e-4, null, null, null, null, null, null, 20000),
        ["NE36"] = new("NE36", "Natural ester insulating liquid", "natural-ester", null, 34.5, 8.1, 920, 7.3e-4, 5.3318, 684, 25, 3.1, 30, null, 350),
        ["SI50"] = new("SI50", "Silicone fluid 50", "silicone", null, 38, 16, 962, 1.0e-3, 7.3956, 1500, 40, 2.7, 1, null, 100),
        ["TR10"] = new("TR10", "Insulating oil", "transformer-mineral", 10, 9.5, 2.5, 881, null, 7.0895, 1567, 42, 2.2, 1, null, 30),
        ["DS2"] = new("DS2", "Standby diesel", "diesel", null, 2.8, 1.2, 836, null, 6.9619, 1500, 22, 2.1, 80, 6, 200),
    };

    public int ReservoirCount => tanks.Count;

    public int SampleCount => samples.Count;

    public void Build()
    {
        Kind[] kinds =
        [
            new("PU", "Pulper gearbox", "Pulp line", "pulper gearbox", "GL320", "rectangular", 180, 420, 58, 16, 65, "open", 6, 3, 0.6),
            new("RF", "Refiner lube unit", "Pulp line", "refiner bearings", "CP220", "rectangular", 600, 1500, 52, 15, 70, "open", 5, 4, 0.9),
            new("WE", "Wet-end lube station", "Wet end", "wet-end bearings", "CP220", "rectangular", 3000, 9000, 50, 18, 80, "open", 5, 4, 0.9),
            new("PH", "Press hydraulic unit", "Wet end", "press loading", "HL46", "rectangular", 700, 2600, 46, 17, 70, "desiccant", 1.2, 4, 1.6),
            new("DL", "Dryer lube station", "Dryer section", "dryer bearings", "CP220", "rectangular", 5000, 14000, 58, 20, 75, "open", 6, 5, 1.1),
            new("CH", "Calender hydraulics", "Dryer section", "calender loading", "ES46", "rectangular", 500, 1600, 48, 19, 55, "desiccant", 6, 4, 1.0),
            new("WH", "Winder hydraulics", "Converting", "winder", "HL46", "rectangular", 300, 1500, 44, 16, 50, "desiccant", 0.8, 3, 1.6),
            new("SC", "Screw compressor", "Converting", "plant air", "PA46", "horizontal-cylinder", 90, 260, 78, 14, 60, "sealed", 0.25, 3, 1.8),
            new("TG", "Turbine lube tank", "Power house", "steam turbine", "TB46", "horizontal-cylinder", 6000, 12000, 55, 16, 65, "dry-purge", 1.6, 5, 2.0),
            new("FP", "Feed pump lube unit", "Power house", "boiler feed pump", "TB32", "rectangular", 250, 900, 50, 15, 60, "open", 2.0, 4, 2.0),
            new("SD", "Standby diesel tank", "Tank farm", "standby generator", "DS2", "horizontal-cylinder", 900, 6000, 18, 2, 75, "open", 0.5, 4, 3.0, false),
            new("TF", "Bulk oil tank", "Tank farm", "new oil", "HL46", "vertical-cylinder", 4000, 9000, 20, 4, 70, "open", 0.3, 2, 1.0, false),
            new("TX", "Unit transformer", "Transformers", "unit transformer", "TR10", "rectangular", 5000, 18000, 45, 6, 30, "sealed", 0.03, 5, 1.0, false),
        ];
        var number = 101;
        for (var round = 0; round < 11; round++)
        {
            foreach (var kind in kinds)
            {
                tanks.Add(Make(kind, number++));
            }
        }

        Special("EH-301", "EHC control fluid unit", "Power house", "turbine control", "PE46", "rectangular", 900, 50, 20, 45, "desiccant", 9, 5);
        Special("GB-302", "Kiln drive gearbox", "Pulp line", "main drive", "PG460", "rectangular", 420, 62, 12, 70, "open", 8200, 4).Floats = true;
        Special("GB-303", "Conveyor drive gearbox", "Converting", "reel drive", "PG220", "rectangular", 260, 58, 8, 70, "open", 60, 3);
        Special("GB-304", "Agitator drive, soluble fluid", "Pulp line", "agitator", "PG46S", "rectangular", 150, 48, 12, 70, "open", 300, 2);
        Special("TX-305", "Auxiliary transformer, natural ester", "Transformers", "auxiliary transformer", "NE36", "rectangular", 2600, 48, 4, 30, "sealed", 0.3, 4);
        Special("TX-306", "Rectifier transformer, silicone", "Transformers", "rectifier", "SI50", "vertical-cylinder", 1900, 45, 4, 35, "sealed", 0.1, 3);
        Special("GB-307", "Couch roll gearbox, aged oil", "Wet end", "couch roll", "GL320X", "rectangular", 380, 60, 18, 80, "open", 160, 4).Clearing = 0.08;
        Stories();
        foreach (var tank in tanks)
        {
            Run(tank);
        }
    }

    private Tank Find(string tag) => tanks.Find(t => t.Tag == tag) ?? throw new InvalidOperationException($"no {tag}");

    private void Stories()
    {
        double Day(int daysBeforeEnd) => Days - daysBeforeEnd;
        var cooler = Find("DL-105");
        cooler.IngressFactor = day => day < Day(118) ? 1 : 60;
        cooler.Ingress = 2.2;
        cooler.Capacity = 60;
        var gland = Find("TG-109");
        gland.IngressFactor = day => 1 + (24 * Math.Clamp((day - Day(420)) / 420, 0, 1));
        gland.Ingress = 1.8;
        var breather = Find("PH-117");
        breather.HumidityFactor = day => day > Day(170) ? 2.2 : 1;
        breather.IngressFactor = day => day > Day(170) ? 14 : 1;
        breather.Ingress = 0.15;
        var flat = Find("FP-123");
        flat.Ingress = 30;
        flat.Capacity = 4;
        flat.DrainEveryDays = 120;
        var diesel = Find("SD-111");
        diesel.Ingress = 7;
        diesel.Capacity = 6;
        diesel.DrainEveryDays = 150;
        var transformer = Find("TX-126");
        transformer.Ingress = 0.12;
        foreach (var (tag, ingress, capacity) in new[] { ("WE-116", 11.0, 14.0), ("DL-131", 10, 22), ("SD-150", 6, 3), ("RF-128", 13, 2.5), ("WE-142", 12, 18), ("FP-149", 22, 1.5), ("DL-157", 8, 16), ("PU-153", 14, 0.8) })
        {
            (Find(tag).Ingress, Find(tag).Capacity) = (ingress, capacity);
        }

        Find("WH-120").DirtyBottle = true;
        Find("RF-115").LastSampleBy = end.AddDays(-160);
        Find("SC-121").NeverSampled = true;
        foreach (var tag in new[] { "TG-109", "DL-105", "TG-122", "WE-103", "PH-104", "DL-118", "EH-301", "RF-102" })
        {
            Find(tag).Sensor = true;
        }

        // some that nobody got round to this autumn
        foreach (var tank in tanks.Where((_, i) => i % 13 == 6))
        {
            tank.LastSampleBy = Min(tank.LastSampleBy, end.AddDays(-75 - random.Next(40)));
        }
    }

    private static DateTime Min(DateTime one, DateTime other) => one < other ? one : other;

    private Tank Special(string tag, string name, string area, string service, string fluid, string shape, double volume, double warm, double cold, double humidity, string breather, double ingress, int criticality)
    {
        var kind = new Kind(tag[..2], name, area, service, fluid, shape, volume, volume, warm, cold, humidity, breather, ingress, criticality, 0.7);
        var tank = Make(kind, int.Parse(tag[3..], CultureInfo.InvariantCulture));
        tanks.Add(tank);
        return tank;
    }

    private Tank Make(Kind kind, int number)
    {
        var volume = Round(kind.VolumeLow + (random.NextDouble() * (kind.VolumeHigh - kind.VolumeLow)), 10);
        var full = volume / 0.8 / 1000; // m³
        double length = 0, width = 0, height;
        switch (kind.Shape)
        {
            case "rectangular":
                height = Math.Cbrt(full / 2.6);
                width = height * 1.2;
                length = full / height / width;
                break;
            case "horizontal-cylinder":
                height = Math.Cbrt(full * 4 / Math.PI / 2.2);
                length = full / (Math.PI / 4 * height * height);
                break;
            default:
                width = Math.Cbrt(full * 4 / Math.PI / 1.3);
                height = full / (Math.PI / 4 * width * width);
                break;
        }

        var tank = new Tank
        {
            Tag = $"{kind.Prefix}-{number}",
            Kind = kind,
            Fluid = fluids[kind.Fluid],
            Volume = volume,
            Length = Round(length * 1000, 5),
            Width = Round(width * 1000, 5),
            Height = Round((height * 1000) + 10, 5),
            Suction = Round(Math.Clamp(height * 1000 * (0.07 + (0.05 * random.NextDouble())), 25, 220), 5),
            Warm = Round(kind.Warm + (4 * Gauss()), 0.5),
            Humidity = Math.Clamp(Math.Round(kind.Humidity + (6 * Gauss())), 10, 95),
            Breather = kind.Breather,
            Ingress = kind.IngressPpmPerDay * 0.11 * Math.Exp(0.5 * Gauss()) * (random.NextDouble() < 0.11 ? 4 + (9 * random.NextDouble()) : 1),
            Clearing = kind.ClearingPerDay * Math.Exp(0.3 * Gauss()),
            Circulation = kind.Circulates ? Round(volume / (8 + (8 * random.NextDouble())), 1) : null,
            Commissioned = new DateTime(2008 + random.Next(15), 1 + random.Next(12), 1 + random.Next(28), 6, 0, 0, DateTimeKind.Utc),
            SampleEveryDays = kind.Prefix is "TX" or "TF" or "SD" ? 91 : 31,
            DrainEveryDays = kind.Prefix is "TX" ? 365 : kind.Prefix is "PH" or "WH" or "CH" or "TF" ? 61 : 30,
        };
        tank.Cold = Round(Math.Min(tank.Warm - 3, kind.Cold + (2 * Gauss())), 0.5);
        if (random.NextDouble() < 0.12)
        {
            tank.Limit = kind.Prefix == "TX" ? 25 : Round((tank.Fluid.Limit ?? 300) * 0.8, 10);
        }

        if (random.NextDouble() < 0.7 && kind.Prefix is not ("GB" or "TX"))
        {
            // a drain boot below the floor holds what the plant lets stand
            tank.Capacity = Round(Math.Max(0.8, volume * (0.003 + (0.004 * random.NextDouble()))), volume > 1000 ? 1 : 0.1);
        }

        return tank;
    }

    /// <summary>Two years of one reservoir, six hours at a time. Amounts in mg/kg of oil.</summary>
    private void Run(Tank tank)
    {
        var density = tank.Fluid.Rho ?? 870;
        var mass = tank.Volume * density / 1000;
        var soluble = tank.Fluid.Family == "pag" && tank.Fluid.A is null;
        double dissolved = soluble ? 4000 : tank.Fluid.Saturation(tank.Cold) * 0.4, haze = 0, settled = 0;
        var exchange = tank.Breather switch { "open" => 0.012, "desiccant" => 0.002, "dry-purge" => 0.01, _ => 0.0006 };
        var nextSample = start.AddDays(3 + random.Next(25));
        var nextDrain = start.AddDays(5 + random.Next(25));
        var nextTopUp = start.AddDays(60 + random.Next(60));
        var bottle = 0;
        var dirtyAt = tank.DirtyBottle ? end.AddDays(-170) : DateTime.MaxValue;
        for (var time = start; time < end; time = time.AddHours(6))
        {
            var day = (time - start).TotalDays;
            var running = !Stopped(time, tank.Kind.Circulates);
            var season = Math.Sin(2 * Math.PI * (time.DayOfYear - 105) / 365.0);
            var celsius = tank.Kind.Circulates ? (running ? tank.Warm + (2 * season) : tank.Cold + 2 + (2 * season)) : tank.Cold + ((tank.Warm - tank.Cold) * 0.5 * (1 + season));
            var saturation = soluble ? 1e9 : tank.Fluid.Saturation(celsius);
            const double step = 0.25;
            var ingress = tank.Ingress * tank.IngressFactor(day) * Math.Exp(0.25 * Gauss()) * (running ? 1 : 0.15);
            var humidity = Math.Clamp(tank.Humidity / 100 * tank.HumidityFactor(day) * (1 + (0.15 * season)), 0.02, 0.98);
            var rest = tank.Breather is "dry-purge" or "desiccant" && tank.HumidityFactor(day) <= 1 ? 0.04 * saturation : humidity * saturation * VapourShare(tank, celsius, season);
            dissolved += exchange * step * ((soluble ? 9000 : rest) - dissolved);

            // one part of what comes in falls straight to the bottom where the oil is wet
            var wet = Math.Clamp((dissolved / saturation) - 0.5, 0, 0.5);
            haze += ingress * step * (1 - (0.4 * wet));
            settled += ingress * step * 0.4 * wet;
            var take = Math.Min(haze, Math.Max(0, saturation - dissolved) * 0.9);
            dissolved += take;
            haze -= take;
            if (dissolved > saturation)
            {
                haze += dissolved - saturation;
                dissolved = saturation;
            }

            var fall = haze * (1 - Math.Exp(-tank.Clearing * step * (running ? 1 : 2.5)));
            haze -= fall;
            settled += fall;
            var back = running ? Math.Min(settled, Math.Max(0, saturation - dissolved) * 0.02 * step) : 0;
            dissolved += back;
            settled -= back;

            if (time >= nextTopUp)
            {
                var oil = Round(tank.Volume * (0.005 + (0.02 * random.NextDouble())), 0.5);
                dissolved *= 1 - (oil / tank.Volume * 0.8);
                topUps.Add(($"{tank.Tag}|{time:s}", Row(tank.Tag, Time(time.AddMinutes(random.Next(200))), oil, random.NextDouble() < 0.5 ? Math.Round(20 + (30 * random.NextDouble())) : null)));
                nextTopUp = time.AddDays(80 + random.Next(90));
            }

            if (time >= nextDrain && time.Hour == 12 && tank.Kind.Prefix != "TX" && !soluble)
            {
                var water = settled * mass / 1e6;
                var out_ = water * Math.Clamp(0.9 + (0.06 * Gauss()), 0.6, 1);
                settled -= out_ / mass * 1e6;
                drains.Add(($"{tank.Tag}|{time:s}", Row(tank.Tag, Time(time.AddMinutes(-random.Next(240))), out_ < 0.015 ? 0 : Math.Round(out_, out_ < 1 ? 2 : 1), Math.Round(0.1 + (0.5 * random.NextDouble()), 2))));
                nextDrain = time.AddDays(tank.DrainEveryDays * (0.85 + (0.3 * random.NextDouble())));
            }

            if (tank.Sensor && time > end.AddDays(-150))
            {
                readings.Add(($"{tank.Tag}|{time:s}", Row(tank.Tag, Time(time), Math.Round(celsius + (0.3 * Gauss()), 1), Math.Round(Math.Clamp((dissolved / tank.Fluid.Saturation(celsius)) + (0.012 * Gauss()), 0, 1), 3))));
            }

            if (time >= nextSample && running && time.Hour == 6)
            {
                if (time <= tank.LastSampleBy && !tank.NeverSampled)
                {
                    var dirty = time <= dirtyAt && dirtyAt < time.AddDays(tank.SampleEveryDays);
                    Sample(tank, time.AddMinutes(random.Next(300)), celsius, dissolved + haze, ++bottle, dirty, settled * mass / 1e6);
                }

                nextSample = time.AddDays(tank.SampleEveryDays * (0.8 + (0.4 * random.NextDouble())));
            }
        }
    }

    // the headspace is cooler than the oil: its water reaches the oil at a lower activity
    private static double VapourShare(Tank tank, double celsius, double season) =>
        Math.Clamp(Math.Exp(17.62 * (20 + (6 * season)) / (243.12 + 20 + (6 * season))) / Math.Exp(17.62 * celsius / (243.12 + celsius)), 0.01, 1);

    /// <summary>Weekend stops now and then, and the annual shutdown in April.</summary>
    private static bool Stopped(DateTime time, bool circulates) =>
        circulates && ((time.Month == 4 && time.Day is >= 6 and <= 19) || (time.DayOfWeek == DayOfWeek.Sunday && (time.DayOfYear / 7 % 3) == 0));

    private void Sample(Tank tank, DateTime taken, double celsius, double content, int bottle, bool dirty, double settledL)
    {
        var point = random.NextDouble() switch { < 0.72 => "return", < 0.95 => "tank", _ => "bottom" };
        var method = tank.Kind.Prefix is "TX" ? "kf-coulometric" : random.NextDouble() switch { < 0.6 => "kf-coulometric", < 0.85 => "kf-evaporator", < 0.96 => "kf-volumetric", _ => "crackle" };
        var code = $"{tank.Tag}/{taken:yyMM}{bottle:00}";
        var received = taken.AddHours(20 + random.Next(110));
        var analyst = random.NextDouble() < 0.5 ? "lab 1" : "lab 2";
        if (method == "crackle")
        {
            samples.Add(($"{code}|1", Row(code, tank.Tag, Time(taken), Time(received), point, Math.Round(celsius, 1), method, null, null, 1, analyst, content > 600 ? "crackles" : "clear")));
            return;
        }

        var seen = Math.Max(1, (content * (1 + (0.07 * Gauss()))) + (5 * Gauss()));
        seen += point == "bottom" && settledL > 0.05 ? content * 0.3 * random.NextDouble() : 0;
        if (dirty)
        {
            seen += 480;
        }

        var replicates = random.NextDouble() < 0.3 ? 2 : 1;
        for (var replicate = 1; replicate <= replicates; replicate++)
        {
            var value = Math.Max(1, seen + (1.874 * Math.Sqrt(seen) / 2.77 * Gauss()));
            samples.Add(($"{code}|{replicate}", Row(code, tank.Tag, Time(taken), Time(received), point, random.NextDouble() < 0.85 ? Math.Round(celsius + (0.5 * Gauss()), 1) : null, method,
                Math.Round(value, value < 100 ? 1 : 0), null, replicate, analyst, dirty ? "bottle looked used" : "")));
        }
    }

    public void Write(string folder)
    {
        File(folder, "fluids.csv", "code,name,family,isoVg,viscosity40Mm2S,viscosity100Mm2S,density15KgM3,expansionPerK,solubilityA,solubilityB,interfacialTensionMNM,relativePermittivity,conductivityPSM,demulsibilityMin,waterLimitPpm",
            fluids.Values.OrderBy(f => f.Code, StringComparer.Ordinal).Select(f => Row(f.Code, f.Name, f.Family, f.Vg, f.V40, f.V100, f.Rho, f.Gamma, f.A, f.B, f.Ift, f.Eps, f.Sigma, f.Demuls, f.Limit)));
        File(folder, "reservoirs.csv", "tag,name,area,service,fluid,shape,lengthMm,widthMm,heightMm,oilVolumeL,suctionHeightMm,circulationLPerMin,operatingTemperatureC,coldestTemperatureC,headspaceRhPercent,breather,waterLimitPpm,waterCapacityL,criticality,commissionedAt",
            tanks.OrderBy(t => t.Tag, StringComparer.Ordinal).Select(t => Row(t.Tag, $"{t.Kind.Name}", t.Kind.Area, t.Kind.Service, t.Fluid.Code, t.Kind.Shape, t.Length > 0 ? t.Length : null, t.Width > 0 ? t.Width : null, t.Height,
                t.Volume, t.Suction, t.Circulation, t.Warm, t.Cold, t.Humidity, t.Breather, t.Limit, t.Capacity, t.Kind.Criticality, Time(t.Commissioned))));
        File(folder, "samples.csv", "sample,tag,takenAt,receivedAt,point,oilTemperatureC,method,waterPpm,waterActivity,replicate,analyst,remark", Ordered(samples));
        File(folder, "drains.csv", "tag,drainedAt,waterL,oilL", Ordered(drains));
        File(folder, "topups.csv", "tag,addedAt,oilL,waterPpm", Ordered(topUps));
        separators.AddRange(
        [
            Row("CF-1", "DL-118", "centrifuge", 40, 0.8, 5, null, 65, null, "false"),
            Row("CO-1", "TG-122", "coalescer", 60, 0.9, 10, null, null, null, "false"),
            Row("CO-2", null, "coalescer", 80, 0.9, 8, null, null, null, "true"),
            Row("AB-1", null, "absorbent", 20, 0.6, null, null, null, 9, "true"),
            Row("VD-1", null, "vacuum-dehydrator", 40, 0.75, null, 5, 60, null, "true"),
            Row("VD-2", null, "vacuum-dehydrator", 20, 0.75, null, 8, 58, null, "true"),
            Row("DA-1", "EH-301", "dry-air-purge", 50, 0.4, null, null, null, null, "false"),
        ]);
        runs.Add(("CF-1", Row("CF-1", "DL-118", Time(start.AddDays(12)), null)));
        runs.Add(("CO-1", Row("CO-1", "TG-122", Time(start.AddDays(40)), null)));
        runs.Add(("VD-1a", Row("VD-1", "WE-103", Time(end.AddDays(-300)), Time(end.AddDays(-297)))));
        runs.Add(("VD-1b", Row("VD-1", "DL-105", Time(end.AddDays(-210)), Time(end.AddDays(-206)))));
        runs.Add(("VD-2a", Row("VD-2", "CH-132", Time(end.AddDays(-120)), Time(end.AddDays(-118)))));
        runs.Add(("DA-1", Row("DA-1", "EH-301", Time(end.AddDays(-400)), null)));
        File(folder, "separators.csv", "code,tag,kind,flowLPerMin,efficiency,cutSizeUm,pressureKPa,oilTemperatureC,capacityL,portable", separators.Order(StringComparer.Ordinal));
        File(folder, "separator-runs.csv", "separator,tag,startedAt,endedAt", Ordered(runs));
        File(folder, "readings.csv", "tag,readAt,oilTemperatureC,waterActivity", Ordered(readings));
    }

    private static IEnumerable<string> Ordered(List<(string Key, string Row)> rows) => rows.OrderBy(r => r.Key, StringComparer.Ordinal).Select(r => r.Row);

    private static void File(string folder, string name, string header, IEnumerable<string> rows)
    {
        using var writer = new StreamWriter(Path.Combine(folder, name), append: false, new UTF8Encoding(false)) { NewLine = "\r\n" };
        writer.WriteLine(header);
        foreach (var row in rows)
        {
            writer.WriteLine(row);
        }
    }

    private static string Row(params object?[] cells) => string.Join(',', cells.Select(c => c switch
    {
        null => "",
        double d => d.ToString("R", CultureInfo.InvariantCulture),
        IFormattable f => f.ToString(null, CultureInfo.InvariantCulture),
        _ => ((string)c).Contains(',', StringComparison.Ordinal) ? $"\"{c}\"" : (string)c,
    }));

    private static string Time(DateTime time) => time.ToString("yyyy-MM-ddTHH:mm:ssZ", CultureInfo.InvariantCulture);

    private static double Round(double value, double to) => Math.Round(Math.Round(value / to) * to, 3);

    private double Gauss() => Math.Sqrt(-2 * Math.Log(1 - random.NextDouble())) * Math.Cos(2 * Math.PI * random.NextDouble());
}
