using Microsoft.Extensions.DependencyInjection;
using Plant.Register.Access;
using Plant.Register.Assessments;
using Plant.Register.Audit;
using Plant.Register.Interchange;
using Plant.Register.Laboratory;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Separators;
using Plant.Register.Storage;
using Plant.Register.WorkOrders;

namespace Plant.Register;

/// <summary>Registers the services of the register; the host adds the database.</summary>
public static class RegisterServices
{
    public static IServiceCollection AddRegister(this IServiceCollection services) => services
        .AddSingleton<RegisterWriter>()
        .AddSingleton<FluidService>()
        .AddSingleton<ReservoirService>()
        .AddSingleton<SampleService>()
        .AddSingleton<DrainService>()
        .AddSingleton<TopUpService>()
        .AddSingleton<SeparatorService>()
        .AddSingleton<SeparatorRunService>()
        .AddSingleton<ReadingService>()
        .AddSingleton<WorkOrderService>()
        .AddSingleton<WorkOrderSteps>()
        .AddSingleton<WorkOrderDrafter>()
        .AddSingleton<Verification>()
        .AddSingleton<RoundService>()
        .AddSingleton<BottleService>()
        .AddSingleton<BenchService>()
        .AddSingleton<TokenService>()
        .AddSingleton<HistoryReader>()
        .AddSingleton<AssessmentService>()
        .AddSingleton<AuditVerifier>()
        .AddSingleton<DatabaseMigrator>()
        .AddSingleton<Importer>()
        .AddSingleton<Exporter>();
}
