namespace Plant.Advice.Tests.Simulation;

/// <summary>
/// Central 90 % intervals against the truth of invented plants, on fixed seeds; the ranges are what was measured, with room for three standard errors.
/// Ingress of a reservoir that is never drained is known worst, and its settled water with it: stated apart, not pooled away.
/// </summary>
public class CoverageTests(ITestOutputHelper output)
{
    [Fact]
    public void Intervals_OfAMillThatDrainsMonthly_HoldTheTruth()
    {
        var found = Judge(PlantKind.Mill, 71_001);
        Within(found, "water", 0.88, 0.98);
        Within(found, "settled, drained", 0.88, 0.98);
        Within(found, "ingress, drained", 0.82, 0.93);
        Within(found, "full, and due for a drain", 0.88, 1);
    }

    [Fact]
    public void Intervals_OfABatchPlantOfAnotherStructure_HoldTheTruth()
    {
        var found = Judge(PlantKind.Batch, 85_001);
        Within(found, "water", 0.82, 0.93);
        Within(found, "settled, drained", 0.90, 0.99);
        Within(found, "ingress, drained", 0.80, 0.93);
        Within(found, "settled, never drained", 0.50, 0.95);
        Within(found, "ingress, never drained", 0.50, 0.95);
        Within(found, "full, and due for a drain", 0.90, 1);
    }

    private static SortedDictionary<string, Tally> Judge(PlantKind kind, int seed)
    {
        var found = new SortedDictionary<string, Tally>(StringComparer.Ordinal);
        var one = new Lock();
        Parallel.For(0, 250, i =>
        {
            var plant = new SimulatedReservoir(kind, seed + i);
            // the dates are in step with nothing
            foreach (var days in new[] { 203.0, 118, 97 })
            {
                plant.Live(days);
                var said = Assessor.Assess(plant.History, plant.Now, new PlanningRule());
                var truth = plant.Hours[^1];
                var group = plant.History.Drains.Count > 1 ? "drained" : "never drained";
                lock (one)
                {
                    Of("water").Add(truth.WaterPpm, said.WaterPpmLow90, said.WaterPpmHigh90);
                    // less than 0.01 % of the oil counts as none, as in the meaning of free water
                    Of("settled, " + group).Add(truth.SettledL, said.SettledWaterLLow90, said.SettledWaterLHigh90, Evidence.FreeShare * plant.Blank.OilVolumeL!.Value);
                    Of("ingress, " + group).Add(truth.UsualIngressGPerDay, said.IngressGPerDayLow90, said.IngressGPerDayHigh90);
                    if (truth.SettledL > plant.CapacityL)
                    {
                        Of("full, and due for a drain").Add(said.DrainBy <= plant.Now ? 0 : 1, 0, 0);
                    }
                }
            }
        });
        return found;

        Tally Of(string name) => found.TryGetValue(name, out var tally) ? tally : found[name] = new Tally();
    }

    private void Within(SortedDictionary<string, Tally> found, string name, double low, double high)
    {
        output.WriteLine($"{name}: {found[name]}");
        Assert.True(found[name].Count >= 10, $"{name}: too few to judge ({found[name].Count})");
        Assert.True(found[name].Share >= low && found[name].Share <= high, FormattableString.Invariant($"{name}: {found[name]}; stated {low:P0} to {high:P0}"));
    }
}
