using System.Diagnostics;
using System.Net;
using System.Net.Sockets;
using System.Text;

namespace Plant.Tests.Support;

/// <summary>The real program as its own process on a free loopback port with its own data folder.</summary>
public sealed class ServerProcess : IAsyncDisposable
{
    private static readonly TimeSpan StartLimit = TimeSpan.FromSeconds(90);

    private readonly string environment;
    private readonly StringBuilder log = new();
    private Process? process;

    private ServerProcess(string dataFolder, string environment, int port)
    {
        DataFolder = dataFolder;
        this.environment = environment;
        BaseAddress = new Uri($"http://localhost:{port}");
    }

    public string DataFolder { get; }

    public Uri BaseAddress { get; }

    public string Log
    {
        get
        {
            lock (log)
            {
                return log.ToString();
            }
        }
    }

    /// <summary>The program that was built beside these tests.</summary>
    private static string Program => Path.Combine(AppContext.BaseDirectory, "Plant.Web.dll");

    public static async Task<ServerProcess> StartAsync(string environment)
    {
        var folder = Directory.CreateTempSubdirectory("plant-").FullName;
        var server = new ServerProcess(folder, environment, FreePort());
        await server.StartAsync();
        return server;
    }

    /// <summary>Runs a command of the program on this server's data and returns exit code and standard output.</summary>
    public async Task<(int Code, string Output, string Error)> CommandAsync(params string[] arguments)
    {
        using var command = Start([.. arguments, $"--Data:Folder={DataFolder}"]);
        var output = command.StandardOutput.ReadToEndAsync();
        var error = command.StandardError.ReadToEndAsync();
        await command.WaitForExitAsync();
        return (command.ExitCode, await output, await error);
    }

    public async Task StartAsync()
    {
        process = Start(["serve", "--urls", BaseAddress.ToString(), $"--Data:Folder={DataFolder}"]);
        process.OutputDataReceived += Keep;
        process.ErrorDataReceived += Keep;
        process.BeginOutputReadLine();
        process.BeginErrorReadLine();
        using var http = new HttpClient { BaseAddress = BaseAddress, Timeout = TimeSpan.FromSeconds(5) };
        var clock = Stopwatch.StartNew();
        while (clock.Elapsed < StartLimit)
        {
            if (process.HasExited)
            {
                throw new InvalidOperationException($"The server ended with code {process.ExitCode}:\n{Log}");
            }

            try
            {
                using var answer = await http.GetAsync(new Uri("/health/ready", UriKind.Relative));
                if (answer.StatusCode == HttpStatusCode.OK)
                {
                    return;
                }
            }
            catch (Exception refused) when (refused is HttpRequestException or TaskCanceledException)
            {
                // not listening yet: asked again below until the limit
            }

            await Task.Delay(50);
        }

        throw new TimeoutException($"The server was not ready in {StartLimit.TotalSeconds} s:\n{Log}");
    }

    /// <summary>SIGKILL: the process gets no chance to tidy up.</summary>
    public async Task KillAsync()
    {
        process!.Kill(entireProcessTree: true);
        await process.WaitForExitAsync();
        process.Dispose();
        process = null;
    }

    public async ValueTask DisposeAsync()
    {
        if (process is not null)
        {
            await KillAsync();
        }

        Directory.Delete(DataFolder, recursive: true);
    }

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }

    private Process Start(string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet")
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            WorkingDirectory = AppContext.BaseDirectory,
        };
        start.ArgumentList.Add(Program);
        foreach (var argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        start.Environment["ASPNETCORE_ENVIRONMENT"] = environment;
        start.Environment["DOTNET_ENVIRONMENT"] = environment;
        return Process.Start(start) ?? throw new InvalidOperationException("dotnet did not start");
    }

    private void Keep(object sender, DataReceivedEventArgs line)
    {
        lock (log)
        {
            log.AppendLine(line.Data);
        }
    }
}
