using WaterMix.Core.Quantities;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.Tests.State.Mixing;

public class TypedNumberTests
{
    private static readonly NumberRule Oxygen = NumberRule.ValueOf(Quantity.Oxygen);

    [Theory]
    [InlineData("285", 285.0)]
    [InlineData(" 1.5e1 ", 15.0)]
    [InlineData("-2", -2.0)]
    [InlineData("\u22122", -2.0)]
    public void Read_ANumber_GivesItsValue(string text, double value) => Assert.Equal(new TypedNumber(value, null), TypedNumber.Read(text, Oxygen));

    [Theory]
    [InlineData("abc", "not a number")]
    [InlineData("3,1", "decimal mark is a point")]
    [InlineData("NaN", "not a number")]
    [InlineData("1e999", "not a number")]
    [InlineData("2000", "oxygen, \u221210 to 1000 \u00b5mol/kg")]
    public void Read_WhatIsNoPossibleNumber_SaysWhatWasExpected(string text, string expected)
    {
        TypedNumber typed = TypedNumber.Read(text, Oxygen);
        Assert.Null(typed.Value);
        Assert.Contains(expected, typed.Problem, StringComparison.Ordinal);
    }

    [Fact]
    public void Read_NothingTyped_IsEmptyOnlyWhereTheRuleAllows()
    {
        Assert.Equal(new TypedNumber(null, null), TypedNumber.Read("", Oxygen));
        Assert.NotNull(TypedNumber.Read("", NumberRule.Positive("a weight")).Problem);
        Assert.NotNull(TypedNumber.Read("0", NumberRule.Positive("a weight")).Problem);
        Assert.NotNull(TypedNumber.Read("2.5", new NumberRule("a version", 1, 9) { IsWhole = true }).Problem);
    }

    [Theory]
    [InlineData(0.1)]
    [InlineData(-123.456789012345)]
    [InlineData(1e-300)]
    public void Text_AnyNumber_ReadsBackToTheSameDouble(double value) =>
        Assert.Equal(value, TypedNumber.Read(TypedNumber.Text(value), new NumberRule("a number")).Value);

    // In binary, 0.007 times 100 is 0.7000000000000001.
    [Fact]
    public void PerCent_ADecimalFraction_HasNoBinaryRest()
    {
        Assert.Equal("0.7", TypedNumber.Text(TypedNumber.PerCent(0.007)));
        Assert.Equal(0.007, TypedNumber.Fraction(0.7));
    }

    [Theory]
    [InlineData(15.524414729720636, "15.52441")]
    [InlineData(-0.25, "\u22120.25")]
    [InlineData(123456789, "123456789")]
    public void Shown_ALongNumber_HasSevenDigits(double value, string shown) => Assert.Equal(shown, TypedNumber.Shown(value));
}
