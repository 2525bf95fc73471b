using MudBlazor;

namespace Plant.Web.Shared;

/// <summary>The component library in the colours of the tokens: paper, ink and one water hue.</summary>
public static class PlantTheme
{
    public static readonly MudTheme Theme = new()
    {
        PaletteLight = new PaletteLight
        {
            Primary = "#1A2021",
            Secondary = "#465053",
            Background = "#E9ECEB",
            Surface = "#FAFBFA",
            TextPrimary = "#1A2021",
            TextSecondary = "#465053",
            LinesDefault = "#D3D8D7",
            TableLines = "#D3D8D7",
            ActionDefault = "#465053",
            AppbarBackground = "#E9ECEB",
            AppbarText = "#1A2021",
            Error = "#A93C06",
            Warning = "#A93C06",
            Info = "#1A2021",
            Success = "#1A2021",
        },
        LayoutProperties = new LayoutProperties { DefaultBorderRadius = "2px" },
        Typography = new Typography { Default = new DefaultTypography { FontFamily = ["Source Sans 3", "system-ui", "sans-serif"], FontSize = ".9375rem" } },
    };
}
