using System.Globalization;
using Microsoft.AspNetCore.WebUtilities;
using Microsoft.Extensions.Primitives;

namespace WaterMix.Web.State.Samples;

/// <summary>What the page shows, as its address says it. Whatever the address lacks or garbles has its default.</summary>
public sealed record SampleView
{
    /// <summary>Which samples.</summary>
    public SampleFilter Filter { get; init; } = new();

    /// <summary>The quantity along x of the property plot.</summary>
    public string X { get; init; } = "practical_salinity";

    /// <summary>The quantity along y of the property plot.</summary>
    public string Y { get; init; } = "potential_temperature";

    /// <summary>The quantity that colours the property plot; empty: the cruise.</summary>
    public string Colour { get; init; } = "pressure";

    /// <summary>The quantity that colours the section; empty: the first that the samples have of a usual order.</summary>
    public string Section { get; init; } = "";

    /// <summary>The cruise whose section is shown; null: the first with samples on screen.</summary>
    public Guid? Along { get; init; }

    /// <summary>The id of the station whose profiles are shown; empty: the one with most samples on screen.</summary>
    public string Station { get; init; } = "";

    /// <summary>The quantities of the profiles; empty: a usual choice.</summary>
    public IReadOnlyList<string> Profiles { get; init; } = [];

    /// <summary>The quantity of which bottle and CTD are compared; empty: the first that has both.</summary>
    public string Compare { get; init; } = "";

    /// <summary>The row of the chosen sample over all cruises, from 0; null for none.</summary>
    public int? Sample { get; init; }

    /// <summary>The upload that is being imported; null for none.</summary>
    public Guid? Upload { get; init; }

    /// <summary>The cruise that the upload is read for again; null for a new one.</summary>
    public Guid? Again { get; init; }

    /// <summary>The cruise whose import report is open; null for none.</summary>
    public Guid? Report { get; init; }

    /// <summary>The view that an address asks for.</summary>
    /// <param name="address">An address with or without a query.</param>
    public static SampleView Parse(string address)
    {
        ArgumentNullException.ThrowIfNull(address);
        int query = address.IndexOf('?', StringComparison.Ordinal);
        Dictionary<string, StringValues> said = QueryHelpers.ParseQuery(query < 0 ? "" : address[query..].Split('#')[0]);
        string Text(string key) => said.TryGetValue(key, out StringValues values) ? values.ToString().Trim() : "";
        string Or(string key, string otherwise) => Text(key) is { Length: > 0 } text ? text : otherwise;
        Guid? Id(string key) => Guid.TryParse(Text(key), out Guid id) ? id : null;
        double? Number(string key) => ValueRange.TryParse(Text(key), out double? bound) ? bound : null;
        var defaults = new SampleView();
        return new SampleView
        {
            Filter = new SampleFilter
            {
                Cruises = [.. Text("cruise").Split(',').Select(t => Guid.TryParse(t, out Guid id) ? id : Guid.Empty).Where(id => id != Guid.Empty)],
                Stations = Text("stations"),
                DownQuantity = Text("down") == "depth" ? "depth" : "pressure",
                Down = new ValueRange(Number("down-from"), Number("down-to")),
                DensityQuantity = StudySamples.Densities.Contains(Text("density")) ? Text("density") : "sigma0",
                Density = new ValueRange(Number("density-from"), Number("density-to")),
                Flags = FlagText.Parse(Text("flags")),
                CtdFlags = FlagText.Parse(Text("ctd-flags")),
                OnlyFlagged = Text("flagged") == "only",
            },
            X = Or("x", defaults.X),
            Y = Or("y", defaults.Y),
            Colour = Text("colour") == "cruise" ? "" : Or("colour", defaults.Colour),
            Section = Text("section"),
            Along = Id("along"),
            Station = Text("station"),
            Profiles = Text("profiles").Split(',', StringSplitOptions.RemoveEmptyEntries),
            Compare = Text("compare"),
            Sample = int.TryParse(Text("sample"), NumberStyles.None, CultureInfo.InvariantCulture, out int row) && row > 0 ? row - 1 : null,
            Upload = Id("upload"),
            Again = Id("again"),
            Report = Id("report"),
        };
    }

    /// <summary>The parts of the query, null for those that have their defaults.</summary>
    public IReadOnlyDictionary<string, object?> ToQuery()
    {
        var defaults = new SampleView();
        static string? Said(string value, string otherwise) => value == otherwise || value.Length == 0 ? null : value;
        static string? Number(double? bound) => bound is null ? null : ValueRange.Text(bound);
        static string? Flags(IReadOnlyList<int>? flags) => flags is null ? null : string.Join(',', flags);
        return new Dictionary<string, object?>
        {
            ["cruise"] = Filter.Cruises.Count == 0 ? null : string.Join(',', Filter.Cruises),
            ["stations"] = Said(Filter.Stations, ""),
            ["down"] = Said(Filter.DownQuantity, "pressure"),
            ["down-from"] = Number(Filter.Down.From),
            ["down-to"] = Number(Filter.Down.To),
            ["density"] = Said(Filter.DensityQuantity, "sigma0"),
            ["density-from"] = Number(Filter.Density.From),
            ["density-to"] = Number(Filter.Density.To),
            ["flags"] = Flags(Filter.Flags),
            ["ctd-flags"] = Flags(Filter.CtdFlags),
            ["flagged"] = Filter.OnlyFlagged ? "only" : null,
            ["x"] = Said(X, defaults.X),
            ["y"] = Said(Y, defaults.Y),
            ["colour"] = Colour.Length == 0 ? "cruise" : Said(Colour, defaults.Colour),
            ["section"] = Said(Section, ""),
            ["along"] = Along?.ToString(),
            ["station"] = Said(Station, ""),
            ["profiles"] = Profiles.Count == 0 ? null : string.Join(',', Profiles),
            ["compare"] = Said(Compare, ""),
            ["sample"] = Sample is { } row ? (row + 1).ToString(CultureInfo.InvariantCulture) : null,
            ["upload"] = Upload?.ToString(),
            ["again"] = Again?.ToString(),
            ["report"] = Report?.ToString(),
        };
    }
}
