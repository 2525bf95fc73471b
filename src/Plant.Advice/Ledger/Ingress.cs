namespace Plant.Advice.Ledger;

/// <summary>How fast water comes in.</summary>
/// <param name="MedianGPerDay">Median [g/day].</param>
/// <param name="Low90GPerDay">Lower end of the 90 % interval [g/day].</param>
/// <param name="High90GPerDay">Upper end of the 90 % interval [g/day].</param>
/// <param name="ChangedAt">When it changed (UTC), or null.</param>
/// <param name="EarlierGPerDay">What it was before the change [g/day], or null.</param>
/// <param name="Intervals">Number of intervals that speak of the present rate [1].</param>
public sealed record Ingress(double MedianGPerDay, double Low90GPerDay, double High90GPerDay, DateTime? ChangedAt, double? EarlierGPerDay, int Intervals)
{
    private const int Cells = 120;
    private const double LowestPpmPerDay = 0.01;
    private const double HighestPpmPerDay = 20_000;

    // an interval's own rate scatters about the mean rate: weather, load, washing down
    private const double Scatter = 0.35;

    // between samples water may have settled unseen in a cold stand: a higher rate is less unlikely than a lower one
    private const double UnseenScatter = 1.5;

    // what all intervals share (humidity exchange, drain efficiency, solubility) does not average out: so many count in full
    private const double MostIntervals = 4;

    // a change is believed at odds that keep false alarms to about one in a reservoir's twenty years
    private const double ChangeLogLikelihood = 7;
    private const double ChangeRatio = 2.5;

    /// <summary>Posterior of the rate over a grid of its logarithm: prior times the likelihood of each interval since the last change.</summary>
    /// <param name="intervals">Balances in order.</param>
    /// <param name="massKg">Mass of the oil [kg].</param>
    /// <returns>The estimate.</returns>
    public static Ingress Estimate(IReadOnlyList<BalanceInterval> intervals, double massKg)
    {
        ArgumentNullException.ThrowIfNull(intervals);
        var (start, changedAt, earlier) = LastChange(intervals);
        Span<double> weight = stackalloc double[Cells];
        var step = Math.Log(HighestPpmPerDay / LowestPpmPerDay) / (Cells - 1);
        var scale = massKg / 1000;
        var highest = double.NegativeInfinity;
        var trust = Trust(intervals, start);
        for (var cell = 0; cell < Cells; cell++)
        {
            var ppmPerDay = LowestPpmPerDay * Math.Exp(step * cell);
            var z = Math.Log(ppmPerDay / Priors.IngressPpmPerDay) / Priors.IngressLogSd;
            var log = -0.5 * z * z;
            for (var i = start; i < intervals.Count; i++)
            {
                log += trust[i - start] * LogLikelihood(intervals[i], ppmPerDay * scale);
            }

            weight[cell] = log;
            highest = Math.Max(highest, log);
        }

        var total = 0.0;
        for (var cell = 0; cell < Cells; cell++)
        {
            weight[cell] = Math.Exp(weight[cell] - highest);
            total += weight[cell];
        }

        double At(ReadOnlySpan<double> w, double p)
        {
            var sum = 0.0;
            for (var cell = 0; cell < Cells; cell++)
            {
                var next = sum + (w[cell] / total);
                if (next >= p)
                {
                    var inside = w[cell] > 0 ? (p - sum) / (w[cell] / total) : 0.5;
                    return scale * LowestPpmPerDay * Math.Exp(step * (cell - 0.5 + inside));
                }

                sum = next;
            }

            return scale * HighestPpmPerDay;
        }

        return new Ingress(At(weight, 0.5), At(weight, 0.05), At(weight, 0.95), changedAt, earlier, intervals.Count - start);
    }

