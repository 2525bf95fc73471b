using Microsoft.AspNetCore.Mvc;
using Plant.Register.Access;
using Plant.Register.Interchange;
using Plant.Web.Hosting;

namespace Plant.Web.Features.Register;

/// <summary>The register pages' services, and where uploaded files go.</summary>
public static class RegisterPages
{
    public static IServiceCollection AddRegisterPages(this IServiceCollection services) => services.AddSingleton<RegisterQueries>().AddSingleton<UploadFolder>();

    public static void MapRegister(this IEndpointRouteBuilder routes) =>
        routes.MapPost("/register/import/upload", async (UploadFolder uploads, [FromForm] IFormFileCollection files, CancellationToken stop) =>
        {
            var outcome = await uploads.KeepAsync(files, stop);
            return TypedResults.LocalRedirect(outcome.IsDone
                ? $"/register/import?batch={outcome.Value}"
                : $"/register/import?message={Uri.EscapeDataString(outcome.Refusals[0].Field + " " + outcome.Refusals[0].Reason)}");
        }).RequireAuthorization(Duty.EditRegister.ToString()).ExcludeFromDescription();
}

/// <summary>Uploaded files, under names that the program chose, outside what it serves.</summary>
public sealed class UploadFolder(PlantSettings settings, TimeProvider clock)
{
    private static readonly TimeSpan Life = TimeSpan.FromHours(12);

    /// <summary>The folder of a batch; null where there is none of this id.</summary>
    public string? Find(string? batch)
    {
        var path = Guid.TryParse(batch, out var id) ? Path.Combine(Root, id.ToString("N")) : null;
        return Directory.Exists(path) ? path : null;
    }

    /// <summary>Keeps the files for a preview.</summary>
    public async Task<Plant.Register.Outcome<string>> KeepAsync(IFormFileCollection files, CancellationToken cancellation)
    {
        Sweep();
        if (files.Count == 0)
        {
            return Plant.Register.Outcome<string>.Invalid(new Plant.Physics.Refusal("files", "", "choose at least one file"));
        }

        foreach (var file in files)
        {
            if (!Files.All.Contains(file.FileName))
            {
                return Plant.Register.Outcome<string>.Invalid(new Plant.Physics.Refusal(file.FileName, "", $"is no file of a plant; they are called {string.Join(", ", Files.All)}"));
            }
        }

        var id = Guid.CreateVersion7().ToString("N");
        var folder = Directory.CreateDirectory(Path.Combine(Root, id)).FullName;
        foreach (var name in Files.All)
        {
            if (files.FirstOrDefault(f => f.FileName == name) is { } file)
            {
                await using var to = new FileStream(Path.Combine(folder, name), FileMode.CreateNew);
                await file.CopyToAsync(to, cancellation);
            }
        }

        return Plant.Register.Outcome<string>.Done(id);
    }

    public void Remove(string batch)
    {
        if (Find(batch) is { } folder)
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    private string Root => Path.Combine(settings.DataFolder, "uploads");

    /// <summary>Removes what nobody came back for.</summary>
    private void Sweep()
    {
        if (!Directory.Exists(Root))
        {
            return;
        }

        foreach (var folder in new DirectoryInfo(Root).GetDirectories().Where(d => clock.GetUtcNow().UtcDateTime - d.CreationTimeUtc > Life))
        {
            folder.Delete(recursive: true);
        }
    }
}
