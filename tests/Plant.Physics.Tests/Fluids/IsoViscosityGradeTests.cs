using Plant.Physics.Fluids;

namespace Plant.Physics.Tests.Fluids;

public sealed class IsoViscosityGradeTests
{
    // ISO 3448 (list from memory): a grade reaches 10 % to either side of its midpoint
    [Theory]
    [InlineData(2, 1.98, 2.42)]
    [InlineData(3, 2.88, 3.52)]
    [InlineData(5, 4.14, 5.06)]
    [InlineData(7, 6.12, 7.48)]
    [InlineData(10, 9, 11)]
    [InlineData(15, 13.5, 16.5)]
    [InlineData(22, 19.8, 24.2)]
    [InlineData(32, 28.8, 35.2)]
    [InlineData(46, 41.4, 50.6)]
    [InlineData(68, 61.2, 74.8)]
    [InlineData(100, 90, 110)]
    [InlineData(220, 198, 242)]
    [InlineData(460, 414, 506)]
    [InlineData(1000, 900, 1100)]
    [InlineData(3200, 2880, 3520)]
    public void Of_InsideAGrade_IsTheGrade(int grade, double low, double high)
    {
        Assert.Equal(grade, IsoViscosityGrade.Of(low * 1.0001));
        Assert.Equal(grade, IsoViscosityGrade.Of(high * 0.9999));
        Assert.NotEqual(grade, IsoViscosityGrade.Of(low * 0.999));
        Assert.NotEqual(grade, IsoViscosityGrade.Of(high * 1.001));
    }

    [Theory]
    [InlineData(1)]
    [InlineData(8)]
    [InlineData(27)]
    [InlineData(38)]
    [InlineData(4000)]
    public void Of_BetweenGrades_IsNull(double viscosity40) => Assert.Null(IsoViscosityGrade.Of(viscosity40));

    [Theory]
    [InlineData(2, 2.2)]
    [InlineData(5, 4.6)]
    [InlineData(46, 46)]
    [InlineData(50, 50)]
    public void MidpointMm2S_Grades_AreTheList(double grade, double midpoint) => Assert.Equal(midpoint, IsoViscosityGrade.MidpointMm2S(grade));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(-46)]
    public void Of_NotAViscosity_Throws(double viscosity40)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => IsoViscosityGrade.Of(viscosity40));
        Assert.Throws<ArgumentOutOfRangeException>(() => IsoViscosityGrade.MidpointMm2S(viscosity40));
    }
}
