using System.Globalization;
using Plant.Physics;
using Plant.Physics.Calculators;

namespace Plant.Register.Laboratory;

/// <summary>What the typed cells of a row come to.</summary>
/// <param name="ReplicatePpm">Each complete replicate [mg/kg].</param>
/// <param name="MeanPpm">Their mean [mg/kg]; null before the first is complete.</param>
/// <param name="Complete">True where nothing more is to be typed.</param>
/// <param name="Wrong">What cannot be; it blocks the release. Empty where all is well.</param>
/// <param name="Warning">What is worth a second look; it never blocks. Empty where all is well.</param>
public sealed record BenchResult(IReadOnlyList<double> ReplicatePpm, double? MeanPpm, bool Complete, string Wrong, string Warning);

/// <summary>Arithmetic of the bench.</summary>
public static class BenchArithmetic
{
    private const double MostPpm = 1e6;
    private const double WideFactor = 1.6;

    /// <summary>Number of cells of a row.</summary>
    public static int CellCount(BenchBatch batch) => (batch.Entry == BenchEntry.Ppm ? 1 : 2) * (batch.Duplicates ? 2 : 1);

    /// <summary>Reads a number as people type it, with point or comma.</summary>
    public static bool TryNumber(string text, out double value) =>
        double.TryParse(text.Trim().Replace(',', '.'), NumberStyles.AllowDecimalPoint | NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out value) && double.IsFinite(value);

    /// <summary>Why a cell cannot hold this text; null where it can.</summary>
    public static string? Refuse(string text)
    {
        if (text.Trim().Length == 0)
        {
            return null;
        }

        return !TryNumber(text, out var value) ? $"\"{text.Trim()}\" is no number: type digits with a point or a comma"
            : value < 0 ? $"{text.Trim()} is below zero"
            : value > MostPpm ? $"{text.Trim()} is more than can be"
            : null;
    }

    /// <summary>Computes a row.</summary>
    public static BenchResult Of(BenchBatch batch, BenchRow row)
    {
        var width = batch.Entry == BenchEntry.Ppm ? 1 : 2;
        var numbers = row.Cells.Select(c => c.Trim().Length > 0 && TryNumber(c, out var value) ? value : (double?)null).ToList();
        var replicates = new List<double>();
        for (var i = 0; i + width <= CellCount(batch) && i + width <= numbers.Count; i += width)
        {
            if (width == 1 && numbers[i] is { } ppm)
            {
                replicates.Add(ppm);
            }
            else if (width == 2 && numbers[i] is { } mass && numbers[i + 1] is { } reading)
            {
                var (content, wrong) = Content(batch, mass, reading);
                if (wrong.Length > 0)
                {
                    return new BenchResult(replicates, null, false, wrong, "");
                }

                replicates.Add(content);
            }
        }

        double? mean = replicates.Count > 0 ? replicates.Average() : null;
        var complete = replicates.Count * width == CellCount(batch) || (replicates.Count == 1 && numbers.Skip(width).All(n => n is null) && numbers.Count > width);
        return new BenchResult(replicates, mean, complete, "", mean is { } found ? Warning(batch, row, replicates, found) : "");
    }

    private static (double Ppm, string Wrong) Content(BenchBatch batch, double massG, double reading)
    {
        var titration = new TitrationRequest(massG, batch.Entry == BenchEntry.MassAndWater ? reading : null, batch.Entry == BenchEntry.MassAndCharge ? reading : null, batch.DriftUgPerMin, batch.Minutes, batch.BlankUg);
        var result = KarlFischerCalculator.Compute(new KarlFischerRequest([titration], Code.Of(batch.Method)));
        return result.Response is { } done ? (done.WaterPpm, "") : (0, $"{result.Refusals[0].Value} {result.Refusals[0].Reason}");
    }

    private static string Warning(BenchBatch batch, BenchRow row, List<double> replicates, double mean)
    {
        var words = new List<string>();
        var table = Plant.Physics.Laboratory.Repeatability.Of(Code.Of(batch.Method));
        if (replicates.Count > 1 && table is not null && replicates.Max() - replicates.Min() > table.AtPpm(mean))
        {
            words.Add(string.Create(CultureInfo.InvariantCulture, $"duplicates differ by {replicates.Max() - replicates.Min():0.#}; repeatability allows {table.AtPpm(mean):0.#}: run one more"));
        }

        // the 90 % interval widened to about 99 %
        if (row is { ExpectedLowPpm: { } low, ExpectedHighPpm: { } high })
        {
            var middle = (low + high) / 2;
            if (mean > middle + (WideFactor * (high - middle)))
            {
                words.Add("far above what was expected");
            }
            else if (mean < middle - (WideFactor * (middle - low)))
            {
                words.Add("far below what was expected");
            }
        }

        if (row.SaturationPpm is { } holds && mean > holds)
        {
            words.Add(string.Create(CultureInfo.InvariantCulture, $"above the {holds:0} that the oil holds: free water likely"));
        }

        return string.Join("; ", words);
    }
}
