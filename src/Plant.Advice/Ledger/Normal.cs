using MathNet.Numerics;

namespace Plant.Advice.Ledger;

/// <summary>The normal distribution.</summary>
internal static class Normal
{
    /// <summary>5 % and 95 % points of a central 90 % interval.</summary>
    public const double Z90 = 1.6448536269514722;

    public static double Cdf(double z) => 0.5 * SpecialFunctions.Erfc(-z / 1.4142135623730951);

    public static double Quantile(double p) => -1.4142135623730951 * SpecialFunctions.ErfcInv(2 * p);
}
