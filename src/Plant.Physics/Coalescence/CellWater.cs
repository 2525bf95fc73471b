using Plant.Physics.Droplets;

namespace Plant.Physics.Coalescence;

/// <summary>Between a distribution of sizes and the water in the cells of a grid.</summary>
internal static class CellWater
{
    private const int Parts = 8;
    private const double FinestShare = 0.02;
    private const double FinestWidth = 1e-4;

    // more than this below zero means that the start is narrower than the cells
    private const double Wiggle = 1e-6;

    /// <summary>Shares water of a distribution, cut to the range of the grid, among the cells.</summary>
    /// <param name="grid">The cells.</param>
    /// <param name="sizes">Its sizes.</param>
    /// <param name="volumeFraction">All of the water [1].</param>
    /// <param name="water">Receives the water in each cell, none below zero [1].</param>
    public static void Load(VolumeGrid grid, IDropletDistribution sizes, double volumeFraction, Span<double> water)
    {
        if (!TryLoadSmooth(grid, sizes, water))
        {
            LoadRough(grid, sizes, water);
        }

        var total = 0.0;
        foreach (var value in water)
        {
            total += value;
        }

        if (!(total > 0))
        {
            throw new ArgumentException("no drop lies in the range of the grid", nameof(sizes));
        }

        foreach (ref var value in water)
        {
            value *= volumeFraction / total;
        }

        FillLack(water);
    }

    /// <summary>Median diameter by volume.</summary>
    /// <param name="grid">The cells.</param>
    /// <param name="water">Water in each cell [1].</param>
    /// <returns>Diameter [m]; null where there is no water.</returns>
    /// <remarks>The water is a density at the middle of its cell: what lies below an edge is the midpoint rule with its next term, and within a cell the density is a straight line.</remarks>
    public static double? MedianM(VolumeGrid grid, ReadOnlySpan<double> water)
    {
        var half = 0.0;
        foreach (var value in water)
        {
            half += 0.5 * value;
        }

        var below = 0.0;
        for (var i = 0; i < water.Length && half > 0; i++)
        {
            var before = i > 0 ? water[i - 1] : 0;
            var next = i + 1 < water.Length ? water[i + 1] : 0;
            var lower = below + ((water[i] - before) / 24);
            var inside = below + water[i] + ((next - water[i]) / 24) - lower;
            below += water[i];
            if (lower + inside < half)
            {
                continue;
            }

            var slope = (next - before) / 4;
            var part = Math.Clamp((half - lower) / inside, 0, 1);
            for (var n = 0; n < 4; n++)
            {
                var excess = lower + (inside * part) + (slope * part * (part - 1)) - half;
                part = Math.Clamp(part - (excess / (inside + (slope * ((2 * part) - 1)))), 0, 1);
            }

            return grid.UpperEdgeM(i) * Math.Exp(grid.LogRatio * (part - 1));
        }

        return null;
    }

    /// <summary>A cell below zero takes what it lacks from its neighbours: first from smaller drops, at the low end from larger ones. The sum stays.</summary>
    /// <param name="water">Water in each cell [1].</param>
    public static void FillLack(Span<double> water)
    {
        var lack = 0.0;
        for (var i = water.Length - 1; i >= 0; i--)
        {
            water[i] += lack;
            lack = Math.Min(0, water[i]);
            water[i] -= lack;
        }

        for (var i = 0; lack < 0 && i < water.Length; i++)
        {
            water[i] += lack;
            lack = Math.Min(0, water[i]);
            water[i] -= lack;
        }
    }

    /// <summary>Densities at the middles of the cells from the water between their edges, exact for polynomials of fifth degree: sums over cells then converge as fast as the distribution is smooth.</summary>
    private static bool TryLoadSmooth(VolumeGrid grid, IDropletDistribution sizes, Span<double> water)
    {
        Span<double> between = stackalloc double[grid.Cells + 4];
        var below = sizes.VolumeBelow(grid.UpperEdgeM(-3));
        for (var i = 0; i < between.Length; i++)
        {
            var next = sizes.VolumeBelow(grid.UpperEdgeM(i - 2));
            between[i] = next - below;
            below = next;
        }

        double total = 0, least = 0;
        for (var i = 0; i < grid.Cells; i++)
        {
            var near = between[i + 1] + between[i + 3];
            water[i] = between[i + 2] - ((near - (2 * between[i + 2])) / 24) + (3.0 / 640 * (between[i] + between[i + 4] - (4 * near) + (6 * between[i + 2])));
            total += water[i];
            least = Math.Min(least, water[i]);
        }

        return total > 0 && least >= -Wiggle * total;
    }

    private static void LoadRough(VolumeGrid grid, IDropletDistribution sizes, Span<double> water)
    {
        water.Clear();
        var low = (grid.LowestM, sizes.VolumeBelow(grid.LowestM));
        for (var part = 1; part <= Parts * grid.Cells; part++)
        {
            var edge = grid.LowestM * Math.Exp(grid.LogRatio * part / Parts);
            var high = (edge, sizes.VolumeBelow(edge));
            Share(grid, sizes, low, high, water);
            low = high;
        }
    }

    private static void Share(VolumeGrid grid, IDropletDistribution sizes, (double Size, double Below) low, (double Size, double Below) high, Span<double> water)
    {
        var share = high.Below - low.Below;
        var middle = Math.Sqrt(low.Size * high.Size);
        if (share > FinestShare && high.Size > low.Size * (1 + FinestWidth))
        {
            var between = (middle, sizes.VolumeBelow(middle));
            Share(grid, sizes, low, between, water);
            Share(grid, sizes, between, high, water);
            return;
        }

        // beyond the middle of the first and last cell this extrapolates, and still keeps number and volume
        var volumes = grid.VolumesM3;
        var drop = Math.PI / 6 * middle * middle * middle;
        var cell = Math.Clamp((int)Math.Floor((Math.Log(middle / grid.LowestM) / grid.LogRatio) - 0.5), 0, grid.Cells - 2);
        var upper = (drop - volumes[cell]) / (volumes[cell + 1] - volumes[cell]);
        water[cell] += share * (1 - upper) * volumes[cell] / drop;
        water[cell + 1] += share * upper * volumes[cell + 1] / drop;
    }
}
