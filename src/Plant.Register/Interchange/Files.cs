using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Separators;

namespace Plant.Register.Interchange;

/// <summary>The files of a plant and their columns, in the order of the specification.</summary>
public static class Files
{
    public const string FluidFile = "fluids.csv";
    public const string ReservoirFile = "reservoirs.csv";
    public const string SampleFile = "samples.csv";
    public const string DrainFile = "drains.csv";
    public const string TopUpFile = "topups.csv";
    public const string SeparatorFile = "separators.csv";
    public const string RunFile = "separator-runs.csv";
    public const string ReadingFile = "readings.csv";

    /// <summary>In the order in which they are read: what is named comes before what names it.</summary>
    public static readonly IReadOnlyList<string> All = [FluidFile, ReservoirFile, SampleFile, DrainFile, TopUpFile, SeparatorFile, RunFile, ReadingFile];

    public static readonly IReadOnlyList<Column<FluidFields>> Fluids =
    [
        Column.Text<FluidFields>("code", f => f.Code, (f, v) => f.Code = v, key: true),
        Column.Text<FluidFields>("name", f => f.Name, (f, v) => f.Name = v),
        Column.Text<FluidFields>("family", f => f.Family, (f, v) => f.Family = v),
        Column.Number<FluidFields>("isoVg", f => f.IsoVg, (f, v) => f.IsoVg = v),
        Column.Number<FluidFields>("viscosity40Mm2S", f => f.Viscosity40Mm2S, (f, v) => f.Viscosity40Mm2S = v),
        Column.Number<FluidFields>("viscosity100Mm2S", f => f.Viscosity100Mm2S, (f, v) => f.Viscosity100Mm2S = v),
        Column.Number<FluidFields>("density15KgM3", f => f.Density15KgM3, (f, v) => f.Density15KgM3 = v),
        Column.Number<FluidFields>("expansionPerK", f => f.ExpansionPerK, (f, v) => f.ExpansionPerK = v),
        Column.Number<FluidFields>("solubilityA", f => f.SolubilityA, (f, v) => f.SolubilityA = v),
        Column.Number<FluidFields>("solubilityB", f => f.SolubilityB, (f, v) => f.SolubilityB = v),
        Column.Number<FluidFields>("interfacialTensionMNM", f => f.InterfacialTensionMNM, (f, v) => f.InterfacialTensionMNM = v),
        Column.Number<FluidFields>("relativePermittivity", f => f.RelativePermittivity, (f, v) => f.RelativePermittivity = v),
        Column.Number<FluidFields>("conductivityPSM", f => f.ConductivityPSM, (f, v) => f.ConductivityPSM = v),
        Column.Number<FluidFields>("demulsibilityMin", f => f.DemulsibilityMin, (f, v) => f.DemulsibilityMin = v),
        Column.Number<FluidFields>("waterLimitPpm", f => f.WaterLimitPpm, (f, v) => f.WaterLimitPpm = v),
    ];

    public static readonly IReadOnlyList<Column<ReservoirFields>> Reservoirs =
    [
        Column.Text<ReservoirFields>("tag", f => f.Tag, (f, v) => f.Tag = v, key: true),
        Column.Text<ReservoirFields>("name", f => f.Name, (f, v) => f.Name = v),
        Column.Text<ReservoirFields>("area", f => f.Area, (f, v) => f.Area = v),
        Column.Text<ReservoirFields>("service", f => f.Service, (f, v) => f.Service = v),
        Column.Text<ReservoirFields>("fluid", f => f.Fluid, (f, v) => f.Fluid = v),
        Column.Text<ReservoirFields>("shape", f => f.Shape, (f, v) => f.Shape = v),
        Column.Number<ReservoirFields>("lengthMm", f => f.LengthMm, (f, v) => f.LengthMm = v),
        Column.Number<ReservoirFields>("widthMm", f => f.WidthMm, (f, v) => f.WidthMm = v),
        Column.Number<ReservoirFields>("heightMm", f => f.HeightMm, (f, v) => f.HeightMm = v),
        Column.Number<ReservoirFields>("oilVolumeL", f => f.OilVolumeL, (f, v) => f.OilVolumeL = v),
        Column.Number<ReservoirFields>("suctionHeightMm", f => f.SuctionHeightMm, (f, v) => f.SuctionHeightMm = v),
        Column.Number<ReservoirFields>("circulationLPerMin", f => f.CirculationLPerMin, (f, v) => f.CirculationLPerMin = v),
        Column.Number<ReservoirFields>("operatingTemperatureC", f => f.OperatingTemperatureC, (f, v) => f.OperatingTemperatureC = v),
        Column.Number<ReservoirFields>("coldestTemperatureC", f => f.ColdestTemperatureC, (f, v) => f.ColdestTemperatureC = v),
        Column.Number<ReservoirFields>("headspaceRhPercent", f => f.HeadspaceRhPercent, (f, v) => f.HeadspaceRhPercent = v),
        Column.Text<ReservoirFields>("breather", f => f.Breather, (f, v) => f.Breather = v),
        Column.Number<ReservoirFields>("waterLimitPpm", f => f.WaterLimitPpm, (f, v) => f.WaterLimitPpm = v),
        Column.Number<ReservoirFields>("waterCapacityL", f => f.WaterCapacityL, (f, v) => f.WaterCapacityL = v),
        Column.Number<ReservoirFields>("criticality", f => f.Criticality, (f, v) => f.Criticality = v),
        Column.Time<ReservoirFields>("commissionedAt", f => f.CommissionedAt, (f, v) => f.CommissionedAt = v),
    ];

