using System.Globalization;
using Plant.Physics.Fluids;
using Plant.Physics.Separators;

namespace Plant.Physics.Calculators;

/// <summary>Asks how a reservoir dries.</summary>
public sealed record DryDownRequest
{
    /// <summary>The fluid.</summary>
    public FluidRequest? Fluid { get; init; }

    /// <summary>Volume of the oil [L].</summary>
    public double? OilVolumeL { get; init; }

    /// <summary>Water content at the start [mg/kg].</summary>
    public double? StartPpm { get; init; }

    /// <summary>Target [mg/kg].</summary>
    public double? TargetPpm { get; init; }

    /// <summary>Water that comes in [g/day]; none where it is not given.</summary>
    public double? IngressGPerDay { get; init; }

    /// <summary>Code of the method.</summary>
    public string? Kind { get; init; }

    /// <summary>Flow of oil, of air for a purge or a breather [L/min].</summary>
    public double? FlowLPerMin { get; init; }

    /// <summary>Efficiency of one pass [0 to 1].</summary>
    public double? Efficiency { get; init; }

    /// <summary>Absolute pressure of a vacuum dehydrator [kPa].</summary>
    public double? PressureKPa { get; init; }

    /// <summary>Temperature of the oil in the separator [°C].</summary>
    public double? OilTemperatureC { get; init; }

    /// <summary>Coldest temperature that the oil comes to [°C].</summary>
    public double? ColdestTemperatureC { get; init; }
}

/// <summary>How a reservoir dries.</summary>
/// <param name="HoursToTarget">Time to the target [h]; null where it cannot be reached.</param>
/// <param name="FloorPpm">Steady content with the ingress [mg/kg]; null where more comes in than can be taken.</param>
/// <param name="TimesH">Times of the curve [h], to the target, or over five time constants.</param>
/// <param name="WaterPpm">Content at those times [mg/kg].</param>
/// <param name="FreeWhenCold">True where water falls out at the coldest temperature from what is left.</param>
/// <param name="Working">How it came about.</param>
public sealed record DryDownResponse(
    double? HoursToTarget, double? FloorPpm, IReadOnlyList<double> TimesH, IReadOnlyList<double> WaterPpm, bool FreeWhenCold, IReadOnlyList<WorkingStep> Working);

/// <summary>Dry-down of a reservoir.</summary>
public static class DryDownCalculator
{
    private const int Intervals = 60;

    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<DryDownResponse> Compute(DryDownRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var fluid = FluidRequest.Model(request.Fluid, refusals);
        var duty = Duty(request, refusals);
        var start = refusals.Within("startPpm", request.StartPpm, 0, 1e6, "mg/kg");
        var target = refusals.Within("targetPpm", request.TargetPpm, 0, 1e6, "mg/kg");
        var cold = refusals.TemperatureK("coldestTemperatureC", request.ColdestTemperatureC);
        if (cold > duty?.OilTemperatureK)
        {
            refusals.Add(new Refusal("coldestTemperatureC", request.ColdestTemperatureC!.Value.ToString("R", CultureInfo.InvariantCulture),
                FormattableString.Invariant($"must not be above oilTemperatureC ({request.OilTemperatureC})")));
        }

        if (fluid is { HasSaturation: false })
        {
            refusals.Add(new Refusal("fluid.solubilityA", "", "this polyalkylene glycol is taken as water-soluble: it has no saturation, so its equilibrium is not known; give solubilityA and solubilityB where it is not"));
        }

        if (refusals.Count > 0 || fluid is null || duty is null)
        {
            return new(null, refusals);
        }

        var working = new Working();
        working.Add("what it takes", DryingMethods.Removes(duty.Method).ToString().ToLowerInvariant(), null, "1", "common practice", Caution(fluid, duty));
        var drying = new DryDown(fluid, duty, working);
        var seconds = drying.TimeToS(start, target);
        var hours = seconds / 3600;
        working.Add("time to the target", FormattableString.Invariant($"from {start} to {target} mg/kg"), hours, "h", Citations.MixedTank, TargetFlag(drying, start, target, hours));
        var left = hours is null ? drying.EndPpm(start) : Math.Min(start, target);
        var saturation = fluid.SaturationPpm(cold, working);
        var free = left is null || left > saturation;
        working.Add("left at the end", hours is null ? "steady content" : "start or target, the lower", left, "mg/kg", Citations.MixedTank,
            free ? FormattableString.Invariant($"above saturation at {request.ColdestTemperatureC} °C: water falls out when it stands cold") : null);
        Heat(duty, drying, start - left, seconds, working);
        var times = Times(seconds is > 0 ? seconds.Value : 5 / drying.RateConstantPerS);
        return new(new DryDownResponse(hours, drying.FloorPpm, [.. times.Select(time => time / 3600)], [.. times.Select(time => drying.AtPpm(start, time))], free, working.Steps), []);
    }

