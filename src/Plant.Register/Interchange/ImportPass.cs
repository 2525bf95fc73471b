using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Audit;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Separators;
using Plant.Register.Storage;

namespace Plant.Register.Interchange;

/// <summary>One run over a folder, within the caller's transaction.</summary>
internal sealed class ImportPass(PlantDbContext context, IDatabaseEngine engine, string folder, ImportOptions options)
{
    private readonly Dictionary<string, Area> areas = new(StringComparer.Ordinal);
    private Dictionary<string, Fluid>? fluids;
    private Dictionary<string, Reservoir>? reservoirs;
    private Dictionary<string, Separator>? separators;
    private int series;

    public async Task RunAsync(FileReport report, CancellationToken cancellation)
    {
        var path = Path.Combine(folder, report.File);
        switch (report.File)
        {
            case Files.FluidFile: await FluidsAsync(report, path, cancellation); break;
            case Files.ReservoirFile: await ReservoirsAsync(report, path, cancellation); break;
            case Files.SampleFile: await SamplesAsync(report, path, cancellation); break;
            case Files.DrainFile: await DrainsAsync(report, path, cancellation); break;
            case Files.TopUpFile: await TopUpsAsync(report, path, cancellation); break;
            case Files.SeparatorFile: await SeparatorsAsync(report, path, cancellation); break;
            case Files.RunFile: await RunsAsync(report, path, cancellation); break;
            case Files.ReadingFile: await new ReadingImport(context, engine, await ReservoirsByTagAsync(cancellation), report, options).RunAsync(path, cancellation); break;
            default: throw new InvalidOperationException($"{report.File} is no file of a plant");
        }
    }

    private async Task FluidsAsync(FileReport report, string path, CancellationToken cancellation)
    {
        var kind = new TableKind<FluidFields, Fluid>(Files.Fluids, f => f.Code!, await FluidsByCodeAsync(cancellation), FluidService.FieldsOf,
            (fields, _) => FluidService.Make(Guid.CreateVersion7(), fields),
            (fluid, fields, _) => FluidService.ApplyTo(fluid, KeepOrigins(fields, FluidService.FieldsOf(fluid))));
        await new TableImport<FluidFields, Fluid>(context, kind, report, options).RunAsync(path, AddAsync, cancellation);
    }

    private async Task ReservoirsAsync(FileReport report, string path, CancellationToken cancellation)
    {
        var known = await ReservoirsByTagAsync(cancellation);
        var fluidOf = await FluidsByCodeAsync(cancellation);
        await PrepareAreasAsync(path, report.File, cancellation);
        var kind = new TableKind<ReservoirFields, Reservoir>(Files.Reservoirs, f => f.Tag!, known, ReservoirService.FieldsOf,
            (fields, refusals) =>
            {
                if (!fluidOf.TryGetValue(fields.Fluid!, out var fluid))
                {
                    refusals.Add(new Refusal("fluid", fields.Fluid!, "names no fluid of the register or of this folder: enter the fluid first, or correct the code"));
                    return null;
                }

                var reservoir = ReservoirService.Make(Guid.CreateVersion7(), fields, fluid, fields.Area is null ? null : areas[fields.Area]);
                reservoir.SeriesNumber = ++series;
                return reservoir;
            },
            (reservoir, fields, refusals) =>
            {
                if (!fluidOf.TryGetValue(fields.Fluid!, out var fluid))
                {
                    refusals.Add(new Refusal("fluid", fields.Fluid!, "names no fluid of the register or of this folder: enter the fluid first, or correct the code"));
                    return;
                }

                ReservoirService.ApplyTo(reservoir, KeepOrigins(fields, ReservoirService.FieldsOf(reservoir)), fluid.Id, fields.Area is null ? null : areas[fields.Area].Id);
            },
            reservoir => (reservoir.Area, reservoir.Fluid) = (null, null));
        await new TableImport<ReservoirFields, Reservoir>(context, kind, report, options).RunAsync(path, AddAsync, cancellation);
    }

    private async Task SamplesAsync(FileReport report, string path, CancellationToken cancellation)
    {
        var byTag = await ReservoirsByTagAsync(cancellation);
        var tagOf = byTag.Values.ToDictionary(r => r.Id, r => r.Tag);
        var existing = (await context.Samples.AsNoTracking().ToListAsync(cancellation)).ToDictionary(s => Key(s.Code, s.Replicate), StringComparer.Ordinal);
        var bottleOf = new Dictionary<string, Guid>(StringComparer.Ordinal);
        foreach (var sample in existing.Values)
        {
            bottleOf.TryAdd(sample.Code, sample.ReservoirId);
        }

        var kind = new TableKind<SampleFields, Sample>(Files.Samples, f => Key(f.Sample!, (int)f.Replicate!.Value), existing, s => SampleService.FieldsOf(s, tagOf[s.ReservoirId]),
            (fields, refusals) =>
            {
                if (Find(byTag, fields.Tag, refusals) is not { } reservoir)
                {
                    return null;
                }

                if (!bottleOf.TryAdd(fields.Sample!, reservoir.Id) && bottleOf[fields.Sample!] != reservoir.Id)
                {
                    refusals.Add(new Refusal("tag", fields.Tag!, $"another replicate of sample {fields.Sample} is of reservoir {tagOf[bottleOf[fields.Sample!]]}: one bottle, one reservoir"));
                    return null;
                }

                return SampleService.Make(Guid.CreateVersion7(), fields, reservoir);
            },
            (sample, fields, refusals) =>
            {
                if (Find(byTag, fields.Tag, refusals) is { } reservoir)
                {
                    SampleService.ApplyTo(sample, fields, reservoir);
                }
            });
        await new TableImport<SampleFields, Sample>(context, kind, report, options).RunAsync(path, fresh => engine.InsertSamplesAsync(context, fresh, cancellation), cancellation);
    }

