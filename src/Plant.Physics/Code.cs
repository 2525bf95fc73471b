using System.Text.Json;

namespace Plant.Physics;

/// <summary>The written form of an enumeration in files and messages: lower case with hyphens ("phosphate-ester").</summary>
public static class Code
{
    /// <summary>The code of a value.</summary>
    /// <typeparam name="T">The enumeration.</typeparam>
    /// <param name="value">The value.</param>
    /// <returns>Its code, such as <c>horizontal-cylinder</c>.</returns>
    public static string Of<T>(T value)
        where T : struct, Enum => Table<T>.Codes[value];

    /// <summary>Reads a code.</summary>
    /// <typeparam name="T">The enumeration.</typeparam>
    /// <param name="text">The code, in lower case.</param>
    /// <param name="value">The value where the code is known.</param>
    /// <returns>False where no value has that code.</returns>
    public static bool TryParse<T>(string text, out T value)
        where T : struct, Enum => Table<T>.Values.TryGetValue(text, out value);

    /// <summary>All codes of an enumeration, in the order of its values.</summary>
    /// <typeparam name="T">The enumeration.</typeparam>
    /// <returns>The codes.</returns>
    public static IReadOnlyCollection<string> All<T>()
        where T : struct, Enum => Table<T>.Values.Keys;

    private static class Table<T>
        where T : struct, Enum
    {
        internal static readonly Dictionary<T, string> Codes =
            Enum.GetValues<T>().ToDictionary(v => v, v => JsonNamingPolicy.KebabCaseLower.ConvertName(v.ToString()));

        internal static readonly Dictionary<string, T> Values = Codes.ToDictionary(p => p.Value, p => p.Key, StringComparer.Ordinal);
    }
}
