using MathNet.Numerics;
using Plant.Physics.Coalescence;

namespace Plant.Physics.Tests.Coalescence;

/// <summary>Exact solutions from the start n = exp(−v) with unit number and volume.</summary>
public sealed class PopulationBalanceAnalyticTests
{
    private static readonly Dictionary<string, Func<double, double, double>> Kernels = new()
    {
        ["constant"] = (_, _) => 1, ["sum"] = (u, v) => u + v, ["product"] = (u, v) => u * v,
    };

    // Scott 1968 and Golovin 1963 (moments derived, densities recomputed apart from this code); the cells begin at volume 1e-4, which leaves out 1e-4 of the number.
    // The densities at 0.1, 0.5, 1, 2, 5 and 10 times the first mean volume.
    [Theory]
    [InlineData("constant", 1, 0.66666667, 3, 0.415780882, 0.318458360, 0.228185386, 0.117154284, 0.0158551082, 5.65615023e-4)]
    [InlineData("constant", 10, 0.16666667, 12, 0.0273186515, 0.0255567893, 0.0235133812, 0.0199036475, 0.0120721725, 0.00524654452)]
    [InlineData("sum", 0.5, 0.60653066, 5.43656366, 0.528675619, 0.317287273, 0.182173986, 0.0755837725, 0.0144053652, 0.00263132450)]
    [InlineData("sum", 1, 0.36787944, 14.7781122, 0.313469530, 0.175861381, 0.0971838786, 0.0411291357, 0.0100901713, 0.00296832859)]
    [InlineData("product", 0.2, 0.9, 3.33333333, 0.886935219, 0.549955470, 0.306230868, 0.103139319, 0.0101378039, 0.00116457528)]
    [InlineData("product", 0.4, 0.8, 10, 0.869387214, 0.498656134, 0.254871793, 0.0779075541, 0.00896124861, 0.00157753830)]
    public void Solve_ExactKernels_AreTheTable(string kernel, double time, double number, double second, params double[] densities)
    {
        var grid = Balances.UnitGrid(80);
        var end = new PopulationBalance(grid, Balances.Pure(Kernels[kernel])).Solve(new Balances.Exponential(), 1, [time]).States[0];
        Checks.Near(number, end.NumberPerM3, 3e-4);
        Checks.Near(1, end.SuspendedVolumeFraction, 1e-12);
        Checks.Near(second, Moment(grid, end, 1), 3e-3);
        double[] at = [0.1, 0.5, 1, 2, 5, 10];
        Assert.All(at.Zip(densities), pair => Checks.Near(pair.Second, Density(grid, end, pair.First), 0.01));
    }

    // coarse cells: the second moment, which two-moment schemes miss by 5 to 31 % at 40 cells
    [Theory]
    [InlineData("constant", 1, 3)]
    [InlineData("constant", 10, 12)]
    [InlineData("sum", 1, 14.7781122)]
    [InlineData("product", 0.2, 3.33333333)]
    [InlineData("product", 0.4, 10)]
    public void Solve_FortyCells_KeepTheSecondMoment(string kernel, double time, double second)
    {
        var grid = Balances.UnitGrid(40);
        Checks.Near(second, Moment(grid, new PopulationBalance(grid, Balances.Pure(Kernels[kernel])).Solve(new Balances.Exponential(), 1, [time]).States[0], 1), 0.005);
    }

    // dM0/dt = S − λM0 − ½βM0² with S 1, λ 0.1, β 0.05: M0(1, 5, 20) and the steady state; M1 = 10(1 − exp(−0.1t))
    [Fact]
    public void Solve_SourceAndSink_AreTheRiccatiSolution()
    {
        var setup = Balances.Pure((_, _) => 0.05) with { SettlingMS = _ => 0.1, Source = new Balances.Exponential(), SourcePerS = 1 };
        double[] times = [1, 5, 20, 400];
        double[] numbers = [0.94415342, 3.40296547, 4.62388739, 4.63324958];
        var result = new PopulationBalance(Balances.UnitGrid(80), setup).Solve(new Balances.Exponential(), 0, times);
        Assert.Equal(times, result.States.Select(state => state.TimeS));
        for (var i = 0; i < times.Length; i++)
        {
            Checks.Near(numbers[i], result.States[i].NumberPerM3, 3e-4);
            Checks.Near(10 * (1 - Math.Exp(-0.1 * times[i])), result.States[i].SuspendedVolumeFraction, 1e-5);
        }

        Assert.True(result.MassErrorFraction < 1e-12);
        Checks.Near(70, Moment(Balances.UnitGrid(80), result.States[^1], 1), 0.003);
    }

    // without collisions n depths in series are a chain of decays: the mean of two is exp(−kt)(1 + kt/2), k = 2v/H
    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(5)]
    public void Solve_DepthsWithoutCollisions_AreAChain(int depths)
    {
        var setup = Balances.Pure((_, _) => 0) with { SettlingMS = _ => 0.1, Depths = depths };
        var state = new PopulationBalance(Balances.UnitGrid(40), setup).Solve(new Balances.Exponential(), 0.01, [7]).States[0];
        var decay = 0.1 * depths * 7;
        var left = Enumerable.Range(0, depths).Sum(j => Enumerable.Range(0, j + 1).Sum(i => Math.Exp(-decay) * Math.Pow(decay, i) / SpecialFunctions.Factorial(i))) / depths;
        Checks.Near(0.01 * left, state.SuspendedVolumeFraction, 1e-5);
        Checks.Near(0.01, state.SuspendedVolumeFraction + state.SettledVolumeFraction, 1e-12);
    }

    // at steady state what enters is what settles: S·v̄ = Σk·v·N
    [Fact]
    public void Solve_SourceWithRealSettling_SettlesWhatEnters()
    {
        var setup = Balances.StandingTank with { Source = Balances.TankStart, SourcePerS = 1e-9 };
        var grid = new VolumeGrid(60);
        var state = new PopulationBalance(grid, setup).Solve(Balances.TankStart, 0, [1e9]).States[0];
        var settling = 0.0;
        for (var i = 0; i < grid.Cells; i++)
        {
            settling += state.WaterByCell[i] * setup.SettlingMS(grid.DiametersM[i]) / 0.5;
        }

        Checks.Near(1e-9, settling, 1e-4);
    }

    private static double Moment(VolumeGrid grid, PopulationBalanceState state, double power)
    {
        var sum = 0.0;
        for (var i = 0; i < grid.Cells; i++)
        {
            sum += state.WaterByCell[i] * Math.Pow(grid.VolumesM3[i], power);
        }

        return sum;
    }

    /// <summary>Number density at a volume: water is v·n(v)·v times the logarithm of the ratio; between cells by a parabola of its logarithm.</summary>
    private static double Density(VolumeGrid grid, PopulationBalanceState state, double volume)
    {
        var step = Math.Log(grid.VolumeRatio);
        double At(int i) => Math.Log(state.WaterByCell[i] / (grid.VolumesM3[i] * grid.VolumesM3[i] * step));
        var place = Math.Log(volume / grid.VolumesM3[0]) / step;
        var near = (int)Math.Round(place);
        var x = place - near;
        return Math.Exp(At(near) + (0.5 * x * (At(near + 1) - At(near - 1))) + (0.5 * x * x * (At(near + 1) - (2 * At(near)) + At(near - 1))));
    }
}
