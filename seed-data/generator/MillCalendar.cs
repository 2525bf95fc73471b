namespace Skarrow;

/// <summary>When a machine stands.</summary>
public enum Rhythm
{
    /// <summary>Stands for the annual shutdown in April and for half a day every fourth Wednesday.</summary>
    Process,

    /// <summary>As the process, and over most weekends.</summary>
    Weekdays,

    /// <summary>Stands for the first five days of the annual shutdown only.</summary>
    PowerHouse,

    /// <summary>Never warm: tanks, standby sets, unheated baths. Follows the weather.</summary>
    Standing,

    /// <summary>Energised all the year but for one day of the shutdown.</summary>
    Always,
}

/// <summary>Weather and stops. Dates in UTC; the mill lies where the spring is dry and the autumn wet.</summary>
public static class MillCalendar
{
    private static readonly DateTime FirstStopDay = new(2024, 1, 3, 0, 0, 0, DateTimeKind.Utc);

    /// <summary>−1 in the middle of winter, +1 in the middle of summer.</summary>
    public static double Season(DateTime time) => -Math.Cos(2 * Math.PI * (time.DayOfYear - 20) / 365.25);

    /// <summary>0 in the dry spring, 1 in the wet season (October).</summary>
    public static double Wetness(DateTime time) => 0.5 - (0.5 * Math.Cos(2 * Math.PI * (time.DayOfYear - 105) / 365.25));

    public static double OutdoorC(DateTime time) => 9.5 + (8.5 * Season(time)) + (2.5 * Math.Sin(2 * Math.PI * (time.TimeOfDay.TotalDays - 0.35)));

    /// <summary>The second Monday of April, 06:00.</summary>
    public static DateTime Shutdown(int year)
    {
        var first = new DateTime(year, 4, 1, 6, 0, 0, DateTimeKind.Utc);
        return first.AddDays(((8 - (int)first.DayOfWeek) % 7) + 7);
    }

    public static bool Runs(Rhythm rhythm, DateTime time)
    {
        var intoShutdown = (time - Shutdown(time.Year)).TotalDays;
        var stopDay = (int)(time - FirstStopDay).TotalDays % 28 == 0 && time.Hour is >= 6 and < 18;
        var weekend = (time.DayOfWeek == DayOfWeek.Saturday && time.Hour >= 14) || (time.DayOfWeek == DayOfWeek.Sunday && time.Hour < 22);
        var worksThrough = (int)(time - FirstStopDay).TotalDays / 7 % 5 == 0;
        return rhythm switch
        {
            Rhythm.Process => intoShutdown is < 0 or > 9 && !stopDay,
            Rhythm.Weekdays => intoShutdown is < 0 or > 10 && !stopDay && (!weekend || worksThrough),
            Rhythm.PowerHouse => intoShutdown is < 0 or > 5,
            Rhythm.Always => intoShutdown is < 2 or > 3,
            _ => false,
        };
    }
}
