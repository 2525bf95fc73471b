using Plant.Physics.Coalescence;
using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Coalescence;

/// <summary>What holds for any oil, drops and tank.</summary>
public sealed class PopulationBalancePropertyTests
{
    [Property(MaxTest = 60)]
    public Property Solve_AnyTank_KeepsWaterAndStaysPositive() => Prop.ForAll(Tanks(), tank =>
    {
        var result = tank.Solve(tank.Kernel);
        return result.Complete && result.Steps < 400 && result.MassErrorFraction < 1e-12
            && result.States.All(state => state.WaterByCell.All(water => water >= 0) && Math.Abs(state.SuspendedVolumeFraction + state.SettledVolumeFraction - tank.Fraction) < 1e-12 * tank.Fraction);
    });

    [Property(MaxTest = 40)]
    public Property Solve_AsTimeGoes_NumberAndSuspensionFall() => Prop.ForAll(Tanks(), tank =>
        tank.Solve(tank.Kernel).States.Pairwise().All(pair => pair.Later.NumberPerM3 <= pair.Earlier.NumberPerM3 * (1 + 1e-4) && pair.Later.SuspendedVolumeFraction <= pair.Earlier.SuspendedVolumeFraction * (1 + 1e-6)));

    [Property(MaxTest = 40)]
    public Property Solve_MoreEfficientCollisions_LeaveFewerDrops() => Prop.ForAll(Tanks(), tank =>
        tank.Solve(tank.Kernel with { Efficiency = tank.Kernel.Efficiency * 0.7 }).States[^1].NumberPerM3 >= tank.Solve(tank.Kernel).States[^1].NumberPerM3 * (1 - 1e-3));

    // without collisions each cell decays by itself
    [Property(MaxTest = 40)]
    public Property Solve_NoCollisions_IsSettlingAlone() => Prop.ForAll(Tanks(), tank =>
    {
        var states = tank.Solve(tank.Kernel with { Efficiency = 0 }).States;
        var grid = new VolumeGrid(60);
        return Enumerable.Range(0, 59).All(i => states[0].WaterByCell[i] < 1e-6 * tank.Fraction
            || Math.Abs(states[^1].WaterByCell[i] - (states[0].WaterByCell[i] * Math.Exp(-tank.Kernel.SpeedMS(grid.DiametersM[i]) * tank.TimeS / tank.DepthM))) < 1e-4 * tank.Fraction);
    });

    private static Arbitrary<Tank> Tanks() => (
        from viscosity in Logarithmic(0.003, 0.5)
        from difference in Logarithmic(10, 200)
        from shear in Logarithmic(0.01, 30)
        from efficiency in Logarithmic(1e-3, 0.3)
        from fraction in Logarithmic(5e-5, 5e-3)
        from median in Logarithmic(4e-6, 1e-4)
        from deviation in Logarithmic(1.3, 2.5)
        from hours in Logarithmic(0.5, 100)
        from depth in Logarithmic(0.1, 2)
        select new Tank(new CollisionKernel { TemperatureK = 320, ViscosityPaS = viscosity, DensityDifferenceKgM3 = difference, ShearRatePerS = shear, Efficiency = efficiency },
            LognormalDistribution.ByVolume(median, deviation), fraction, hours * 3600, depth)).ToArbitrary();

    private static Gen<double> Logarithmic(double low, double high) => Gen.Choose(0, 100_000).Select(i => low * Math.Pow(high / low, i / 100_000.0));

    public sealed record Tank(CollisionKernel Kernel, LognormalDistribution Start, double Fraction, double TimeS, double DepthM)
    {
        public PopulationBalanceResult Solve(CollisionKernel kernel) =>
            new PopulationBalance(new VolumeGrid(60), new PopulationBalanceSetup { KernelM3S = kernel.RateM3S, SettlingMS = kernel.SpeedMS, DepthM = DepthM })
                .Solve(Start, Fraction, [0, 0.1 * TimeS, 0.5 * TimeS, TimeS]);
    }
}

internal static class Pairs
{
    public static IEnumerable<(T Earlier, T Later)> Pairwise<T>(this IEnumerable<T> items)
    {
        var list = items.ToList();
        return list.Zip(list.Skip(1));
    }
}