    private async Task DrainsAsync(FileReport report, string path, CancellationToken cancellation)
    {
        var byTag = await ReservoirsByTagAsync(cancellation);
        var tagOf = byTag.Values.ToDictionary(r => r.Id, r => r.Tag);
        var existing = (await context.Drains.AsNoTracking().ToListAsync(cancellation)).ToDictionary(d => Key(tagOf[d.ReservoirId], d.DrainedAt), StringComparer.Ordinal);
        var kind = new TableKind<DrainFields, DrainEvent>(Files.Drains, f => Key(f.Tag!, f.DrainedAt!.Value.UtcDateTime), existing, d => DrainService.FieldsOf(d, tagOf[d.ReservoirId]),
            (fields, refusals) => Find(byTag, fields.Tag, refusals) is { } reservoir ? Detach(DrainService.Make(Guid.CreateVersion7(), fields, reservoir)) : null,
            (drain, fields, _) => DrainService.ApplyTo(drain, fields));
        await new TableImport<DrainFields, DrainEvent>(context, kind, report, options).RunAsync(path, AddAsync, cancellation);

        static DrainEvent Detach(DrainEvent drain)
        {
            drain.Reservoir = null;
            return drain;
        }
    }

    private async Task TopUpsAsync(FileReport report, string path, CancellationToken cancellation)
    {
        var byTag = await ReservoirsByTagAsync(cancellation);
        var tagOf = byTag.Values.ToDictionary(r => r.Id, r => r.Tag);
        var existing = (await context.TopUps.AsNoTracking().ToListAsync(cancellation)).ToDictionary(t => Key(tagOf[t.ReservoirId], t.AddedAt), StringComparer.Ordinal);
        var kind = new TableKind<TopUpFields, TopUpEvent>(Files.TopUps, f => Key(f.Tag!, f.AddedAt!.Value.UtcDateTime), existing, t => TopUpService.FieldsOf(t, tagOf[t.ReservoirId]),
            (fields, refusals) => Find(byTag, fields.Tag, refusals) is { } reservoir ? Detach(TopUpService.Make(Guid.CreateVersion7(), fields, reservoir)) : null,
            (topUp, fields, _) => TopUpService.ApplyTo(topUp, fields));
        await new TableImport<TopUpFields, TopUpEvent>(context, kind, report, options).RunAsync(path, AddAsync, cancellation);

        static TopUpEvent Detach(TopUpEvent topUp)
        {
            topUp.Reservoir = null;
            return topUp;
        }
    }

    private async Task SeparatorsAsync(FileReport report, string path, CancellationToken cancellation)
    {
        var byTag = await ReservoirsByTagAsync(cancellation);
        var tagOf = byTag.Values.ToDictionary(r => r.Id, r => r.Tag);
        var kind = new TableKind<SeparatorFields, Separator>(Files.Separators, f => f.Code!, await SeparatorsByCodeAsync(cancellation),
            s => SeparatorService.FieldsOf(s, s.ReservoirId is { } id ? tagOf[id] : null),
            (fields, refusals) =>
            {
                var reservoir = fields.Tag is null ? null : Find(byTag, fields.Tag, refusals);
                var separator = SeparatorService.Make(Guid.CreateVersion7(), fields, reservoir);
                separator.Reservoir = null;
                return separator;
            },
            (separator, fields, refusals) =>
            {
                SeparatorService.ApplyTo(separator, fields, fields.Tag is null ? null : Find(byTag, fields.Tag, refusals)?.Id);
            });
        await new TableImport<SeparatorFields, Separator>(context, kind, report, options).RunAsync(path, AddAsync, cancellation);
    }

