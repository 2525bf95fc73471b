using System.Security.Cryptography;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Web.Features.Account;

/// <summary>People who sign in.</summary>
public sealed class PeopleService(RegisterWriter writer, IPasswordHasher<PlantUser> hasher, ILookupNormalizer normalizer)
{
    private const int OneTimeLength = 20;

    /// <summary>Letters and digits that are not taken for one another.</summary>
    private const string OneTimeAlphabet = "abcdefghjkmnpqrstuvwxyzABCDEFGHJKMNPQRSTUVWXYZ23456789";

    /// <summary>Adds a person and returns the one-time password.</summary>
    public Task<Outcome<string>> AddAsync(Actor actor, string email, string role, CancellationToken cancellation = default) =>
        AddAsync(actor, email, role, RandomNumberGenerator.GetString(OneTimeAlphabet, OneTimeLength), oneTime: true, cancellation);

    /// <summary>Adds a person with a password.</summary>
    public async Task<Outcome<string>> AddAsync(Actor actor, string email, string role, string password, bool oneTime, CancellationToken cancellation = default)
    {
        if (!actor.May(Duty.Administer))
        {
            return Outcome<string>.Refused(OutcomeKind.Forbidden, $"{actor.Name} may not add people");
        }

        var refusals = new List<Refusal>();
        refusals.Required("email", email, 200);
        if (!email.Contains('@', StringComparison.Ordinal) || email.Any(char.IsWhiteSpace))
        {
            refusals.Add(new Refusal("email", email, "must be an e-mail address"));
        }

        if (!PlantRole.ForPeople.Contains(role))
        {
            refusals.Add(new Refusal("role", role, $"must be one of {string.Join(", ", PlantRole.ForPeople)}"));
        }

        if (refusals.Count > 0)
        {
            return Outcome<string>.Invalid(refusals);
        }

        return await writer.WriteAsync(actor, null, async (context, stop) =>
        {
            var normalized = normalizer.NormalizeEmail(email);
            if (await context.Users.AnyAsync(u => u.NormalizedEmail == normalized, stop))
            {
                return Outcome<string>.Refused(OutcomeKind.Conflict, $"{email} is known already");
            }

            var person = new PlantUser
            {
                Id = Guid.CreateVersion7(),
                UserName = email,
                NormalizedUserName = normalizer.NormalizeName(email),
                Email = email,
                NormalizedEmail = normalized,
                EmailConfirmed = true,
                LockoutEnabled = true,
                MustChangePassword = oneTime,
                SecurityStamp = Guid.CreateVersion7().ToString("N"),
            };
            person.PasswordHash = hasher.HashPassword(person, password);
            context.Users.Add(person);
            context.UserRoles.Add(new IdentityUserRole<Guid> { UserId = person.Id, RoleId = await RoleAsync(context, role, stop) });
            return Outcome<string>.Done(password);
        }, cancellation);
    }

    private async Task<Guid> RoleAsync(PlantDbContext context, string name, CancellationToken cancellation)
    {
        var normalized = normalizer.NormalizeName(name);
        var known = await context.Roles.FirstOrDefaultAsync(r => r.NormalizedName == normalized, cancellation);
        if (known is not null)
        {
            return known.Id;
        }

        var role = new IdentityRole<Guid> { Id = Guid.CreateVersion7(), Name = name, NormalizedName = normalized };
        context.Roles.Add(role);
        return role.Id;
    }
}
