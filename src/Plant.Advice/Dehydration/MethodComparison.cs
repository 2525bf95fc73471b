using Plant.Advice.Ledger;
using Plant.Physics;
using Plant.Physics.Droplets;
using Plant.Physics.Fluids;
using Plant.Physics.Separators;

namespace Plant.Advice.Dehydration;

/// <summary>Every way to dry a reservoir to a target: floor, time, energy, consumables, waste and cost, and for each that is out the reason.</summary>
public sealed class MethodComparison
{
    private const double WorthDrainingL = 0.5;
    private const double LongestHours = 60 * 24;
    private const double SettlingDropM = 50e-6;
    private const double SettlingDepthM = 0.5;
    private const double WarmK = 343.15;
    private const double VacuumPa = 2000;
    private const double VacuumRigK = 333.15;
    private const double LowestK = 255;
    private const double HighestK = 395;
    private const double PumpRisePa = 3e5;
    private const double PumpEfficiency = 0.5;
    private const double CentrifugeViscosityMm2S = 200;

    private readonly OilState oil;
    private readonly FluidModel fluid;
    private readonly MethodTask task;
    private readonly MethodRates rates;
    private readonly double runningK;
    private readonly double volumeM3;

    private MethodComparison(OilState oil, FluidModel fluid, MethodTask task, MethodRates rates, double runningK, double volumeM3) =>
        (this.oil, this.fluid, this.task, this.rates, this.runningK, this.volumeM3) = (oil, fluid, task, rates, runningK, volumeM3);

    /// <summary>Compares.</summary>
    /// <param name="oil">The oil.</param>
    /// <param name="task">What is to be reached.</param>
    /// <param name="rates">What things cost; null: the shipped ones.</param>
    /// <returns>What works, cheapest first, then what is out; empty where fluid, volume or temperature is not known, or where nobody would run a rig (below −18 °C, above 122 °C).</returns>
    public static IReadOnlyList<MethodOption> Of(OilState oil, MethodTask task, MethodRates? rates = null)
    {
        ArgumentNullException.ThrowIfNull(oil);
        ArgumentNullException.ThrowIfNull(task);
        if (oil is not { Fluid: { HasSaturation: true } fluid, RunningK: >= LowestK and <= HighestK and { } running, VolumeL: > 0 and { } volume })
        {
            return [];
        }

        var comparison = new MethodComparison(oil, fluid, task, rates ?? new MethodRates(), running, volume / 1000);
        return [.. comparison.Options().OrderBy(o => !o.Works).ThenBy(o => o.Cost)];
    }

    private IEnumerable<MethodOption> Options()
    {
        foreach (var kind in Enum.GetValues<SeparatorKind>())
        {
            // a vacuum rig brings its own heater
            yield return At(kind, kind == SeparatorKind.VacuumDehydrator ? Math.Max(runningK, VacuumRigK) : runningK, "");
        }

        // cold oil gives up more as drops: a coalescer then goes below what it could warm
        if (oil.ColdestK is { } cold && cold < runningK - 5 && fluid.SaturationPpm(cold) < fluid.SaturationPpm(runningK))
        {
            var cool = Math.Max(cold, 293.15);
            if (cool < runningK)
            {
                yield return At(SeparatorKind.Coalescer, cool, FormattableString.Invariant($"cool to {cool - Constants.ZeroCelsiusK:0} °C"));
            }
        }

        yield return Settling(runningK, "");
        if (runningK < WarmK - 10)
        {
            yield return Settling(WarmK, FormattableString.Invariant($"warm to {WarmK - Constants.ZeroCelsiusK:0} °C"));
        }
    }

    private MethodOption At(SeparatorKind kind, double temperatureK, string first)
    {
        first = string.Join(", then ", new[] { task.SettledL > WorthDrainingL ? "drain" : "", first }.Where(f => f.Length > 0));
        if (Excluded(kind, temperatureK) is { } why)
        {
            return new MethodOption(kind, first, null, null, null, "", 0, null, why);
        }

        var duty = Duty(kind, temperatureK);
        var drying = new DryDown(fluid, duty);
        var floor = drying.FloorPpm;
        var hours = drying.TimeToS(task.StartPpm, task.TargetPpm) / 3600;
        if (hours is null or > LongestHours)
        {
            return new MethodOption(kind, first, floor, hours, null, "", 0, null, hours is not null ? FormattableString.Invariant($"takes {hours / 24:0} days")
                : floor is null ? "more water comes in than it can take"
                : FormattableString.Invariant($"ends at {floor:0} mg/kg, above the target of {task.TargetPpm:0}"));
        }

        var waterKg = ((task.StartPpm - task.TargetPpm) * 1e-6 * drying.OilMassKg) + (duty.IngressKgS * hours.Value * 3600);
        var energy = EnergyKWh(kind, duty, drying, waterKg, hours.Value);
        var elements = kind == SeparatorKind.Absorbent ? Math.Ceiling(waterKg / rates.ElementL) : kind == SeparatorKind.Coalescer ? 1 : 0;
        var waste = task.SettledL + (kind is SeparatorKind.Absorbent or SeparatorKind.DryAirPurge ? 0 : waterKg);
        var cost = rates.SetUp + (hours.Value * rates.RigPerHour) + (energy * rates.PerKWh) + (elements * rates.PerElement) + (waste * rates.PerWasteL);
        return new MethodOption(kind, first, floor, hours, energy, elements > 0 ? FormattableString.Invariant($"{elements:0} {(elements == 1 ? "element" : "elements")}") : "", waste, cost, "");
    }

