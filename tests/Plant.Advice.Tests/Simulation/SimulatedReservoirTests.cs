namespace Plant.Advice.Tests.Simulation;

public class SimulatedReservoirTests
{
    [Theory]
    [InlineData(3)]
    [InlineData(11)]
    public void Live_TwoYears_LosesNoWater(int seed)
    {
        var plant = new SimulatedReservoir(PlantKind.Mill, seed).Live(730);

        Assert.InRange(plant.Imbalance, -1e-6, 1e-6);
        Assert.NotEmpty(plant.History.Samples);
        Assert.NotEmpty(plant.History.Drains);
    }

    [Fact]
    public void Live_SameSeed_SameHistory()
    {
        var one = new SimulatedReservoir(PlantKind.Batch, 5).Live(200);
        var other = new SimulatedReservoir(PlantKind.Batch, 5).Live(120).Live(80);

        Assert.Equal(one.Hours, other.Hours);
        Assert.Equal(one.History.Samples, other.History.Samples);
    }
}
