namespace Plant.Advice.Ledger;

/// <summary>Robust statistics of short series.</summary>
public static class Robust
{
    /// <summary>Median.</summary>
    /// <param name="values">Values; at least one.</param>
    /// <returns>The median.</returns>
    public static double Median(IReadOnlyList<double> values)
    {
        var sorted = values.Order().ToArray();
        var middle = sorted.Length / 2;
        return sorted.Length % 2 == 1 ? sorted[middle] : 0.5 * (sorted[middle - 1] + sorted[middle]);
    }

    /// <summary>Theil–Sen slope: the median of the slopes of all pairs.</summary>
    /// <param name="x">Places; at least two different ones.</param>
    /// <param name="y">Values.</param>
    /// <returns>Slope; null where all places are the same.</returns>
    /// <remarks>Source: Theil 1950, Sen 1968.</remarks>
    public static double? TheilSen(IReadOnlyList<double> x, IReadOnlyList<double> y)
    {
        ArgumentNullException.ThrowIfNull(x);
        ArgumentNullException.ThrowIfNull(y);
        var slopes = new List<double>(x.Count * (x.Count - 1) / 2);
        for (var i = 0; i < x.Count; i++)
        {
            for (var j = i + 1; j < x.Count; j++)
            {
                if (x[j] != x[i])
                {
                    slopes.Add((y[j] - y[i]) / (x[j] - x[i]));
                }
            }
        }

        return slopes.Count == 0 ? null : Median(slopes);
    }
}
