namespace Plant.Register.Access;

/// <summary>Who acts: every write names one, and services check its roles.</summary>
/// <param name="Name">Sign-in name, token name, or the command.</param>
/// <param name="Roles">Roles.</param>
public sealed record Actor(string Name, IReadOnlySet<string> Roles)
{
    /// <summary>The person's id; null for a token or a command. A person's roles are asked again at each write.</summary>
    public Guid? PersonId { get; init; }

    /// <summary>When the person last proved who it is (UTC); null: long ago.</summary>
    public DateTime? ConfirmedAt { get; init; }

    /// <summary>Somebody at the machine's own console: may do what an administrator may.</summary>
    public static Actor Console(string command) => new($"command {command}", new HashSet<string> { PlantRole.Administrator });

    public bool Is(params ReadOnlySpan<string> roles)
    {
        foreach (var role in roles)
        {
            if (Roles.Contains(role))
            {
                return true;
            }
        }

        return false;
    }
}
