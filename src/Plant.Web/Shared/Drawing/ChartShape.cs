using Plotly.Blazor;
using Plotly.Blazor.LayoutLib;
using Plotly.Blazor.Traces;
using Plotly.Blazor.Traces.ScatterLib;
using Plotly.Blazor.Traces.ScatterLib.MarkerLib;

namespace Plant.Web.Shared.Drawing;

/// <summary>Turns series into traces and a layout in the colours of the tokens.</summary>
internal static class ChartShape
{
    // the order in which the page's script reads the tokens
    private const int Ink = 0, Ink2 = 1, Line = 3, Line2 = 4, Water = 5, Oil = 6, Sheet = 8;

    public static (Layout Layout, IList<ITrace> Data) Of(IReadOnlyList<ChartSeries> series, string[] colours, string xTitle, string yTitle)
    {
        var layout = new Layout
        {
            PaperBgColor = "rgba(0,0,0,0)",
            PlotBgColor = "rgba(0,0,0,0)",
            ShowLegend = false,
            AutoSize = true,
            Height = 300,
            Margin = new Margin { L = 56, R = 130, T = 10, B = 40 },
            Font = new Font { Family = "Source Sans 3, sans-serif", Size = 12, Color = colours[Ink2] },
            XAxis = [new XAxis { GridColor = colours[Line], ZeroLineColor = colours[Line2], Title = new Plotly.Blazor.LayoutLib.XAxisLib.Title { Text = series.Any(s => s.X.Count > 0 && s.X[0] is DateTime) ? null : xTitle } }],
            YAxis = [new YAxis { GridColor = colours[Line], ZeroLineColor = colours[Line2], RangeMode = Plotly.Blazor.LayoutLib.YAxisLib.RangeModeEnum.ToZero, Title = new Plotly.Blazor.LayoutLib.YAxisLib.Title { Text = yTitle } }],
            Annotations = [.. series.Where(s => s.Style is SeriesStyle.Line or SeriesStyle.Dashed && s.X.Count > 0 && s.Y[^1] is not null).Select(s => new Annotation
            {
                X = s.X[^1],
                Y = (decimal)s.Y[^1]!.Value,
                Text = Plain(s.Name),
                ShowArrow = false,
                XAnchor = Plotly.Blazor.LayoutLib.AnnotationLib.XAnchorEnum.Left,
                Font = new Plotly.Blazor.LayoutLib.AnnotationLib.Font { Color = s.Water ? colours[Water] : colours[Ink], Size = 12 },
            })],
        };
        return (layout, [.. series.Select(s => Trace(s, colours))]);
    }

    private static Scatter Trace(ChartSeries series, string[] colours)
    {
        var colour = series.Water ? colours[Water] : series.Style is SeriesStyle.Triangles ? colours[Ink2] : colours[Ink];
        var trace = new Scatter
        {
            Name = Plain(series.Name),
            X = [.. series.X],
            Y = [.. series.Y.Select(v => (object)v!)],
            HoverTemplate = "%{x}<br>%{y:.3~g}<extra>" + Plain(series.Name) + "</extra>",
        };
        switch (series.Style)
        {
            case SeriesStyle.Rings or SeriesStyle.Triangles:
                trace.Mode = ModeFlag.Markers;
                trace.Marker = new Marker
                {
                    Color = series.Style == SeriesStyle.Rings ? colours[Sheet] : "rgba(0,0,0,0)",
                    Size = 8,
                    Symbol = series.Style == SeriesStyle.Rings ? SymbolEnum.Circle : SymbolEnum.TriangleUpOpen,
                    Line = new Plotly.Blazor.Traces.ScatterLib.MarkerLib.Line { Color = colour, Width = 1.5m },
                };
                if (series.Error is { } error)
                {
                    trace.ErrorY = new ErrorY { Type = Plotly.Blazor.Traces.ScatterLib.ErrorYLib.TypeEnum.Data, Array = [.. error.Select(e => (object)e)], Color = colour, Thickness = 1.2m, Width = 0 };
                }

                break;
            case SeriesStyle.Line or SeriesStyle.Dashed:
                trace.Mode = ModeFlag.Lines;
                trace.Line = new Plotly.Blazor.Traces.ScatterLib.Line { Color = colour, Width = 1.5m, Dash = series.Style == SeriesStyle.Dashed ? "dash" : "solid" };
                break;
            default:
                trace.Mode = ModeFlag.Lines;
                trace.Line = new Plotly.Blazor.Traces.ScatterLib.Line { Color = colours[Oil], Width = 0 };
                if (series.Style == SeriesStyle.Band)
                {
                    trace.Fill = FillEnum.ToNextY;
                    trace.FillColor = colours[Oil];
                }

                break;
        }

        return trace;
    }

    /// <summary>The chart library reads some markup in texts: none of ours has any.</summary>
    private static string Plain(string text) => text.Replace('<', '‹').Replace('>', '›');
}
