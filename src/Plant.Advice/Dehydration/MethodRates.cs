namespace Plant.Advice.Dehydration;

/// <summary>What work, power and disposal cost, in the plant's own money. All of it is judgement and meant to be edited.</summary>
public sealed record MethodRates
{
    /// <summary>A rig or element that is set up and watched, by the hour.</summary>
    public double RigPerHour { get; init; } = 12;

    /// <summary>Setting up and taking away.</summary>
    public double SetUp { get; init; } = 150;

    /// <summary>Electricity [per kWh].</summary>
    public double PerKWh { get; init; } = 0.2;

    /// <summary>An absorbent element.</summary>
    public double PerElement { get; init; } = 90;

    /// <summary>Water that an absorbent element takes [L].</summary>
    public double ElementL { get; init; } = 0.8;

    /// <summary>Oily water to dispose of [per L].</summary>
    public double PerWasteL { get; init; } = 0.6;
}
