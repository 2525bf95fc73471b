namespace Skarrow;

/// <summary>The stories. Days count back from the end of the records; STORIES.md is written from this list.</summary>
public static class Stories
{
    public static readonly IReadOnlyList<Story> All = [.. Leaks(), .. Fluids(), .. Habits(), .. Sensors()];

    /// <summary>Reservoirs whose sampling stopped, and when.</summary>
    public static readonly IReadOnlyDictionary<string, double> SamplingStopped = new Dictionary<string, double>
    {
        ["PL-AGT-06"] = 205, ["PL-SCR-02"] = 96, ["WE-FAN-03"] = 88, ["WE-RDG-05"] = 140, ["DS-GBX-07"] = 118, ["DS-HOD-02"] = 232, ["CV-BAL-02"] = 103,
        ["CV-SHT-04"] = 171, ["CV-CMP-03"] = 77, ["PH-FAN-02"] = 109, ["PH-CNV-03"] = 241, ["TR-DST-06"] = 283,
    };

    public static Unit Apply(Unit unit)
    {
        unit = SamplingStopped.TryGetValue(unit.Tag, out var day) ? unit with { LastSampleDay = day } : unit;
        return All.Where(s => s.Tag == unit.Tag).Aggregate(unit, (changed, story) => story.Change(changed));
    }

    private static IEnumerable<Story> Leaks()
    {
        yield return new("DS-LUB-02", 73, "A cooler tube lets 12 L/day of cooling water in, from one day to the next; the sump fills.", "Ingress changed, dated to a few days; free water; drain every few weeks until the cooler is mended.") { Change = u => u with { Leaks = [new(73, 0, 12_000, 12_000)], SuctionMm = 150, CapacityL = 550 } };
        yield return new("DS-LUB-04", 402, "The same on the sister station a year earlier; plugged after a month, then dried with VD-01.", "Past history: the ingress of today is the usual one.") { Change = u => u with { Leaks = [new(402, 371, 9_000, 9_000)] } };
        yield return new("PH-TG-01", 330, "A gland seal wears: steam condenses in the oil, 25 g/day at first, 2 kg/day now.", "Ingress grows; the oil passed its limit; drains bring more each month.") { Change = u => u with { Leaks = [new(330, 0, 25, 2_000)], CapacityL = 160 } };
        yield return new("WE-PRS-02", 118, "The desiccant breather is spent as the wet season begins: the tank breathes the mist of the wet end.", "Water rises without a leak; free when cold; a new breather and an absorbent or vacuum treatment.") { Change = u => u with { BreatherFailsDay = 118 } };
        yield return new("WE-LUB-02", 262, "Water comes in steadily, the oil is at saturation: its trend is flat. Nobody has drained for five months.", "Flat is not calm: settled water is near its capacity, drain at once.") { Change = u => u with { Leaks = [new(262, 0, 4_200, 4_200)], LastDrainDay = 146 } };
        yield return new("PL-WSH-02", null, "Hosing down reaches the vent of the gearbox.", "Free water, a litre or so a drain; raise and shield the vent.") { Change = u => u with { Leaks = [new(731, 0, 45, 45)], DrainDays = 30, SuctionMm = 60, CapacityL = 3.5 } };
        yield return new("PH-CRU-01", 210, "Rain runs down the shaft of a crusher that stands outside over the weekend.", "Free water in a thick, cold oil that gives it up slowly.") { Change = u => u with { Leaks = [new(210, 0, 60, 110)], CapacityL = 12 } };
        yield return new("CV-CMP-02", 520, "A compressor loafs too cool and drops condensate into its oil.", "Free water; drain weekly, raise the running temperature.") { Change = u => u with { OperatingC = 58, Leaks = [new(520, 0, 28, 34)], DrainDays = 21, CapacityL = 1.8 } };
        yield return new("PL-PUL-03", 155, "Stuffing box spray gets past the shaft seal.", "Free water, ingress changed in the summer.") { Change = u => u with { Leaks = [new(155, 0, 180, 180)], DrainDays = 30 } };
        yield return new("WE-VAC-01", null, "Seal water gets past the labyrinth of a vacuum pump gearbox, a little every day.", "Free water, steady; a drain every few weeks keeps it.") { Change = u => u with { Leaks = [new(731, 0, 62, 62)], DrainDays = 30, SuctionMm = 40, CapacityL = 4 } };
        yield return new("PH-BFP-03", 300, "Gland steam condenses in a feed pump's oil; the operators drain it monthly.", "Free water; the interval follows from the drained volumes.") { Change = u => u with { Leaks = [new(300, 0, 170, 220)], SuctionMm = 60, CapacityL = 14 } };
        yield return new("PH-BFP-04", 64, "A seal-water line seeps into a bearing housing.", "Ingress changed lately; still dissolved when hot, falls out when cold.") { Change = u => u with { Leaks = [new(64, 0, 1.6, 1.6)] } };
    }

