using MathNet.Numerics;

namespace Plant.Physics.Ingress;

/// <summary>Where separated water came from, by Bayes' rule over its tracers.</summary>
public static class WaterOrigin
{
    /// <summary>Least weight of the class "other" before anything is measured [1].</summary>
    public const double LeastOther = 0.02;

    /// <summary>Most that a single tracer may say for one source against another [1]: one odd measurement decides nothing alone.</summary>
    public const double MostByOneTracer = 100;

    // below these, in the tracer's unit, a result says only "less than" (judgement)
    private static readonly Dictionary<WaterTracer, double> DetectionLimits = new()
    {
        [WaterTracer.Sodium] = 0.1, [WaterTracer.Chloride] = 0.5, [WaterTracer.Hardness] = 1, [WaterTracer.Glycol] = 100, [WaterTracer.Boron] = 0.05, [WaterTracer.Conductivity] = 1,
    };

    private static readonly WaterSource Unlisted = WaterSource.AnyOther(0);

    /// <summary>Bayes' rule.</summary>
    /// <param name="priors">Weights before [1], at least one above 0.</param>
    /// <param name="likelihoods">Likelihoods [1], one a weight.</param>
    /// <returns>Probabilities, in the same order.</returns>
    /// <remarks>Equation: p·L/Σ p·L. Source: Bayes' rule. Valid for: sources that exclude each other; a mixture is shared among its parts.</remarks>
    public static IReadOnlyList<double> Posterior(IReadOnlyList<double> priors, IReadOnlyList<double> likelihoods)
    {
        ArgumentNullException.ThrowIfNull(priors);
        ArgumentNullException.ThrowIfNull(likelihoods);
        if (priors.Count != likelihoods.Count)
        {
            throw new ArgumentException("there must be one likelihood a prior", nameof(likelihoods));
        }

        var weights = priors.Zip(likelihoods, (prior, likelihood) => Guard.NotNegative(prior) * Guard.NotNegative(likelihood)).ToList();
        var total = Guard.Positive(weights.Sum(), nameof(priors));
        return [.. weights.Select(weight => weight / total)];
    }

    /// <summary>Judges separated water.</summary>
    /// <param name="measured">Tracers measured in the water; what is missing says nothing.</param>
    /// <param name="sources">The sources in question; "other" is added where it is missing.</param>
    /// <param name="newOil">Tracers that water takes up from the new oil (its additives hold sodium, boron, calcium), or null; taken off first.</param>
    /// <param name="working">Receives the steps, or null.</param>
    /// <returns>Probabilities, in the order of the sources, with "other".</returns>
    /// <remarks>Equation: prior × product of lognormal likelihoods, each tracer held to a factor of 100. Source: Bayes' rule; ranges and priors are judgement. Valid for: one source at a time, tracers that are independent.</remarks>
    public static IReadOnlyList<SourceProbability> Judge(
        IReadOnlyDictionary<WaterTracer, double> measured, IReadOnlyList<WaterSource> sources, IReadOnlyDictionary<WaterTracer, double>? newOil = null, Working? working = null)
    {
        ArgumentNullException.ThrowIfNull(measured);
        ArgumentNullException.ThrowIfNull(sources);
        var all = WithOther(sources);
        var likelihoods = Enumerable.Repeat(1.0, all.Count).ToArray();
        foreach (var (tracer, value) in measured.OrderBy(pair => pair.Key))
        {
            var net = Math.Max(0, Guard.NotNegative(value) - Guard.NotNegative(newOil?.GetValueOrDefault(tracer) ?? 0));
            var single = all.Select(source => LogLikelihood(tracer, net, source)).ToArray();
            for (var i = 0; i < likelihoods.Length; i++)
            {
                likelihoods[i] *= Math.Exp(Math.Max(single[i] - single.Max(), -Math.Log(MostByOneTracer)));
            }

            working?.Add($"{Code.Of(tracer)} speaks most for", all[Array.IndexOf(single, single.Max())].Name, net, tracer == WaterTracer.Conductivity ? "µS/cm" : "mg/L", Citations.Bayes,
                net < DetectionLimits[tracer] ? "below detection: counts as less than the limit" : null);
        }

        var posterior = Posterior([.. all.Select(source => source.Prior)], likelihoods);
        var result = all.Zip(posterior, (source, probability) => new SourceProbability(source.Name, probability)).ToList();
        foreach (var (source, probability) in result)
        {
            working?.Add($"probability of {source}", "prior × likelihoods, normalised", probability, "1", Citations.Bayes, "priors and ranges are judgement: put the plant's own waters in");
        }

        return result;
    }

    /// <summary>The sources with weights that sum to 1, "other" among them with its least weight.</summary>
    private static List<WaterSource> WithOther(IReadOnlyList<WaterSource> sources)
    {
        var all = sources.Any(source => source.Name == WaterSource.Other) ? sources : [.. sources, WaterSource.AnyOther(0)];
        var listed = all.Where(source => source.Name != WaterSource.Other).Sum(source => Guard.NotNegative(source.Prior));
        var other = all.Where(source => source.Name == WaterSource.Other).Sum(source => Guard.NotNegative(source.Prior));
        var share = listed + other == 0 ? 1 : Math.Max(LeastOther, other / (listed + other));
        return [.. all.Select(source => source with { Prior = source.Name == WaterSource.Other ? share : listed == 0 ? 0 : source.Prior / listed * (1 - share) })];
    }

    private static double LogLikelihood(WaterTracer tracer, double value, WaterSource source)
    {
        // a source that expects nothing of a tracer is judged as the class "other"
        var range = source.Ranges.TryGetValue(tracer, out var own) ? own : Unlisted.Ranges[tracer];
        var spread = Math.Log(Guard.Between(range.GeometricDeviation, 1.01, 1e4));
        var limit = DetectionLimits[tracer];
        var z = Math.Log(Math.Max(value, limit) / Guard.Positive(range.Median)) / spread;
        return value < limit ? Math.Log(0.5 * SpecialFunctions.Erfc(-z / Math.Sqrt(2))) : (-0.5 * z * z) - Math.Log(spread * Math.Sqrt(2 * Math.PI));
    }
}
