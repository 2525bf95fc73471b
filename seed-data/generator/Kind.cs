namespace Skarrow;

/// <summary>A group of like reservoirs. Pairs are the lowest and the highest value in the group.</summary>
public sealed record Kind(string Prefix, int Count, string Area, string Name, string Service)
{
    /// <summary>Taken in turn.</summary>
    public required IReadOnlyList<string> Fluids { get; init; }

    public required IReadOnlyList<string> Breathers { get; init; }

    public string Shape { get; init; } = "rectangular";

    public required (double Low, double High) OilL { get; init; }

    public required (double Low, double High) OperatingC { get; init; }

    public required (double Low, double High) ColdestC { get; init; }

    public (double Low, double High)? Rh { get; init; }

    /// <summary>Minutes for the pumps to turn the oil over once; 0: splash or no circulation.</summary>
    public double TurnoverMin { get; init; }

    /// <summary>Median of <see cref="Unit.Fill"/>.</summary>
    public double Fill { get; init; } = 0.12;

    public double SampleDays { get; init; } = 30;

    public double DrainDays { get; init; }

    public int Criticality { get; init; } = 3;

    public Rhythm Rhythm { get; init; } = Rhythm.Process;

    public double? LimitPpm { get; init; }

    /// <summary>False where nothing draws from the bottom: transformers, splash gearboxes without a pump.</summary>
    public bool HasSuction { get; init; } = true;
}
