using System.Text;
using nietras.SeparatedValues;

namespace Plant.Register.Interchange;

/// <summary>Reads one file as a stream of checked rows.</summary>
public sealed class CsvFile<T>(string path, IReadOnlyList<Column<T>> columns, FileReport report)
    where T : class, Storage.IFields, new()
{
    private const int LongestCell = 10_000;
    private const string NotUtf8 = "holds bytes that are not UTF-8: save the file as UTF-8";

    private readonly List<Physics.Refusal> refusals = [];

    /// <summary>Rows that pass the rules, with their lines; what does not pass is in the report.</summary>
    public IEnumerable<(long Line, T Fields)> Rows()
    {
        using var text = Open();
        if (text is null)
        {
            yield break;
        }

        using var reader = Read(text);
        if (reader is null)
        {
            yield break;
        }

        Column<T>[]? header = null;
        while (Next(reader))
        {
            if (header is null)
            {
                header = Header(reader.Current);
                if (header is null)
                {
                    yield break;
                }
            }
            else if (Read(reader.Current, header) is { } row)
            {
                yield return row;
            }
        }

        if (header is null && report.Errors.Count == 0)
        {
            report.Refuse(1, string.Empty, string.Empty, $"is empty: it needs a header row with {string.Join(", ", columns.Select(c => c.Name))}");
        }
    }

    private StreamReader? Open()
    {
        var stream = new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.Read, 1 << 16, FileOptions.SequentialScan);
        Span<byte> start = stackalloc byte[4];
        var count = stream.Read(start);
        stream.Position = 0;
        if (count >= 2 && (start is [0xFF, 0xFE, ..] or [0xFE, 0xFF, ..] || (count >= 4 && (start[0] == 0 || start[1] == 0))))
        {
            stream.Dispose();
            report.Refuse(1, string.Empty, string.Empty, "is UTF-16 text: save it as UTF-8");
            return null;
        }

        return new StreamReader(stream, new UTF8Encoding(false, throwOnInvalidBytes: true), detectEncodingFromByteOrderMarks: true, 1 << 16);
    }

    private SepReader? Read(StreamReader text)
    {
        try
        {
            return Sep.Reader(options => options with { Sep = Sep.New(','), HasHeader = false, Unescape = true, DisableColCountCheck = true }).From(text);
        }
        catch (DecoderFallbackException)
        {
            report.Refuse(1, string.Empty, string.Empty, NotUtf8);
            return null;
        }
    }

    private bool Next(SepReader reader)
    {
        try
        {
            return reader.MoveNext();
        }
        catch (DecoderFallbackException)
        {
            report.Refuse(reader.Current.LineNumberToExcl, string.Empty, string.Empty, NotUtf8);
        }
        catch (Exception broken) when (broken is InvalidDataException or NotSupportedException)
        {
            report.Refuse(reader.Current.LineNumberToExcl, string.Empty, string.Empty, "a row is longer than 16 million characters: a quote is probably not closed");
        }

        return false;
    }

    private Column<T>[]? Header(SepReader.Row row)
    {
        var header = new Column<T>[row.ColCount];
        for (var i = 0; i < row.ColCount; i++)
        {
            var name = row[i].ToString();
            var column = columns.FirstOrDefault(c => c.Name == name);
            if (column is null)
            {
                report.Refuse(1, name, string.Empty, $"is no column of this file; it knows {string.Join(", ", columns.Select(c => c.Name))}");
            }
            else if (header.Contains(column))
            {
                report.Refuse(1, name, string.Empty, "stands twice in the header");
            }
            else
            {
                header[i] = column;
            }
        }

        foreach (var key in columns.Where(c => c.IsKey && !header.Contains(c)))
        {
            report.Refuse(1, key.Name, string.Empty, "is a key column and is absent: add it");
        }

        return report.Errors.Count == 0 ? header : null;
    }

    private (long Line, T Fields)? Read(SepReader.Row row, Column<T>[] header)
    {
        var line = row.LineNumberFrom;
        if (row.ColCount == 1 && row[0].Span.IsEmpty)
        {
            return null;
        }

        if (row.ColCount != header.Length)
        {
            report.Refuse(line, string.Empty, string.Empty, FormattableString.Invariant($"has {row.ColCount} cells where the header has {header.Length}: quote cells that hold a comma"));
            report.CountRefusedRow();
            return null;
        }

        var fields = new T();
        refusals.Clear();
        for (var i = 0; i < header.Length; i++)
        {
            var cell = row[i].Span;
            if (cell.IsEmpty)
            {
                continue;
            }

            if (cell.Length > LongestCell || cell.Contains('\0'))
            {
                refusals.Add(new(header[i].Name, cell[..Math.Min(20, cell.Length)].ToString().Replace('\0', '?'), cell.Length > LongestCell ? $"is longer than {LongestCell} characters: a quote is probably not closed" : "holds a NUL character: remove it"));
            }
            else if (header[i].Read(fields, cell) is { } remedy)
            {
                refusals.Add(new(header[i].Name, cell.ToString(), remedy));
            }
        }

        if (refusals.Count == 0)
        {
            fields.Check(refusals);
        }

        if (refusals.Count == 0)
        {
            return (line, fields);
        }

        foreach (var refusal in refusals)
        {
            report.Refuse(line, refusal.Field, refusal.Value, refusal.Reason);
        }

        report.CountRefusedRow();
        return null;
    }
}
