using System.Net.Http.Headers;
using System.Net.Http.Json;
using System.Text.Json.Nodes;
using Microsoft.Playwright;
using Plant.Browser.Tests.Support;
using Plant.Tests.Support;

namespace Plant.Browser.Tests.Journeys;

/// <summary>A technician at the bench: keyboard and scanner only.</summary>
[Collection(PlantCollection.Name)]
public sealed class BenchTests(PlantBrowser plant)
{
    private const int Bottles = 40;

    [Fact]
    public async Task FortyResultsWithDuplicates_OverASlowLinkAndAKilledServer_AreAllReleased()
    {
        await using var server = await ServerProcess.StartAsync("Development");
        await LogBottlesAsync(server, "KF", Bottles);
        await using var visit = await plant.VisitAsync("lab", server: server.BaseAddress);
        var page = visit.Page;
        await page.RouteAsync("**/bench/batches/**", async route =>
        {
            await Task.Delay(150);
            await route.ContinueAsync();
        });
        await page.GotoAsync("/bench");
        await page.Locator("#bench[data-live=true]").WaitForAsync();
        var keys = 0;
        for (var n = 0; n < Bottles; n++)
        {
            // the scanner types by itself; only what a person presses counts
            await page.Keyboard.TypeAsync($"KF-{n:00}", new() { Delay = 5 });
            await page.Keyboard.PressAsync("Enter");
            await AtAsync(page, $"ppm 1 of KF-{n:00}");
            foreach (var typed in new[] { $"{100 + n}", $"{101 + n}" })
            {
                await page.Keyboard.TypeAsync(typed, new() { Delay = 30 });
                await page.Keyboard.PressAsync("Enter");
                keys += typed.Length + 1;
            }

            if (n == Bottles / 2)
            {
                await server.KillAsync();
                await server.StartAsync();
            }
        }

        Assert.True(keys <= 320, $"{keys} key presses");
        await Assertions.Expect(page.Locator("#bench-saved")).ToContainTextAsync("80 cells");
        await page.Keyboard.PressAsync("Control+Enter");
        await page.GetByText("40 ready").WaitForAsync();
        await page.Keyboard.PressAsync("1");
        await page.GetByText("Released: 40 results").WaitForAsync();

        using var http = await ApiAsync(server, "lab");
        for (var n = 0; n < Bottles; n++)
        {
            var found = await ResultsAsync(http, $"KF-{n:00}");
            Assert.Equal([100.0 + n, 101.0 + n], found);
        }
    }

    [Fact]
    public async Task Grid_MovesByKeys_RestoresAndTellsWhatIsWrong()
    {
        await LogBottlesAsync(plant.Server, "GK", 3);
        await using var visit = await plant.VisitAsync("lab");
        var page = visit.Page;
        await page.GotoAsync("/bench");
        await page.Locator("#bench[data-live=true]").WaitForAsync();
        for (var n = 0; n < 3; n++)
        {
            await page.Keyboard.TypeAsync($"GK-{n:00}");
            await page.Keyboard.PressAsync("Enter");
            await AtAsync(page, $"ppm 1 of GK-{n:00}");
            await page.Keyboard.TypeAsync("100");
            await page.Keyboard.PressAsync("Enter");
            await page.Keyboard.TypeAsync("101");
            await page.Keyboard.PressAsync("Enter");
        }

        await page.Locator("#bench-grid input[tabindex='0']").FocusAsync();
        await page.Keyboard.PressAsync("Control+Home");
        await AtAsync(page, "ppm 1 of GK-00");
        await page.Keyboard.PressAsync("End");
        await AtAsync(page, "ppm 2 of GK-00");
        await page.Keyboard.PressAsync("ArrowDown");
        await AtAsync(page, "ppm 2 of GK-01");
        await page.Keyboard.PressAsync("ArrowLeft");
        await AtAsync(page, "ppm 1 of GK-01");
        await page.Keyboard.PressAsync("Control+End");
        await AtAsync(page, "ppm 2 of GK-02");
        Assert.Equal(1, await page.Locator("#bench-grid input[tabindex='0']").CountAsync());
        await page.Keyboard.PressAsync("F2");
        await page.Keyboard.TypeAsync("9");
        Assert.Equal("1019", await page.EvaluateAsync<string>("document.activeElement.value"));
        await page.Keyboard.PressAsync("Escape");
        Assert.Equal("101", await page.EvaluateAsync<string>("document.activeElement.value"));
        await page.Keyboard.TypeAsync("1o1");
        await page.Keyboard.PressAsync("Enter");
        await page.GetByText("is no number").WaitForAsync();
        await page.Keyboard.PressAsync("Escape");
        await page.Locator("#bottle").FocusAsync();
        await page.Keyboard.TypeAsync("GK-00");
        await page.Keyboard.PressAsync("Enter");
        await page.GetByText("stands in this batch already").WaitForAsync();
        visit.AssertNoComplaints();
    }

    private static Task AtAsync(IPage page, string label) => Assertions.Expect(page.Locator("input:focus")).ToHaveAttributeAsync("aria-label", label);

    private static async Task<HttpClient> ApiAsync(ServerProcess server, string role)
    {
        var (code, output, error) = await server.CommandAsync("token", "--name", $"browser {Guid.CreateVersion7()}", "--role", role);
        Assert.True(code == 0, error);
        var http = new HttpClient { BaseAddress = server.BaseAddress };
        http.DefaultRequestHeaders.Authorization = new AuthenticationHeaderValue("Bearer", output.Trim().Split('\n')[^1]);
        return http;
    }

    private static async Task LogBottlesAsync(ServerProcess server, string prefix, int count)
    {
        using var http = await ApiAsync(server, "lab");
        for (var n = 0; n < count; n++)
        {
            using var answer = await http.PostAsJsonAsync("/api/v1/bottles", new { code = $"{prefix}-{n:00}", tag = "DS-LUB-01", point = "return", takenAt = $"2026-11-30T08:{n:00}:00Z" });
            Assert.True(answer.IsSuccessStatusCode, await answer.Content.ReadAsStringAsync());
        }
    }

    private static async Task<List<double>> ResultsAsync(HttpClient http, string bottle)
    {
        var found = new List<double>();
        string? cursor = null;
        do
        {
            var page = JsonNode.Parse(await http.GetStringAsync(new Uri($"/api/v1/samples?tag=DS-LUB-01&limit=500{(cursor is null ? "" : $"&cursor={cursor}")}", UriKind.Relative)))!;
            found.AddRange(page["items"]!.AsArray().Where(i => (string?)i!["sample"] == bottle).OrderBy(i => (double)i!["replicate"]!).Select(i => (double)i!["waterPpm"]!));
            cursor = (string?)page["nextCursor"];
        }
        while (cursor is not null);
        return found;
    }
}
