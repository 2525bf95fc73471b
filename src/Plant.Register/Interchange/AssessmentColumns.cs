using System.Globalization;
using Plant.Advice;
using Plant.Physics;

namespace Plant.Register.Interchange;

/// <summary>The columns of an assessment, for files and messages.</summary>
public static class AssessmentColumns
{
    /// <summary>Name and value of each column in order; null is "not known".</summary>
    public static readonly IReadOnlyList<(string Name, Func<Assessment, object?> Value)> All =
    [
        ("tag", a => a.Tag),
        ("asOf", a => a.AsOf),
        ("condition", a => Code.Of(a.Condition)),
        ("probabilityFreeNow", a => a.ProbabilityFreeNow),
        ("probabilityFreeColdest", a => a.ProbabilityFreeColdest),
        ("waterPpm", a => a.WaterPpm),
        ("waterPpmLow90", a => a.WaterPpmLow90),
        ("waterPpmHigh90", a => a.WaterPpmHigh90),
        ("saturationNowPpm", a => a.SaturationNowPpm),
        ("saturationColdestPpm", a => a.SaturationColdestPpm),
        ("dissolvedPpm", a => a.DissolvedPpm),
        ("emulsifiedPpm", a => a.EmulsifiedPpm),
        ("settledWaterL", a => a.SettledWaterL),
        ("settledWaterLLow90", a => a.SettledWaterLLow90),
        ("settledWaterLHigh90", a => a.SettledWaterLHigh90),
        ("ingressGPerDay", a => a.IngressGPerDay),
        ("ingressGPerDayLow90", a => a.IngressGPerDayLow90),
        ("ingressGPerDayHigh90", a => a.IngressGPerDayHigh90),
        ("ingressChangedAt", a => a.IngressChangedAt),
        ("waterGoes", a => a.WaterGoes is { } goes ? Code.Of(goes) : null),
        ("drainIntervalDays", a => a.DrainIntervalDays),
        ("drainBy", a => a.DrainBy),
        ("dehydrateBy", a => a.DehydrateBy),
        ("dehydration", a => a.Dehydration is { } kind ? Code.Of(kind) : null),
        ("reason", a => a.Reason),
        ("basis", a => Code.Of(a.Basis)),
    ];

    /// <summary>A number with the figures that mean something: six.</summary>
    public static double Round(double value)
    {
        if (value == 0)
        {
            return 0;
        }

        var scale = Math.Pow(10, 5 - Math.Floor(Math.Log10(Math.Abs(value))));
        return double.IsFinite(scale) && scale > 0 ? Math.Round(value * scale) / scale : value;
    }

    /// <summary>Writes a fleet as CSV.</summary>
    public static void Write(TextWriter writer, IEnumerable<Assessment> fleet)
    {
        writer.WriteLine(string.Join(',', All.Select(c => c.Name)));
        foreach (var assessment in fleet)
        {
            writer.WriteLine(string.Join(',', All.Select(c => Cell(c.Value(assessment)))));
        }
    }

    private static string Cell(object? value)
    {
        var text = value switch
        {
            null => string.Empty,
            double number => Round(number).ToString("R", CultureInfo.InvariantCulture),
            DateTime time => CsvText.Format(new DateTimeOffset(time, TimeSpan.Zero)),
            _ => CsvText.Neutralise((string)value),
        };
        return text.AsSpan().IndexOfAny("\",\r\n") < 0 ? text : "\"" + text.Replace("\"", "\"\"", StringComparison.Ordinal) + "\"";
    }
}
