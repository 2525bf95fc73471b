using Microsoft.EntityFrameworkCore;
using Plant.Register.Laboratory;
using Plant.Register.Samples;

namespace Plant.Register.Storage.Mapping;

internal static class SampleMapping
{
    public static void Map(ModelBuilder model)
    {
        var sample = model.Record<Sample>("samples");
        sample.HasIndex(s => new { s.Code, s.Replicate }).IsUnique();
        sample.HasIndex(s => new { s.ReservoirId, s.TakenAt });
        sample.Property(s => s.Point).AsCode();
        sample.Property(s => s.Method).AsCode();
        sample.HasOne(s => s.Reservoir).WithMany().HasForeignKey(s => s.ReservoirId).OnDelete(DeleteBehavior.Restrict);

        var bottle = model.Record<Bottle>("bottles");
        bottle.HasIndex(b => b.Code).IsUnique();
        bottle.Property(b => b.Point).AsCode();
        bottle.HasOne(b => b.Reservoir).WithMany().HasForeignKey(b => b.ReservoirId).OnDelete(DeleteBehavior.Restrict);

        var batch = model.Entity<BenchBatch>();
        batch.ToTable("bench_batches");
        batch.Property(b => b.Id).ValueGeneratedNever();
        batch.Property(b => b.Method).AsCode();
        batch.Property(b => b.Entry).AsCode();
        batch.HasIndex(b => new { b.Owner, b.OpenedAt });
        batch.HasMany(b => b.Rows).WithOne().HasForeignKey(r => r.BatchId).OnDelete(DeleteBehavior.Cascade);

        var row = model.Entity<BenchRow>();
        row.ToTable("bench_rows");
        row.Property(r => r.Id).ValueGeneratedNever();
        row.Property(r => r.Point).AsCode();
        row.HasIndex(r => r.Bottle);

        // read and written by the range with plain SQL; the migrations cluster it by its key
        var reading = model.Entity<Reading>();
        reading.ToTable("readings");
        reading.HasKey(r => new { r.SeriesNumber, r.AtMs });
    }
}
