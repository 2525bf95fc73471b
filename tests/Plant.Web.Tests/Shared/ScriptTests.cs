using System.Net;
using Plant.Web.Shared.Drawing;
using Plant.Web.Tests.Support;

namespace Plant.Web.Tests.Shared;

[Collection(WebPlantCollection.Name)]
public sealed class ScriptTests(WebPlant plant)
{
    [Theory]
    [InlineData(PlantChart.PlotlyInterop)]
    [InlineData(PlantChart.PlotlyScript)]
    public async Task ChartLibrary_LiesWhereThePageLoadsIt(string address)
    {
        using var http = plant.Anonymous();
        using var answer = await http.GetAsync(new Uri(address.TrimStart('.'), UriKind.Relative));
        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.Equal("text/javascript", answer.Content.Headers.ContentType!.MediaType);
    }
}
