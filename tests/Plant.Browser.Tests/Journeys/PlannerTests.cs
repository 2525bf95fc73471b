using System.Diagnostics;
using System.Globalization;
using Microsoft.Playwright;
using Plant.Browser.Tests.Support;

namespace Plant.Browser.Tests.Journeys;

/// <summary>What a planner does: from the fleet to a reservoir to its working.</summary>
[Collection(PlantCollection.Name)]
public sealed class PlannerTests(PlantBrowser plant)
{
    [Fact]
    public async Task Fleet_Reservoir_Working()
    {
        await using var visit = await plant.VisitAsync("planner");
        var page = visit.Page;
        await Assertions.Expect(page.Locator(".say")).ToContainTextAsync("reservoirs");
        await Assertions.Expect(page.GetByRole(AriaRole.Group, new() { NameRegex = new("Drain-by dates") })).ToBeVisibleAsync();
        await Assertions.Expect(page.Locator("tbody tr")).ToHaveCountAsync(40);

        await page.GetByRole(AriaRole.Link, new() { NameRegex = new("^free water \\d+$") }).ClickAsync();
        await page.WaitForURLAsync("**/?condition=free-water");
        await Assertions.Expect(page.Locator("tbody tr .cond").First).ToContainTextAsync("free water");
        var tag = await page.Locator("tbody tr a.tag").First.InnerTextAsync();
        await page.Locator("tbody tr a.tag").First.ClickAsync();
        await Assertions.Expect(page.Locator("h1")).ToContainTextAsync(tag);
        await Assertions.Expect(page.GetByText("What is known")).ToBeVisibleAsync();
        await page.GetByText("Show the working behind these numbers").ClickAsync();
        await Assertions.Expect(page.Locator("#working tbody tr").First).ToBeVisibleAsync();
        await Assertions.Expect(page.Locator("#working")).ToContainTextAsync("mg/kg");
        await page.GoBackAsync();
        await page.WaitForURLAsync("**/?condition=free-water");
        visit.AssertNoComplaints();
    }

    [Fact]
    public async Task Reservoir_DrawsItsCharts()
    {
        await using var visit = await plant.VisitAsync("planner");
        var page = visit.Page;
        await page.Locator("tbody tr a.tag").First.ClickAsync();
        await Assertions.Expect(page.Locator(".js-plotly-plot .main-svg").First).ToBeVisibleAsync();
        await page.GetByText("The numbers of this chart").First.ClickAsync();
        await Assertions.Expect(page.Locator("details[open] tbody tr").First).ToBeVisibleAsync();
        await page.GetByRole(AriaRole.Button, new() { Name = "Light or dark" }).ClickAsync();
        await Assertions.Expect(page.Locator("html")).ToHaveAttributeAsync("data-theme", "dark");
        await Assertions.Expect(page.Locator(".js-plotly-plot .main-svg").First).ToBeVisibleAsync();
        visit.AssertNoComplaints();
    }

    [Fact]
    public async Task Find_ByTag_OpensTheReservoir()
    {
        await using var visit = await plant.VisitAsync("supervisor");
        var page = visit.Page;
        var tag = await page.Locator("tbody tr a.tag").Nth(3).InnerTextAsync();
        await visit.LiveAsync();
        await page.Keyboard.PressAsync("Control+k");
        await page.Keyboard.TypeAsync(tag.ToLowerInvariant());
        await page.Keyboard.PressAsync("Enter");
        await Assertions.Expect(page.Locator("h1")).ToContainTextAsync(tag);
        visit.AssertNoComplaints();
    }

