namespace Plant.Physics.Coalescence;

/// <summary>Share of collisions that end in one drop.</summary>
public static class CollisionEfficiency
{
    /// <summary>Coefficient of Coulaloglou and Tavlarides [1/m²]: 1.83e9 per cm² in the paper (from memory). A public library has 1.83e9 per m², which makes nearly every collision count.</summary>
    public const double FilmCoefficientPerM2 = 1.83e13;

    /// <summary>Hamaker constant of water, hydrocarbon, water [J] (from memory).</summary>
    public const double HamakerJ = 4e-21;

    /// <summary>Share of collisions that last until the film between the drops is gone.</summary>
    /// <param name="drainageS">Time that the film needs to drain [s].</param>
    /// <param name="contactS">Time that the drops stay together [s].</param>
    /// <returns>Collision efficiency [0 to 1].</returns>
    /// <remarks>Equation: exp(−t_drain/t_contact). Source: Coulaloglou and Tavlarides 1977 (from memory). Valid for: random times of contact.</remarks>
    public static double FilmDrainage(double drainageS, double contactS) => Math.Exp(-Guard.NotNegative(drainageS) / Guard.Positive(contactS));

    /// <summary>Time that a film between immobile surfaces needs to drain.</summary>
    /// <param name="viscosityPaS">Dynamic viscosity of the oil [Pa·s].</param>
    /// <param name="radiusM">Equivalent radius of the drops, 2·r1·r2/(r1 + r2) [m].</param>
    /// <param name="forceN">Force that presses them together [N].</param>
    /// <param name="tensionNM">Interfacial tension [N/m].</param>
    /// <param name="filmM">Thickness at which the film breaks [m].</param>
    /// <returns>Time [s].</returns>
    /// <remarks>Equation: 3μR²F/(16πσ²h²). Source: Chesters 1991 (from memory). Valid for: surfaces held by surfactant, as in used oil.</remarks>
    public static double ImmobileDrainageS(double viscosityPaS, double radiusM, double forceN, double tensionNM, double filmM) =>
        3 * Guard.Positive(viscosityPaS) * Guard.Positive(radiusM) * radiusM * Guard.NotNegative(forceN) / (16 * Math.PI * Guard.Positive(tensionNM) * tensionNM * Guard.Positive(filmM) * filmM);

    /// <summary>Time that a film between partly mobile surfaces needs to drain.</summary>
    /// <param name="dropViscosityPaS">Dynamic viscosity of the drops [Pa·s].</param>
    /// <param name="radiusM">Equivalent radius of the drops [m].</param>
    /// <param name="forceN">Force that presses them together [N].</param>
    /// <param name="tensionNM">Interfacial tension [N/m].</param>
    /// <param name="filmM">Thickness at which the film breaks [m].</param>
    /// <returns>Time [s].</returns>
    /// <remarks>Equation: πμd√F/(2h)·(R/(4πσ))^1.5. Source: Chesters 1991 (from memory). Valid for: clean surfaces.</remarks>
    public static double MobileDrainageS(double dropViscosityPaS, double radiusM, double forceN, double tensionNM, double filmM) =>
        Math.PI * Guard.Positive(dropViscosityPaS) * Math.Sqrt(Guard.NotNegative(forceN)) / (2 * Guard.Positive(filmM)) * Math.Pow(Guard.Positive(radiusM) / (4 * Math.PI * Guard.Positive(tensionNM)), 1.5);

    /// <summary>Thickness at which a film breaks.</summary>
    /// <param name="radiusM">Equivalent radius of the drops [m].</param>
    /// <param name="tensionNM">Interfacial tension [N/m].</param>
    /// <param name="hamakerJ">Hamaker constant [J].</param>
    /// <returns>Thickness [m].</returns>
    /// <remarks>Equation: (A·R/(8πσ))^⅓. Source: Chesters 1991 (from memory). Valid for: films that van der Waals forces break.</remarks>
    public static double CriticalFilmM(double radiusM, double tensionNM, double hamakerJ = HamakerJ) =>
        Math.Cbrt(Guard.Positive(hamakerJ) * Guard.Positive(radiusM) / (8 * Math.PI * Guard.Positive(tensionNM)));

