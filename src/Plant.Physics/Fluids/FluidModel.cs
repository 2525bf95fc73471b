using Plant.Physics.Water;

namespace Plant.Physics.Fluids;

/// <summary>A fluid whose properties can be asked at any temperature. What its sheet does not give is the family's default, and says so.</summary>
public sealed class FluidModel
{
    private readonly ViscosityTemperature viscosity;
    private readonly double density15KgM3;
    private readonly double expansionPerK;
    private readonly bool linearExpansion;
    private readonly double solubilityA;
    private readonly double solubilityB;

    private FluidModel(FluidSheet sheet)
    {
        Sheet = sheet;
        var defaults = FluidFamilyDefaults.Of(sheet.Family);
        ViscosityIsFamilyDefault = sheet.Viscosity40Mm2S is null || sheet.Viscosity100Mm2S is null;
        DensityIsFamilyDefault = sheet.Density15KgM3 is null;
        SolubilityIsFamilyDefault = sheet.SolubilityA is null;
        var (v40, v100) = ViscositiesMm2S(sheet, defaults);
        viscosity = ViscosityTemperature.Through(313.15, v40, 373.15, v100);
        density15KgM3 = sheet.Density15KgM3 ?? defaults.Density15KgM3;
        linearExpansion = sheet.ExpansionPerK is not null || defaults.ExpansionPerK is not null;
        expansionPerK = sheet.ExpansionPerK ?? defaults.ExpansionPerK ?? DensityTemperature.ExpansionPerK(
            sheet.Family == FluidFamily.Diesel ? DensityTemperature.FuelOil(density15KgM3) : DensityTemperature.LubricatingOil, density15KgM3);
        HasSaturation = (sheet.SolubilityA ?? defaults.SolubilityA) is not null;
        solubilityA = sheet.SolubilityA ?? defaults.SolubilityA ?? double.NaN;
        solubilityB = sheet.SolubilityA is null ? defaults.SolubilityB ?? double.NaN : sheet.SolubilityB!.Value;
    }

    /// <summary>The sheet it was made from.</summary>
    public FluidSheet Sheet { get; }

    /// <summary>Chemical family.</summary>
    public FluidFamily Family => Sheet.Family;

    /// <summary>False for a polyalkylene glycol without a curve: it takes up water without limit.</summary>
    public bool HasSaturation { get; }

    /// <summary>True where the solubility is the family's default.</summary>
    public bool SolubilityIsFamilyDefault { get; }

    /// <summary>True where a viscosity is assumed.</summary>
    public bool ViscosityIsFamilyDefault { get; }

    /// <summary>True where the density is the family's default.</summary>
    public bool DensityIsFamilyDefault { get; }

    /// <summary>Relative permittivity [1].</summary>
    public double RelativePermittivity => Sheet.RelativePermittivity ?? FluidFamilyDefaults.Of(Family).RelativePermittivity;

    /// <summary>Interfacial tension against water [N/m].</summary>
    public double InterfacialTensionNM => (Sheet.InterfacialTensionMNM ?? FluidFamilyDefaults.Of(Family).InterfacialTensionMNM) / 1000;

    /// <summary>Electrical conductivity [S/m].</summary>
    public double ConductivitySM => (Sheet.ConductivityPSM ?? FluidFamilyDefaults.Of(Family).ConductivityPSM) * 1e-12;