    [Fact]
    public async Task NewReservoir_WithAMistake_IsMendedAndEntered()
    {
        await using var visit = await plant.VisitAsync("planner");
        var page = visit.Page;
        await page.GotoAsync("/register/reservoirs/new");
        await visit.LiveAsync();
        await page.Locator("#tag").FillAsync("ZZ-900");
        await page.Locator("#name").FillAsync("Test stand");
        await page.Locator("#oilVolumeL").FillAsync("55 gal");
        await page.Locator("#operatingTemperatureC").FillAsync("140 F");
        await page.Locator("#operatingTemperatureC").PressAsync("Tab");
        await Assertions.Expect(page.Locator("#operatingTemperatureC-note")).ToContainTextAsync("60 °C");
        await page.GetByRole(AriaRole.Button, new() { Name = "Enter the reservoir" }).ClickAsync();
        await Assertions.Expect(page.Locator("#fluid-note")).ToContainTextAsync("may not be empty");
        await page.Locator("#fluid").SelectOptionAsync(new SelectOptionValue { Index = 1 });
        await page.GetByRole(AriaRole.Button, new() { Name = "Enter the reservoir" }).ClickAsync();
        await Assertions.Expect(page.Locator("h1")).ToContainTextAsync("ZZ-900");
        await Assertions.Expect(page.Locator(".say")).ToContainTextAsync("No usable sample");
        visit.AssertNoComplaints();
    }

    [Fact]
    public async Task Import_InTheBrowser_ShowsWhatItMeansAndWrites()
    {
        var folder = Directory.CreateTempSubdirectory("plant-import-").FullName;
        await File.WriteAllTextAsync(Path.Combine(folder, "fluids.csv"), "code,name,family\nBR-1,Browser oil,mineral\nBR-2,Bad oil,wax\n");
        await using var visit = await plant.VisitAsync("planner");
        var page = visit.Page;
        await page.GotoAsync("/register/import");
        await visit.LiveAsync();
        await page.Locator("#files").SetInputFilesAsync(Path.Combine(folder, "fluids.csv"));
        await page.GetByRole(AriaRole.Button, new() { Name = "Look at them" }).ClickAsync();
        await Assertions.Expect(page.GetByText("must be one of mineral")).ToBeVisibleAsync();
        await visit.LiveAsync();
        await File.WriteAllTextAsync(Path.Combine(folder, "fluids.csv"), "code,name,family\nBR-1,Browser oil,mineral\n");
        await page.Locator("#files").SetInputFilesAsync(Path.Combine(folder, "fluids.csv"));
        await page.GetByRole(AriaRole.Button, new() { Name = "Look at them" }).ClickAsync();
        await Assertions.Expect(page.GetByText("must be one of mineral")).ToHaveCountAsync(0);
        await visit.LiveAsync();
        await page.GetByRole(AriaRole.Button, new() { Name = "Import all of it" }).ClickAsync();
        await Assertions.Expect(page.GetByText("Imported.")).ToBeVisibleAsync();
        await page.GotoAsync("/register");
        await Assertions.Expect(page.GetByRole(AriaRole.Link, new() { Name = "BR-1" })).ToBeVisibleAsync();
        visit.AssertNoComplaints();
        Directory.Delete(folder, recursive: true);
    }

    [Fact]
    public async Task Lab_MayReadButNotEdit()
    {
        await using var visit = await plant.VisitAsync("lab");
        var page = visit.Page;
        await page.GotoAsync("/register");
        await Assertions.Expect(page.GetByRole(AriaRole.Link, new() { Name = "New reservoir" })).ToHaveCountAsync(0);
        await page.GotoAsync("/register/reservoirs/new");
        await Assertions.Expect(page.Locator("h1")).ToContainTextAsync("Not for your role");
    }

    [Fact]
    public async Task Fleet_Warm_IsUsableSoon()
    {
        await using var visit = await plant.VisitAsync("planner");
        var times = new List<double>();
        for (var i = 0; i < 5; i++)
        {
            var clock = Stopwatch.StartNew();
            await visit.Page.GotoAsync("/");
            await visit.Page.Locator("tbody tr").First.WaitForAsync();
            times.Add(clock.Elapsed.TotalMilliseconds);
        }

        times.Sort();
        TestContext.Current.SendDiagnosticMessage("fleet page, warm: median {0} ms", times[2].ToString("0", CultureInfo.InvariantCulture));
        Assert.True(times[2] < 5000, $"median {times[2]:0} ms");
    }
}
