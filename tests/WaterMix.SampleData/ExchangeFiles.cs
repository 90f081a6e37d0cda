using System.Globalization;
using System.Text;

namespace WaterMix.SampleData;

/// <summary>The cruise as WHP-Exchange bottle and CTD files, <c>WhpExchange</c>.</summary>
public static class ExchangeFiles
{
    private const string Stamp = "20240301HALCYON";

    private const string Notice = "# Halcyon Basin is an invented ocean: nothing here was ever measured.";

    /// <summary>The bottle file.</summary>
    /// <param name="cruise">The cruise.</param>
    public static string Bottles(Cruise cruise)
    {
        ArgumentNullException.ThrowIfNull(cruise);
        var text = new StringBuilder();
        text.Append("BOTTLE,").Append(Stamp).Append('\n').Append(Notice).Append('\n');
        text.Append("EXPOCODE,SECT_ID,STNNBR,CASTNO,SAMPNO,BTLNBR,BTLNBR_FLAG_W,DATE,TIME,LATITUDE,LONGITUDE,DEPTH,CTDPRS,CTDTMP");
        foreach (Column column in Enum.GetValues<Column>())
        {
            string name = column.ToString().ToUpperInvariant();
            text.Append(CultureInfo.InvariantCulture, $",{name},{name}_FLAG_W");
        }

        text.Append("\n,,,,,,,,,,,METERS,DBAR,ITS-90");
        foreach (Column column in Enum.GetValues<Column>())
        {
            text.Append(Bottle.TracerOf(column) == 1 ? ",PSS-78," : ",UMOL/KG,");
        }

        text.Append('\n');
        foreach (Bottle bottle in cruise.Bottles)
        {
            Append(text, bottle);
        }

        return text.Append("END_DATA\n").ToString();
    }

    /// <summary>One cast's CTD file.</summary>
    /// <param name="station">The station; its first cast is written.</param>
    /// <param name="levels">The levels, from the surface down.</param>
    public static string Cast(Station station, IReadOnlyList<CtdLevel> levels)
    {
        ArgumentNullException.ThrowIfNull(station);
        ArgumentNullException.ThrowIfNull(levels);
        CultureInfo plain = CultureInfo.InvariantCulture;
        var text = new StringBuilder();
        text.Append("CTD,").Append(Stamp).Append('\n').Append(Notice).Append('\n');
        text.Append(plain, $"NUMBER_HEADERS = 10\nEXPOCODE = {Cruise.Expocode}\nSECT_ID = {Cruise.SectionId}\nSTNNBR = {station.Number}\nCASTNO = 1\n");
        text.Append(plain, $"DATE = {station.Start:yyyyMMdd}\nTIME = {station.Start:HHmm}\n");
        text.Append(plain, $"LATITUDE = {station.Latitude:F4}\nLONGITUDE = {station.Longitude:F4}\nDEPTH = {station.BottomDepth}\n");
        text.Append("CTDPRS,CTDPRS_FLAG_W,CTDTMP,CTDTMP_FLAG_W,CTDSAL,CTDSAL_FLAG_W,CTDOXY,CTDOXY_FLAG_W\nDBAR,,ITS-90,,PSS-78,,UMOL/KG,\n");
        foreach (CtdLevel level in levels)
        {
            int flag = level.IsInterpolated ? 6 : 2;
            text.Append(plain, $"{level.Pressure:F1},2,{level.Temperature:F4},{flag},{level.Salinity:F4},{flag},{level.Oxygen:F1},{flag}\n");
        }

        return text.Append("END_DATA\n").ToString();
    }

    private static void Append(StringBuilder text, Bottle bottle)
    {
        CultureInfo plain = CultureInfo.InvariantCulture;
        Station station = bottle.Station;
        DateTime time = station.Start.AddHours(bottle.Cast == 1 ? 0 : 3);
        text.Append(plain, $"{Cruise.Expocode},{Cruise.SectionId},{station.Number},{bottle.Cast},{bottle.Sample},{bottle.Sample},{bottle.Flag},");
        text.Append(plain, $"{time:yyyyMMdd},{time:HHmm},{station.Latitude:F4},{station.Longitude:F4},{station.BottomDepth},");
        text.Append(plain, $"{bottle.Pressure:F1},{bottle.Temperature:F4}");
        foreach (Column column in Enum.GetValues<Column>())
        {
            Measured measured = bottle[column];
            double value = double.IsNaN(measured.Value) ? -999 : measured.Value;
            text.Append(',').Append(value.ToString(Format(column), plain)).Append(',').Append(measured.Flag.ToString(plain));
        }

        text.Append('\n');
    }

    private static string Format(Column column) => Bottle.TracerOf(column) switch
    {
        1 => "F4",
        2 => "F1",
        4 => "F3",
        _ => "F2",
    };
}
