namespace Plant.Web.Shared.Drawing;

/// <summary>How a series is drawn.</summary>
public enum SeriesStyle
{
    /// <summary>Rings with their interval.</summary>
    Rings,

    /// <summary>Triangles: kept, but not believed.</summary>
    Triangles,

    /// <summary>A solid line.</summary>
    Line,

    /// <summary>A dashed line.</summary>
    Dashed,

    /// <summary>The upper edge of a band, filled down to the series before it.</summary>
    Band,

    /// <summary>The lower edge of a band.</summary>
    BandFloor,
}

/// <summary>One series of a chart.</summary>
/// <param name="Name">Its name, shown when pointed at.</param>
/// <param name="Style">How it is drawn.</param>
/// <param name="X">Places: times or numbers.</param>
/// <param name="Y">Values.</param>
/// <param name="Error">Half of the 90 % interval of each value, where there is one.</param>
/// <param name="Water">True for free or settled water: the only thing in the water hue.</param>
public sealed record ChartSeries(string Name, SeriesStyle Style, IReadOnlyList<object> X, IReadOnlyList<double?> Y, IReadOnlyList<double>? Error = null, bool Water = false);
