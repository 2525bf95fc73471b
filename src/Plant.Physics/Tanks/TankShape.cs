namespace Plant.Physics.Tanks;

/// <summary>Shape of a reservoir.</summary>
public enum TankShape
{
    /// <summary>Rectangular, flat floor.</summary>
    Rectangular,

    /// <summary>Cylinder lying on its side, flat ends; its diameter is its height.</summary>
    HorizontalCylinder,

    /// <summary>Standing cylinder, flat floor; its diameter is its width.</summary>
    VerticalCylinder,
}
