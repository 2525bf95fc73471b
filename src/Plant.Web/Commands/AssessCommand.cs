using System.Text;
using Plant.Register.Assessments;
using Plant.Register.Interchange;
using Plant.Register.Storage;

namespace Plant.Web.Commands;

/// <summary>assess.</summary>
internal static class AssessCommand
{
    public static async Task<int> RunAsync(CommandContext context)
    {
        context.NoWords();
        var asOf = context.Get<TimeProvider>().GetUtcNow();
        if (context.Line["as-of"] is { } text && !CsvText.TryTime(text, out asOf))
        {
            throw new UsageException($"--as-of \"{text}\" must be a time as ISO 8601 with Z or an offset, such as 2026-03-01T06:00:00Z");
        }

        await context.Get<DatabaseMigrator>().MigrateAsync();
        var fleet = await context.Get<AssessmentService>().FleetAsync(asOf.UtcDateTime);
        if (context.Line["out"] is { } file)
        {
            var path = CommandContext.PathOf(file);
            await using var writer = new StreamWriter(path, append: false, new UTF8Encoding(false)) { NewLine = "\r\n" };
            AssessmentColumns.Write(writer, fleet);
        }
        else
        {
            AssessmentColumns.Write(context.Out, fleet);
        }

        return CommandRunner.Done;
    }
}
