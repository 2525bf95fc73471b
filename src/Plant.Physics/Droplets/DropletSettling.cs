using Plant.Physics.Fluids;
using Plant.Physics.Water;

namespace Plant.Physics.Droplets;

/// <summary>Settling of water drops in one fluid at one temperature.</summary>
public sealed class DropletSettling
{
    private readonly double viscosityRatio;

    /// <summary>Takes the properties at the temperature once.</summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="working">Receives the steps, or null.</param>
    public DropletSettling(FluidModel fluid, double temperatureK, Working? working = null)
    {
        ArgumentNullException.ThrowIfNull(fluid);
        ViscosityPaS = fluid.DynamicViscosityPaS(temperatureK, working);
        DensityKgM3 = fluid.DensityKgM3(temperatureK);
        DensityDifferenceKgM3 = fluid.DensityDifferenceKgM3(temperatureK);
        viscosityRatio = WaterProperties.ViscosityPaS(temperatureK) / ViscosityPaS;
    }

    /// <summary>Dynamic viscosity of the fluid [Pa·s].</summary>
    public double ViscosityPaS { get; }

    /// <summary>Density of the fluid [kg/m³].</summary>
    public double DensityKgM3 { get; }

    /// <summary>Density of water less density of the fluid [kg/m³].</summary>
    public double DensityDifferenceKgM3 { get; }

    /// <summary>Velocity of a drop.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <param name="volumeFraction">Volume fraction of water [0 to 1).</param>
    /// <param name="mobileInterface">True for a clean drop (Hadamard–Rybczynski), false for a rigid sphere (Schiller–Naumann).</param>
    /// <returns>Velocity [m/s]; positive down.</returns>
    /// <remarks>Equation: velocity of one drop × (1 − φ)^4.65. Source: Schiller and Naumann 1933; Hadamard 1911; Richardson and Zaki 1954. Valid for: Reynolds numbers below 1000, fractions below 0.4.</remarks>
    public double VelocityMS(double diameterM, double volumeFraction = 0, bool mobileInterface = false)
    {
        var single = mobileInterface
            ? Settling.StokesMS(diameterM, DensityDifferenceKgM3, ViscosityPaS) * Settling.HadamardRybczynskiFactor(viscosityRatio)
            : Settling.SchillerNaumannMS(diameterM, DensityDifferenceKgM3, ViscosityPaS, DensityKgM3);
        return volumeFraction == 0 ? single : single * Settling.RichardsonZakiFactor(volumeFraction);
    }

    /// <summary>Reynolds number of a drop.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <param name="velocityMS">Velocity [m/s].</param>
    /// <returns>Reynolds number [1].</returns>
    /// <remarks>Equation: ρ·|v|·d/μ. Source: definition. Valid for: any.</remarks>
    public double Reynolds(double diameterM, double velocityMS) => DensityKgM3 * Math.Abs(velocityMS) * diameterM / ViscosityPaS;

    /// <summary>Size of the drop that moves at a velocity.</summary>
    /// <param name="velocityMS">Velocity, either way [m/s].</param>
    /// <returns>Diameter [m]; null where no drop up to 100 mm is as fast, as near equal density.</returns>
    /// <remarks>Equation: inverse of the velocity with Schiller–Naumann drag, by bisection of its logarithm. Source: Schiller and Naumann 1933 (read). Valid for: Reynolds numbers below 1000.</remarks>
    public double? CutSizeM(double velocityMS)
    {
        var target = Math.Abs(Guard.Finite(velocityMS));
        double low = 1e-9, high = 0.1;
        if (Math.Abs(VelocityMS(high)) < target)
        {
            return null;
        }

        for (var i = 0; i < 80; i++)
        {
            var middle = Math.Sqrt(low * high);
            if (Math.Abs(VelocityMS(middle)) < target)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return Math.Sqrt(low * high);
    }
}
