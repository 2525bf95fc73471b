using Plant.Web.Shared.Drawing;

namespace Plant.Web.Tests.Shared.Drawing;

public sealed class LabelColumnTests
{
    [Fact]
    public void Place_FarApart_StayWhereTheyBelong() => Assert.Equal([10, 60, 120], LabelColumn.Place([10, 60, 120], [19, 19, 19], 200));

    [Fact]
    public void Place_TooClose_NeverTouchAndNeverLeaveTheDrawing()
    {
        var random = new Random(7);
        for (var n = 0; n < 500; n++)
        {
            var count = random.Next(1, 7);
            var wanted = Enumerable.Range(0, count).Select(_ => 300 * random.NextDouble()).Order().ToArray();
            var tall = wanted.Select(_ => random.Next(2) == 0 ? 19.0 : 35).ToArray();
            var places = LabelColumn.Place(wanted, tall, 300);
            for (var i = 1; i < count; i++)
            {
                Assert.True(places[i] >= places[i - 1] + tall[i - 1] - 1e-9);
            }

            Assert.True(places[^1] + tall[^1] <= 300 + 1e-9);
        }
    }
}
