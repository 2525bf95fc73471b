using MathNet.Numerics.Integration;
using Plant.Physics.Droplets;
using Plant.Physics.Fluids;

namespace Plant.Physics.Tanks;

/// <summary>A reservoir as a gravity separator.</summary>
public static class GravitySeparation
{
    /// <summary>Mean residence time.</summary>
    /// <param name="volumeM3">Volume of the fluid [m³].</param>
    /// <param name="flowM3S">Circulation [m³/s].</param>
    /// <returns>Residence time [s].</returns>
    /// <remarks>Equation: V/Q. Source: definition. Valid for: any flow above 0.</remarks>
    public static double ResidenceTimeS(double volumeM3, double flowM3S) => Guard.Positive(volumeM3) / Guard.Positive(flowM3S);

    /// <summary>Overflow rate: the velocity of a drop that is just caught.</summary>
    /// <param name="flowM3S">Circulation [m³/s].</param>
    /// <param name="areaM2">Plan area [m²].</param>
    /// <returns>Velocity [m/s].</returns>
    /// <remarks>Equation: Q/A. Source: Hazen 1904 (from memory). Valid for: quiet flow.</remarks>
    public static double OverflowRateMS(double flowM3S, double areaM2) => Guard.NotNegative(flowM3S) / Guard.Positive(areaM2);

    /// <summary>Share of drops of one velocity that a pass removes.</summary>
    /// <param name="velocityMS">Settling velocity, either way [m/s].</param>
    /// <param name="overflowRateMS">Overflow rate [m/s].</param>
    /// <param name="tanksInSeries">Number of equal stirred tanks in series [1]; null for the ideal tank.</param>
    /// <returns>Removed share [0 to 1].</returns>
    /// <remarks>Equation: min(1, v/u), or 1 − (1 + v/(n·u))^−n. Source: Hazen 1904 (from memory). Valid for: any n above 0.</remarks>
    public static double Removal(double velocityMS, double overflowRateMS, double? tanksInSeries = null)
    {
        var ratio = Math.Abs(Guard.Finite(velocityMS)) / Guard.Positive(overflowRateMS);
        return tanksInSeries is { } n ? 1 - Math.Pow(1 + (ratio / Guard.Positive(n)), -n) : Math.Min(1, ratio);
    }

    /// <summary>Removed share of a lognormal spray.</summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="overflowRateMS">Overflow rate [m/s].</param>
    /// <param name="tanksInSeries">Number of tanks in series [1]; null for the ideal tank.</param>
    /// <param name="medianM">Median droplet diameter by volume [m].</param>
    /// <param name="geometricDeviation">Geometric standard deviation [1]; 1 for one size.</param>
    /// <returns>Removed share by volume [0 to 1].</returns>
    /// <remarks>Equation: ∫ R(v(d)) dF(d), by Gauss–Legendre over ±6 standard deviations, cut at the kink. Source: definition. Valid for: dilute water.</remarks>
    public static double LognormalRemoval(FluidModel fluid, double temperatureK, double overflowRateMS, double? tanksInSeries, double medianM, double geometricDeviation)
    {
        Guard.Positive(medianM);
        Guard.Between(geometricDeviation, 1, 20);
        var settling = new DropletSettling(fluid, temperatureK);
        var spread = Math.Log(geometricDeviation);
        if (spread == 0)
        {
            return Removal(settling.VelocityMS(medianM), overflowRateMS, tanksInSeries);
        }

        double Part(double z) => Removal(settling.VelocityMS(medianM * Math.Exp(spread * z)), overflowRateMS, tanksInSeries) * Math.Exp(-0.5 * z * z) / Math.Sqrt(2 * Math.PI);
        var cut = settling.CutSizeM(overflowRateMS) is { } size ? Math.Clamp(Math.Log(size / medianM) / spread, -6, 6) : 0;
        var total = 0.0;
        const int panels = 12;
        foreach (var (from, to) in new[] { (-6.0, cut), (cut, 6.0) })
        {
            var step = (to - from) / panels;
            for (var i = 0; i < panels && step > 0; i++)
            {
                total += GaussLegendreRule.Integrate(Part, from + (i * step), from + ((i + 1) * step), 16);
            }
        }

        return Math.Clamp(total, 0, 1);
    }
}
