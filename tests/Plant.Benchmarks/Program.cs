using Plant.Benchmarks;

// dotnet run -c Release --project tests/Plant.Benchmarks -- all [--reference PATH-TO-A-PYTHON-PROGRAM]
// dotnet run -c Release --project tests/Plant.Benchmarks -- coalescence [--reference FOLDER-WITH-pbe_cvode.c-AND-pbe_scipy.py]
var reference = args is [.., "--reference", var path] ? path : null;
return args.FirstOrDefault() switch
{
    "readings" => await WholeProcess.ReadingsAsync(reference),
    "samples" => await WholeProcess.SamplesAsync(),
    "assess" => await WholeProcess.AssessAsync(),
    "pages" => await PageTimes.RunAsync(),
    "working" => WorkingCost.Run(),
    "coalescence" => CoalescenceCost.Run(reference),
    "all" => await WholeProcess.ReadingsAsync(reference) + await WholeProcess.SamplesAsync() + await WholeProcess.AssessAsync() + await PageTimes.RunAsync() + WorkingCost.Run(),
    _ => WholeProcess.Usage(),
};
