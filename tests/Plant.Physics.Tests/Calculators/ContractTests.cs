using System.Text.Json;
using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

/// <summary>The names of fields that outside callers use.</summary>
public sealed class ContractTests
{
    [Theory]
    [InlineData(typeof(FluidStateRequest), "fluid,temperatureC")]
    [InlineData(typeof(FluidStateResponse), "kinematicViscosityMm2S,dynamicViscosityMPaS,densityKgM3,waterDensityKgM3,densityDifferenceKgM3,saturationPpm,waterGoes,inversionTemperatureC,working")]
    [InlineData(typeof(WaterSplitRequest), "fluid,temperatureC,coldestTemperatureC,waterPpm,standardUncertaintyPpm")]
    [InlineData(typeof(WaterSplitResponse), "dissolvedPpm,undissolvedPpm,saturationPpm,waterActivity,probabilityFree,dissolvedPpmAtColdest,undissolvedPpmAtColdest,saturationPpmAtColdest,waterActivityAtColdest,probabilityFreeAtColdest,working")]
    [InlineData(typeof(SettlingRequest), "fluid,temperatureC,dropletUm,depthMm,waterVolumeFraction,mobileInterface")]
    [InlineData(typeof(SettlingResponse), "results,working")]
    [InlineData(typeof(SettlingRow), "dropletUm,velocityMmPerS,reynolds,settlingTimeS")]
    [InlineData(typeof(TankRequest), "fluid,temperatureC,shape,lengthMm,widthMm,heightMm,oilVolumeL,circulationLPerMin,tanksInSeries,dropletMedianUm,geometricDeviation")]
    [InlineData(typeof(TankResponse), "oilDepthMm,surfaceAreaM2,residenceTimeMin,cutSizeUm,removalFraction,working")]
    [InlineData(typeof(CoalescenceRequest), "fluid,temperatureC,waterVolumeFraction,dropletMedianUm,geometricDeviation,depthMm,hours,shearRatePerS,collisionEfficiency,fieldKVPerCm,cells")]
    [InlineData(typeof(CoalescenceResponse), "timesS,suspendedFraction,numberPerM3,medianUm,massErrorFraction,working")]
    [InlineData(typeof(KarlFischerRequest), "replicates,method")]
    [InlineData(typeof(TitrationRequest), "sampleG,waterUg,chargeC,driftUgPerMin,minutes,blankUg")]
    [InlineData(typeof(KarlFischerResponse), "waterPpm,replicatePpm,repeatabilityPpm,withinRepeatability,standardUncertaintyPpm,working")]
    [InlineData(typeof(CoalescerRequest), "fluid,temperatureC,faceVelocityMmPerS,fibreUm,solidity,thicknessMm,dropletUm,stages")]
    [InlineData(typeof(CoalescerResponse), "results,pressureDropKPa,working")]
    [InlineData(typeof(CoalescerRow), "dropletUm,removalFraction")]
    [InlineData(typeof(ElectricFieldRequest), "fluid,temperatureC,dropletUm,gapUm,fieldKVPerCm")]
    [InlineData(typeof(ElectricFieldResponse), "attractionN,criticalFieldKVPerCm,electricCapillaryNumber,breaksUp,working")]
    [InlineData(typeof(ScreenRequest), "interfacialTensionMNM,contactAngleDeg,poreUm")]
    [InlineData(typeof(ScreenResponse), "breakthroughKPa,waterWets,working")]
    [InlineData(typeof(DryDownRequest), "fluid,oilVolumeL,startPpm,targetPpm,ingressGPerDay,kind,flowLPerMin,efficiency,pressureKPa,oilTemperatureC,coldestTemperatureC")]
    [InlineData(typeof(DryDownResponse), "hoursToTarget,floorPpm,timesH,waterPpm,freeWhenCold,working")]
    [InlineData(typeof(BearingLifeRequest), "waterPpm")]
    [InlineData(typeof(BearingLifeResponse), "relativeLife,working")]
    [InlineData(typeof(FluidRequest), "code,name,family,isoVg,viscosity40Mm2S,viscosity100Mm2S,density15KgM3,expansionPerK,solubilityA,solubilityB,interfacialTensionMNM,relativePermittivity,conductivityPSM,demulsibilityMin,waterLimitPpm")]
    public void Fields_InJson_AreTheContract(Type type, string fields) =>
        Assert.Equal(fields, string.Join(',', JsonSerializerOptions.Web.GetTypeInfo(type).Properties.Select(property => property.Name)));

    [Fact]
    public void Step_InJson_HasTheContractsFields() =>
        Assert.Superset(new HashSet<string> { "name", "formula", "value", "unit", "source" },
            JsonSerializerOptions.Web.GetTypeInfo(typeof(WorkingStep)).Properties.Select(property => property.Name).ToHashSet());

    [Fact]
    public void Request_FromJson_ReadsAndComputes()
    {
        var request = JsonSerializer.Deserialize<TankRequest>(
            """
            {"fluid":{"family":"mineral","isoVg":46},"temperatureC":40,"shape":"horizontal-cylinder","lengthMm":3000,"heightMm":1500,"oilVolumeL":3000,
             "circulationLPerMin":200,"tanksInSeries":null,"dropletMedianUm":100,"geometricDeviation":1.6}
            """, JsonSerializerOptions.Web)!;
        Requests.ShowsItsWorking(Requests.Done(TankCalculator.Compute(request)).Working);
    }
}
