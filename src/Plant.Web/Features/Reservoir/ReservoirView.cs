using Plant.Advice;
using Plant.Advice.Ledger;
using Plant.Physics;
using Plant.Register.Reservoirs;
using Plant.Register.Separators;

namespace Plant.Web.Features.Reservoir;

/// <summary>All that the reservoir page shows.</summary>
/// <param name="Id">Id of the reservoir.</param>
/// <param name="Fields">The register's columns.</param>
/// <param name="FluidName">Name of the fluid.</param>
/// <param name="History">The records.</param>
/// <param name="Assessment">What they mean.</param>
/// <param name="Steps">The working.</param>
/// <param name="Observations">Samples as they are judged.</param>
/// <param name="Forecast">By the day, if nobody does anything.</param>
/// <param name="Equipment">Separators that stand at it.</param>
public sealed record ReservoirView(
    Guid Id, ReservoirFields Fields, string FluidName, ReservoirHistory History, Assessment Assessment, IReadOnlyList<WorkingStep> Steps,
    IReadOnlyList<Observation> Observations, IReadOnlyList<ForecastDay> Forecast, IReadOnlyList<SeparatorFields> Equipment);
