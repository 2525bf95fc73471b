using System.Diagnostics;
using System.Globalization;
using Microsoft.Playwright;
using Plant.Tests.Support;

namespace Plant.Benchmarks;

/// <summary>How soon a page can be used in a real browser, warm, on a plant of 2,000 reservoirs and 200,000 samples beside the demo plant.</summary>
public static class PageTimes
{
    private const int Repeats = 15;

    /// <summary>Fleet and reservoir page, from the click on a link to a page that answers.</summary>
    public static async Task<int> RunAsync()
    {
        await using var server = await ServerProcess.StartAsync("Development");
        var files = Directory.CreateTempSubdirectory("plant-bench-").FullName;
        WholeProcess.Plant(files, 2000);
        WholeProcess.Samples(files, 2000, 100);
        var (code, _, error) = await server.CommandAsync("import", files);
        Directory.Delete(files, recursive: true);
        if (code != 0)
        {
            throw new InvalidOperationException(error);
        }

        using var playwright = await Playwright.CreateAsync();
        await using var browser = await playwright.Chromium.LaunchAsync(new() { ExecutablePath = "/usr/bin/chromium", Args = ["--no-sandbox", "--disable-gpu"] });
        var page = await browser.NewPageAsync(new() { BaseURL = server.BaseAddress.ToString(), ViewportSize = new() { Width = 1366, Height = 900 } });
        await page.GotoAsync("/account/sign-in");
        await page.GetByRole(AriaRole.Button, new() { Name = "Sign in as planner" }).ClickAsync();
        await page.WaitForURLAsync(address => !address.Contains("sign-in", StringComparison.Ordinal));
        foreach (var (name, address) in new[] { ("fleet page, 2,000 reservoirs", "/"), ("fleet page, filtered and sorted", "/?area=Area%203&order=water"), ("reservoir page", "/reservoirs/R0007") })
        {
            await TimeAsync(page, name, address);
        }

        return 0;
    }

    private static async Task TimeAsync(IPage page, string name, string address)
    {
        var times = new List<double>();
        for (var n = -2; n < Repeats; n++)
        {
            // a person looks before the next click
            await page.WaitForTimeoutAsync(800);
            var clock = Stopwatch.StartNew();
            await page.GotoAsync(address, new() { WaitUntil = WaitUntilState.DOMContentLoaded });
            await page.Locator("main h1").First.WaitForAsync(new() { State = WaitForSelectorState.Attached });
            var shown = clock.Elapsed.TotalMilliseconds;
            await page.Locator("#content[data-live=true]").WaitForAsync(new() { State = WaitForSelectorState.Attached });
            if (n >= 0)
            {
                times.Add(clock.Elapsed.TotalMilliseconds);
            }
            else
            {
                Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"  warming {name}: shown {shown:0} ms, answers {clock.Elapsed.TotalMilliseconds:0} ms"));
            }
        }

        times.Sort();
        Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{name}: usable in {times[Repeats / 2]:0} ms (median), {times[^1]:0} ms (worst of {Repeats})"));
    }
}
