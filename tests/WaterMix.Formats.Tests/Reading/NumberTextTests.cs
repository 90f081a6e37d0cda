using System.Globalization;
using System.Text;
using CsCheck;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

public class NumberTextTests
{
    // Agreement: .NET's own parser rounds correctly (IEEE 754).
    [Fact]
    public void TryParse_DecimalsOfAnyLength_AgreesWithDoubleParseToTheBit() =>
        Gen.Select(Gen.Bool, Gen.ULong, Gen.Int[0, 20]).Sample((negative, digits, decimals) =>
        {
            string text = digits.ToString(CultureInfo.InvariantCulture).PadLeft(decimals + 1, '0');
            text = (negative ? "-" : "") + text[..^decimals] + (decimals > 0 ? "." + text[^decimals..] : "");

            Assert.True(NumberText.TryParse(Encoding.UTF8.GetBytes(text), (byte)'.', out double value));
            Assert.Equal(BitConverter.DoubleToInt64Bits(double.Parse(text, CultureInfo.InvariantCulture)), BitConverter.DoubleToInt64Bits(value));
        });

    [Fact]
    public void TryParse_RoundTripText_GivesTheSameBits() =>
        Gen.Double.Where(double.IsFinite).Sample(number =>
        {
            Assert.True(NumberText.TryParse(Encoding.UTF8.GetBytes(number.ToString("R", CultureInfo.InvariantCulture)), (byte)'.', out double value));
            Assert.Equal(BitConverter.DoubleToInt64Bits(number), BitConverter.DoubleToInt64Bits(value));
        });

    [Theory]
    [InlineData("3,1", 3.1)]
    [InlineData("-0,02", -0.02)]
    [InlineData("1,5e3", 1500)]
    [InlineData("7", 7)]
    public void TryParse_DecimalComma_Reads(string text, double expected)
    {
        Assert.True(NumberText.TryParse(Encoding.UTF8.GetBytes(text), (byte)',', out double value));
        Assert.Equal(expected, value);
    }

    [Theory]
    [InlineData("", '.')]
    [InlineData("-", '.')]
    [InlineData(".", '.')]
    [InlineData("3,1", '.')]
    [InlineData("3.1", ',')]
    [InlineData("1.2.3", '.')]
    [InlineData("<0.02", '.')]
    [InlineData("n.d.", '.')]
    public void TryParse_NoNumber_SaysSo(string text, char mark) =>
        Assert.False(NumberText.TryParse(Encoding.UTF8.GetBytes(text), (byte)mark, out _));
}
