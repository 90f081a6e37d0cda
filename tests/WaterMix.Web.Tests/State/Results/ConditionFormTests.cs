using WaterMix.Web.State.Results;

namespace WaterMix.Web.Tests.State.Results;

public class ConditionFormTests
{
    [Theory]
    [InlineData(" 0.5 ", "", 0.5, null)]
    [InlineData("", "1e2", null, 100.0)]
    [InlineData("−3", "4", -3.0, 4.0)]
    public void Take_Bounds_GivesTheConditionAndEmptiesTheForm(string low, string high, double? atLeast, double? lessThan)
    {
        var form = new ConditionForm { Column = "misfit", AtLeast = low, LessThan = high };

        Assert.Equal(new RowCondition("misfit", atLeast, lessThan), form.Take());
        Assert.Equal(("", "", null), (form.AtLeast, form.LessThan, form.Problem));
    }

    [Theory]
    [InlineData("0,5", "", "“0,5” is not a number. Type one such as 0.5, with a point.")]
    [InlineData("", "", "Type at least one bound, such as 0.5.")]
    [InlineData("2", "2", "No value can be in this range: the lower bound is not below the upper one.")]
    public void Take_WhatIsNoRange_SaysWhatToType(string low, string high, string problem)
    {
        var form = new ConditionForm { Column = "misfit", AtLeast = low, LessThan = high };

        Assert.Null(form.Take());
        Assert.Equal(problem, form.Problem);
        Assert.Equal(low, form.AtLeast);
    }
}
