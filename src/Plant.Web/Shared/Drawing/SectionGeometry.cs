using System.Globalization;
using Plant.Physics.Tanks;

namespace Plant.Web.Shared.Drawing;

/// <summary>A section across a reservoir, from millimetres to pixels, as SVG paths.</summary>
public sealed class SectionGeometry
{
    private readonly double centreX;
    private readonly double floorY;

    private SectionGeometry(TankShape shape, double widthMm, double heightMm, double scale, double centreX, double floorY)
    {
        Shape = shape;
        WidthMm = widthMm;
        HeightMm = heightMm;
        Scale = scale;
        this.centreX = centreX;
        this.floorY = floorY;
    }

    public TankShape Shape { get; }

    /// <summary>Width across [mm].</summary>
    public double WidthMm { get; }

    /// <summary>Height [mm].</summary>
    public double HeightMm { get; }

    /// <summary>Pixels a millimetre.</summary>
    public double Scale { get; }

    /// <summary>Fits the section into a box of pixels.</summary>
    public static SectionGeometry Fit(TankShape shape, double widthMm, double heightMm, double left, double top, double width, double height)
    {
        var across = shape == TankShape.HorizontalCylinder ? heightMm : widthMm;
        var scale = Math.Min(width / across, height / heightMm);
        return new SectionGeometry(shape, across, heightMm, scale, left + (width / 2), top + height);
    }

    /// <summary>Pixel of a place across, from the middle [mm].</summary>
    public double X(double mm) => centreX + (mm * Scale);

    /// <summary>Pixel of a height above the floor [mm].</summary>
    public double Y(double mm) => floorY - (mm * Scale);

    /// <summary>Half the width of the section at a height [mm].</summary>
    public double HalfWidthMm(double heightMm) => Shape == TankShape.HorizontalCylinder ? Math.Sqrt(Math.Max(0, heightMm * (HeightMm - heightMm))) : WidthMm / 2;

    /// <summary>Outline.</summary>
    public string Wall()
    {
        if (Shape == TankShape.HorizontalCylinder)
        {
            var r = HeightMm / 2 * Scale;
            return Path($"M{X(0) - r:0.#} {Y(HeightMm / 2):0.#}a{r:0.#} {r:0.#} 0 1 0 {2 * r:0.#} 0a{r:0.#} {r:0.#} 0 1 0 {-2 * r:0.#} 0z");
        }

        var (l, right, bottom, top) = (X(-WidthMm / 2), X(WidthMm / 2), Y(0), Y(HeightMm));
        return Shape == TankShape.VerticalCylinder
            ? Path($"M{l:0.#} {top:0.#}V{bottom:0.#}H{right:0.#}V{top:0.#}Q{X(0):0.#} {top - ((right - l) * 0.12):0.#} {l:0.#} {top:0.#}z")
            : Path($"M{l:0.#} {top:0.#}V{bottom:0.#}H{right:0.#}V{top:0.#}z");
    }

    /// <summary>The part between two heights [mm].</summary>
    public string Slab(double fromMm, double toMm)
    {
        fromMm = Math.Clamp(fromMm, 0, HeightMm);
        toMm = Math.Clamp(toMm, 0, HeightMm);
        if (toMm <= fromMm)
        {
            return string.Empty;
        }

        var (low, high) = (HalfWidthMm(fromMm), HalfWidthMm(toMm));
        if (Shape != TankShape.HorizontalCylinder)
        {
            return Path($"M{X(-low):0.#} {Y(fromMm):0.#}H{X(low):0.#}V{Y(toMm):0.#}H{X(-low):0.#}Z");
        }

        var r = HeightMm / 2 * Scale;
        return Path($"M{X(-low):0.#} {Y(fromMm):0.#}L{X(low):0.#} {Y(fromMm):0.#}A{r:0.#} {r:0.#} 0 0 0 {X(high):0.#} {Y(toMm):0.#}L{X(-high):0.#} {Y(toMm):0.#}A{r:0.#} {r:0.#} 0 0 0 {X(-low):0.#} {Y(fromMm):0.#}Z");
    }

    private static string Path(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
