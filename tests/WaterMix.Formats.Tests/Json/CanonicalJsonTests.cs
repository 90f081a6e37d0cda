using System.Globalization;
using System.Text;
using System.Text.Json.Nodes;
using CsCheck;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.Tests.Json;

public class CanonicalJsonTests
{
    // Reference: Rfc8785, appendix B, table of doubles and their text. The rows were taken from open test suites that all quote
    // that table alike, not from the page of the RFC itself.
    [Theory]
    [InlineData("0000000000000000", "0")]
    [InlineData("8000000000000000", "0")]
    [InlineData("0000000000000001", "5e-324")]
    [InlineData("8000000000000001", "-5e-324")]
    [InlineData("7fefffffffffffff", "1.7976931348623157e+308")]
    [InlineData("ffefffffffffffff", "-1.7976931348623157e+308")]
    [InlineData("4340000000000000", "9007199254740992")]
    [InlineData("c340000000000000", "-9007199254740992")]
    [InlineData("4430000000000000", "295147905179352830000")]
    [InlineData("44b52d02c7e14af5", "9.999999999999997e+22")]
    [InlineData("44b52d02c7e14af6", "1e+23")]
    [InlineData("44b52d02c7e14af7", "1.0000000000000001e+23")]
    [InlineData("444b1ae4d6e2ef4e", "999999999999999700000")]
    [InlineData("444b1ae4d6e2ef4f", "999999999999999900000")]
    [InlineData("444b1ae4d6e2ef50", "1e+21")]
    [InlineData("3eb0c6f7a0b5ed8c", "9.999999999999997e-7")]
    [InlineData("3eb0c6f7a0b5ed8d", "0.000001")]
    [InlineData("41b3de4355555553", "333333333.3333332")]
    [InlineData("41b3de4355555554", "333333333.33333325")]
    [InlineData("41b3de4355555555", "333333333.3333333")]
    [InlineData("41b3de4355555556", "333333333.3333334")]
    [InlineData("41b3de4355555557", "333333333.33333343")]
    [InlineData("becbf647612f3696", "-0.0000033333333333333333")]
    [InlineData("43143ff3c1cb0959", "1424953923781206.2")]
    public void Write_Doubles_AsPrintedInTheStandard(string bits, string text)
    {
        double value = BitConverter.UInt64BitsToDouble(ulong.Parse(bits, NumberStyles.HexNumber, CultureInfo.InvariantCulture));

        Assert.Equal(text, Text(JsonValue.Create(value)));
    }

    // Reference: Rfc8785, 3.2.2, example of primitive types; taken from open test suites as above.
    [Fact]
    public void Write_PrimitiveTypes_AsPrintedInTheStandard()
    {
        const string Input = """
            {
              "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
              "string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
              "literals": [null, true, false]
            }
            """;

        Assert.Equal(
            """{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\u000f\nA'B\"\\\\\"/"}""",
            Text(JsonNode.Parse(Input)));
    }

    // Reference: Rfc8785, 3.2.3, example of sorting by UTF-16 code units; taken from open test suites as above.
    [Fact]
    public void Write_Keys_SortedAsInTheStandard()
    {
        var input = new JsonObject
        {
            ["\u20ac"] = "Euro Sign",
            ["\r"] = "Carriage Return",
            ["\ufb33"] = "Hebrew Letter Dalet With Dagesh",
            ["1"] = "One",
            ["\U0001f600"] = "Emoji: Grinning Face",
            ["\u0080"] = "Control",
            ["\u00f6"] = "Latin Small Letter O With Diaeresis",
        };

        Assert.Equal(
            "{\"\\r\":\"Carriage Return\",\"1\":\"One\",\"\u0080\":\"Control\",\"\u00f6\":\"Latin Small Letter O With Diaeresis\","
            + "\"\u20ac\":\"Euro Sign\",\"\U0001f600\":\"Emoji: Grinning Face\",\"\ufb33\":\"Hebrew Letter Dalet With Dagesh\"}",
            Text(input));
    }

    [Fact]
    public void Write_WhatJsonCannotHold_IsRefused()
    {
        Assert.Throws<ArgumentException>(() => CanonicalJson.Write(JsonValue.Create(double.NaN)));
        Assert.Throws<ArgumentException>(() => CanonicalJson.Write(JsonValue.Create(double.NegativeInfinity)));
        Assert.Throws<ArgumentException>(() => CanonicalJson.Write(JsonValue.Create("\uD800")));
    }

    // Property: any finite double reads back to itself (minus zero to zero).
    [Fact]
    public void Write_AnyDouble_ReadsBackToTheSame() =>
        Gen.Long.Select(BitConverter.Int64BitsToDouble).Where(double.IsFinite).Sample(
            value => double.Parse(Text(JsonValue.Create(value)), NumberStyles.Float, CultureInfo.InvariantCulture) == value,
            iter: 100_000);

    private static string Text(JsonNode? value) => Encoding.UTF8.GetString(CanonicalJson.Write(value));
}
