using Plant.Register.Access;
using Plant.Register.Storage;
using Plant.Web.Features.Account;

namespace Plant.Web.Commands;

/// <summary>token, user.</summary>
internal static class AccessCommands
{
    public static void AddPeople(IServiceCollection services) => services.AddPeople();

    public static async Task<int> TokenAsync(CommandContext context)
    {
        context.NoWords();
        var days = context.Line["days"] is { } text
            ? int.TryParse(text, System.Globalization.NumberStyles.None, System.Globalization.CultureInfo.InvariantCulture, out var number) ? number : throw new UsageException($"--days \"{text}\" must be a whole number")
            : (int?)null;
        var name = context.Line["name"] ?? throw new UsageException("--name is missing");
        var role = context.Line["role"] ?? throw new UsageException("--role is missing");
        await context.Get<DatabaseMigrator>().MigrateAsync();
        var outcome = await context.Get<TokenService>().CreateAsync(Actor.Console("token"), name, role, days);
        foreach (var refusal in outcome.Refusals)
        {
            context.Error.WriteLine($"{refusal.Field} \"{refusal.Value}\" {refusal.Reason}");
        }

        if (!outcome.IsDone)
        {
            return CommandRunner.Refused;
        }

        context.Out.WriteLine($"Token \"{name}\" for role {role}. It is shown this once:");
        context.Out.WriteLine(outcome.Value);
        return CommandRunner.Done;
    }

    public static async Task<int> UserAsync(CommandContext context)
    {
        if (context.Line.Words is not ["add"])
        {
            throw new UsageException("only \"user add\" is known");
        }

        var email = context.Line["email"] ?? throw new UsageException("--email is missing");
        var role = context.Line["role"] ?? throw new UsageException("--role is missing");
        await context.Get<DatabaseMigrator>().MigrateAsync();
        await using var scope = context.Services.CreateAsyncScope();
        var outcome = await scope.ServiceProvider.GetRequiredService<PeopleService>().AddAsync(Actor.Console("user add"), email, role);
        foreach (var refusal in outcome.Refusals)
        {
            context.Error.WriteLine($"{refusal.Field} \"{refusal.Value}\" {refusal.Reason}");
        }

        if (!outcome.IsDone)
        {
            context.Error.WriteLine(outcome.Message ?? "nobody was added");
            return CommandRunner.Refused;
        }

        context.Out.WriteLine($"{email} may sign in as {role} with this one-time password, and chooses an own one then:");
        context.Out.WriteLine(outcome.Value);
        return CommandRunner.Done;
    }
}
