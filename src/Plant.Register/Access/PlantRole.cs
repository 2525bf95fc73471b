namespace Plant.Register.Access;

/// <summary>The roles. <see cref="Sensor"/> is for tokens only.</summary>
public static class PlantRole
{
    public const string Planner = "planner";
    public const string Lab = "lab";
    public const string Supervisor = "supervisor";
    public const string Administrator = "administrator";
    public const string Sensor = "sensor";

    /// <summary>Roles that a person can have.</summary>
    public static readonly IReadOnlyList<string> ForPeople = [Planner, Lab, Supervisor, Administrator];

    public static readonly IReadOnlyList<string> All = [Planner, Lab, Supervisor, Administrator, Sensor];
}
