namespace Plant.Physics.Droplets;

/// <summary>Settling velocities of a drop or sphere. Positive is down.</summary>
public static class Settling
{
    /// <summary>Exponent of hindered settling at low Reynolds number [1].</summary>
    public const double HinderingExponent = 4.65;

    /// <summary>Stokes velocity.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <param name="densityDifferenceKgM3">Density of the drop less density of the fluid [kg/m³].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the fluid [Pa·s].</param>
    /// <returns>Velocity [m/s]; positive down.</returns>
    /// <remarks>Equation: g·d²·Δρ/(18μ). Source: Stokes 1851. Valid for: Reynolds numbers below 0.3.</remarks>
    public static double StokesMS(double diameterM, double densityDifferenceKgM3, double viscosityPaS) =>
        Constants.GravityMS2 * Guard.NotNegative(diameterM) * diameterM * Guard.Finite(densityDifferenceKgM3) / (18 * Guard.Positive(viscosityPaS));

    /// <summary>Factor on the Stokes velocity of a clean drop with a mobile surface.</summary>
    /// <param name="viscosityRatio">Viscosity of the drop over viscosity of the fluid [1].</param>
    /// <returns>Factor from 1 to 1.5 [1].</returns>
    /// <remarks>Equation: 3(1 + k)/(2 + 3k). Source: Hadamard 1911, Rybczynski 1911 (from memory). Valid for: clean interfaces; small drops in used oil fall as rigid spheres.</remarks>
    public static double HadamardRybczynskiFactor(double viscosityRatio) =>
        3 * (1 + Guard.NotNegative(viscosityRatio)) / (2 + (3 * viscosityRatio));

    /// <summary>Drag coefficient of a sphere.</summary>
    /// <param name="reynolds">Reynolds number [1].</param>
    /// <returns>Drag coefficient [1].</returns>
    /// <remarks>Equation: 24/Re·(1 + 0.15·Re^0.687), 0.44 above 1000. Source: Schiller and Naumann 1933 (read). Valid for: Reynolds numbers below 1000. Disagrees with: other drag laws by ± 3 %.</remarks>
    public static double SchillerNaumannDrag(double reynolds) =>
        Guard.Positive(reynolds) < 1000 ? 24 / reynolds * (1 + (0.15 * Math.Pow(reynolds, 0.687))) : 0.44;

    /// <summary>Velocity of a rigid sphere with Schiller–Naumann drag.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <param name="densityDifferenceKgM3">Density of the drop less density of the fluid [kg/m³].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the fluid [Pa·s].</param>
    /// <param name="densityKgM3">Density of the fluid [kg/m³].</param>
    /// <returns>Velocity [m/s]; positive down.</returns>
    /// <remarks>Equation: v(1 + 0.15·Re^0.687) = v_Stokes, by Newton's method on a convex function. Source: Schiller and Naumann 1933 (read). Valid for: Reynolds numbers below 1000.</remarks>
    public static double SchillerNaumannMS(double diameterM, double densityDifferenceKgM3, double viscosityPaS, double densityKgM3)
    {
        var stokes = StokesMS(diameterM, densityDifferenceKgM3, viscosityPaS);
        var target = Math.Abs(stokes);
        if (target == 0)
        {
            return 0;
        }

        var scale = Guard.Positive(densityKgM3) * diameterM / viscosityPaS;
        if (scale * target < 1e-9)
        {
            return stokes;
        }

        var v = target;
        for (var i = 0; i < 50; i++)
        {
            var drag = 0.15 * Math.Pow(scale * v, 0.687);
            var next = v - (((v * (1 + drag)) - target) / (1 + (1.687 * drag)));
            if (Math.Abs(next - v) <= 1e-14 * target)
            {
                v = next;
                break;
            }

            v = next;
        }

        if (scale * v >= 1000)
        {
            v = Math.Sqrt(4 * Constants.GravityMS2 * diameterM * Math.Abs(densityDifferenceKgM3) / (3 * 0.44 * densityKgM3));
        }

        return Math.CopySign(v, stokes);
    }

    /// <summary>Factor of hindered settling.</summary>
    /// <param name="volumeFraction">Volume fraction of drops [0 to 1).</param>
    /// <param name="exponent">Exponent n [1].</param>
    /// <returns>Factor on the velocity of one drop [0 to 1].</returns>
    /// <remarks>Equation: (1 − φ)^n. Source: Richardson and Zaki 1954 (read). Valid for: fractions below 0.4.</remarks>
    public static double RichardsonZakiFactor(double volumeFraction, double exponent = HinderingExponent) =>
        Math.Pow(1 - Guard.Between(volumeFraction, 0, 1), Guard.NotNegative(exponent));

    /// <summary>Smooth exponent of hindered settling.</summary>
    /// <param name="reynolds">Reynolds number of one drop [1].</param>
    /// <returns>Exponent n [1].</returns>
    /// <remarks>Equation: (4.7 + 0.41·Re^0.75)/(1 + 0.175·Re^0.75). Source: Rowe 1987 (from memory). Valid for: any Reynolds number. Disagrees with: the stepped exponents of 1954, which jump at 0.2 and 1.</remarks>
    public static double RoweExponent(double reynolds)
    {
        var x = Math.Pow(Guard.NotNegative(reynolds), 0.75);
        return (4.7 + (0.41 * x)) / (1 + (0.175 * x));
    }
}
