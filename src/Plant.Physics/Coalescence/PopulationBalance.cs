using Plant.Physics.Droplets;

namespace Plant.Physics.Coalescence;

/// <summary>
/// Population balance of drops that coalesce and settle: Smoluchowski's equation on a geometric grid. Not for use by two threads at once.
/// </summary>
/// <remarks>
/// Equation: dn(v)/dt = ½∫K(v − u, u)n(v − u)n(u)du − n(v)∫K(v, u)n(u)du − n(v)·w(v)/H + source. Source: Smoluchowski 1916; Kumar and Ramkrishna 1996 for the cells (from memory).
/// Valid for: dilute drops that do not break up. Water is kept to rounding; no cell goes below zero; the error of the grid falls with about the fifth power of the number of cells.
/// </remarks>
public sealed class PopulationBalance
{
    /// <summary>Steps in time after which a solution is given up [1].</summary>
    public const int MostSteps = 5000;

    // what rounding may take of the water in one step; more is an instability, and the step is done again, shorter
    private const double MostRounding = 1e-9;

    // what is left is followed to this share of what was there
    private const double Forgotten = 1e-9;

    private readonly VolumeGrid grid;
    private readonly PopulationBalanceSetup setup;
    private readonly SizeSystem system;
    private readonly ImplicitExtrapolation method;
    private readonly double[] perVolume;
    private readonly double[] state;
    private double mostNumber;

    /// <summary>Tabulates all pairs.</summary>
    /// <param name="grid">The cells.</param>
    /// <param name="setup">What happens to the drops.</param>
    public PopulationBalance(VolumeGrid grid, PopulationBalanceSetup setup)
    {
        ArgumentNullException.ThrowIfNull(grid);
        ArgumentNullException.ThrowIfNull(setup);
        Guard.Positive(setup.DepthM);
        Guard.NotNegative(setup.SourcePerS);
        Guard.Between(setup.Tolerance, 1e-10, 0.01);
        Guard.Between(setup.Depths, 1, 64);
        if (setup.SourcePerS > 0 && setup.Source is null)
        {
            throw new ArgumentException("water that enters needs sizes", nameof(setup));
        }

        this.grid = grid;
        this.setup = setup;
        perVolume = new double[grid.Cells];
        for (var i = 0; i < perVolume.Length; i++)
        {
            perVolume[i] = 1 / grid.VolumesM3[i];
        }

        system = new SizeSystem(grid, setup);
        method = new ImplicitExtrapolation(system);
        state = new double[system.Size];
    }

    /// <summary>Follows the drops from a start.</summary>
    /// <param name="start">Sizes at the start, the same in every depth; cut to the range of the grid.</param>
    /// <param name="volumeFraction">Water at the start [0 to 1).</param>
    /// <param name="timesS">Times at which to tell of the drops, rising [s].</param>
    /// <param name="stop">Ends the work early with an <see cref="OperationCanceledException"/>.</param>
    /// <returns>The drops at these times.</returns>
    /// <remarks>Equation: as the class. Source: as the class. Valid for: as the class.</remarks>
    public PopulationBalanceResult Solve(IDropletDistribution start, double volumeFraction, IReadOnlyList<double> timesS, CancellationToken stop = default)
    {
        ArgumentNullException.ThrowIfNull(timesS);
        Begin(start, volumeFraction);
        var states = new List<PopulationBalanceState>(timesS.Count);
        double now = 0, worst = 0, step = FirstStep(timesS);
        int steps = 0, before = method.Evaluations;
        foreach (var time in timesS)
        {
            ArgumentOutOfRangeException.ThrowIfLessThan(Guard.Finite(time, nameof(timesS)), now, nameof(timesS));
            while (now < time)
            {
                stop.ThrowIfCancellationRequested();
                if (steps++ >= MostSteps)
                {
                    return new(states, worst, false, steps - 1, method.Evaluations - before);
                }

                // a last short step is shared with the one before it
                var rest = time - now;
                var seconds = step >= rest ? rest : Math.Min(step, Math.Max(0.5 * rest, 0.5 * step));
                method.Step(state, seconds);
                var error = Error();
                var factor = Math.Clamp(0.9 * Math.Pow(setup.Tolerance / Math.Max(error, 1e-30), 1.0 / ImplicitExtrapolation.Order), 0.1, 4);
                var expected = (volumeFraction * setup.Depths) + (setup.SourcePerS * (now + seconds));
                if (!(error <= setup.Tolerance) || !TryAccept(expected))
                {
                    step = seconds * (double.IsNaN(error) ? 0.1 : Math.Min(factor, 0.5));
                    continue;
                }

                now = seconds == rest ? time : now + seconds;
                step = seconds < step ? Math.Max(step, seconds * factor) : seconds * factor;
                worst = Math.Max(worst, MassError(expected));
                method.Begin(state);
            }

            states.Add(Tell(now));
        }

        return new(states, worst, true, steps, method.Evaluations - before);
    }

