using Plant.Web.Api;
using Plant.Web.Commands;
using Plant.Web.Features.Account;
using Plant.Web.Features.Bench;
using Plant.Web.Features.Calculators;
using Plant.Web.Features.Fleet;
using Plant.Web.Features.Orders;
using Plant.Web.Features.Records;
using Plant.Web.Features.Register;
using Plant.Web.Features.Reservoir;
using Plant.Web.Features.Tag;
using Plant.Web.Hosting;
using Plant.Web.Shared;

if (await CommandRunner.TryRunAsync(args) is { } code)
{
    return code;
}

var builder = WebApplication.CreateBuilder(new WebApplicationOptions
{
    Args = args is ["serve", .. var rest] ? rest : args,
    ContentRootPath = File.Exists("appsettings.json") ? null : AppContext.BaseDirectory,
});
var settings = PlantSettings.Read(builder.Configuration);
settings.PrepareFolder();
builder.AddHosting(settings);
builder.Services.AddPlant(settings);
builder.Services.AddAccount();
builder.Services.AddApi();
builder.Services.AddLook();
builder.Services.AddFleet();
builder.Services.AddReservoirPages();
builder.Services.AddRegisterPages();
builder.Services.AddOrders();
builder.Services.AddRecords();
builder.Services.AddCalculators();

var app = builder.Build();
app.UseHosting();
app.MapHealth();
app.MapApi();
app.MapAccount();
app.MapFleet();
app.MapRegister();
app.MapOrders();
app.MapBench();
app.MapTag();
app.MapRecords();
app.MapRazorComponents<App>().AddInteractiveServerRenderMode();
await app.PrepareAsync();
await app.RunAsync();
return CommandRunner.Done;

/// <summary>The program; tests start it.</summary>
public sealed partial class Program;
