using Plant.Physics.Laboratory;

namespace Plant.Physics.Tests.Laboratory;

public sealed class RepeatabilityTests
{
    // ISO 12937 (from memory, unverified): 13.25, 26.50, 59.26 mg/kg
    [Theory]
    [InlineData(50, 13.25)]
    [InlineData(200, 26.50)]
    [InlineData(1000, 59.26)]
    public void AtPpm_Coulometric_IsIso12937(double ppm, double expected) => Checks.Within(expected, Of("kf-coulometric").AtPpm(ppm), 0.005);

    // ASTM D6304-16 by mass (from memory, unverified): r = 0.03813·X^0.6 with X in %: 36.47 mg/kg at 200
    [Fact]
    public void AtPpm_Evaporator_IsD6304InPercent() => Checks.Within(36.47, Of("kf-evaporator").AtPpm(200), 0.01);

    [Fact]
    public void Table_EveryRow_SaysWhatItRestsOn()
    {
        Assert.Equal(["kf-coulometric", "kf-evaporator", "kf-volumetric"], Repeatability.Table.Select(row => row.Method).Order());
        Assert.All(Repeatability.Table, row => Assert.Contains("unverified", row.Source, StringComparison.Ordinal));
    }

    [Fact]
    public void Of_UnknownMethod_IsNull() => Assert.Null(Repeatability.Of("crackle"));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(-1)]
    public void AtPpm_NotAContent_Throws(double ppm) => Assert.Throws<ArgumentOutOfRangeException>(() => Of("kf-coulometric").AtPpm(ppm));

    private static Repeatability Of(string method) => Assert.IsType<Repeatability>(Repeatability.Of(method));
}
