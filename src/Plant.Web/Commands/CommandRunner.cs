using Plant.Web.Hosting;

namespace Plant.Web.Commands;

/// <summary>Runs a command with no web app around it, so that it starts fast.</summary>
public static class CommandRunner
{
    public const int Done = 0;
    public const int Refused = 1;
    public const int WrongUsage = 2;

    /// <summary>The exit code; null where the web app is to run.</summary>
    public static async Task<int?> TryRunAsync(string[] args)
    {
        CommandLine line;
        try
        {
            line = CommandLine.Parse(args, CommandTable.All);
        }
        catch (UsageException wrong)
        {
            return Wrong(args[0], wrong.Message);
        }

        if (!CommandTable.All.TryGetValue(line.Name, out var command))
        {
            await Console.Error.WriteLineAsync($"{line.Name} is no command");
            CommandTable.Help(Console.Error);
            return WrongUsage;
        }

        if (line.Has("help"))
        {
            if (command.Run is null)
            {
                CommandTable.Help(Console.Out);
            }
            else
            {
                Console.Out.WriteLine($"usage: {command.Usage}");
                Console.Out.WriteLine(command.Help);
            }

            return Done;
        }

        return command.Run is null ? null : await RunAsync(command, line);
    }

    private static async Task<int> RunAsync(Command command, CommandLine line)
    {
        try
        {
            var settings = PlantSettings.Read(Configuration(line));
            settings.PrepareFolder();
            var services = new ServiceCollection().AddLogging().AddPlant(settings);
            AccessCommands.AddPeople(services);
            await using var provider = services.BuildServiceProvider();
            return await command.Run!(new CommandContext(line, provider, settings));
        }
        catch (UsageException wrong)
        {
            return Wrong(command.Name, wrong.Message);
        }
        catch (Exception failure) when (failure is SettingException or InvalidDataException or InvalidOperationException or IOException or UnauthorizedAccessException or System.Data.Common.DbException)
        {
            await Console.Error.WriteLineAsync($"{command.Name}: {failure.Message}");
            return Refused;
        }
    }

    private static IConfiguration Configuration(CommandLine line)
    {
        var environment = Environment.GetEnvironmentVariable("ASPNETCORE_ENVIRONMENT") ?? Environment.GetEnvironmentVariable("DOTNET_ENVIRONMENT") ?? "Production";
        return new ConfigurationBuilder()
            .SetBasePath(AppContext.BaseDirectory)
            .AddJsonFile("appsettings.json", optional: true)
            .AddJsonFile($"appsettings.{environment}.json", optional: true)
            .AddJsonFile(Path.Combine(Directory.GetCurrentDirectory(), "appsettings.json"), optional: true)
            .AddJsonFile(Path.Combine(Directory.GetCurrentDirectory(), $"appsettings.{environment}.json"), optional: true)
            .AddEnvironmentVariables()
            .AddCommandLine([.. line.Settings])
            .Build();
    }

    private static int Wrong(string command, string message)
    {
        Console.Error.WriteLine($"{command}: {message}");
        Console.Error.WriteLine($"usage: {CommandTable.All[command].Usage}");
        return WrongUsage;
    }
}
