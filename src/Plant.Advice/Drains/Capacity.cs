using Plant.Physics;
using Plant.Physics.Fluids;
using Plant.Physics.Tanks;

namespace Plant.Advice.Drains;

/// <summary>How much settled water may stand before it does harm.</summary>
public static class Capacity
{
    /// <summary>Layer that may float where water is lighter than the oil [mm].</summary>
    public const double FloatingLayerMm = 25;

    /// <summary>Capacity for settled or floating water.</summary>
    /// <param name="history">The records.</param>
    /// <param name="waterGoes">Which way water goes.</param>
    /// <param name="working">Receives the step, or null.</param>
    /// <returns>Capacity [L]; null where neither given nor computable.</returns>
    public static double? LitresOf(ReservoirHistory history, WaterDirection? waterGoes, Working? working = null)
    {
        ArgumentNullException.ThrowIfNull(history);
        if (history.WaterCapacityL is { } given)
        {
            working?.Add("capacity for settled water", "as given for the reservoir", given, "L", "register");
            return given;
        }

        if (history.Shape is not { } shape || TankGeometry.TryCreate(shape, history.LengthMm, history.WidthMm, history.HeightMm, []) is not { } tank)
        {
            return null;
        }

        double? capacity = null;
        if (waterGoes == WaterDirection.Up)
        {
            if (history.OilVolumeL is { } volume)
            {
                var depth = tank.DepthM(Math.Min(volume / 1000, tank.FullVolumeM3));
                var below = Math.Max(0, depth - (FloatingLayerMm / 1000));
                capacity = (tank.VolumeM3(depth) - tank.VolumeM3(below)) * 1000;
                working?.Add("capacity for floating water", FormattableString.Invariant($"a layer of {FloatingLayerMm} mm below the surface"), capacity, "L", "common practice");
            }
        }
        else if (history.SuctionHeightMm is > 0 and { } suction && suction / 1000 <= tank.HeightM)
        {
            capacity = tank.VolumeM3(suction / 1000) * 1000;
            working?.Add("capacity for settled water", FormattableString.Invariant($"volume below the suction mouth at {suction} mm"), capacity, "L", Citations.Geometry);
        }

        return capacity is > 0 ? capacity : null;
    }
}
