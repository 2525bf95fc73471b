using System.Text;
using Plant.Register.Interchange;
using Plant.Register.Tests.Storage;

namespace Plant.Register.Tests.Interchange;

/// <summary>Files as people and spreadsheets spoil them: each is refused with file, line, column, value and remedy, and nothing is written.</summary>
[Collection(PlantsCollection.Name)]
public sealed class MalformedFileTests(Plants plants)
{
    private const string Fluid = "fluids.csv";
    private const string Reservoir = "reservoirs.csv";
    private const string Sample = "samples.csv";
    private const string SampleHead = "sample,tag,takenAt,point,method,waterPpm,waterActivity,replicate,remark\n";
    private const string DrainHead = "tag,drainedAt,waterL,oilL\n";

    /// <summary>File, its content, then line, column, value and a word of the remedy of the first error.</summary>
    public static TheoryData<string, string, long, string, string, string> Spoiled => new()
    {
        { Fluid, "", 1, "", "", "header row" },
        { Fluid, "code,name,family,colour\nX,Oil,mineral,red\n", 1, "colour", "", "no column" },
        { Fluid, "name,family\nOil,mineral\n", 1, "code", "", "key column" },
        { Fluid, "code,code,family\nX,X,mineral\n", 1, "code", "", "twice" },
        { Fluid, "Code,name,family\nX,Oil,mineral\n", 1, "Code", "", "no column" },
        { Fluid, "code;name;family\nX;Oil;mineral\n", 1, "code;name;family", "", "no column" },
        { Fluid, "code,name,family\nX,Oil\n", 2, "", "", "2 cells where the header has 3" },
        { Fluid, "code,name,family\nX,Oil, light,mineral\n", 2, "", "", "quote cells" },
        { Fluid, "code,name,family\n,Oil,mineral\n", 2, "code", "", "may not be empty" },
        { Fluid, "code,name,family\nX,Oil,\n", 2, "family", "", "may not be empty" },
        { Fluid, "code,name,family\nX,Oil,Mineral\n", 2, "family", "Mineral", "one of mineral" },
        { Fluid, "code,name,family\nX,Oil,petrol\n", 2, "family", "petrol", "one of" },
        { Fluid, "code,name,family,density15KgM3\nX,Oil,mineral,0.87\n", 2, "density15KgM3", "0.87", "between 500 and 2000" },
        { Fluid, "code,name,family,density15KgM3\nX,Oil,mineral,870 kg/m3\n", 2, "density15KgM3", "870 kg/m3", "must be a number" },
        { Fluid, "code,name,family,viscosity40Mm2S\nX,Oil,mineral,\"46,0\"\n", 2, "viscosity40Mm2S", "46,0", "decimal point" },
        { Fluid, "code,name,family,viscosity40Mm2S\nX,Oil,mineral,\"1,234\"\n", 2, "viscosity40Mm2S", "1,234", "thousands" },
        { Fluid, "code,name,family,viscosity40Mm2S\nX,Oil,mineral,NaN\n", 2, "viscosity40Mm2S", "NaN", "must be a number" },
        { Fluid, "code,name,family,viscosity40Mm2S\nX,Oil,mineral,Infinity\n", 2, "viscosity40Mm2S", "Infinity", "must be a number" },
        { Fluid, "code,name,family,viscosity40Mm2S\nX,Oil,mineral,1e999\n", 2, "viscosity40Mm2S", "1e999", "must be a number" },
        { Fluid, "code,name,family,viscosity40Mm2S\nX,Oil,mineral,0x2E\n", 2, "viscosity40Mm2S", "0x2E", "must be a number" },
        { Fluid, "code,name,family,viscosity40Mm2S\nX,Oil,mineral,-46\n", 2, "viscosity40Mm2S", "-46", "above 0" },
        { Fluid, "code,name,family,viscosity40Mm2S,viscosity100Mm2S\nX,Oil,mineral,46,68\n", 2, "viscosity100Mm2S", "68", "below viscosity40Mm2S" },
        { Fluid, "code,name,family,solubilityA,solubilityB\nX,Oil,mineral,7.09,\n", 2, "solubilityB", "", "both or neither" },
        { Fluid, "code,name,family\nX,Oil,mineral\nX,Oil two,mineral\n", 3, "code", "X", "line 2" },
        { Reservoir, "tag,name,fluid\nR9,Tank,NONE\n", 2, "fluid", "NONE", "names no fluid" },
        { Reservoir, "tag,name,fluid,shape\nR9,Tank,M,round\n", 2, "shape", "round", "one of rectangular" },
        { Reservoir, "tag,name,fluid,operatingTemperatureC,coldestTemperatureC\nR9,Tank,M,20,50\n", 2, "coldestTemperatureC", "50", "operatingTemperatureC" },
        { Reservoir, "tag,name,fluid,operatingTemperatureC\nR9,Tank,M,400\n", 2, "operatingTemperatureC", "400", "between -60 and 250" },
        { Reservoir, "tag,name,fluid,headspaceRhPercent\nR9,Tank,M,120\n", 2, "headspaceRhPercent", "120", "between 0 and 100" },
        { Reservoir, "tag,name,fluid,criticality\nR9,Tank,M,2.5\n", 2, "criticality", "2.5", "whole number" },
        { Reservoir, "tag,name,fluid,criticality\nR9,Tank,M,7\n", 2, "criticality", "7", "between 1 and 5" },
        { Reservoir, "tag,name,fluid,shape,lengthMm,widthMm,heightMm,oilVolumeL\nR9,Tank,M,rectangular,1000,1000,1000,5000\n", 2, "oilVolumeL", "5000", "more than the tank" },
        { Reservoir, "tag,name,fluid,heightMm,suctionHeightMm\nR9,Tank,M,500,600\n", 2, "suctionHeightMm", "600", "heightMm" },
        { Sample, SampleHead + "S1,NOPE,2026-01-01T00:00:00Z,return,kf-coulometric,100,,1,\n", 2, "tag", "NOPE", "names no reservoir" },
        { Sample, SampleHead + "S1,R1,2026-01-01 00:00,return,kf-coulometric,100,,1,\n", 2, "takenAt", "2026-01-01 00:00", "with Z or an offset" },
        { Sample, SampleHead + "S1,R1,01.02.2026,return,kf-coulometric,100,,1,\n", 2, "takenAt", "01.02.2026", "ISO 8601" },
        { Sample, SampleHead + "S1,R1,2026-02-30T00:00:00Z,return,kf-coulometric,100,,1,\n", 2, "takenAt", "2026-02-30T00:00:00Z", "ISO 8601" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00.1234Z,return,kf-coulometric,100,,1,\n", 2, "takenAt", "2026-01-01T00:00:00.1234000+00:00", "millisecond" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,middle,kf-coulometric,100,,1,\n", 2, "point", "middle", "one of return" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,return,titration,100,,1,\n", 2, "method", "titration", "one of kf-coulometric" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,return,kf-coulometric,100,0.4,1,\n", 2, "waterPpm", "100", "exactly one" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,return,kf-coulometric,,,1,\n", 2, "waterPpm", "", "exactly one" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,return,activity-sensor,,40,1,\n", 2, "waterActivity", "40", "between 0 and 1" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,return,crackle,,,1,yes\n", 2, "remark", "yes", "clear or crackles" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,return,crackle,100,,1,clear\n", 2, "waterPpm", "100", "must be empty" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,return,kf-coulometric,100,,,\n", 2, "replicate", "", "may not be empty" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,return,kf-coulometric,<10,,1,\n", 2, "waterPpm", "<10", "must be a number" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,return,kf-coulometric,-1,,1,\n", 2, "waterPpm", "-1", "between 0 and" },
        { Sample, SampleHead + "S1,R1,2026-01-01T00:00:00Z,return,kf-coulometric,100,,1,\nS1,R2,2026-01-01T00:00:00Z,return,kf-coulometric,101,,2,\n", 3, "tag", "R2", "one bottle, one reservoir" },
        { "drains.csv", DrainHead + "R1,2026-01-01T00:00:00Z,,\n", 2, "waterL", "", "may not be empty" },
        { "drains.csv", DrainHead + "R1,2026-01-01T00:00:00Z,1,\nR1,2026-01-01T01:00:00+01:00,2,\n", 3, "tag", "R1, 2026-01-01T00:00:00.000Z", "line 2" },
        { "topups.csv", "tag,addedAt,oilL\nR1,2026-01-01T00:00:00Z,-4\n", 2, "oilL", "-4", "between 0 and" },
        { "separators.csv", "code,kind,efficiency\nC1,coalescer,90\n", 2, "efficiency", "90", "between 0 and 1" },
        { "separators.csv", "code,kind,portable\nC1,coalescer,yes\n", 2, "portable", "yes", "true or false" },
        { "separators.csv", "code,kind,tag,portable\nC1,coalescer,R1,true\n", 2, "tag", "R1", "portable" },
        { "separator-runs.csv", "separator,tag,startedAt\nNONE,R1,2026-01-01T00:00:00Z\n", 2, "separator", "NONE", "names no separator" },
        { "readings.csv", "tag,readAt,oilTemperatureC\nR1,2026-01-01T00:00:00Z,\n", 2, "waterActivity", "", "needs oilTemperatureC or waterActivity" },
        { "readings.csv", "tag,readAt,waterActivity\nR1,2026-01-01T00:00:00Z,0.4\nR1,2026-01-01T00:00:00Z,0.5\n", 3, "readAt", "2026-01-01T00:00:00Z", "other values" },
        { Fluid, "code,name,family\nX,\"Oil\0\",mineral\n", 2, "name", "Oil?", "NUL" },
        { Fluid, "code,name,family\nX,\"Oil " + new string('x', 20_000) + "\",mineral\n", 2, "name", "Oil xxxxxxxxxxxxxxxx", "longer than" },
    };

    [Theory, MemberData(nameof(Spoiled))]
    public async Task SpoiledFile_IsRefusedWithItsPlaceAndRemedy(string file, string content, long line, string column, string value, string remedy)
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        var folder = await FolderAsync(plant, file, Encoding.UTF8.GetBytes(content));
        var outcome = await plant.Get<Importer>().ImportAsync(folder, new ImportOptions(), TestPlant.Planner);
        Assert.False(outcome.IsDone);
        var error = outcome.Value!.Files.Single(f => f.File == file).Errors[0];
        Assert.Equal((file, line, column, value), (error.File, error.Line, error.Column, error.Value));
        Assert.Contains(remedy, error.Remedy, StringComparison.Ordinal);
        await using var context = await plant.OpenAsync();
        Assert.Empty(context.Reservoirs);
    }

