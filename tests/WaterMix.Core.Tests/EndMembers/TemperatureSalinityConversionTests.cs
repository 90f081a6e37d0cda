using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Tests.EndMembers;

public class TemperatureSalinityConversionTests
{
    private const TemperatureSalinityPair ToConservative = TemperatureSalinityPair.ConservativeAndAbsolute;
    private const TemperatureSalinityPair ToPotential = TemperatureSalinityPair.PotentialAndPractical;

    // Reference: five levels of the check casts published with the TEOS-10 toolbox (tests/Reference/seawater/gsw_check_casts.csv): columns
    // pt0_from_t, SP_chck_cast, position and pressure, CT_from_t, SA_from_SP. The toolbox itself allows 6e-10 degC and 1.3e-10 g/kg or less.
    [Theory]
    [InlineData(27.962, 34.306287392599714, 11, 142, 0, 27.996436412058213, 34.468236430490606)]
    [InlineData(1.5919261126559991, 34.652278999853984, 11, 142, 2534, 1.5920152151251625, 34.832276550596632)]
    [InlineData(26.960549482037408, 34.494339000022983, 9.5, 183, 50, 26.984519550841551, 34.657240399095258)]
    [InlineData(3.2697334708739891, 34.585781000007742, 9.5, 183, 1416, 3.2691229461896851, 34.762487890645836)]
    [InlineData(4.4090358206430791, 10.279548, 59, 20, 101, 4.6113979927987794, 10.389468455026284)]
    public void Convert_CheckCastLevel_GivesThePublishedValuesBothWays(double pt, double sp, double latitude, double longitude, double pressure, double ct, double sa)
    {
        EndMember there = Converted(Water(pt, sp, latitude, longitude, pressure), ToConservative);
        EndMember back = Converted(there, ToPotential);

        Assert.Equal(ct, there.Values["conservative_temperature"], 6e-10);
        Assert.Equal(sa, there.Values["absolute_salinity"], 1.3e-10);
        Assert.False(there.Values.ContainsKey("potential_temperature") || there.Values.ContainsKey("practical_salinity"));
        Assert.Equal(pt, back.Values["potential_temperature"], 1e-9);
        Assert.Equal(sp, back.Values["practical_salinity"], 1e-9);
    }

    // Reference: Python package gsw 3.6.16 (Debian python3-gsw): J from CT_first_derivatives and from SA_from_SP by differences, then
    // J C J' in numpy. Columns: pt, SP, position, pressure, sd of pt and SP, their correlation; sd of CT and SA, their correlation.
    [Theory]
    [InlineData(3.3, 34.9, 62, -30, 2000, 0.15, 0.02, 0.0, 0.14983772622981217, 0.02009625397342063, -0.001230854038604394)]
    [InlineData(11.9, 36.5, 36, -12, 1000, 0.4, 0.05, -0.6, 0.3997786138544178, 0.05023870828289035, -0.6017018403800319)]
    [InlineData(5.0, 7.5, 59, 20, 30, 1.0, 0.3, 0.5, 1.0396674131245314, 0.30066891428579545, 0.4985720755091514)]
    public void Convert_Spread_IsPropagatedAsByTheReferenceDerivatives(
        double pt, double sp, double latitude, double longitude, double pressure, double sdT, double sdS, double r, double newSdT, double newSdS, double newR)
    {
        EndMember water = Water(pt, sp, latitude, longitude, pressure) with
        {
            Sd = new Dictionary<string, double> { ["potential_temperature"] = sdT, ["practical_salinity"] = sdS },
            Correlations = r == 0 ? null : new TracerMatrix(["practical_salinity", "potential_temperature"], [[1, r], [r, 1]]),
        };

        EndMember there = Converted(water, ToConservative);

        Assert.Equal(newSdT, there.Sd["conservative_temperature"], 1e-9);
        Assert.Equal(newSdS, there.Sd["absolute_salinity"], 1e-9);
        Assert.Equal(newR, Of(there.Correlations!, "conservative_temperature", "absolute_salinity"), 1e-8);
    }

    [Fact]
    public void Convert_ThereAndBack_ReturnsValuesSpreadsAndCorrelations()
    {
        EndMember water = Water(3.3, 34.9, 62, -30, 2000) with
        {
            Sd = new Dictionary<string, double> { ["potential_temperature"] = 0.15, ["practical_salinity"] = 0.02, ["oxygen"] = 6 },
            MeanSd = new Dictionary<string, double> { ["potential_temperature"] = 0.03, ["practical_salinity"] = 0.004, ["oxygen"] = 1 },
            Correlations = new TracerMatrix(
                ["oxygen", "potential_temperature", "practical_salinity"],
                [[1, -0.8, 0.1], [-0.8, 1, 0.3], [0.1, 0.3, 1]]),
        };

        EndMember back = Converted(Converted(water, ToConservative), ToPotential);

        Same(water.Values, back.Values);
        Same(water.Sd, back.Sd);
        Same(water.MeanSd, back.MeanSd);
        Assert.Equal(water.Correlations!.Tracers, back.Correlations!.Tracers);
        Assert.All(water.Correlations.Matrix.SelectMany(row => row).Zip(back.Correlations.Matrix.SelectMany(row => row)), pair => Assert.Equal(pair.First, pair.Second, 1e-9));
        Assert.Empty(EndMemberSetCheck.Findings(new EndMemberSet("x", 1, [Converted(water, ToConservative)])));
    }

