namespace Skarrow;

/// <summary>What the mill has, area by area.</summary>
public static class Kinds
{
    private static readonly string[] Vented = ["open"];
    private static readonly string[] Mixed = ["open", "desiccant"];
    private static readonly string[] Dried = ["desiccant", "sealed"];
    private static readonly string[] Closed = ["sealed"];

    public static readonly IReadOnlyList<Kind> All = [.. PulpLine(), .. WetEnd(), .. DryerSection(), .. Converting(), .. PowerHouse(), .. TankFarm(), .. Transformers()];

    private static IEnumerable<Kind> PulpLine()
    {
        const string Area = "Pulp line";
        yield return new("PL-REF", 4, Area, "Refiner lubrication unit", "refiner bearing lubrication") { Fluids = ["TURB-68"], Breathers = Mixed, OilL = (400, 1100), OperatingC = (45, 52), ColdestC = (13, 18), Rh = (50, 65), TurnoverMin = 8, DrainDays = 30, Fill = 0.16, Criticality = 4 };
        yield return new("PL-PUL", 4, Area, "Pulper gearbox", "pulper gearbox") { Fluids = ["GEAR-320"], Breathers = Vented, OilL = (260, 480), OperatingC = (52, 62), ColdestC = (11, 16), Rh = (60, 75), TurnoverMin = 6, DrainDays = 60, Fill = 0.2 };
        yield return new("PL-AGT", 8, Area, "Stock chest agitator gearbox", "agitator gearbox") { Fluids = ["GEAR-320", "SYN-G220"], Breathers = Mixed, OilL = (35, 90), OperatingC = (42, 52), ColdestC = (10, 15), Rh = (55, 70), SampleDays = 91, Criticality = 2, HasSuction = false };
        yield return new("PL-SCR", 3, Area, "Reject press hydraulics", "reject press hydraulics") { Fluids = ["HYD-46"], Breathers = Mixed, OilL = (250, 500), OperatingC = (42, 50), ColdestC = (14, 18), Rh = (50, 65), TurnoverMin = 4, DrainDays = 60 };
        yield return new("PL-PMP", 4, Area, "Medium-consistency pump", "stock pump bearing bath") { Fluids = ["TURB-68"], Breathers = Vented, Shape = "horizontal-cylinder", OilL = (18, 35), OperatingC = (50, 58), ColdestC = (14, 18), Rh = (50, 65), SampleDays = 91, Fill = 0.2, HasSuction = false };
        yield return new("PL-WSH", 3, Area, "Washer drive gearbox", "washer drive gearbox") { Fluids = ["GEAR-460"], Breathers = Vented, OilL = (110, 190), OperatingC = (48, 55), ColdestC = (12, 16), Rh = (60, 75), Fill = 0.25, DrainDays = 60, Criticality = 3, HasSuction = false };
    }

    private static IEnumerable<Kind> WetEnd()
    {
        const string Area = "Wet end";
        yield return new("WE-PRS", 4, Area, "Press section hydraulics", "press section hydraulics") { Fluids = ["HYD-46", "HYD-46", "EST-H46"], Breathers = Mixed, OilL = (1800, 3200), OperatingC = (45, 52), ColdestC = (17, 20), Rh = (50, 60), TurnoverMin = 4, DrainDays = 30, Criticality = 4 };
        yield return new("WE-LUB", 3, Area, "Wet end circulating lubrication", "wet end circulating lubrication") { Fluids = ["CIRC-220"], Breathers = Vented, OilL = (5500, 9500), OperatingC = (50, 56), ColdestC = (16, 20), Rh = (55, 65), TurnoverMin = 25, DrainDays = 30, Fill = 0.22, Criticality = 5 };
        yield return new("WE-VAC", 6, Area, "Vacuum pump gearbox", "vacuum pump gearbox") { Fluids = ["GEAR-320", "SYN-G220"], Breathers = Mixed, OilL = (120, 220), OperatingC = (55, 64), ColdestC = (14, 18), Rh = (50, 65), TurnoverMin = 6, DrainDays = 91 };
        yield return new("WE-FAN", 4, Area, "Fan pump drive", "fan pump gearbox") { Fluids = ["SYN-G220"], Breathers = Dried, OilL = (150, 240), OperatingC = (54, 60), ColdestC = (15, 18), Rh = (50, 60), TurnoverMin = 6, Criticality = 5 };
        yield return new("WE-RDG", 6, Area, "Roll drive gearbox", "roll drive gearbox") { Fluids = ["GEAR-320"], Breathers = Vented, OilL = (70, 140), OperatingC = (52, 60), ColdestC = (14, 18), Rh = (60, 75), SampleDays = 45, Fill = 0.2, HasSuction = false };
        yield return new("WE-SHW", 3, Area, "Shower water pump", "shower pump bearing bath") { Fluids = ["TURB-68"], Breathers = Vented, Shape = "horizontal-cylinder", OilL = (12, 22), OperatingC = (44, 50), ColdestC = (15, 18), Rh = (55, 65), SampleDays = 91, Fill = 0.2, Criticality = 2, HasSuction = false };
    }

