using System.Text;
using WaterMix.Core;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.Tests.Json;

public class StrictJsonTests
{
    // What is JSON and what is not: RFC 8259. Places count lines and characters from 1.
    [Theory]
    [InlineData("", "an empty file", null, null)]
    [InlineData(" \r\n\t", "an empty file", null, null)]
    [InlineData("{\"a\": 1,\n \"b\": NaN}", "NaN", 2L, "7")]
    [InlineData("{\"a\": -Infinity}", "-Infinity", 1L, "7")]
    [InlineData("{\"a\": nan}", "nan", 1L, "7")]
    [InlineData("[1, 2,]", "a closing bracket", 1L, "6")]
    [InlineData("{\"a\": 1 , }", "a closing bracket", 1L, "9")]
    [InlineData("{ // note\n \"a\": 1}", "a comment", 1L, "3")]
    [InlineData("{\"a\": 1} /* end */", "a comment", 1L, "10")]
    [InlineData("{\"a\": 1", "the end of the file", 1L, "8")]
    [InlineData("{\"a\": \"unclosed", "the end of the file", 1L, "16")]
    [InlineData("{\"a\":", "the end of the file", 1L, "6")]
    [InlineData("{\"a\": [1, {\"b\": 2}\n", "the end of the file", 2L, "1")]
    [InlineData("{\"a\": tru", "the end of the file", 1L, "10")]
    [InlineData("{\"a\": True}", "'True'", 1L, "7")]
    [InlineData("{\"a\" 1}", "'1'", 1L, "6")]
    [InlineData("{\"a\": 1 \"b\": 2}", "'\"'", 1L, "9")]
    [InlineData("{'a': 1}", "'''", 1L, "2")]
    [InlineData("{\"ä\": 01}", "'01'", 1L, "8")]
    [InlineData("{\"a\": 1} trailing", "'trailing'", 1L, "10")]
    [InlineData("<html>", "'<'", 1L, "1")]
    [InlineData("latitude,longitude\n1,2", "'latitude'", 1L, "1")]
    [InlineData("{\"a\": \"line\nbreak\"}", "the control character U+000A", 1L, "12")]
    [InlineData("{\"a\": \"\\uD800\"}", "half of a surrogate pair (\\uD800 to \\uDFFF on its own)", 1L, "7")]
    [InlineData("{\"a\": 1, \"b\": 2,\n\"a\": 3}", "\"a\" a second time (first in line 1)", 2L, "1")]
    public void Parse_NotStrictJson_SaysWhereAndWhat(string text, string found, long? line, string? column)
    {
        StrictJsonDocument document = Parse(text);

        Finding finding = Assert.Single(document.Findings);
        Assert.Equal(Severity.Error, finding.Severity);
        Assert.Equal(found, finding.Found);
        Assert.Equal(line, finding.Line);
        Assert.Equal(column, finding.Column);
        Assert.Equal("x.json", finding.File);
    }

    [Fact]
    public void Parse_SeveralFaults_ListsThemAllInOrder()
    {
        StrictJsonDocument document = Parse("{\n\"a\": NaN, // why\n\"b\": [1, -Infinity,],\n\"a\": 2,\n}");

        Assert.Equal(
            ["NaN", "a comment", "-Infinity", "a closing bracket", "\"a\" a second time (first in line 2)", "a closing bracket"],
            document.Findings.Select(f => f.Found));
        Assert.NotNull(document.Root);
    }

    [Fact]
    public void Parse_ByteOrderMark_IsSkippedAndColumnsCountAfterIt()
    {
        StrictJsonDocument document = StrictJsonDocument.Parse([0xEF, 0xBB, 0xBF, .. "{\"a\": NaN}"u8], null);

        Finding finding = Assert.Single(document.Findings);
        Assert.Equal("7", finding.Column);
    }

