namespace Plant.Physics.Separators;

/// <summary>A bed of fibres with the flow through it.</summary>
public sealed record FibreBed
{
    /// <summary>Diameter of the fibres [m].</summary>
    public required double FibreM { get; init; }

    /// <summary>Volume fraction of fibres [0 to 1].</summary>
    public required double Solidity { get; init; }

    /// <summary>Thickness of one stage [m].</summary>
    public required double ThicknessM { get; init; }

    /// <summary>Flow over face area [m/s].</summary>
    public required double FaceVelocityMS { get; init; }

    /// <summary>Number of equal stages one behind the other.</summary>
    public int Stages { get; init; } = 1;
}
