namespace Skarrow;

/// <summary>What dries and cleans oil in the mill, and when it ran. A rig for mineral oil never meets the control fluid.</summary>
public static class Separators
{
    public static readonly IReadOnlyList<SeparatorSheet> All =
    [
        new("VD-01", null, "vacuum-dehydrator") { FlowLPerMin = 45, Efficiency = 0.75, PressureKPa = 5, OilTemperatureC = 60 },
        new("VD-02", null, "vacuum-dehydrator") { FlowLPerMin = 25, Efficiency = 0.7, PressureKPa = 6, OilTemperatureC = 62 },
        new("VD-03", "PH-EHC-02", "vacuum-dehydrator") { FlowLPerMin = 8, Efficiency = 0.6, PressureKPa = 4, OilTemperatureC = 55 },
        new("CO-01", "PH-TG-02", "coalescer") { FlowLPerMin = 90, Efficiency = 0.9, CutSizeUm = 10 },
        new("CF-01", "DS-LUB-01", "centrifuge") { FlowLPerMin = 60, Efficiency = 0.8, CutSizeUm = 6, OilTemperatureC = 65 },
        new("AB-01", null, "absorbent") { FlowLPerMin = 20, Efficiency = 0.6, CapacityL = 9 },
        new("AB-02", null, "absorbent") { FlowLPerMin = 20, CapacityL = 9 },
        new("EC-01", "TF-DSL-02", "electrostatic-coalescer") { FlowLPerMin = 40, Efficiency = 0.85, CutSizeUm = 3 },
        new("DA-01", "WE-FAN-01", "dry-air-purge") { FlowLPerMin = 30 },
    ];

    /// <summary>Days before the end of the records.</summary>
    public static readonly IReadOnlyList<Run> Runs =
    [
        new("CO-01", "PH-TG-02", 641, null),
        new("CF-01", "DS-LUB-01", 592, 322),
        new("CF-01", "DS-LUB-01", 298, null),
        new("DA-01", "WE-FAN-01", 412, null),
        new("VD-03", "PH-EHC-02", 655, 640),
        new("VD-03", "PH-EHC-02", 320, 306),
        new("EC-01", "TF-DSL-02", 402, 400.5),
        new("EC-01", "TF-DSL-02", 121, 119),
        new("VD-01", "WE-PRS-01", 611, 608),
        new("VD-01", "DS-LUB-04", 369, 362),
        new("VD-01", "WE-LUB-03", 297, 292),
        new("VD-01", "WE-LUB-01", 101, 96),
        new("VD-01", "PL-REF-01", 3.2, null),
        new("VD-02", "PL-REF-02", 512, 510),
        new("VD-02", "CV-BAL-01", 233, 231.5),
        new("VD-02", "PH-BFP-03", 48, 46),
        new("AB-01", "PL-WSH-01", 355, 353),
        new("AB-01", "WE-VAC-05", 82, 80),
        new("AB-02", "WE-VAC-03", 64, 61),
    ];

    public static IReadOnlyList<(SeparatorSheet Sheet, Run Run)> On(string tag) =>
        [.. Runs.Where(r => r.Tag == tag).Select(r => (All.First(s => s.Code == r.Separator), r))];
}
