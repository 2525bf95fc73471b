using Microsoft.Playwright;
using Plant.Browser.Tests.Support;

namespace Plant.Browser.Tests.Journeys;

/// <summary>Planner, supervisor and round walker with one order.</summary>
[Collection(PlantCollection.Name)]
public sealed class OrderTests(PlantBrowser plant)
{
    [Fact]
    public async Task FleetToApproved_TheOpenPageFollowsByItself()
    {
        await using var planner = await plant.VisitAsync("planner");
        var page = planner.Page;
        await page.GotoAsync("/?condition=free-water");
        await planner.LiveAsync();
        await page.Locator(".pick").Nth(0).CheckAsync();
        await page.GetByText("1 chosen").WaitForAsync();
        await page.Locator(".pick").Nth(1).CheckAsync();
        await page.GetByText("2 chosen").WaitForAsync();
        Assert.Contains("chosen=", page.Url, StringComparison.Ordinal);
        await page.GetByRole(AriaRole.Button, new() { Name = "Draft orders" }).ClickAsync();
        await page.WaitForURLAsync("**/orders?mine=true");
        await page.Locator("tr:has(td:text-is('draft')) td:first-child a.tag").First.ClickAsync();
        await page.WaitForURLAsync("**/orders/1*");
        var number = page.Url.Split('/')[^1];
        await page.GetByRole(AriaRole.Button, new() { Name = "Submit" }).ClickAsync();
        await Assertions.Expect(page.Locator("h1")).ToContainTextAsync("submitted");

        await using var supervisor = await plant.VisitAsync("supervisor", width: 1024, height: 768);
        await supervisor.Page.GotoAsync($"/approvals?order={number}");
        await supervisor.LiveAsync();
        var approve = supervisor.Page.GetByRole(AriaRole.Button, new() { Name = "Approve" });
        Assert.True((await approve.BoundingBoxAsync())!.Height >= 44);
        await approve.ClickAsync();
        await supervisor.Page.GetByText($"{number} is approved").WaitForAsync();
        await Assertions.Expect(page.Locator("h1")).ToContainTextAsync("approved", new() { Timeout = 5_000 });
        planner.AssertNoComplaints();
        supervisor.AssertNoComplaints();
    }

    [Fact]
    public async Task OwnOrder_IsLockedWithItsCause()
    {
        await using var supervisor = await plant.VisitAsync("supervisor");
        var page = supervisor.Page;
        await page.GotoAsync("/reservoirs/DS-LUB-01");
        await page.GetByRole(AriaRole.Button, new() { Name = "Draft an order" }).ClickAsync();
        await page.WaitForURLAsync("**/orders/*");
        await supervisor.LiveAsync();
        await page.GetByRole(AriaRole.Button, new() { Name = "Submit" }).ClickAsync();
        await Assertions.Expect(page.Locator("h1")).ToContainTextAsync("submitted");
        await page.GotoAsync($"/approvals?order={page.Url.Split('/')[^1]}");
        await supervisor.LiveAsync();
        await page.GetByText("is your own: somebody else must decide").WaitForAsync();
        Assert.Equal(0, await page.GetByRole(AriaRole.Button, new() { Name = "Approve" }).CountAsync());
    }

    [Fact]
    public async Task Walker_WithTheLinkCut_LosesNothingAndSavesOnce()
    {
        await using var walker = await plant.VisitAsync("lab", width: 390, height: 844);
        var page = walker.Page;
        await page.GotoAsync("/t/DS-LUB-03");
        await page.FillAsync("#water", "3,57");
        await page.Context.SetOfflineAsync(true);
        var save = page.GetByRole(AriaRole.Button, new() { Name = "Save" });
        Assert.True((await save.BoundingBoxAsync())!.Height >= 44);
        await save.ClickAsync();
        await save.ClickAsync();
        await page.GetByText("Kept on this phone").WaitForAsync();
        await page.Context.SetOfflineAsync(false);
        await page.GetByText("Saved: 3.57 L of water drained").WaitForAsync();
        await page.GotoAsync("/reservoirs/DS-LUB-03");
        Assert.Equal(1, await page.Locator("td", new() { HasTextRegex = new System.Text.RegularExpressions.Regex("^3\\.57$") }).CountAsync());
    }
}
