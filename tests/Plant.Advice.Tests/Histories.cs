using Plant.Advice.Tests.Simulation;
using Plant.Physics.Fluids;
using Plant.Physics.Tanks;

namespace Plant.Advice.Tests;

/// <summary>Short histories to build tests from.</summary>
internal static class Histories
{
    public static readonly DateTime Now = new(2026, 3, 1, 12, 0, 0, DateTimeKind.Utc);

    /// <summary>1,000 L of turbine oil (about 860 kg) that runs at 50 °C (saturation 238 mg/kg) and stands at 20 °C (80 mg/kg), with room for 40 L of water.</summary>
    public static ReservoirHistory Tank { get; } = new()
    {
        Tag = "T-1",
        Fluid = Oils.Turbine,
        Shape = TankShape.Rectangular,
        LengthMm = 2000,
        WidthMm = 1000,
        HeightMm = 800,
        OilVolumeL = 1000,
        SuctionHeightMm = 20,
        OperatingTemperatureC = 50,
        ColdestTemperatureC = 20,
        HeadspaceRhPercent = 30,
        Breather = Breather.Sealed,
        WaterLimitPpm = 500,
    };

    public static FluidSheet Glycol { get; } = new() { Family = FluidFamily.Pag, Viscosity40Mm2S = 220, Viscosity100Mm2S = 40, Density15KgM3 = 1075 };

    public static WaterSample Karl(double daysAgo, double ppm, int replicate = 1, string? bottle = null) =>
        new(bottle ?? FormattableString.Invariant($"b{daysAgo}"), replicate, Now.AddDays(-daysAgo), null, SamplePoint.Return, null, WaterMethod.KfCoulometric, ppm, null, null);

    public static WaterSample Crackle(double daysAgo, bool crackles) =>
        new(FormattableString.Invariant($"c{daysAgo}"), 1, Now.AddDays(-daysAgo), null, SamplePoint.Return, null, WaterMethod.Crackle, null, null, crackles);

    /// <summary>Six monthly samples, the newest ten days old.</summary>
    public static ReservoirHistory Sampled(this ReservoirHistory history, params double[] ppm) =>
        history with { Samples = [.. ppm.Select((value, i) => Karl(10 + (30 * (ppm.Length - 1 - i)), value))] };

    /// <summary>Monthly drains, the newest five days old.</summary>
    public static ReservoirHistory Drained(this ReservoirHistory history, params double[] litres) =>
        history with { Drains = [.. litres.Select((value, i) => new Drain(Now.AddDays(-5 - (30 * (litres.Length - 1 - i))), value, null))] };

    public static Assessment Assess(this ReservoirHistory history) => Assessor.Assess(history, Now, new PlanningRule());
}
