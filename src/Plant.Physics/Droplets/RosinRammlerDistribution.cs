using System.Globalization;
using MathNet.Numerics;

namespace Plant.Physics.Droplets;

/// <summary>Sizes of drops after Rosin and Rammler, by volume: the share above d is exp(−(d/X)^n).</summary>
/// <remarks>Equation: F = 1 − exp(−(d/X)^n). Source: Rosin and Rammler 1933 (from memory). Valid for: sprays and pipe flow, n about 2.6 (from memory).</remarks>
public sealed class RosinRammlerDistribution : IDropletDistribution
{
    /// <summary>Takes size and spread.</summary>
    /// <param name="sizeM">Size X below which lie 63.2 % of the volume [m].</param>
    /// <param name="spread">Exponent n: the larger, the narrower [1].</param>
    public RosinRammlerDistribution(double sizeM, double spread)
    {
        SizeM = Guard.Positive(sizeM);
        Spread = Guard.Positive(spread);
    }

    /// <summary>Size below which lie 63.2 % of the volume [m].</summary>
    public double SizeM { get; }

    /// <summary>Exponent n [1].</summary>
    public double Spread { get; }

    /// <summary>Median diameter by volume [m].</summary>
    public double MedianVolumeM => QuantileM(0.5);

    /// <summary>Mean diameter by volume, D[4,3] [m].</summary>
    public double VolumeMeanM => SizeM * SpecialFunctions.Gamma(1 + (1 / Spread));

    /// <summary>Sauter mean diameter, volume over surface: X/Γ(1 − 1/n).</summary>
    /// <param name="refusals">Receives a refusal where n is 1 or less: the many small drops then have a surface without bound, and the mean is zero.</param>
    /// <returns>Diameter [m]; null where it diverges.</returns>
    public double? SauterM(ICollection<Refusal> refusals)
    {
        ArgumentNullException.ThrowIfNull(refusals);
        if (Spread > 1)
        {
            return SizeM / SpecialFunctions.Gamma(1 - (1 / Spread));
        }

        refusals.Add(new Refusal("spread", Spread.ToString("R", CultureInfo.InvariantCulture), "must be above 1: at or below it the surface of the small drops has no bound and there is no Sauter mean"));
        return null;
    }

    /// <summary>Size below which a share of the volume lies.</summary>
    /// <param name="volumeShare">Share by volume [0 to 1).</param>
    /// <returns>Diameter [m].</returns>
    /// <remarks>Equation: X·(−ln(1 − F))^(1/n). Source: Rosin and Rammler 1933 (from memory). Valid for: shares below 1.</remarks>
    public double QuantileM(double volumeShare) => SizeM * Math.Pow(-Math.Log(1 - Guard.Between(volumeShare, 0, 1 - 1e-15)), 1 / Spread);

    /// <summary>Share of the volume in drops below a size.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <returns>Share by volume [0 to 1].</returns>
    /// <remarks>Equation: 1 − exp(−(d/X)^n). Source: Rosin and Rammler 1933 (from memory). Valid for: any size.</remarks>
    public double VolumeBelow(double diameterM)
    {
        var power = Math.Pow(Guard.NotNegative(diameterM) / SizeM, Spread);
        return power < 1e-5 ? power * (1 - (0.5 * power)) : 1 - Math.Exp(-power);
    }
}