    [Theory]
    [InlineData("FFFE63006F006400", "UTF-16")]
    [InlineData("636F64652C6E616D652C66616D696C790A582CE92C6D696E6572616C0A", "not UTF-8")]
    [InlineData("636F64652C6E616D652C66616D696C790A582C224F696C2C6D696E6572616C0A", "cells")]
    public async Task SpoiledBytes_AreRefused(string hex, string remedy)
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        var folder = await FolderAsync(plant, Fluid, Convert.FromHexString(hex));
        var outcome = await plant.Get<Importer>().ImportAsync(folder, new ImportOptions(), TestPlant.Planner);
        Assert.Contains(remedy, outcome.Value!.Files[0].Errors[0].Remedy, StringComparison.Ordinal);
    }

    [Fact]
    public async Task ManyErrors_AreToldInOneRun_TheFirstHundredAFile()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        var rows = string.Concat(Enumerable.Range(0, 250).Select(i => FormattableString.Invariant($"X{i},Oil,none\n")));
        var folder = await FolderAsync(plant, Fluid, Encoding.UTF8.GetBytes("code,name,family\n" + rows));
        var report = (await plant.Get<Importer>().ImportAsync(folder, new ImportOptions(), TestPlant.Planner)).Value!.Files[0];
        Assert.Equal((100, 250), (report.Errors.Count, report.Refused));
    }

    private static async Task<string> FolderAsync(TestPlant plant, string file, byte[] content)
    {
        var folder = Path.Combine(plant.Folder, "in");
        Directory.CreateDirectory(folder);
        await File.WriteAllTextAsync(Path.Combine(folder, Fluid), "code,name,family\nM,Oil,mineral\n");
        if (file is not (Fluid or Reservoir))
        {
            await File.WriteAllTextAsync(Path.Combine(folder, Reservoir), "tag,name,fluid\nR1,Tank,M\nR2,Tank,M\n");
        }

        await File.WriteAllBytesAsync(Path.Combine(folder, file), content);
        return folder;
    }
}
