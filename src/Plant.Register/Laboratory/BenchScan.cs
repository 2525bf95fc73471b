namespace Plant.Register.Laboratory;

/// <summary>What a scanned bottle turned out to be.</summary>
public enum BenchScanKind
{
    /// <summary>A new row.</summary>
    Opened,

    /// <summary>It stands in this batch already.</summary>
    Twice,

    /// <summary>It stands in somebody's other batch.</summary>
    Elsewhere,

    /// <summary>Its result is released already.</summary>
    Done,

    /// <summary>Nobody logged it.</summary>
    Unknown,
}

/// <summary>What a scan led to.</summary>
/// <param name="Kind">What it is.</param>
/// <param name="Row">Its row, where there is one.</param>
/// <param name="Text">What to tell.</param>
public sealed record BenchScan(BenchScanKind Kind, BenchRow? Row, string Text);