    [Fact]
    public void Convert_MeanSdOfOneOnly_CountsTheOtherAsSdOverRootN()
    {
        EndMember partly = Water(3.3, 34.9, 62, -30, 2000) with
        {
            Sd = new Dictionary<string, double> { ["potential_temperature"] = 0.15, ["practical_salinity"] = 0.02 },
            MeanSd = new Dictionary<string, double> { ["potential_temperature"] = 0.03 },
            Observations = 4,
        };
        EndMember spelledOut = partly with { MeanSd = new Dictionary<string, double> { ["potential_temperature"] = 0.03, ["practical_salinity"] = 0.01 } };

        Same(Converted(spelledOut, ToConservative).MeanSd, Converted(partly, ToConservative).MeanSd);
        Assert.Empty(Converted(partly with { MeanSd = new Dictionary<string, double>() }, ToConservative).MeanSd);
    }

    [Fact]
    public void Convert_NoSpreadButCorrelations_RenamesThem()
    {
        EndMember water = Water(3.3, 34.9, 62, -30, 2000) with { Correlations = new TracerMatrix(["oxygen", "practical_salinity"], [[1, 0.4], [0.4, 1]]) };

        EndMember there = Converted(water, ToConservative);

        Assert.Equal(new TracerMatrix(["oxygen", "absolute_salinity"], [[1, 0.4], [0.4, 1]]), there.Correlations);
        Assert.Empty(there.Sd);
        Assert.Null(Converted(Water(3.3, 34.9, 62, -30, 2000), ToConservative).Correlations);
    }

    [Fact]
    public void Convert_AlreadyThatPairOrNoneOfThem_StaysAsItIs()
    {
        EndMember there = Converted(Water(3.3, 34.9, 62, -30, 2000), ToConservative);
        EndMember neither = new("N", "", new Dictionary<string, double> { ["oxygen"] = 3 }, new Provenance(ProvenanceKind.Manual));

        Assert.Same(there, Converted(there, ToConservative));
        Assert.Same(neither, Converted(neither, ToConservative));
    }

    [Fact]
    public void Convert_WithoutPosition_NamesEveryEndMemberThatLacksOne()
    {
        EndMember with = Water(3.3, 34.9, 62, -30, 2000);
        EndMemberSet set = new("x", 1, [with with { Id = "A", Position = null }, with, with with { Id = "C", Position = null }]);

        ConvertedSet converted = TemperatureSalinityConversion.Convert(set, ToConservative);

        Assert.Null(converted.Set);
        Assert.Equal(["/endMembers/0/position", "/endMembers/2/position"], converted.Findings.Select(f => f.Path));
        Assert.Equal(["none for A", "none for C"], converted.Findings.Select(f => f.Found));
    }

    [Theory]
    [InlineData("potential_temperature", null, "/endMembers/0/values")]
    [InlineData("practical_salinity", null, "/endMembers/0/values")]
    [InlineData("conservative_temperature", "practical_salinity", "/endMembers/0/values")]
    public void Convert_HalfAPairOrAMixedOne_IsRefused(string one, string? other, string path)
    {
        var values = new[] { one, other }.OfType<string>().ToDictionary(id => id, _ => 10.0);

        ConvertedSet converted = TemperatureSalinityConversion.Convert(new("x", 1, [Water(1, 1, 0, 0, 0) with { Values = values }]), ToConservative);

        Assert.Null(converted.Set);
        Assert.Equal(path, Assert.Single(converted.Findings).Path);
    }

    [Fact]
    public void Convert_SouthOfTheAtlas_IsRefusedWithThePosition()
    {
        ConvertedSet converted = TemperatureSalinityConversion.Convert(new("x", 1, [Water(1, 34, -89, 0, 10)]), ToConservative);

        Assert.Null(converted.Set);
        Assert.Contains("-89 N", Assert.Single(converted.Findings).Found, StringComparison.Ordinal);
    }

    private static EndMember Water(double pt, double sp, double latitude, double longitude, double pressure) => new(
        "W",
        "",
        new Dictionary<string, double> { ["potential_temperature"] = pt, ["practical_salinity"] = sp, ["oxygen"] = 250 },
        new Provenance(ProvenanceKind.Manual))
    {
        Position = new EndMemberPosition(latitude, longitude, pressure),
        Observations = 1,
    };

    private static EndMember Converted(EndMember endMember, TemperatureSalinityPair to)
    {
        ConvertedSet converted = TemperatureSalinityConversion.Convert(new EndMemberSet("x", 1, [endMember]), to);
        Assert.Empty(converted.Findings);
        return converted.Set!.EndMembers[0];
    }

    private static double Of(TracerMatrix matrix, string one, string other) =>
        matrix.Matrix[matrix.Tracers.ToList().IndexOf(one)][matrix.Tracers.ToList().IndexOf(other)];

    private static void Same(IReadOnlyDictionary<string, double> expected, IReadOnlyDictionary<string, double> actual)
    {
        Assert.Equal(expected.Keys.Order(), actual.Keys.Order());
        Assert.All(expected, pair => Assert.Equal(pair.Value, actual[pair.Key], 1e-9));
    }
}
