namespace Plant.Web.Commands;

/// <summary>Words of the command line: a command, what it takes, and settings for the program.</summary>
public sealed class CommandLine
{
    private readonly Dictionary<string, string?> options = new(StringComparer.Ordinal);
    private readonly List<string> words = [];
    private readonly List<string> settings = [];

    private CommandLine(string name) => Name = name;

    public string Name { get; }

    public IReadOnlyList<string> Words => words;

    /// <summary>Arguments that are settings: --Section:Key value, --urls …</summary>
    public IReadOnlyList<string> Settings => settings;

    /// <summary>Reads the arguments; anything that is no command is for the web app.</summary>
    public static CommandLine Parse(IReadOnlyList<string> args, IReadOnlyDictionary<string, Command> commands)
    {
        if (args.Count == 0 || !commands.TryGetValue(args[0], out var command))
        {
            var serve = new CommandLine(args.Count > 0 && !args[0].StartsWith('-') ? args[0] : "serve");
            serve.settings.AddRange(args);
            if (args.Contains("--help") || args.Contains("-h"))
            {
                serve.options["help"] = null;
            }

            return serve;
        }

        var line = new CommandLine(args[0]);
        for (var i = 1; i < args.Count; i++)
        {
            line.Take(args, ref i, command);
        }

        return line;
    }

    public bool Has(string option) => options.ContainsKey(option);

    public string? this[string option] => options.GetValueOrDefault(option);

    private void Take(IReadOnlyList<string> args, ref int i, Command command)
    {
        var word = args[i];
        if (!word.StartsWith("--", StringComparison.Ordinal) && word != "-h")
        {
            words.Add(word);
            return;
        }

        var name = word.TrimStart('-').Split('=', 2)[0];
        if (name is "help" or "h")
        {
            options["help"] = null;
        }
        else if (command.Options.Contains(name))
        {
            options[name] = word.Contains('=', StringComparison.Ordinal) ? word[(word.IndexOf('=', StringComparison.Ordinal) + 1)..] : i + 1 < args.Count ? args[++i] : throw new UsageException($"--{name} needs a value");
        }
        else if (name.Contains(':', StringComparison.Ordinal) || command.TakesSettings)
        {
            settings.Add(word);
            if (!word.Contains('=', StringComparison.Ordinal) && i + 1 < args.Count && !args[i + 1].StartsWith("--", StringComparison.Ordinal))
            {
                settings.Add(args[++i]);
            }
        }
        else
        {
            throw new UsageException($"--{name} is no option of {command.Name}");
        }
    }
}

/// <summary>Wrong usage: exit code 2.</summary>
public sealed class UsageException(string message) : Exception(message);