    private string? Excluded(SeparatorKind kind, double temperatureK)
    {
        var viscosity = fluid.KinematicViscosityM2S(temperatureK) * 1e6;
        var difference = Math.Abs(fluid.DensityDifferenceKgM3(temperatureK));
        var tight = fluid.Sheet.DemulsibilityMin > MethodChoice.TightEmulsionMin || fluid.Sheet.InterfacialTensionMNM < MethodChoice.WeakInterfaceMNM;
        return kind switch
        {
            SeparatorKind.VacuumDehydrator when fluid.Family == FluidFamily.Diesel => "a vacuum draws the light ends of a fuel",
            SeparatorKind.ElectrostaticCoalescer when fluid.Family == FluidFamily.Diesel => "an electric field beside fuel vapour can ignite it",
            SeparatorKind.ElectrostaticCoalescer when fluid.Family is FluidFamily.PhosphateEster or FluidFamily.Pag or FluidFamily.Ester or FluidFamily.NaturalEster => "the fluid conducts: the field breaks down in it",
            SeparatorKind.Absorbent when fluid.Family == FluidFamily.PhosphateEster => "ask the maker: some absorbents swell in, or change, a phosphate ester",
            SeparatorKind.Coalescer or SeparatorKind.ElectrostaticCoalescer when viscosity > MethodChoice.CoalescerViscosityMm2S => FormattableString.Invariant($"too thick there: {viscosity:0} mm²/s"),
            SeparatorKind.Coalescer when tight => "the emulsion is tight",
            SeparatorKind.Coalescer or SeparatorKind.ElectrostaticCoalescer or SeparatorKind.Centrifuge when difference < Constants.NeutralDensityKgM3 => "water and fluid weigh the same",
            SeparatorKind.Centrifuge when viscosity > CentrifugeViscosityMm2S => FormattableString.Invariant($"too thick there: {viscosity:0} mm²/s"),
            _ => null,
        };
    }

    /// <summary>What a rig of the usual size does on this volume (judgement).</summary>
    private DryDownDuty Duty(SeparatorKind kind, double temperatureK)
    {
        var (method, turnoverHours, most, efficiency) = kind switch
        {
            SeparatorKind.Coalescer => (DryingMethod.Coalescer, 1.0, 100.0, 0.9),
            SeparatorKind.ElectrostaticCoalescer => (DryingMethod.ElectrostaticCoalescer, 2, 60, 0.9),
            SeparatorKind.VacuumDehydrator => (DryingMethod.VacuumDehydrator, 2, 60, 0.7),
            SeparatorKind.Centrifuge => (DryingMethod.Centrifuge, 1, 100, 0.8),
            SeparatorKind.Absorbent => (DryingMethod.Absorbent, 2, 40, 0.6),
            _ => (DryingMethod.DryAirPurge, 0.5, 400, 0.7),
        };
        return new DryDownDuty
        {
            Method = method, OilVolumeM3 = volumeM3, FlowM3S = Math.Min(volumeM3 / (turnoverHours * 3600), most / 60_000), Efficiency = efficiency, OilTemperatureK = temperatureK,
            IngressKgS = task.IngressGPerDay / 86.4e6, PressurePa = VacuumPa,
        };
    }

    private double EnergyKWh(SeparatorKind kind, DryDownDuty duty, DryDown drying, double waterKg, double hours)
    {
        var pump = DryingEnergy.PumpPowerW(duty.FlowM3S, PumpRisePa, PumpEfficiency) * hours / 1000;
        var change = Math.Abs(duty.OilTemperatureK - runningK);
        var heat = change > 0 ? DryingEnergy.HeatJ(drying.OilMassKg, DryingEnergy.OilSpecificHeatJKgK(fluid.Sheet.Density15KgM3 ?? 870, duty.OilTemperatureK), change, 0, duty.OilTemperatureK) / 3.6e6 : 0;
        var vapour = kind is SeparatorKind.VacuumDehydrator or SeparatorKind.DryAirPurge ? waterKg * DryingEnergy.LatentHeatJKg(Math.Min(duty.OilTemperatureK, 390)) / 3.6e6 : 0;
        return pump + heat + vapour;
    }

    private MethodOption Settling(double temperatureK, string first)
    {
        var floor = fluid.SaturationPpm(temperatureK);
        var speed = Math.Abs(new DropletSettling(fluid, temperatureK).VelocityMS(SettlingDropM));
        double? hours = speed > 0 ? SettlingDepthM / speed / 3600 : null;
        var why = floor > task.TargetPpm ? FormattableString.Invariant($"ends at {floor:0} mg/kg, above the target of {task.TargetPpm:0}: what is dissolved stays")
            : hours is null or > LongestHours ? "drops of 50 µm do not settle in two months" : "";
        var water = Math.Max(0, task.StartPpm - floor) * 1e-6 * (oil.MassKg ?? 0);
        var heat = temperatureK > runningK ? DryingEnergy.HeatJ(oil.MassKg ?? 0, DryingEnergy.OilSpecificHeatJKgK(fluid.Sheet.Density15KgM3 ?? 870, temperatureK), temperatureK - runningK, 0, temperatureK) / 3.6e6 : 0;
        return why.Length > 0
            ? new MethodOption(null, first, floor, hours, null, "", 0, null, why)
            : new MethodOption(null, first, floor, hours, heat, "", water + task.SettledL, (heat * rates.PerKWh) + ((water + task.SettledL) * rates.PerWasteL), "");
    }
}
