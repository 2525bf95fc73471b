namespace Plant.Physics.Coalescence;

/// <summary>
/// How a new drop of any volume is shared among the six cells about it, so that number, volume and the next four moments are kept.
/// Two cells alone, which keep number and volume, spread the growth by small drops like an upwind scheme of first order; that costs percents at 40 cells.
/// </summary>
internal static class Redistribution
{
    /// <summary>Cells that share a drop [1].</summary>
    public const int Cells = 6;

    /// <summary>Cells below the drop's own that take part [1].</summary>
    public const int Below = 2;

    /// <summary>What the sum over pairs needs: the linear share of the upper neighbour, then the shares of the four outer cells; the inner two follow from number and volume.</summary>
    /// <param name="position">Volume of the drop over that of the cell just below it, from 1 to the ratio [1].</param>
    /// <param name="ratio">Ratio of neighbouring volumes [1].</param>
    /// <param name="shares">Receives five shares by number.</param>
    /// <remarks>Equation: Lagrange polynomials in volume on nodes q^−2 … q³. Source: extends Kumar and Ramkrishna 1996, who keep two moments.</remarks>
    public static void Outer(double position, double ratio, Span<double> shares)
    {
        shares[0] = (position - 1) / (ratio - 1);
        shares[1] = Lagrange(position, ratio, 0);
        shares[2] = Lagrange(position, ratio, 1);
        shares[3] = Lagrange(position, ratio, 4);
        shares[4] = Lagrange(position, ratio, 5);
    }

    private static double Lagrange(double position, double ratio, int node)
    {
        var value = 1.0;
        var own = Math.Pow(ratio, node - Below);
        for (var other = 0; other < Cells; other++)
        {
            if (other != node)
            {
                var place = Math.Pow(ratio, other - Below);
                value *= (position - place) / (own - place);
            }
        }

        return value;
    }
}
