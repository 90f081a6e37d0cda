using WaterMix.Core;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Tests.Reading;

namespace WaterMix.Formats.Tests.Matching;

public class ColumnGuessTests
{
    [Theory]
    [InlineData("temperature_C", "in_situ_temperature", "degC")]
    [InlineData("Temp", "in_situ_temperature", "")]
    [InlineData("theta (degC)", "potential_temperature", "degC")]
    [InlineData("Salinity [PSS-78]", "practical_salinity", "PSS-78")]
    [InlineData("SAL", "practical_salinity", "")]
    [InlineData("oxygen [mL/L]", "oxygen", "mL/L")]
    [InlineData("O2_umol_kg", "oxygen", "umol/kg")]
    [InlineData("dissolved oxygen (umol/kg)", "oxygen", "umol/kg")]
    [InlineData("PO4 (umol/L)", "phosphate", "umol/L")]
    [InlineData("NO3 µmol/kg", "nitrate", "umol/kg")]
    [InlineData("SiO4", "silicate", "")]
    [InlineData("NO2+NO3", "nitrate", "")]
    [InlineData("NH4", "ammonium", "")]
    [InlineData("DIC [umol/kg]", "dissolved_inorganic_carbon", "umol/kg")]
    [InlineData("TALK", "total_alkalinity", "")]
    [InlineData("δ18O [‰]", "delta_oxygen_18", "‰")]
    [InlineData("CFC-11 [PMOL/KG]", "cfc11", "PMOL/KG")]
    [InlineData("SF6 [fmol/kg]", "sulfur_hexafluoride", "fmol/kg")]
    [InlineData("Depth_m", "depth", "m")]
    [InlineData("DEPTH", "depth", "")]
    [InlineData("Bottom depth [m]", "bottom_depth", "m")]
    [InlineData("bottom_depth_m", "bottom_depth", "m")]
    [InlineData("pressure_dbar", "pressure", "dbar")]
    [InlineData("CTD pressure", "pressure", "")]
    [InlineData("lat", "latitude", "")]
    [InlineData("Lon", "longitude", "")]
    [InlineData("Latitude [degrees_north]", "latitude", "degrees_north")]
    [InlineData("gamma_n", "neutral_density", "")]
    public void Of_NameInTheWild_IsThatQuantity(string name, string quantity, string unit)
    {
        using OpenedSamples opened = Open($"station,{name}\n1,2\n");

        ColumnMatch match = opened.Match.Columns[1];
        Assert.Equal((name, quantity), (match.Column, match.Quantity));
        string found = match.Unit ?? SourceColumn.Parse(1, name).Unit;
        Assert.True(found == unit || Units.Normalise(found) == Units.Normalise(unit) || (unit == "degC" && found == "c") || found.Replace('_', '/') == unit, found);
    }

    [Theory]
    [InlineData("station_no", "station")]
    [InlineData("Station No.", "station")]
    [InlineData("STNNBR", "station")]
    [InlineData("Cruise", "expocode")]
    [InlineData("cast_no", "cast")]
    [InlineData("sample number", "sample")]
    [InlineData("SECT_ID", "section")]
    public void Of_IdentityName_IsThatColumn(string name, string id)
    {
        using OpenedSamples opened = Open($"oxygen,{name}\n1,2\n");

        Assert.Equal(id, opened.Match.Columns[1].Identity);
    }

    [Fact]
    public void Of_DateAndTime_BecomeOneTime()
    {
        SampleTable table = ReadingHelp.Table("station,date,time,oxygen\n1,2008-02-05,22:07,200\n2,2008-02-05,,200\n");

        IdentityColumn time = table.Identity.Single(i => i.Id == "time");
        Assert.Equal(["2008-02-05T22:07:00Z", "2008-02-05"], [time[0], time[1]]);
    }

    [Theory]
    [InlineData("salinity_ctd", ValueOrigin.Ctd)]
    [InlineData("ctd_salinity", ValueOrigin.Ctd)]
    [InlineData("CTD salinity [PSS-78]", ValueOrigin.Ctd)]
    [InlineData("salinity_bottle", null)]
    [InlineData("salinity", null)]
    public void Of_InstrumentInTheName_IsTheOrigin(string name, ValueOrigin? origin)
    {
        using OpenedSamples opened = Open($"station,{name}\n1,35\n");

        Assert.Equal(("practical_salinity", origin), (opened.Match.Columns[1].Quantity!, opened.Match.Columns[1].Origin));
    }

    [Theory]
    [InlineData("Salinity [PSS-78],salinity_flag")]
    [InlineData("Salinity [PSS-78],Salinity [PSS-78]_FLAG_W")]
    [InlineData("sal,salinity_flag")]
    [InlineData("SALNTY,SALNTY_FLAG_W")]
    public void Of_FlagColumn_GoesWithItsColumn(string header)
    {
        using OpenedSamples opened = Open($"station,{header}\n1,35,2\n");

        Assert.Equal(header.Split(',')[1], opened.Match.Columns[1].Flag);
        Assert.Empty(opened.Findings);
    }

    [Fact]
    public void Of_FlagsOfAnotherScheme_AreNotUsedAndSaidSo()
    {
        SampleTable table = ReadingHelp.Table("station,oxygen,oxygen_qc\n1,200,1\n");

        Assert.False(table.Find("oxygen")!.HasFlags);
        Finding finding = Assert.Single(ReadingHelp.Findings("station,oxygen,oxygen_qc\n1,200,1\n"));
        Assert.Equal((Severity.Warning, "oxygen_qc"), (finding.Severity, finding.Column!));
    }

