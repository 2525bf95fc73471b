using Microsoft.AspNetCore.Identity;
using Plant.Register.Access;

namespace Plant.Web.Features.Account;

/// <summary>Refuses passwords that everybody tries first. Length is the only other rule.</summary>
public sealed class CommonPasswordValidator : IPasswordValidator<PlantUser>
{
    private static readonly string[] Common =
    [
        "password", "passwort", "letmein", "welcome", "qwerty", "qwertz", "azerty", "iloveyou", "administrator", "changeme", "sumpledger", "maintenance",
        "123456", "654321", "111111", "000000", "abc123", "monkey", "dragon", "football", "baseball", "sunshine", "princess", "master", "superman", "trustno1",
    ];

    public Task<IdentityResult> ValidateAsync(UserManager<PlantUser> manager, PlantUser user, string? password)
    {
        var text = password ?? string.Empty;
        var rest = Common.Aggregate(text.ToLowerInvariant(), (left, word) => left.Replace(word, string.Empty, StringComparison.Ordinal));
        var name = user.Email?.Split('@')[0];
        var weak = rest.Length < 6 || text.Distinct().Count() < 5 || (name is { Length: > 3 } && text.Contains(name, StringComparison.OrdinalIgnoreCase));
        return Task.FromResult(weak
            ? IdentityResult.Failed(new IdentityError { Code = "CommonPassword", Description = "This password is among the first that others try: choose another one." })
            : IdentityResult.Success);
    }
}