    private static IEnumerable<Kind> DryerSection()
    {
        const string Area = "Dryer section";
        yield return new("DS-LUB", 4, Area, "Dryer lubrication station", "dryer circulating lubrication") { Fluids = ["CIRC-220"], Breathers = Vented, OilL = (8500, 14500), OperatingC = (58, 64), ColdestC = (18, 22), Rh = (40, 55), TurnoverMin = 30, DrainDays = 30, Fill = 0.15, Criticality = 5 };
        yield return new("DS-GBX", 10, Area, "Dryer group drive", "dryer drive gearbox") { Fluids = ["GEAR-320", "SYN-G220", "GEAR-320", "SYN-G220", "PAG-220"], Breathers = Vented, OilL = (90, 260), OperatingC = (62, 72), ColdestC = (17, 22), Rh = (40, 55), TurnoverMin = 8 };
        yield return new("DS-HOD", 4, Area, "Hood exhaust fan", "fan bearing bath") { Fluids = ["TURB-46"], Breathers = Vented, Shape = "horizontal-cylinder", OilL = (15, 40), OperatingC = (55, 62), ColdestC = (17, 21), Rh = (40, 55), SampleDays = 91, Criticality = 2, HasSuction = false };
        yield return new("DS-HYD", 3, Area, "Calender hydraulics", "calender hydraulics") { Fluids = ["HYD-46"], Breathers = Dried, OilL = (1100, 2400), OperatingC = (46, 52), ColdestC = (18, 21), Rh = (40, 50), TurnoverMin = 4, DrainDays = 60, Criticality = 4 };
    }

    private static IEnumerable<Kind> Converting()
    {
        const string Area = "Converting";
        yield return new("CV-SLT", 3, Area, "Slitter hydraulics", "slitter hydraulics") { Fluids = ["EST-H46", "HYD-46"], Breathers = Mixed, OilL = (380, 900), OperatingC = (44, 50), ColdestC = (14, 17), Rh = (40, 50), TurnoverMin = 4, Rhythm = Rhythm.Weekdays };
        yield return new("CV-WND", 3, Area, "Winder hydraulics", "winder hydraulics") { Fluids = ["HYD-46"], Breathers = Mixed, OilL = (600, 1200), OperatingC = (45, 50), ColdestC = (14, 17), Rh = (40, 50), TurnoverMin = 4, Rhythm = Rhythm.Weekdays, Criticality = 4 };
        yield return new("CV-SHT", 5, Area, "Sheeter gearbox", "sheeter gearbox") { Fluids = ["SYN-G220", "PAG-220"], Breathers = Vented, OilL = (45, 120), OperatingC = (48, 58), ColdestC = (13, 17), Rh = (40, 50), SampleDays = 60, Rhythm = Rhythm.Weekdays, HasSuction = false };
        yield return new("CV-BAL", 4, Area, "Baler hydraulics", "baler hydraulics") { Fluids = ["HYD-46"], Breathers = Vented, OilL = (550, 1300), OperatingC = (44, 50), ColdestC = (8, 13), Rh = (50, 65), TurnoverMin = 4, DrainDays = 91, Rhythm = Rhythm.Weekdays, Criticality = 2 };
        yield return new("CV-PAL", 4, Area, "Palletiser gearbox", "palletiser gearbox") { Fluids = ["GEAR-320"], Breathers = Closed, OilL = (25, 60), OperatingC = (38, 45), ColdestC = (14, 17), SampleDays = 91, Rhythm = Rhythm.Weekdays, Criticality = 1, HasSuction = false };
        yield return new("CV-CMP", 4, Area, "Screw compressor", "screw compressor") { Fluids = ["SYN-C46"], Breathers = Closed, Shape = "vertical-cylinder", OilL = (80, 190), OperatingC = (74, 82), ColdestC = (14, 18), Rh = (50, 60), TurnoverMin = 1.5, Fill = 0.3, DrainDays = 30, Criticality = 4 };
    }

