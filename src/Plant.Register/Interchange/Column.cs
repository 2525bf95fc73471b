namespace Plant.Register.Interchange;

/// <summary>One column of a file: its name, and how it is read into fields and written from them.</summary>
/// <param name="Name">Name in the header.</param>
/// <param name="IsKey">True where it is part of the key: it may not be absent.</param>
/// <param name="Read">Reads a cell that is not empty; returns the remedy where it cannot.</param>
/// <param name="Write">Writes the cell.</param>
public sealed record Column<T>(string Name, bool IsKey, Column<T>.Reader Read, Func<T, string> Write)
{
    public delegate string? Reader(T fields, ReadOnlySpan<char> cell);
}

/// <summary>Makes columns of each type.</summary>
public static class Column
{
    public static Column<T> Text<T>(string name, Func<T, string?> get, Action<T, string> set, bool key = false) => new(name, key, (fields, cell) =>
    {
        set(fields, CsvText.Restore(cell.ToString()));
        return null;
    }, fields => CsvText.Neutralise(get(fields) ?? string.Empty));

    public static Column<T> Number<T>(string name, Func<T, double?> get, Action<T, double> set, bool key = false) => new(name, key, (fields, cell) =>
    {
        if (!CsvText.TryNumber(cell, out var value))
        {
            return "must be a number with a decimal point and no thousands separator, such as 1234.5";
        }

        set(fields, value);
        return null;
    }, fields => CsvText.Format(get(fields)));

    public static Column<T> Time<T>(string name, Func<T, DateTimeOffset?> get, Action<T, DateTimeOffset> set, bool key = false) => new(name, key, (fields, cell) =>
    {
        if (!CsvText.TryTime(cell, out var value))
        {
            return "must be a time as ISO 8601 with Z or an offset, such as 2026-03-01T06:00:00Z";
        }

        set(fields, value);
        return null;
    }, fields => CsvText.Format(get(fields)));

    public static Column<T> Flag<T>(string name, Func<T, bool?> get, Action<T, bool> set) => new(name, false, (fields, cell) =>
    {
        if (cell is not ("true" or "false"))
        {
            return "must be true or false";
        }

        set(fields, cell is "true");
        return null;
    }, fields => CsvText.Format(get(fields)));
}