    private static DryDownDuty? Duty(DryDownRequest request, List<Refusal> refusals)
    {
        var before = refusals.Count;
        var volume = refusals.Within("oilVolumeL", request.OilVolumeL, 0, 1e9, "L", openLow: true) / 1000;
        var ingress = refusals.Within("ingressGPerDay", request.IngressGPerDay ?? 0, 0, 1e9, "g/day") / 86.4e6;
        if (request.Kind is null || !Code.TryParse<DryingMethod>(request.Kind, out var method))
        {
            refusals.Add(new Refusal("kind", request.Kind ?? "", $"must be one of {string.Join(", ", Code.All<DryingMethod>())}"));
            method = default;
        }

        var flow = refusals.Within("flowLPerMin", request.FlowLPerMin, 0, 1e7, "L/min", openLow: true) / 60_000;
        var efficiency = refusals.Within("efficiency", request.Efficiency, 0, 1, "", openLow: true);
        var temperature = refusals.TemperatureK("oilTemperatureC", request.OilTemperatureC);
        var pressure = method == DryingMethod.VacuumDehydrator ? refusals.Within("pressureKPa", request.PressureKPa, 0, 110, "kPa (absolute)", openLow: true) * 1000 : 2000;
        return refusals.Count > before ? null : new DryDownDuty
        {
            Method = method, OilVolumeM3 = volume, FlowM3S = flow, Efficiency = efficiency, OilTemperatureK = temperature, IngressKgS = ingress, PressurePa = pressure,
        };
    }

    private static double[] Times(double horizonS) => [.. Enumerable.Range(0, Intervals + 1).Select(i => horizonS * i / Intervals)];

    private static string? TargetFlag(DryDown drying, double start, double target, double? hours) =>
        hours is null
            ? "cannot be reached: the floor lies at or above the target; more flow, a lower equilibrium, or less ingress"
            : hours == 0 && !(drying.EndPpm(start) <= target) ? "is met now, but the ingress lifts the content above it again" : null;

    private static string? Caution(FluidModel fluid, DryDownDuty duty) => duty.Method switch
    {
        DryingMethod.VacuumDehydrator when fluid.Family == FluidFamily.Diesel => "a vacuum draws the light ends of fuel: not for fuels",
        DryingMethod.ElectrostaticCoalescer when fluid.Family == FluidFamily.Diesel => "fuel vapour: never a field where there is a vapour space",
        DryingMethod.ElectrostaticCoalescer when fluid.Sheet.ConductivityPSM > 1e4 => "the fluid conducts: a field does not stand in it",
        DryingMethod.Coalescer or DryingMethod.ElectrostaticCoalescer or DryingMethod.Centrifuge when Math.Abs(fluid.DensityDifferenceKgM3(duty.OilTemperatureK)) < Constants.NeutralDensityKgM3
            => "water and fluid weigh the same here: the drops do not part by weight",
        _ => null,
    };

    private static void Heat(DryDownDuty duty, DryDown drying, double? fallPpm, double? seconds, Working working)
    {
        if (fallPpm is not > 0)
        {
            return;
        }

        var water = ((fallPpm.Value * 1e-6) + (drying.IngressPpmS * (seconds ?? 0) * 1e-6)) * drying.OilMassKg;
        working.Add("water to be taken", "fall of the content × mass of oil + ingress until then", water, "kg", Citations.MixedTank,
            duty.Method is DryingMethod.Absorbent or DryingMethod.DesiccantBreather ? "compare with the capacity of the element" : null);
        if (duty.Method is DryingMethod.VacuumDehydrator or DryingMethod.DryAirPurge && duty.OilTemperatureK is > 250 and < 400)
        {
            working.Add("heat to evaporate it", "water × latent heat", water * DryingEnergy.LatentHeatJKg(duty.OilTemperatureK) / 3.6e6, "kWh", Citations.LatentHeat);
        }
    }
}