    private static IEnumerable<Kind> PowerHouse()
    {
        const string Area = "Power house";
        yield return new("PH-TG", 2, Area, "Turbine main oil tank", "steam turbine lubrication") { Fluids = ["TURB-46"], Breathers = Vented, OilL = (7000, 10500), OperatingC = (50, 54), ColdestC = (18, 21), Rh = (40, 50), TurnoverMin = 8, DrainDays = 30, Criticality = 5, Rhythm = Rhythm.PowerHouse };
        yield return new("PH-EHC", 2, Area, "Turbine control fluid unit", "turbine control") { Fluids = ["FR-46"], Breathers = Dried, OilL = (620, 900), OperatingC = (46, 50), ColdestC = (19, 22), Rh = (40, 50), TurnoverMin = 6, Fill = 0.1, Criticality = 5, Rhythm = Rhythm.PowerHouse };
        yield return new("PH-BFP", 4, Area, "Boiler feed pump", "feed pump lubrication") { Fluids = ["TURB-46"], Breathers = Mixed, OilL = (420, 820), OperatingC = (48, 55), ColdestC = (17, 20), Rh = (40, 55), TurnoverMin = 6, DrainDays = 30, Fill = 0.18, Criticality = 5, Rhythm = Rhythm.PowerHouse };
        yield return new("PH-FAN", 4, Area, "Boiler fan lubrication unit", "fan lubrication") { Fluids = ["TURB-68"], Breathers = Mixed, OilL = (160, 320), OperatingC = (42, 50), ColdestC = (10, 15), Rh = (45, 60), TurnoverMin = 6, DrainDays = 91, Criticality = 4, Rhythm = Rhythm.PowerHouse };
        yield return new("PH-CRU", 2, Area, "Bark crusher gearbox", "crusher gearbox") { Fluids = ["GEAR-460"], Breathers = Vented, OilL = (320, 450), OperatingC = (50, 58), ColdestC = (2, 6), Rh = (60, 75), TurnoverMin = 8, DrainDays = 60, Rhythm = Rhythm.Weekdays };
        yield return new("PH-CNV", 6, Area, "Bark conveyor gearbox", "conveyor gearbox") { Fluids = ["GEAR-460", "SYN-G220"], Breathers = Vented, OilL = (22, 65), OperatingC = (40, 50), ColdestC = (0, 4), Rh = (60, 80), SampleDays = 91, Criticality = 2, HasSuction = false };
        yield return new("PH-AHT", 2, Area, "Air heater drive", "air heater gearbox") { Fluids = ["PAG-320", "PAG-W460"], Breathers = Vented, OilL = (55, 110), OperatingC = (62, 70), ColdestC = (14, 18), Rh = (45, 60), SampleDays = 60, Rhythm = Rhythm.PowerHouse, HasSuction = false };
        yield return new("PH-DG", 2, Area, "Standby diesel day tank", "standby diesel day tank") { Fluids = ["DIESEL"], Breathers = Vented, Shape = "vertical-cylinder", OilL = (900, 1400), OperatingC = (17, 19), ColdestC = (10, 13), Rh = (45, 60), DrainDays = 91, SampleDays = 91, Fill = 0.1, Criticality = 5, Rhythm = Rhythm.Standing };
    }