    /// <summary>Builds the model, or refuses what cannot be.</summary>
    /// <param name="sheet">What is known.</param>
    /// <param name="refusals">Receives a refusal for each value that cannot be.</param>
    /// <returns>The model; null where something was refused.</returns>
    public static FluidModel? TryCreate(FluidSheet sheet, List<Refusal> refusals)
    {
        ArgumentNullException.ThrowIfNull(sheet);
        ArgumentNullException.ThrowIfNull(refusals);
        var before = refusals.Count;
        Above(refusals, "isoVg", sheet.IsoVg, 0, 10_000, "mm²/s");
        Above(refusals, "viscosity40Mm2S", sheet.Viscosity40Mm2S, 0, 100_000, "mm²/s");
        Above(refusals, "viscosity100Mm2S", sheet.Viscosity100Mm2S, 0, 10_000, "mm²/s");
        Within(refusals, "density15KgM3", sheet.Density15KgM3, 500, 2000, "kg/m³");
        Within(refusals, "expansionPerK", sheet.ExpansionPerK, 0, 0.01, "1/K");
        Within(refusals, "solubilityA", sheet.SolubilityA, 0, 20, "");
        Within(refusals, "solubilityB", sheet.SolubilityB, -1000, 5000, "K");
        Above(refusals, "interfacialTensionMNM", sheet.InterfacialTensionMNM, 0, 80, "mN/m");
        Within(refusals, "relativePermittivity", sheet.RelativePermittivity, 1, 100, "");
        Within(refusals, "conductivityPSM", sheet.ConductivityPSM, 0, 1e15, "pS/m");
        Within(refusals, "demulsibilityMin", sheet.DemulsibilityMin, 0, 10_000, "min");
        Within(refusals, "waterLimitPpm", sheet.WaterLimitPpm, 0, 1e6, "mg/kg");
        if (sheet.SolubilityA is null != sheet.SolubilityB is null)
        {
            refusals.Add(new Refusal(sheet.SolubilityA is null ? "solubilityA" : "solubilityB", "", "solubilityA and solubilityB go together: give both or neither"));
        }

        if (refusals.Count == before)
        {
            var (v40, v100) = ViscositiesMm2S(sheet, FluidFamilyDefaults.Of(sheet.Family));
            if (v100 >= v40)
            {
                refusals.Add(new Refusal("viscosity100Mm2S", Text(v100), FormattableString.Invariant($"must be below viscosity40Mm2S ({v40}): oil thins when it warms")));
            }
        }

        return refusals.Count == before ? new FluidModel(sheet) : null;
    }

    /// <summary>Kinematic viscosity.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="working">Receives the step, or null.</param>
    /// <returns>Kinematic viscosity [m²/s].</returns>
    /// <remarks>Equation: ASTM D341 through the 40 and 100 °C points. Source: ASTM D341 (read). Valid for: cloud point to initial boiling point.</remarks>
    public double KinematicViscosityM2S(double temperatureK, Working? working = null)
    {
        var value = viscosity.AtMm2S(temperatureK);
        working?.Add("kinematic viscosity", FormattableString.Invariant($"log10 log10 Z = {viscosity.A:0.######} − {viscosity.B:0.######}·log10 {temperatureK:0.##} K"), value, "mm²/s",
            Citations.D341, ViscosityIsFamilyDefault ? "a viscosity of the fluid is assumed from its grade or family (from memory, unverified)" : null);
        return value * 1e-6;
    }

    /// <summary>Dynamic viscosity.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="working">Receives the steps, or null.</param>
    /// <returns>Dynamic viscosity [Pa·s].</returns>
    /// <remarks>Equation: ν·ρ. Source: definition. Valid for: as the viscosity and the density.</remarks>
    public double DynamicViscosityPaS(double temperatureK, Working? working = null)
    {
        var value = KinematicViscosityM2S(temperatureK, working) * DensityKgM3(temperatureK, working);
        working?.Add("dynamic viscosity", "kinematic viscosity × density", value * 1000, "mPa·s", "definition");
        return value;
    }

