using FsCheck;
using FsCheck.Fluent;

namespace Plant.Physics.Tests;

/// <summary>Inputs of property tests.</summary>
internal static class Inputs
{
    private const int Steps = 1_000_000;

    public static Arbitrary<double> Between(double low, double high) => Gen.Choose(0, Steps).Select(i => low + ((high - low) * i / Steps)).ToArbitrary();

    /// <summary>Evenly over the decades.</summary>
    public static Arbitrary<double> Logarithmic(double low, double high) =>
        Gen.Choose(0, Steps).Select(i => low * Math.Pow(high / low, (double)i / Steps)).ToArbitrary();

    public static Arbitrary<T> OneOf<T>(params T[] values) => Gen.Elements(values).ToArbitrary();
}
