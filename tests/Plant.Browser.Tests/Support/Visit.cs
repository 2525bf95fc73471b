using Microsoft.Playwright;

namespace Plant.Browser.Tests.Support;

/// <summary>A person's browser session, with what must never happen on any page: console errors, policy violations, requests to elsewhere.</summary>
public sealed class Visit : IAsyncDisposable
{
    private readonly IBrowserContext context;
    private readonly List<string> complaints = [];

    private Visit(IBrowserContext context, IPage page)
    {
        this.context = context;
        Page = page;
    }

    public IPage Page { get; }

    public static async Task<Visit> OpenAsync(IBrowserContext context, Uri home)
    {
        await context.AddInitScriptAsync(
            "document.addEventListener('securitypolicyviolation', e => console.error('policy violation: ' + e.violatedDirective + ' ' + e.blockedURI));");
        var visit = new Visit(context, await context.NewPageAsync());
        visit.Page.Console += (_, message) =>
        {
            if (message.Type == "error")
            {
                visit.Complain($"console: {message.Text}");
            }
        };
        visit.Page.PageError += (_, error) => visit.Complain($"script: {error}");
        visit.Page.Request += (_, request) =>
        {
            var address = new Uri(request.Url);
            if (address.Scheme is "http" or "https" or "ws" or "wss" && address.Host != home.Host)
            {
                visit.Complain($"request to elsewhere: {request.Url}");
            }
        };
        return visit;
    }

    public async Task SignInAsync(string role)
    {
        await Page.GotoAsync("/account/sign-in");
        await Page.GetByRole(AriaRole.Button, new() { NameRegex = new System.Text.RegularExpressions.Regex(role, System.Text.RegularExpressions.RegexOptions.IgnoreCase) }).First.ClickAsync();
        await Page.WaitForURLAsync(address => !address.Contains("/account/", StringComparison.Ordinal));
    }

    /// <summary>Waits until the page answers to typing: before that it is only a picture of itself.</summary>
    public Task LiveAsync() => Page.Locator("#content[data-live=true]").WaitForAsync(new() { Timeout = 15_000, State = WaitForSelectorState.Attached });

    public void AssertNoComplaints() => Assert.Empty(complaints);

    public async ValueTask DisposeAsync() => await context.DisposeAsync();

    private void Complain(string what) => complaints.Add(what);
}
