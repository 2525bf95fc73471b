using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Separators;
using Plant.Register.Storage;

namespace Plant.Register.Interchange;

/// <summary>Reads a folder of files into the register: all or nothing, and the same folder again has no effect.</summary>
public sealed class Importer(RegisterWriter writer, IDatabaseEngine engine)
{
    /// <summary>Imports the files that the folder holds, or only looks where the options say so.</summary>
    public async Task<Outcome<ImportReport>> ImportAsync(string folder, ImportOptions options, Actor actor, CancellationToken cancellation = default)
    {
        if (!actor.May(Duty.EditRegister))
        {
            return Outcome<ImportReport>.Refused(OutcomeKind.Forbidden, $"{actor.Name} may not import");
        }

        if (options.AmendReason is { } reason && reason.Trim().Length < RegisterWriter.ReasonLength)
        {
            return Outcome<ImportReport>.Invalid(new Refusal("amend", reason, $"say in at least {RegisterWriter.ReasonLength} characters why known rows are corrected"));
        }

        var present = Files.All.Where(file => File.Exists(Path.Combine(folder, file))).ToList();
        if (present.Count == 0)
        {
            return Outcome<ImportReport>.Invalid(new Refusal("folder", folder, Directory.Exists(folder)
                ? $"holds none of {string.Join(", ", Files.All)}"
                : "is no folder"));
        }

        var reports = new List<FileReport>();
        var outcome = await writer.WriteAsync(actor, options.AmendReason, async (context, stop) =>
        {
            context.ChangeTracker.AutoDetectChangesEnabled = false;
            var pass = new ImportPass(context, engine, folder, options);
            foreach (var file in present)
            {
                var report = new FileReport(file);
                reports.Add(report);
                await pass.RunAsync(report, stop);
            }

            var found = new ImportReport(reports, false);
            return options.Preview || found.HasErrors
                ? new Outcome<ImportReport>(OutcomeKind.Invalid, found, [], null)
                : Outcome<ImportReport>.Done(found with { Written = true });
        }, cancellation);
        return outcome.Value is null ? outcome with { Value = new ImportReport(reports, false) } : outcome;
    }
}
