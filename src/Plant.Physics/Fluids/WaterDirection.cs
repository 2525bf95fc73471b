namespace Plant.Physics.Fluids;

/// <summary>Which way undissolved water goes in a fluid at rest.</summary>
public enum WaterDirection
{
    /// <summary>Water is denser: it settles at the bottom.</summary>
    Down,

    /// <summary>The fluid is denser: water floats.</summary>
    Up,

    /// <summary>The densities are too close for gravity to separate them.</summary>
    Neither,
}
