using Microsoft.EntityFrameworkCore;
using Plant.Advice;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Reservoirs;
using Plant.Register.Storage;

namespace Plant.Register.Samples;

/// <summary>Laboratory results.</summary>
public sealed class SampleService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer) : RecordService<Sample, SampleFields>(contexts, writer)
{
    protected override Duty WriteDuty => Duty.RecordSamples;

    /// <summary>A new record from checked fields.</summary>
    public static Sample Make(Guid id, SampleFields fields, Reservoir reservoir)
    {
        var sample = new Sample
        {
            Id = id,
            Code = fields.Sample!,
            Replicate = (int)fields.Replicate!.Value,
            ReservoirId = reservoir.Id,
            TakenAt = fields.TakenAt!.Value.UtcDateTime,
            Point = Rule.Parse<SamplePoint>(fields.Point)!.Value,
            Method = Rule.Parse<WaterMethod>(fields.Method)!.Value,
        };
        ApplyTo(sample, fields, reservoir);
        return sample;
    }

    public static void ApplyTo(Sample sample, SampleFields fields, Reservoir reservoir)
    {
        sample.ReservoirId = reservoir.Id;
        sample.TakenAt = fields.TakenAt!.Value.UtcDateTime;
        sample.ReceivedAt = fields.ReceivedAt?.UtcDateTime;
        sample.Point = Rule.Parse<SamplePoint>(fields.Point)!.Value;
        sample.OilTemperatureC = fields.OilTemperatureC;
        sample.Method = Rule.Parse<WaterMethod>(fields.Method)!.Value;
        sample.WaterPpm = fields.WaterPpm;
        sample.WaterActivity = fields.WaterActivity;
        sample.Analyst = fields.Analyst;
        sample.Remark = fields.Remark;
    }

    /// <summary>The columns; the tag is known where the reservoir was read with the sample.</summary>
    public static SampleFields FieldsOf(Sample sample, string? tag) => new()
    {
        Sample = sample.Code,
        Tag = tag,
        TakenAt = new DateTimeOffset(sample.TakenAt, TimeSpan.Zero),
        ReceivedAt = sample.ReceivedAt is { } time ? new DateTimeOffset(time, TimeSpan.Zero) : null,
        Point = Code.Of(sample.Point),
        OilTemperatureC = sample.OilTemperatureC,
        Method = Code.Of(sample.Method),
        WaterPpm = sample.WaterPpm,
        WaterActivity = sample.WaterActivity,
        Replicate = sample.Replicate,
        Analyst = sample.Analyst,
        Remark = sample.Remark,
    };

    protected override IQueryable<Sample> Query(PlantDbContext context) => context.Samples.Include(s => s.Reservoir);

    protected override IQueryable<Sample> OfTag(IQueryable<Sample> query, string tag) => query.Where(s => s.Reservoir!.Tag == tag);

    protected override Task<Sample?> FindByFieldsAsync(PlantDbContext context, SampleFields fields, References references, CancellationToken cancellation) =>
        Query(context).FirstOrDefaultAsync(s => s.Code == fields.Sample && s.Replicate == (int)fields.Replicate!.Value, cancellation);

    protected override async Task<References> ResolveAsync(PlantDbContext context, SampleFields fields, List<Refusal> refusals, CancellationToken cancellation)
    {
        var reservoir = await References.ReservoirAsync(context, fields.Tag, refusals, cancellation);
        var elsewhere = await context.Samples.Where(s => s.Code == fields.Sample && s.WithdrawnAt == null && s.Reservoir!.Tag != fields.Tag && s.Replicate != (int)fields.Replicate!.Value)
            .Select(s => s.Reservoir!.Tag).FirstOrDefaultAsync(cancellation);
        if (elsewhere is not null)
        {
            refusals.Add(new Refusal("tag", fields.Tag!, $"another replicate of sample {fields.Sample} is of reservoir {elsewhere}: one bottle, one reservoir"));
        }

        return new References(Reservoir: reservoir);
    }

    protected override Sample Make(Guid id, SampleFields fields, References references, Actor actor)
    {
        var sample = Make(id, fields, references.Reservoir!);
        sample.Reservoir = references.Reservoir;
        return sample;
    }

    protected override void Apply(Sample record, SampleFields fields, References references)
    {
        ApplyTo(record, fields, references.Reservoir!);
        record.Reservoir = references.Reservoir;
    }

    protected override SampleFields ToFields(Sample record) => FieldsOf(record, record.Reservoir?.Tag);

    protected override void CheckKey(Sample record, SampleFields fields, List<Refusal> refusals)
    {
        KeyStays(refusals, "sample", fields.Sample, record.Code);
        if ((int)fields.Replicate!.Value != record.Replicate)
        {
            refusals.Add(new Refusal("replicate", fields.Replicate.Value.ToString("R", System.Globalization.CultureInfo.InvariantCulture), $"is part of the key and stays {record.Replicate}"));
        }
    }
}
