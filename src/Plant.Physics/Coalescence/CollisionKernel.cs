using Plant.Physics.Droplets;

namespace Plant.Physics.Coalescence;

/// <summary>All that makes drops of water meet in oil at rest or in slow flow, times the share of meetings that count.</summary>
public sealed record CollisionKernel
{
    /// <summary>Temperature [K].</summary>
    public required double TemperatureK { get; init; }

    /// <summary>Dynamic viscosity of the oil [Pa·s].</summary>
    public required double ViscosityPaS { get; init; }

    /// <summary>Density of water less density of the oil [kg/m³].</summary>
    public required double DensityDifferenceKgM3 { get; init; }

    /// <summary>Shear rate [1/s].</summary>
    public double ShearRatePerS { get; init; }

    /// <summary>Share of collisions that end in one drop [0 to 1].</summary>
    public double Efficiency { get; init; } = 1;

    /// <summary>Electric field [V/m].</summary>
    public double FieldVM { get; init; }

    /// <summary>Relative permittivity of the oil [1].</summary>
    public double RelativePermittivity { get; init; } = 2.2;

    /// <summary>Speed of a rigid drop, whichever way it goes.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <returns>Speed [m/s].</returns>
    /// <remarks>Equation: g·d²·|Δρ|/(18μ). Source: Stokes 1851. Valid for: Reynolds numbers below 0.3.</remarks>
    public double SpeedMS(double diameterM) => Math.Abs(Settling.StokesMS(diameterM, DensityDifferenceKgM3, ViscosityPaS));

    /// <summary>Rate constant of coalescence.</summary>
    /// <param name="firstM">Diameter of the one drop [m].</param>
    /// <param name="secondM">Diameter of the other [m].</param>
    /// <returns>Rate constant [m³/s].</returns>
    /// <remarks>Equation: λ·(Brownian + laminar shear + differential settling + field). Source: each as <see cref="CollisionRate"/>. Valid for: independent causes.</remarks>
    public double RateM3S(double firstM, double secondM)
    {
        var rate = CollisionRate.BrownianM3S(firstM, secondM, TemperatureK, ViscosityPaS)
            + CollisionRate.LaminarShearM3S(firstM, secondM, ShearRatePerS)
            + CollisionRate.DifferentialSettlingM3S(firstM, secondM, SpeedMS(firstM), SpeedMS(secondM));
        if (FieldVM > 0)
        {
            rate += CollisionRate.FieldM3S(firstM, secondM, FieldVM, RelativePermittivity, ViscosityPaS);
        }

        return Guard.Between(Efficiency, 0, 1) * rate;
    }

    /// <summary>How much more often two equal drops meet for the field.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <returns>Factor, 1 without a field [1].</returns>
    /// <remarks>Equation: K with field over K without. Source: judgement, see <see cref="CollisionRate.FieldM3S"/>. Valid for: order of magnitude.</remarks>
    public double FieldFactor(double diameterM)
    {
        var without = (this with { FieldVM = 0, Efficiency = 1 }).RateM3S(diameterM, diameterM);
        return (this with { Efficiency = 1 }).RateM3S(diameterM, diameterM) / without;
    }
}
