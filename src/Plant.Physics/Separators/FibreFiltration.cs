namespace Plant.Physics.Separators;

/// <summary>Catching of drops by fibres in creeping flow.</summary>
public static class FibreFiltration
{
    /// <summary>Hydrodynamic factor of the cell around a fibre.</summary>
    /// <param name="solidity">Volume fraction of fibres [0 to 1].</param>
    /// <returns>Factor [1].</returns>
    /// <remarks>Equation: −½·ln α − ¾ + α − α²/4. Source: Kuwabara 1959 (from memory). Valid for: creeping flow across parallel fibres.</remarks>
    public static double KuwabaraFactor(double solidity)
    {
        var a = Open(solidity);
        return (-0.5 * Math.Log(a)) - 0.75 + a - (0.25 * a * a);
    }

    /// <summary>Drops that a fibre catches because they are as large as their path is near.</summary>
    /// <param name="diameterM">Diameter of the drop [m].</param>
    /// <param name="fibreM">Diameter of the fibre [m].</param>
    /// <param name="solidity">Volume fraction of fibres [0 to 1].</param>
    /// <returns>Single-fibre efficiency over the fibre's diameter [1]; that of the whole cell where the drop is larger than the cell.</returns>
    /// <remarks>
    /// Equation: (1 + R)/(2Ku)·(2·ln(1 + R) − 1 + α + (1 − α/2)/(1 + R)² − α/2·(1 + R)²), R = d/d_f. Source: stream function of Kuwabara 1959 (from memory).
    /// Valid for: 1 + R up to 1/√α, the edge of the cell, and held there beyond. Disagrees with: Lee and Liu's 0.6(1 − α)/Ku·R²/(1 + R), which is 0.55 to 0.59 of it.
    /// </remarks>
    public static double Interception(double diameterM, double fibreM, double solidity)
    {
        var a = Open(solidity);
        var r = Guard.NotNegative(diameterM) / Guard.Positive(fibreM);
        var factor = KuwabaraFactor(a);
        if (r < 1e-3)
        {
            // the closed form loses its digits here
            return (((1 - a) * r * r) - (2 * r * r * r / 3) + (((28 - (12 * a)) / 48) * Math.Pow(r, 4))) / factor;
        }

        var u = Math.Min(1 + r, CellEdge(a));
        return u / (2 * factor) * ((2 * Math.Log(u)) - 1 + a + ((1 - (a / 2)) / (u * u)) - (a / 2 * u * u));
    }

    /// <summary>Radius of the cell of flow around a fibre, over the fibre's.</summary>
    /// <param name="solidity">Volume fraction of fibres [0 to 1].</param>
    /// <returns>Ratio [1].</returns>
    /// <remarks>Equation: 1/√α. Source: Kuwabara 1959 (from memory). Valid for: parallel fibres.</remarks>
    public static double CellEdge(double solidity) => 1 / Math.Sqrt(Open(solidity));

    /// <summary>Diffusion coefficient of a drop.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the oil [Pa·s].</param>
    /// <param name="diameterM">Diameter of the drop [m].</param>
    /// <returns>Diffusion coefficient [m²/s].</returns>
    /// <remarks>Equation: kT/(3πμd). Source: Stokes and Einstein. Valid for: drops much larger than molecules.</remarks>
    public static double DiffusionCoefficientM2S(double temperatureK, double viscosityPaS, double diameterM) =>
        Constants.BoltzmannJK * Guard.Positive(temperatureK) / (3 * Math.PI * Guard.Positive(viscosityPaS) * Guard.Positive(diameterM));

    /// <summary>Drops that a fibre catches by diffusion.</summary>
    /// <param name="peclet">Péclet number, velocity × fibre diameter over diffusion coefficient [1].</param>
    /// <param name="solidity">Volume fraction of fibres [0 to 1].</param>
    /// <returns>Single-fibre efficiency [1].</returns>
    /// <remarks>Equation: 1.6·((1 − α)/Ku)^(1/3)·Pe^(−2/3). Source: Lee and Liu 1982 (coefficient from memory). Valid for: Péclet numbers above 10.</remarks>
    public static double Diffusion(double peclet, double solidity) =>
        1.6 * Math.Cbrt((1 - Open(solidity)) / KuwabaraFactor(solidity)) * Math.Pow(Guard.Positive(peclet), -2.0 / 3);

