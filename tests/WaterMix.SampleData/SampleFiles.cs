using System.Globalization;
using System.Text;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.MixingModels;

namespace WaterMix.SampleData;

/// <summary>Every generated file of <c>sample-data</c>, by its name there.</summary>
public static class SampleFiles
{
    /// <summary>Makes all files.</summary>
    /// <param name="seed">The seed of all random numbers.</param>
    /// <returns>The files' bytes by their name relative to the folder, with <c>/</c> between parts.</returns>
    public static IReadOnlyDictionary<string, byte[]> Make(ulong seed)
    {
        var cruise = new Cruise(seed);
        var files = new Dictionary<string, byte[]>
        {
            [Models.SetFile] = EndMemberSetFile.Write(Sources.Set),
            ["halcyon.mixmodel.json"] = MixingModelFile.Write(Models.TwoLayers),
            ["halcyon-simple.mixmodel.json"] = MixingModelFile.Write(Models.Simple),
            ["halcyon-coastline.geojson"] = Encoding.UTF8.GetBytes(Coastline.GeoJson(new Noise(seed))),
            ["halcyon_hy1.csv"] = Encoding.UTF8.GetBytes(ExchangeFiles.Bottles(cruise)),
            ["halcyon_truth.csv"] = Encoding.UTF8.GetBytes(Truth(cruise)),
        };
        foreach (int number in CtdCast.Stations)
        {
            Station station = cruise.Stations[number - 1];
            string name = string.Create(CultureInfo.InvariantCulture, $"casts/halcyon_{number:D5}_00001_ct1.csv");
            files[name] = Encoding.UTF8.GetBytes(ExchangeFiles.Cast(station, CtdCast.Levels(cruise, station)));
        }

        return files;
    }

    /// <summary>The true fractions and amounts at each bottle's pressure; empty in the mixed layer, which is no mixture of the sources.</summary>
    private static string Truth(Cruise cruise)
    {
        var text = new StringBuilder("station,cast,sample");
        foreach (string id in Sources.Set.EndMembers.Select(e => e.Id))
        {
            text.Append(",fraction_").Append(id);
        }

        text.Append(CultureInfo.InvariantCulture, $",amount_{Sources.Respiration.Id},amount_{Sources.Opal.Id}\n");
        foreach (Bottle bottle in cruise.Bottles)
        {
            text.Append(CultureInfo.InvariantCulture, $"{bottle.Station.Number},{bottle.Cast},{bottle.Sample}");
            bool isMixture = bottle.Pressure >= Models.MixedLayer;
            foreach (double value in (double[])[.. bottle.Water.Fractions, bottle.Water.Respiration, bottle.Water.Opal])
            {
                text.Append(',').Append(isMixture ? value.ToString("0.####", CultureInfo.InvariantCulture) : "");
            }

            text.Append('\n');
        }

        return text.ToString();
    }
}
