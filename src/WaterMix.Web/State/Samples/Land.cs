using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;
using WaterMix.Workspace.Demo;

namespace WaterMix.Web.State.Samples;

/// <summary>The land around a study's stations.</summary>
public static class Land
{
    /// <summary>The beginning of the invented cruise's expedition code; no country has the letters ZZ.</summary>
    private const string Invented = "ZZHB";

    private static readonly Lazy<Coastline> Halcyon = new(() =>
    {
        using Stream coast = InventedOcean.Open("halcyon-coastline.geojson");
        return Coastline.FromGeoJson(coast);
    });

    /// <summary>The invented ocean's land where every cruise belongs to it; null for the earth's.</summary>
    /// <param name="cruises">The cruises.</param>
    public static Coastline? Of(IReadOnlyList<FigureCruise> cruises)
    {
        ArgumentNullException.ThrowIfNull(cruises);
        return cruises.Count > 0 && cruises.All(c => IsInvented(c.Samples)) ? Halcyon.Value : null;
    }

    private static bool IsInvented(SampleTable table) =>
        table.RowCount > 0 && table.Identity.FirstOrDefault(c => c.Id == "expocode")?[0].StartsWith(Invented, StringComparison.Ordinal) == true;
}