    [Theory]
    [InlineData("silcate", "silicate")]
    [InlineData("phospate", "phosphate")]
    [InlineData("salinty", "salinity")]
    public void Of_MisspeltName_IsSuggestedNotGuessed(string name, string suggestion)
    {
        string csv = $"station,{name}\n1,35\n";

        Finding finding = Assert.Single(ReadingHelp.Findings(csv));

        Assert.Contains($"near to '{suggestion}'", finding.Found, StringComparison.Ordinal);
        Assert.Equal([name], ReadingHelp.Table(csv).Columns.Select(c => c.Id));
    }

    [Fact]
    public void Of_UnknownColumn_IsKeptAsAFurtherTracerWithItsUnit()
    {
        SampleColumn column = Assert.Single(ReadingHelp.Table("station,barium [nmol/kg]\n1,45\n").Columns);

        Assert.Equal(("barium", "nmol/kg"), (column.Id, column.Quantity.Unit));
    }

    [Fact]
    public void Of_WhpNames_DepthIsTheSounding()
    {
        SampleTable table = ReadingHelp.Table("EXPOCODE,STNNBR,DEPTH [METERS],CTDPRS [DBAR]\nX,1,4000,10\n");

        Assert.Equal(["pressure", "bottom_depth"], table.Columns.Select(c => c.Id));
    }

    [Fact]
    public void Of_BottlePositions_AreFurtherColumnsAndDoNotReplaceTheStations()
    {
        SampleTable table = ReadingHelp.Table("EXPOCODE,STNNBR,LATITUDE,LONGITUDE,BTL_LAT,BTL_LON\nX,1,-9,10,-8.9,10.1\n");

        Assert.Equal(["latitude", "longitude", "BTL_LAT", "BTL_LON"], table.Columns.Select(c => c.Id));
        Assert.Equal([-9, 10, -8.9, 10.1], table.Columns.Select(c => c.Values[0]));
    }

    [Fact]
    public void Of_NoSampleNumbers_UsesBottleNumbers()
    {
        SampleTable table = ReadingHelp.Table("EXPOCODE,STNNBR,BTLNBR,OXYGEN\nX,1,a3,200\n");

        Assert.Equal("a3", table.Identity.Single(i => i.Id == "sample")[0]);
    }

    [Fact]
    public void Of_SumOfNitrateAndNitrite_StandsInForNitrateOnlyWhereThereIsNone()
    {
        Finding note = Assert.Single(ReadingHelp.Findings("station,NO2+NO3 [umol/kg]\n1,20\n"));
        SampleTable both = ReadingHelp.Table("station,NO2+NO3 [umol/kg],NO3 [umol/kg]\n1,20,19\n");

        Assert.Equal((Severity.Note, "NO2+NO3 [umol/kg]"), (note.Severity, note.Column!));
        Assert.Equal(["nitrate", "nitrate_plus_nitrite"], both.Columns.Select(c => c.Id));
        Assert.Equal(19, both.Find("nitrate")!.Values[0]);
    }

    [Fact]
    public void Of_TemperatureWithoutAScale_IsTakenAsIts90AndNoted()
    {
        Finding note = Assert.Single(ReadingHelp.Findings("station,temperature [degC]\n1,20\n"));

        Assert.Equal((Severity.Note, "It was taken as ITS-90."), (note.Severity, note.Remedy));
    }

    [Fact]
    public void Of_ConcentrationWithoutAUnit_IsTakenAsCanonicalAndNoted()
    {
        Finding note = Assert.Single(ReadingHelp.Findings("station,O2\n1,200\n"));

        Assert.Equal((Severity.Note, "It was taken as umol/kg."), (note.Severity, note.Remedy));
    }

    [Fact]
    public void Of_SalinityInGramsPerKilogram_IsNotGuessed()
    {
        SampleTable table = ReadingHelp.Table("station,salinity [g/kg]\n1,35\n");

        Assert.Null(table.Find("practical_salinity"));
        Assert.Null(table.Find("absolute_salinity"));
    }

    [Fact]
    public void Of_TheIdItself_WinsOverAnotherNameOfTheQuantity()
    {
        SampleTable table = ReadingHelp.Table("station,oxygen,O2 [mL/L]\n1,200,4.5\n");

        Assert.Equal([200, 4.5], table.Columns.Select(c => c.Values[0]));
        Assert.Equal("oxygen", table.Columns[0].Id);
    }

    [Fact]
    public void Of_WhpName_WinsOverAnotherNameOfTheQuantity()
    {
        SampleTable table = ReadingHelp.Table("EXPOCODE,STNNBR,TCARBN [UMOL/KG],TCO2 [UMOL/KG]\nX,1,2100,2101\n");

        Assert.Equal(["dissolved_inorganic_carbon", "TCO2"], table.Columns.Select(c => c.Id));
        Assert.Equal(2100, table.Columns[0].Values[0]);
    }

    [Fact]
    public void Of_OtherNameInAnExchangeFile_IsUnderstoodToo()
    {
        SampleTable table = ReadingHelp.Table("CTD,20000101TEST\nNUMBER_HEADERS = 2\nSTNNBR = 1\nCTDPRS,NITRATE,NITRATE_FLAG_W,FLUOR\nDBAR,UMOL/KG,,MG/M3\n10,20,2,0.5\nEND_DATA\n");

        Assert.Equal(["pressure", "nitrate", "FLUOR"], table.Columns.Select(c => c.Id));
        Assert.All(table.Columns, c => Assert.Equal(ValueOrigin.Ctd, c.OriginAt(0)));
    }

    private static OpenedSamples Open(string csv) => SampleReader.Open([ReadingHelp.File("a.csv", csv)], new ReadingOptions());
}