    private static IEnumerable<Kind> TankFarm()
    {
        const string Area = "Tank farm";
        yield return new("TF-DSL", 3, Area, "Diesel bulk tank", "diesel bulk storage") { Fluids = ["DIESEL"], Breathers = ["open", "desiccant", "desiccant"], Shape = "horizontal-cylinder", OilL = (18000, 38000), OperatingC = (10, 11), ColdestC = (2, 3), Rh = (55, 70), DrainDays = 91, SampleDays = 91, Fill = 0.02, Criticality = 3, Rhythm = Rhythm.Standing };
        yield return new("TF-FPD", 2, Area, "Fire pump diesel tank", "fire pump day tank") { Fluids = ["DIESEL"], Breathers = Dried, Shape = "horizontal-cylinder", OilL = (700, 1100), OperatingC = (12, 14), ColdestC = (5, 7), Rh = (55, 65), DrainDays = 91, SampleDays = 91, Fill = 0.05, Criticality = 5, Rhythm = Rhythm.Standing };
        yield return new("TF-NEW", 4, Area, "New oil tank", "new oil storage") { Fluids = ["TURB-46", "HYD-46", "CIRC-220", "GEAR-320"], Breathers = ["desiccant"], Shape = "vertical-cylinder", OilL = (3500, 9000), OperatingC = (16, 20), ColdestC = (9, 12), Rh = (50, 60), DrainDays = 182, SampleDays = 91, Fill = 0.03, Criticality = 2, Rhythm = Rhythm.Standing };
        yield return new("TF-UNL", 4, Area, "Unloading pump gearbox", "unloading pump gearbox") { Fluids = ["SYN-G220"], Breathers = Closed, OilL = (12, 30), OperatingC = (12, 18), ColdestC = (2, 6), SampleDays = 182, Fill = 0.08, Criticality = 1, Rhythm = Rhythm.Standing, HasSuction = false };
    }

    private static IEnumerable<Kind> Transformers()
    {
        const string Area = "Transformers";
        yield return new("TR-MAIN", 2, Area, "Main transformer", "main transformer") { Fluids = ["TRAF-10"], Breathers = ["desiccant"], OilL = (17000, 24000), OperatingC = (50, 56), ColdestC = (12, 16), Rh = (30, 40), SampleDays = 91, Fill = 0.08, Criticality = 5, Rhythm = Rhythm.Always, HasSuction = false, LimitPpm = 25 };
        yield return new("TR-DST", 10, Area, "Distribution transformer", "distribution transformer") { Fluids = ["TRAF-10"], Breathers = ["sealed", "desiccant"], OilL = (900, 3800), OperatingC = (44, 54), ColdestC = (10, 18), SampleDays = 182, Fill = 0.06, Rhythm = Rhythm.Always, HasSuction = false, LimitPpm = 40 };
        yield return new("TR-NES", 2, Area, "Ester-filled transformer", "indoor transformer") { Fluids = ["NE-36"], Breathers = Closed, OilL = (1400, 2200), OperatingC = (48, 54), ColdestC = (15, 18), SampleDays = 182, Fill = 0.06, Criticality = 4, Rhythm = Rhythm.Always, HasSuction = false };
        yield return new("TR-SIL", 2, Area, "Silicone-filled transformer", "indoor transformer") { Fluids = ["SIL-50"], Breathers = Closed, OilL = (1100, 1600), OperatingC = (46, 52), ColdestC = (15, 18), SampleDays = 182, Fill = 0.12, Criticality = 4, Rhythm = Rhythm.Always, HasSuction = false };
    }
}
