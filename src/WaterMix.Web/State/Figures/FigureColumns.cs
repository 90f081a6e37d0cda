using System.Collections.Concurrent;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;

namespace WaterMix.Web.State.Figures;

/// <summary>
/// The samples of a study as arrays for figures. The rows of several cruises run on: row r of the second cruise is the first
/// cruise's number of samples plus r. Columns are made when first asked for, and kept. Every array has <see cref="RowCount"/>
/// entries, NaN where there is no usable value; none may be written to. Several threads may ask at once.
/// </summary>
public sealed class FigureColumns
{
    private readonly AcceptedFlags _accepted;
    private readonly DerivedTracerFactors? _factors;
    private readonly ConcurrentDictionary<string, Lazy<double[]>> _columns = new(StringComparer.Ordinal);
    private readonly int[] _firstRows;
    private CruiseTrack? _track;

    /// <summary>Columns over cruises.</summary>
    /// <param name="cruises">The cruises, in the study's order.</param>
    /// <param name="accepted">The flags that count as usable; null for the defaults.</param>
    /// <param name="factors">The factors of NO, PO, N* and PO4*; null for the defaults.</param>
    public FigureColumns(IReadOnlyList<FigureCruise> cruises, AcceptedFlags? accepted = null, DerivedTracerFactors? factors = null)
    {
        ArgumentNullException.ThrowIfNull(cruises);
        Cruises = cruises;
        _accepted = accepted ?? AcceptedFlags.Default;
        _factors = factors;
        _firstRows = new int[cruises.Count];
        foreach ((int index, FigureCruise cruise) in cruises.Index())
        {
            _firstRows[index] = RowCount;
            RowCount += cruise.Samples.RowCount;
        }
    }

    /// <summary>The cruises.</summary>
    public IReadOnlyList<FigureCruise> Cruises { get; }

    /// <summary>Number of samples of all cruises.</summary>
    public int RowCount { get; }

    /// <summary>The stations, in the order in which the files first name them.</summary>
    public IReadOnlyList<MapStation> Stations => Track.Stations;

    /// <summary>Kilometres along the track of the sample's cruise, from its first station; length n.</summary>
    public double[] DistanceKm => Track.DistanceKm;

    /// <summary>The index of each sample's station in <see cref="Stations"/>; -1 where it has neither a station's name nor a position.</summary>
    public int[] StationOf => Track.StationOf;

    private CruiseTrack Track => _track ??= CruiseTrack.Of(this);

    /// <summary>Which cruise a row belongs to, and its row there.</summary>
    /// <param name="row">A row of all cruises, from 0.</param>
    public (int Cruise, int Row) Locate(int row)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(row);
        ArgumentOutOfRangeException.ThrowIfGreaterThanOrEqual(row, RowCount);
        int cruise = Array.FindLastIndex(_firstRows, first => first <= row);
        while (Cruises[cruise].Samples.RowCount == 0)
        {
            cruise--;
        }

