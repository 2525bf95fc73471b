using System.Net;
using System.Net.Http.Headers;
using System.Text.RegularExpressions;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.Extensions.DependencyInjection;
using Plant.Register.Access;

namespace Plant.Web.Tests.Support;

/// <summary>The real server on Kestrel with the demo plant on a real SQLite file, shared by the tests of the collection.</summary>
public sealed partial class WebPlant : IAsyncLifetime
{
    private readonly Dictionary<string, string> tokens = [];
    private Factory? factory;
    private string folder = "";

    /// <summary>Settings of this server beyond the usual ones.</summary>
    public Dictionary<string, string> Settings { get; init; } = [];

    public IServiceProvider Services => factory!.Services;

    public Uri Address => factory!.ClientOptions.BaseAddress;

    public async ValueTask InitializeAsync()
    {
        folder = Directory.CreateTempSubdirectory("plant-web-").FullName;
        factory = new Factory(folder, Settings);
        factory.StartServer();
        foreach (var role in PlantRole.All)
        {
            tokens[role] = (await Services.GetRequiredService<TokenService>().CreateAsync(Actor.Console("test"), $"test {role}", role, 1)).Value!;
        }
    }

    public async ValueTask DisposeAsync()
    {
        if (factory is not null)
        {
            await factory.DisposeAsync();
        }

        Microsoft.Data.Sqlite.SqliteConnection.ClearAllPools();
        Directory.Delete(folder, recursive: true);
    }

    /// <summary>Nobody signed in; redirects are not followed.</summary>
    public HttpClient Anonymous() => new(new HttpClientHandler { AllowAutoRedirect = false, CookieContainer = new CookieContainer() }) { BaseAddress = Address };

    /// <summary>A program with a token.</summary>
    public HttpClient Token(string role)
    {
        var http = Anonymous();
        http.DefaultRequestHeaders.Authorization = new AuthenticationHeaderValue("Bearer", tokens[role]);
        return http;
    }

    /// <summary>A person who signed in on the page.</summary>
    public async Task<HttpClient> PersonAsync(string role)
    {
        var http = Anonymous();
        var form = await FormTokenAsync(http, "/account/sign-in");
        using var content = new FormUrlEncodedContent(new Dictionary<string, string> { ["role"] = role, ["__RequestVerificationToken"] = form });
        using var answer = await http.PostAsync(new Uri("/account/demo", UriKind.Relative), content);
        Assert.Equal(HttpStatusCode.Found, answer.StatusCode);
        return http;
    }

    public static async Task<string> FormTokenAsync(HttpClient http, string page) =>
        AntiforgeryField().Match(await http.GetStringAsync(new Uri(page, UriKind.Relative))).Groups[1].Value;

    [GeneratedRegex("name=\"__RequestVerificationToken\" value=\"([^\"]+)\"")]
    private static partial Regex AntiforgeryField();

    private sealed class Factory : WebApplicationFactory<Program>
    {
        private readonly string folder;
        private readonly Dictionary<string, string> settings;

        public Factory(string folder, Dictionary<string, string> settings)
        {
            (this.folder, this.settings) = (folder, settings);
            UseKestrel(0);
        }

        protected override void ConfigureWebHost(IWebHostBuilder builder)
        {
            builder.UseEnvironment("Development");
            builder.UseSetting("Data:Folder", folder);
            foreach (var (key, value) in settings)
            {
                builder.UseSetting(key, value);
            }

            builder.UseSetting("Logging:LogLevel:Default", "Warning");
        }
    }
}

[CollectionDefinition(Name)]
public sealed class WebPlantCollection : ICollectionFixture<WebPlant>
{
    public const string Name = "one server";
}
