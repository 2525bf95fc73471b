using System.Globalization;

namespace Plant.Register.Interchange;

/// <summary>How values are written in the files and read from them. What is written reads back the same.</summary>
public static class CsvText
{
    /// <summary>A cell that begins with one of these could run as a formula in a spreadsheet.</summary>
    private const string Triggers = "=+-@\t\r";

    /// <summary>Text with a quote before what a spreadsheet would take for a formula; a text that begins so already gets one more.</summary>
    public static string Neutralise(string text) => NeedsQuote(text) ? "'" + text : text;

    /// <summary>Text as a quoted cell.</summary>
    public static string Quote(string text) => $"\"{Neutralise(text).Replace("\"", "\"\"", StringComparison.Ordinal)}\"";

    /// <summary>Undoes <see cref="Neutralise"/>.</summary>
    public static string Restore(string text) => text.Length > 1 && text[0] == '\'' && NeedsQuote(text.AsSpan(1)) ? text[1..] : text;

    public static string Format(double? value) => value is { } number ? number.ToString("R", CultureInfo.InvariantCulture) : string.Empty;

    public static string Format(DateTimeOffset? value) => value is { } time ? time.UtcDateTime.ToString("yyyy-MM-ddTHH:mm:ss.FFF'Z'", CultureInfo.InvariantCulture) : string.Empty;

    public static string Format(bool? value) => value switch { true => "true", false => "false", null => string.Empty };

    public static bool TryNumber(ReadOnlySpan<char> text, out double value) =>
        double.TryParse(text, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent, CultureInfo.InvariantCulture, out value)
        && double.IsFinite(value);

    /// <summary>yyyy-MM-ddTHH:mm[:ss[.fff]] with Z or an offset, to the millisecond.</summary>
    public static bool TryTime(ReadOnlySpan<char> text, out DateTimeOffset value)
    {
        value = default;
        if (text.Length < 17 || text[4] != '-' || text[7] != '-' || text[10] is not ('T' or ' ') || text[13] != ':'
            || !Digits(text, 0, 4, out var year) || !Digits(text, 5, 2, out var month) || !Digits(text, 8, 2, out var day)
            || !Digits(text, 11, 2, out var hour) || !Digits(text, 14, 2, out var minute))
        {
            return false;
        }

        var at = 16;
        var second = 0;
        long ticks = 0;
        if (at < text.Length && text[at] == ':')
        {
            if (!Digits(text, 17, 2, out second))
            {
                return false;
            }

            at = 19;
            if (at < text.Length && text[at] == '.')
            {
                var unit = TimeSpan.TicksPerSecond;
                for (at++; at < text.Length && char.IsAsciiDigit(text[at]); at++)
                {
                    unit /= 10;
                    ticks += unit * (text[at] - '0');
                }
            }
        }

        if (!Offset(text[at..], out var offset) || month is < 1 or > 12 || day < 1 || year < 1 || day > DateTime.DaysInMonth(year, month) || hour > 23 || minute > 59 || second > 59)
        {
            return false;
        }

        value = new DateTimeOffset(new DateTime(year, month, day, hour, minute, second).AddTicks(ticks), offset);
        return true;
    }

    private static bool NeedsQuote(ReadOnlySpan<char> text)
    {
        var rest = text.TrimStart('\'');
        return rest.Length > 0 && Triggers.Contains(rest[0], StringComparison.Ordinal);
    }

    private static bool Offset(ReadOnlySpan<char> text, out TimeSpan offset)
    {
        offset = TimeSpan.Zero;
        if (text is "Z")
        {
            return true;
        }

        if (text.Length != 6 || text[0] is not ('+' or '-') || text[3] != ':' || !Digits(text, 1, 2, out var hours) || !Digits(text, 4, 2, out var minutes) || hours > 14 || minutes > 59)
        {
            return false;
        }

        offset = new TimeSpan(hours, minutes, 0) * (text[0] == '-' ? -1 : 1);
        return true;
    }

    private static bool Digits(ReadOnlySpan<char> text, int from, int count, out int value)
    {
        value = 0;
        if (from + count > text.Length)
        {
            return false;
        }

        for (var i = from; i < from + count; i++)
        {
            if (!char.IsAsciiDigit(text[i]))
            {
                return false;
            }

            value = (value * 10) + (text[i] - '0');
        }

        return true;
    }
}
