namespace Plant.Physics.Coalescence;

/// <summary>
/// Linearly implicit Euler steps, extrapolated to high order. The approximate Jacobian damps only what is fast, so a step needs no factorisation;
/// extrapolation removes what the Jacobian leaves out as it removes every other error that is a power of the step.
/// </summary>
internal sealed class ImplicitExtrapolation
{
    /// <summary>Order of a step [1]. Measured: 5 to 9 differ little, 6 is the fastest at the usual tolerance.</summary>
    public const int Order = 6;

    private readonly SizeSystem system;
    private readonly double[][] rows;
    private readonly double[] begin;
    private readonly double[] rate;
    private readonly double[] change;

    public ImplicitExtrapolation(SizeSystem system)
    {
        this.system = system;
        rows = [.. Enumerable.Range(0, Order).Select(_ => new double[system.Size])];
        begin = new double[system.Size];
        rate = new double[system.Size];
        change = new double[system.Size];
    }

    /// <summary>Sums over all pairs so far [1].</summary>
    public int Evaluations { get; private set; }

    /// <summary>Rate of change at the start of the step.</summary>
    public ReadOnlySpan<double> BeginRate => begin;

    /// <summary>The state after <see cref="Step"/>.</summary>
    public ReadOnlySpan<double> Result => rows[0];

    /// <summary>The same of one order less, to judge the error by.</summary>
    public ReadOnlySpan<double> NextBest => rows[1];

    /// <summary>Makes a state the start of steps.</summary>
    /// <param name="state">The state.</param>
    public void Begin(ReadOnlySpan<double> state)
    {
        Evaluate(state, begin);
        system.FixJacobian();
    }

    /// <summary>Tries a step from the state given to <see cref="Begin"/>.</summary>
    /// <param name="state">That state.</param>
    /// <param name="seconds">The step [s].</param>
    public void Step(ReadOnlySpan<double> state, double seconds)
    {
        for (var row = 0; row < Order; row++)
        {
            var parts = row + 1;
            Euler(state, seconds / parts, parts, rows[row]);
            // Aitken and Neville on harmonic steps: the newest row moves the ones before it one order up
            for (var back = row - 1; back >= 0; back--)
            {
                var factor = 1 / (((double)parts / (back + 1)) - 1);
                var (fine, coarse) = (rows[back + 1], rows[back]);
                for (var i = 0; i < coarse.Length; i++)
                {
                    coarse[i] = fine[i] + ((fine[i] - coarse[i]) * factor);
                }
            }
        }
    }

    private void Euler(ReadOnlySpan<double> state, double seconds, int parts, double[] y)
    {
        system.SetStep(seconds);
        state.CopyTo(y);
        for (var part = 0; part < parts; part++)
        {
            var source = begin;
            if (part > 0)
            {
                Evaluate(y, rate);
                source = rate;
            }

            for (var i = 0; i < change.Length; i++)
            {
                change[i] = source[i] * seconds;
            }

            system.Solve(change);
            for (var i = 0; i < y.Length; i++)
            {
                y[i] += change[i];
            }
        }
    }

    private void Evaluate(ReadOnlySpan<double> state, Span<double> into)
    {
        Evaluations++;
        system.Evaluate(state, into);
    }
}
