using MathNet.Numerics;

namespace Plant.Physics.Droplets;

/// <summary>Lognormal sizes of drops. The median by number, the median by volume and every mean follow from one another.</summary>
/// <remarks>Equation: D[p,q] = d_n50·exp(½(p + q)·ln²σ). Source: Hatch and Choate 1929 (from memory). Valid for: any size.</remarks>
public sealed class LognormalDistribution : IDropletDistribution
{
    private readonly double spread;

    private LognormalDistribution(double medianNumberM, double geometricDeviation)
    {
        MedianNumberM = medianNumberM;
        GeometricDeviation = geometricDeviation;
        spread = Math.Log(geometricDeviation);
    }

    /// <summary>Median diameter by number [m].</summary>
    public double MedianNumberM { get; }

    /// <summary>Geometric standard deviation [1].</summary>
    public double GeometricDeviation { get; }

    /// <summary>Median diameter by volume [m].</summary>
    public double MedianVolumeM => MedianNumberM * Math.Exp(3 * spread * spread);

    /// <summary>Sauter mean diameter, volume over surface [m].</summary>
    public double SauterM => MeanM(3, 2);

    /// <summary>From the median by number.</summary>
    /// <param name="medianM">Median diameter by number [m].</param>
    /// <param name="geometricDeviation">Geometric standard deviation, at least 1 [1].</param>
    /// <returns>The distribution.</returns>
    public static LognormalDistribution ByNumber(double medianM, double geometricDeviation) =>
        new(Guard.Positive(medianM), Guard.Between(geometricDeviation, 1, 100));

    /// <summary>From the median by volume.</summary>
    /// <param name="medianM">Median diameter by volume [m].</param>
    /// <param name="geometricDeviation">Geometric standard deviation, at least 1 [1].</param>
    /// <returns>The distribution.</returns>
    public static LognormalDistribution ByVolume(double medianM, double geometricDeviation)
    {
        var spread = Math.Log(Guard.Between(geometricDeviation, 1, 100));
        return new(Guard.Positive(medianM) * Math.Exp(-3 * spread * spread), geometricDeviation);
    }

    /// <summary>Mean diameter of an order, such as D[3,2].</summary>
    /// <param name="upper">Order p [1].</param>
    /// <param name="lower">Order q [1].</param>
    /// <returns>Mean diameter [m].</returns>
    /// <remarks>Equation: d_n50·exp(½(p + q)·ln²σ). Source: Hatch and Choate 1929 (from memory). Valid for: any orders.</remarks>
    public double MeanM(double upper, double lower) => MedianNumberM * Math.Exp(0.5 * (Guard.Finite(upper) + Guard.Finite(lower)) * spread * spread);

    /// <summary>Share of the volume in drops below a size.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <returns>Share by volume [0 to 1].</returns>
    /// <remarks>Equation: Φ(ln(d/d_v50)/ln σ). Source: definition. Valid for: any size.</remarks>
    public double VolumeBelow(double diameterM) => Below(diameterM, MedianVolumeM);

    /// <summary>Share of the drops below a size.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <returns>Share by number [0 to 1].</returns>
    /// <remarks>Equation: Φ(ln(d/d_n50)/ln σ). Source: definition. Valid for: any size.</remarks>
    public double NumberBelow(double diameterM) => Below(diameterM, MedianNumberM);

    private double Below(double diameterM, double medianM)
    {
        var distance = Math.Log(Guard.Positive(diameterM) / medianM);
        return spread > 0 ? 0.5 * SpecialFunctions.Erfc(-distance / (spread * Math.Sqrt(2))) : distance >= 0 ? 1 : 0;
    }
}
