using WaterMix.Testing;

namespace WaterMix.Cli.Tests;

/// <summary>The main job on a real section: WOCE A03, North Atlantic 36N, 1993, EXPOCODE 90CT40_1 (written RUCT40_1 in the bottle file), open data.</summary>
public class SolveCommandTests
{
    private static readonly string Model = Path.Combine(TestData.Root, "tests", "WaterMix.Cli.Tests", "Models", "north-atlantic-36n.mixmodel.json");

    private static readonly Lazy<ResultTable> Section = new(() =>
    {
        CommandRun run = CommandRun.Of("solve", TestData.File("bottle/a03_hy1.csv"), "--model", Model, "--proof");
        Assert.True(run.ExitCode == 0, run.Error);
        return ResultTable.Parse(run.Output);
    });

    [Fact]
    public void Solve_NorthAtlanticSection_KeepsEveryRowInOrder()
    {
        TestData.File("bottle/a03_hy1.csv");
        ResultTable section = Section.Value;

        Assert.Equal(2841, section.RowCount);
        Assert.All(Enumerable.Range(0, section.RowCount), row => Assert.Equal(row + 1, section.Number(row, "row")));
        Assert.Equal(124, Enumerable.Range(0, section.RowCount).Select(row => section.Text(row, "station")).Distinct().Count());
        Assert.Equal(
            "row,expocode,section,station,cast,sample,time,latitude,longitude,pressure,layer,status,tracers,"
            + "fraction_MOW,fraction_NACW,fraction_AAIW,fraction_LSW,fraction_ISOW,fraction_DSOW,fraction_AABW,fraction_sum,amount_respiration,amount_opal,"
            + "residual_potential_temperature,residual_practical_salinity,residual_oxygen,residual_nitrate,residual_phosphate,residual_silicate,"
            + "residual_mass,misfit,chi2,dof,p_value,kkt_violation,note",
            string.Join(',', section.Names));
    }

    [Fact]
    public void Solve_NorthAtlanticSection_ProvesEveryAnswerAndConservesMass()
    {
        TestData.File("bottle/a03_hy1.csv");
        ResultTable section = Section.Value;
        int[] solved = [.. Enumerable.Range(0, section.RowCount).Where(row => section.Text(row, "status") == "solved")];

        Assert.True(solved.Length > 1900);
        Assert.All(solved, row => Assert.True(section.Number(row, "kkt_violation") < 1e-9));
        Assert.All(solved, row => Assert.Equal(1, section.Number(row, "fraction_sum"), 1e-12));
    }

    // Common practice, no source: salty Mediterranean-type water enters in the east near 1,000 dbar and fades westward.
    [Fact]
    public void Solve_NorthAtlanticSection_MediterraneanWaterFadesWestward()
    {
        TestData.File("bottle/a03_hy1.csv");
        ResultTable section = Section.Value;
        var rows = Enumerable.Range(0, section.RowCount)
            .Where(row => !double.IsNaN(section.Number(row, "fraction_MOW")))
            .Select(row => (Longitude: section.Number(row, "longitude"), Pressure: section.Number(row, "pressure"), Share: section.Number(row, "fraction_MOW")))
            .ToList();

        foreach ((double longitude, double pressure, _) in rows.OrderByDescending(r => r.Share).Take(5))
        {
            Assert.True(longitude > -10, $"a largest share lies at {longitude}");
            Assert.InRange(pressure, 900, 1500);
        }

        double[] byTenDegrees = [.. rows.Where(r => r.Pressure is >= 900 and <= 1500)
            .GroupBy(r => r.Longitude).Where(g => g.Count() >= 2)
            .Select(g => (Band: (int)(-g.Key / 10), Share: Median(g.Select(r => r.Share))))
            .GroupBy(s => s.Band).OrderBy(g => g.Key).Select(g => Median(g.Select(s => s.Share)))];

        // From 9 W to 60 W each ten degrees hold less than the ten east of them; west of 50 W there is nearly nothing.
        Assert.True(byTenDegrees[0] > 0.7);
        for (int band = 1; band <= 5; band++)
        {
            Assert.True(byTenDegrees[band] < byTenDegrees[band - 1], string.Join(' ', byTenDegrees));
        }

        Assert.All(byTenDegrees[5..], share => Assert.InRange(share, 0, 0.1));
    }

    // Common practice, no source: Antarctic bottom water crosses this latitude in the deep western basin.
    [Fact]
    public void Solve_NorthAtlanticSection_AntarcticBottomWaterLiesInTheDeepWest()
    {
        TestData.File("bottle/a03_hy1.csv");
        ResultTable section = Section.Value;

        int[] largest = [.. Enumerable.Range(0, section.RowCount)
            .Where(row => !double.IsNaN(section.Number(row, "fraction_AABW")))
            .OrderByDescending(row => section.Number(row, "fraction_AABW")).Take(5)];

        foreach (int row in largest)
        {
            Assert.InRange(section.Number(row, "longitude"), -57, -52);
            Assert.True(section.Number(row, "pressure") > 5000);
            Assert.InRange(section.Number(row, "fraction_AABW"), 0.3, 0.45);
        }
    }

