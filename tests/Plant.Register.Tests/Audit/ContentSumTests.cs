using Plant.Register.Audit;

namespace Plant.Register.Tests.Audit;

public sealed class ContentSumTests
{
    [Fact]
    public void Sum_OfTheSameRecordsInAnyOrder_IsTheSame()
    {
        var random = new Random(3);
        var records = Enumerable.Range(0, 200).Select(i => BitConverter.GetBytes(i * 7919)).ToArray();
        var one = default(ContentSum);
        foreach (var record in records)
        {
            one.Add(record);
        }

        random.Shuffle(records);
        var other = default(ContentSum);
        foreach (var record in records)
        {
            other.Add(record);
        }

        Assert.Equal(one, other);
        Assert.Equal(one, ContentSum.Parse(one.ToString()));
    }

    [Fact]
    public void Remove_UndoesAdd()
    {
        var sum = default(ContentSum);
        sum.Add("kept"u8);
        var before = sum;
        for (byte i = 0; i < 100; i++)
        {
            sum.Add([i, 1]);
        }

        Assert.NotEqual(before, sum);
        for (byte i = 0; i < 100; i++)
        {
            sum.Remove([i, 1]);
        }

        Assert.Equal(before, sum);
    }
}
