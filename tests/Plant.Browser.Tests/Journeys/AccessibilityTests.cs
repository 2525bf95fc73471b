using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using Plant.Browser.Tests.Support;

namespace Plant.Browser.Tests.Journeys;

/// <summary>axe finds nothing on any page, in light and dark, wide and on a phone.</summary>
[Collection(PlantCollection.Name)]
public sealed class AccessibilityTests(PlantBrowser plant)
{
    private static readonly AxeRunOptions Rules = new()
    {
        ResultTypes = [ResultType.Violations],
        RunOnly = new RunOnlyOptions { Type = "tag", Values = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"] },
    };

    public static TheoryData<bool, int> Looks => new() { { false, 1366 }, { true, 1366 }, { false, 390 }, { true, 390 } };

    [Theory, MemberData(nameof(Looks))]
    public async Task EveryPage_HasNoViolation(bool dark, int width)
    {
        var found = new List<string>();
        await using (var stranger = await plant.VisitAsync(null, dark, width))
        {
            foreach (var page in new[] { "/account/sign-in", "/account/first", "/account/denied", "/no-such-page", "/error" })
            {
                await CheckAsync(stranger, page, found);
            }
        }

        await using var visit = await plant.VisitAsync("administrator", dark, width);
        await visit.Page.GotoAsync("/?condition=free-water");
        var tag = (await visit.Page.Locator("a.tag, a.row b").First.TextContentAsync())!.Trim();
        foreach (var page in new[]
        {
            "/", "/?q=nothing-fits", $"/reservoirs/{tag}", "/reservoirs/none", "/register", "/register/reservoirs/new", $"/register/reservoirs/{tag}/edit",
            "/register/fluids/new", "/register/fluids/TURB-46/edit", "/register/import", "/account", "/account/confirm", "/orders", "/bench", $"/t/{tag}", "/records", "/calculators", "/calculators/dry-down", "/calculators/settling?dropletUm=x",
        })
        {
            await CheckAsync(visit, page, found);
        }

        await using (var planner = await plant.VisitAsync("planner", dark, width))
        {
            await planner.Page.GotoAsync($"/?chosen={tag}");
            await CheckAsync(planner, $"/?chosen={tag}", found);
            await planner.Page.GotoAsync($"/reservoirs/{tag}");
            await planner.Page.GetByRole(Microsoft.Playwright.AriaRole.Button, new() { Name = "Draft an order" }).ClickAsync();
            await planner.LiveAsync();
            await planner.Page.GetByRole(Microsoft.Playwright.AriaRole.Button, new() { Name = "Submit" }).ClickAsync();
            await planner.Page.GetByText("is submitted").WaitForAsync();
            await CheckAsync(planner, new Uri(planner.Page.Url).PathAndQuery, found);
        }

        await using (var supervisor = await plant.VisitAsync("supervisor", dark, width))
        {
            await CheckAsync(supervisor, "/approvals", found);
        }

        Assert.True(found.Count == 0, string.Join("\n", found));
    }

    [Theory]
    [InlineData(320)]
    [InlineData(390)]
    [InlineData(1366)]
    public async Task EveryPage_FitsTheScreen(int width)
    {
        await using var visit = await plant.VisitAsync("planner", width: width);
        var found = new List<string>();
        foreach (var page in new[] { "/", "/register", "/register/reservoirs/new", "/register/fluids/new", "/register/import", "/account" })
        {
            await visit.Page.GotoAsync(page);
            await visit.Page.WaitForTimeoutAsync(400);
            var over = await visit.Page.EvaluateAsync<int>("document.documentElement.scrollWidth - window.innerWidth");
            if (over > 0)
            {
                found.Add($"{page} is {over} px too wide at {width}");
            }
        }

        Assert.Equal([], found);
    }

    private static async Task CheckAsync(Visit visit, string page, List<string> found)
    {
        await visit.Page.GotoAsync(page);
        await visit.Page.Locator("h1").First.WaitForAsync(new() { State = Microsoft.Playwright.WaitForSelectorState.Attached });
        await visit.Page.WaitForTimeoutAsync(700);
        var result = await visit.Page.RunAxe(Rules);
        found.AddRange(result.Violations.Select(v => $"{page}: {v.Id}: {v.Help}: {string.Join(" | ", v.Nodes.Take(2).Select(n => n.Html))}"));
    }
}
