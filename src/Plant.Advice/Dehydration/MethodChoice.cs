using Plant.Advice.Ledger;
using Plant.Physics.Fluids;

namespace Plant.Advice.Dehydration;

/// <summary>First choice of dehydration: by what must go and what the fluid allows (common practice).</summary>
public static class MethodChoice
{
    /// <summary>Viscosity above which a mechanical coalescer works poorly [mm²/s].</summary>
    public const double CoalescerViscosityMm2S = 150;

    /// <summary>Demulsibility above which an emulsion is tight [min] (common practice).</summary>
    public const double TightEmulsionMin = 30;

    /// <summary>Interfacial tension below which an emulsion is tight [mN/m] (common practice).</summary>
    public const double WeakInterfaceMNM = 18;

    private const double SmallVolumeL = 300;

    /// <summary>Chooses.</summary>
    /// <param name="oil">The oil.</param>
    /// <param name="targetPpm">Content to reach [mg/kg].</param>
    /// <param name="emulsifiedPpm">Emulsified water now [mg/kg].</param>
    /// <returns>The kind of separator, and why; no kind where nothing portable fits.</returns>
    public static (SeparatorKind? Kind, string Why) For(OilState oil, double targetPpm, double emulsifiedPpm)
    {
        ArgumentNullException.ThrowIfNull(oil);
        if (oil.Fluid is not { } fluid)
        {
            return (null, "the fluid's sheet cannot be used");
        }

        var small = oil.VolumeL is < SmallVolumeL;
        var saturation = oil.SaturationPpm;
        var dissolvedMustGo = saturation is null || targetPpm < saturation;
        var emulsion = emulsifiedPpm > 0.05 * targetPpm;
        var tight = fluid.Sheet.DemulsibilityMin > TightEmulsionMin || fluid.Sheet.InterfacialTensionMNM < WeakInterfaceMNM;
        var viscosity = oil.RunningK is { } temperature ? fluid.KinematicViscosityM2S(temperature) * 1e6 : 46;
        var stalls = oil.WaterGoes == WaterDirection.Neither;
        switch (fluid.Family)
        {
            case FluidFamily.Diesel:
                return dissolvedMustGo && !emulsion
                    ? (SeparatorKind.Absorbent, "an absorbent polishes fuel; a vacuum would draw its light ends")
                    : (SeparatorKind.Coalescer, "a fuel coalescer takes what is undissolved; a vacuum would draw light ends");
            case FluidFamily.PhosphateEster:
                return (small ? SeparatorKind.DryAirPurge : SeparatorKind.VacuumDehydrator, "water in a phosphate ester is dissolved: only vacuum or dry gas takes it");
            case FluidFamily.Pag or FluidFamily.Ester or FluidFamily.NaturalEster or FluidFamily.Silicone when dissolvedMustGo:
                return (SeparatorKind.VacuumDehydrator, "most of the water is dissolved: only vacuum or dry gas takes it");
            case FluidFamily.TransformerMineral:
                return (SeparatorKind.VacuumDehydrator, "transformer oil is dried far below saturation: vacuum, with degassing");
        }

        if (dissolvedMustGo)
        {
            return small ? (SeparatorKind.Absorbent, "a small volume above its target: an absorbent element does it") : (SeparatorKind.VacuumDehydrator, "the target is below saturation: the water to remove is dissolved");
        }

        return tight || stalls || viscosity > CoalescerViscosityMm2S
            ? (SeparatorKind.VacuumDehydrator, tight ? "the emulsion is tight: a coalescer would fail" : stalls ? "water and oil weigh the same: nothing settles" : "the oil is too thick for a coalescer")
            : (SeparatorKind.Coalescer, "what must go is undissolved and the oil lets it go");
    }

    /// <summary>The chosen kind in plain words.</summary>
    /// <param name="kind">The kind.</param>
    /// <returns>Words.</returns>
    public static string Words(SeparatorKind kind) => kind switch
    {
        SeparatorKind.Coalescer => "a coalescer",
        SeparatorKind.ElectrostaticCoalescer => "an electrostatic coalescer",
        SeparatorKind.VacuumDehydrator => "a vacuum dehydrator",
        SeparatorKind.Centrifuge => "a centrifuge",
        SeparatorKind.Absorbent => "an absorbent element",
        _ => "a dry-air purge",
    };
}
