using System.Globalization;
using Plant.Physics.Fluids;
using Plant.Physics.Separators;

namespace Plant.Physics.Calculators;

/// <summary>Asks what a fibre coalescer catches.</summary>
public sealed record CoalescerRequest
{
    /// <summary>The fluid.</summary>
    public FluidRequest? Fluid { get; init; }

    /// <summary>Temperature [°C].</summary>
    public double? TemperatureC { get; init; }

    /// <summary>Flow over face area [mm/s].</summary>
    public double? FaceVelocityMmPerS { get; init; }

    /// <summary>Diameter of the fibres [µm].</summary>
    public double? FibreUm { get; init; }

    /// <summary>Volume fraction of fibres [0 to 1].</summary>
    public double? Solidity { get; init; }

    /// <summary>Thickness of one stage [mm].</summary>
    public double? ThicknessMm { get; init; }

    /// <summary>Diameters of drops [µm].</summary>
    public IReadOnlyList<double>? DropletUm { get; init; }

    /// <summary>Number of equal stages; one where it is not given.</summary>
    public double? Stages { get; init; }
}

/// <summary>One size of drops.</summary>
/// <param name="DropletUm">Diameter [µm].</param>
/// <param name="RemovalFraction">Share that is caught [0 to 1].</param>
public sealed record CoalescerRow(double DropletUm, double RemovalFraction);

/// <summary>What a fibre coalescer catches.</summary>
/// <param name="Results">A row a size.</param>
/// <param name="PressureDropKPa">Pressure drop of all stages [kPa].</param>
/// <param name="Working">How it came about.</param>
public sealed record CoalescerResponse(IReadOnlyList<CoalescerRow> Results, double PressureDropKPa, IReadOnlyList<WorkingStep> Working);

/// <summary>A fibre coalescer.</summary>
public static class CoalescerCalculator
{
    private const double HamakerJ = 4e-21;

    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<CoalescerResponse> Compute(CoalescerRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var fluid = FluidRequest.Model(request.Fluid, refusals);
        var temperature = refusals.TemperatureK("temperatureC", request.TemperatureC);
        var bed = Bed(request, refusals);
        var sizes = refusals.DropletsUm(request.DropletUm);
        if (refusals.Count > 0 || fluid is null)
        {
            return new(null, refusals);
        }

        var working = new Working();
        var coalescer = new FibreCoalescer(fluid, temperature, bed, working);
        var rows = sizes.Select(size => new CoalescerRow(size, coalescer.Removal(size * 1e-6))).ToList();
        Explain(fluid, temperature, bed, coalescer, sizes, working);
        return new(new CoalescerResponse(rows, coalescer.PressureDropPa / 1000, working.Steps), []);
    }

    private static FibreBed Bed(CoalescerRequest request, List<Refusal> refusals)
    {
        var velocity = refusals.Within("faceVelocityMmPerS", request.FaceVelocityMmPerS, 0, 1e4, "mm/s", openLow: true) / 1000;
        var fibre = refusals.Within("fibreUm", request.FibreUm, 0, 1e4, "µm", openLow: true) * 1e-6;
        var solidity = refusals.Within("solidity", request.Solidity, 0, 0.7, "", openLow: true);
        var thickness = refusals.Within("thicknessMm", request.ThicknessMm, 0, 1e4, "mm", openLow: true) / 1000;
        var stages = refusals.Within("stages", request.Stages ?? 1, 1, 100, "");
        if (!double.IsNaN(stages) && stages != Math.Floor(stages))
        {
            refusals.Add(new Refusal("stages", stages.ToString("R", CultureInfo.InvariantCulture), "must be a whole number from 1 to 100"));
        }

        return new FibreBed { FaceVelocityMS = velocity, FibreM = fibre, Solidity = solidity, ThicknessM = thickness, Stages = double.IsNaN(stages) ? 1 : (int)stages };
    }

    private static void Explain(FluidModel fluid, double temperatureK, FibreBed bed, FibreCoalescer coalescer, IReadOnlyList<double> sizes, Working working)
    {
        var size = sizes[0] * 1e-6;
        var reynolds = fluid.DensityKgM3(temperatureK) * bed.FaceVelocityMS * bed.FibreM / coalescer.ViscosityPaS;
        working.Add("Kuwabara factor", FormattableString.Invariant($"−½·ln α − ¾ + α − α²/4, α = {bed.Solidity}"), FibreFiltration.KuwabaraFactor(bed.Solidity), "1", Citations.Kuwabara,
            reynolds > 1 ? FormattableString.Invariant($"Reynolds number {reynolds:0.#} of the fibre is above 1: the flow does not creep") : null);
        working.Add("interception, first size", "exact stream function, R = d/d_f", FibreFiltration.Interception(size, bed.FibreM, bed.Solidity), "1", Citations.Kuwabara,
            1 + (sizes.Max() * 1e-6 / bed.FibreM) > FibreFiltration.CellEdge(bed.Solidity) ? "a drop is larger than the space between fibres: it is held as by a sieve" : null);
        working.Add("diffusion coefficient, first size", "kT/(3πμd)", FibreFiltration.DiffusionCoefficientM2S(temperatureK, coalescer.ViscosityPaS, size), "m²/s", Citations.StokesEinstein);
        working.Add("diffusion, first size", FormattableString.Invariant($"1.6·((1 − α)/Ku)^(1/3)·Pe^(−2/3), Pe = {coalescer.Peclet(size):0.###e+0}"), FibreFiltration.Diffusion(coalescer.Peclet(size), bed.Solidity), "1", Citations.LeeLiu,
            coalescer.Peclet(size) < 10 ? "a Péclet number below 10 is outside the range of the formula" : null);
        working.Add("London attraction, first size, not counted", FormattableString.Invariant($"(2A·d²(1 − α)²/(3μU·Ku²·d_f⁴))^(1/3), A = {HamakerJ} J"),
            FibreFiltration.Attraction(HamakerJ, size, coalescer.ViscosityPaS, bed.FaceVelocityMS, bed.FibreM, bed.Solidity), "1", Citations.SpielmanGoren);
        working.Add("removed share, first size", FormattableString.Invariant($"1 − exp(−4α·η·L/(π·d_f(1 − α))) in {bed.Stages} stages"), coalescer.Removal(size), "1", Citations.FibreBed,
            fluid.InterfacialTensionNM < 0.015 ? "below 15 mN/m drops are caught but hardly merge: coalescers fail" : null);
        working.Add("pressure drop", "μUL/d_f²·64α^1.5(1 + 56α³), all stages", coalescer.PressureDropPa / 1000, "kPa", Citations.Davies,
            bed.Solidity is < 0.006 or > 0.3 ? "solidity is outside 0.006 to 0.3: extrapolated" : null);
        if (fluid.HasSaturation)
        {
            working.Add("dissolved water stays", "saturation at the temperature", fluid.SaturationPpm(temperatureK), "mg/kg", Citations.Solubility, "falls out downstream where the oil gets colder");
        }
    }
}
