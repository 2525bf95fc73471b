using Plotly.Blazor;
using Plotly.Blazor.LayoutLib;
using Plotly.Blazor.Traces;
using Plotly.Blazor.Traces.ScatterLib;
using Plotly.Blazor.Traces.ScatterLib.MarkerLib;
using AnnotationLib = Plotly.Blazor.LayoutLib.AnnotationLib;

namespace Plant.Web.Shared.Drawing;

/// <summary>Turns series into traces and a layout in the colours of the tokens.</summary>
public static class ChartShape
{
    private const int Height = 350, TopRoom = 26, Foot = 44, LabelHeight = 16;
    private const string Clear = "rgba(0,0,0,0)";

    public static (Layout Layout, IList<ITrace> Data) Of(IReadOnlyList<ChartSeries> series, ChartLook look, string xTitle, string unit)
    {
        var top = ChartScale.Top(series);
        var across = ChartScale.Across(series);
        var dates = across?.From is DateTime;
        var layout = new Layout
        {
            PaperBgColor = Clear,
            PlotBgColor = Clear,
            ShowLegend = false,
            Height = Height,
            Margin = new Margin { L = 48, R = look.Narrow ? 10 : 124, T = TopRoom, B = Foot },
            Font = new Font { Family = "Source Sans 3, sans-serif", Size = 12, Color = look.Ink2 },
            XAxis =
            [
                new XAxis
                {
                    GridColor = look.Line, ZeroLine = false, ShowLine = true, LineColor = look.Line2, FixedRange = look.Narrow,
                    Range = across is { } ends ? [ends.From, ends.To] : null,
                    NTicks = look.Narrow ? 4 : 9,
                    TickFormat = dates ? "%-d %b\n%Y" : null,
                    Title = new Plotly.Blazor.LayoutLib.XAxisLib.Title { Text = dates ? null : xTitle },
                },
            ],
            YAxis =
            [
                new YAxis
                {
                    GridColor = look.Line, ZeroLineColor = look.Line2, FixedRange = look.Narrow, Range = [0, top], NTicks = 6,
                    SeparateThousands = true, ExponentFormat = Plotly.Blazor.LayoutLib.YAxisLib.ExponentFormatEnum.None,
                },
            ],
            Annotations = [.. Ends(series, look, top), .. Moments(series, look)],
        };
        return (layout, [.. series.Select(s => Trace(s, look, top, unit, dates))]);
    }

    /// <summary>Names of the lines at their right ends, apart from each other.</summary>
    private static IEnumerable<Annotation> Ends(IReadOnlyList<ChartSeries> series, ChartLook look, double top)
    {
        var named = series.Where(s => s.Style is SeriesStyle.Line or SeriesStyle.Dashed && s.Y.Count > 0 && s.Y[^1] is not null).OrderByDescending(s => s.Y[^1]).ToList();
        const double room = Height - TopRoom - Foot;
        var places = LabelColumn.Place([.. named.Select(s => room * (1 - (s.Y[^1]!.Value / top)))], [.. named.Select(_ => (double)LabelHeight)], room + (LabelHeight / 2));
        return named.Select((s, i) => new Annotation
        {
            XRef = "paper",
            YRef = "paper",
            X = 1,
            Y = (decimal)(1 - (places[i] / room)),
            Text = Plain(s.Name),
            ShowArrow = false,
            BgColor = look.Narrow ? look.Sheet : null,
            XAnchor = look.Narrow ? AnnotationLib.XAnchorEnum.Right : AnnotationLib.XAnchorEnum.Left,
            YAnchor = look.Narrow ? AnnotationLib.YAnchorEnum.Bottom : AnnotationLib.YAnchorEnum.Middle,
            Font = new AnnotationLib.Font { Color = s.Water ? look.Water : look.Ink, Size = 12 },
        });
    }

    /// <summary>Names of moments above their lines.</summary>
    private static IEnumerable<Annotation> Moments(IReadOnlyList<ChartSeries> series, ChartLook look) =>
        series.Where(s => s.Style is SeriesStyle.Moment || (s.Style is SeriesStyle.Today && !look.Narrow)).Select(s => new Annotation
        {
            X = s.X[0],
            YRef = "paper",
            Y = 1,
            Text = Plain(s.Name),
            ShowArrow = false,
            XAnchor = s.Style == SeriesStyle.Today ? AnnotationLib.XAnchorEnum.Left : AnnotationLib.XAnchorEnum.Right,
            YAnchor = AnnotationLib.YAnchorEnum.Bottom,
            Font = new AnnotationLib.Font { Color = look.Ink, Size = 12 },
        });

