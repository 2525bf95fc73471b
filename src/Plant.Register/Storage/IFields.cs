using Plant.Physics;

namespace Plant.Register.Storage;

/// <summary>The columns of a file as a caller gives them: every value may be missing, and codes are still text.</summary>
public interface IFields
{
    /// <summary>Adds a refusal for each value that no sane plant has; the same rules for form, API and import.</summary>
    void Check(List<Refusal> refusals);
}
