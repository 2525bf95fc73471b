namespace Plant.Physics.Coalescence;

/// <summary>
/// The kernel of all pairs of cells, laid out as the sum over pairs reads it: by blocks of cells, within a block by distance.
/// An array a block: one array for all would be so large that making it costs more than filling it.
/// </summary>
internal sealed class PairTable
{
    /// <summary>Cells of a block: one vector [1].</summary>
    public const int Lanes = 8;

    private readonly double[][] larger;
    private readonly double[][] smaller;

    public PairTable(VolumeGrid grid, Func<double, double, double> kernelM3S)
    {
        var cells = grid.Cells;
        var blocks = (cells + Lanes - 1) / Lanes;
        Stride = blocks * Lanes;
        larger = [.. Enumerable.Range(0, blocks).Select(block => new double[Lanes * Math.Min(cells, (block + 1) * Lanes)])];
        smaller = [.. Enumerable.Range(0, blocks).Select(block => new double[Lanes * (cells - (block * Lanes) + 1)])];
        var d = grid.DiametersM;
        // the kink of differential settling at equal sizes: a sixth of a cell apart makes the sum over cells of fourth order (Euler–Maclaurin)
        var apart = Math.Exp(grid.LogRatio / 12);
        for (var j = 0; j < cells; j++)
        {
            for (var k = 0; k <= j; k++)
            {
                // two of one kind are half as many pairs
                var value = Guard.NotNegative(j == k ? 0.5 * kernelM3S(d[j] * apart, d[j] / apart) : kernelM3S(d[j], d[k]), nameof(kernelM3S));
                larger[j / Lanes][((j - k) * Lanes) + (j % Lanes)] = value;
                smaller[k / Lanes][((j - k) * Lanes) + (k % Lanes)] = value;
            }
        }
    }

    /// <summary>Cells, rounded up to whole blocks [1].</summary>
    public int Stride { get; }

    /// <summary>Kernel of the cells of a block with the cell that lies a distance below.</summary>
    public ref double Larger(int block) => ref larger[block][0];

    /// <summary>Kernel of the cells of a block with the cell that lies a distance above.</summary>
    public ref double Smaller(int block) => ref smaller[block][0];
}
