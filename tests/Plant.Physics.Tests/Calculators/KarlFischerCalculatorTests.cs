using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

public sealed class KarlFischerCalculatorTests
{
    // worked by hand: (412.5 − 6.0·3.5 − 18.0)/5.000 = 74.70; ISO 12937 (from memory) r = 1.874·√74.7
    [Fact]
    public void Compute_OneTitration_IsTheHandCalculation()
    {
        var result = Requests.Done(KarlFischerCalculator.Compute(new KarlFischerRequest([new(5, 412.5, null, 6, 3.5, 18)], "kf-coulometric")));
        Checks.Within(74.70, result.WaterPpm, 1e-9);
        Checks.Within(1.874 * Math.Sqrt(74.7), result.RepeatabilityPpm, 1e-9);
        Checks.Within(1.874 * Math.Sqrt(74.7) / 2.7718, result.StandardUncertaintyPpm, 1e-9);
        Assert.True(result.WithinRepeatability);
        Requests.ShowsItsWorking(result.Working);
    }

    // 4.000 C titrate 373.430 µg
    [Fact]
    public void Compute_FromCharge_IsFaraday() =>
        Checks.Within(373.43044, Requests.Done(KarlFischerCalculator.Compute(new KarlFischerRequest([new(1, null, 4, null, null, null)], "kf-coulometric"))).WaterPpm, 1e-5);

    // r at 200 mg/kg is 26.50; two results may differ by r, three by 1.1958 r
    [Theory]
    [InlineData("187,213", true)]
    [InlineData("186,214", false)]
    [InlineData("185,200,215", true)]
    [InlineData("184,200,216", false)]
    public void Compute_Replicates_AreHeldAgainstTheCriticalRange(string contents, bool within)
    {
        var replicates = contents.Split(',').Select(text => (TitrationRequest?)new TitrationRequest(1, double.Parse(text, System.Globalization.CultureInfo.InvariantCulture), null, null, null, null)).ToList();
        var result = Requests.Done(KarlFischerCalculator.Compute(new KarlFischerRequest(replicates, "kf-coulometric")));
        Checks.Within(200, result.WaterPpm, 1e-9);
        Assert.Equal(within, result.WithinRepeatability);
        Assert.Equal(replicates.Count, result.ReplicatePpm.Count);
        Assert.Equal(!within, result.Working.Any(step => step.Flag is not null));
        Checks.Near(26.502 / 2.7718 / Math.Sqrt(replicates.Count), result.StandardUncertaintyPpm, 1e-4);
    }

    [Theory]
    [InlineData(null)]
    [InlineData("crackle")]
    [InlineData("activity-sensor")]
    public void Compute_MethodWithoutTitration_IsRefusedWithTheCodes(string? method)
    {
        var result = KarlFischerCalculator.Compute(new KarlFischerRequest([new(1, 100, null, null, null, null)], method));
        Assert.Equal("method", Requests.Refused(result));
        Assert.Contains("kf-evaporator", result.Refusals[0].Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Compute_NoReplicates_IsRefused()
    {
        Assert.Equal("replicates", Requests.Refused(KarlFischerCalculator.Compute(new KarlFischerRequest([], "kf-coulometric"))));
        Assert.Equal("replicates", Requests.Refused(KarlFischerCalculator.Compute(new KarlFischerRequest(null, "kf-coulometric"))));
        Assert.Equal("replicates[0]", Requests.Refused(KarlFischerCalculator.Compute(new KarlFischerRequest([null], "kf-coulometric"))));
    }

    [Theory]
    [InlineData(null, 100.0, null, 0.0, 0.0, "sampleG")]
    [InlineData(0.0, 100.0, null, 0.0, 0.0, "sampleG")]
    [InlineData(1.0, null, null, 0.0, 0.0, "waterUg")]
    [InlineData(1.0, 100.0, 1.0, 0.0, 0.0, "waterUg")]
    [InlineData(1.0, double.NaN, null, 0.0, 0.0, "waterUg")]
    [InlineData(1.0, null, -1.0, 0.0, 0.0, "chargeC")]
    [InlineData(1.0, 100.0, null, -1.0, 0.0, "driftUgPerMin")]
    [InlineData(1.0, 100.0, null, 0.0, double.NaN, "blankUg")]
    [InlineData(1.0, 100.0, null, 0.0, 101.0, "waterUg")]
    public void Compute_BadField_IsRefusedByPlaceAndName(double? sample, double? water, double? charge, double? drift, double? blank, string field) =>
        Assert.Equal($"replicates[1].{field}",
            Requests.Refused(KarlFischerCalculator.Compute(new KarlFischerRequest([new(1, 100, null, null, null, null), new(sample, water, charge, drift, 1, blank)], "kf-coulometric"))));
}
