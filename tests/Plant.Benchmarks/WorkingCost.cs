using BenchmarkDotNet.Attributes;
using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Running;
using Plant.Advice;
using Plant.Physics;
using Plant.Physics.Fluids;
using Plant.Physics.Tanks;

namespace Plant.Benchmarks;

/// <summary>One assessment with and without its working: the fleet must not pay for what nobody asked to see.</summary>
[MemoryDiagnoser]
[ShortRunJob]
public class WorkingCost
{
    private readonly PlanningRule rule = new();
    private readonly DateTime asOf = new(2026, 12, 1, 0, 0, 0, DateTimeKind.Utc);
    private ReservoirHistory history = null!;

    /// <summary>Runs it.</summary>
    public static int Run()
    {
        BenchmarkRunner.Run<WorkingCost>(ManualConfig.CreateMinimumViable());
        return 0;
    }

    /// <summary>Two years of monthly samples and drains.</summary>
    [GlobalSetup]
    public void Setup() => history = new ReservoirHistory
    {
        Tag = "B",
        Fluid = new FluidSheet { Family = FluidFamily.Mineral, Viscosity40Mm2S = 46, Viscosity100Mm2S = 6.8, Density15KgM3 = 870, SolubilityA = 7.09, SolubilityB = 1567, WaterLimitPpm = 300 },
        Shape = TankShape.Rectangular,
        LengthMm = 2000,
        WidthMm = 1200,
        HeightMm = 1000,
        OilVolumeL = 1800,
        SuctionHeightMm = 60,
        OperatingTemperatureC = 55,
        ColdestTemperatureC = 15,
        Samples = [.. Enumerable.Range(0, 24).Select(i => new WaterSample($"S{i}", 1, asOf.AddDays(-30 * (24 - i)), null, SamplePoint.Return, 54, WaterMethod.KfCoulometric, 120 + (3 * i) + (i * 37 % 11), null, null))],
        Drains = [.. Enumerable.Range(0, 24).Select(i => new Drain(asOf.AddDays(-30 * (24 - i) + 3), 0.4 + (0.05 * (i % 5)), 0.2))],
    };

    /// <summary>As the fleet asks.</summary>
    [Benchmark(Baseline = true)]
    public Assessment WithoutWorking() => Assessor.Assess(history, asOf, rule);

    /// <summary>As a page asks that shows it.</summary>
    [Benchmark]
    public Assessment WithWorking() => Assessor.Assess(history, asOf, rule, new Working());
}
