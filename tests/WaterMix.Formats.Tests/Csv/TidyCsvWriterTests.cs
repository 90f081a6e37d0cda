using System.Text;
using CsCheck;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Tests.Reading;

namespace WaterMix.Formats.Tests.Csv;

public class TidyCsvWriterTests
{
    [Fact]
    public void Write_Table_IsThisText()
    {
        SampleTable table = ReadingHelp.Table(
            "BOTTLE,20000101TEST\nEXPOCODE,STNNBR,BTLNBR_FLAG_W,DATE,TIME,CTDPRS,CTDSAL,CTDSAL_FLAG_W,SALNTY,SALNTY_FLAG_W,HELIUM,HELIUM_FLAG_W\n,,,,,DBAR,PSS-78,,PSS-78,,NMOL/KG,\n"
            + "\"A,B\",7a,2,19930923,2222,10.10,35.2000,2,-999,9,1.5,2\nC,8,3,,,20,35.3,2,35.1,2,-999,5\nEND_DATA\n");

        Assert.Equal(
            "expocode,station,time,bottle_flag,pressure,practical_salinity,practical_salinity_flag,practical_salinity_source,"
            + "practical_salinity_bottle,practical_salinity_bottle_flag,practical_salinity_ctd,practical_salinity_ctd_flag,HELIUM [NMOL/KG],HELIUM_flag\n"
            + "\"A,B\",7a,1993-09-23T22:22:00Z,2,10.1,35.2,2,ctd,,9,35.2,2,1.5,2\n"
            + "C,8,,3,20,35.1,2,bottle,35.1,2,35.3,2,,5\n",
            Encoding.UTF8.GetString(ReadingHelp.Write(table)));
    }

    // Property: whatever the table, reading back what was written gives the same bits.
    [Fact]
    public void Write_ThenRead_GivesTheSameTable() =>
        Gen.Select(
            Gen.Double.Where(v => double.IsFinite(v) && v != -999 && v != -9 && Math.Abs(v) < 1e30).Array[1, 40],
            Gen.Byte[0, 9].Array[40],
            Gen.Byte[1, 3].Array[40],
            Gen.String[Gen.Char["abc ,\"'#;é0"], 0, 5].Array[40]).Sample((values, flags, bottles, names) =>
        {
            int n = values.Length;
            string[] distinct = [.. names.Take(n).Select(s => s.Trim()).Where(s => s.Length > 0).Distinct()];
            int[] codes = [.. names.Take(n).Select(s => Array.IndexOf(distinct, s.Trim()))];
            double[] holes = [.. values.Select((v, i) => i % 3 == 0 ? double.NaN : v)];
            ValueOrigin[] origins = [.. holes.Select((v, i) => double.IsNaN(v) ? ValueOrigin.None : i % 2 == 0 ? ValueOrigin.Bottle : ValueOrigin.Ctd)];
            var table = new SampleTable(
                n,
                [new IdentityColumn("station", codes, distinct)],
                [
                    new SampleColumn(Quantity.Pressure, values, origin: ValueOrigin.Ctd),
                    new SampleColumn(Quantity.Oxygen, holes, flags[..n], origins),
                    new SampleColumn(Quantity.Silicate, values),
                    new SampleColumn(Quantity.Further("Ba", "nmol/kg"), holes, flags[..n]),
                ],
                bottles[..n]);

            using OpenedSamples opened = SampleReader.Open([ReadingHelp.File("a.csv", ReadingHelp.Write(table))], new ReadingOptions());
            SampleTable back = Assert.Single(opened.ReadBlocks(TestContext.Current.CancellationToken)).Table;

            Assert.False(opened.HasErrors, string.Join("\n", opened.Findings));
            Assert.Equal(["pressure", "oxygen", "silicate", "Ba"], back.Columns.Select(c => c.Id));
            Assert.Equal(Bits(values), Bits(back.Columns[0].Values.ToArray()));
            Assert.Equal(Bits(holes), Bits(back.Columns[1].Values.ToArray()));
            Assert.Equal(flags[..n], back.Columns[1].Flags.ToArray());
            Assert.Equal(origins, Enumerable.Range(0, n).Select(back.Columns[1].OriginAt));
            Assert.Equal("nmol/kg", back.Columns[3].Quantity.Unit);
            Assert.Equal(bottles[..n], back.BottleFlags.ToArray());
            Assert.Equal(Enumerable.Range(0, n).Select(i => table.Identity[0][i]), Enumerable.Range(0, n).Select(i => back.Identity[0][i]));
        });

    // Columns that lost their quantity, or whose names nearly are ids, must not find another on the way back.
    [Theory]
    [InlineData("station,oxygen [furlongs],O2 [mL/L],dissolved oxygen [umol/L]\n1,2,3,4\n")]
    [InlineData("station,oxygen,O2 [mL/L]\n1,200,4.5\n")]
    [InlineData("station,silcate,silicate\n1,200,4.5\n")]
    [InlineData("station,oxygen,oxygen_qc,oxygen_ctd\n1,200,2,201\n")]
    [InlineData("CTD,20000101TEST\nNUMBER_HEADERS = 3\nSTNNBR = 1\nLATITUDE = -9\nCTDPRS,CTDPRS_FLAG_W,CTDSAL,CTDSAL_FLAG_W,FLUOR\nDBAR,,PSS-78,,MG/M3\n10,2,35,7,0.5\n12,2,-999,9,-999\nEND_DATA\n")]
    public void Write_AwkwardColumns_ReadBackTheSame(string text)
    {
        SampleTable table = ReadingHelp.Table(text);

        ReadingHelp.AssertSame(table, ReadingHelp.Table(Encoding.UTF8.GetString(ReadingHelp.Write(table))));
    }

    // A table as conversion writes it, derived columns included.
    [Fact]
    public void Write_DerivedColumns_ReadBackTheSame()
    {
        SampleTable measured = ReadingHelp.Table("station,latitude,longitude,pressure,in_situ_temperature,salinity,salinity_flag,oxygen,phosphate\n1,30,-40,100,10,35.1,2,200,1.5\n2,,-40,100,10,35.1,3,200,1.5\n");
        SampleTable table = SampleDerivation.Derive(measured, ["conservative_temperature", "absolute_salinity", "sigma2", "apparent_oxygen_utilisation", "po"]).Table;

        SampleTable back = ReadingHelp.Table(Encoding.UTF8.GetString(ReadingHelp.Write(table)));

        foreach (SampleColumn column in table.Columns)
        {
            SampleColumn again = back.Find(column.Id)!;
            Assert.Equal(Bits(column.Values.ToArray()), Bits(again.Values.ToArray()));
            Assert.Equal(column.Flags.ToArray(), again.Flags.ToArray());
        }
    }

    [Fact]
    public void Write_TableWithoutSamples_IsTheHeader()
    {
        using OpenedSamples opened = SampleReader.Open([ReadingHelp.File("a.csv", "station,oxygen\n")], new ReadingOptions());

        Assert.Equal("station,oxygen\n", Encoding.UTF8.GetString(ReadingHelp.Write(opened.Schema)));
    }

    private static long[] Bits(double[] values) => [.. values.Select(BitConverter.DoubleToInt64Bits)];
}
