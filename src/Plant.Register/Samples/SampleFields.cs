using System.Globalization;
using Plant.Advice;
using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.Samples;

/// <summary>Columns of samples.csv.</summary>
public sealed record SampleFields : IFields
{
    /// <summary>What a crackle test may say.</summary>
    public static readonly IReadOnlyList<string> CrackleRemarks = ["clear", "crackles"];

    public string? Sample { get; set; }

    public string? Tag { get; set; }

    public DateTimeOffset? TakenAt { get; set; }

    public DateTimeOffset? ReceivedAt { get; set; }

    public string? Point { get; set; }

    public double? OilTemperatureC { get; set; }

    public string? Method { get; set; }

    public double? WaterPpm { get; set; }

    public double? WaterActivity { get; set; }

    public double? Replicate { get; set; }

    public string? Analyst { get; set; }

    public string? Remark { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("sample", Sample, 100);
        refusals.Required("tag", Tag);
        refusals.Required("takenAt", TakenAt);
        refusals.Time("takenAt", TakenAt);
        refusals.Time("receivedAt", ReceivedAt);
        refusals.Required("point", Point);
        refusals.OneOf<SamplePoint>("point", string.IsNullOrWhiteSpace(Point) ? null : Point);
        refusals.Temperature("oilTemperatureC", OilTemperatureC);
        refusals.Required("method", Method);
        refusals.OneOf<WaterMethod>("method", string.IsNullOrWhiteSpace(Method) ? null : Method);
        refusals.Ppm("waterPpm", WaterPpm);
        refusals.Range("waterActivity", WaterActivity, 0, 1, string.Empty);
        refusals.Required("replicate", Replicate);
        refusals.Range("replicate", Replicate, 1, 1000, string.Empty);
        refusals.Text("analyst", Analyst);
        refusals.Text("remark", Remark, 2000);
        if (Replicate is { } replicate && replicate != Math.Floor(replicate))
        {
            refusals.Add(new Refusal("replicate", replicate.ToString("R", CultureInfo.InvariantCulture), "must be a whole number from 1"));
        }

        if (ReceivedAt < TakenAt)
        {
            refusals.Add(new Refusal("receivedAt", ReceivedAt.Value.ToString("O", CultureInfo.InvariantCulture), "must not be before takenAt"));
        }

        CheckResult(refusals);
    }

    private void CheckResult(List<Refusal> refusals)
    {
        if (Method == Code.Of(WaterMethod.Crackle))
        {
            if (WaterPpm is not null || WaterActivity is not null)
            {
                refusals.Add(new Refusal(WaterPpm is not null ? "waterPpm" : "waterActivity", (WaterPpm ?? WaterActivity)!.Value.ToString("R", CultureInfo.InvariantCulture),
                    "must be empty for a crackle test: its result is the remark, clear or crackles"));
            }

            if (Remark is null || !CrackleRemarks.Contains(Remark))
            {
                refusals.Add(new Refusal("remark", Remark ?? string.Empty, "must be clear or crackles for a crackle test"));
            }
        }
        else if (WaterPpm is null == WaterActivity is null)
        {
            refusals.Add(new Refusal("waterPpm", WaterPpm?.ToString("R", CultureInfo.InvariantCulture) ?? string.Empty, "exactly one of waterPpm and waterActivity must be given"));
        }
    }
}