    /// <summary>Density.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="working">Receives the step, or null.</param>
    /// <returns>Density [kg/m³].</returns>
    /// <remarks>Equation: ρ15(1 − γ(t − 15)) where an expansion is given, else ρ15·VCF. Source: definition; ASTM D1250-80 (read). Valid for: about −20 to 150 °C.</remarks>
    public double DensityKgM3(double temperatureK, Working? working = null)
    {
        var delta = Guard.Positive(temperatureK) - Constants.ZeroCelsiusK - 15;
        var value = linearExpansion ? density15KgM3 * (1 - (expansionPerK * delta)) : density15KgM3 * DensityTemperature.VolumeCorrection(expansionPerK, temperatureK);
        working?.Add("density of the fluid",
            linearExpansion
                ? FormattableString.Invariant($"{density15KgM3}·(1 − {expansionPerK}·({delta:0.##} K))")
                : FormattableString.Invariant($"{density15KgM3}·exp(−αΔ(1 + 0.8αΔ)), α = {expansionPerK:0.######e0} 1/K, Δ = {delta:0.##} K"),
            value, "kg/m³", linearExpansion ? Citations.Expansion : Citations.D1250, DensityIsFamilyDefault ? "density is the family's default (from memory, unverified)" : null);
        return value;
    }

    /// <summary>Water that the fluid holds in solution.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="working">Receives the step, or null.</param>
    /// <returns>Saturation [mg/kg].</returns>
    /// <remarks>Equation: 10^(A − B/T). Source: as given for the fluid, else the family's default (from memory, unverified). Valid for: activity below about 0.9 and contents below about 2 %.</remarks>
    /// <exception cref="InvalidOperationException">The fluid has no saturation.</exception>
    public double SaturationPpm(double temperatureK, Working? working = null)
    {
        if (!HasSaturation)
        {
            throw new InvalidOperationException("the fluid takes up water without limit: it has no saturation");
        }

        var value = Math.Pow(10, solubilityA - (solubilityB / Guard.Positive(temperatureK)));
        working?.Add("saturation", FormattableString.Invariant($"10^({solubilityA} − {solubilityB}/{temperatureK:0.##} K)"), value, "mg/kg",
            SolubilityIsFamilyDefault ? Citations.FamilyDefault : Citations.Solubility, SolubilityIsFamilyDefault ? "solubility is the family's default: a factor of 1.5 either way" : null);
        return value;
    }

    /// <summary>Temperature at which a water content begins to fall out.</summary>
    /// <param name="waterPpm">Water content [mg/kg].</param>
    /// <returns>Haze temperature [K]; null where the content never falls out.</returns>
    /// <remarks>Equation: T = B/(A − log10 C). Source: the solubility curve. Valid for: contents below 10^A.</remarks>
    public double? HazeTemperatureK(double waterPpm)
    {
        if (!HasSaturation || waterPpm <= 0)
        {
            return null;
        }

        var temperature = solubilityB / (solubilityA - Math.Log10(Guard.Positive(waterPpm)));
        return temperature > 0 && double.IsFinite(temperature) ? temperature : null;
    }

    /// <summary>Density of water less density of the fluid.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Difference of densities [kg/m³]; positive where water sinks.</returns>
    /// <remarks>Equation: ρw − ρo. Source: Kell 1975 for water. Valid for: 0 to 120 °C.</remarks>
    public double DensityDifferenceKgM3(double temperatureK) => WaterProperties.DensityKgM3(temperatureK) - DensityKgM3(temperatureK);

    /// <summary>Which way undissolved water goes.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="working">Receives the step, or null.</param>
    /// <returns>Down, up, or neither where the densities are within 5 kg/m³.</returns>
    /// <remarks>Equation: sign of ρw − ρo. Source: common practice. Valid for: 0 to 120 °C.</remarks>
    public WaterDirection WaterGoes(double temperatureK, Working? working = null)
    {
        var difference = DensityDifferenceKgM3(temperatureK);
        working?.Add("density of water less density of the fluid", FormattableString.Invariant($"{WaterProperties.DensityKgM3(temperatureK):0.##} − {DensityKgM3(temperatureK):0.##}"),
            difference, "kg/m³", Citations.Kell, Math.Abs(difference) < Constants.NeutralDensityKgM3 ? "within 5 kg/m³: gravity does not separate them" : null);
        return Math.Abs(difference) < Constants.NeutralDensityKgM3 ? WaterDirection.Neither : difference > 0 ? WaterDirection.Down : WaterDirection.Up;
    }

