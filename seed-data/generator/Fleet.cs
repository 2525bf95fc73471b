namespace Skarrow;

/// <summary>Makes the reservoirs of the groups, with dimensions that hold their oil.</summary>
public static class Fleet
{
    public static IReadOnlyList<Unit> Build(DateTime end) =>
        [.. Kinds.All.SelectMany(kind => Enumerable.Range(1, kind.Count).Select(number => One(kind, number, end)))];

    private static Unit One(Kind kind, int number, DateTime end)
    {
        var tag = FormattableString.Invariant($"{kind.Prefix}-{number:00}");
        var chance = new Chance(tag);
        double Within((double Low, double High) range) => chance.Between(range.Low, range.High);
        var litres = Tidy(Within(kind.OilL));
        var (length, width, height) = Dimensions(kind.Shape, litres, chance.Between(0.66, 0.78));
        // about one data plate in nine does not tell where the suction mouth is
        var suction = kind.HasSuction && !chance.Yes(0.11) ? Math.Max(20, Step(height * chance.Between(0.07, 0.11), 5)) : (double?)null;
        var turnover = kind.TurnoverMin * chance.Between(0.85, 1.2);
        return new Unit
        {
            Tag = tag,
            Name = FormattableString.Invariant($"{kind.Name} {number}"),
            Area = kind.Area,
            Service = kind.Service,
            Fluid = kind.Fluids[(number - 1) % kind.Fluids.Count],
            Shape = kind.Shape,
            LengthMm = length,
            WidthMm = width,
            HeightMm = height,
            OilL = litres,
            SuctionMm = suction,
            CirculationLPerMin = kind.TurnoverMin > 0 ? Tidy(litres / turnover) : null,
            OperatingC = Math.Round(Within(kind.OperatingC)),
            ColdestC = Math.Round(Within(kind.ColdestC)),
            RhPercent = kind.Rh is { } rh ? Step(Within(rh), 5) : null,
            Breather = kind.Breathers[(number - 1) % kind.Breathers.Count],
            LimitPpm = kind.LimitPpm,
            Criticality = Math.Clamp(kind.Criticality + (chance.Yes(0.15) ? -1 : 0) + (chance.Yes(0.1) ? 1 : 0), 1, 5),
            CommissionedAt = end.AddDays(-chance.Whole(1400, 7200)).Date.AddHours(8),
            Rhythm = kind.Rhythm,
            Fill = Math.Min(0.55, chance.LogNormal(kind.Fill, 0.7)),
            SampleDays = kind.SampleDays,
            DrainDays = kind.DrainDays,
            Clearing = chance.LogNormal(1, 0.35),
        };
    }

    /// <summary>Length, width and height of a tank that this much oil fills to the given share.</summary>
    private static (double? Length, double? Width, double Height) Dimensions(string shape, double litres, double share)
    {
        var volume = litres / share * 1e6;
        var step = litres < 300 ? 5 : 10;
        if (shape == "horizontal-cylinder")
        {
            var diameter = Step(Math.Cbrt(volume / (Math.PI / 4 * 2.3)), step);
            return (Step(volume / (Math.PI / 4 * diameter * diameter), step), null, diameter);
        }

        if (shape == "vertical-cylinder")
        {
            var diameter = Step(Math.Cbrt(volume / (Math.PI / 4 * 1.35)), step);
            return (null, diameter, Step(volume / (Math.PI / 4 * diameter * diameter), step));
        }

        var height = Step(Math.Cbrt(volume / 2.6), step);
        var width = Step(1.25 * height, step);
        return (Step(volume / (width * height), step), width, height);
    }

    /// <summary>Two figures, as on a data plate.</summary>
    public static double Tidy(double value)
    {
        var unit = Math.Pow(10, Math.Floor(Math.Log10(value)) - 1);
        return Math.Round(Math.Round(value / unit) * unit, 3);
    }

    public static double Step(double value, double step) => Math.Round(value / step) * step;
}
