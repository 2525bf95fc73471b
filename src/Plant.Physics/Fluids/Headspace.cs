using Plant.Physics.Water;

namespace Plant.Physics.Fluids;

/// <summary>Water exchanged between a fluid and the air above it.</summary>
public static class Headspace
{
    /// <summary>Partial pressure of water in air.</summary>
    /// <param name="airTemperatureK">Temperature of the air [K].</param>
    /// <param name="relativeHumidity">Relative humidity [0 to 1].</param>
    /// <returns>Partial pressure [Pa].</returns>
    /// <remarks>Equation: RH·psat(T). Source: definition; Wagner and Pruß 2002. Valid for: 273.16 K and more.</remarks>
    public static double WaterPressurePa(double airTemperatureK, double relativeHumidity) =>
        Guard.Between(relativeHumidity, 0, 1) * WaterProperties.VapourPressurePa(airTemperatureK);

    /// <summary>Water activity of a fluid at rest under air.</summary>
    /// <param name="oilTemperatureK">Temperature of the fluid [K].</param>
    /// <param name="waterPressurePa">Partial pressure of water in the air [Pa].</param>
    /// <returns>Relative saturation [0 to 1]; 1 where water condenses into the fluid.</returns>
    /// <remarks>Equation: p/psat(T). Source: equal activity in both phases. Valid for: 273.16 K and more.</remarks>
    public static double EquilibriumActivity(double oilTemperatureK, double waterPressurePa) =>
        Math.Min(1, Guard.NotNegative(waterPressurePa) / WaterProperties.VapourPressurePa(oilTemperatureK));

    /// <summary>Water content of a fluid at rest under air.</summary>
    /// <param name="fluid">The fluid; it must have a saturation.</param>
    /// <param name="oilTemperatureK">Temperature of the fluid [K].</param>
    /// <param name="waterPressurePa">Partial pressure of water in the air [Pa].</param>
    /// <param name="working">Receives the step, or null.</param>
    /// <returns>Water content [mg/kg].</returns>
    /// <remarks>Equation: S(T)·p/psat(T). Source: equal activity in both phases. Valid for: as the solubility curve.</remarks>
    public static double EquilibriumPpm(FluidModel fluid, double oilTemperatureK, double waterPressurePa, Working? working = null)
    {
        ArgumentNullException.ThrowIfNull(fluid);
        var activity = EquilibriumActivity(oilTemperatureK, waterPressurePa);
        var value = fluid.SaturationPpm(oilTemperatureK) * activity;
        working?.Add("content in equilibrium with the headspace", FormattableString.Invariant($"S·p/psat = {fluid.SaturationPpm(oilTemperatureK):0.#}·{activity:0.####}"), value, "mg/kg", Citations.Headspace);
        return value;
    }

    /// <summary>Dew point of air.</summary>
    /// <param name="waterPressurePa">Partial pressure of water [Pa].</param>
    /// <returns>Dew point [K].</returns>
    /// <remarks>Equation: psat(T) = p, by bisection. Source: Wagner and Pruß 2002. Valid for: 1 Pa to 5 MPa.</remarks>
    public static double DewPointK(double waterPressurePa)
    {
        Guard.Between(waterPressurePa, 1, 5e6);
        double low = 200, high = 600;
        for (var i = 0; i < 60; i++)
        {
            var middle = 0.5 * (low + high);
            if (WaterProperties.VapourPressurePa(middle) < waterPressurePa)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return 0.5 * (low + high);
    }
}