    private async Task RunsAsync(FileReport report, string path, CancellationToken cancellation)
    {
        var byTag = await ReservoirsByTagAsync(cancellation);
        var tagOf = byTag.Values.ToDictionary(r => r.Id, r => r.Tag);
        var byCode = await SeparatorsByCodeAsync(cancellation);
        var codeOf = byCode.Values.ToDictionary(s => s.Id, s => s.Code);
        var existing = (await context.SeparatorRuns.AsNoTracking().ToListAsync(cancellation)).ToDictionary(r => Key(codeOf[r.SeparatorId], r.StartedAt), StringComparer.Ordinal);
        var kind = new TableKind<SeparatorRunFields, SeparatorRunEvent>(Files.Runs, f => Key(f.Separator!, f.StartedAt!.Value.UtcDateTime), existing,
            r => SeparatorRunService.FieldsOf(r, codeOf[r.SeparatorId], tagOf[r.ReservoirId]),
            (fields, refusals) =>
            {
                if (!byCode.TryGetValue(fields.Separator!, out var separator))
                {
                    refusals.Add(new Refusal("separator", fields.Separator!, "names no separator of the register or of this folder: enter it first, or correct the code"));
                }

                if (Find(byTag, fields.Tag, refusals) is not { } reservoir || separator is null)
                {
                    return null;
                }

                var run = SeparatorRunService.Make(Guid.CreateVersion7(), fields, separator, reservoir);
                (run.Reservoir, run.Separator) = (null, null);
                return run;
            },
            (run, fields, refusals) =>
            {
                if (Find(byTag, fields.Tag, refusals) is { } reservoir)
                {
                    SeparatorRunService.ApplyTo(run, fields, reservoir.Id);
                }
            });
        await new TableImport<SeparatorRunFields, SeparatorRunEvent>(context, kind, report, options).RunAsync(path, AddAsync, cancellation);
    }

    /// <summary>Adds a portion and lets go of it, so that memory does not grow with the file.</summary>
    private async Task AddAsync<T>(IReadOnlyList<T> fresh)
        where T : class
    {
        foreach (var record in fresh)
        {
            context.Entry(record).State = EntityState.Added;
        }

        await context.SaveChangesAsync();
        foreach (var record in fresh)
        {
            context.Entry(record).State = EntityState.Detached;
        }
    }

    private async Task PrepareAreasAsync(string path, string file, CancellationToken cancellation)
    {
        var names = new CsvFile<ReservoirFields>(path, Files.Reservoirs, new FileReport(file)).Rows().Select(r => r.Fields.Area).OfType<string>().ToHashSet(StringComparer.Ordinal);
        foreach (var name in names)
        {
            areas.Add(name, (await ReservoirService.AreaAsync(context, name, cancellation))!);
        }

        var created = context.ChangeTracker.Entries<Area>().Where(e => e.State == EntityState.Added).Select(e => e.Entity.Name).Order(StringComparer.Ordinal).ToList();
        if (created.Count > 0)
        {
            context.Batches.Add(new RecordBatch("area", string.Join(", ", created), "{}", 0, default));
            await context.SaveChangesAsync(cancellation);
        }
    }

    private async Task<Dictionary<string, Fluid>> FluidsByCodeAsync(CancellationToken cancellation) =>
        fluids ??= await context.Fluids.AsNoTracking().ToDictionaryAsync(f => f.Code, StringComparer.Ordinal, cancellation);

    private async Task<Dictionary<string, Separator>> SeparatorsByCodeAsync(CancellationToken cancellation) =>
        separators ??= await context.Separators.AsNoTracking().ToDictionaryAsync(s => s.Code, StringComparer.Ordinal, cancellation);

    private async Task<Dictionary<string, Reservoir>> ReservoirsByTagAsync(CancellationToken cancellation)
    {
        if (reservoirs is null)
        {
            reservoirs = await context.Reservoirs.AsNoTracking().Include(r => r.Area).Include(r => r.Fluid).ToDictionaryAsync(r => r.Tag, StringComparer.Ordinal, cancellation);
            series = reservoirs.Count == 0 ? 0 : reservoirs.Values.Max(r => r.SeriesNumber);
        }

        return reservoirs;
    }

    private static Reservoir? Find(Dictionary<string, Reservoir> byTag, string? tag, List<Refusal> refusals)
    {
        if (byTag.TryGetValue(tag!, out var reservoir))
        {
            return reservoir;
        }

        refusals.Add(new Refusal("tag", tag!, "names no reservoir of the register or of this folder: enter the reservoir first, or correct the tag"));
        return null;
    }

    private static FluidFields KeepOrigins(FluidFields fields, FluidFields known) => fields with
    {
        ViscosityOrigin = known.ViscosityOrigin,
        DensityOrigin = known.DensityOrigin,
        SolubilityOrigin = known.SolubilityOrigin,
        LimitOrigin = known.LimitOrigin,
    };

    private static ReservoirFields KeepOrigins(ReservoirFields fields, ReservoirFields known) => fields with
    {
        DimensionsOrigin = known.DimensionsOrigin,
        TemperaturesOrigin = known.TemperaturesOrigin,
        LimitOrigin = known.LimitOrigin,
        CapacityOrigin = known.CapacityOrigin,
    };

    private static string Key(string name, int number) => FormattableString.Invariant($"{name}, {number}");

    private static string Key(string name, DateTime at) => FormattableString.Invariant($"{name}, {at:yyyy-MM-ddTHH:mm:ss.fff}Z");
}
