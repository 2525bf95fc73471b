using System.Runtime.CompilerServices;

namespace Plant.Physics;

/// <summary>Checks of arguments at the public doors of the physics: bugs of the caller, never input of a person.</summary>
internal static class Guard
{
    public static double Finite(double value, [CallerArgumentExpression(nameof(value))] string name = "") =>
        double.IsFinite(value) ? value : throw new ArgumentOutOfRangeException(name, value, "must be a finite number");

    public static double Positive(double value, [CallerArgumentExpression(nameof(value))] string name = "") =>
        double.IsFinite(value) && value > 0 ? value : throw new ArgumentOutOfRangeException(name, value, "must be above 0");

    public static double NotNegative(double value, [CallerArgumentExpression(nameof(value))] string name = "") =>
        double.IsFinite(value) && value >= 0 ? value : throw new ArgumentOutOfRangeException(name, value, "must not be negative");

    public static double Between(double value, double low, double high, [CallerArgumentExpression(nameof(value))] string name = "") =>
        value >= low && value <= high ? value : throw new ArgumentOutOfRangeException(name, value, FormattableString.Invariant($"must lie between {low} and {high}"));
}
