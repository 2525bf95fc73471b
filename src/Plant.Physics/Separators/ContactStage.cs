namespace Plant.Physics.Separators;

/// <summary>How near one pass brings the oil to equilibrium.</summary>
public static class ContactStage
{
    /// <summary>Contact efficiency from contents before and after.</summary>
    /// <param name="inletPpm">Content before [mg/kg].</param>
    /// <param name="outletPpm">Content after [mg/kg].</param>
    /// <param name="equilibriumPpm">Content in equilibrium [mg/kg].</param>
    /// <returns>Efficiency [1]; 1 where the oil leaves in equilibrium.</returns>
    /// <remarks>Equation: (C_in − C_out)/(C_in − C_eq). Source: definition (Murphree). Valid for: an inlet other than the equilibrium.</remarks>
    public static double Efficiency(double inletPpm, double outletPpm, double equilibriumPpm)
    {
        var whole = Guard.NotNegative(inletPpm) - Guard.NotNegative(equilibriumPpm);
        return whole == 0
            ? throw new ArgumentOutOfRangeException(nameof(equilibriumPpm), equilibriumPpm, "must differ from the content before")
            : (inletPpm - Guard.NotNegative(outletPpm)) / whole;
    }

    /// <summary>Contact efficiency of stages in counter-current.</summary>
    /// <param name="strippingFactor">Stripping factor: what the gas can carry over what the oil brings, per stage [1].</param>
    /// <param name="stages">Number of ideal stages [1].</param>
    /// <returns>Efficiency [0 to 1].</returns>
    /// <remarks>Equation: (S^(N+1) − S)/(S^(N+1) − 1), N/(N + 1) at S = 1. Source: Kremser 1930 (from memory). Valid for: a straight equilibrium line.</remarks>
    public static double Kremser(double strippingFactor, double stages)
    {
        var s = Guard.Positive(strippingFactor);
        var n = Guard.Positive(stages);
        if (Math.Abs(s - 1) < 1e-7)
        {
            return n / (n + 1);
        }

        // written in the smaller of s and 1/s, so that many stages do not overflow
        return s < 1
            ? (s - Math.Pow(s, n + 1)) / (1 - Math.Pow(s, n + 1))
            : (1 - Math.Pow(s, -n)) / (1 - Math.Pow(s, -n - 1));
    }
}