    /// <summary>Drops that a fibre draws through the liquid by London attraction alone.</summary>
    /// <param name="hamakerJ">Hamaker constant, near 4e-21 for water on glass in oil [J].</param>
    /// <param name="diameterM">Diameter of the drop [m].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the oil [Pa·s].</param>
    /// <param name="velocityMS">Face velocity [m/s].</param>
    /// <param name="fibreM">Diameter of the fibre [m].</param>
    /// <param name="solidity">Volume fraction of fibres [0 to 1].</param>
    /// <returns>Single-fibre efficiency [1].</returns>
    /// <remarks>
    /// Equation: (2A·d²(1 − α)²/(3μU·Ku²·d_f⁴))^(1/3). Source: Spielman and Goren 1968 (topic read), limit of thin trajectories with the force 2A·a³/(3y⁴), derived anew.
    /// Valid for: trajectories thin against the fibre and wide against the drop; elsewhere interception rules.
    /// </remarks>
    public static double Attraction(double hamakerJ, double diameterM, double viscosityPaS, double velocityMS, double fibreM, double solidity)
    {
        var shape = (1 - Open(solidity)) / KuwabaraFactor(solidity);
        return Math.Cbrt(2 * Guard.NotNegative(hamakerJ) * Math.Pow(Guard.NotNegative(diameterM) * shape, 2)
            / (3 * Guard.Positive(viscosityPaS) * Guard.Positive(velocityMS) * Math.Pow(Guard.Positive(fibreM), 4)));
    }

    /// <summary>Share that a bed catches.</summary>
    /// <param name="fibreEfficiency">Single-fibre efficiency [1].</param>
    /// <param name="solidity">Volume fraction of fibres [0 to 1].</param>
    /// <param name="thicknessM">Thickness [m].</param>
    /// <param name="fibreM">Diameter of the fibres [m].</param>
    /// <returns>Share [0 to 1].</returns>
    /// <remarks>Equation: 1 − exp(−4α·η·L/(π·d_f(1 − α))). Source: penetration of a bed (from memory). Valid for: a bed that is even and drops that stay.</remarks>
    public static double Removal(double fibreEfficiency, double solidity, double thicknessM, double fibreM) =>
        1 - Math.Exp(-4 * Open(solidity) * Guard.NotNegative(fibreEfficiency) * Guard.NotNegative(thicknessM) / (Math.PI * Guard.Positive(fibreM) * (1 - solidity)));

    /// <summary>Pressure drop of a clean bed.</summary>
    /// <param name="viscosityPaS">Dynamic viscosity of the oil [Pa·s].</param>
    /// <param name="velocityMS">Face velocity [m/s].</param>
    /// <param name="thicknessM">Thickness [m].</param>
    /// <param name="fibreM">Diameter of the fibres [m].</param>
    /// <param name="solidity">Volume fraction of fibres [0 to 1].</param>
    /// <returns>Pressure drop [Pa].</returns>
    /// <remarks>
    /// Equation: μUL/d_f²·64α^1.5(1 + 56α³). Source: Davies 1952 (from memory). Valid for: solidity 0.006 to 0.3, clean and dry of water.
    /// Disagrees with: Kozeny and Ergun, which give half of it at a solidity of 0.1.
    /// </remarks>
    public static double PressureDropPa(double viscosityPaS, double velocityMS, double thicknessM, double fibreM, double solidity) =>
        Guard.Positive(viscosityPaS) * Guard.NotNegative(velocityMS) * Guard.NotNegative(thicknessM) / Math.Pow(Guard.Positive(fibreM), 2)
        * 64 * Math.Pow(Open(solidity), 1.5) * (1 + (56 * Math.Pow(solidity, 3)));

    private static double Open(double solidity) =>
        solidity is > 0 and < 1 ? solidity : throw new ArgumentOutOfRangeException(nameof(solidity), solidity, "must lie between 0 and 1, both excluded");
}