    private static Scatter Trace(ChartSeries series, ChartLook look, double top, string unit, bool dates)
    {
        var upright = series.Style is SeriesStyle.Today or SeriesStyle.Moment;
        var trace = new Scatter
        {
            Name = Plain(series.Name),
            X = upright ? [series.X[0], series.X[0]] : [.. series.X],
            Y = upright ? [0, top] : [.. series.Y.Select(v => (object)v!)],
            HoverInfo = series.Tells ? null : HoverInfoFlag.Skip,
        };
        if (series.Tells)
        {
            trace.Text = string.Empty;
            trace.TextArray = [.. series.Y.Select((y, i) => $"{Figures.Of(y)}{(series.Error is { } e ? $" ± {Figures.Of(e[i])}" : "")} {unit}")];
            trace.HoverTemplate = (dates ? "%{x|%-d %b %Y}" : "%{x:.3~g}") + "<br>%{text}<extra>" + Plain(series.Name) + "</extra>";
        }

        if (series.Style is SeriesStyle.Rings or SeriesStyle.Triangles)
        {
            Mark(trace, series, look, top);
        }
        else
        {
            Draw(trace, series, look);
        }

        return trace;
    }

    private static void Mark(Scatter trace, ChartSeries series, ChartLook look, double top)
    {
        var odd = series.Style == SeriesStyle.Triangles;
        trace.Mode = odd ? ModeFlag.Markers | ModeFlag.Text : ModeFlag.Markers;
        trace.Marker = new Marker
        {
            Color = look.Sheet,
            Size = odd ? 9 : 7,
            Symbol = odd ? SymbolEnum.TriangleUp : SymbolEnum.Circle,
            Line = new Plotly.Blazor.Traces.ScatterLib.MarkerLib.Line { Color = odd ? look.Ink2 : look.Ink, Width = 1.5m },
        };
        if (odd)
        {
            // what is not believed and off the scale stands at its edge, with its value
            trace.Y = [.. series.Y.Select(v => (object)Math.Min(v ?? 0, 0.97 * top))];
            trace.TextPosition = Plotly.Blazor.Traces.ScatterLib.TextPositionEnum.MiddleRight;
            trace.TextTemplate = "%{text}";
        }
        else if (series.Error is { } error)
        {
            trace.ErrorY = new ErrorY { Type = Plotly.Blazor.Traces.ScatterLib.ErrorYLib.TypeEnum.Data, Array = [.. error.Select(e => (object)e)], Color = look.Ink, Thickness = 1, Width = 0 };
        }
    }

    private static void Draw(Scatter trace, ChartSeries series, ChartLook look)
    {
        var band = series.Style is SeriesStyle.BandFloor or SeriesStyle.WideBand or SeriesStyle.NarrowBand;
        trace.Mode = ModeFlag.Lines;
        trace.Line = new Plotly.Blazor.Traces.ScatterLib.Line
        {
            Color = band ? Clear : series.Water ? look.Water : series.Style == SeriesStyle.Path ? look.Line2 : look.Ink,
            Width = band ? 0 : series.Style is SeriesStyle.Line or SeriesStyle.Today ? 2 : 1.25m,
            Dash = series.Style is SeriesStyle.Dashed or SeriesStyle.Moment ? "5px,3px" : "solid",
        };
        if (series.Style is SeriesStyle.WideBand or SeriesStyle.NarrowBand)
        {
            var wide = series.Style == SeriesStyle.WideBand;
            trace.Fill = FillEnum.ToNextY;
            trace.FillColor = series.Water ? (wide ? look.Water3 : look.Water2) : (wide ? look.Oil : look.Oil2);
        }
    }

    /// <summary>The chart library reads some markup in texts: none of ours has any.</summary>
    private static string Plain(string text) => text.Replace('<', '‹').Replace('>', '›');
}
