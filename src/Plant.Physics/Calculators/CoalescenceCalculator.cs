using System.Globalization;
using Plant.Physics.Coalescence;
using Plant.Physics.Droplets;
using Plant.Physics.Fluids;

namespace Plant.Physics.Calculators;

/// <summary>Asks how suspended drops grow and settle.</summary>
public sealed record CoalescenceRequest
{
    /// <summary>The fluid.</summary>
    public FluidRequest? Fluid { get; init; }

    /// <summary>Temperature [°C].</summary>
    public double? TemperatureC { get; init; }

    /// <summary>Volume fraction of water at the start [0 to 0.4].</summary>
    public double? WaterVolumeFraction { get; init; }

    /// <summary>Median diameter by volume at the start [µm].</summary>
    public double? DropletMedianUm { get; init; }

    /// <summary>Geometric standard deviation at the start [1].</summary>
    public double? GeometricDeviation { get; init; }

    /// <summary>Depth of the oil [mm].</summary>
    public double? DepthMm { get; init; }

    /// <summary>Time to follow [h].</summary>
    public double? Hours { get; init; }

    /// <summary>Shear rate [1/s]; null for none.</summary>
    public double? ShearRatePerS { get; init; }

    /// <summary>Share of collisions that end in one drop [0 to 1]; null for a guess from the fluid's sheet.</summary>
    public double? CollisionEfficiency { get; init; }

    /// <summary>Electric field [kV/cm]; null or 0 for none.</summary>
    public double? FieldKVPerCm { get; init; }

    /// <summary>Cells of size; null for 80. Where the answer needs more, each is divided.</summary>
    public double? Cells { get; init; }
}

/// <summary>How suspended drops grow and settle.</summary>
/// <param name="TimesS">Times [s].</param>
/// <param name="SuspendedFraction">Water in suspension at these times, of that at the start [0 to 1].</param>
/// <param name="NumberPerM3">Drops per volume [1/m³].</param>
/// <param name="MedianUm">Median diameter by volume [µm]; null where nothing is suspended.</param>
/// <param name="MassErrorFraction">Largest loss or gain of water by the computation [1].</param>
/// <param name="Working">How it came about.</param>
public sealed record CoalescenceResponse(
    IReadOnlyList<double> TimesS, IReadOnlyList<double> SuspendedFraction, IReadOnlyList<double> NumberPerM3, IReadOnlyList<double?> MedianUm, double MassErrorFraction,
    IReadOnlyList<WorkingStep> Working);

/// <summary>Drops that coalesce and settle.</summary>
public static class CoalescenceCalculator
{
    /// <summary>Fewest and most cells that a request may ask for [1].</summary>
    public const int FewestCells = 20, MostCells = 320;

    private const int Intervals = 24;
    private const int EnoughCells = 80;

    // cells over the logarithm of the whole range per logarithm of the deviation that resolve a narrow start
    private const double CellsPerSpread = 1.6;

    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <param name="stop">Ends the work early.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<CoalescenceResponse> Compute(CoalescenceRequest request, CancellationToken stop = default)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var fluid = FluidRequest.Model(request.Fluid, refusals);
        var temperature = refusals.TemperatureK("temperatureC", request.TemperatureC);
        var fraction = refusals.Within("waterVolumeFraction", request.WaterVolumeFraction, 0, 0.4, "", openLow: true);
        var median = refusals.Within("dropletMedianUm", request.DropletMedianUm, VolumeGrid.SmallestM * 1e6, VolumeGrid.LargestM * 1e6, "µm", openLow: true) * 1e-6;
        var deviation = refusals.Within("geometricDeviation", request.GeometricDeviation, 1, 20, "");
        var depth = refusals.Within("depthMm", request.DepthMm, 0, 1e6, "mm", openLow: true) / 1000;
        var time = refusals.Within("hours", request.Hours, 0, 10_000, "h", openLow: true) * 3600;
        var shear = refusals.Within("shearRatePerS", request.ShearRatePerS ?? 0, 0, 10_000, "1/s");
        var efficiency = refusals.Optional("collisionEfficiency", request.CollisionEfficiency, 0, 1, "");
        var field = refusals.Within("fieldKVPerCm", request.FieldKVPerCm ?? 0, 0, 100, "kV/cm") * 1e5;
        var cells = refusals.Within("cells", request.Cells ?? EnoughCells, FewestCells, MostCells, "");
        if (cells > Math.Floor(cells))
        {
            refusals.Add(new Refusal("cells", cells.ToString("R", CultureInfo.InvariantCulture), FormattableString.Invariant($"must be a whole number from {FewestCells} to {MostCells}")));
        }

        if (refusals.Count > 0 || fluid is null)
        {
            return new(null, refusals);
        }

        var working = new Working();
        var kernel = Kernel(fluid, temperature, efficiency, working) with { ShearRatePerS = shear, FieldVM = field };
        Describe(kernel, median, depth, fluid, working);
        var start = LognormalDistribution.ByVolume(median, deviation);
        var grid = Grid((int)cells, start, working);
        var balance = new PopulationBalance(grid, new PopulationBalanceSetup { KernelM3S = kernel.RateM3S, SettlingMS = kernel.SpeedMS, DepthM = depth, Tolerance = 1e-5 });
        var result = balance.Solve(start, fraction, [.. Enumerable.Range(0, Intervals + 1).Select(i => time * i / Intervals)], stop);
        if (!result.Complete)
        {
            refusals.Add(new Refusal("hours", request.Hours!.Value.ToString("R", CultureInfo.InvariantCulture),
                FormattableString.Invariant($"needs more than {PopulationBalance.MostSteps} steps with these drops: follow a shorter time, or less shear or field")));
            return new(null, refusals);
        }

