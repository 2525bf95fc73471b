namespace Plant.Register.Interchange;

/// <summary>How to import.</summary>
public sealed record ImportOptions
{
    /// <summary>Why known rows may be corrected; null: they may not.</summary>
    public string? AmendReason { get; init; }

    /// <summary>True to look only: nothing is written, and changed rows are no errors.</summary>
    public bool Preview { get; init; }

    /// <summary>Told the file and the line now and then.</summary>
    public IProgress<(string File, long Line)>? Progress { get; init; }
}