    [Fact]
    public void Parse_BytesThatAreNoText_SaysSo()
    {
        Assert.Contains("0xFF", Assert.Single(StrictJsonDocument.Parse([.. "{\"a\": \""u8, 0xFF, .. "\"}"u8], null).Findings).Found, StringComparison.Ordinal);
        Assert.Contains("UTF-16", Assert.Single(StrictJsonDocument.Parse([0xFF, 0xFE, 0x7B, 0x00], null).Findings).Found, StringComparison.Ordinal);
        Assert.Contains("binary", Assert.Single(StrictJsonDocument.Parse([0x50, 0x4B, 0x03, 0x04, 0x00, 0x00], null).Findings).Found, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(64, 0)]
    [InlineData(65, 1)]
    [InlineData(100_000, 1)]
    public void Parse_DeepNesting_IsRefusedBeyondSixtyFourLevels(int levels, int findings)
    {
        StrictJsonDocument document = Parse(new string('[', levels) + new string(']', levels));

        Assert.Equal(findings, document.Findings.Count);
        Assert.All(document.Findings, f => Assert.Equal("deeper nesting", f.Found));
    }

    [Fact]
    public void AsObject_UnknownKey_NamesItsPlaceAndTheNearestKnownKey()
    {
        StrictJsonDocument document = Parse("{\n\"name\": \"x\",\n\"tarcers/1\": 1,\n\"tracer\": 2}");

        document.Root!.AsObject("name", "tracers");

        Assert.Equal(["/tarcers~11", "/tracer"], document.Findings.Select(f => f.Path));
        Assert.Equal([3L, 4L], document.Findings.Select(f => f.Line));
        Assert.Contains("Did you mean \"tracers\"?", document.Findings[1].Remedy, StringComparison.Ordinal);
    }

    [Fact]
    public void As_WrongTypes_AreAllFoundWithTheirPaths()
    {
        StrictJsonDocument document = Parse("""{ "n": "3,1", "t": 3, "l": {}, "o": [], "i": 2.5, "big": 1e999, "c": "exat", "null": null, "b": 0 }""");
        StrictJsonObject root = document.Root!.AsObject("n", "t", "l", "o", "i", "big", "c", "null", "b")!;

        Assert.Null(root.Required("n")!.AsNumber());
        Assert.Null(root.Required("t")!.AsText());
        Assert.Null(root.Required("l")!.AsList());
        Assert.Null(root.Required("o")!.AsMap());
        Assert.Null(root.Required("i")!.AsInteger(1, int.MaxValue));
        Assert.Null(root.Required("big")!.AsNumber());
        Assert.Null(root.Required("c")!.AsChoice(("exact", 1), ("weighted", 2)));
        Assert.Null(root.Required("null")!.AsNumber());
        Assert.Null(root.Required("b")!.AsBoolean());
        Assert.Null(root.Required("absent"));

        Assert.Equal(["/n", "/t", "/l", "/o", "/i", "/big", "/c", "/null", "/b", "/absent"], document.Findings.Select(f => f.Path));
        Assert.Equal(
            ["the text \"3,1\"", "the number 3", "an object", "a list", "the number 2.5", "the number 1e999", "the text \"exat\"", "null", "the number 0", "none"],
            document.Findings.Select(f => f.Found));
        Assert.Contains("\"exact\"", document.Findings[6].Remedy, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("/a/0/b", "/a/0/b", 3)]
    [InlineData("/a/0/missing/deeper", "/a/0", 2)]
    [InlineData("/elsewhere", "", 1)]
    public void Nearest_PathPresentOrNot_GivesTheInnermostValueAround(string path, string nearest, int line)
    {
        StrictJsonNode node = Parse("{\n\"a\": [ {\n\"b\": 1 } ],\n\"ab\": 2 }").Nearest(path)!;

        Assert.Equal(nearest, node.Path);
        Assert.Equal(line, node.Line);
    }

    private static StrictJsonDocument Parse(string text) => StrictJsonDocument.Parse(Encoding.UTF8.GetBytes(text), "x.json");
}
