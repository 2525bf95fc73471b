using System.Reflection;
using System.Text.RegularExpressions;
using System.Xml.Linq;
using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.Components;

namespace Plant.Web.Tests.Architecture;

/// <summary>The house as DEVELOPERS.md draws it.</summary>
public sealed partial class HouseTests
{
    private const int LongestFile = 500;
    private const int LongestMethod = 60;
    private const int MostParameters = 6;

    private static readonly string Root = FindRoot();

    [Theory]
    [InlineData("Plant.Physics", "")]
    [InlineData("Plant.Advice", "Plant.Physics")]
    [InlineData("Plant.Register", "Plant.Advice")]
    [InlineData("Plant.Register.Sqlite", "Plant.Register")]
    [InlineData("Plant.Register.PostgreSql", "Plant.Register")]
    [InlineData("Plant.Web", "Plant.Register.PostgreSql,Plant.Register.Sqlite")]
    public void Project_RefersOnlyToWhatItMay(string project, string allowed)
    {
        var references = XDocument.Load(Path.Combine(Root, "src", project, project + ".csproj")).Descendants("ProjectReference")
            .Select(r => Path.GetFileNameWithoutExtension(r.Attribute("Include")!.Value.Replace('\\', '/'))).Order(StringComparer.Ordinal);
        Assert.Equal(allowed, string.Join(',', references));
    }

    [Theory]
    [InlineData("Plant.Physics")]
    [InlineData("Plant.Advice")]
    public void PureProject_HasNoClockFilesOrNetwork(string project)
    {
        var found = Sources($"src/{project}").SelectMany(file => Impure().Matches(File.ReadAllText(file)).Select(m => $"{Path.GetFileName(file)}: {m.Value}"));
        Assert.Equal([], found);
    }

    [Fact]
    public void File_IsNotTooLong()
    {
        var found = Sources("src").Concat(Sources("tests")).Select(file => (file, lines: File.ReadLines(file).Count())).Where(f => f.lines > LongestFile)
            .Select(f => $"{Path.GetRelativePath(Root, f.file)}: {f.lines}");
        Assert.Equal([], found);
    }

    [Fact]
    public void Method_IsNotTooLong()
    {
        var found = new List<string>();
        foreach (var file in Sources("src"))
        {
            var lines = File.ReadAllLines(file);
            for (var i = 0; i < lines.Length; i++)
            {
                if (!MethodHead().IsMatch(lines[i]) || i + 1 >= lines.Length || lines[i + 1] != "    {")
                {
                    continue;
                }

                var end = Array.FindIndex(lines, i + 1, line => line == "    }");
                if (end - i - 2 > LongestMethod)
                {
                    found.Add($"{Path.GetRelativePath(Root, file)}:{i + 1}: {end - i - 2} lines");
                }
            }
        }

        Assert.Equal([], found);
    }

    [Fact]
    public void Constructor_TakesFewParameters()
    {
        var found = from type in OurTypes()
                    where !type.Name.Contains('<', StringComparison.Ordinal) && type.GetMethod("<Clone>$") is null
                    from constructor in type.GetConstructors(BindingFlags.Public | BindingFlags.Instance)
                    where constructor.GetParameters().Length > MostParameters
                    select $"{type.FullName}: {constructor.GetParameters().Length}";
        Assert.Equal([], found);
    }

    [Fact]
    public void Page_SaysWhoMaySeeIt()
    {
        var found = typeof(Program).Assembly.GetTypes().Where(t => t.GetCustomAttributes<RouteAttribute>().Any())
            .Where(t => t.GetCustomAttribute<AuthorizeAttribute>() is null && t.GetCustomAttribute<AllowAnonymousAttribute>() is null).Select(t => t.Name);
        Assert.Equal([], found);
    }

