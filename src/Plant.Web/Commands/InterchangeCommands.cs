using Plant.Register;
using Plant.Register.Access;
using Plant.Register.Interchange;
using Plant.Register.Storage;

namespace Plant.Web.Commands;

/// <summary>import, export.</summary>
internal static class InterchangeCommands
{
    public static async Task<int> ImportAsync(CommandContext context)
    {
        var folder = CommandContext.PathOf(context.Word("FOLDER"));
        await context.Get<DatabaseMigrator>().MigrateAsync();
        var options = new ImportOptions { AmendReason = context.Line["amend"], Progress = Console.IsErrorRedirected ? null : new Ticker(context.Error) };
        var outcome = await context.Get<Importer>().ImportAsync(folder, options, Actor.Console("import"));
        foreach (var report in outcome.Value?.Files ?? [])
        {
            context.Out.WriteLine(FormattableString.Invariant($"{report.File}: {report.New} new, {report.Unchanged} unchanged, {report.Amended} {(options.AmendReason is null ? "changed" : "amended")}, {report.Refused} refused"));
            foreach (var error in report.Errors)
            {
                context.Error.WriteLine(error);
            }

            if (report.Refused > report.Errors.Count)
            {
                context.Error.WriteLine(FormattableString.Invariant($"{report.File}: {report.Refused} rows are refused; the first {report.Errors.Count} errors are told"));
            }
        }

        foreach (var refusal in outcome.Refusals)
        {
            context.Error.WriteLine($"{refusal.Field} \"{refusal.Value}\" {refusal.Reason}");
        }

        if (outcome.IsDone)
        {
            return CommandRunner.Done;
        }

        context.Error.WriteLine(outcome.Message ?? "Nothing was written: mend the rows above and import the folder again.");
        return CommandRunner.Refused;
    }

    public static async Task<int> ExportAsync(CommandContext context)
    {
        var folder = CommandContext.PathOf(context.Word("FOLDER"));
        await context.Get<DatabaseMigrator>().MigrateAsync();
        var outcome = await context.Get<Exporter>().ExportAsync(folder, Actor.Console("export"));
        foreach (var (file, rows) in outcome.Value ?? [])
        {
            context.Out.WriteLine(FormattableString.Invariant($"{file}: {rows} rows"));
        }

        return outcome.IsDone ? CommandRunner.Done : CommandRunner.Refused;
    }

    /// <summary>A line that is overwritten, on a terminal only.</summary>
    private sealed class Ticker(TextWriter to) : IProgress<(string File, long Line)>
    {
        private long last;

        public void Report((string File, long Line) value)
        {
            if (value.Line - last is >= 50_000 or < 0)
            {
                last = value.Line;
                to.Write(FormattableString.Invariant($"\r{value.File}: {value.Line} lines "));
            }
        }
    }
}
