using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Reading;
using WaterMix.Web.State.Figures;
using WaterMix.Web.State.Samples;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.Tests.State.Samples;

/// <summary>Small tables of samples for tests.</summary>
internal static class Tables
{
    public static readonly ImportReport NoReport = new(0, [], [], [], [], new Dictionary<int, long>(), []);

    public static Cruise CruiseOf(string name, int rows = 0) => new(Guid.NewGuid(), name, name, rows, Guid.NewGuid(), NoReport, null);

    public static SampleColumn Column(Quantity quantity, double[] values, byte[]? flags = null, string suffix = "", ValueOrigin origin = ValueOrigin.Bottle) =>
        new(quantity, values, flags, origin: origin) { Suffix = suffix };

    public static SampleTable Table(string[] stations, params SampleColumn[] columns)
    {
        string[] names = [.. stations.Distinct()];
        return new SampleTable(stations.Length, [new IdentityColumn("station", [.. stations.Select(s => Array.IndexOf(names, s))], names)], columns);
    }

    public static StudySamples Study(params (Cruise Cruise, SampleTable Table)[] cruises) =>
        new([.. cruises.Select(c => c.Cruise)], [.. cruises.Select(c => new FigureCruise(c.Cruise.Name, c.Table))], AcceptedFlags.Default, new DerivedTracerFactors());
}
