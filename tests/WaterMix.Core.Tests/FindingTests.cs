namespace WaterMix.Core.Tests;

public class FindingTests
{
    [Fact]
    public void ToString_WithPlace_SaysWhereWhatAndWhatToDo()
    {
        var finding = new Finding(Severity.Warning, "a number", "'n.d.'", "Leave the cell empty where nothing was measured.")
        {
            File = "cruise.csv",
            Line = 214,
            Column = "OXYGEN",
            Count = 3,
        };

        Assert.Equal(
            "warning: cruise.csv, line 214, column OXYGEN: expected a number; found 'n.d.' (3 times, first here). Leave the cell empty where nothing was measured.",
            finding.ToString());
    }

    [Fact]
    public void ToString_EmptyPath_NamesTheWholeDocument()
    {
        var finding = new Finding(Severity.Error, "an object", "an array", "Begin with '{'.") { Path = "" };

        Assert.Equal("error: the whole document: expected an object; found an array. Begin with '{'.", finding.ToString());
    }
}
