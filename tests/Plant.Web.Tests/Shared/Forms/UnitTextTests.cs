using Plant.Web.Shared.Forms;

namespace Plant.Web.Tests.Shared.Forms;

public sealed class UnitTextTests
{
    [Theory]
    [InlineData("55 gal", "L", 208.197648)] // NIST SP 811: 1 gal (US) = 3.785 411 784 L
    [InlineData("0.2 m3", "L", 200)]
    [InlineData("200", "L", 200)]
    [InlineData("140 F", "°C", 60)]
    [InlineData("140°F", "°C", 60)]
    [InlineData("333.15 K", "°C", 60)]
    [InlineData("−5", "°C", -5)]
    [InlineData("4 ft", "mm", 1219.2)]
    [InlineData("1,5", "mm", 1.5)]
    [InlineData("0.03 %", "ppm", 300)]
    public void TryRead_NumberWithAUnit_IsConverted(string text, string unit, double expected)
    {
        Assert.True(UnitText.TryRead(text, unit, out var value, out var remedy));
        Assert.Equal(expected, value!.Value, 1e-6);
        Assert.Null(remedy);
    }

    [Theory]
    [InlineData("about 200", "L", "not understood")]
    [InlineData("1,234", "L", "without a thousands separator")]
    [InlineData("1.234,5", "L", "without a thousands separator")]
    [InlineData("60 bar", "°C", "bar is no unit of this field")]
    [InlineData("5 kg", "L", "kg is no unit of this field")]
    public void TryRead_TypicalMistake_IsToldHowToMendIt(string text, string unit, string remedy)
    {
        Assert.False(UnitText.TryRead(text, unit, out var value, out var told));
        Assert.Null(value);
        Assert.Contains(remedy, told, StringComparison.Ordinal);
    }

    [Fact]
    public void TryRead_NothingTyped_IsNotKnown()
    {
        Assert.True(UnitText.TryRead("  ", "L", out var value, out _));
        Assert.Null(value);
    }
}
