namespace Plant.Physics.Fluids;

/// <summary>What is known of a fluid, as on its data sheet; null is "not known".</summary>
public sealed record FluidSheet
{
    /// <summary>Chemical family.</summary>
    public required FluidFamily Family { get; init; }

    /// <summary>ISO 3448 viscosity grade [mm²/s at 40 °C].</summary>
    public double? IsoVg { get; init; }

    /// <summary>Kinematic viscosity at 40 °C [mm²/s].</summary>
    public double? Viscosity40Mm2S { get; init; }

    /// <summary>Kinematic viscosity at 100 °C [mm²/s].</summary>
    public double? Viscosity100Mm2S { get; init; }

    /// <summary>Density at 15 °C [kg/m³].</summary>
    public double? Density15KgM3 { get; init; }

    /// <summary>Thermal expansion about 15 °C [1/K].</summary>
    public double? ExpansionPerK { get; init; }

    /// <summary>A of log10(saturation in ppm) = A − B/T [1].</summary>
    public double? SolubilityA { get; init; }

    /// <summary>B of log10(saturation in ppm) = A − B/T [K].</summary>
    public double? SolubilityB { get; init; }

    /// <summary>Interfacial tension against water [mN/m].</summary>
    public double? InterfacialTensionMNM { get; init; }

    /// <summary>Relative permittivity [1].</summary>
    public double? RelativePermittivity { get; init; }

    /// <summary>Electrical conductivity [pS/m].</summary>
    public double? ConductivityPSM { get; init; }

    /// <summary>Time to separate in the demulsibility test (ASTM D1401) [min].</summary>
    public double? DemulsibilityMin { get; init; }

    /// <summary>Limit for the water content [mg/kg].</summary>
    public double? WaterLimitPpm { get; init; }
}
