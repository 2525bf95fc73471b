using Plant.Physics;
using Plant.Physics.Calculators;
using Plant.Physics.Fluids;
using Plant.Physics.Laboratory;
using Plant.Physics.Separators;
using Plant.Physics.Tanks;

namespace Plant.Web.Features.Calculators;

/// <summary>All calculators, in the order of the work.</summary>
public static class CalculatorCatalogue
{
    private static readonly CalculatorField[] Fluid =
    [
        new("fluid.family", "Fluid family", "", "mineral", Code.All<FluidFamily>()),
        new("fluid.viscosity40Mm2S", "Viscosity at 40 °C", "mm²/s", "46"),
        new("fluid.viscosity100Mm2S", "Viscosity at 100 °C", "mm²/s", "6.8"),
        new("fluid.density15KgM3", "Density at 15 °C", "kg/m³", "870"),
        new("fluid.solubilityA", "Solubility A", ""),
        new("fluid.solubilityB", "Solubility B", "K"),
        new("fluid.interfacialTensionMNM", "Interfacial tension", "mN/m"),
    ];

    private static readonly CalculatorField Temperature = new("temperatureC", "Oil temperature", "°C", "50");
    private static readonly CalculatorField Sizes = new("dropletUm", "Droplet diameters", "µm", "5 10 20 30 40 50 60 80 100 150 200", List: true);