    // A deep bottle that holds surface water; its values are flagged bad.
    [Fact]
    public void Solve_BadBottle_IsTooFewTracersAndNotAStrangeMixture()
    {
        TestData.File("bottle/a03_hy1.csv");
        ResultTable section = Section.Value;

        Assert.Equal("12", section.Text(158, "station"));
        Assert.Equal("too-few-tracers", section.Text(158, "status"));
        Assert.Equal("", section.Text(158, "fraction_AABW"));
        Assert.Equal("2 usable tracers for 3 unknowns; without a usable value: oxygen, nitrate, phosphate, silicate", section.Text(158, "note"));
    }

    [Fact]
    public void Solve_ToFileOnAnyThreads_WritesTheSameBytes()
    {
        using var scratch = new Scratch();
        string samples = TestData.File("bottle/a03_hy1.csv");

        CommandRun one = CommandRun.Of("solve", samples, "--model", Model, "--out", scratch.Path("one.csv"), "--threads", "1");
        CommandRun three = CommandRun.Of("solve", samples, "--model", Model, "--out", scratch.Path("three.csv"), "--threads", "3");
        CommandRun standard = CommandRun.Of("solve", samples, "--model", Model);

        Assert.Equal(0, one.ExitCode + three.ExitCode + standard.ExitCode);
        Assert.Equal(File.ReadAllBytes(scratch.Path("one.csv")), File.ReadAllBytes(scratch.Path("three.csv")));
        Assert.Equal(File.ReadAllText(scratch.Path("one.csv")), standard.Output);
        Assert.Contains("2,841 samples in ", one.Error, StringComparison.Ordinal);
        Assert.DoesNotContain('\r', standard.Output);
    }

    [Fact]
    public void Solve_SeveralFiles_NamesTheFileOfEachRow()
    {
        using var scratch = new Scratch();
        string first = TestData.File("bottle/a03_hy1.csv");
        string second = scratch.Write("b_second.csv", "pressure,potential_temperature,practical_salinity,oxygen,nitrate,phosphate,silicate\n2000,3.5,34.95,270,18,1.2,15\n");

        CommandRun run = CommandRun.Of("solve", second, first, "--model", Model);
        ResultTable table = ResultTable.Parse(run.Output);

        Assert.Equal(["file", "file_row", "row"], table.Names.Take(3));
        Assert.Equal(2842, table.RowCount);
        Assert.Equal(("a03_hy1.csv", 1.0, 1.0), (table.Text(0, "file"), table.Number(0, "file_row"), table.Number(0, "row")));
        Assert.Equal(("b_second.csv", 1.0, 2842.0), (table.Text(2841, "file"), table.Number(2841, "file_row"), table.Number(2841, "row")));
        Assert.Equal("solved", table.Text(2841, "status"));
    }

    [Theory]
    [InlineData("--threads", "0", "--threads: expected a whole number of 1 or more; found '0'.")]
    [InlineData("--out", "result.txt", "--out: expected a name that ends in .csv")]
    [InlineData("--accept-flags", "2;6", "--accept-flags: expected flags 0 to 9 with commas between, such as 2,6; found '2;6'.")]
    [InlineData("--laboratory-temperature", "warm", "--laboratory-temperature: expected degrees Celsius between 0 and 40, such as 20; found 'warm'.")]
    public void Solve_WrongOption_SaysWhatWasExpected(string option, string value, string message)
    {
        CommandRun run = CommandRun.Of("solve", "x.csv", "--model", Model, option, value);

        Assert.Equal(1, run.ExitCode);
        Assert.Contains(message, run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_FolderThatDoesNotExist_SaysSoAndEndsWithOne()
    {
        using var scratch = new Scratch();
        string samples = scratch.Write("s.csv", "pressure,potential_temperature,practical_salinity,oxygen,nitrate,phosphate,silicate\n2000,3.5,34.95,270,18,1.2,15\n");

        CommandRun run = CommandRun.Of("solve", samples, "--model", Model, "--out", scratch.Path("no/such/folder/r.csv"));

        Assert.Equal(1, run.ExitCode);
        Assert.Contains("Nothing was written", run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", run.Error, StringComparison.Ordinal);
    }

    private static double Median(IEnumerable<double> values)
    {
        double[] sorted = [.. values.Order()];
        return 0.5 * (sorted[(sorted.Length - 1) / 2] + sorted[sorted.Length / 2]);
    }
}
