using Bunit;
using WaterMix.Core.Quantities;
using WaterMix.Web.Components.Mixing;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.Tests.Components.Mixing;

public class NumberFieldTests : BunitContext
{
    private double? _stored = 285;
    private int _changes;

    [Fact]
    public void Change_ANumber_IsHandedOn()
    {
        IRenderedComponent<NumberField> field = Show();
        field.Find("input").Change("290.5");
        Assert.Equal(290.5, _stored);
        Assert.Equal(1, _changes);
    }

    [Fact]
    public void Change_Text_SaysSoAtTheFieldAndKeepsTheStoredValue()
    {
        IRenderedComponent<NumberField> field = Show();
        field.Find("input").Change("salty");
        Assert.Equal(285, _stored);
        Assert.Equal(0, _changes);
        Assert.Equal("true", field.Find("input").GetAttribute("aria-invalid"));
        string message = field.Find("#" + field.Find("input").GetAttribute("aria-describedby")).TextContent;
        Assert.Contains("\u201csalty\u201d is not a number", message, StringComparison.Ordinal);
        Assert.Contains("285 stays stored", message, StringComparison.Ordinal);
    }

    [Fact]
    public void Change_TextAndThenEscape_ShowsTheStoredValueAgain()
    {
        IRenderedComponent<NumberField> field = Show();
        field.Find("input").Change("salty");
        field.Find("input").KeyDown("Escape");
        Assert.Equal("285", field.Find("input").GetAttribute("value"));
        Assert.Null(field.Find("input").GetAttribute("aria-invalid"));
    }

    [Fact]
    public void Value_ChangedFromOutside_TakesThePlaceOfAWrongText()
    {
        IRenderedComponent<NumberField> field = Show();
        field.Find("input").Change("salty");
        field.Render(p => p.Add(f => f.Value, -3));
        Assert.Equal("\u22123", field.Find("input").GetAttribute("value"));
        Assert.Empty(field.FindAll("[role=alert]"));
    }

    private IRenderedComponent<NumberField> Show() => Render<NumberField>(p => p
        .Add(f => f.Label, "oxygen of NDW")
        .Add(f => f.Value, _stored)
        .Add(f => f.Rule, NumberRule.ValueOf(Quantity.Oxygen))
        .Add(f => f.OnChange, value =>
        {
            _stored = value;
            _changes++;
        }));
}
