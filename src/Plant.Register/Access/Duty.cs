namespace Plant.Register.Access;

/// <summary>What a role may do; services ask here, pages and endpoints too, so that there is one matrix.</summary>
public enum Duty
{
    /// <summary>Read the register and its assessments.</summary>
    Read,

    /// <summary>Create, correct and withdraw reservoirs, fluids, separators, limits; import.</summary>
    EditRegister,

    /// <summary>Record and correct laboratory results.</summary>
    RecordSamples,

    /// <summary>Record drains, top-ups and separator runs.</summary>
    RecordWork,

    /// <summary>Post sensor readings.</summary>
    PostReadings,

    /// <summary>Draft work orders and rounds.</summary>
    PlanWork,

    /// <summary>Approve or refuse work orders.</summary>
    ApproveWork,

    /// <summary>Users, tokens, backups.</summary>
    Administer,
}

/// <summary>The matrix of duties and roles.</summary>
public static class Duties
{
    private static readonly Dictionary<Duty, string[]> Allowed = new()
    {
        [Duty.Read] = [PlantRole.Planner, PlantRole.Lab, PlantRole.Supervisor, PlantRole.Administrator],
        [Duty.EditRegister] = [PlantRole.Planner, PlantRole.Administrator],
        [Duty.RecordSamples] = [PlantRole.Lab, PlantRole.Administrator],
        [Duty.RecordWork] = [PlantRole.Planner, PlantRole.Lab, PlantRole.Supervisor, PlantRole.Administrator],
        [Duty.PostReadings] = [PlantRole.Sensor, PlantRole.Planner, PlantRole.Lab, PlantRole.Administrator],
        [Duty.PlanWork] = [PlantRole.Planner, PlantRole.Supervisor, PlantRole.Administrator],
        [Duty.ApproveWork] = [PlantRole.Supervisor],
        [Duty.Administer] = [PlantRole.Administrator],
    };

    public static IReadOnlyList<string> RolesFor(Duty duty) => Allowed[duty];

    public static bool May(this Actor actor, Duty duty) => actor.Is(Allowed[duty]);
}
