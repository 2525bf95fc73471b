using Plant.Physics.Fluids;

namespace Plant.Physics.Separators;

/// <summary>A fibre coalescer on one fluid at one temperature.</summary>
public sealed class FibreCoalescer
{
    private readonly FibreBed bed;
    private readonly double temperatureK;

    /// <summary>Takes the properties at the temperature once.</summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="bed">The bed with its flow.</param>
    /// <param name="working">Receives the steps, or null.</param>
    public FibreCoalescer(FluidModel fluid, double temperatureK, FibreBed bed, Working? working = null)
    {
        ArgumentNullException.ThrowIfNull(fluid);
        ArgumentNullException.ThrowIfNull(bed);
        Guard.Positive(bed.FaceVelocityMS);
        Guard.Between(bed.Stages, 1, 1000);
        this.bed = bed;
        this.temperatureK = Guard.Positive(temperatureK);
        ViscosityPaS = fluid.DynamicViscosityPaS(temperatureK, working);
        PressureDropPa = bed.Stages * FibreFiltration.PressureDropPa(ViscosityPaS, bed.FaceVelocityMS, bed.ThicknessM, bed.FibreM, bed.Solidity);
    }

    /// <summary>Dynamic viscosity of the oil [Pa·s].</summary>
    public double ViscosityPaS { get; }

    /// <summary>Pressure drop of all stages [Pa].</summary>
    public double PressureDropPa { get; }

    /// <summary>What one fibre catches of one size.</summary>
    /// <param name="diameterM">Diameter of the drop [m].</param>
    /// <returns>Single-fibre efficiency [1].</returns>
    /// <remarks>Equation: interception + diffusion. Source: Kuwabara 1959; Lee and Liu 1982. Valid for: mechanisms that do not overlap, drops that do not bounce.</remarks>
    public double FibreEfficiency(double diameterM) =>
        FibreFiltration.Interception(diameterM, bed.FibreM, bed.Solidity) + FibreFiltration.Diffusion(Peclet(diameterM), bed.Solidity);

    /// <summary>Share of one size that the stages catch.</summary>
    /// <param name="diameterM">Diameter of the drop [m].</param>
    /// <returns>Share [0 to 1].</returns>
    /// <remarks>Equation: 1 − (1 − E)^n, E = 1 − exp(−4α·η·L/(π·d_f(1 − α))). Source: penetration of a bed (from memory). Valid for: drops that stay caught; for a spray carry the sizes, not the total.</remarks>
    public double Removal(double diameterM) =>
        FibreFiltration.Removal(FibreEfficiency(diameterM), bed.Solidity, bed.Stages * bed.ThicknessM, bed.FibreM);

    /// <summary>Péclet number of a drop.</summary>
    /// <param name="diameterM">Diameter of the drop [m].</param>
    /// <returns>Péclet number [1].</returns>
    /// <remarks>Equation: U·d_f/D. Source: definition with the face velocity. Valid for: any.</remarks>
    public double Peclet(double diameterM) => bed.FaceVelocityMS * bed.FibreM / FibreFiltration.DiffusionCoefficientM2S(temperatureK, ViscosityPaS, diameterM);
}
