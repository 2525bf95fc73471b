using Microsoft.EntityFrameworkCore;
using Plant.Advice;
using Plant.Physics;
using Plant.Physics.Tanks;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>Reservoirs of the plant.</summary>
public sealed class ReservoirService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer)
    : RecordService<Reservoir, ReservoirFields>(contexts, writer)
{
    protected override Duty WriteDuty => Duty.EditRegister;

    /// <summary>A new record from checked fields.</summary>
    public static Reservoir Make(Guid id, ReservoirFields fields, Fluid fluid, Area? area)
    {
        var reservoir = new Reservoir { Id = id, Tag = fields.Tag!, Name = fields.Name!, FluidId = fluid.Id };
        ApplyTo(reservoir, fields, fluid, area);
        return reservoir;
    }

    public static void ApplyTo(Reservoir reservoir, ReservoirFields fields, Fluid fluid, Area? area)
    {
        ApplyTo(reservoir, fields, fluid.Id, area?.Id);
        reservoir.Area = area;
        reservoir.Fluid = fluid;
    }

    /// <summary>Applies the fields by the ids of what they name, for those who do not track it.</summary>
    public static void ApplyTo(Reservoir reservoir, ReservoirFields fields, Guid fluidId, Guid? areaId)
    {
        reservoir.Name = fields.Name!;
        reservoir.AreaId = areaId;
        reservoir.Service = fields.Service;
        reservoir.FluidId = fluidId;
        reservoir.Shape = Rule.Parse<TankShape>(fields.Shape);
        reservoir.LengthMm = fields.LengthMm;
        reservoir.WidthMm = fields.WidthMm;
        reservoir.HeightMm = fields.HeightMm;
        reservoir.OilVolumeL = fields.OilVolumeL;
        reservoir.SuctionHeightMm = fields.SuctionHeightMm;
        reservoir.CirculationLPerMin = fields.CirculationLPerMin;
        reservoir.OperatingTemperatureC = fields.OperatingTemperatureC;
        reservoir.ColdestTemperatureC = fields.ColdestTemperatureC;
        reservoir.HeadspaceRhPercent = fields.HeadspaceRhPercent;
        reservoir.Breather = Rule.Parse<Breather>(fields.Breather);
        reservoir.WaterLimitPpm = fields.WaterLimitPpm;
        reservoir.WaterCapacityL = fields.WaterCapacityL;
        reservoir.Criticality = (int?)fields.Criticality;
        reservoir.CommissionedAt = fields.CommissionedAt?.UtcDateTime;
        reservoir.DimensionsOrigin = Rule.Parse<ValueOrigin>(fields.DimensionsOrigin) ?? ValueOrigin.Unverified;
        reservoir.TemperaturesOrigin = Rule.Parse<ValueOrigin>(fields.TemperaturesOrigin) ?? ValueOrigin.Unverified;
        reservoir.LimitOrigin = Rule.Parse<ValueOrigin>(fields.LimitOrigin) ?? (fields.WaterLimitPpm is null ? ValueOrigin.FamilyDefault : ValueOrigin.Unverified);
        reservoir.CapacityOrigin = Rule.Parse<ValueOrigin>(fields.CapacityOrigin) ?? ValueOrigin.Unverified;
    }

    public static ReservoirFields FieldsOf(Reservoir reservoir) => new()
    {
        Tag = reservoir.Tag,
        Name = reservoir.Name,
        Area = reservoir.Area?.Name,
        Service = reservoir.Service,
        Fluid = reservoir.Fluid?.Code,
        Shape = reservoir.Shape is { } shape ? Code.Of(shape) : null,
        LengthMm = reservoir.LengthMm,
        WidthMm = reservoir.WidthMm,
        HeightMm = reservoir.HeightMm,
        OilVolumeL = reservoir.OilVolumeL,
        SuctionHeightMm = reservoir.SuctionHeightMm,
        CirculationLPerMin = reservoir.CirculationLPerMin,
        OperatingTemperatureC = reservoir.OperatingTemperatureC,
        ColdestTemperatureC = reservoir.ColdestTemperatureC,
        HeadspaceRhPercent = reservoir.HeadspaceRhPercent,
        Breather = reservoir.Breather is { } breather ? Code.Of(breather) : null,
        WaterLimitPpm = reservoir.WaterLimitPpm,
        WaterCapacityL = reservoir.WaterCapacityL,
        Criticality = reservoir.Criticality,
        CommissionedAt = reservoir.CommissionedAt is { } time ? new DateTimeOffset(time, TimeSpan.Zero) : null,
        DimensionsOrigin = Code.Of(reservoir.DimensionsOrigin),
        TemperaturesOrigin = Code.Of(reservoir.TemperaturesOrigin),
        LimitOrigin = Code.Of(reservoir.LimitOrigin),
        CapacityOrigin = Code.Of(reservoir.CapacityOrigin),
    };

    /// <summary>The area of this name, made where the site has none yet.</summary>
    public static async Task<Area?> AreaAsync(PlantDbContext context, string? name, CancellationToken cancellation)
    {
        if (name is null)
        {
            return null;
        }

        var known = context.Areas.Local.FirstOrDefault(a => a.Name == name) ?? await context.Areas.FirstOrDefaultAsync(a => a.Name == name, cancellation);
        if (known is not null)
        {
            return known;
        }

        var site = context.Sites.Local.FirstOrDefault() ?? await context.Sites.FirstOrDefaultAsync(cancellation);
        if (site is null)
        {
            site = new Site { Id = Guid.CreateVersion7(), Name = "Plant", TimeZone = "UTC" };
            context.Add(site);
        }

        var area = new Area { Id = Guid.CreateVersion7(), SiteId = site.Id, Name = name };
        context.Add(area);
        return area;
    }

    protected override IQueryable<Reservoir> Query(PlantDbContext context) => context.Reservoirs.Include(r => r.Area).Include(r => r.Fluid);

    protected override IQueryable<Reservoir> OfTag(IQueryable<Reservoir> query, string tag) => query.Where(r => r.Tag == tag);

    protected override Task<Reservoir?> FindByKeyAsync(PlantDbContext context, string key, CancellationToken cancellation) =>
        Query(context).FirstOrDefaultAsync(r => r.Tag == key, cancellation);

    protected override Task<Reservoir?> FindByFieldsAsync(PlantDbContext context, ReservoirFields fields, References references, CancellationToken cancellation) =>
        FindByKeyAsync(context, fields.Tag!, cancellation);

    protected override async Task<References> ResolveAsync(PlantDbContext context, ReservoirFields fields, List<Refusal> refusals, CancellationToken cancellation)
    {
        var fluid = await context.Fluids.FirstOrDefaultAsync(f => f.Code == fields.Fluid && f.WithdrawnAt == null, cancellation);
        if (fluid is null)
        {
            refusals.Add(new Refusal("fluid", fields.Fluid ?? string.Empty, "names no fluid of the register: enter the fluid first, or correct the code"));
        }

        return new References(Fluid: fluid, Area: await AreaAsync(context, fields.Area, cancellation));
    }

    protected override Reservoir Make(Guid id, ReservoirFields fields, References references, Actor actor) => Make(id, fields, references.Fluid!, references.Area);

    protected override async Task PrepareAsync(PlantDbContext context, Reservoir record, CancellationToken cancellation) =>
        record.SeriesNumber = 1 + (await context.Reservoirs.MaxAsync(r => (int?)r.SeriesNumber, cancellation) ?? 0);

    protected override void Apply(Reservoir record, ReservoirFields fields, References references) => ApplyTo(record, fields, references.Fluid!, references.Area);

    protected override ReservoirFields ToFields(Reservoir record) => FieldsOf(record);

    protected override void CheckKey(Reservoir record, ReservoirFields fields, List<Refusal> refusals) => KeyStays(refusals, "tag", fields.Tag, record.Tag);
}
