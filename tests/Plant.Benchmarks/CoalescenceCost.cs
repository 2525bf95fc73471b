using System.ComponentModel;
using System.Diagnostics;
using System.Globalization;
using Plant.Physics.Coalescence;
using Plant.Physics.Droplets;

namespace Plant.Benchmarks;

/// <summary>The population balance of a tank that stands for 24 h: time and error against the converged answer, beside programs that solve the same with two-moment cells.</summary>
public static class CoalescenceCost
{
    private const double StokesPerMS = 134 * 9.81 / (18 * 0.0257);
    private const string Name = "ours, tables included";
    private const double UsualTolerance = 1e-4;

    private static readonly int[] Sizes = [40, 60, 80, 160];

    private static readonly PopulationBalanceSetup Tank = new()
    {
        KernelM3S = (a, b) =>
        {
            var sum = a + b;
            return 0.1 * ((2 * 1.380649e-23 * 323.15 / (3 * 0.0257) * sum * sum / (a * b)) + (5.0 / 6 * sum * sum * sum) + (Math.PI / 4 * sum * sum * StokesPerMS * Math.Abs((a * a) - (b * b))));
        },
        SettlingMS = d => StokesPerMS * d * d,
        DepthM = 0.5,
    };

    private sealed record Row(string Solver, int Cells, double Milliseconds, double Number, double Ppm);

    /// <summary>Runs ours, and the reference programs of a folder where their libraries are installed.</summary>
    public static int Run(string? folder)
    {
        var converged = Solve(400, 1e-8);
        Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"converged (400 cells, tolerance 1e-8): {converged.NumberPerM3:0.00000e0} drops per m³, {converged.SuspendedVolumeFraction * 1e6:0.0000} ppm suspended"));
        // unmeasured until the compiler has done its last pass
        for (var i = 0; i < 500; i++)
        {
            Solve(Sizes[0], UsualTolerance);
        }

        var ours = Sizes.Select(Ours).ToList();
        var others = folder is null ? [] : References(folder);
        foreach (var row in ours.Concat(others.Where(row => Sizes.Contains(row.Cells))))
        {
            Console.WriteLine(string.Create(CultureInfo.InvariantCulture,
                $"{row.Solver,-28} N = {row.Cells,3}: {row.Milliseconds,8:0.000} ms, error of number {Math.Abs((row.Number / converged.NumberPerM3) - 1),8:0.000 %}, of suspended water {Math.Abs((row.Ppm * 1e-6 / converged.SuspendedVolumeFraction) - 1),8:0.000 %}"));
        }

        foreach (var own in ours)
        {
            var best = others.Where(row => row.Cells == own.Cells).MinBy(row => row.Milliseconds);
            if (best is not null)
            {
                Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"N = {own.Cells}: ours {best.Milliseconds / own.Milliseconds:0.0} times as fast as {best.Solver}, the fastest reference"));
            }
        }

        var all = ours.Concat(others).Where(row => Error(row, converged) <= 0.01).ToList();
        var (own1, other1) = (all.Where(row => row.Solver == Name).MinBy(row => row.Milliseconds), all.Where(row => row.Solver != Name).MinBy(row => row.Milliseconds));
        if (own1 is not null && other1 is not null)
        {
            Console.WriteLine(string.Create(CultureInfo.InvariantCulture,
                $"to within 1 % in both: ours N = {own1.Cells}, {own1.Milliseconds:0.000} ms; {other1.Solver} N = {other1.Cells}, {other1.Milliseconds:0.000} ms; ratio {other1.Milliseconds / own1.Milliseconds:0.0}"));
        }

        return 0;
    }

    private static double Error(Row row, PopulationBalanceState converged) =>
        Math.Max(Math.Abs((row.Number / converged.NumberPerM3) - 1), Math.Abs((row.Ppm * 1e-6 / converged.SuspendedVolumeFraction) - 1));

    private static PopulationBalanceState Solve(int cells, double tolerance) =>
        new PopulationBalance(new VolumeGrid(cells), Tank with { Tolerance = tolerance }).Solve(LognormalDistribution.ByVolume(10e-6, 1.8), 500e-6, [86_400]).States[0];

    private static Row Ours(int cells)
    {
        var times = new List<double>();
        var state = Solve(cells, UsualTolerance);
        for (var i = 0; i < 101; i++)
        {
            var start = Stopwatch.GetTimestamp();
            state = Solve(cells, UsualTolerance);
            times.Add(Stopwatch.GetElapsedTime(start).TotalMilliseconds);
        }

        times.Sort();
        return new(Name, cells, times[times.Count / 2], state.NumberPerM3, state.SuspendedVolumeFraction * 1e6);
    }

    private static List<Row> References(string folder)
    {
        using var work = new WorkFolder();
        var program = Path.Combine(work.Path, "pbe_cvode");
        var rows = new List<Row>();
        var (built, message) = Start("gcc", "-O3", "-march=native", "-o", program, Path.Combine(folder, "pbe_cvode.c"), "-lsundials_cvode", "-lsundials_nvecserial", "-lm");
        if (built)
        {
            rows.AddRange(Parse(Start(program, "1e-6", "1e-12", "7")));
        }
        else
        {
            Console.WriteLine($"missing for the C reference: gcc or SUNDIALS ({message.Split('\n')[0]})");
        }

        foreach (var python in new[] { "/usr/bin/python3", "python3" })
        {
            if (Start(python, "-c", "import scipy").Done)
            {
                rows.AddRange(Parse(Start(python, Path.Combine(folder, "pbe_scipy.py"))));
                return rows;
            }
        }

        Console.WriteLine("missing for the Python reference: SciPy");
        return rows;
    }

    private static IEnumerable<Row> Parse((bool Done, string Output) run)
    {
        if (!run.Done)
        {
            Console.WriteLine($"a reference failed: {run.Output.Split('\n')[0]}");
            yield break;
        }

        foreach (var line in run.Output.Split('\n').Where(line => line.StartsWith("PBE ", StringComparison.Ordinal)))
        {
            var fields = line.Split(' ').Where(part => part.Contains('=', StringComparison.Ordinal)).ToDictionary(part => part.Split('=')[0], part => part.Split('=')[1]);
            double Of(string name) => double.Parse(fields[name], CultureInfo.InvariantCulture);
            yield return new(fields["solver"], (int)Of("N"), Of("ms_median"), Of("M0"), Of("M1ppm"));
        }
    }

    private static (bool Done, string Output) Start(string program, params string[] arguments)
    {
        try
        {
            using var process = Process.Start(new ProcessStartInfo(program, arguments) { RedirectStandardOutput = true, RedirectStandardError = true })!;
            var error = process.StandardError.ReadToEndAsync();
            var output = process.StandardOutput.ReadToEnd();
            process.WaitForExit();
            return process.ExitCode == 0 ? (true, output) : (false, error.GetAwaiter().GetResult());
        }
        catch (Win32Exception missing)
        {
            return (false, missing.Message);
        }
    }

    private sealed class WorkFolder : IDisposable
    {
        public string Path { get; } = Directory.CreateTempSubdirectory("plant-pbe-").FullName;

        public void Dispose() => Directory.Delete(Path, recursive: true);
    }
}
