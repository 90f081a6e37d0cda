using Microsoft.Extensions.FileProviders;

namespace WaterMix.Web.State.Figures;

/// <summary>The earth's land (Natural Earth 1:50 million, <c>NaturalEarth</c>), read once for all users.</summary>
internal static class EarthCoastline
{
    private static readonly Lock Reading = new();
    private static Coastline? s_land;

    /// <summary>The land, read from the served files.</summary>
    /// <param name="files">The files that the app serves.</param>
    public static Coastline Of(IFileProvider files)
    {
        lock (Reading)
        {
            if (s_land is null)
            {
                using Stream stream = files.GetFileInfo("map/land-50m.json").CreateReadStream();
                s_land = Coastline.FromTopoJson(stream);
            }

            return s_land;
        }
    }
}
