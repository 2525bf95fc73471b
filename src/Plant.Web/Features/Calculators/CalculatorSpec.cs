using System.Globalization;
using System.Text.Json;
using System.Text.Json.Nodes;
using Plant.Physics;
using Plant.Physics.Calculators;
using Plant.Web.Api;
using Plant.Web.Shared.Drawing;

namespace Plant.Web.Features.Calculators;

/// <summary>What a calculator answered.</summary>
/// <param name="Response">The response without its working; null where something was refused.</param>
/// <param name="Steps">The working.</param>
/// <param name="Refused">What was refused, by field.</param>
public sealed record CalculatorAnswer(JsonObject? Response, IReadOnlyList<WorkingStep> Steps, IReadOnlyDictionary<string, string> Refused);

/// <summary>A calculator as its page shows it: the same that the interface answers with.</summary>
public sealed class CalculatorSpec
{
    private const int SweepPoints = 41;

    private readonly Func<JsonObject, CalculatorAnswer> compute;

    private CalculatorSpec(Func<JsonObject, CalculatorAnswer> compute) => this.compute = compute;

    public required string Code { get; init; }

    public required string Title { get; init; }

    /// <summary>What it is for, in a sentence.</summary>
    public required string What { get; init; }

    public required IReadOnlyList<CalculatorField> Fields { get; init; }

    public required IReadOnlyList<CalculatorOutput> Outputs { get; init; }

    public CalculatorPicture? Picture { get; init; }

    /// <summary>A calculator of the physics service.</summary>
    public static CalculatorSpec Of<TRequest, TResponse>(
        Func<TRequest, CalculatorResult<TResponse>> calculator, string code, string title, string what,
        IReadOnlyList<CalculatorField> fields, IReadOnlyList<CalculatorOutput> outputs, CalculatorPicture? picture = null)
        where TRequest : class
        where TResponse : class => new(input =>
        {
            var result = calculator(input.Deserialize<TRequest>(ApiSetup.Json)!);
            if (result.Response is not { } response)
            {
                return new CalculatorAnswer(null, [], result.Refusals.GroupBy(r => r.Field.Replace("[", ".", StringComparison.Ordinal).Replace("]", "", StringComparison.Ordinal))
                    .ToDictionary(g => g.Key, g => string.Join("; ", g.Select(r => r.Reason))));
            }

            var node = JsonSerializer.SerializeToNode(response, ApiSetup.Json)!.AsObject();
            var steps = node["working"].Deserialize<List<WorkingStep>>(ApiSetup.Json) ?? [];
            node.Remove("working");
            return new CalculatorAnswer(node, steps, new Dictionary<string, string>());
        })
        {
            Code = code, Title = title, What = what, Fields = fields, Outputs = outputs, Picture = picture,
        };

    /// <summary>Computes from what was typed; what is no number is refused at its field.</summary>
    public CalculatorAnswer Compute(IReadOnlyDictionary<string, string> typed)
    {
        var refused = new Dictionary<string, string>();
        var input = Build(typed, refused);
        return refused.Count > 0 ? new CalculatorAnswer(null, [], refused) : compute(input);
    }

    /// <summary>The picture's series; none where there is nothing to draw.</summary>
    public IReadOnlyList<ChartSeries> Draw(IReadOnlyDictionary<string, string> typed, JsonObject response)
    {
        if (Picture is not { } picture)
        {
            return [];
        }

        var points = picture.From is { } from ? Sweep(typed, picture, from) : Columns(response, picture);
        return points.Count < 2 ? [] : [new ChartSeries(picture.YTitle, SeriesStyle.Line, [.. points.Select(p => (object)p.X)], [.. points.Select(p => (double?)p.Y)])];
    }

    private static List<(double X, double Y)> Columns(JsonObject response, CalculatorPicture picture)
    {
        if (response["results"] is JsonArray rows)
        {
            return [.. rows.Where(r => r![picture.Y] is not null).Select(r => ((double)r![picture.X]!, (double)r[picture.Y]!))];
        }

        return response[picture.X] is JsonArray x && response[picture.Y] is JsonArray y ? [.. x.Zip(y, (a, b) => ((double)a!, (double)b!))] : [];
    }

    private List<(double X, double Y)> Sweep(IReadOnlyDictionary<string, string> typed, CalculatorPicture picture, double from)
    {
        var points = new List<(double, double)>();
        for (var i = 0; i < SweepPoints; i++)
        {
            var x = from + ((picture.To - from) * i / (SweepPoints - 1));
            var changed = new Dictionary<string, string>(typed) { [picture.X] = x.ToString("R", CultureInfo.InvariantCulture) };
            if (Compute(changed).Response?[picture.Y] is JsonValue y)
            {
                points.Add((x, (double)y));
            }
        }

        return points;
    }

    private JsonObject Build(IReadOnlyDictionary<string, string> typed, Dictionary<string, string> refused)
    {
        var root = new JsonObject();
        foreach (var field in Fields)
        {
            var text = typed.GetValueOrDefault(field.Path, "").Trim();
            if (text.Length == 0)
            {
                continue;
            }

            if (field.Options is not null)
            {
                Put(root, field.Path, text is "true" or "false" ? JsonValue.Create(text == "true") : JsonValue.Create(text));
                continue;
            }

            var numbers = (field.List ? text.Split([' ', ';'], StringSplitOptions.RemoveEmptyEntries) : [text]).Select(t => (Text: t, Known: TryNumber(t, out var v), Value: v)).ToList();
            if (numbers.FirstOrDefault(n => !n.Known) is { Text: { } wrong })
            {
                refused[field.Path] = $"\"{wrong}\" is no number: type digits with a point or a comma{(field.List ? ", numbers with spaces between" : "")}";
                continue;
            }

            Put(root, field.Path, field.List ? new JsonArray([.. numbers.Select(n => (JsonNode)JsonValue.Create(n.Value))]) : JsonValue.Create(numbers[0].Value));
        }

        return root;
    }

    private static bool TryNumber(string text, out double value) =>
        double.TryParse(text.Replace(',', '.'), NumberStyles.Float, CultureInfo.InvariantCulture, out value) && double.IsFinite(value);

    private static void Put(JsonObject root, string path, JsonNode value)
    {
        var parts = path.Split('.');
        JsonNode at = root;
        for (var i = 0; i < parts.Length - 1; i++)
        {
            var next = Child(at, parts[i]);
            if (next is null)
            {
                next = char.IsDigit(parts[i + 1][0]) ? new JsonArray() : new JsonObject();
                Set(at, parts[i], next);
            }

            at = next;
        }

        Set(at, parts[^1], value);
    }

    private static JsonNode? Child(JsonNode at, string part) =>
        at is JsonArray list ? (int.Parse(part, CultureInfo.InvariantCulture) < list.Count ? list[int.Parse(part, CultureInfo.InvariantCulture)] : null) : at[part];

    private static void Set(JsonNode at, string part, JsonNode value)
    {
        if (at is JsonArray list)
        {
            list.Add(value);
        }
        else
        {
            at[part] = value;
        }
    }
}
