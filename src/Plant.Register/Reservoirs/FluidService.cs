using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Physics.Fluids;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>Fluids of the plant.</summary>
public sealed class FluidService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer) : RecordService<Fluid, FluidFields>(contexts, writer)
{
    protected override Duty WriteDuty => Duty.EditRegister;

    /// <summary>A new record from checked fields.</summary>
    public static Fluid Make(Guid id, FluidFields fields)
    {
        var fluid = new Fluid { Id = id, Code = fields.Code!, Name = fields.Name!, Family = Rule.Parse<FluidFamily>(fields.Family)!.Value };
        ApplyTo(fluid, fields);
        return fluid;
    }

    public static void ApplyTo(Fluid fluid, FluidFields fields)
    {
        fluid.Name = fields.Name!;
        fluid.Family = Rule.Parse<FluidFamily>(fields.Family)!.Value;
        fluid.IsoVg = fields.IsoVg;
        fluid.Viscosity40Mm2S = fields.Viscosity40Mm2S;
        fluid.Viscosity100Mm2S = fields.Viscosity100Mm2S;
        fluid.Density15KgM3 = fields.Density15KgM3;
        fluid.ExpansionPerK = fields.ExpansionPerK;
        fluid.SolubilityA = fields.SolubilityA;
        fluid.SolubilityB = fields.SolubilityB;
        fluid.InterfacialTensionMNM = fields.InterfacialTensionMNM;
        fluid.RelativePermittivity = fields.RelativePermittivity;
        fluid.ConductivityPSM = fields.ConductivityPSM;
        fluid.DemulsibilityMin = fields.DemulsibilityMin;
        fluid.WaterLimitPpm = fields.WaterLimitPpm;
        fluid.ViscosityOrigin = Origin(fields.ViscosityOrigin, fields.Viscosity40Mm2S is not null);
        fluid.DensityOrigin = Origin(fields.DensityOrigin, fields.Density15KgM3 is not null);
        fluid.SolubilityOrigin = Origin(fields.SolubilityOrigin, fields.SolubilityA is not null);
        fluid.LimitOrigin = Origin(fields.LimitOrigin, fields.WaterLimitPpm is not null);
    }

    public static FluidFields FieldsOf(Fluid fluid) => new()
    {
        Code = fluid.Code,
        Name = fluid.Name,
        Family = Code.Of(fluid.Family),
        IsoVg = fluid.IsoVg,
        Viscosity40Mm2S = fluid.Viscosity40Mm2S,
        Viscosity100Mm2S = fluid.Viscosity100Mm2S,
        Density15KgM3 = fluid.Density15KgM3,
        ExpansionPerK = fluid.ExpansionPerK,
        SolubilityA = fluid.SolubilityA,
        SolubilityB = fluid.SolubilityB,
        InterfacialTensionMNM = fluid.InterfacialTensionMNM,
        RelativePermittivity = fluid.RelativePermittivity,
        ConductivityPSM = fluid.ConductivityPSM,
        DemulsibilityMin = fluid.DemulsibilityMin,
        WaterLimitPpm = fluid.WaterLimitPpm,
        ViscosityOrigin = Code.Of(fluid.ViscosityOrigin),
        DensityOrigin = Code.Of(fluid.DensityOrigin),
        SolubilityOrigin = Code.Of(fluid.SolubilityOrigin),
        LimitOrigin = Code.Of(fluid.LimitOrigin),
    };

    /// <summary>A value that nobody vouched for is from a data sheet where it is given, and the family's default where it is not.</summary>
    internal static ValueOrigin Origin(string? code, bool given) =>
        Rule.Parse<ValueOrigin>(code) ?? (given ? ValueOrigin.DataSheet : ValueOrigin.FamilyDefault);

    protected override IQueryable<Fluid> Query(PlantDbContext context) => context.Fluids;

    protected override IQueryable<Fluid> OfTag(IQueryable<Fluid> query, string tag) => query.Where(f => f.Code == tag);

    protected override Task<Fluid?> FindByKeyAsync(PlantDbContext context, string key, CancellationToken cancellation) =>
        context.Fluids.FirstOrDefaultAsync(f => f.Code == key, cancellation);

    protected override Task<Fluid?> FindByFieldsAsync(PlantDbContext context, FluidFields fields, References references, CancellationToken cancellation) =>
        FindByKeyAsync(context, fields.Code!, cancellation);

    protected override Task<References> ResolveAsync(PlantDbContext context, FluidFields fields, List<Refusal> refusals, CancellationToken cancellation) =>
        Task.FromResult(new References());

    protected override Fluid Make(Guid id, FluidFields fields, References references, Actor actor) => Make(id, fields);

    protected override void Apply(Fluid record, FluidFields fields, References references) => ApplyTo(record, fields);

    protected override FluidFields ToFields(Fluid record) => FieldsOf(record);

    protected override void CheckKey(Fluid record, FluidFields fields, List<Refusal> refusals) => KeyStays(refusals, "code", fields.Code, record.Code);
}
