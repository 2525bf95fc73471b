namespace Plant.Physics.Separators;

/// <summary>Force between two uncharged conducting drops in an insulating liquid in a uniform field.</summary>
public static class ConductingSpheres
{
    /// <summary>Smallest gap over radius that is computed [1]; closer is less than a molecule for any drop.</summary>
    public const double SmallestGap = 1e-8;

    // beyond this distance over radius two dipoles that polarise each other are exact to 2e-8
    private const double FarDistance = 60;

    /// <summary>Attraction of two equal spheres in a field along their axis.</summary>
    /// <param name="radiusM">Radius [m].</param>
    /// <param name="gapM">Gap between the surfaces [m].</param>
    /// <param name="permittivityFM">Permittivity of the liquid [F/m].</param>
    /// <param name="fieldVM">Field far away, root mean square [V/m].</param>
    /// <returns>Attraction [N].</returns>
    /// <remarks>
    /// Equation: F = −½E·dP/ds with P = 16πεc³E·Σ w(m − m̄)², m = 1, 3, 5 …, w = 1/(exp(mξ) − 1), cosh ξ = s/2a, c = a·sinh ξ, m̄ the mean of m by w
    /// (it makes each charge zero). Source: bispherical series for two conducting spheres, Davis 1964 (from memory; derived anew).
    /// Valid for: spheres; gaps above 1e-8 of the radius. Disagrees with: the image-dipole formula by 25 % at a gap of a tenth of the radius and more below.
    /// </remarks>
    public static double AttractionN(double radiusM, double gapM, double permittivityFM, double fieldVM)
    {
        var ratio = Guard.Between(Guard.Positive(gapM) / Guard.Positive(radiusM), SmallestGap, double.MaxValue);
        var scale = Guard.Positive(permittivityFM) * Math.Pow(radiusM * Guard.Finite(fieldVM), 2);
        var distance = 2 + ratio;
        if (distance > FarDistance)
        {
            return 24 * Math.PI * scale / (Math.Pow(distance, 4) * Math.Pow(1 - (2 / Math.Pow(distance, 3)), 2));
        }

        var xi = 2 * Math.Asinh(Math.Sqrt(ratio) / 2);
        double sum = 0, first = 0;
        foreach (var (m, w) in Weights(xi))
        {
            sum += w;
            first += m * w;
        }

        var mean = first / sum;
        double spread = 0, slope = 0;
        foreach (var (m, w) in Weights(xi))
        {
            var square = (m - mean) * (m - mean);
            spread += w * square;
            slope -= m * w * (1 + w) * square;
        }

        var (sinh, cosh) = (Math.Sinh(xi), Math.Cosh(xi));
        return -4 * Math.PI * scale * sinh * ((3 * cosh * spread) + (sinh * slope));
    }

    /// <summary>Attraction of two spheres far apart in a field along their axis.</summary>
    /// <param name="radius1M">Radius of one [m].</param>
    /// <param name="radius2M">Radius of the other [m].</param>
    /// <param name="distanceM">Distance of the centres [m].</param>
    /// <param name="permittivityFM">Permittivity of the liquid [F/m].</param>
    /// <param name="fieldVM">Field far away, root mean square [V/m].</param>
    /// <returns>Attraction [N].</returns>
    /// <remarks>Equation: 24πε·r1³r2³E²/s⁴. Source: two induced dipoles. Valid for: gaps of several radii; at a gap of four radii it is 2 % low.</remarks>
    public static double FarAttractionN(double radius1M, double radius2M, double distanceM, double permittivityFM, double fieldVM) =>
        FarRadialN(radius1M, radius2M, distanceM, 0, permittivityFM, fieldVM);

    /// <summary>Attraction of two spheres far apart whose axis lies at an angle to the field.</summary>
    /// <param name="radius1M">Radius of one [m].</param>
    /// <param name="radius2M">Radius of the other [m].</param>
    /// <param name="distanceM">Distance of the centres [m].</param>
    /// <param name="angleRad">Angle between axis and field [rad].</param>
    /// <param name="permittivityFM">Permittivity of the liquid [F/m].</param>
    /// <param name="fieldVM">Field far away, root mean square [V/m].</param>
    /// <returns>Attraction [N]; negative, a repulsion, beyond 54.7°.</returns>
    /// <remarks>Equation: 12πε·r1³r2³E²(3cos²θ − 1)/s⁴. Source: two induced dipoles. Valid for: gaps of several radii.</remarks>
    public static double FarRadialN(double radius1M, double radius2M, double distanceM, double angleRad, double permittivityFM, double fieldVM) =>
        Strength(radius1M, radius2M, distanceM, permittivityFM, fieldVM) * ((3 * Math.Pow(Math.Cos(Guard.Finite(angleRad)), 2)) - 1);

    /// <summary>Force that turns the axis of two spheres far apart into the field.</summary>
    /// <param name="radius1M">Radius of one [m].</param>
    /// <param name="radius2M">Radius of the other [m].</param>
    /// <param name="distanceM">Distance of the centres [m].</param>
    /// <param name="angleRad">Angle between axis and field [rad].</param>
    /// <param name="permittivityFM">Permittivity of the liquid [F/m].</param>
    /// <param name="fieldVM">Field far away, root mean square [V/m].</param>
    /// <returns>Force towards smaller angles [N].</returns>
    /// <remarks>Equation: 12πε·r1³r2³E²·sin 2θ/s⁴. Source: two induced dipoles. Valid for: gaps of several radii.</remarks>
    public static double FarTurningN(double radius1M, double radius2M, double distanceM, double angleRad, double permittivityFM, double fieldVM) =>
        Strength(radius1M, radius2M, distanceM, permittivityFM, fieldVM) * Math.Sin(2 * Guard.Finite(angleRad));

    private static double Strength(double radius1M, double radius2M, double distanceM, double permittivityFM, double fieldVM) =>
        12 * Math.PI * Guard.Positive(permittivityFM) * Math.Pow(Guard.Positive(radius1M) * Guard.Positive(radius2M), 3) * Math.Pow(Guard.Finite(fieldVM), 2)
        / Math.Pow(Guard.Between(distanceM, radius1M + radius2M, double.MaxValue), 4);

    private static IEnumerable<(double M, double W)> Weights(double xi)
    {
        for (var m = 1.0; m * xi < 60; m += 2)
        {
            yield return (m, 1 / (Math.Exp(m * xi) - 1));
        }
    }
}
