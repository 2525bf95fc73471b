namespace Plant.Web.Shared.Drawing;

/// <summary>How a series is drawn.</summary>
public enum SeriesStyle
{
    /// <summary>Rings with their interval.</summary>
    Rings,

    /// <summary>Triangles with their value: kept, but not believed.</summary>
    Triangles,

    /// <summary>A solid line, named at its end.</summary>
    Line,

    /// <summary>A dashed line, named at its end.</summary>
    Dashed,

    /// <summary>A thin line through points that other series show.</summary>
    Path,

    /// <summary>A moment: a solid upright line, named at its top.</summary>
    Today,

    /// <summary>A moment: a dashed upright line, named at its top.</summary>
    Moment,

    /// <summary>The lower edge of a band.</summary>
    BandFloor,

    /// <summary>The upper edge of a 90 % band, filled down to the series before it.</summary>
    WideBand,

    /// <summary>The upper edge of a 50 % band, filled down to the series before it.</summary>
    NarrowBand,
}

/// <summary>One series of a chart.</summary>
/// <param name="Name">Its name, shown at its end or when pointed at.</param>
/// <param name="Style">How it is drawn.</param>
/// <param name="X">Places: times or numbers.</param>
/// <param name="Y">Values; a moment has none.</param>
/// <param name="Error">Half of the 90 % interval of each value, where there is one.</param>
/// <param name="Water">True for free or settled water: the only thing in the water hue.</param>
public sealed record ChartSeries(string Name, SeriesStyle Style, IReadOnlyList<object> X, IReadOnlyList<double?> Y, IReadOnlyList<double>? Error = null, bool Water = false)
{
    /// <summary>True where the numbers are worth a row in the table beside the chart.</summary>
    public bool Tells => Style is SeriesStyle.Rings or SeriesStyle.Triangles or SeriesStyle.Line or SeriesStyle.Dashed;

    /// <summary>A moment in time.</summary>
    public static ChartSeries At(string name, DateTime when, bool today = false) => new(name, today ? SeriesStyle.Today : SeriesStyle.Moment, [when], []);
}
