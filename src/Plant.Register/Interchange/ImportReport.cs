namespace Plant.Register.Interchange;

/// <summary>One refused cell or row.</summary>
/// <param name="File">Name of the file.</param>
/// <param name="Line">Line in the file, the header is 1.</param>
/// <param name="Column">Name of the column; empty where the whole row or file is meant.</param>
/// <param name="Value">The value as it stands there.</param>
/// <param name="Remedy">What is wrong and what to do.</param>
public sealed record ImportError(string File, long Line, string Column, string Value, string Remedy)
{
    public override string ToString() =>
        FormattableString.Invariant($"{File}, line {Line}{(Column.Length > 0 ? $", column {Column}" : "")}{(Value.Length > 0 ? $", value \"{Value}\"" : "")}: {Remedy}");
}

/// <summary>A row that a preview shows.</summary>
/// <param name="Line">Line in the file.</param>
/// <param name="Key">The row's key.</param>
/// <param name="Change">What differs, as "column: old → new".</param>
public sealed record ChangedRow(long Line, string Key, string Change);

/// <summary>What an import found in one file.</summary>
public sealed class FileReport(string file)
{
    /// <summary>Errors that are told in one run.</summary>
    public const int ErrorLimit = 100;

    private const int ChangedLimit = 50;

    private readonly List<ImportError> errors = [];
    private readonly List<ChangedRow> changedRows = [];

    public string File => file;

    public long New { get; set; }

    public long Unchanged { get; set; }

    /// <summary>Known rows with other values: amended, or where no reason was given refused.</summary>
    public long Amended { get; private set; }

    public long Refused { get; private set; }

    public IReadOnlyList<ImportError> Errors => errors;

    public IReadOnlyList<ChangedRow> ChangedRows => changedRows;

    public void Refuse(long line, string column, string value, string remedy)
    {
        if (errors.Count < ErrorLimit)
        {
            errors.Add(new ImportError(file, line, column, value.Length > 80 ? value[..80] + "…" : value, remedy));
        }
    }

    public void CountRefusedRow() => Refused++;

    public void Change(ChangedRow row)
    {
        Amended++;
        if (changedRows.Count < ChangedLimit)
        {
            changedRows.Add(row);
        }
    }
}

/// <summary>What an import found and did.</summary>
/// <param name="Files">A report a file that the folder held.</param>
/// <param name="Written">True where the rows are in the register now.</param>
public sealed record ImportReport(IReadOnlyList<FileReport> Files, bool Written)
{
    public bool HasErrors => Files.Any(f => f.Refused > 0 || f.Errors.Count > 0);
}
