namespace Plant.Physics.Laboratory;

/// <summary>Repeatability of a method: the difference that two results of one operator exceed once in twenty times.</summary>
/// <param name="Method">Code of the method.</param>
/// <param name="Coefficient">c in r = c·w^p with w and r in mg/kg.</param>
/// <param name="Power">p in r = c·w^p [1].</param>
/// <param name="Source">Where it comes from, with its standing.</param>
public sealed record Repeatability(string Method, double Coefficient, double Power, string Source)
{
    /// <summary>The table: editable, and unverified until somebody holds it against the standards.</summary>
    public static IReadOnlyList<Repeatability> Table { get; } =
    [
        new("kf-coulometric", 1.874, 0.5, Citations.Iso12937),
        // r = 0.03813·X^0.6 in %: for mg/kg multiply by 10^4·10^(−4·0.6)
        new("kf-evaporator", 0.03813 * 39.810717055349734, 0.6, Citations.D6304),
        new("kf-volumetric", 2 * 1.874, 0.5, "twice " + Citations.Iso12937),
    ];

    /// <summary>The row of a method.</summary>
    /// <param name="method">Code of the method.</param>
    /// <returns>The row; null for a method without one.</returns>
    public static Repeatability? Of(string method) => Table.FirstOrDefault(row => row.Method == method);

    /// <summary>Repeatability at a content.</summary>
    /// <param name="waterPpm">Water content [mg/kg].</param>
    /// <returns>Repeatability r [mg/kg].</returns>
    /// <remarks>Equation: c·w^p. Source: the row's own. Valid for: the scope of the method.</remarks>
    public double AtPpm(double waterPpm) => Coefficient * Math.Pow(Guard.NotNegative(waterPpm), Power);
}
