namespace Plant.Physics.Water;

/// <summary>Properties of pure liquid water at 1 atm.</summary>
public static class WaterProperties
{
    /// <summary>Critical temperature of water [K].</summary>
    public const double CriticalTemperatureK = 647.096;

    private const double CriticalPressurePa = 22.064e6;

    /// <summary>Density of water.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Density [kg/m³].</returns>
    /// <remarks>
    /// Equation: Kell's rational polynomial in °C. Source: Kell 1975, coefficients from memory, within 0.016 kg/m³ of IAPWS from 0 to 100 °C.
    /// Valid for: 273.15 to 423.15 K.
    /// </remarks>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is not a finite number.</exception>
    public static double DensityKgM3(double temperatureK)
    {
        var t = Guard.Finite(temperatureK) - Constants.ZeroCelsiusK;
        return (999.83952 + (t * (16.945176 + (t * (-7.9870401e-3 + (t * (-46.170461e-6 + (t * (105.56302e-9 + (t * -280.54253e-12))))))))))
            / (1 + (16.87985e-3 * t));
    }

    /// <summary>Dynamic viscosity of water.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Dynamic viscosity [Pa·s].</returns>
    /// <remarks>Equation: 1e-6·Σ aᵢ(T/300)^bᵢ. Source: IAPWS SR6-08 (read). Valid for: 253.15 to 383.15 K.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is not above 0.</exception>
    public static double ViscosityPaS(double temperatureK)
    {
        var x = Guard.Positive(temperatureK) / 300;
        return 1e-6 * ((280.68 * Math.Pow(x, -1.9)) + (511.45 * Math.Pow(x, -7.7)) + (61.131 * Math.Pow(x, -19.6)) + (0.45903 * Math.Pow(x, -40)));
    }

    /// <summary>Relative permittivity of water.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Relative permittivity [1].</returns>
    /// <remarks>Equation: Σ eᵢ(T/300)^fᵢ. Source: IAPWS SR6-08 (read). Valid for: 253.15 to 383.15 K.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is not above 0.</exception>
    public static double RelativePermittivity(double temperatureK)
    {
        var x = Guard.Positive(temperatureK) / 300;
        return (-43.7527 * Math.Pow(x, -0.05)) + (299.504 * Math.Pow(x, -1.47)) + (-399.364 * Math.Pow(x, -2.11)) + (221.327 * Math.Pow(x, -2.31));
    }

    /// <summary>Surface tension of water against its vapour.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Surface tension [N/m].</returns>
    /// <remarks>Equation: 235.8·τ^1.256·(1 − 0.625τ) mN/m, τ = 1 − T/Tc. Source: IAPWS R1-76(2014) (read). Valid for: 273.16 K to the critical point.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">The temperature lies outside 0 to the critical temperature.</exception>
    public static double SurfaceTensionNM(double temperatureK)
    {
        var tau = 1 - (Guard.Between(temperatureK, 0, CriticalTemperatureK) / CriticalTemperatureK);
        return 0.2358 * Math.Pow(tau, 1.256) * (1 - (0.625 * tau));
    }

    /// <summary>Vapour pressure of water.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Saturation pressure [Pa].</returns>
    /// <remarks>
    /// Equation: ln(p/pc) = (Tc/T)·Σ aᵢ θ^nᵢ, θ = 1 − T/Tc. Source: Wagner and Pruß 2002, from memory, within 0.006 % of IF97 up to 100 °C, 0.013 % at 500 K.
    /// Valid for: 273.16 K to the critical point; below it extrapolates over supercooled water.
    /// Disagrees with: the Magnus formula by more than 2 % at 100 °C, which is therefore not used for hot oil.
    /// </remarks>
    /// <exception cref="ArgumentOutOfRangeException">The temperature lies outside 200 K to the critical temperature.</exception>
    public static double VapourPressurePa(double temperatureK)
    {
        var theta = 1 - (Guard.Between(temperatureK, 200, CriticalTemperatureK) / CriticalTemperatureK);
        var sum = (-7.85951783 * theta) + (1.84408259 * Math.Pow(theta, 1.5)) + (-11.7866497 * Math.Pow(theta, 3))
            + (22.6807411 * Math.Pow(theta, 3.5)) + (-15.9618719 * Math.Pow(theta, 4)) + (1.80122502 * Math.Pow(theta, 7.5));
        return CriticalPressurePa * Math.Exp(CriticalTemperatureK / temperatureK * sum);
    }
}
