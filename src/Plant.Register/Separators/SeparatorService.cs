using Microsoft.EntityFrameworkCore;
using Plant.Advice;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Reservoirs;
using Plant.Register.Storage;

namespace Plant.Register.Separators;

/// <summary>Separators of the plant.</summary>
public sealed class SeparatorService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer)
    : RecordService<Separator, SeparatorFields>(contexts, writer)
{
    protected override Duty WriteDuty => Duty.EditRegister;

    /// <summary>A new record from checked fields.</summary>
    public static Separator Make(Guid id, SeparatorFields fields, Reservoir? reservoir)
    {
        var separator = new Separator { Id = id, Code = fields.Code!, Kind = Rule.Parse<SeparatorKind>(fields.Kind)!.Value };
        ApplyTo(separator, fields, reservoir);
        return separator;
    }

    public static void ApplyTo(Separator separator, SeparatorFields fields, Reservoir? reservoir)
    {
        ApplyTo(separator, fields, reservoir?.Id);
        separator.Reservoir = reservoir;
    }

    /// <summary>Applies the fields by the id of what they name, for those who do not track it.</summary>
    public static void ApplyTo(Separator separator, SeparatorFields fields, Guid? reservoirId)
    {
        separator.ReservoirId = reservoirId;
        separator.Kind = Rule.Parse<SeparatorKind>(fields.Kind)!.Value;
        separator.FlowLPerMin = fields.FlowLPerMin;
        separator.Efficiency = fields.Efficiency;
        separator.CutSizeUm = fields.CutSizeUm;
        separator.PressureKPa = fields.PressureKPa;
        separator.OilTemperatureC = fields.OilTemperatureC;
        separator.CapacityL = fields.CapacityL;
        separator.Portable = fields.Portable;
    }

    public static SeparatorFields FieldsOf(Separator separator, string? tag) => new()
    {
        Code = separator.Code,
        Tag = tag,
        Kind = Code.Of(separator.Kind),
        FlowLPerMin = separator.FlowLPerMin,
        Efficiency = separator.Efficiency,
        CutSizeUm = separator.CutSizeUm,
        PressureKPa = separator.PressureKPa,
        OilTemperatureC = separator.OilTemperatureC,
        CapacityL = separator.CapacityL,
        Portable = separator.Portable,
    };

    protected override IQueryable<Separator> Query(PlantDbContext context) => context.Separators.Include(s => s.Reservoir);

    protected override IQueryable<Separator> OfTag(IQueryable<Separator> query, string tag) => query.Where(s => s.Reservoir!.Tag == tag);

    protected override Task<Separator?> FindByKeyAsync(PlantDbContext context, string key, CancellationToken cancellation) =>
        Query(context).FirstOrDefaultAsync(s => s.Code == key, cancellation);

    protected override Task<Separator?> FindByFieldsAsync(PlantDbContext context, SeparatorFields fields, References references, CancellationToken cancellation) =>
        FindByKeyAsync(context, fields.Code!, cancellation);

    protected override async Task<References> ResolveAsync(PlantDbContext context, SeparatorFields fields, List<Refusal> refusals, CancellationToken cancellation) =>
        new(Reservoir: fields.Tag is null ? null : await References.ReservoirAsync(context, fields.Tag, refusals, cancellation));

    protected override Separator Make(Guid id, SeparatorFields fields, References references, Actor actor) => Make(id, fields, references.Reservoir);

    protected override void Apply(Separator record, SeparatorFields fields, References references) => ApplyTo(record, fields, references.Reservoir);

    protected override SeparatorFields ToFields(Separator record) => FieldsOf(record, record.Reservoir?.Tag);

    protected override void CheckKey(Separator record, SeparatorFields fields, List<Refusal> refusals) => KeyStays(refusals, "code", fields.Code, record.Code);
}
