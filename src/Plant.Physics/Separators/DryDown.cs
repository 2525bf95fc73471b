using Plant.Physics.Fluids;
using Plant.Physics.Water;

namespace Plant.Physics.Separators;

/// <summary>Water content of a mixed reservoir while a separator takes water and water comes in. Closed form throughout: the rate is linear in pieces.</summary>
/// <remarks>Equation: dC/dt = q − k·(min(C, cap) − C_eq). Source: water balance of a well mixed tank. Valid for: contents below about 2 %.</remarks>
public sealed class DryDown
{
    /// <summary>Relative saturation to which an absorbent takes dissolved water (judgement) [0 to 1].</summary>
    public const double AbsorbentActivity = 0.5;

    private readonly double capPpm = double.PositiveInfinity;
    private readonly bool takesOnly;

    /// <summary>Takes the properties at the temperature once.</summary>
    /// <param name="fluid">The fluid; it must have a saturation.</param>
    /// <param name="duty">What the separator does.</param>
    /// <param name="working">Receives the steps, or null.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value of the duty is outside its range.</exception>
    public DryDown(FluidModel fluid, DryDownDuty duty, Working? working = null)
    {
        ArgumentNullException.ThrowIfNull(fluid);
        ArgumentNullException.ThrowIfNull(duty);
        Guard.Between(duty.Efficiency, 0, 1);
        Guard.Positive(duty.FlowM3S);
        var temperature = Guard.Positive(duty.OilTemperatureK);
        SaturationPpm = fluid.SaturationPpm(temperature, working);
        OilMassKg = fluid.DensityKgM3(temperature, working) * Guard.Positive(duty.OilVolumeM3);
        IngressPpmS = Guard.NotNegative(duty.IngressKgS) * 1e6 / OilMassKg;
        RateConstantPerS = Guard.Positive(duty.Efficiency) * duty.FlowM3S / duty.OilVolumeM3;
        switch (duty.Method)
        {
            case DryingMethod.VacuumDehydrator:
                EquilibriumPpm = Headspace.EquilibriumPpm(fluid, temperature, Guard.Positive(duty.PressurePa));
                break;
            case DryingMethod.Absorbent:
                EquilibriumPpm = AbsorbentActivity * SaturationPpm;
                takesOnly = true;
                break;
            case DryingMethod.DryAirPurge or DryingMethod.DesiccantBreather:
                var dry = WaterProperties.VapourPressurePa(duty.DewPointK);
                EquilibriumPpm = Headspace.EquilibriumPpm(fluid, temperature, dry);
                capPpm = SaturationPpm;
                RateConstantPerS = duty.Efficiency * PurgeAir.RemovalKgS(duty.FlowM3S, temperature, WaterProperties.VapourPressurePa(temperature), 0) * 1e6 / (SaturationPpm * OilMassKg);
                break;
            default:
                EquilibriumPpm = SaturationPpm;
                takesOnly = true;
                break;
        }

        if (working is not null)
        {
            Explain(duty, working);
        }
    }

    /// <summary>Mass of the oil [kg].</summary>
    public double OilMassKg { get; }

    /// <summary>Saturation at the temperature of the separator [mg/kg].</summary>
    public double SaturationPpm { get; }

    /// <summary>Content at which the separator takes nothing more [mg/kg].</summary>
    public double EquilibriumPpm { get; }

    /// <summary>Share of the distance to equilibrium that goes per time [1/s].</summary>
    public double RateConstantPerS { get; }

    /// <summary>Rise by the water that comes in [mg/kg/s].</summary>
    public double IngressPpmS { get; }

    /// <summary>Steady content with this ingress [mg/kg]; null where more comes in than the separator can take.</summary>
    public double? FloorPpm => SteadyPpm <= capPpm ? SteadyPpm : null;

    private double SteadyPpm => EquilibriumPpm + (IngressPpmS / RateConstantPerS);

    /// <summary>Change of the content.</summary>
    /// <param name="waterPpm">Water content [mg/kg].</param>
    /// <returns>Rate [mg/kg/s]; negative while it dries.</returns>
    /// <remarks>Equation: q − k·(min(C, cap) − C_eq), not below zero removal for what only takes. Source: water balance of a mixed tank. Valid for: contents below about 2 %.</remarks>
    public double RatePpmS(double waterPpm)
    {
        var removal = RateConstantPerS * (Math.Min(Guard.NotNegative(waterPpm), capPpm) - EquilibriumPpm);
        return IngressPpmS - (takesOnly ? Math.Max(0, removal) : removal);
    }

