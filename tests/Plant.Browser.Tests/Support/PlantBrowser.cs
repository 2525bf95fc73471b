using Microsoft.Playwright;
using Plant.Tests.Support;

namespace Plant.Browser.Tests.Support;

/// <summary>One real server with the demo plant and one Chromium, shared by all tests of the collection.</summary>
public sealed class PlantBrowser : IAsyncLifetime
{
    private const string Chromium = "/usr/bin/chromium";

    private IPlaywright? playwright;
    private IBrowser? browser;
    private ServerProcess? server;

    public ServerProcess Server => server!;

    public async ValueTask InitializeAsync()
    {
        Assert.SkipUnless(File.Exists(Chromium), $"{Chromium} is missing: apt-get install chromium");
        // a busy machine is slow, not wrong: budgets are measured apart
        Assertions.SetDefaultExpectTimeout(30_000);
        server = await ServerProcess.StartAsync("Development");
        playwright = await Playwright.CreateAsync();
        browser = await playwright.Chromium.LaunchAsync(new()
        {
            ExecutablePath = Chromium,
            Args =
            [
                "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run",
                "--disable-background-networking", "--disable-component-update", "--disable-sync",
            ],
        });
    }

    /// <summary>A fresh browser session; signs in as the demo person of a role where one is named.</summary>
    public async Task<Visit> VisitAsync(string? role = null, bool dark = false, int width = 1366, int height = 900, Uri? server = null)
    {
        var context = await browser!.NewContextAsync(new()
        {
            BaseURL = (server ?? Server.BaseAddress).ToString(),
            ViewportSize = new() { Width = width, Height = height },
            ColorScheme = dark ? ColorScheme.Dark : ColorScheme.Light,
            Locale = "en-GB",
            TimezoneId = "UTC",
        });
        var visit = await Visit.OpenAsync(context, server ?? Server.BaseAddress);
        if (role is not null)
        {
            await visit.SignInAsync(role);
        }

        return visit;
    }

    public async ValueTask DisposeAsync()
    {
        if (browser is not null)
        {
            await browser.DisposeAsync();
        }

        playwright?.Dispose();
        if (server is not null)
        {
            await server.DisposeAsync();
        }
    }
}

[CollectionDefinition(Name)]
public sealed class PlantCollection : ICollectionFixture<PlantBrowser>
{
    public const string Name = "one plant, one browser";
}
