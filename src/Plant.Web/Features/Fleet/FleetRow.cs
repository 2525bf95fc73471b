using Plant.Advice;
using Plant.Web.Shared.Drawing;

namespace Plant.Web.Features.Fleet;

/// <summary>A reservoir as the fleet page shows it.</summary>
/// <param name="Tag">Tag.</param>
/// <param name="Name">Name.</param>
/// <param name="Area">Area.</param>
/// <param name="FluidCode">Code of its fluid.</param>
/// <param name="OpenWork">Open work orders in words.</param>
/// <param name="Section">What its section shows.</param>
/// <param name="Assessment">What its records mean.</param>
public sealed record FleetRow(string Tag, string Name, string Area, string FluidCode, string OpenWork, SectionState Section, Assessment Assessment)
{
    /// <summary>Days since the newest sample; null without one.</summary>
    public double? SampleAgeDays => Assessment.LastSampleAt is { } at ? (Assessment.AsOf - at).TotalDays : null;

    /// <summary>True where the date to drain has come.</summary>
    public bool Due => Assessment.DrainBy <= Assessment.AsOf;
}