    private static IEnumerable<Story> Fluids()
    {
        yield return new("WE-VAC-03", 200, "An old charge with a low interfacial tension (6.5 mN/m) holds its water as a tight emulsion.", "Water far above saturation but drains bring nothing: draining and coalescers cannot help, vacuum can.") { Change = u => u with { Fluid = "GEAR-320-T", Clearing = 0.1, FineShare = 0.75, DrainDays = 30, Leaks = [new(200, 0, 6, 8)] } };
        yield return new("PH-AHT-01", 260, "A heavy polyglycol: water is lighter than the oil and floats.", "Water goes up: skim, do not drain; capacity is a layer of 25 mm.") { Change = u => u with { Leaks = [new(260, 0, 24, 24)], DrainDays = 60, SuctionMm = 45 } };
        yield return new("DS-GBX-05", 190, "A polyglycol of about water's density: water sinks when hot and hangs or rises when cold (inversion near 25 °C).", "Which way water goes turns between running and standing; do not rely on settling.") { Change = u => u with { Leaks = [new(190, 0, 42, 42)] } };
        yield return new("PH-AHT-02", null, "A water-soluble polyglycol without a solubility on its sheet.", "No saturation: unknown, with that reason; judge by the limit alone.") { Change = u => u with { Leaks = [new(500, 0, 2.5, 2.5)] } };
        yield return new("PH-EHC-01", 240, "The phosphate ester control fluid takes water from a seeping cooler: above its limit, far below saturation.", "Dissolved only; dehydrate (vacuum) before it hydrolyses.") { Change = u => u with { Leaks = [new(240, 0, 5, 5)] } };
        yield return new("TR-MAIN-02", 430, "A transformer's gasket lets moisture in.", "Slow rise to its limit of 25 mg/kg; a date for drying.") { Change = u => u with { Leaks = [new(430, 0, 0.3, 0.6)] } };
        yield return new("TR-NES-02", 420, "A natural ester that holds ten times what mineral oil would.", "Many mg/kg, and dry; the limit is what counts.") { Change = u => u with { Leaks = [new(420, 0, 0.9, 0.9)] } };
        yield return new("TR-SIL-01", 330, "A silicone-filled unit with a tired seal.", "Near saturation when cold.") { Change = u => u with { Leaks = [new(330, 0, 0.45, 0.45)], SampleDays = 91 } };
        yield return new("PH-DG-01", 380, "Rain finds the vent of a standby diesel day tank; nobody has drained it for eight months.", "Free water under the fuel of an engine that must start: drain now.") { Change = u => u with { SettledAtStartL = 2, Leaks = [new(380, 0, 55, 55)], CapacityL = 10, LastDrainDay = 165 } };
        yield return new("TF-DSL-01", null, "A bulk tank breathes moist air by an open vent, summer and winter.", "Free water at the bottom, a few litres a quarter.") { Change = u => u with { SettledAtStartL = 6, Leaks = [new(731, 0, 110, 110)], CapacityL = 24 } };
    }

    private static IEnumerable<Story> Habits()
    {
        yield return new("PL-REF-03", 52, "A bottle was not clean: one result near 900 mg/kg between calm ones.", "One doubtful result, kept and not believed; it changes no date.") { Change = u => u with { DirtyBottleDay = 52, SampleDays = 28 } };
        yield return new("CV-WND-03", 45, "Commissioned lately; no sample was ever taken.", "Unknown: nothing to go by; take a sample.") { Change = u => u with { SampleDays = 0 } };
        yield return new("CV-BAL-03", null, "A cold hall and free weekends: water falls out every Saturday and is taken up again on Monday.", "Dry when running, free when cold.") { Change = u => u with { Fill = 0.85, ColdestC = 8, RhPercent = 65 } };
        yield return new("WE-FAN-03", 88, "Nobody has sampled it for three months; eleven others are in the same state.", "Sample overdue.") { Change = u => u };
    }

    private static IEnumerable<Story> Sensors()
    {
        yield return new("WE-PRS-04", 38, "An online sensor gives the same activity for weeks while the temperature goes on moving.", "A stuck sensor; the bottle disagrees.") { Change = u => u with { Sensor = (420, 4), SensorSticksDay = 38, Leaks = [new(60, 0, 25, 45)] } };
        foreach (var (tag, from, hours) in new[] { ("DS-LUB-02", 330.0, 4), ("PH-TG-01", 410, 4), ("PH-TG-02", 410, 4), ("WE-LUB-02", 300, 4), ("WE-PRS-01", 240, 4), ("PH-EHC-02", 365, 6), ("TR-MAIN-01", 540, 6), ("PH-BFP-02", 120, 2) })
        {
            yield return new(tag, from, $"Online activity sensor, a reading every {hours} h.", "Sensor and bottles must tell one story.") { Change = u => u with { Sensor = (from, hours) } };
        }
    }
}
