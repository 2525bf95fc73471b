using System.Globalization;
using System.Text;

namespace Skarrow;

/// <summary>RFC 4180 with a header row, point decimals and times in UTC.</summary>
public static class Csv
{
    public static void Write(string folder, string file, string header, IEnumerable<object?[]> rows)
    {
        var text = new StringBuilder(header.Replace(" ", string.Empty, StringComparison.Ordinal)).Append("\r\n");
        foreach (var row in rows)
        {
            text.AppendJoin(',', row.Select(Field)).Append("\r\n");
        }

        File.WriteAllText(Path.Combine(folder, file), text.ToString(), new UTF8Encoding(false));
    }

    private static string Field(object? value) => value switch
    {
        null => string.Empty,
        string text => text.AsSpan().ContainsAny("\",\r\n") ? $"\"{text.Replace("\"", "\"\"", StringComparison.Ordinal)}\"" : text,
        DateTime time => time.ToString("yyyy-MM-ddTHH:mm:ssZ", CultureInfo.InvariantCulture),
        bool yes => yes ? "true" : "false",
        IFormattable number => number.ToString(null, CultureInfo.InvariantCulture),
        _ => throw new NotSupportedException($"{value.GetType()} has no place in a CSV file"),
    };
}
