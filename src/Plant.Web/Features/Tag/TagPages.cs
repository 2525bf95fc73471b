using System.Globalization;
using System.Security.Claims;
using Microsoft.AspNetCore.Mvc;
using Plant.Register;
using Plant.Register.Access;
using Plant.Register.Laboratory;
using Plant.Register.Reservoirs;
using Plant.Web.Features.Account;

namespace Plant.Web.Features.Tag;

/// <summary>What the round walker's form posts to. The form carries the id and so the time of its visit: sent twice, it has one effect.</summary>
public static class TagPages
{
    public static void MapTag(this IEndpointRouteBuilder routes) => routes.MapPost("/t/{tag}", LogAsync).RequireAuthorization(Duty.RecordWork.ToString()).ExcludeFromDescription();

    private static async Task<IResult> LogAsync(
        string tag, ClaimsPrincipal user, DrainService drains, TopUpService topUps, BottleService bottles, TimeProvider clock, [FromForm] WalkerForm form, CancellationToken stop)
    {
        var at = DateTimeOffset.FromUnixTimeMilliseconds(TimeOf(form.Visit) ?? clock.GetUtcNow().ToUnixTimeMilliseconds());
        var actor = user.ToActor();
        if (!Number(form.Water, out var water) || !Number(form.Oil, out var oil) || !Number(form.TopUp, out var topUp))
        {
            return Back(tag, "A number was not understood: type digits with a point or a comma.", done: false);
        }

        water ??= form.Looked == "none" ? 0 : null;
        var said = new List<string>();
        var wrong = water is null ? null : Told(await drains.CreateAsync(actor, form.Visit, new DrainFields { Tag = tag, DrainedAt = at, WaterL = water, OilL = oil }, stop));
        if (wrong is null && water is not null)
        {
            said.Add(string.Create(CultureInfo.InvariantCulture, $"{water:0.##} L of water drained"));
        }

        if (wrong is null && topUp > 0)
        {
            wrong = Told(await topUps.CreateAsync(actor, null, new TopUpFields { Tag = tag, AddedAt = at, OilL = topUp }, stop));
            said.Add(string.Create(CultureInfo.InvariantCulture, $"{topUp:0.##} L topped up"));
        }

        if (wrong is null && !string.IsNullOrWhiteSpace(form.Bottle))
        {
            wrong = Told(await bottles.CreateAsync(actor, null, new BottleFields { Code = form.Bottle.Trim(), Tag = tag, Point = "return", TakenAt = at }, stop));
            said.Add($"bottle {form.Bottle.Trim()} taken");
        }

        return wrong is not null ? Back(tag, wrong, done: false)
            : said.Count == 0 ? Back(tag, "Nothing was entered: type what was drained, or choose what you saw.", done: false)
            : Back(tag, "Saved: " + string.Join(", ", said) + ".", done: true);
    }

    private static string? Told<T>(Outcome<T> outcome) => outcome.IsDone ? null : outcome.Message ?? string.Join("; ", outcome.Refusals.Select(r => $"{r.Field} {r.Reason}"));

    private static bool Number(string? text, out double? value)
    {
        value = null;
        if (string.IsNullOrWhiteSpace(text))
        {
            return true;
        }

        var read = BenchArithmetic.TryNumber(text, out var number);
        value = number;
        return read;
    }

    /// <summary>Unix milliseconds in a version-7 id; null for another kind of id.</summary>
    private static long? TimeOf(Guid id) => id.Version == 7 ? Convert.ToInt64(id.ToString("N")[..12], 16) : null;

    private static Microsoft.AspNetCore.Http.HttpResults.RedirectHttpResult Back(string tag, string message, bool done) => TypedResults.LocalRedirect($"/t/{Uri.EscapeDataString(tag)}?said={Uri.EscapeDataString(message)}&done={(done ? "true" : "false")}");

    /// <summary>What the walker typed.</summary>
    public sealed record WalkerForm
    {
        public Guid Visit { get; set; }

        public string? Water { get; set; }

        public string? Oil { get; set; }

        public string? Looked { get; set; }

        public string? TopUp { get; set; }

        public string? Bottle { get; set; }
    }
}