    /// <summary>The same after a surge: between what it was and the most that the surge may be.</summary>
    /// <param name="surge">The surge.</param>
    /// <returns>The estimate.</returns>
    public Ingress Surged(Surge surge)
    {
        ArgumentNullException.ThrowIfNull(surge);
        return new Ingress(Math.Sqrt(MedianGPerDay * surge.GPerDay), MedianGPerDay, Math.Max(High90GPerDay, surge.GPerDay * 2), surge.From, MedianGPerDay, Intervals);
    }

    /// <summary>Old intervals say less of today: half a year halves their weight; and so many count in full at most.</summary>
    private static double[] Trust(IReadOnlyList<BalanceInterval> intervals, int start)
    {
        var trust = new double[intervals.Count - start];
        var sum = 0.0;
        for (var i = 0; i < trust.Length; i++)
        {
            trust[i] = Math.Pow(0.5, (intervals[^1].To - intervals[start + i].To).TotalDays / 180);
            sum += trust[i];
        }

        for (var i = 0; i < trust.Length && sum > MostIntervals; i++)
        {
            trust[i] *= MostIntervals / sum;
        }

        return trust;
    }

    private static double LogLikelihood(BalanceInterval interval, double rateGPerDay)
    {
        var own = interval.SdGPerDay * interval.SdGPerDay;
        var scatter = Scatter * rateGPerDay;
        var variance = own + (scatter * scatter);
        var distance = interval.IngressGPerDay - rateGPerDay;
        if (interval.LowerBoundOnly)
        {
            // water may have settled unseen: only a rate below what the oil took up is unlikely
            return distance > 0 ? -0.5 * Math.Min(distance * distance / variance, 25) : 0;
        }

        var unseen = UnseenScatter * rateGPerDay;
        var square = distance * distance / (interval.SettledLPerDay is null && distance < 0 ? own + (unseen * unseen) : variance);
        // Student's t with 4 degrees of freedom: one odd interval does not decide
        return (-2.5 * Math.Log(1 + (square / 4))) - (0.5 * Math.Log(variance));
    }

    private static (int Start, DateTime? At, double? Earlier) LastChange(IReadOnlyList<BalanceInterval> intervals)
    {
        var best = 0.0;
        var at = 0;
        double before = 0, after = 0;
        var rates = new (double Value, double Weight)[intervals.Count];
        for (var i = 0; i < rates.Length; i++)
        {
            rates[i] = LogRate(intervals[i]);
        }

        var whole = LogMean(rates);
        for (var cut = 3; cut <= rates.Length - 2; cut++)
        {
            var first = LogMean(rates.AsSpan(0, cut));
            var second = LogMean(rates.AsSpan(cut));
            var gain = 0.5 * (whole.Loss - first.Loss - second.Loss);
            if (gain > best && Math.Exp(Math.Abs(second.Mean - first.Mean)) > ChangeRatio)
            {
                best = gain;
                at = cut;
                (before, after) = (first.Mean, second.Mean);
            }
        }

        return best > ChangeLogLikelihood && after > before ? (at, intervals[at].From.AddDays(0.5 * Math.Min(30, intervals[at].Days)), Math.Exp(before)) : (0, null, null);
    }

    /// <summary>Mean of the logarithms and the loss about it.</summary>
    private static (double Mean, double Loss) LogMean(ReadOnlySpan<(double Value, double Weight)> rates)
    {
        double weights = 0, sum = 0;
        foreach (var (value, weight) in rates)
        {
            weights += weight;
            sum += value * weight;
        }

        var mean = sum / weights;
        var loss = 0.0;
        foreach (var (value, weight) in rates)
        {
            loss += Math.Min((value - mean) * (value - mean) * weight, 16);
        }

        return (mean, loss);
    }

    private static (double Value, double Weight) LogRate(BalanceInterval interval)
    {
        var floor = Math.Max(1, interval.SdGPerDay);
        var rate = Math.Max(interval.IngressGPerDay, 0) + floor;
        var own = interval.SdGPerDay / rate;
        return (Math.Log(rate), 1 / ((Scatter * Scatter) + (own * own)));
    }
}
