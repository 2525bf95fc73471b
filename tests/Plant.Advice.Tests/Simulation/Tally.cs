namespace Plant.Advice.Tests.Simulation;

/// <summary>How often the truth lay inside an interval.</summary>
internal sealed class Tally
{
    private int below, inside, above;

    public int Count => below + inside + above;

    public double Share => (double)inside / Count;

    /// <summary>Counts one interval.</summary>
    /// <param name="truth">The truth.</param>
    /// <param name="low">Lower end.</param>
    /// <param name="high">Upper end.</param>
    /// <param name="grace">Amount by which the truth may miss an end and still counts as inside.</param>
    public void Add(double truth, double? low, double? high, double grace = 0)
    {
        if (truth < low - grace)
        {
            below++;
        }
        else if (truth > high + grace)
        {
            above++;
        }
        else if (low is not null)
        {
            inside++;
        }
    }

    public override string ToString() => FormattableString.Invariant($"{Share:P1} of {Count} ({(double)below / Count:P1} below, {(double)above / Count:P1} above)");
}
