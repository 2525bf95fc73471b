using Microsoft.EntityFrameworkCore;
using Plant.Register.Access;
using Plant.Register.Audit;
using Plant.Register.Separators;
using Plant.Register.WorkOrders;

namespace Plant.Register.Storage.Mapping;

internal static class WorkMapping
{
    public static void Map(ModelBuilder model)
    {
        var separator = model.Record<Separator>("separators");
        separator.HasIndex(s => s.Code).IsUnique();
        separator.Property(s => s.Kind).AsCode();
        separator.HasOne(s => s.Reservoir).WithMany().HasForeignKey(s => s.ReservoirId).OnDelete(DeleteBehavior.Restrict);

        var run = model.Record<SeparatorRunEvent>("separator_runs");
        run.HasIndex(r => new { r.SeparatorId, r.StartedAt }).IsUnique();
        run.HasIndex(r => new { r.ReservoirId, r.StartedAt });
        run.HasOne(r => r.Separator).WithMany().HasForeignKey(r => r.SeparatorId).OnDelete(DeleteBehavior.Restrict);
        run.HasOne(r => r.Reservoir).WithMany().HasForeignKey(r => r.ReservoirId).OnDelete(DeleteBehavior.Restrict);

        var order = model.Record<WorkOrder>("work_orders");
        order.HasIndex(o => o.Number).IsUnique();
        order.HasIndex(o => o.ReservoirId);
        order.Property(o => o.Kind).AsCode();
        order.Property(o => o.State).AsCode();
        order.HasOne(o => o.Reservoir).WithMany().HasForeignKey(o => o.ReservoirId).OnDelete(DeleteBehavior.Restrict);

        var look = model.Entity<OrderLook>();
        look.ToTable("order_looks");
        look.HasKey(l => new { l.OrderId, l.Person });

        var round = model.Record<DrainRound>("rounds");
        round.HasIndex(r => r.Code).IsUnique();

        var token = model.Entity<ApiToken>();
        token.ToTable("api_tokens");
        token.Property(t => t.Id).ValueGeneratedNever();
        token.HasIndex(t => t.Hash).IsUnique();

        var entry = model.Entity<AuditEntry>();
        entry.ToTable("audit_entries");
        entry.HasKey(e => e.Sequence);
        entry.Property(e => e.Sequence).ValueGeneratedNever();
        entry.HasIndex(e => new { e.Kind, e.RecordId });

        var head = model.Entity<AuditHead>();
        head.ToTable("audit_heads");
        head.HasKey(h => h.Kind);

        var revision = model.Entity<Revision>();
        revision.ToTable("revisions");
        revision.Property(r => r.Id).ValueGeneratedNever();
        revision.HasIndex(r => new { r.RecordId, r.Number }).IsUnique();
    }
}
