namespace Plant.Physics.Coalescence;

/// <summary>Cells of drop volume whose edges form a geometric series; each is represented by one size, its geometric middle.</summary>
public sealed class VolumeGrid
{
    /// <summary>Smallest drop of the usual grid [m].</summary>
    public const double SmallestM = 0.5e-6;

    /// <summary>Largest drop of the usual grid [m].</summary>
    public const double LargestM = 2e-3;

    /// <summary>Fewest cells of a grid [1].</summary>
    public const int FewestCells = 20;

    /// <summary>Most cells of a grid [1].</summary>
    public const int MostCells = 400;

    private readonly double[] diameters;
    private readonly double[] volumes;

    /// <summary>Divides the range of sizes.</summary>
    /// <param name="cells">Number of cells, 20 to 400 [1].</param>
    /// <param name="smallestM">Lower edge of the first cell [m].</param>
    /// <param name="largestM">Upper edge of the last cell [m].</param>
    public VolumeGrid(int cells, double smallestM = SmallestM, double largestM = LargestM)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(cells, FewestCells);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(cells, MostCells);
        LowestM = Guard.Positive(smallestM);
        LogRatio = Math.Log(Guard.Positive(largestM) / smallestM) / cells;
        if (LogRatio <= 0)
        {
            throw new ArgumentOutOfRangeException(nameof(largestM), largestM, "must be above smallestM");
        }

        diameters = new double[cells];
        volumes = new double[cells];
        for (var i = 0; i < cells; i++)
        {
            diameters[i] = smallestM * Math.Exp(LogRatio * (i + 0.5));
            volumes[i] = Math.PI / 6 * diameters[i] * diameters[i] * diameters[i];
        }
    }

    /// <summary>Number of cells [1].</summary>
    public int Cells => diameters.Length;

    /// <summary>Lower edge of the first cell [m].</summary>
    public double LowestM { get; }

    /// <summary>Logarithm of the ratio of neighbouring diameters [1].</summary>
    public double LogRatio { get; }

    /// <summary>Ratio of neighbouring volumes [1].</summary>
    public double VolumeRatio => Math.Exp(3 * LogRatio);

    /// <summary>Diameters that stand for the cells [m].</summary>
    public ReadOnlySpan<double> DiametersM => diameters;

    /// <summary>Volumes that stand for the cells [m³].</summary>
    public ReadOnlySpan<double> VolumesM3 => volumes;

    /// <summary>Upper edge of a cell.</summary>
    /// <param name="cell">Index of the cell [1].</param>
    /// <returns>Diameter [m].</returns>
    public double UpperEdgeM(int cell) => LowestM * Math.Exp(LogRatio * (cell + 1));
}