        return (cruise, row - _firstRows[cruise]);
    }

    /// <summary>The first row of a cruise.</summary>
    /// <param name="cruise">Index of the cruise.</param>
    public int FirstRow(int cruise) => _firstRows[cruise];

    /// <summary>The usable values of a quantity, derived where the samples lack it.</summary>
    /// <param name="id">A quantity's id, or one with a suffix such as <c>practical_salinity_ctd</c>.</param>
    public double[] Values(string id) => Kept("value " + id, cruise => Usable(cruise.Samples, id));

    /// <summary>The quantity of a column in the samples; the contract's, or a further one with its unit; without a unit where no cruise has it.</summary>
    /// <param name="id">A column's id.</param>
    public Quantity QuantityOf(string id) =>
        Cruises.Select(c => c.Samples.Find(id)?.Quantity).FirstOrDefault(q => q is not null) ?? Quantity.FindOrFurther(id);

    /// <summary>The fraction of a source; NaN where it is not permitted or the sample has no answer.</summary>
    /// <param name="endMember">The end-member's id.</param>
    public double[] Fractions(string endMember) =>
        Kept("fraction " + endMember, c => Result(c, r => r.Fractions, m => m.EndMembers.EndMembers.Select(e => e.Id), endMember));

    /// <summary>The amount of a process, in the unit of its per-quantity.</summary>
    /// <param name="process">The process's id.</param>
    public double[] Amounts(string process) => Kept("amount " + process, c => Result(c, r => r.Amounts, m => m.Processes.Select(p => p.Id), process));

    /// <summary>The residual of a tracer, observed minus fitted, in the tracer's unit.</summary>
    /// <param name="tracer">The tracer's id.</param>
    public double[] Residuals(string tracer) => Kept("residual " + tracer, c => Result(c, r => r.Residuals, m => m.Tracers, tracer));

    /// <summary>A column of the results that has one number per sample, such as <c>r => r.Misfit</c>.</summary>
    /// <param name="name">A name to keep it under.</param>
    /// <param name="column">The column.</param>
    public double[] OfResult(string name, Func<MixingResult, double[]> column) =>
        Kept("result " + name, c => c.Result is null ? null : column(c.Result));

    /// <summary>What became of a sample; null without a run.</summary>
    /// <param name="row">A row of all cruises.</param>
    public SolveStatus? StatusOf(int row)
    {
        (int cruise, int own) = Locate(row);
        return Cruises[cruise].Result?.Status[own];
    }

    /// <summary>Where the samples stand in a section, its stations and its sea floor.</summary>
    /// <param name="along">What it runs along.</param>
    /// <param name="against">What it runs down.</param>
    /// <param name="rows">The rows to show; null for all.</param>
    public SectionColumns Section(SectionAlong along, SectionAgainst against, IReadOnlyList<int>? rows = null) =>
        SectionMaker.Make(this, along, against, rows);

    /// <summary>The sample in words: <c>station 12, cast 1, sample 4, 1203 dbar</c>, with the cruise where there are several.</summary>
    /// <param name="row">A row of all cruises.</param>
    public string NameOf(int row)
    {
        (int cruise, int own) = Locate(row);
        SampleTable samples = Cruises[cruise].Samples;
        List<string> parts = Cruises.Count > 1 ? [Cruises[cruise].Name] : [];
        foreach (IdentityColumn column in samples.Identity.Where(c => c.Id is "station" or "cast" or "sample" && c[own].Length > 0))
        {
            parts.Add($"{column.Id} {column[own]}");
        }

        double pressure = Values(Quantity.Pressure.Id)[row];
        if (double.IsFinite(pressure))
        {
            parts.Add($"{FigureText.Fixed(pressure, 0)} dbar");
        }

        return parts.Count > 0 ? string.Join(", ", parts) : $"row {FigureText.Count(own + 1)}";
    }

    private double[]? Usable(SampleTable table, string id)
    {
        SampleTable derived = SampleDerivation.CanDerive(id) ? SampleDerivation.Derive(table, [id], _factors).Table : table;
        if (derived.Find(id) is not { } column)
        {
            return null;
        }

        double[] values = new double[column.Length];
        for (int row = 0; row < values.Length; row++)
        {
            values[row] = column.UsableAt(row, _accepted);
        }

        return values;
    }

    private static double[]? Result(FigureCruise cruise, Func<MixingResult, double[][]> columns, Func<MixingModel, IEnumerable<string>> ids, string id)
    {
        int index = cruise.Result is null ? -1 : ids(cruise.Result.Model.Model).ToList().IndexOf(id);
        return index < 0 ? null : columns(cruise.Result!)[index];
    }

    private double[] Kept(string key, Func<FigureCruise, double[]?> make) => _columns.GetOrAdd(key, _ => new Lazy<double[]>(() => Joined(make))).Value;

    private double[] Joined(Func<FigureCruise, double[]?> make)
    {
        double[] column = new double[RowCount];
        column.AsSpan().Fill(double.NaN);
        foreach ((int index, FigureCruise cruise) in Cruises.Index())
        {
            make(cruise)?.CopyTo(column, _firstRows[index]);
        }

        return column;
    }
}
