namespace Plant.Web.Commands;

/// <summary>One command of the program.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Usage">How it is called.</param>
/// <param name="Help">What it does.</param>
/// <param name="Options">Names of its options that take a value.</param>
/// <param name="Run">Runs it and gives the exit code; null for the web app.</param>
/// <param name="TakesSettings">True where any other option is a setting.</param>
public sealed record Command(string Name, string Usage, string Help, IReadOnlyList<string> Options, Func<CommandContext, Task<int>>? Run, bool TakesSettings = false);

/// <summary>What a command works with.</summary>
/// <param name="Line">The command line.</param>
/// <param name="Services">The register's services.</param>
/// <param name="Settings">The settings.</param>
public sealed record CommandContext(CommandLine Line, IServiceProvider Services, Hosting.PlantSettings Settings)
{
    public T Get<T>()
        where T : notnull => Services.GetRequiredService<T>();

    public TextWriter Out => Console.Out;

    public TextWriter Error => Console.Error;

    /// <summary>The one word that the command needs.</summary>
    public string Word(string what) => Line.Words.Count == 1 ? Line.Words[0] : throw new UsageException($"{Line.Name} needs one {what}");

    /// <summary>A path as the caller means it: relative to where they stand, also under dotnet run, which moves to the project.</summary>
    public static string PathOf(string path)
    {
        var here = Environment.GetEnvironmentVariable("PWD");
        return Path.IsPathRooted(path) || !Directory.Exists(here) ? Path.GetFullPath(path) : Path.GetFullPath(path, here);
    }

    public void NoWords()
    {
        if (Line.Words.Count > 0)
        {
            throw new UsageException($"{Line.Name} takes no {Line.Words[0]}");
        }
    }
}