    [Fact]
    public void Feature_UsesAnotherOnlyThroughItsServices()
    {
        string[] open = ["Account"];
        var found = from file in Sources("src/Plant.Web/Features").Concat(Directory.GetFiles(Path.Combine(Root, "src/Plant.Web/Features"), "*.razor", SearchOption.AllDirectories))
                    let own = Path.GetRelativePath(Path.Combine(Root, "src/Plant.Web/Features"), file).Split(Path.DirectorySeparatorChar)[0]
                    from Match use in FeatureUse().Matches(File.ReadAllText(file))
                    where use.Groups[1].Value != own && !open.Contains(use.Groups[1].Value)
                    select $"{Path.GetFileName(file)} uses {use.Groups[1].Value}";
        Assert.Equal([], found);
    }

    [Fact]
    public void Package_HasAFixedVersionAndAReason()
    {
        var reasons = File.ReadAllText(Path.Combine(Root, "DEVELOPERS.md"));
        var packages = XDocument.Load(Path.Combine(Root, "Directory.Packages.props")).Descendants("PackageVersion").ToList();
        Assert.All(packages, p => Assert.Matches(@"^\d[\w.-]*$", p.Attribute("Version")!.Value));
        var missing = packages.Select(p => p.Attribute("Include")!.Value).Where(name => !reasons.Contains(name, StringComparison.Ordinal) && !reasons.Contains("." + string.Join('.', name.Split('.')[^1..]), StringComparison.Ordinal));
        Assert.Equal([], missing);
    }

    [Fact]
    public void TopLevel_HoldsOnlyWhatTheDesignNames()
    {
        string[] named = ["README.md", "DEVELOPERS.md", "LICENSE", "Plant.sln", "src", "tests", "deploy", "seed-data", "Directory.Build.props", "Directory.Packages.props"];
        var found = Directory.GetFileSystemEntries(Root).Select(Path.GetFileName).Where(n => n![0] != '.' && n != "TestResults" && !named.Contains(n));
        Assert.Equal([], found);
        Assert.All(named, name => Assert.True(Path.Exists(Path.Combine(Root, name)), name));
    }

    [Fact]
    public void Context_IsNeverInjectedAsSuch()
    {
        // parts of one unit of work may be handed its context; what others can ask for may not
        var found = from type in OurTypes()
                    where type.IsPublic
                    from constructor in type.GetConstructors(BindingFlags.Public | BindingFlags.Instance)
                    from parameter in constructor.GetParameters()
                    where parameter.ParameterType == typeof(Plant.Register.Storage.PlantDbContext)
                    select type.FullName;
        Assert.Equal([], found);
    }

    private static IEnumerable<Type> OurTypes() =>
        new[] { typeof(Program), typeof(Plant.Register.RegisterServices), typeof(Plant.Advice.Assessor), typeof(Plant.Physics.Working), typeof(Plant.Register.Sqlite.SqliteEngine), typeof(Plant.Register.PostgreSql.PostgreSqlEngine) }
            .SelectMany(t => t.Assembly.GetTypes()).Where(t => t.IsClass && t.Namespace?.StartsWith("Plant", StringComparison.Ordinal) == true && !t.Namespace.EndsWith("Migrations", StringComparison.Ordinal));

    private static IEnumerable<string> Sources(string folder) => Directory.GetFiles(Path.Combine(Root, folder), "*.cs", SearchOption.AllDirectories)
        .Where(f => !f.Contains("/obj/", StringComparison.Ordinal) && !f.Contains("/bin/", StringComparison.Ordinal) && !f.Contains("Migrations", StringComparison.Ordinal));

    private static string FindRoot()
    {
        var folder = AppContext.BaseDirectory;
        while (!File.Exists(Path.Combine(folder, "Plant.sln")))
        {
            folder = Path.GetDirectoryName(folder) ?? throw new InvalidOperationException("no Plant.sln above the tests");
        }

        return folder;
    }

    [GeneratedRegex(@"\b(TimeProvider|Stopwatch|DateTime\.Now|DateTime\.UtcNow|System\.IO|File\.|HttpClient|DbContext|Environment\.|Random\b)")]
    private static partial Regex Impure();

    [GeneratedRegex(@"^    (public|private|protected|internal)[^=;]*\)\s*$")]
    private static partial Regex MethodHead();

    [GeneratedRegex(@"Features\.(\w+)")]
    private static partial Regex FeatureUse();
}
