using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Authorization;
using Plant.Physics.Fluids;
using Plant.Register.Reservoirs;
using Plant.Web.Features.Account;
using Plant.Web.Shared.Forms;

namespace Plant.Web.Features.Register;

/// <summary>Enters or corrects a reservoir, with a live preview.</summary>
public sealed partial class ReservoirFormPage
{
    private readonly FormState state = new();
    private ReservoirFields fields = new();
    private FluidSheet? sheet;
    private IReadOnlyList<string> tags = [];
    private IReadOnlyList<string> fluids = [];
    private IReadOnlyList<string> areas = [];
    private Guid token;
    private string? similar;
    private string? reason;
    private bool missing;
    private bool saved;

    /// <summary>Tag of the reservoir to correct; null for a new one.</summary>
    [Parameter]
    public string? Tag { get; set; }

    [CascadingParameter]
    private Task<AuthenticationState> Who { get; set; } = default!;

    [Inject]
    private ReservoirService Reservoirs { get; set; } = default!;

    [Inject]
    private FluidService Fluids { get; set; } = default!;

    [Inject]
    private RegisterQueries Queries { get; set; } = default!;

    [Inject]
    private NavigationManager Navigation { get; set; } = default!;

    protected override async Task OnInitializedAsync()
    {
        (tags, fluids, areas) = await Queries.ChoicesAsync();
        if (Tag is not null)
        {
            var outcome = await Reservoirs.GetAsync((await Who).User.ToActor(), Tag);
            missing = !outcome.IsDone;
            (fields, token) = outcome.IsDone ? (outcome.Value!.Fields, outcome.Value.Token) : (fields, token);
        }

        await LoadFluidAsync();
    }

    private async Task CopyAsync(string? tag)
    {
        similar = tag;
        if (tag is not null && await Reservoirs.GetAsync((await Who).User.ToActor(), tag) is { IsDone: true } outcome)
        {
            fields = outcome.Value!.Fields with { Tag = fields.Tag, Name = fields.Name };
            await Touch();
        }
    }

    private async Task Touch()
    {
        state.Dirty = true;
        saved = false;
        await LoadFluidAsync();
    }

    private async Task LoadFluidAsync()
    {
        sheet = fields.Fluid is { } code && await Fluids.GetAsync((await Who).User.ToActor(), code) is { IsDone: true } outcome
            ? FluidService.Make(Guid.Empty, outcome.Value!.Fields).ToSheet()
            : null;
    }

    private async Task SaveAsync()
    {
        var actor = (await Who).User.ToActor();
        var outcome = Tag is null
            ? await Reservoirs.CreateAsync(actor, null, fields)
            : await Reservoirs.AmendAsync(actor, Tag, token, fields, reason);
        if (!state.Take(outcome))
        {
            return;
        }

        (token, saved, reason) = (outcome.Value!.Token, true, null);
        if (Tag is null)
        {
            Navigation.NavigateTo($"/reservoirs/{Uri.EscapeDataString(fields.Tag!)}");
        }
    }
}
