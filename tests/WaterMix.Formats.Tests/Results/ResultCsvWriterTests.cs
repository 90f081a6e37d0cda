using System.Globalization;
using System.Text;
using CsCheck;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Results;
using WaterMix.Formats.Tests.MixingModels;
using WaterMix.Formats.Tests.Reading;

namespace WaterMix.Formats.Tests.Results;

public class ResultCsvWriterTests
{
    private const string Row = "7,30,-40,2000,1.3,34.78,255";

    // The contract: docs/results.md.
    [Theory]
    [InlineData(false, false, "row,", ",p_value,note")]
    [InlineData(true, true, "file,file_row,row,", ",p_value,kkt_violation,note")]
    public void Write_Header_IsInTheContractsOrder(bool namesFiles, bool withProof, string begins, string ends)
    {
        PreparedModel model = PreparedModel.From(MixingModelFile.Read(Encoding.UTF8.GetBytes(HalcyonModel.Json), "m", HalcyonModel.OpenSet).Value!);
        SampleTable table = ReadingHelp.Table("oxygen,sample,time,cast,expocode,pressure,station,section\n255,1,1993-09-23T22:22Z,2,E,2000,7,S\n");

        string header = Write(model, namesFiles, withProof, new SampleBlock(table, "a.csv", 1, 1)).Split('\n')[0];

        Assert.Equal(
            begins + "expocode,section,station,cast,sample,time,latitude,longitude,pressure,layer,status,tracers,"
            + "fraction_NDW,fraction_SBW,fraction_MSW,fraction_sum,amount_respiration,amount_opal,amount_denitrification,"
            + "residual_potential_temperature,residual_practical_salinity,residual_oxygen,residual_nitrate,residual_phosphate,residual_silicate,"
            + "residual_mass,misfit,chi2,dof" + ends,
            header);
    }

    // RFC 4180, section 2: a field with a comma or a quote stands in quotes, a quote in it is doubled.
    [Theory]
    [InlineData("7 b", "7 b")]
    [InlineData("Été №7", "Été №7")]
    [InlineData("\"A,B\"", "\"A,B\"")]
    [InlineData("\"6\"\" é, ß\"", "\"6\"\" é, ß\"")]
    public void Write_StationName_IsQuotedWhereItMustBe(string given, string written)
    {
        SampleTable table = ReadingHelp.Table($"{SmallModel.Header}\n{given}{Row[1..]}\n");

        string row = Write(SmallModel.Prepare(), false, false, new SampleBlock(table, "a.csv", 1, 1)).Split('\n')[1];

        Assert.StartsWith($"1,{written},30,-40,2000,all,solved,3,", row, StringComparison.Ordinal);
    }

    [Fact]
    public void Write_FileNameWithAComma_IsQuotedAndRowsRunOn()
    {
        SampleTable table = ReadingHelp.Table($"{SmallModel.Header}\n{Row}\n");

        string csv = Write(SmallModel.Prepare(), true, false, new SampleBlock(table, "a, b.csv", 1, 1), new SampleBlock(table, "c.csv", 2, 1));

        Assert.Equal(["\"a, b.csv\",1,1,7", "c.csv,1,2,7"], csv.Split('\n')[1..3].Select(line => line[..line.IndexOf(",30,", StringComparison.Ordinal)]));
    }

    [Fact]
    public void Write_Missing_IsEmpty()
    {
        SampleTable table = ReadingHelp.Table($"{SmallModel.Header}\n,,-40,-999,,,\n");

        string row = Write(SmallModel.Prepare(), false, true, new SampleBlock(table, "a.csv", 1, 1)).Split('\n')[1];

        Assert.Matches("^1,,,-40,,all,too-few-tracers,0,,{13}\"?[^,]", row);
    }

    // Property: every number of the samples and of the result reads back to the same bits.
    [Fact]
    public void Write_Numbers_ReadBackToTheSameBits() =>
        Gen.Select(Gen.Double.Where(double.IsFinite), Gen.Double[-2, 6], Gen.Double[34, 36], Gen.Double[200, 320]).Array[1, 20].Sample(rows =>
        {
            var table = new SampleTable(
                rows.Length,
                [],
                [
                    new SampleColumn(Quantity.Pressure, [.. rows.Select(r => r.Item1)]),
                    new SampleColumn(Quantity.PotentialTemperature, [.. rows.Select(r => r.Item2)]),
                    new SampleColumn(Quantity.PracticalSalinity, [.. rows.Select(r => r.Item3)]),
                    new SampleColumn(Quantity.Oxygen, [.. rows.Select(r => r.Item4)]),
                ]);
            PreparedModel model = SmallModel.Prepare();
            MixingResult result = MixingSolver.Solve(model, table, new SolveOptions { Threads = 1, WithProof = true }).Result;

            string[] lines = Write(model, false, true, new SampleBlock(table, "a.csv", 1, 1)).Split('\n');

            double[][] columns =
            [
                table.Columns[0].Values.ToArray(), .. result.Fractions, result.FractionSum, .. result.Amounts, .. result.Residuals,
                result.ResidualMass, result.Misfit, result.Chi2, result.PValue, result.KktViolation!,
            ];
            int[] places = [3, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 18, 19];
            for (int row = 0; row < rows.Length; row++)
            {
                string[] fields = lines[row + 1].Split(',');
                for (int i = 0; i < columns.Length; i++)
                {
                    string field = fields[places[i]];
                    double back = field.Length == 0 ? double.NaN : double.Parse(field, CultureInfo.InvariantCulture);
                    Assert.Equal(BitConverter.DoubleToInt64Bits(columns[i][row]), BitConverter.DoubleToInt64Bits(back));
                }
            }
        });

    [Fact]
    public void Write_SeveralBlocks_GiveTheBytesOfOne()
    {
        string[] rows = [.. Enumerable.Range(0, 100).Select(i => FormattableString.Invariant($"{i},30,-40,{20 * i},{i * 0.03},{34.66 + (i * 0.0024)},{(i % 7 == 0 ? "" : $"{240 + i}")}"))];
        SampleTable Table(Range range) => ReadingHelp.Table($"{SmallModel.Header}\n{string.Join('\n', rows[range])}\n");
        PreparedModel model = SmallModel.Prepare();

        string one = Write(model, false, true, new SampleBlock(Table(..), "a.csv", 1, 1));
        string several = Write(model, false, true, new SampleBlock(Table(..1), "a.csv", 1, 1), new SampleBlock(Table(1..64), "a.csv", 2, 2), new SampleBlock(Table(64..), "a.csv", 65, 65));

        Assert.Equal(one, several);
        Assert.Equal(102, one.Split('\n').Length);
    }

    private static string Write(PreparedModel model, bool namesFiles, bool withProof, params SampleBlock[] blocks)
    {
        using var stream = new MemoryStream();
        using (var writer = new ResultCsvWriter(stream, model, namesFiles, withProof))
        {
            foreach (SampleBlock block in blocks)
            {
                writer.Write(block, MixingSolver.Solve(model, block.Table, new SolveOptions { Threads = 1, WithProof = withProof }).Result);
            }
        }

        return Encoding.UTF8.GetString(stream.ToArray());
    }
}
