using Bunit;
using Plant.Web.Shared.Forms;

namespace Plant.Web.Tests.Shared.Forms;

public sealed class UnitFieldTests : BunitContext
{
    [Fact]
    public void Typed_OtherUnit_StaysAsTypedAndIsToldInTheFieldsUnit()
    {
        double? heard = null;
        var field = Render<UnitField>(p => p.Add(f => f.Id, "t").Add(f => f.Label, "Usual temperature").Add(f => f.Unit, "°C").Add(f => f.ValueChanged, v => heard = v));
        field.Find("input").Change("140 F");
        field.Render(p => p.Add(f => f.Value, heard));
        Assert.Equal(60, heard!.Value, 1e-9);
        Assert.Equal("140 F", field.Find("input").GetAttribute("value"));
        Assert.Contains("60 °C", field.Find("#t-note").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Typed_NotUnderstood_SaysSoAndKeepsTheText()
    {
        var heard = 0;
        var field = Render<UnitField>(p => p.Add(f => f.Id, "v").Add(f => f.Label, "Oil volume").Add(f => f.Unit, "L").Add(f => f.ValueChanged, _ => heard++));
        field.Find("input").Change("1,234");
        Assert.Equal(0, heard);
        Assert.Equal("1,234", field.Find("input").GetAttribute("value"));
        Assert.Equal("true", field.Find("input").GetAttribute("aria-invalid"));
        Assert.Contains("thousands", field.Find(".wrong").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Refused_ByTheRegister_StandsAtTheField()
    {
        var refused = new Dictionary<string, string> { ["v"] = "must be above 0" };
        var field = Render<UnitField>(p => p.Add(f => f.Id, "v").Add(f => f.Label, "Oil volume").Add(f => f.Refused, refused));
        Assert.Equal("must be above 0", field.Find(".wrong").TextContent);
        Assert.Equal("v-note", field.Find("input").GetAttribute("aria-describedby"));
    }
}