    public static readonly IReadOnlyList<Column<SampleFields>> Samples =
    [
        Column.Text<SampleFields>("sample", f => f.Sample, (f, v) => f.Sample = v, key: true),
        Column.Text<SampleFields>("tag", f => f.Tag, (f, v) => f.Tag = v),
        Column.Time<SampleFields>("takenAt", f => f.TakenAt, (f, v) => f.TakenAt = v),
        Column.Time<SampleFields>("receivedAt", f => f.ReceivedAt, (f, v) => f.ReceivedAt = v),
        Column.Text<SampleFields>("point", f => f.Point, (f, v) => f.Point = v),
        Column.Number<SampleFields>("oilTemperatureC", f => f.OilTemperatureC, (f, v) => f.OilTemperatureC = v),
        Column.Text<SampleFields>("method", f => f.Method, (f, v) => f.Method = v),
        Column.Number<SampleFields>("waterPpm", f => f.WaterPpm, (f, v) => f.WaterPpm = v),
        Column.Number<SampleFields>("waterActivity", f => f.WaterActivity, (f, v) => f.WaterActivity = v),
        Column.Number<SampleFields>("replicate", f => f.Replicate, (f, v) => f.Replicate = v, key: true),
        Column.Text<SampleFields>("analyst", f => f.Analyst, (f, v) => f.Analyst = v),
        Column.Text<SampleFields>("remark", f => f.Remark, (f, v) => f.Remark = v),
    ];

    public static readonly IReadOnlyList<Column<DrainFields>> Drains =
    [
        Column.Text<DrainFields>("tag", f => f.Tag, (f, v) => f.Tag = v, key: true),
        Column.Time<DrainFields>("drainedAt", f => f.DrainedAt, (f, v) => f.DrainedAt = v, key: true),
        Column.Number<DrainFields>("waterL", f => f.WaterL, (f, v) => f.WaterL = v),
        Column.Number<DrainFields>("oilL", f => f.OilL, (f, v) => f.OilL = v),
    ];

    public static readonly IReadOnlyList<Column<TopUpFields>> TopUps =
    [
        Column.Text<TopUpFields>("tag", f => f.Tag, (f, v) => f.Tag = v, key: true),
        Column.Time<TopUpFields>("addedAt", f => f.AddedAt, (f, v) => f.AddedAt = v, key: true),
        Column.Number<TopUpFields>("oilL", f => f.OilL, (f, v) => f.OilL = v),
        Column.Number<TopUpFields>("waterPpm", f => f.WaterPpm, (f, v) => f.WaterPpm = v),
    ];

    public static readonly IReadOnlyList<Column<SeparatorFields>> Separators =
    [
        Column.Text<SeparatorFields>("code", f => f.Code, (f, v) => f.Code = v, key: true),
        Column.Text<SeparatorFields>("tag", f => f.Tag, (f, v) => f.Tag = v),
        Column.Text<SeparatorFields>("kind", f => f.Kind, (f, v) => f.Kind = v),
        Column.Number<SeparatorFields>("flowLPerMin", f => f.FlowLPerMin, (f, v) => f.FlowLPerMin = v),
        Column.Number<SeparatorFields>("efficiency", f => f.Efficiency, (f, v) => f.Efficiency = v),
        Column.Number<SeparatorFields>("cutSizeUm", f => f.CutSizeUm, (f, v) => f.CutSizeUm = v),
        Column.Number<SeparatorFields>("pressureKPa", f => f.PressureKPa, (f, v) => f.PressureKPa = v),
        Column.Number<SeparatorFields>("oilTemperatureC", f => f.OilTemperatureC, (f, v) => f.OilTemperatureC = v),
        Column.Number<SeparatorFields>("capacityL", f => f.CapacityL, (f, v) => f.CapacityL = v),
        Column.Flag<SeparatorFields>("portable", f => f.Portable, (f, v) => f.Portable = v),
    ];

    public static readonly IReadOnlyList<Column<SeparatorRunFields>> Runs =
    [
        Column.Text<SeparatorRunFields>("separator", f => f.Separator, (f, v) => f.Separator = v, key: true),
        Column.Text<SeparatorRunFields>("tag", f => f.Tag, (f, v) => f.Tag = v),
        Column.Time<SeparatorRunFields>("startedAt", f => f.StartedAt, (f, v) => f.StartedAt = v, key: true),
        Column.Time<SeparatorRunFields>("endedAt", f => f.EndedAt, (f, v) => f.EndedAt = v),
    ];

    public static readonly IReadOnlyList<Column<ReadingFields>> Readings =
    [
        Column.Text<ReadingFields>("tag", f => f.Tag, (f, v) => f.Tag = v, key: true),
        Column.Time<ReadingFields>("readAt", f => f.ReadAt, (f, v) => f.ReadAt = v, key: true),
        Column.Number<ReadingFields>("oilTemperatureC", f => f.OilTemperatureC, (f, v) => f.OilTemperatureC = v),
        Column.Number<ReadingFields>("waterActivity", f => f.WaterActivity, (f, v) => f.WaterActivity = v),
    ];
}
