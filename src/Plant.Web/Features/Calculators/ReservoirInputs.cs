using System.Globalization;
using Plant.Physics;
using Plant.Register.Assessments;

namespace Plant.Web.Features.Calculators;

/// <summary>The inputs that a reservoir's own records give.</summary>
public sealed class ReservoirInputs(AssessmentService assessments, TimeProvider clock)
{
    /// <summary>By path of the field; empty where there is no reservoir of this tag.</summary>
    public async Task<IReadOnlyDictionary<string, string>> ReadAsync(string tag, CancellationToken cancellation = default)
    {
        var found = new Dictionary<string, string>();
        var some = await assessments.SomeAsync(clock.GetUtcNow().UtcDateTime, [tag], cancellation);
        if (some.Count == 0)
        {
            return found;
        }

        void Put(string path, double? value)
        {
            if (value is { } number)
            {
                found[path] = number.ToString("G5", CultureInfo.InvariantCulture);
            }
        }

        var (history, assessment) = some[0];
        var sheet = history.Fluid;
        found["fluid.family"] = Code.Of(sheet.Family);
        Put("fluid.viscosity40Mm2S", sheet.Viscosity40Mm2S);
        Put("fluid.viscosity100Mm2S", sheet.Viscosity100Mm2S);
        Put("fluid.density15KgM3", sheet.Density15KgM3);
        Put("fluid.solubilityA", sheet.SolubilityA);
        Put("fluid.solubilityB", sheet.SolubilityB);
        Put("fluid.interfacialTensionMNM", sheet.InterfacialTensionMNM);
        Put("interfacialTensionMNM", sheet.InterfacialTensionMNM);
        Put("temperatureC", history.OperatingTemperatureC);
        Put("oilTemperatureC", history.OperatingTemperatureC);
        Put("coldestTemperatureC", history.ColdestTemperatureC);
        Put("oilVolumeL", history.OilVolumeL);
        Put("lengthMm", history.LengthMm);
        Put("widthMm", history.WidthMm);
        Put("heightMm", history.HeightMm);
        Put("circulationLPerMin", history.CirculationLPerMin);
        Put("waterPpm", assessment.WaterPpm);
        Put("startPpm", assessment.WaterPpm);
        Put("targetPpm", assessment.LimitPpm * 0.7);
        Put("ingressGPerDay", assessment.IngressGPerDay);
        if (history.Shape is { } shape)
        {
            found["shape"] = Code.Of(shape);
        }

        return found;
    }
}
