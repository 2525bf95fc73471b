using Plant.Physics.Fluids;

namespace Plant.Advice.Ledger;

/// <summary>What is believed before anything is observed. Judgement, from memory, unverified: broad on purpose.</summary>
public static class Priors
{
    /// <summary>Source line of every number here.</summary>
    public const string Source = "judgement (from memory, unverified)";

    /// <summary>Median of the usual ingress, as rise of the water content [mg/kg per day].</summary>
    public const double IngressPpmPerDay = 15;

    /// <summary>Standard deviation of its natural logarithm [1].</summary>
    public const double IngressLogSd = 1.5;

    /// <summary>Share of the settled water that a drain takes [0 to 1].</summary>
    public const double DrainEfficiency = 0.9;

    /// <summary>Standard deviation of that share [1].</summary>
    public const double DrainEfficiencySd = 0.08;

    /// <summary>Scatter of sampling, as a share of the content [1].</summary>
    public const double SamplingShare = 0.07;

    /// <summary>Scatter of sampling that does not grow with the content [mg/kg].</summary>
    public const double SamplingPpm = 5;

    /// <summary>Smallest drained volume that can be told from nothing [L].</summary>
    public const double SmallestDrainL = 0.02;

    /// <summary>Leaks that start in a year, for planning [1/year].</summary>
    public const double LeaksPerYear = 0.25;

    /// <summary>Share of the time in which the oil stands cold or is still filling up again after it [1].</summary>
    public const double ColdStandShare = 0.12;

    /// <summary>Share of the undissolved water that settles in a day [1/day].</summary>
    public const double ClearingPerDay = 2;

    /// <summary>Share of the missing water that warm oil takes back from the bottom in a day [1/day].</summary>
    public const double RedissolvedPerDay = 0.02;

    /// <summary>Share of the ingress that settles in oil that is above its cold saturation and is never drained [1].</summary>
    public const double UndrainedShare = 0.35;

    /// <summary>Density of water [kg/L].</summary>
    public const double WaterKgPerL = 0.998;

    /// <summary>By how much a leak multiplies the ingress: five equally likely values [1].</summary>
    public static readonly double[] LeakFactors = [2.8, 5.6, 11, 22, 43];

    /// <summary>Exchange of humidity with the headspace [1/day].</summary>
    /// <param name="breather">How the reservoir breathes.</param>
    /// <returns>Rate [1/day].</returns>
    public static double HumidityExchangePerDay(Breather? breather) => breather is null or Breather.Open ? 0.01 : 0.0008;

    /// <summary>Relative uncertainty of the saturation [1].</summary>
    /// <param name="fluid">The fluid.</param>
    /// <returns>Standard deviation of its natural logarithm [1].</returns>
    public static double SaturationLogSd(FluidModel fluid)
    {
        ArgumentNullException.ThrowIfNull(fluid);
        return fluid.SolubilityIsFamilyDefault ? 0.35 : 0.14;
    }
}
