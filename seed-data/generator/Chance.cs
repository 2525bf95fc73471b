namespace Skarrow;

/// <summary>A row of random numbers that depends on its name alone: changing one reservoir leaves the others as they were.</summary>
public sealed class Chance
{
    private const ulong Seed = 0x5CA4_4035_B0A2_D315;
    private ulong state;

    /// <summary>FNV-1a of the name, then SplitMix64: both published, so no runtime can change the numbers.</summary>
    public Chance(string name)
    {
        state = 14695981039346656037;
        foreach (var letter in name)
        {
            state = (state ^ letter) * 1099511628211;
        }

        state ^= Seed;
    }

    public double Next()
    {
        state += 0x9E3779B97F4A7C15;
        var z = state;
        z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9;
        z = (z ^ (z >> 27)) * 0x94D049BB133111EB;
        return ((z ^ (z >> 31)) >> 11) / 9007199254740992.0;
    }

    public double Between(double low, double high) => low + ((high - low) * Next());

    public int Whole(int low, int high) => low + (int)(Next() * (high - low + 1));

    public bool Yes(double probability) => Next() < probability;

    public T Pick<T>(IReadOnlyList<T> choices) => choices[Whole(0, choices.Count - 1)];

    public double Normal() => Math.Sqrt(-2 * Math.Log(1 - Next())) * Math.Cos(2 * Math.PI * Next());

    public double LogNormal(double median, double logSd) => median * Math.Exp(logSd * Normal());
}
