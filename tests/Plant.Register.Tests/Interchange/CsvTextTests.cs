using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using Plant.Register.Interchange;

namespace Plant.Register.Tests.Interchange;

public sealed class CsvTextTests
{
    [Property(MaxTest = 2000)]
    public bool Neutralise_AnyText_IsRestored(NonNull<string> text) => CsvText.Restore(CsvText.Neutralise(text.Get)) == text.Get;

    [Property(MaxTest = 2000)]
    public bool Neutralise_AnyText_StartsNoFormula(NonNull<string> text)
    {
        var cell = CsvText.Neutralise(text.Get);
        return cell.Length == 0 || !"=+-@\t\r".Contains(cell[0], StringComparison.Ordinal);
    }

    [Property(MaxTest = 2000)]
    public bool Number_ComesBackTheSame(NormalFloat number) => CsvText.TryNumber(CsvText.Format(number.Get), out var back) && back.Equals(number.Get);

    [Property(MaxTest = 1000)]
    public bool Time_ComesBackTheSame(int seconds, ushort milliseconds)
    {
        var time = DateTimeOffset.UnixEpoch.AddSeconds(seconds).AddMilliseconds(milliseconds % 1000);
        return CsvText.TryTime(CsvText.Format(time), out var back) && back == time;
    }

    [Theory]
    [InlineData("2026-03-01T06:00:00Z", "2026-03-01T06:00:00Z")]
    [InlineData("2026-03-01T07:00:00+01:00", "2026-03-01T06:00:00Z")]
    [InlineData("2026-03-01T06:00Z", "2026-03-01T06:00:00Z")]
    [InlineData("2026-03-01T06:00:00.250Z", "2026-03-01T06:00:00.25Z")]
    [InlineData("2024-02-29T23:30:00-01:00", "2024-03-01T00:30:00Z")]
    public void Time_WithOffset_IsUtc(string text, string utc)
    {
        Assert.True(CsvText.TryTime(text, out var time));
        Assert.Equal(utc, CsvText.Format(time));
    }
}
