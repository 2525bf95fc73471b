using System.Security.Cryptography;
using System.Text;
using Microsoft.EntityFrameworkCore;
using Plant.Register;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Web.Features.Account;

/// <summary>With nobody in the register, the console shows a code that makes the first administrator; it is good for an hour and once.</summary>
public sealed class FirstAdministrator(IDbContextFactory<PlantDbContext> contexts, PeopleService people, TimeProvider clock, IHostEnvironment environment)
{
    private static readonly TimeSpan Life = TimeSpan.FromHours(1);

    private string? code;
    private DateTimeOffset made;

    /// <summary>Prints the code where nobody can sign in yet.</summary>
    public async Task OfferAsync(CancellationToken cancellation)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        if (environment.IsDevelopment() || await context.Users.AnyAsync(cancellation))
        {
            return;
        }

        code = Convert.ToHexStringLower(RandomNumberGenerator.GetBytes(10));
        made = clock.GetUtcNow();
        Console.Out.WriteLine($"Nobody can sign in yet. Within an hour, make the first administrator at /account/first with the code {code}");
    }

    public async Task<Outcome<string>> MakeAsync(string given, string email, string password, CancellationToken cancellation)
    {
        if (code is null || clock.GetUtcNow() - made > Life || !CryptographicOperations.FixedTimeEquals(Encoding.UTF8.GetBytes(given), Encoding.UTF8.GetBytes(code)))
        {
            return Outcome<string>.Refused(OutcomeKind.Forbidden, "the code is wrong or older than an hour: start the program again for a new one");
        }

        var outcome = await people.AddAsync(Actor.Console("first administrator"), email, PlantRole.Administrator, password, oneTime: false, cancellation);
        if (outcome.IsDone)
        {
            code = null;
        }

        return outcome;
    }
}