    /// <summary>Van der Waals force between two drops.</summary>
    /// <param name="firstM">Diameter of the one drop [m].</param>
    /// <param name="secondM">Diameter of the other [m].</param>
    /// <param name="gapM">Gap between them [m].</param>
    /// <param name="hamakerJ">Hamaker constant [J].</param>
    /// <returns>Force [N].</returns>
    /// <remarks>Equation: A·r1·r2/(6h²(r1 + r2)). Source: Hamaker 1937 (from memory). Valid for: gaps far below the radii.</remarks>
    public static double VanDerWaalsN(double firstM, double secondM, double gapM, double hamakerJ = HamakerJ)
    {
        double r1 = 0.5 * Guard.Positive(firstM), r2 = 0.5 * Guard.Positive(secondM);
        return Guard.Positive(hamakerJ) * r1 * r2 / (6 * Guard.Positive(gapM) * gapM * (r1 + r2));
    }

    /// <summary>Efficiency in turbulence.</summary>
    /// <param name="firstM">Diameter of the one drop [m].</param>
    /// <param name="secondM">Diameter of the other [m].</param>
    /// <param name="oil">The oil and its turbulence.</param>
    /// <param name="coefficientPerM2">Coefficient, to be calibrated [1/m²].</param>
    /// <returns>Collision efficiency [0 to 1].</returns>
    /// <remarks>
    /// Equation: exp(−C2·μρε/(σ²(1 + φ)³)·(d1d2/(d1 + d2))⁴). Source: Coulaloglou and Tavlarides 1977 (C2 from memory). Valid for: drops above the Kolmogorov length.
    /// Disagrees with: a public library that takes the C2 per cm² as per m².
    /// </remarks>
    public static double CoulaloglouTavlarides(double firstM, double secondM, TurbulentOil oil, double coefficientPerM2 = FilmCoefficientPerM2)
    {
        ArgumentNullException.ThrowIfNull(oil);
        var size = Guard.Positive(firstM) * Guard.Positive(secondM) / (firstM + secondM);
        var crowd = 1 + Guard.Between(oil.VolumeFraction, 0, 1);
        return Math.Exp(-Guard.NotNegative(coefficientPerM2) * Guard.Positive(oil.ViscosityPaS) * Guard.Positive(oil.DensityKgM3) * Guard.NotNegative(oil.DissipationWKg)
            / (Guard.Positive(oil.TensionNM) * oil.TensionNM * crowd * crowd * crowd) * Math.Pow(size, 4));
    }

    /// <summary>A first guess from what is measured on oils. Judgement: no published relation; calibrate on the reservoir.</summary>
    /// <param name="demulsibilityMinutes">Time to separate by ASTM D1401 [min]; null where not known.</param>
    /// <param name="tensionNM">Interfacial tension [N/m]; null where not known.</param>
    /// <param name="working">Receives the step, or null.</param>
    /// <returns>Collision efficiency [0 to 1].</returns>
    /// <remarks>
    /// Equation: 0.1 up to 15 min, a tenth for each further 22.5 min, not below 0.0001; times a third for each 15 mN/m below 40, not below a ninth. Source: judgement.
    /// Valid for: order of magnitude only; within 15 min oils separate fast, 30 is the usual limit, 60 and more never.
    /// </remarks>
    public static double Prior(double? demulsibilityMinutes, double? tensionNM, Working? working = null)
    {
        var byTime = demulsibilityMinutes is { } minutes ? Math.Max(1e-4, 0.1 * Math.Pow(10, -Math.Max(0, Guard.NotNegative(minutes) - 15) / 22.5)) : 0.1;
        var byTension = tensionNM is { } tension ? Math.Pow(1.0 / 3, Math.Clamp((0.040 - Guard.Positive(tension)) / 0.015, 0, 2)) : 1;
        var value = byTime * byTension;
        working?.Add("collision efficiency, first guess",
            FormattableString.Invariant($"{byTime:0.####} by demulsibility {(demulsibilityMinutes is null ? "(not known)" : $"{demulsibilityMinutes} min")} × {byTension:0.###} by interfacial tension {(tensionNM is null ? "(not known)" : $"{tensionNM * 1000} mN/m")}"),
            value, "1", Citations.Judgement, "a guess of the order of magnitude: give collisionEfficiency where it is known");
        return value;
    }
}
