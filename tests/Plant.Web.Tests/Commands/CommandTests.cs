using System.Diagnostics;

namespace Plant.Web.Tests.Commands;

/// <summary>The program as a command: its own process, its exit codes and streams.</summary>
public sealed class CommandTests : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("plant-cmd-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Theory]
    [InlineData("serve")]
    [InlineData("migrate")]
    [InlineData("import")]
    [InlineData("export")]
    [InlineData("assess")]
    [InlineData("token")]
    [InlineData("user")]
    [InlineData("backup")]
    [InlineData("restore")]
    [InlineData("verify")]
    public async Task Help_PrintsAUsage(string command)
    {
        var (code, output, error) = await RunAsync(command, "--help");
        Assert.Equal((0, ""), (code, error));
        Assert.Contains(command, output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(2, "nonsense")]
    [InlineData(2, "import")]
    [InlineData(2, "import", "a", "b")]
    [InlineData(2, "assess", "--as-of", "yesterday")]
    [InlineData(2, "assess", "--colour", "red")]
    [InlineData(2, "token", "--name", "x")]
    [InlineData(2, "user", "remove")]
    [InlineData(1, "import", "no-such-folder")]
    [InlineData(1, "token", "--name", "x", "--role", "king")]
    [InlineData(1, "verify")]
    [InlineData(1, "backup", "copy.db")]
    [InlineData(1, "migrate", "--Database:Provider=Oracle")]
    [InlineData(1, "migrate", "--Planning:Risk=2")]
    public async Task WrongCall_TellsWhyOnStandardError(int expected, params string[] arguments)
    {
        var (code, _, error) = await RunAsync(arguments);
        Assert.Equal(expected, code);
        Assert.NotEqual("", error.Trim());
        Assert.DoesNotContain("   at ", error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task OnePlant_FromImportToVerify()
    {
        var plant = Path.Combine(AppContext.BaseDirectory, "seed-data");
        var (code, output, error) = await RunAsync("import", plant);
        Assert.True(code == 0, error);
        Assert.Contains("reservoirs.csv: 149 new, 0 unchanged", output, StringComparison.Ordinal);
        (_, output, _) = await RunAsync("import", plant);
        Assert.Contains("reservoirs.csv: 0 new, 149 unchanged", output, StringComparison.Ordinal);

        var file = Path.Combine(folder, "assessment.csv");
        (code, _, error) = await RunAsync("assess", "--as-of", "2026-12-01T00:00:00Z", "--out", file);
        Assert.True(code == 0, error);
        var lines = await File.ReadAllLinesAsync(file);
        Assert.Equal(150, lines.Length);
        Assert.StartsWith("tag,asOf,condition,probabilityFreeNow,probabilityFreeColdest,waterPpm,waterPpmLow90,waterPpmHigh90,saturationNowPpm,saturationColdestPpm,dissolvedPpm,emulsifiedPpm,settledWaterL", lines[0], StringComparison.Ordinal);

        (code, output, _) = await RunAsync("token", "--name", "gateway", "--role", "sensor", "--days", "30");
        Assert.Equal(0, code);
        Assert.StartsWith("slt_", output.TrimEnd().Split('\n')[^1], StringComparison.Ordinal);
        (code, output, _) = await RunAsync("user", "add", "--email", "anna@plant.example", "--role", "planner");
        Assert.Equal(0, code);

        var copy = Path.Combine(folder, "copy.db");
        Assert.Equal(0, (await RunAsync("backup", copy)).Code);
        Assert.Equal(0, (await RunAsync("restore", copy)).Code);
        (code, _, error) = await RunAsync("verify");
        Assert.True(code == 0, error);
    }

    private async Task<(int Code, string Output, string Error)> RunAsync(params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet") { RedirectStandardOutput = true, RedirectStandardError = true, WorkingDirectory = folder };
        foreach (var argument in (string[])[Path.Combine(AppContext.BaseDirectory, "Plant.Web.dll"), .. arguments, $"--Data:Folder={folder}/data"])
        {
            start.ArgumentList.Add(argument);
        }

        start.Environment["ASPNETCORE_ENVIRONMENT"] = "Production";
        start.Environment["PWD"] = folder;
        using var process = Process.Start(start)!;
        var output = process.StandardOutput.ReadToEndAsync();
        var error = await process.StandardError.ReadToEndAsync();
        await process.WaitForExitAsync();
        return (process.ExitCode, await output, error);
    }
}
