using System.Globalization;
using Plant.Physics.Fluids;
using Plant.Physics.Separators;
using Plant.Physics.Water;

namespace Plant.Physics.Calculators;

/// <summary>Asks what an electric field does to water drops.</summary>
/// <param name="Fluid">The fluid.</param>
/// <param name="TemperatureC">Temperature [°C].</param>
/// <param name="DropletUm">Diameter of two equal drops [µm].</param>
/// <param name="GapUm">Gap between them along the field [µm].</param>
/// <param name="FieldKVPerCm">Field, root mean square [kV/cm].</param>
public sealed record ElectricFieldRequest(FluidRequest? Fluid, double? TemperatureC, double? DropletUm, double? GapUm, double? FieldKVPerCm);

/// <summary>What an electric field does to water drops.</summary>
/// <param name="AttractionN">Attraction of the two drops [N].</param>
/// <param name="CriticalFieldKVPerCm">Field at which such a drop breaks up [kV/cm].</param>
/// <param name="ElectricCapillaryNumber">ε·E²·r/γ [1].</param>
/// <param name="BreaksUp">True where the field is above the critical one.</param>
/// <param name="Working">How it came about.</param>
public sealed record ElectricFieldResponse(double AttractionN, double CriticalFieldKVPerCm, double ElectricCapillaryNumber, bool BreaksUp, IReadOnlyList<WorkingStep> Working);

/// <summary>Water drops in an electric field.</summary>
public static class ElectricFieldCalculator
{
    private const double VoltPerMetre = 1e5;
    private const double WetOilBreakdownVM = 3e6;
    private const double ConductingSM = 1e-8;

    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<ElectricFieldResponse> Compute(ElectricFieldRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var fluid = FluidRequest.Model(request.Fluid, refusals);
        var temperature = refusals.TemperatureK("temperatureC", request.TemperatureC);
        var radius = refusals.Within("dropletUm", request.DropletUm, 0, 1e5, "µm", openLow: true) * 0.5e-6;
        var gap = refusals.Within("gapUm", request.GapUm, 0, 1e7, "µm", openLow: true) * 1e-6;
        var field = refusals.Within("fieldKVPerCm", request.FieldKVPerCm, 0, 1000, "kV/cm") * VoltPerMetre;
        if (gap / radius < ConductingSpheres.SmallestGap)
        {
            refusals.Add(new Refusal("gapUm", request.GapUm!.Value.ToString("R", CultureInfo.InvariantCulture),
                string.Create(CultureInfo.InvariantCulture, $"is less than a molecule: the drops touch; give at least {ConductingSpheres.SmallestGap * radius * 1e6:0.##e+0} µm")));
        }

        if (refusals.Count > 0 || fluid is null)
        {
            return new(null, refusals);
        }

        var working = new Working();
        var permittivity = Constants.VacuumPermittivityFM * fluid.RelativePermittivity;
        Properties(fluid, temperature, working);
        var attraction = ConductingSpheres.AttractionN(radius, gap, permittivity, field);
        var far = ConductingSpheres.FarAttractionN(radius, radius, (2 * radius) + gap, permittivity, field);
        working.Add("attraction of far dipoles", "24πε·a⁶E²/s⁴", far, "N", Citations.FarDipole);
        working.Add("attraction", FormattableString.Invariant($"−½E·dP/ds, bispherical, gap/radius {gap / radius:0.####}"), attraction, "N", Citations.TwoSpheres, "for drops along the field; beyond 54.7° to it they repel");
        var critical = ElectrostaticCoalescence.CriticalFieldVM(permittivity, radius, fluid.InterfacialTensionNM);
        var number = ElectrostaticCoalescence.CapillaryNumber(permittivity, field, radius, fluid.InterfacialTensionNM);
        working.Add("critical field", "√(0.21025·γ/(ε·r))", critical / VoltPerMetre, "kV/cm", Citations.Taylor, "falling drops broke 26 % below it: design at half");
        working.Add("electric capillary number", "ε·E²·r/γ", number, "1", Citations.Taylor, number > ElectrostaticCoalescence.TaylorLimit ? "the drop breaks up: a lower field separates better" : null);
        return new(new ElectricFieldResponse(attraction, critical / VoltPerMetre, number, field > critical, Limits(fluid, temperature, field, working)), []);
    }

    private static void Properties(FluidModel fluid, double temperatureK, Working working)
    {
        const string assumed = "the family's default is taken (from memory, unverified)";
        working.Add("relative permittivity", "data sheet or family", fluid.RelativePermittivity, "1", fluid.Sheet.RelativePermittivity is null ? Citations.FamilyDefault : "given", fluid.Sheet.RelativePermittivity is null ? assumed : null);
        working.Add("interfacial tension", "data sheet or family", fluid.InterfacialTensionNM * 1000, "mN/m", fluid.Sheet.InterfacialTensionMNM is null ? Citations.FamilyDefault : "given", fluid.Sheet.InterfacialTensionMNM is null ? assumed : null);
        fluid.DynamicViscosityPaS(temperatureK, working);
    }

    private static IReadOnlyList<WorkingStep> Limits(FluidModel fluid, double temperatureK, double fieldVM, Working working)
    {
        var relaxation = fluid.ConductivitySM > 0 ? ElectricRelaxation.LiquidS(fluid.RelativePermittivity, fluid.ConductivitySM) : (double?)null;
        working.Add("relaxation time of the oil", FormattableString.Invariant($"ε0·εr/σ, σ = {fluid.ConductivitySM:0.##e+0} S/m"), relaxation, "s", Citations.Relaxation,
            fluid.ConductivitySM > ConductingSM ? "the oil conducts: a steady field does not stand in it" : fluid.Sheet.ConductivityPSM is null ? "conductivity is the family's default (from memory, unverified)" : null);
        if (fieldVM > 0)
        {
            working.Add("time of approach at 1 % water", "μ(s0⁵ − (2a)⁵)/(40ε·E²·a⁵)",
                ElectrostaticCoalescence.ApproachTimeS(fluid.DynamicViscosityPaS(temperatureK), Constants.VacuumPermittivityFM * fluid.RelativePermittivity, fieldVM, 0.01), "s", Citations.FarDipole,
                "46 times as long at 0.1 % water: fields do little there");
        }

        var warm = fluid.Family == FluidFamily.Diesel ? "fuel vapour: never a field where there is a vapour space; licensed design, bonded and interlocked" : "only in a full, bonded vessel without vapour space, interlocked; licensed design";
        working.Add("safety", fieldVM > WetOilBreakdownVM ? "field above 30 kV/cm: wet oil may break down" : "field below 30 kV/cm", fieldVM / VoltPerMetre, "kV/cm", "common practice", warm);
        working.Add("permittivity of water", "sum of four powers of T/300", WaterProperties.RelativePermittivity(temperatureK), "1", Citations.Iapws, "drops count as conductors: true up to the megahertz");
        return working.Steps;
    }
}
