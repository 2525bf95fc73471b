namespace Plant.Physics.Separators;

/// <summary>What a separator is set to do on a reservoir.</summary>
public sealed record DryDownDuty
{
    /// <summary>The method.</summary>
    public required DryingMethod Method { get; init; }

    /// <summary>Volume of the oil [m³].</summary>
    public required double OilVolumeM3 { get; init; }

    /// <summary>Flow of oil through the separator; of air at the headspace's temperature for a purge or a breather [m³/s].</summary>
    public required double FlowM3S { get; init; }

    /// <summary>Share of the way to equilibrium in one pass; for what takes drops only, the share of the undissolved water [0 to 1].</summary>
    public required double Efficiency { get; init; }

    /// <summary>Temperature of the oil in the separator [K].</summary>
    public required double OilTemperatureK { get; init; }

    /// <summary>Water that comes in [kg/s].</summary>
    public double IngressKgS { get; init; }

    /// <summary>Absolute pressure of the vacuum chamber, taken as all water vapour: the safe side [Pa].</summary>
    public double PressurePa { get; init; } = 2000;

    /// <summary>Dew point of the purge air [K]; −40 °C is usual behind a desiccant (judgement).</summary>
    public double DewPointK { get; init; } = 233.15;
}
