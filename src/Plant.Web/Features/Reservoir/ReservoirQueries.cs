using Microsoft.EntityFrameworkCore;
using Plant.Advice;
using Plant.Physics;
using Plant.Register.Assessments;
using Plant.Register.Reservoirs;
using Plant.Register.Separators;
using Plant.Register.Storage;

namespace Plant.Web.Features.Reservoir;

/// <summary>Reads what the reservoir page shows.</summary>
public sealed class ReservoirQueries(IDbContextFactory<PlantDbContext> contexts, HistoryReader histories, PlanningRule rule)
{
    /// <summary>How far the forecast reaches [days].</summary>
    public const int ForecastDays = 90;

    /// <summary>The reservoir as of a time; null where there is none of this tag.</summary>
    public async Task<ReservoirView?> ReadAsync(string tag, DateTime asOf, CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var reservoir = await context.Reservoirs.AsNoTracking().Include(r => r.Area).Include(r => r.Fluid).FirstOrDefaultAsync(r => r.Tag == tag && r.WithdrawnAt == null, cancellation);
        if (reservoir is null)
        {
            return null;
        }

        var equipment = await context.Separators.AsNoTracking().Where(s => s.WithdrawnAt == null && (s.ReservoirId == reservoir.Id
            || context.SeparatorRuns.Any(r => r.SeparatorId == s.Id && r.ReservoirId == reservoir.Id && r.WithdrawnAt == null))).OrderBy(s => s.Code).ToListAsync(cancellation);
        var history = (await histories.ReadAsync(asOf, [tag], cancellation))[0];
        var working = new Working();
        var assessment = Assessor.Assess(history, asOf, rule, working);
        return new ReservoirView(reservoir.Id, ReservoirService.FieldsOf(reservoir), reservoir.Fluid!.Name, history, assessment, working.Steps, Forecaster.Observed(history, asOf),
            Forecaster.Forecast(history, asOf, rule, ForecastDays), equipment.ConvertAll(s => SeparatorService.FieldsOf(s, tag)));
    }
}
