using Plant.Physics.Fluids;

namespace Plant.Advice;

/// <summary>The usual cautions of the work; local codes and licensed practice come first.</summary>
public static class Cautions
{
    /// <summary>What stands beside every advice.</summary>
    public const string Advisory = "Advisory: a person decides; follow local codes, isolation rules and licensed practice.";

    /// <summary>Cautions for work on a reservoir.</summary>
    /// <param name="history">The reservoir.</param>
    /// <param name="drains">True where something is drained.</param>
    /// <param name="dehydration">Dehydration advised, or null.</param>
    /// <returns>The cautions, the general one last.</returns>
    public static IReadOnlyList<string> For(ReservoirHistory history, bool drains, SeparatorKind? dehydration)
    {
        ArgumentNullException.ThrowIfNull(history);
        var found = new List<string>();
        if (drains || dehydration is not null)
        {
            if (history.OperatingTemperatureC >= 45)
            {
                found.Add(FormattableString.Invariant($"Hot oil ({history.OperatingTemperatureC:0} °C) and stored pressure: isolate, relieve, let it cool."));
            }

            found.Add(history.Fluid.Family == FluidFamily.TransformerMineral
                ? "Transformer: de-energise and earth by licensed staff only; check for PCB before any oil or water leaves it."
                : "Water drained from oil is oily waste: collect it, never to the drain.");
            switch (history.Fluid.Family)
            {
                case FluidFamily.Diesel:
                    found.Add("Fuel vapour: no ignition sources, bond and earth, ventilate.");
                    break;
                case FluidFamily.PhosphateEster:
                    found.Add("Phosphate ester: gloves, goggles and breathing protection; its own hoses and rig, never shared with mineral oil.");
                    break;
            }
        }

        if (dehydration == SeparatorKind.VacuumDehydrator)
        {
            found.Add("Vacuum vessel: may foam over or collapse; watch the heater's surface temperature; oil of hydrogen-cooled generators releases hydrogen.");
        }

        if (dehydration == SeparatorKind.ElectrostaticCoalescer)
        {
            found.Add("Electric field: only in an oil-filled, bonded vessel without vapour space.");
        }

        found.Add(Advisory);
        return found;
    }
}
