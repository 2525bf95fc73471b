namespace Plant.Web.Commands;

/// <summary>All commands.</summary>
public static class CommandTable
{
    public static readonly IReadOnlyDictionary<string, Command> All = new Command[]
    {
        new("serve", "serve [--urls URL] [--Section:Key VALUE …]", "Runs the web app (the default).", [], null, TakesSettings: true),
        new("migrate", "migrate", "Creates or upgrades the database, and says from which version to which.", [], DatabaseCommands.MigrateAsync),
        new("import", "import FOLDER [--amend \"reason\"]", "Reads the CSV files that the folder holds, all or nothing; the same folder again has no effect. Known rows with other values need --amend.", ["amend"], InterchangeCommands.ImportAsync),
        new("export", "export FOLDER", "Writes the whole register as CSV files.", [], InterchangeCommands.ExportAsync),
        new("assess", "assess [--as-of TIME] [--out FILE.csv]", "Judges the whole fleet as of a time, with what was known then. Advisory: follow local codes and licensed practice.", ["as-of", "out"], AssessCommand.RunAsync),
        new("token", "token --name NAME --role ROLE [--days N]", "Makes an API token; the last line of the output is the token, shown this once.", ["name", "role", "days"], AccessCommands.TokenAsync),
        new("user", "user add --email E --role ROLE", "Makes a person and prints a one-time password.", ["email", "role"], AccessCommands.UserAsync),
        new("backup", "backup FILE", "Writes a consistent, verified copy while the program runs.", [], DatabaseCommands.BackupAsync),
        new("restore", "restore FILE", "Verifies a copy, then puts it in the place of the database and keeps what it replaced. Stop the program first.", [], DatabaseCommands.RestoreAsync),
        new("verify", "verify", "Checks integrity, foreign keys and the audit chain; exit code 1 where something is wrong.", [], DatabaseCommands.VerifyAsync),
    }.ToDictionary(c => c.Name, StringComparer.Ordinal);

    public static void Help(TextWriter to)
    {
        to.WriteLine("Sump Ledger: where the water in the plant's oil is, and what to do about it.");
        to.WriteLine();
        foreach (var command in All.Values)
        {
            to.WriteLine($"  {command.Usage}");
            to.WriteLine($"      {command.Help}");
        }

        to.WriteLine();
        to.WriteLine("Every setting may be given too: --ConnectionStrings:Plant=…, --Database:Provider=PostgreSql, --Data:Folder=…");
        to.WriteLine("Exit codes: 0 done, 1 refused input, 2 wrong usage.");
    }
}