    private void Begin(IDropletDistribution start, double volumeFraction)
    {
        ArgumentNullException.ThrowIfNull(start);
        Guard.Between(volumeFraction, 0, 1);
        Array.Clear(state);
        mostNumber = 0;
        for (var depth = 0; depth < setup.Depths && volumeFraction > 0; depth++)
        {
            CellWater.Load(grid, start, volumeFraction, state.AsSpan(system.Of(depth)));
        }

        method.Begin(state);
    }

    private double FirstStep(IReadOnlyList<double> timesS)
    {
        double water = 0, change = 0;
        for (var i = 0; i < state.Length; i++)
        {
            water += Math.Abs(state[i]);
            change += Math.Abs(method.BeginRate[i]);
        }

        return timesS.Count == 0 ? 0 : Math.Max(1e-6 * timesS[^1], change > 0 ? 0.2 * water / change : timesS[^1]);
    }

    private double Error()
    {
        var fine = method.Result;
        var coarse = method.NextBest;
        double water = Forgotten * fine[^1], number = double.Epsilon, waterError = 0, numberError = 0;
        for (var depth = 0; depth < setup.Depths; depth++)
        {
            var (from, count) = system.Of(depth).GetOffsetAndLength(fine.Length);
            for (var i = 0; i < count; i++)
            {
                var amount = Math.Abs(fine[from + i]);
                var difference = Math.Abs(fine[from + i] - coarse[from + i]);
                water += amount;
                number += amount * perVolume[i];
                waterError += difference;
                numberError += difference * perVolume[i];
            }
        }

        mostNumber = Math.Max(mostNumber, number);
        return Math.Max(waterError / Math.Max(water, double.Epsilon), numberError / (number + (Forgotten * mostNumber)));
    }

    /// <summary>Takes over the result of a step: none below zero, and rounding taken back where most of the water is.</summary>
    private bool TryAccept(double expected)
    {
        double total = 0;
        var fullest = 0;
        var result = method.Result;
        for (var i = 0; i < result.Length; i++)
        {
            total += result[i];
            fullest = result[i] > result[fullest] ? i : fullest;
        }

        if (!(Math.Abs(total - expected) <= MostRounding * expected))
        {
            return false;
        }

        result.CopyTo(state);
        state[fullest] += expected - total;
        for (var depth = 0; depth < setup.Depths; depth++)
        {
            CellWater.FillLack(state.AsSpan(system.Of(depth)));
        }

        return true;
    }

    private double MassError(double expected)
    {
        var total = 0.0;
        foreach (var water in state)
        {
            total += water;
        }

        return expected > 0 ? Math.Abs(total - expected) / expected : total;
    }

    private PopulationBalanceState Tell(double now)
    {
        var mean = new double[grid.Cells];
        double water = 0, number = 0;
        for (var depth = 0; depth < setup.Depths; depth++)
        {
            var cells = state.AsSpan(system.Of(depth));
            for (var i = 0; i < mean.Length; i++)
            {
                mean[i] += cells[i] / setup.Depths;
                water += cells[i] / setup.Depths;
                number += cells[i] * perVolume[i] / setup.Depths;
            }
        }

        return new(now, water, state[^1] / setup.Depths, number, CellWater.MedianM(grid, mean), mean);
    }
}
