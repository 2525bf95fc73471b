using Plant.Physics.Laboratory;

namespace Plant.Physics.Tests.Laboratory;

public sealed class KarlFischerTests
{
    // M/(2F) with CODATA's F: 93.35761 µg/C
    [Fact]
    public void MicrogramPerCoulomb_Faraday_IsTheConstant()
    {
        Checks.Near(18.01528e6 / (2 * 96485.33212), KarlFischer.MicrogramPerCoulomb, 1e-8);
        Checks.Near(Checks.Of("kf").Number("ug_per_C"), KarlFischer.MicrogramPerCoulomb, 1e-8);
        Checks.Within(373.430, KarlFischer.WaterUg(4), 5e-4);
        Checks.Within(2.240583, KarlFischer.WaterUg(0.4 * 60) / 1000, 1e-6);
    }

    // worked by hand: (412.5 − 6.0·3.5 − 18.0)/5.000 and an oven run (612 − 9.0·6 − 45)/2.013
    [Theory]
    [InlineData(412.5, 6.0, 3.5, 18.0, 5.0, 74.70)]
    [InlineData(612, 9.0, 6, 45, 2.013, 254.844)]
    [InlineData(100, 0, 0, 0, 1, 100)]
    [InlineData(10, 6, 3.5, 0, 1, -11)]
    public void ContentPpm_Titrations_IsNetOverMass(double water, double drift, double minutes, double blank, double mass, double expected) =>
        Checks.Within(expected, KarlFischer.ContentPpm(water, drift, minutes, blank, mass), 5e-4);

    // ISO 5725-6: studentised range with infinite degrees of freedom, 95 %, recomputed apart from this code
    [Theory]
    [InlineData(2, 2.7718)]
    [InlineData(3, 3.3145)]
    [InlineData(4, 3.6332)]
    [InlineData(5, 3.8577)]
    [InlineData(6, 4.0301)]
    [InlineData(7, 4.1696)]
    [InlineData(8, 4.2863)]
    [InlineData(9, 4.3865)]
    [InlineData(10, 4.4741)]
    public void CriticalRangePpm_Replicates_IsTheFactor(int count, double factor) => Checks.Near(factor, KarlFischer.CriticalRangePpm(2.7718, count), 1e-9);

    // ISO 12937 (from memory, unverified): r = 1.874·√w, so u = r/2.7718
    [Theory]
    [InlineData("kf-coulometric", 200, 1, 9.5615)]
    [InlineData("kf-coulometric", 200, 2, 6.7610)]
    [InlineData("kf-volumetric", 200, 1, 19.123)]
    [InlineData("kf-evaporator", 200, 1, 13.158)]
    public void StandardUncertaintyPpm_Methods_IsRepeatabilityOverTheFactor(string method, double ppm, int count, double expected) =>
        Checks.Near(expected, KarlFischer.StandardUncertaintyPpm(method, ppm, count), 1e-3);

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    public void StandardUncertaintyPpm_VeryDry_DoesNotVanish(double ppm) => Assert.Equal(KarlFischer.SmallestPpm, KarlFischer.StandardUncertaintyPpm("kf-coulometric", ppm, 1));

    [Fact]
    public void StandardUncertaintyPpm_UnknownMethod_IsTheWidest() =>
        Assert.Equal(KarlFischer.StandardUncertaintyPpm("kf-volumetric", 100, 1), KarlFischer.StandardUncertaintyPpm("crackle", 100, 1));

    [Property]
    public Property StandardUncertaintyPpm_MoreWaterFewerReplicates_IsWider() => Prop.ForAll(Inputs.OneOf("kf-coulometric", "kf-volumetric", "kf-evaporator"), Inputs.Logarithmic(20, 20_000), (method, ppm) =>
        KarlFischer.StandardUncertaintyPpm(method, ppm * 1.1, 1) > KarlFischer.StandardUncertaintyPpm(method, ppm, 1)
        && KarlFischer.StandardUncertaintyPpm(method, ppm, 3) < KarlFischer.StandardUncertaintyPpm(method, ppm, 2));

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => KarlFischer.WaterUg(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => KarlFischer.ContentPpm(double.NaN, 0, 0, 0, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => KarlFischer.ContentPpm(1, 0, 0, 0, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => KarlFischer.ContentPpm(1, -1, 0, 0, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => KarlFischer.CriticalRangePpm(-1, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => KarlFischer.StandardUncertaintyPpm("kf-coulometric", double.NaN, 1));
    }
}
