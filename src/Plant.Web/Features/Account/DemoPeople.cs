using Microsoft.EntityFrameworkCore;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Web.Features.Account;

/// <summary>In Development only: one person a role, who signs in with a click.</summary>
public sealed class DemoPeople(IDbContextFactory<PlantDbContext> contexts, PeopleService people, IHostEnvironment environment)
{
    public bool Offered => environment.IsDevelopment();

    /// <summary>True for one of the demo plant's people.</summary>
    public static bool IsDemo(PlantUser user) => PlantRole.ForPeople.Any(role => EmailOf(role) == user.Email);

    public static string EmailOf(string role) => $"{role}@demo.invalid";

    /// <summary>Makes those who are missing, with passwords that nobody knows.</summary>
    public async Task PrepareAsync(CancellationToken cancellation)
    {
        if (!Offered)
        {
            return;
        }

        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var known = await context.Users.Select(u => u.Email).ToListAsync(cancellation);
        foreach (var role in PlantRole.ForPeople.Where(role => !known.Contains(EmailOf(role))))
        {
            await people.AddAsync(Actor.Console("demo people"), EmailOf(role), role, Convert.ToHexString(System.Security.Cryptography.RandomNumberGenerator.GetBytes(24)), oneTime: false, cancellation);
        }
    }
}
