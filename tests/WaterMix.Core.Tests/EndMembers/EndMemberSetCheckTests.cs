using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Tests.EndMembers;

public class EndMemberSetCheckTests
{
    // fraction_sum and residual_mass are columns of every result; a second column of that name could not be told apart.
    [Theory]
    [InlineData("sum", "depth_of_colour", "/endMembers/0/id")]
    [InlineData("Sum", "depth_of_colour", "/endMembers/0/id")]
    [InlineData("A", "mass", "/units/mass")]
    public void Findings_NamesOfResultColumns_AreRefused(string id, string tracer, string path)
    {
        var member = new EndMember(id, "", new Dictionary<string, double> { [tracer] = 1 }, new Provenance(ProvenanceKind.Manual));
        var set = new EndMemberSet("s", 1, [member]) { Units = new Dictionary<string, string> { [tracer] = "1" } };

        Finding error = Assert.Single(EndMemberSetCheck.Findings(set), f => f.Severity == Severity.Error);

        Assert.Equal(path, error.Path);
    }
}
