namespace Plant.Physics.Coalescence;

/// <summary>
/// The equations of the population balance: collisions in each depth, settling from depth to depth and out of the last, and a source into the first.
/// The state is the volume fraction of water in each cell of each depth, then what has settled out of the last.
/// </summary>
internal sealed class SizeSystem
{
    private readonly PairRates[] pairs;
    private readonly double[] settlingPerS;
    private readonly double[] sourcePerS;
    private readonly double[] growthPerS;
    private readonly double[] damping;
    private readonly int cells;
    private readonly int stride;
    private double stepS;

    public SizeSystem(VolumeGrid grid, PopulationBalanceSetup setup)
    {
        cells = grid.Cells;
        var first = new PairRates(grid, setup.KernelM3S);
        pairs = [first, .. Enumerable.Range(1, setup.Depths - 1).Select(_ => first.WithOwnMemory())];
        stride = first.Stride;
        settlingPerS = new double[stride];
        sourcePerS = new double[stride];
        for (var i = 0; i < cells; i++)
        {
            // the last cell gathers what grows past it: it settles as its upper edge does, so that the answer does not hang on its width
            var diameter = i + 1 < cells ? grid.DiametersM[i] : grid.UpperEdgeM(i);
            settlingPerS[i] = Guard.NotNegative(setup.SettlingMS(diameter)) * setup.Depths / setup.DepthM;
        }

        if (setup.Source is { } source)
        {
            CellWater.Load(grid, source, setup.SourcePerS, sourcePerS.AsSpan(0, cells));
        }

        growthPerS = new double[pairs.Length * stride];
        damping = new double[pairs.Length * stride];
    }

    /// <summary>Depths [1].</summary>
    public int Depths => pairs.Length;

    /// <summary>Length of the state [1].</summary>
    public int Size => (pairs.Length * stride) + 1;

    /// <summary>Where the cells of a depth stand in the state.</summary>
    /// <param name="depth">The depth, from 0.</param>
    /// <returns>The range.</returns>
    public Range Of(int depth) => (depth * stride)..((depth * stride) + cells);

    /// <summary>Rate of change of a state.</summary>
    /// <param name="state">The state.</param>
    /// <param name="rate">Receives the rate [1/s].</param>
    public void Evaluate(ReadOnlySpan<double> state, Span<double> rate)
    {
        ReadOnlySpan<double> fallen = sourcePerS;
        for (var depth = 0; depth < pairs.Length; depth++)
        {
            var own = rate.Slice(depth * stride, stride);
            var water = state.Slice(depth * stride, stride);
            pairs[depth].Evaluate(water, own);
            for (var i = 0; i < own.Length; i++)
            {
                own[i] += (depth == 0 ? fallen[i] : settlingPerS[i] * fallen[i]) - (settlingPerS[i] * water[i]);
            }

            fallen = water;
        }

        rate[^1] = Dot(settlingPerS, fallen);
    }

    /// <summary>Takes growth as the last <see cref="Evaluate"/> found it into the approximate Jacobian.</summary>
    public void FixJacobian()
    {
        for (var depth = 0; depth < pairs.Length; depth++)
        {
            pairs[depth].Growth.AsSpan(0, cells - 1).CopyTo(growthPerS.AsSpan(depth * stride));
        }
    }

    /// <summary>Prepares <see cref="Solve"/>.</summary>
    /// <param name="seconds">The step [s].</param>
    public void SetStep(double seconds)
    {
        stepS = seconds;
        for (var i = 0; i < damping.Length; i++)
        {
            damping[i] = 1 / (1 + (seconds * (settlingPerS[i % stride] + growthPerS[i])));
        }
    }

    /// <summary>
    /// Solves (1 − h·J)x = b in place, cell by cell, with J of the fast parts alone: settling, and growth into the next cell. It moves water and makes none, so the total of x is that of b.
    /// </summary>
    /// <param name="b">Right side, then solution.</param>
    public void Solve(Span<double> b)
    {
        for (var from = 0; from < damping.Length; from += stride)
        {
            var grown = 0.0;
            for (var i = 0; i < stride; i++)
            {
                var at = from + i;
                var fallen = from == 0 ? 0 : stepS * settlingPerS[i] * b[at - stride];
                b[at] = (b[at] + grown + fallen) * damping[at];
                grown = stepS * growthPerS[at] * b[at];
            }
        }

        b[^1] += stepS * Dot(settlingPerS, b.Slice(damping.Length - stride, stride));
    }

    private static double Dot(ReadOnlySpan<double> a, ReadOnlySpan<double> b)
    {
        var sum = 0.0;
        for (var i = 0; i < a.Length; i++)
        {
            sum += a[i] * b[i];
        }

        return sum;
    }
}
