namespace Plant.Physics.Separators;

/// <summary>How fast charge moves: it sets the frequencies at which a field does its work on drops.</summary>
public static class ElectricRelaxation
{
    /// <summary>Relaxation time of a liquid.</summary>
    /// <param name="relativePermittivity">Relative permittivity [1].</param>
    /// <param name="conductivitySM">Conductivity [S/m].</param>
    /// <returns>Relaxation time [s].</returns>
    /// <remarks>Equation: ε0·εr/σ. Source: Maxwell (from memory). Valid for: ohmic liquids.</remarks>
    public static double LiquidS(double relativePermittivity, double conductivitySM) =>
        Constants.VacuumPermittivityFM * Guard.Positive(relativePermittivity) / Guard.Positive(conductivitySM);

    /// <summary>Relaxation time of a drop in a liquid: well above this time it acts as a conductor.</summary>
    /// <param name="dropPermittivity">Relative permittivity of the drop [1].</param>
    /// <param name="dropSM">Conductivity of the drop [S/m].</param>
    /// <param name="liquidPermittivity">Relative permittivity of the liquid [1].</param>
    /// <param name="liquidSM">Conductivity of the liquid [S/m].</param>
    /// <returns>Relaxation time [s].</returns>
    /// <remarks>Equation: ε0(εd + 2εc)/(σd + 2σc). Source: Maxwell and Wagner (from memory). Valid for: dilute spheres.</remarks>
    public static double DropS(double dropPermittivity, double dropSM, double liquidPermittivity, double liquidSM) =>
        Constants.VacuumPermittivityFM * (Guard.Positive(dropPermittivity) + (2 * Guard.Positive(liquidPermittivity)))
        / Guard.Positive(Guard.NotNegative(dropSM) + (2 * Guard.NotNegative(liquidSM)));

    /// <summary>Time in which the field leaves the oil for the insulation of the electrodes.</summary>
    /// <param name="insulationPermittivity">Relative permittivity of the insulation [1].</param>
    /// <param name="insulationM">Thickness of the insulation [m].</param>
    /// <param name="oilPermittivity">Relative permittivity of the oil [1].</param>
    /// <param name="oilM">Thickness of the oil [m].</param>
    /// <param name="oilSM">Conductivity of the oil [S/m].</param>
    /// <returns>Time [s].</returns>
    /// <remarks>Equation: (εi/di + εo/do)·ε0·do/σo. Source: two layers in series. Valid for: insulation that does not conduct.</remarks>
    public static double InsulatedElectrodeS(double insulationPermittivity, double insulationM, double oilPermittivity, double oilM, double oilSM) =>
        ((Guard.Positive(insulationPermittivity) / Guard.Positive(insulationM)) + (Guard.Positive(oilPermittivity) / Guard.Positive(oilM)))
        * Constants.VacuumPermittivityFM * oilM / Guard.Positive(oilSM);

    /// <summary>Frequency that belongs to a relaxation time.</summary>
    /// <param name="relaxationS">Relaxation time [s].</param>
    /// <returns>Frequency [Hz].</returns>
    /// <remarks>Equation: 1/(2πτ). Source: definition. Valid for: one relaxation.</remarks>
    public static double CornerHz(double relaxationS) => 1 / (2 * Math.PI * Guard.Positive(relaxationS));
}
