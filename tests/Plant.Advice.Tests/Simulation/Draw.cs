namespace Plant.Advice.Tests.Simulation;

/// <summary>Random numbers of a fixed seed.</summary>
internal sealed class Draw(int seed)
{
    private readonly Random random = new(seed);

    public double Uniform() => random.NextDouble();

    public int Index(int count) => random.Next(count);

    public double Normal() => Math.Sqrt(-2 * Math.Log(1 - random.NextDouble())) * Math.Cos(2 * Math.PI * random.NextDouble());
}
