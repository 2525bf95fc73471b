using System.Globalization;
using Plant.Physics.Laboratory;

namespace Plant.Physics.Calculators;

/// <summary>One titration.</summary>
/// <param name="SampleG">Mass of the sample [g].</param>
/// <param name="WaterUg">Mass of water found [µg], or</param>
/// <param name="ChargeC">charge passed [C].</param>
/// <param name="DriftUgPerMin">Drift [µg/min].</param>
/// <param name="Minutes">Duration [min].</param>
/// <param name="BlankUg">Blank [µg].</param>
public sealed record TitrationRequest(double? SampleG, double? WaterUg, double? ChargeC, double? DriftUgPerMin, double? Minutes, double? BlankUg);

/// <summary>Asks for the result of a titration with its replicates.</summary>
/// <param name="Replicates">The titrations.</param>
/// <param name="Method">Code of the method.</param>
public sealed record KarlFischerRequest(IReadOnlyList<TitrationRequest?>? Replicates, string? Method);

/// <summary>Result of a titration with its replicates.</summary>
/// <param name="WaterPpm">Mean [mg/kg].</param>
/// <param name="ReplicatePpm">Each replicate [mg/kg].</param>
/// <param name="RepeatabilityPpm">Repeatability of the method at the mean [mg/kg].</param>
/// <param name="WithinRepeatability">True where the replicates agree; a single one has nothing to disagree with.</param>
/// <param name="StandardUncertaintyPpm">Standard uncertainty of the mean [mg/kg].</param>
/// <param name="Working">How it came about.</param>
public sealed record KarlFischerResponse(
    double WaterPpm, IReadOnlyList<double> ReplicatePpm, double RepeatabilityPpm, bool WithinRepeatability, double StandardUncertaintyPpm, IReadOnlyList<WorkingStep> Working);

/// <summary>Karl Fischer arithmetic.</summary>
public static class KarlFischerCalculator
{
    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<KarlFischerResponse> Compute(KarlFischerRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var table = request.Method is null ? null : Repeatability.Of(request.Method);
        if (table is null)
        {
            refusals.Add(new Refusal("method", request.Method ?? "", $"must be one of {string.Join(", ", Repeatability.Table.Select(row => row.Method))}"));
        }

        if (request.Replicates is null || request.Replicates.Count is 0 or > 10)
        {
            refusals.Add(new Refusal("replicates", (request.Replicates?.Count ?? 0).ToString(CultureInfo.InvariantCulture), "must hold 1 to 10 titrations"));
        }

        var working = new Working();
        var contents = (request.Replicates ?? []).Select((titration, index) => Content(titration, index, refusals, working)).ToList();
        if (refusals.Count > 0 || table is null)
        {
            return new(null, refusals);
        }

        var mean = contents.Average();
        var repeatability = table.AtPpm(mean);
        var range = contents.Max() - contents.Min();
        var critical = KarlFischer.CriticalRangePpm(repeatability, contents.Count);
        var within = contents.Count < 2 || range <= critical;
        var uncertainty = KarlFischer.StandardUncertaintyPpm(table.Method, mean, contents.Count);
        working.Add("mean", "mean of the replicates", mean, "mg/kg", "definition");
        working.Add("repeatability", FormattableString.Invariant($"{table.Coefficient:0.####}·{mean:0.###}^{table.Power}"), repeatability, "mg/kg", table.Source);
        working.Add("range", FormattableString.Invariant($"largest − smallest; accepted up to {critical:0.##} mg/kg for {contents.Count}"), range, "mg/kg", "ISO 5725-6 (studentised range)",
            within ? null : "the replicates differ by more than the method's repeatability: titrate again");
        working.Add("standard uncertainty", FormattableString.Invariant($"max(r/2.7718, {KarlFischer.SmallestPpm} mg/kg)/√{contents.Count}"), uncertainty, "mg/kg", table.Source);
        return new(new KarlFischerResponse(mean, contents, repeatability, within, uncertainty, working.Steps), []);
    }

    private static double Content(TitrationRequest? titration, int index, List<Refusal> refusals, Working working)
    {
        string Field(string name) => string.Create(CultureInfo.InvariantCulture, $"replicates[{index}].{name}");
        if (titration is null)
        {
            refusals.Add(new Refusal(string.Create(CultureInfo.InvariantCulture, $"replicates[{index}]"), "", "is empty: give sampleG and waterUg or chargeC"));
            return 0;
        }

        var mass = refusals.Within(Field("sampleG"), titration.SampleG, 0, 10_000, "g", openLow: true);
        if (titration.WaterUg is null == titration.ChargeC is null)
        {
            refusals.Add(new Refusal(Field("waterUg"), titration.WaterUg?.ToString("R", CultureInfo.InvariantCulture) ?? "", "exactly one of waterUg and chargeC must be given"));
            return 0;
        }

        var water = titration.WaterUg is not null
            ? refusals.Within(Field("waterUg"), titration.WaterUg, 0, 1e9, "µg")
            : refusals.Within(Field("chargeC"), titration.ChargeC, 0, 1e7, "C") * KarlFischer.MicrogramPerCoulomb;
        var drift = refusals.Within(Field("driftUgPerMin"), titration.DriftUgPerMin ?? 0, 0, 1e6, "µg/min");
        var minutes = refusals.Within(Field("minutes"), titration.Minutes ?? 0, 0, 10_000, "min");
        var blank = refusals.Within(Field("blankUg"), titration.BlankUg ?? 0, 0, 1e9, "µg");
        if (double.IsNaN(mass + water + drift + minutes + blank))
        {
            return 0;
        }

        var content = KarlFischer.ContentPpm(water, drift, minutes, blank, mass);
        if (content < 0)
        {
            refusals.Add(new Refusal(Field("waterUg"), water.ToString("R", CultureInfo.InvariantCulture),
                string.Create(CultureInfo.InvariantCulture, $"is less than drift and blank together ({(drift * minutes) + blank:0.##} µg): measure the blank again")));
        }

        working.Add(string.Create(CultureInfo.InvariantCulture, $"replicate {index + 1}"),
            string.Create(CultureInfo.InvariantCulture, $"({water:0.###} µg − {drift}·{minutes} − {blank})/{mass} g"), content, "mg/kg",
            titration.ChargeC is null ? "common practice" : Citations.Faraday);
        return content;
    }
}
