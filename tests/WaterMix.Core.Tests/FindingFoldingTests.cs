namespace WaterMix.Core.Tests;

public class FindingFoldingTests
{
    [Fact]
    public void AddFolded_TheSameNoteAgain_AddsToItsCount()
    {
        var note = new Finding(Severity.Note, "a position", "none", "Give one.") { Count = 3 };
        var other = note with { Column = "latitude" };
        var findings = new List<Finding>();

        findings.AddFolded([note, other, note with { Count = 4 }]);

        Assert.Equal([note with { Count = 7 }, other], findings);
    }
}
