using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>Which samples are shown. Part of the page's address.</summary>
public sealed record SampleFilter
{
    /// <summary>The cruises that are shown; empty: all.</summary>
    public IReadOnlyList<Guid> Cruises { get; init; } = [];

    /// <summary>Station names and ranges of numbers as typed; empty: all. See <see cref="StationChoice"/>.</summary>
    public string Stations { get; init; } = "";

    /// <summary>The quantity that <see cref="Down"/> bounds: <c>pressure</c> or <c>depth</c>.</summary>
    public string DownQuantity { get; init; } = "pressure";

    /// <summary>Bounds of pressure, dbar, or depth, m.</summary>
    public ValueRange Down { get; init; }

    /// <summary>The density that <see cref="Density"/> bounds: <c>sigma0</c> to <c>sigma4</c> or <c>neutral_density</c>.</summary>
    public string DensityQuantity { get; init; } = "sigma0";

    /// <summary>Bounds of the density, kg/m3.</summary>
    public ValueRange Density { get; init; }

    /// <summary>Water-sample flags with which a value is shown; null: the model's.</summary>
    public IReadOnlyList<int>? Flags { get; init; }

    /// <summary>CTD flags with which a value is shown; null: the model's.</summary>
    public IReadOnlyList<int>? CtdFlags { get; init; }

    /// <summary>True where only samples are shown that hold a value whose flag is not accepted.</summary>
    public bool OnlyFlagged { get; init; }

    /// <summary>True where every sample is shown.</summary>
    public bool TakesAll => Cruises.Count == 0 && Stations.Length == 0 && Down.IsOpen && Density.IsOpen && !OnlyFlagged;

    /// <summary>The rows that are shown.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <returns>Rows of all cruises, rising.</returns>
    public int[] Rows(StudySamples samples)
    {
        ArgumentNullException.ThrowIfNull(samples);
        FigureColumns columns = samples.Columns;
        if (TakesAll)
        {
            return [.. Enumerable.Range(0, columns.RowCount)];
        }

        bool[] stations = Holding(columns.Stations);
        bool hasStations = Stations.Length > 0;
        int[] stationOf = hasStations ? columns.StationOf : [];
        double[] down = Down.IsOpen ? [] : columns.Values(DownQuantity);
        double[] density = Density.IsOpen ? [] : columns.Values(DensityQuantity);
        bool[] flagged = OnlyFlagged ? samples.FlaggedRows() : [];
        var rows = new List<int>();
        for (int cruise = 0; cruise < samples.Cruises.Count; cruise++)
        {
            if (Cruises.Count > 0 && !Cruises.Contains(samples.Cruises[cruise].Id))
            {
                continue;
            }

            int first = columns.FirstRow(cruise);
            int end = first + columns.Cruises[cruise].Samples.RowCount;
            for (int row = first; row < end; row++)
            {
                if ((!hasStations || (stationOf[row] >= 0 && stations[stationOf[row]]))
                    && (Down.IsOpen || Down.Holds(down[row]))
                    && (Density.IsOpen || Density.Holds(density[row]))
                    && (!OnlyFlagged || flagged[row]))
                {
                    rows.Add(row);
                }
            }
        }

        return [.. rows];
    }

    /// <summary>The flags with which values are shown.</summary>
    /// <param name="model">The model's, for those that the filter does not name.</param>
    public AcceptedFlags Accepted(AcceptedFlags model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return Flags is null && CtdFlags is null ? model : new AcceptedFlags([.. Flags ?? model.WaterSample], [.. CtdFlags ?? model.Ctd]);
    }

    /// <inheritdoc/>
    public bool Equals(SampleFilter? other) =>
        other is not null
        && Cruises.SequenceEqual(other.Cruises)
        && (Stations, DownQuantity, Down, DensityQuantity, Density, OnlyFlagged) == (other.Stations, other.DownQuantity, other.Down, other.DensityQuantity, other.Density, other.OnlyFlagged)
        && Same(Flags, other.Flags)
        && Same(CtdFlags, other.CtdFlags);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Cruises.Count, Stations, DownQuantity, Down, DensityQuantity, Density, OnlyFlagged);

    private static bool Same(IReadOnlyList<int>? a, IReadOnlyList<int>? b) => a is null ? b is null : b is not null && a.SequenceEqual(b);

    private bool[] Holding(IReadOnlyList<MapStation> stations)
    {
        StationChoice? choice = StationChoice.Parse(Stations);
        return [.. stations.Select(s => choice is null || choice.Holds(s.Name))];
    }
}
