using Plant.Physics.Droplets;

namespace Plant.Physics.Coalescence;

/// <summary>What happens to drops in a reservoir.</summary>
public sealed record PopulationBalanceSetup
{
    /// <summary>Rate constant of coalescence of two drops of the given diameters [m], symmetric [m³/s].</summary>
    public required Func<double, double, double> KernelM3S { get; init; }

    /// <summary>Speed of a drop of the given diameter [m] towards where water gathers, not negative [m/s].</summary>
    public required Func<double, double> SettlingMS { get; init; }

    /// <summary>Depth of the oil [m].</summary>
    public required double DepthM { get; init; }

    /// <summary>Stirred depths, one below the other, into which the oil is divided: what leaves one enters the next, 1 to 64 [1].</summary>
    public int Depths { get; init; } = 1;

    /// <summary>Sizes of water that keeps entering the first depth; null for none.</summary>
    public IDropletDistribution? Source { get; init; }

    /// <summary>Entering water per volume of the first depth [1/s].</summary>
    public double SourcePerS { get; init; }

    /// <summary>Relative error that one step in time may make in the suspended water and in the number of drops, 1e-10 to 0.01 [1].</summary>
    public double Tolerance { get; init; } = 1e-4;
}
