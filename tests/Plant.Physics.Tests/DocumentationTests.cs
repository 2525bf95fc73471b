using System.Reflection;
using System.Runtime.CompilerServices;
using System.Text.RegularExpressions;
using System.Xml.Linq;
using Plant.Physics.Water;

namespace Plant.Physics.Tests;

/// <summary>Every formula says what it computes, from where, for what, and in which units; the unit in the text is the unit in the name.</summary>
public sealed partial class DocumentationTests
{
    private static readonly string[] FormulaFolders = ["Water", "Fluids", "Droplets", "Tanks", "Laboratory", "Separators", "Ingress", "Coalescence"];

    // longest first: the suffix of a name and the unit that its text must give
    private static readonly (string Suffix, string Unit)[] Units =
    [
        ("PpmS", "mg/kg/s"), ("MS2", "m/s²"), ("WKg", "W/kg"), ("PerM2", "1/m²"), ("PerS", "1/s"), ("WM2K", "W/m²/K"), ("JKgK", "J/kg/K"), ("JKg", "J/kg"), ("KgS", "kg/s"), ("RadS", "rad/s"), ("Rad", "rad"), ("SM", "S/m"), ("VM", "V/m"), ("FM", "F/m"), ("Hz", "Hz"),
        ("UgPerMin", "µg/min"), ("Mm2S", "mm²/s"), ("KgM3", "kg/m³"), ("M2S", "m²/s"), ("M3S", "m³/s"), ("PerK", "1/K"), ("PaS", "Pa·s"), ("Ppm", "mg/kg"),
        ("MS", "m/s"), ("NM", "N/m"), ("M2", "m²"), ("M3", "m³"), ("Pa", "Pa"), ("Mm", "mm"), ("Ug", "µg"), ("inutes", "min"), ("K", "K"), ("M", "m"), ("S", "s"), ("C", "C"), ("G", "g"),
        ("Kg", "kg"), ("W", "W"), ("J", "J"), ("N", "N"),
    ];

    private static readonly Dictionary<string, XElement> Texts = XDocument.Load(Path.ChangeExtension(typeof(WaterProperties).Assembly.Location, ".xml"))
        .Descendants("member").ToDictionary(member => member.Attribute("name")!.Value);

    public static TheoryData<string> Formulas() => [.. Methods().Select(Id).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Formulas))]
    public void Formula_Documentation_IsCompleteAndItsUnitsFitTheNames(string id)
    {
        var method = Methods().Single(m => Id(m) == id);
        Assert.True(Texts.TryGetValue(id, out var text), $"{id} has no documentation");
        var faults = new List<string>();
        foreach (var parameter in method.GetParameters().Where(p => IsNumber(p.ParameterType)))
        {
            var words = text.Elements("param").FirstOrDefault(e => e.Attribute("name")!.Value == parameter.Name)?.Value ?? "";
            Compare(parameter.Name!, words, faults);
        }

        if (IsNumber(method.ReturnType))
        {
            Compare(method.Name, text.Element("returns")?.Value ?? "", faults);
            var remarks = (text.Element("remarks")?.Value ?? "") + (Texts["T:" + method.DeclaringType!.FullName].Element("remarks")?.Value ?? "");
            faults.AddRange(new[] { "Equation:", "Source:", "Valid for:" }.Where(label => !remarks.Contains(label, StringComparison.Ordinal)).Select(label => $"remarks lack \"{label}\""));
        }

        Assert.True(faults.Count == 0, $"{id}: {string.Join("; ", faults)}");
    }

    [Fact]
    public void Formulas_Found_AreThoseOfAllFolders()
    {
        var ids = Methods().Select(Id).ToList();
        Assert.All(FormulaFolders, folder => Assert.Contains(ids, id => id.StartsWith($"M:Plant.Physics.{folder}.", StringComparison.Ordinal)));
    }

    [Theory]
    [InlineData("temperatureK", "Temperature [K].", true)]
    [InlineData("temperatureK", "Temperature [°C].", false)]
    [InlineData("temperatureK", "Temperature.", false)]
    [InlineData("volumeFraction", "Fraction [0 to 1].", true)]
    [InlineData("volumeFraction", "Fraction [m].", false)]
    public void Compare_NameAndText_FindsWhatDoesNotFit(string name, string words, bool fits)
    {
        var faults = new List<string>();
        Compare(name, words, faults);
        Assert.Equal(fits, faults.Count == 0);
    }

    private static void Compare(string name, string words, List<string> faults)
    {
        var match = Bracket().Match(words);
        var expected = Units.FirstOrDefault(unit => name.EndsWith(unit.Suffix, StringComparison.Ordinal)).Unit;
        if (!match.Success)
        {
            faults.Add($"{name} gives no [unit]");
        }
        else if (expected is null ? match.Groups[1].Value is not "1" && !match.Groups[1].Value.StartsWith("0 to 1", StringComparison.Ordinal) : match.Groups[1].Value != expected)
        {
            faults.Add($"{name} says [{match.Groups[1].Value}] where its name says [{expected ?? "1"}]");
        }
    }

    private static IEnumerable<MethodInfo> Methods() =>
        from type in typeof(WaterProperties).Assembly.GetExportedTypes()
        where FormulaFolders.Any(folder => type.Namespace == "Plant.Physics." + folder)
        from method in type.GetMethods(BindingFlags.Public | BindingFlags.Static | BindingFlags.Instance | BindingFlags.DeclaredOnly)
        where !method.IsSpecialName && method.GetCustomAttribute<CompilerGeneratedAttribute>() is null && method.GetParameters().Any(p => IsNumber(p.ParameterType))
        select method;

    private static bool IsNumber(Type type) => type == typeof(double) || type == typeof(double?);

    private static string Id(MethodInfo method) =>
        $"M:{method.DeclaringType!.FullName!.Replace('+', '.')}.{method.Name}({string.Join(',', method.GetParameters().Select(p => TypeId(p.ParameterType)))})";

    private static string TypeId(Type type) => !type.IsGenericType
        ? type.FullName!.Replace('+', '.')
        : $"{type.GetGenericTypeDefinition().FullName!.Split('`')[0]}{{{string.Join(',', type.GetGenericArguments().Select(TypeId))}}}";

    [GeneratedRegex(@"\[([^\])]+)[\])]")]
    private static partial Regex Bracket();
}
