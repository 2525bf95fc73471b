namespace Skarrow;

/// <summary>One row of separators.csv.</summary>
public sealed record SeparatorSheet(string Code, string? Tag, string Kind)
{
    public double? FlowLPerMin { get; init; }

    public double? Efficiency { get; init; }

    public double? CutSizeUm { get; init; }

    public double? PressureKPa { get; init; }

    public double? OilTemperatureC { get; init; }

    public double? CapacityL { get; init; }
}