        return new(Response(result, fraction, working), []);
    }

    private static CollisionKernel Kernel(FluidModel fluid, double temperatureK, double? efficiency, Working working)
    {
        var viscosity = fluid.DynamicViscosityPaS(temperatureK, working);
        fluid.WaterGoes(temperatureK, working);
        if (efficiency is { } given)
        {
            working.Add("collision efficiency", "as given", given, "1", "given");
        }

        return new CollisionKernel
        {
            TemperatureK = temperatureK,
            ViscosityPaS = viscosity,
            DensityDifferenceKgM3 = fluid.DensityDifferenceKgM3(temperatureK),
            Efficiency = efficiency ?? CollisionEfficiency.Prior(fluid.Sheet.DemulsibilityMin, fluid.Sheet.InterfacialTensionMNM / 1000, working),
            RelativePermittivity = fluid.RelativePermittivity,
        };
    }

    private static void Describe(CollisionKernel kernel, double medianM, double depthM, FluidModel fluid, Working working)
    {
        var twin = 2 * medianM;
        working.Add("collisions by diffusion, the median drop with one twice its size", "2kT/(3μ)·(d1 + d2)(1/d1 + 1/d2)",
            CollisionRate.BrownianM3S(medianM, twin, kernel.TemperatureK, kernel.ViscosityPaS), "m³/s", Citations.Smoluchowski);
        working.Add("collisions by shear, the same two", FormattableString.Invariant($"{kernel.ShearRatePerS} 1/s·(d1 + d2)³/6"),
            CollisionRate.LaminarShearM3S(medianM, twin, kernel.ShearRatePerS), "m³/s", Citations.Smoluchowski);
        working.Add("collisions by settling, the same two", "π/4·(d1 + d2)²·|v1 − v2|, v = g·d²·Δρ/(18μ)",
            CollisionRate.DifferentialSettlingM3S(medianM, twin, kernel.SpeedMS(medianM), kernel.SpeedMS(twin)), "m³/s", Citations.DifferentialSettling);
        if (kernel.FieldVM > 0)
        {
            working.Add("field: factor on the collisions of two median drops", FormattableString.Invariant($"1 + 16π·0.19245·εE²·r1²r2²/(μ(r1 + r2))/K, E = {kernel.FieldVM / 1e5} kV/cm, εr = {kernel.RelativePermittivity}"),
                kernel.FieldFactor(medianM), "1", Citations.FieldAttraction,
                fluid.Sheet.RelativePermittivity is null ? "calibrate on the reservoir; relative permittivity is the family's default (from memory)" : "calibrate on the reservoir; drops that the field breaks up are not followed");
        }

        working.Add("settling out of the median drop, per time", FormattableString.Invariant($"v/({depthM} m)"), kernel.SpeedMS(medianM) / depthM, "1/s", Citations.Stokes);
    }

    private static VolumeGrid Grid(int cells, LognormalDistribution start, Working working)
    {
        var range = Math.Log(VolumeGrid.LargestM / VolumeGrid.SmallestM);
        var narrow = CellsPerSpread * range / Math.Max(Math.Log(start.GeometricDeviation), 1e-9);
        var enough = Math.Max(EnoughCells, Math.Min(narrow, MostCells));
        var parts = Math.Max(1, Math.Min((int)Math.Ceiling(enough / cells), MostCells / cells));
        var grid = new VolumeGrid(cells * parts);
        var inside = start.VolumeBelow(VolumeGrid.LargestM) - start.VolumeBelow(VolumeGrid.SmallestM);
        working.Add("cells of size", FormattableString.Invariant($"0.5 µm to 2 mm in {cells} cells{(parts > 1 ? $", each in {parts} parts" : "")}"), grid.Cells, "1", Citations.KumarRamkrishna,
            grid.Cells < Math.Max(narrow, EnoughCells) ? "the start is narrower than the cells: the answer is less exact" : null);
        working.Add("share of the given distribution within these sizes", "F(2 mm) − F(0.5 µm); the water is put there in full", inside, "1", "definition", inside < 0.99 ? "the distribution is cut at 0.5 µm or 2 mm" : null);
        return grid;
    }

    private static CoalescenceResponse Response(PopulationBalanceResult result, double fraction, Working working)
    {
        var end = result.States[^1];
        var most = result.States.Max(state => state.WaterByCell[^1]) / fraction;
        working.Add("steps in time", "linearly implicit Euler, extrapolated to sixth order", result.Steps, "1", "numerical method");
        working.Add("in suspension at the end", "of the water at the start", end.SuspendedVolumeFraction / fraction, "1", Citations.KumarRamkrishna,
            most > 0.01 ? "drops grow past 2 mm: they are kept at that size" : null);
        return new(
            [.. result.States.Select(state => state.TimeS)],
            [.. result.States.Select(state => state.SuspendedVolumeFraction / fraction)],
            [.. result.States.Select(state => state.NumberPerM3)],
            [.. result.States.Select(state => state.MedianM * 1e6)],
            result.MassErrorFraction,
            working.Steps);
    }
}
