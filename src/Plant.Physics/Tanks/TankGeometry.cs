using System.Globalization;

namespace Plant.Physics.Tanks;

/// <summary>Volume, depth and plan area of a reservoir.</summary>
public sealed class TankGeometry
{
    private readonly double lengthM;
    private readonly double widthM;
    private readonly double heightM;

    private TankGeometry(TankShape shape, double lengthM, double widthM, double heightM)
    {
        Shape = shape;
        this.lengthM = lengthM;
        this.widthM = widthM;
        this.heightM = heightM;
        FullVolumeM3 = VolumeM3(heightM);
    }

    /// <summary>Shape.</summary>
    public TankShape Shape { get; }

    /// <summary>Inside height [m].</summary>
    public double HeightM => heightM;

    /// <summary>Volume when full [m³].</summary>
    public double FullVolumeM3 { get; }

    /// <summary>Builds the geometry, or refuses what is missing or cannot be.</summary>
    /// <param name="shape">Shape.</param>
    /// <param name="lengthMm">Inside length [mm]; not needed for a standing cylinder.</param>
    /// <param name="widthMm">Inside width, or the diameter of a standing cylinder [mm]; not needed for a lying one.</param>
    /// <param name="heightMm">Inside height, or the diameter of a lying cylinder [mm].</param>
    /// <param name="refusals">Receives the refusals.</param>
    /// <returns>The geometry; null where something was refused.</returns>
    public static TankGeometry? TryCreate(TankShape shape, double? lengthMm, double? widthMm, double? heightMm, List<Refusal> refusals)
    {
        ArgumentNullException.ThrowIfNull(refusals);
        var before = refusals.Count;
        Need(refusals, "lengthMm", lengthMm, shape != TankShape.VerticalCylinder);
        Need(refusals, "widthMm", widthMm, shape != TankShape.HorizontalCylinder);
        Need(refusals, "heightMm", heightMm, true);
        return refusals.Count == before ? new TankGeometry(shape, (lengthMm ?? 0) / 1000, (widthMm ?? 0) / 1000, heightMm!.Value / 1000) : null;
    }

    /// <summary>Volume below a level.</summary>
    /// <param name="depthM">Depth [m]; from 0 to the height.</param>
    /// <returns>Volume [m³].</returns>
    /// <remarks>Equation: L·W·h; L·(R²·acos((R − h)/R) − (R − h)·√(2Rh − h²)); πD²h/4. Source: geometry. Valid for: flat floors and ends.</remarks>
    public double VolumeM3(double depthM)
    {
        Guard.Between(depthM, 0, heightM * (1 + 1e-12));
        switch (Shape)
        {
            case TankShape.Rectangular:
                return lengthM * widthM * depthM;
            case TankShape.VerticalCylinder:
                return Math.PI / 4 * widthM * widthM * depthM;
            default:
                var r = heightM / 2;
                var h = Math.Min(depthM, heightM);
                return lengthM * ((r * r * Math.Acos(Math.Clamp((r - h) / r, -1, 1))) - ((r - h) * Math.Sqrt(Math.Max(0, (2 * r * h) - (h * h)))));
        }
    }

    /// <summary>Depth of a volume.</summary>
    /// <param name="volumeM3">Volume [m³]; from 0 to the full volume.</param>
    /// <returns>Depth [m].</returns>
    /// <remarks>Equation: inverse of the volume; by bisection for a lying cylinder. Source: geometry. Valid for: flat floors and ends.</remarks>
    public double DepthM(double volumeM3)
    {
        Guard.Between(volumeM3, 0, FullVolumeM3 * (1 + 1e-9));
        switch (Shape)
        {
            case TankShape.Rectangular:
                return Math.Min(heightM, volumeM3 / (lengthM * widthM));
            case TankShape.VerticalCylinder:
                return Math.Min(heightM, volumeM3 / (Math.PI / 4 * widthM * widthM));
            default:
                double low = 0, high = heightM;
                for (var i = 0; i < 100 && high - low > 1e-15 * heightM; i++)
                {
                    var middle = 0.5 * (low + high);
                    if (VolumeM3(middle) < volumeM3)
                    {
                        low = middle;
                    }
                    else
                    {
                        high = middle;
                    }
                }

                return 0.5 * (low + high);
        }
    }

    /// <summary>Plan area at a level.</summary>
    /// <param name="depthM">Depth [m].</param>
    /// <returns>Area of the surface [m²].</returns>
    /// <remarks>Equation: L·W; 2L·√(h(D − h)); πD²/4. Source: geometry. Valid for: flat floors and ends.</remarks>
    public double SurfaceAreaM2(double depthM)
    {
        Guard.Between(depthM, 0, heightM * (1 + 1e-12));
        return Shape switch
        {
            TankShape.Rectangular => lengthM * widthM,
            TankShape.VerticalCylinder => Math.PI / 4 * widthM * widthM,
            _ => 2 * lengthM * Math.Sqrt(Math.Max(0, depthM * (heightM - depthM))),
        };
    }

    private static void Need(List<Refusal> refusals, string field, double? value, bool needed)
    {
        if (value is { } number ? !(number > 0 && number <= 1e6) : needed)
        {
            refusals.Add(new Refusal(field, value?.ToString("R", CultureInfo.InvariantCulture) ?? "", "must be above 0 and at most 1000000 mm"));
        }
    }
}
