namespace Plant.Web.Features.Calculators;

/// <summary>An input of a calculator.</summary>
/// <param name="Path">Where it goes in the request, with points between: fluid.family, replicates.0.sampleG.</param>
/// <param name="Label">What it is.</param>
/// <param name="Unit">Its unit; empty where it has none.</param>
/// <param name="Example">What stands there at first; empty: optional.</param>
/// <param name="Options">Codes to choose from; null: a number is typed.</param>
/// <param name="List">True where several numbers are typed with spaces between.</param>
public sealed record CalculatorField(string Path, string Label, string Unit, string Example = "", IReadOnlyCollection<string>? Options = null, bool List = false);

/// <summary>A number that a calculator answers.</summary>
/// <param name="Name">Its name in the response.</param>
/// <param name="Label">What it is.</param>
/// <param name="Unit">Its unit.</param>
public sealed record CalculatorOutput(string Name, string Label, string Unit);

/// <summary>The picture of a calculator: what of its answer is drawn, or which input is swept.</summary>
/// <param name="X">Name of the horizontal value: an array or a column of the results; with a sweep, the path of the input.</param>
/// <param name="XTitle">What it is, with its unit.</param>
/// <param name="Y">Name of the vertical value.</param>
/// <param name="YTitle">What it is.</param>
/// <param name="Unit">Its unit.</param>
/// <param name="From">Where the sweep begins; null: no sweep.</param>
/// <param name="To">Where it ends.</param>
public sealed record CalculatorPicture(string X, string XTitle, string Y, string YTitle, string Unit, double? From = null, double To = 0);
