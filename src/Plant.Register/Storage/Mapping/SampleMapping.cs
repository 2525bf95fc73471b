using Microsoft.EntityFrameworkCore;
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

        // read and written by the range with plain SQL; the migrations cluster it by its key
        var reading = model.Entity<Reading>();
        reading.ToTable("readings");
        reading.HasKey(r => new { r.SeriesNumber, r.AtMs });
    }
}
