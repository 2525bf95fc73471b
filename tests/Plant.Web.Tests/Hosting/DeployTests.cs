using System.Text.Json;
using Microsoft.Extensions.Configuration;
using Plant.Web.Hosting;

namespace Plant.Web.Tests.Hosting;

/// <summary>The files an operator copies: that they parse, and name settings that the program reads.</summary>
public sealed class DeployTests
{
    private static readonly string Deploy = Path.Combine(Root(), "deploy");

    [Fact]
    public void SampleSettings_AreReadByTheProgram()
    {
        var settings = PlantSettings.Read(new ConfigurationBuilder().AddJsonFile(Path.Combine(Deploy, "appsettings.Production.sample.json")).Build());
        Assert.Equal(PlantSettings.PostgreSql, settings.Provider);
        Assert.Equal(0.02, settings.Planning.Risk);
        Assert.Equal("/var/lib/sump-ledger", settings.DataFolder);
        using var json = JsonDocument.Parse(File.ReadAllText(Path.Combine(Deploy, "appsettings.Production.sample.json")));
        Assert.Equal(["Urls", "AllowedHosts", "Database", "ConnectionStrings", "Data", "Planning"], json.RootElement.EnumerateObject().Select(p => p.Name));
    }

    [Fact]
    public void Unit_KeepsTheServiceInItsPlace()
    {
        var lines = File.ReadAllLines(Path.Combine(Deploy, "sump-ledger.service")).Where(l => l.Length > 0).ToList();
        Assert.All(lines, l => Assert.Matches(@"^(\[[A-Z][a-z]+\]|[A-Z][A-Za-z]+=.+)$", l));
        Assert.Contains("Environment=Data__Folder=/var/lib/sump-ledger", lines);
        Assert.Contains("StateDirectory=sump-ledger", lines);
        Assert.Contains("NoNewPrivileges=yes", lines);
    }

    [Fact]
    public void ContainerFile_RunsAsAnOrdinaryUser()
    {
        var lines = File.ReadAllLines(Path.Combine(Deploy, "Containerfile")).Where(l => l.Length > 0 && l[0] != '#').ToList();
        Assert.All(lines, l => Assert.Contains(l.Split(' ')[0], (string[])["FROM", "WORKDIR", "COPY", "RUN", "USER", "ENV", "VOLUME", "EXPOSE", "ENTRYPOINT"]));
        Assert.Equal("$APP_UID", lines.Last(l => l.StartsWith("USER ", StringComparison.Ordinal)).Split(' ')[1]);
    }

    [Fact]
    public void ComposeFile_NamesSettingsThatTheProgramReads()
    {
        var settings = File.ReadAllLines(Path.Combine(Deploy, "compose.yaml")).Select(l => l.Trim()).Where(l => l.Contains("__", StringComparison.Ordinal))
            .Select(l => l.Split(": ", 2)).ToDictionary(p => p[0].Replace("__", ":", StringComparison.Ordinal), p => (string?)p[1]);
        Assert.Equal(PlantSettings.PostgreSql, PlantSettings.Read(new ConfigurationBuilder().AddInMemoryCollection(settings).Build()).Provider);
        Assert.DoesNotContain('\t', File.ReadAllText(Path.Combine(Deploy, "compose.yaml")));
    }

    [Theory]
    [InlineData("Database:Provider", "Oracle")]
    [InlineData("Planning:Risk", "2 %")]
    [InlineData("Planning:CapacityShare", "1.5")]
    public void WrongSetting_StopsWithTheKeysName(string key, string value)
    {
        var wrong = Assert.Throws<SettingException>(() => PlantSettings.Read(new ConfigurationBuilder().AddInMemoryCollection([new(key, value)]).Build()));
        Assert.Contains(key, wrong.Message, StringComparison.Ordinal);
        Assert.Contains(value, wrong.Message, StringComparison.Ordinal);
    }

    private static string Root()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (!File.Exists(Path.Combine(folder.FullName, "Plant.sln")))
        {
            folder = folder.Parent ?? throw new DirectoryNotFoundException("Plant.sln");
        }

        return folder.FullName;
    }
}
