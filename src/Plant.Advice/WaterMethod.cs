namespace Plant.Advice;

/// <summary>How a water content was found.</summary>
public enum WaterMethod
{
    /// <summary>Karl Fischer, coulometric, direct injection.</summary>
    KfCoulometric,

    /// <summary>Karl Fischer, volumetric.</summary>
    KfVolumetric,

    /// <summary>Karl Fischer, coulometric, with evaporation.</summary>
    KfEvaporator,

    /// <summary>Capacitive sensor: relative saturation.</summary>
    ActivitySensor,

    /// <summary>Crackle test on a hot plate: yes or no.</summary>
    Crackle,
}