    /// <summary>The calculators.</summary>
    public static IReadOnlyList<CalculatorSpec> All { get; } =
    [
        CalculatorSpec.Of<FluidStateRequest, FluidStateResponse>(FluidStateCalculator.Compute, "fluid-state", "Fluid at a temperature",
            "Viscosity, density, what it holds, and which way water goes in it.", [.. Fluid, Temperature],
            [
                new("kinematicViscosityMm2S", "Kinematic viscosity", "mm²/s"), new("dynamicViscosityMPaS", "Dynamic viscosity", "mPa·s"), new("densityKgM3", "Density of the oil", "kg/m³"),
                new("waterDensityKgM3", "Density of water", "kg/m³"), new("densityDifferenceKgM3", "Water − oil", "kg/m³"), new("saturationPpm", "Saturation", "mg/kg"), new("waterGoes", "Water goes", ""),
                new("inversionTemperatureC", "Water turns at", "°C"),
            ],
            new("temperatureC", "oil temperature, °C", "saturationPpm", "saturation", "mg/kg", 0, 100)),
        CalculatorSpec.Of<WaterSplitRequest, WaterSplitResponse>(WaterSplitCalculator.Compute, "water-split", "Dissolved and undissolved",
            "What of the water is dissolved while running and after a cold stand.",
            [.. Fluid, Temperature, new("coldestTemperatureC", "Coldest temperature", "°C", "15"), new("waterPpm", "Water content", "mg/kg", "180"), new("standardUncertaintyPpm", "Its standard uncertainty", "mg/kg", "10")],
            [
                new("dissolvedPpm", "Dissolved", "mg/kg"), new("undissolvedPpm", "Undissolved", "mg/kg"), new("saturationPpm", "Saturation", "mg/kg"), new("waterActivity", "Activity", ""), new("probabilityFree", "Chance of free water", ""),
                new("dissolvedPpmAtColdest", "Dissolved when cold", "mg/kg"), new("undissolvedPpmAtColdest", "Falls out when cold", "mg/kg"), new("saturationPpmAtColdest", "Saturation when cold", "mg/kg"),
                new("waterActivityAtColdest", "Activity when cold", ""), new("probabilityFreeAtColdest", "Chance of free water when cold", ""),
            ],
            new("waterPpm", "water content, mg/kg", "probabilityFree", "chance of free water", "", 0, 600)),
        CalculatorSpec.Of<SettlingRequest, SettlingResponse>(SettlingCalculator.Compute, "settling", "Settling of drops",
            "How fast drops sink or rise, and how long they take.",
            [.. Fluid, Temperature, Sizes, new("depthMm", "Depth", "mm", "500"), new("waterVolumeFraction", "Share of water by volume", "", "0.001"), new("mobileInterface", "Mobile interface", "", "false", ["false", "true"])],
            [], new("dropletUm", "droplet diameter, µm", "velocityMmPerS", "velocity, positive down", "mm/s")),
        CalculatorSpec.Of<TankRequest, TankResponse>(TankCalculator.Compute, "tank", "Separation in a tank",
            "Depth, residence time, cut size and what of the drops stays behind.",
            [
                .. Fluid, Temperature, new("shape", "Shape", "", "rectangular", Code.All<TankShape>()), new("lengthMm", "Length", "mm", "2000"), new("widthMm", "Width", "mm", "1200"), new("heightMm", "Height", "mm", "1000"),
                new("oilVolumeL", "Oil volume", "L", "1800"), new("circulationLPerMin", "Circulation", "L/min", "200"), new("tanksInSeries", "Tanks in series", "", "3"),
                new("dropletMedianUm", "Median droplet", "µm", "50"), new("geometricDeviation", "Geometric deviation", "", "1.8"),
            ],
            [new("oilDepthMm", "Depth of the oil", "mm"), new("surfaceAreaM2", "Surface", "m²"), new("residenceTimeMin", "Residence time", "min"), new("cutSizeUm", "Cut size", "µm"), new("removalFraction", "Removed in one pass", "")],
            new("circulationLPerMin", "circulation, L/min", "removalFraction", "removed in one pass", "", 10, 1000)),
        CalculatorSpec.Of<CoalescenceRequest, CoalescenceResponse>(request => CoalescenceCalculator.Compute(request, default), "coalescence", "Growth and settling of drops",
            "How a haze clears while it stands: drops meet, grow and settle.",
            [
                .. Fluid, Temperature, new("waterVolumeFraction", "Share of water by volume", "", "0.0005"), new("dropletMedianUm", "Median droplet by volume", "µm", "10"), new("geometricDeviation", "Geometric deviation", "", "1.8"),
                new("depthMm", "Depth", "mm", "500"), new("hours", "Time", "h", "24"), new("shearRatePerS", "Shear rate", "1/s", "5"), new("collisionEfficiency", "Collision efficiency", "", "0.1"),
                new("fieldKVPerCm", "Electric field", "kV/cm", "0"), new("cells", "Cells", "", "60"),
            ],
            [new("massErrorFraction", "Water lost by the computation", "")], new("timesS", "time, s", "suspendedFraction", "share still suspended", "")),
        CalculatorSpec.Of<CoalescerRequest, CoalescerResponse>(CoalescerCalculator.Compute, "coalescer", "Fibre coalescer",
            "What a bed of fibres catches, and the pressure that it takes. Dissolved water passes.",
            [
                .. Fluid, Temperature, new("faceVelocityMmPerS", "Face velocity", "mm/s", "2"), new("fibreUm", "Fibre diameter", "µm", "10"), new("solidity", "Solidity", "", "0.1"), new("thicknessMm", "Thickness", "mm", "10"),
                new("dropletUm", "Droplet diameters", "µm", "0.5 1 1.5 2 3 4 5 7 10", List: true), new("stages", "Stages", "", "1"),
            ],
            [new("pressureDropKPa", "Pressure drop, clean", "kPa")], new("dropletUm", "droplet diameter, µm", "removalFraction", "removed", "")),
        CalculatorSpec.Of<ScreenRequest, ScreenResponse>(ScreenCalculator.Compute, "screen", "Separator screen",
            "The pressure at which drops are pushed through a pore.",
            [new("interfacialTensionMNM", "Interfacial tension", "mN/m", "30"), new("contactAngleDeg", "Contact angle through the water", "°", "140"), new("poreUm", "Largest pore", "µm", "30")],
            [new("breakthroughKPa", "Breakthrough pressure", "kPa"), new("waterWets", "Water wets it", "")],
            new("poreUm", "pore, µm", "breakthroughKPa", "breakthrough pressure", "kPa", 5, 100)),
        CalculatorSpec.Of<ElectricFieldRequest, ElectricFieldResponse>(ElectricFieldCalculator.Compute, "electric-field", "Drops in an electric field",
            "Attraction of two drops, and the field that tears them. Never in a vapour space.",
            [.. Fluid, Temperature, new("dropletUm", "Droplet diameter", "µm", "100"), new("gapUm", "Gap", "µm", "20"), new("fieldKVPerCm", "Field", "kV/cm", "2")],
            [new("attractionN", "Attraction", "N"), new("criticalFieldKVPerCm", "Field that tears the drop", "kV/cm"), new("electricCapillaryNumber", "Electric capillary number", ""), new("breaksUp", "Drop breaks up", "")],
            new("gapUm", "gap, µm", "attractionN", "attraction", "N", 2, 100)),
        CalculatorSpec.Of<DryDownRequest, DryDownResponse>(DryDownCalculator.Compute, "dry-down", "Drying a reservoir",
            "How long a separator takes, and where it ends with the water that comes in.",
            [
                .. Fluid, new("oilVolumeL", "Oil volume", "L", "1800"), new("startPpm", "Water at the start", "mg/kg", "300"), new("targetPpm", "Target", "mg/kg", "100"), new("ingressGPerDay", "Ingress", "g/day", "20"),
                new("kind", "Method", "", "vacuum-dehydrator", Code.All<DryingMethod>()), new("flowLPerMin", "Flow of oil (of air for a purge)", "L/min", "20"), new("efficiency", "Efficiency of a pass", "", "0.7"),
                new("pressureKPa", "Absolute pressure", "kPa", "5"), new("oilTemperatureC", "Oil temperature in it", "°C", "60"), new("coldestTemperatureC", "Coldest temperature", "°C", "15"),
            ],
            [new("hoursToTarget", "Time to the target", "h"), new("floorPpm", "Floor with the ingress", "mg/kg"), new("freeWhenCold", "Water still falls out when cold", "")],
            new("timesH", "time, h", "waterPpm", "water content", "mg/kg")),
        CalculatorSpec.Of<KarlFischerRequest, KarlFischerResponse>(KarlFischerCalculator.Compute, "karl-fischer", "Karl Fischer titration",
            "Content, repeatability and uncertainty of a result with its duplicate.",
            [
                new("method", "Method", "", "kf-coulometric", [.. Repeatability.Table.Select(r => r.Method)]), new("replicates.0.sampleG", "Mass 1", "g", "2.013"), new("replicates.0.waterUg", "Water 1", "µg", "448.2"),
                new("replicates.0.blankUg", "Blank 1", "µg", "18"), new("replicates.1.sampleG", "Mass 2", "g", "1.987"), new("replicates.1.waterUg", "Water 2", "µg", "437"), new("replicates.1.blankUg", "Blank 2", "µg", "18"),
            ],
            [new("waterPpm", "Water content", "mg/kg"), new("repeatabilityPpm", "Repeatability", "mg/kg"), new("withinRepeatability", "The two agree", ""), new("standardUncertaintyPpm", "Standard uncertainty", "mg/kg")]),
        CalculatorSpec.Of<BearingLifeRequest, BearingLifeResponse>(BearingLifeCalculator.Compute, "bearing-life", "Bearing life",
            "Life of a rolling bearing against that at 100 mg/kg of water.", [new("waterPpm", "Water content", "mg/kg", "214")], [new("relativeLife", "Relative life", "")],
            new("waterPpm", "water content, mg/kg", "relativeLife", "relative life", "", 25, 400)),
    ];

    /// <summary>One of them; null where there is none of this code.</summary>
    public static CalculatorSpec? Find(string code) => All.FirstOrDefault(c => c.Code == code);
}
