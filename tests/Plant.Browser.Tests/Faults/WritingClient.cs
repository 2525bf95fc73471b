using System.Globalization;
using System.Net;
using System.Net.Http.Headers;
using System.Net.Http.Json;
using System.Text.Json;
using Plant.Tests.Support;

namespace Plant.Browser.Tests.Faults;

/// <summary>A client that writes samples, drains and readings of its own reservoir with ids of its own and keeps count of what was answered.</summary>
internal sealed class WritingClient(ServerProcess server, string token, int number)
{
    private static readonly DateTime Start = new(2026, 1, 1, 0, 0, 0, DateTimeKind.Utc);

    private readonly string tag = $"K-{number}";
    private readonly Dictionary<int, double> sent = [];
    private readonly List<int> unanswered = [];
    private int next;

    public int Acknowledged { get; private set; }

    public int Repeated { get; private set; }

    public static async Task PrepareRegisterAsync(ServerProcess server)
    {
        var folder = Directory.CreateDirectory(Path.Combine(server.DataFolder, "kill-plant")).FullName;
        await File.WriteAllTextAsync(Path.Combine(folder, "fluids.csv"), "code,name,family\r\nM,Oil,mineral\r\n");
        var rows = string.Concat(Enumerable.Range(1, 8).Select(n => string.Create(CultureInfo.InvariantCulture, $"K-{n},Tank {n},Hall,M\r\n")));
        await File.WriteAllTextAsync(Path.Combine(folder, "reservoirs.csv"), "tag,name,area,fluid\r\n" + rows);
        var (code, _, error) = await server.CommandAsync("import", folder);
        Assert.True(code == 0, error);
    }

    public async Task WriteUntilStoppedAsync(CancellationToken stop)
    {
        using var http = Client();
        while (!stop.IsCancellationRequested)
        {
            var index = next++;
            sent[index] = 100 + (index % 50);
            unanswered.Add(index);
            try
            {
                await SendAsync(http, index);
                unanswered.Remove(index);
                Acknowledged++;
            }
            catch (Exception cut) when (cut is HttpRequestException or OperationCanceledException or IOException)
            {
                // no answer: whether it was written is not known, so it is repeated with the same id after the restart
                return;
            }
        }
    }

    public async Task RepeatUnansweredAsync()
    {
        using var http = Client();
        foreach (var index in unanswered)
        {
            await SendAsync(http, index);
            Repeated++;
        }

        unanswered.Clear();
    }

    public async Task AssertRegisterHoldsExactlyWhatWasSentAsync()
    {
        using var http = Client();
        var samples = await ListAsync(http, "samples");
        var drains = await ListAsync(http, "drains");
        var readings = await ListAsync(http, "readings");
        Assert.Equal(sent.Keys.Where(index => index % 3 == 0).Order().Select(index => (SampleCode(index), (double?)sent[index])),
            samples.Select(row => (row.GetProperty("sample").GetString()!, Number(row, "waterPpm"))).OrderBy(row => row.Item1, StringComparer.Ordinal));
        Assert.Equal(sent.Keys.Where(index => index % 3 == 1).Order().Select(index => (At(index), (double?)sent[index])),
            drains.Select(row => (row.GetProperty("drainedAt").GetDateTime().ToUniversalTime(), Number(row, "waterL"))).OrderBy(row => row.Item1));
        Assert.Equal(sent.Keys.Where(index => index % 3 == 2).Order().Select(index => (At(index), (double?)sent[index])),
            readings.Select(row => (row.GetProperty("readAt").GetDateTime().ToUniversalTime(), Number(row, "oilTemperatureC"))).OrderBy(row => row.Item1));
    }

    private static double? Number(JsonElement row, string field) => row.GetProperty(field) is { ValueKind: JsonValueKind.Number } value ? value.GetDouble() : null;

    private static DateTime At(int index) => Start.AddMinutes(index);

    private string SampleCode(int index) => string.Create(CultureInfo.InvariantCulture, $"{tag}/{index:D6}");

    private HttpClient Client()
    {
        var http = new HttpClient { BaseAddress = server.BaseAddress, Timeout = TimeSpan.FromSeconds(10) };
        http.DefaultRequestHeaders.Authorization = new AuthenticationHeaderValue("Bearer", token);
        return http;
    }

    private async Task SendAsync(HttpClient http, int index)
    {
        using var answer = (index % 3) switch
        {
            0 => await http.PostAsJsonAsync("/api/v1/samples", new
            {
                id = Id(index), sample = SampleCode(index), replicate = 1, tag, takenAt = At(index), point = "return", method = "kf-coulometric", waterPpm = sent[index],
            }),
            1 => await http.PostAsJsonAsync("/api/v1/drains", new { id = Id(index), tag, drainedAt = At(index), waterL = sent[index] }),
            _ => await http.PostAsJsonAsync("/api/v1/readings", new[] { new { tag, readAt = At(index), oilTemperatureC = sent[index] } }),
        };
        Assert.True(answer.IsSuccessStatusCode, $"{answer.StatusCode}: {await answer.Content.ReadAsStringAsync()}");
    }

    /// <summary>An id made by this client: the same for a repeated request.</summary>
    private Guid Id(int index) => new(number, (short)(index >> 16), (short)index, 0x80, 0, 0, 0, 0, 0, 0, 1);

    private async Task<List<JsonElement>> ListAsync(HttpClient http, string resource)
    {
        var rows = new List<JsonElement>();
        for (string? cursor = null; ;)
        {
            var address = $"/api/v1/{resource}?tag={tag}&limit=500" + (cursor is null ? string.Empty : $"&cursor={Uri.EscapeDataString(cursor)}");
            using var answer = await http.GetAsync(new Uri(address, UriKind.Relative));
            Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
            var page = await answer.Content.ReadFromJsonAsync<JsonElement>();
            rows.AddRange(page.GetProperty("items").EnumerateArray());
            cursor = page.TryGetProperty("nextCursor", out var nextCursor) ? nextCursor.GetString() : null;
            if (cursor is null)
            {
                return rows;
            }
        }
    }
}
