using System.Text;
using Microsoft.EntityFrameworkCore;
using Plant.Register.Access;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Separators;
using Plant.Register.Storage;

namespace Plant.Register.Interchange;

/// <summary>Writes the register as the files of a plant: rows in key order, times in UTC, numbers in their shortest form.</summary>
public sealed class Exporter(IDbContextFactory<PlantDbContext> contexts)
{
    /// <summary>Writes all files into the folder and says how many rows each has.</summary>
    public async Task<Outcome<IReadOnlyList<(string File, long Rows)>>> ExportAsync(string folder, Actor actor, CancellationToken cancellation = default)
    {
        if (!actor.May(Duty.Read))
        {
            return Outcome<IReadOnlyList<(string, long)>>.Refused(OutcomeKind.Forbidden, $"{actor.Name} may not read the register");
        }

        Directory.CreateDirectory(folder);
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        await using var snapshot = await context.Database.BeginTransactionAsync(System.Data.IsolationLevel.Serializable, cancellation);
        var reservoirs = await context.Reservoirs.AsNoTracking().Include(r => r.Area).Include(r => r.Fluid).ToListAsync(cancellation);
        var tagOf = reservoirs.ToDictionary(r => r.Id, r => r.Tag);
        var separators = await context.Separators.AsNoTracking().ToListAsync(cancellation);
        var codeOf = separators.ToDictionary(s => s.Id, s => s.Code);
        var fluids = await context.Fluids.AsNoTracking().Where(f => f.WithdrawnAt == null).ToListAsync(cancellation);
        var samples = await context.Samples.AsNoTracking().Where(s => s.WithdrawnAt == null).ToListAsync(cancellation);
        var drains = await context.Drains.AsNoTracking().Where(d => d.WithdrawnAt == null).ToListAsync(cancellation);
        var topUps = await context.TopUps.AsNoTracking().Where(t => t.WithdrawnAt == null).ToListAsync(cancellation);
        var runs = await context.SeparatorRuns.AsNoTracking().Where(r => r.WithdrawnAt == null).ToListAsync(cancellation);

        var written = new List<(string, long)>
        {
            Write(folder, Files.FluidFile, Files.Fluids, fluids.OrderBy(f => f.Code, StringComparer.Ordinal).Select(FluidService.FieldsOf)),
            Write(folder, Files.ReservoirFile, Files.Reservoirs, reservoirs.Where(r => r.WithdrawnAt is null).OrderBy(r => r.Tag, StringComparer.Ordinal).Select(ReservoirService.FieldsOf)),
            Write(folder, Files.SampleFile, Files.Samples, samples.OrderBy(s => s.Code, StringComparer.Ordinal).ThenBy(s => s.Replicate).Select(s => SampleService.FieldsOf(s, tagOf[s.ReservoirId]))),
            Write(folder, Files.DrainFile, Files.Drains, drains.OrderBy(d => tagOf[d.ReservoirId], StringComparer.Ordinal).ThenBy(d => d.DrainedAt).Select(d => DrainService.FieldsOf(d, tagOf[d.ReservoirId]))),
            Write(folder, Files.TopUpFile, Files.TopUps, topUps.OrderBy(t => tagOf[t.ReservoirId], StringComparer.Ordinal).ThenBy(t => t.AddedAt).Select(t => TopUpService.FieldsOf(t, tagOf[t.ReservoirId]))),
            Write(folder, Files.SeparatorFile, Files.Separators, separators.Where(s => s.WithdrawnAt is null).OrderBy(s => s.Code, StringComparer.Ordinal).Select(s => SeparatorService.FieldsOf(s, s.ReservoirId is { } id ? tagOf[id] : null))),
            Write(folder, Files.RunFile, Files.Runs, runs.OrderBy(r => codeOf[r.SeparatorId], StringComparer.Ordinal).ThenBy(r => r.StartedAt).Select(r => SeparatorRunService.FieldsOf(r, codeOf[r.SeparatorId], tagOf[r.ReservoirId]))),
            Write(folder, Files.ReadingFile, Files.Readings, Readings(context, reservoirs)),
        };
        return Outcome<IReadOnlyList<(string, long)>>.Done(written);
    }

    /// <summary>Readings a reservoir at a time: the largest table is never in memory as a whole.</summary>
    private static IEnumerable<ReadingFields> Readings(PlantDbContext context, List<Reservoir> reservoirs)
    {
        foreach (var reservoir in reservoirs.Where(r => r.WithdrawnAt is null).OrderBy(r => r.Tag, StringComparer.Ordinal))
        {
            foreach (var reading in context.Readings.AsNoTracking().Where(r => r.SeriesNumber == reservoir.SeriesNumber).OrderBy(r => r.AtMs).AsEnumerable())
            {
                yield return new ReadingFields
                {
                    Tag = reservoir.Tag,
                    ReadAt = DateTimeOffset.FromUnixTimeMilliseconds(reading.AtMs),
                    OilTemperatureC = reading.OilTemperatureC,
                    WaterActivity = reading.WaterActivity,
                };
            }
        }
    }

    private static (string File, long Rows) Write<T>(string folder, string file, IReadOnlyList<Column<T>> columns, IEnumerable<T> rows)
    {
        var path = Path.Combine(folder, file);
        var count = 0L;
        using (var writer = new StreamWriter(path + ".part", append: false, new UTF8Encoding(false), 1 << 16) { NewLine = "\r\n" })
        {
            writer.WriteLine(string.Join(',', columns.Select(c => c.Name)));
            foreach (var row in rows)
            {
                for (var i = 0; i < columns.Count; i++)
                {
                    if (i > 0)
                    {
                        writer.Write(',');
                    }

                    WriteCell(writer, columns[i].Write(row));
                }

                writer.WriteLine();
                count++;
            }
        }

        File.Move(path + ".part", path, overwrite: true);
        return (file, count);
    }

    private static void WriteCell(StreamWriter writer, string cell)
    {
        if (cell.AsSpan().IndexOfAny("\",\r\n") < 0)
        {
            writer.Write(cell);
            return;
        }

        writer.Write('"');
        writer.Write(cell.Replace("\"", "\"\"", StringComparison.Ordinal));
        writer.Write('"');
    }
}
