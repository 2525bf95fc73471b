using Plant.Physics;
using Plant.Physics.Fluids;

namespace Plant.Advice.Ledger;

/// <summary>What the oil of a reservoir is and can hold, from its sheet and its temperatures.</summary>
public sealed record OilState
{
    /// <summary>The fluid; null where its sheet cannot be used.</summary>
    public FluidModel? Fluid { get; init; }

    /// <summary>Running temperature [K].</summary>
    public double? RunningK { get; init; }

    /// <summary>Coldest temperature [K].</summary>
    public double? ColdestK { get; init; }

    /// <summary>Volume of the oil [L].</summary>
    public double? VolumeL { get; init; }

    /// <summary>Mass of the oil [kg].</summary>
    public double? MassKg { get; init; }

    /// <summary>Saturation at the running temperature [mg/kg].</summary>
    public double? SaturationPpm { get; init; }

    /// <summary>Saturation at the coldest temperature [mg/kg].</summary>
    public double? SaturationColdestPpm { get; init; }

    /// <summary>Content in equilibrium with the headspace [mg/kg].</summary>
    public double? HeadspacePpm { get; init; }

    /// <summary>Exchange with the headspace [1/day].</summary>
    public double ExchangePerDay { get; init; }

    /// <summary>Which way undissolved water goes at the running temperature.</summary>
    public WaterDirection? WaterGoes { get; init; }

    /// <summary>Relative uncertainty of the saturation [1].</summary>
    public double SaturationLogSd { get; init; }

    /// <summary>Reads it off the records.</summary>
    /// <param name="history">The records.</param>
    /// <param name="working">Receives the steps, or null.</param>
    /// <returns>The state.</returns>
    public static OilState Of(ReservoirHistory history, Working? working = null)
    {
        ArgumentNullException.ThrowIfNull(history);
        var fluid = FluidModel.TryCreate(history.Fluid, []);
        double? running = history.OperatingTemperatureC is { } warm ? warm + Constants.ZeroCelsiusK : null;
        double? coldest = history.ColdestTemperatureC is { } cold ? cold + Constants.ZeroCelsiusK : running;
        running ??= coldest;
        if (fluid is null)
        {
            return new OilState { RunningK = running, ColdestK = coldest, VolumeL = history.OilVolumeL, ExchangePerDay = Priors.HumidityExchangePerDay(history.Breather) };
        }

        var density = fluid.DensityKgM3(running ?? 313.15);
        var saturated = fluid.HasSaturation;
        return new OilState
        {
            Fluid = fluid,
            RunningK = running,
            ColdestK = coldest,
            VolumeL = history.OilVolumeL,
            MassKg = history.OilVolumeL * density / 1000,
            SaturationPpm = saturated && running is { } t ? fluid.SaturationPpm(t, working) : null,
            SaturationColdestPpm = saturated && coldest is { } c ? fluid.SaturationPpm(c, working) : null,
            HeadspacePpm = saturated && running is { } r && coldest is { } air && history.HeadspaceRhPercent is { } humidity
                ? Headspace.EquilibriumPpm(fluid, r, Headspace.WaterPressurePa(Math.Max(air, 275), Math.Clamp(humidity / 100, 0, 1)), working)
                : null,
            ExchangePerDay = Priors.HumidityExchangePerDay(history.Breather),
            WaterGoes = running is { } at ? fluid.WaterGoes(at, working) : null,
            SaturationLogSd = Priors.SaturationLogSd(fluid),
        };
    }

    /// <summary>Content below which a separator takes nothing [mg/kg].</summary>
    /// <param name="run">The run.</param>
    /// <returns>Floor [mg/kg].</returns>
    public double FloorPpm(SeparatorRun run)
    {
        ArgumentNullException.ThrowIfNull(run);
        if (Fluid is not { HasSaturation: true } || (run.OilTemperatureC + Constants.ZeroCelsiusK ?? RunningK) is not { } temperature)
        {
            return 0;
        }

        var saturation = Fluid.SaturationPpm(temperature);
        return run.Kind switch
        {
            SeparatorKind.VacuumDehydrator => saturation * Math.Min(1, (run.PressureKPa ?? 10) * 1000 / Plant.Physics.Water.WaterProperties.VapourPressurePa(temperature)),
            SeparatorKind.DryAirPurge => 0.1 * saturation,
            SeparatorKind.Absorbent => 0.5 * saturation,
            _ => saturation,
        };
    }
}