    /// <summary>Temperature at which water and fluid weigh the same: on its cold side water floats, on its warm side it sinks.</summary>
    /// <returns>Inversion temperature [K]; null where there is none from 0 to 120 °C.</returns>
    /// <remarks>Equation: ρw(T) = ρo(T), by bisection. Source: Kell 1975 for water. Valid for: 0 to 120 °C.</remarks>
    public double? InversionTemperatureK()
    {
        const double coldK = Constants.ZeroCelsiusK;
        const double warmK = Constants.ZeroCelsiusK + 120;
        double low = coldK, high = warmK;
        if (DensityDifferenceKgM3(low) > 0 == DensityDifferenceKgM3(high) > 0)
        {
            return null;
        }

        var risesWithTemperature = DensityDifferenceKgM3(high) > 0;
        for (var i = 0; i < 60; i++)
        {
            var middle = 0.5 * (low + high);
            if (DensityDifferenceKgM3(middle) > 0 == risesWithTemperature)
            {
                high = middle;
            }
            else
            {
                low = middle;
            }
        }

        return 0.5 * (low + high);
    }

    private static (double V40, double V100) ViscositiesMm2S(FluidSheet sheet, FluidFamilyDefaults defaults)
    {
        var v40 = sheet.Viscosity40Mm2S ?? (sheet.IsoVg is { } grade ? IsoViscosityGrade.MidpointMm2S(grade) : null as double?);
        if (v40 is null)
        {
            return (sheet.Viscosity100Mm2S is { } only ? only * defaults.Viscosity40Mm2S / defaults.Viscosity100Mm2S : defaults.Viscosity40Mm2S,
                sheet.Viscosity100Mm2S ?? defaults.Viscosity100Mm2S);
        }

        return (v40.Value, sheet.Viscosity100Mm2S ?? Viscosity100Mm2S(v40.Value, defaults));
    }

    /// <summary>Viscosity at 100 °C of an oil with the family's typical viscosity index; where the index is not defined, with the family's slope.</summary>
    private static double Viscosity100Mm2S(double viscosity40Mm2S, FluidFamilyDefaults defaults)
    {
        double low = 2, high = viscosity40Mm2S;
        if (low >= high || ViscosityIndex.Of(viscosity40Mm2S, low) > defaults.ViscosityIndex)
        {
            var slope = ViscosityTemperature.Through(313.15, defaults.Viscosity40Mm2S, 373.15, defaults.Viscosity100Mm2S);
            var z40 = Math.Log10(Math.Log10(viscosity40Mm2S + 0.7));
            return Math.Max(0.3, Math.Pow(10, Math.Pow(10, z40 - (slope.B * (Math.Log10(373.15) - Math.Log10(313.15))))) - 0.7);
        }

        for (var i = 0; i < 50; i++)
        {
            var middle = 0.5 * (low + high);
            if (ViscosityIndex.Of(viscosity40Mm2S, middle) < defaults.ViscosityIndex)
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

    private static void Above(List<Refusal> refusals, string field, double? value, double low, double high, string unit)
    {
        if (value is { } number && !(number > low && number <= high))
        {
            refusals.Add(new Refusal(field, Text(number), FormattableString.Invariant($"must be above {low} and at most {high} {unit}").TrimEnd()));
        }
    }

    private static void Within(List<Refusal> refusals, string field, double? value, double low, double high, string unit)
    {
        if (value is { } number && !(number >= low && number <= high))
        {
            refusals.Add(new Refusal(field, Text(number), FormattableString.Invariant($"must lie between {low} and {high} {unit}").TrimEnd()));
        }
    }

    private static string Text(double value) => value.ToString("R", System.Globalization.CultureInfo.InvariantCulture);
}
