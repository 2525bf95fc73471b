namespace Plant.Physics.Ingress;

/// <summary>Steam that leaves a turbine's shaft seals towards the bearings.</summary>
public static class GlandSteam
{
    /// <summary>Leak of a labyrinth.</summary>
    /// <param name="clearanceM2">Area of the clearance [m²].</param>
    /// <param name="upstreamPa">Absolute pressure before it [Pa].</param>
    /// <param name="upstreamK">Temperature before it [K].</param>
    /// <param name="downstreamPa">Absolute pressure behind it [Pa].</param>
    /// <param name="teeth">Number of throttling points [1].</param>
    /// <returns>Leak [kg/s].</returns>
    /// <remarks>
    /// Equation: A·√(p0·ρ0)·√((1 − β²)/(n − ln β)), β = p/p0. Source: Martin 1908 (from memory), steam as an ideal gas, no contraction and no carry-over.
    /// Valid for: many teeth, below choking; real ones differ by a factor of about 0.7 to 1.3.
    /// </remarks>
    public static double LabyrinthKgS(double clearanceM2, double upstreamPa, double upstreamK, double downstreamPa, double teeth)
    {
        var ratio = Guard.Positive(Guard.Between(downstreamPa, 0, Guard.Positive(upstreamPa))) / upstreamPa;
        var density = upstreamPa / (Constants.WaterVapourJKgK * Guard.Positive(upstreamK));
        return Guard.NotNegative(clearanceM2) * Math.Sqrt(upstreamPa * density * (1 - (ratio * ratio)) / (Guard.Between(teeth, 1, 1000) - Math.Log(ratio)));
    }

    /// <summary>Water that gets into the oil.</summary>
    /// <param name="leakKgS">Leak of the seals [kg/s].</param>
    /// <param name="condensedShare">Share that reaches and condenses in the oil; no measured range is known: a prior [0 to 1].</param>
    /// <returns>Ingress [kg/s].</returns>
    /// <remarks>Equation: leak × share. Source: definition. Valid for: any. 1 kg/h is 24 kg a day.</remarks>
    public static double IngressKgS(double leakKgS, double condensedShare) => Guard.NotNegative(leakKgS) * Guard.Between(condensedShare, 0, 1);
}
