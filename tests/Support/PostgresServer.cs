using System.Diagnostics;
using System.Net;
using System.Net.Sockets;

namespace Plant.Tests.Support;

/// <summary>PostgreSQL for tests: the one that tests/run started, or one of our own on a free port, or none.</summary>
public sealed class PostgresServer : IAsyncDisposable
{
    private readonly string? folder;
    private readonly string? binaries;

    private PostgresServer(string? connection, string? folder, string? binaries)
    {
        Connection = connection;
        this.folder = folder;
        this.binaries = binaries;
    }

    /// <summary>Connection string to its maintenance database; null where there is no server on this machine.</summary>
    public string? Connection { get; }

    public static async Task<PostgresServer> StartAsync()
    {
        if (Environment.GetEnvironmentVariable("PLANT_TEST_POSTGRES") is { Length: > 0 } given)
        {
            return new PostgresServer(given, null, null);
        }

        var binaries = Directory.Exists("/usr/lib/postgresql")
            ? Directory.GetDirectories("/usr/lib/postgresql").Order(StringComparer.Ordinal).Select(d => Path.Combine(d, "bin")).LastOrDefault(d => File.Exists(Path.Combine(d, "initdb")))
            : null;
        if (binaries is null)
        {
            return new PostgresServer(null, null, null);
        }

        var folder = Directory.CreateTempSubdirectory("plant-pg-").FullName;
        File.SetUnixFileMode(folder, (UnixFileMode)0b111_111_111);
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        var port = ((IPEndPoint)listener.LocalEndpoint).Port;
        listener.Stop();
        var data = Path.Combine(folder, "data");
        await RunAsync(Path.Combine(binaries, "initdb"), "-D", data, "-U", "plant", "-A", "trust", "--data-checksums", "-E", "UTF8");
        await RunAsync(Path.Combine(binaries, "pg_ctl"), "-D", data, "-w", "-l", Path.Combine(folder, "log"), "-o", $"-p {port} -k {folder} -c listen_addresses=127.0.0.1", "start");
        return new PostgresServer($"Host=127.0.0.1;Port={port};Username=plant;Database=postgres", folder, binaries);
    }

    public async ValueTask DisposeAsync()
    {
        if (folder is not null)
        {
            await RunAsync(Path.Combine(binaries!, "pg_ctl"), "-D", Path.Combine(folder, "data"), "-m", "immediate", "stop");
            Directory.Delete(folder, recursive: true);
        }
    }

    private static async Task RunAsync(string program, params string[] arguments)
    {
        var root = Environment.UserName == "root";
        var start = new ProcessStartInfo(root ? "runuser" : program) { RedirectStandardOutput = false, WorkingDirectory = "/" };
        foreach (var argument in root ? ["-u", "postgres", "--", program, .. arguments] : arguments)
        {
            start.ArgumentList.Add(argument);
        }

        using var process = Process.Start(start)!;
        await process.WaitForExitAsync();
        if (process.ExitCode != 0)
        {
            throw new InvalidOperationException($"{program} ended with {process.ExitCode}");
        }
    }
}