    /// <summary>Content after a time.</summary>
    /// <param name="startPpm">Content at the start [mg/kg].</param>
    /// <param name="timeS">Time [s].</param>
    /// <returns>Content [mg/kg].</returns>
    /// <remarks>Equation: C_ss + (C0 − C_ss)·exp(−kt) where removal is proportional, straight where it is constant. Source: water balance of a mixed tank. Valid for: contents below about 2 %.</remarks>
    public double AtPpm(double startPpm, double timeS)
    {
        var water = Guard.NotNegative(startPpm);
        var left = Guard.NotNegative(timeS);
        for (var piece = 0; piece < 3; piece++)
        {
            var rate = RatePpmS(water);
            if (rate == 0 || left == 0)
            {
                return water;
            }

            var straight = (takesOnly && water < EquilibriumPpm) || water > capPpm || (water == capPpm && rate > 0);
            var edge = water < EquilibriumPpm && takesOnly ? EquilibriumPpm : water > capPpm && rate < 0 ? capPpm : water < capPpm && rate > 0 ? capPpm : double.NaN;
            var toEdge = double.IsNaN(edge) ? double.PositiveInfinity : straight ? (edge - water) / rate : ProportionalS(water, edge);
            if (left < toEdge)
            {
                return straight ? water + (rate * left) : SteadyPpm + ((water - SteadyPpm) * Math.Exp(-RateConstantPerS * left));
            }

            water = edge;
            left -= toEdge;
        }

        return water;
    }

    /// <summary>Content after a long time.</summary>
    /// <param name="startPpm">Content at the start [mg/kg].</param>
    /// <returns>Content [mg/kg]; null where it rises without end.</returns>
    /// <remarks>Equation: C_eq + q/k, or the start where nothing comes in and nothing is taken. Source: water balance of a mixed tank. Valid for: contents below about 2 %.</remarks>
    public double? EndPpm(double startPpm)
    {
        var rate = RatePpmS(startPpm);
        return rate == 0 ? startPpm : rate > 0 && startPpm >= capPpm ? null : FloorPpm;
    }

    /// <summary>Time until the content is down at a target.</summary>
    /// <param name="startPpm">Content at the start [mg/kg].</param>
    /// <param name="targetPpm">Target [mg/kg].</param>
    /// <returns>Time [s]; 0 where it is there already, null where it never comes down to it.</returns>
    /// <remarks>Equation: ln((C0 − C_ss)/(C − C_ss))/k where removal is proportional. Source: inverse of the content after a time. Valid for: contents below about 2 %.</remarks>
    public double? TimeToS(double startPpm, double targetPpm)
    {
        var water = Guard.NotNegative(startPpm);
        if (water <= Guard.NotNegative(targetPpm))
        {
            return 0;
        }

        if (!(EndPpm(water) < targetPpm))
        {
            return null;
        }

        var time = 0.0;
        if (water > capPpm)
        {
            var reached = Math.Max(targetPpm, capPpm);
            time = (reached - water) / RatePpmS(water);
            water = reached;
        }

        return water <= targetPpm ? time : time + ProportionalS(water, targetPpm);
    }

    private double ProportionalS(double fromPpm, double toPpm)
    {
        var share = (fromPpm - SteadyPpm) / (toPpm - SteadyPpm);
        return share >= 1 ? Math.Log(share) / RateConstantPerS : double.PositiveInfinity;
    }

    private void Explain(DryDownDuty duty, Working working)
    {
        var (formula, source, flag) = duty.Method switch
        {
            DryingMethod.VacuumDehydrator => (FormattableString.Invariant($"S·min(1, p/psat) = {SaturationPpm:0.##}·min(1, {duty.PressurePa:0.#} Pa/{WaterProperties.VapourPressurePa(duty.OilTemperatureK):0.#} Pa)"), Citations.Headspace,
                WaterProperties.VapourPressurePa(duty.OilTemperatureK) <= duty.PressurePa ? "water does not boil here: warmer oil or a deeper vacuum" : null),
            DryingMethod.Absorbent => ("0.5·S", Citations.AbsorbentFloor, "judgement: ask the maker for the element's equilibrium"),
            DryingMethod.DryAirPurge or DryingMethod.DesiccantBreather => (FormattableString.Invariant($"S·p(dew point {duty.DewPointK - Constants.ZeroCelsiusK:0.#} °C)/psat"), Citations.PurgeAir,
                FormattableString.Invariant($"the dew point of the air is taken as {duty.DewPointK - Constants.ZeroCelsiusK:0.#} °C (judgement)")),
            _ => ("S: dissolved water stays", Citations.Undissolved, (string?)null),
        };
        working.Add("content at which nothing more is taken", formula, EquilibriumPpm, "mg/kg", source, flag);
        working.Add("rate constant", DryingMethods.FlowIsAir(duty.Method) ? "η·Q_air·psat·M/(R·T)/(S·ρ·V)" : "η·Q/V", RateConstantPerS * 3600, "1/h", Citations.MixedTank,
            DryingMethods.FlowIsAir(duty.Method) ? "the flow is that of air at the headspace's temperature" : null);
        working.Add("rise by ingress", FormattableString.Invariant($"{duty.IngressKgS * 86.4e6:0.###} g/day over {OilMassKg:0.#} kg of oil"), IngressPpmS * 3600, "mg/kg/h", Citations.MixedTank);
        working.Add("floor with the ingress", "C_eq + ingress/rate constant", FloorPpm, "mg/kg", Citations.MixedTank, FloorPpm is null ? "more water comes in than the air can carry out: the content rises without end" : null);
    }
}
