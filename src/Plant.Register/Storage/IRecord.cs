namespace Plant.Register.Storage;

/// <summary>A recorded thing: corrected by a new version, removed by a withdrawal, never overwritten or deleted.</summary>
public interface IRecord
{
    /// <summary>Made by whoever records it, so that a repeated request has one effect.</summary>
    Guid Id { get; }

    /// <summary>Renewed at each change by the context: a save that names an older one is stale and refused.</summary>
    Guid Token { get; set; }

    /// <summary>When it was withdrawn (UTC); a withdrawn record counts for nothing and stays readable.</summary>
    DateTime? WithdrawnAt { get; set; }

    /// <summary>What the plant calls it: the key of its file (tag; sample and replicate; tag and time).</summary>
    string NaturalKey { get; }
}
