#:project generator/Generator.csproj
#:property RestorePackagesWithLockFile=false

// Makes the demo plant: Skarrow Board Mill, an invented mill with its own power house.
//
//   dotnet run seed-data/generate.cs                                   writes the files of this folder again
//   dotnet run seed-data/generate.cs -- --end 2027-05-31 --out FOLDER  ends the two years of records on another day
//
// No clock and no library: the last day is a constant, every reservoir draws from its own seeded row of numbers,
// so the same arguments give the same bytes. The water is followed by a simulation of its own (generator/Simulation.cs)
// which shares nothing with src, so that the program is not judged by its own formulas.
// What is hidden in the records stands in generator/Stories.cs, and as a table in STORIES.md.

using System.Globalization;
using Skarrow;

var end = new DateTime(2026, 11, 30, 0, 0, 0, DateTimeKind.Utc);
var folder = "seed-data";
for (var i = 0; i < args.Length; i += 2)
{
    var value = i + 1 < args.Length ? args[i + 1] : string.Empty;
    if (args[i] == "--out" && value.Length > 0)
    {
        folder = value;
    }
    else if (args[i] != "--end" || !DateTime.TryParseExact(value, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal | DateTimeStyles.AdjustToUniversal, out end))
    {
        Console.Error.WriteLine($"{args[i]} {value}: not understood. Use --end YYYY-MM-DD (the last day of the records) and --out FOLDER.");
        return 2;
    }
}

var mill = new Mill(end);
mill.Write(folder);
Console.WriteLine(mill.Summary());
return 0;
