using System.Diagnostics;
using System.Globalization;

namespace Plant.Benchmarks;

/// <summary>Commands of the program as whole processes, start included, on files made here.</summary>
public static class WholeProcess
{
    private static readonly string Program = Path.Combine(AppContext.BaseDirectory, "Plant.Web.dll");

    /// <summary>How to call it.</summary>
    public static int Usage()
    {
        Console.Error.WriteLine("usage: all | readings [--reference PATH] | samples | assess | pages | working | coalescence [--reference FOLDER]");
        return 2;
    }

    /// <summary>1,000,000 readings of 200 sensors into an empty register, beside a reference program in the same run.</summary>
    public static async Task<int> ReadingsAsync(string? reference)
    {
        const int sensors = 200, each = 5000;
        using var plant = new Folder();
        Plant(plant.Path, sensors);
        await using (var writer = new StreamWriter(System.IO.Path.Combine(plant.Path, "readings.csv")))
        {
            await writer.WriteLineAsync("tag,readAt,oilTemperatureC,waterActivity");
            var start = new DateTime(2026, 1, 1, 0, 0, 0, DateTimeKind.Utc);
            for (var i = 0; i < each; i++)
            {
                for (var sensor = 0; sensor < sensors; sensor++)
                {
                    await writer.WriteLineAsync(string.Create(CultureInfo.InvariantCulture, $"R{sensor:0000},{start.AddMinutes(10 * i):yyyy-MM-ddTHH:mm:ssZ},{50 + (i % 97 * 0.1):0.0},{0.3 + (sensor % 50 * 0.01):0.00}"));
                }
            }
        }

        var (seconds, peak) = await RunAsync("import", plant.Path, $"--Data:Folder={plant.Path}/data");
        var rate = sensors * each / seconds;
        Row("import 1,000,000 readings", seconds, peak, string.Create(CultureInfo.InvariantCulture, $"{rate:#,0} rows/s"));
        if (reference is not null)
        {
            using var python = Process.Start(new ProcessStartInfo("python3", [reference, System.IO.Path.Combine(plant.Path, "reference.db")]) { RedirectStandardOutput = true })!;
            foreach (var line in (await python.StandardOutput.ReadToEndAsync()).Split('\n').Where(l => l.Contains("py_bulk1M", StringComparison.Ordinal)))
            {
                var other = double.Parse(line.Split("rows_per_s=")[1].Split(' ')[0], CultureInfo.InvariantCulture);
                Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"reference, insert alone without reading or checking a file: {other:#,0} rows/s; ratio {rate / other:0.00}"));
            }
        }

        return 0;
    }

    /// <summary>2,000 reservoirs with 200,000 samples into an empty register.</summary>
    public static async Task<int> SamplesAsync()
    {
        using var plant = new Folder();
        Plant(plant.Path, 2000);
        Samples(plant.Path, 2000, 100);
        var (seconds, peak) = await RunAsync("import", plant.Path, $"--Data:Folder={plant.Path}/data");
        Row("import 2,000 reservoirs, 200,000 samples", seconds, peak, "");
        return 0;
    }

    /// <summary>The whole fleet judged, start included.</summary>
    public static async Task<int> AssessAsync()
    {
        using var plant = new Folder();
        Plant(plant.Path, 2000);
        Samples(plant.Path, 2000, 100);
        await RunAsync("import", plant.Path, $"--Data:Folder={plant.Path}/data");
        var times = new List<(double Seconds, double Peak)>();
        for (var i = 0; i < 3; i++)
        {
            times.Add(await RunAsync("assess", "--out", System.IO.Path.Combine(plant.Path, "out.csv"), "--as-of", "2026-12-01T00:00:00Z", $"--Data:Folder={plant.Path}/data"));
        }

        times.Sort();
        Row("assess 2,000 reservoirs × 100 samples, median of 3", times[1].Seconds, times[1].Peak, "");
        return 0;
    }

    /// <summary>Fluids and reservoirs of a plant.</summary>
    public static void Plant(string folder, int reservoirs)
    {
        File.WriteAllText(System.IO.Path.Combine(folder, "fluids.csv"), "code,name,family,viscosity40Mm2S,viscosity100Mm2S,density15KgM3,solubilityA,solubilityB,waterLimitPpm\nM,Oil,mineral,46,6.8,870,7.09,1567,300\n");
        using var writer = new StreamWriter(System.IO.Path.Combine(folder, "reservoirs.csv"));
        writer.WriteLine("tag,name,area,fluid,shape,lengthMm,widthMm,heightMm,oilVolumeL,suctionHeightMm,operatingTemperatureC,coldestTemperatureC");
        for (var i = 0; i < reservoirs; i++)
        {
            writer.WriteLine(string.Create(CultureInfo.InvariantCulture, $"R{i:0000},Tank {i},Area {i % 7},M,rectangular,2000,1200,1000,1800,60,55,15"));
        }
    }

    /// <summary>Their samples.</summary>
    public static void Samples(string folder, int reservoirs, int each)
    {
        var random = new Random(1);
        using var writer = new StreamWriter(System.IO.Path.Combine(folder, "samples.csv"));
        writer.WriteLine("sample,tag,takenAt,receivedAt,point,oilTemperatureC,method,waterPpm,waterActivity,replicate,analyst,remark");
        for (var r = 0; r < reservoirs; r++)
        {
            for (var s = 0; s < each; s++)
            {
                var taken = new DateTime(2026, 11, 30, 0, 0, 0, DateTimeKind.Utc).AddDays(-7.3 * (each - s)).AddSeconds(r);
                taken = taken.AddTicks(-(taken.Ticks % TimeSpan.TicksPerSecond));
                writer.WriteLine(string.Create(CultureInfo.InvariantCulture, $"R{r:0000}/{s:000},R{r:0000},{taken:yyyy-MM-ddTHH:mm:ssZ},{taken.AddDays(2):yyyy-MM-ddTHH:mm:ssZ},return,54.5,kf-coulometric,{60 + (r % 150) + (20 * random.NextDouble()):0.0},,1,lab 1,"));
            }
        }
    }

    private static async Task<(double Seconds, double PeakMiB)> RunAsync(params string[] arguments)
    {
        var clock = Stopwatch.StartNew();
        var start = new ProcessStartInfo("dotnet", [Program, .. arguments]) { RedirectStandardOutput = true, RedirectStandardError = true };
        start.Environment["ASPNETCORE_ENVIRONMENT"] = "Production";
        using var process = Process.Start(start)!;
        var output = process.StandardOutput.ReadToEndAsync();
        var error = process.StandardError.ReadToEndAsync();
        var peak = 0L;
        while (!process.HasExited)
        {
            await Task.WhenAny(process.WaitForExitAsync(), Task.Delay(50));
            if (!process.HasExited)
            {
                process.Refresh();
                peak = Math.Max(peak, process.PeakWorkingSet64);
            }
        }

        await output;
        return process.ExitCode == 0 ? (clock.Elapsed.TotalSeconds, peak / 1048576.0) : throw new InvalidOperationException(await error);
    }

    private static void Row(string what, double seconds, double peak, string more) =>
        Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{what}: {seconds:0.0} s, peak {peak:0} MiB {more}"));

    private sealed class Folder : IDisposable
    {
        public string Path { get; } = Directory.CreateTempSubdirectory("plant-bench-").FullName;

        public void Dispose() => Directory.Delete(Path, recursive: true);
    }
}
