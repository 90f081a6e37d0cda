using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;
using WaterMix.Formats.Matching;
using WaterMix.Web.State.Figures;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.State.Samples;

/// <summary>The samples of a study's cruises with the flags that count as usable.</summary>
public sealed class StudySamples
{
    private bool[]? _flagged;

    /// <summary>Samples of cruises.</summary>
    /// <param name="cruises">The cruises, in the study's order.</param>
    /// <param name="tables">Their samples and results, in the same order.</param>
    /// <param name="accepted">The flags that count as usable.</param>
    /// <param name="factors">The factors of NO, PO, N* and PO4*.</param>
    public StudySamples(IReadOnlyList<Cruise> cruises, IReadOnlyList<FigureCruise> tables, AcceptedFlags accepted, DerivedTracerFactors factors)
    {
        ArgumentNullException.ThrowIfNull(tables);
        Cruises = cruises;
        Accepted = accepted;
        Columns = new FigureColumns(tables, accepted, factors);
        Quantities = [.. Offered(tables)];
        Land = Samples.Land.Of(tables);
    }

    /// <summary>The ids of densities, in the order in which they are offered.</summary>
    public static IReadOnlyList<string> Densities { get; } = ["sigma0", "sigma1", "sigma2", "sigma3", "sigma4", "neutral_density"];

    /// <summary>The cruises.</summary>
    public IReadOnlyList<Cruise> Cruises { get; }

    /// <summary>The flags that count as usable.</summary>
    public AcceptedFlags Accepted { get; }

    /// <summary>The columns of all cruises, for figures.</summary>
    public FigureColumns Columns { get; }

    /// <summary>The quantities that figures can show: measured ones first, then derived ones.</summary>
    public IReadOnlyList<QuantityChoice> Quantities { get; }

    /// <summary>The land around the stations; null for the earth's.</summary>
    public Coastline? Land { get; }

    /// <summary>True where a quantity can be shown.</summary>
    /// <param name="id">Its id.</param>
    public bool Has(string id) => Quantities.Any(q => q.Id == id);

    /// <summary>The first of these quantities that can be shown, or else the first of all; empty without any.</summary>
    /// <param name="ids">Ids in order of preference.</param>
    public string FirstOf(params ReadOnlySpan<string> ids)
    {
        foreach (string id in ids)
        {
            if (Has(id))
            {
                return id;
            }
        }

        return Quantities.Count > 0 ? Quantities[0].Id : "";
    }

    /// <summary>The axis of a quantity, with the instrument where it is one instrument's original.</summary>
    /// <param name="id">Its id.</param>
    public FigureAxis AxisOf(string id)
    {
        FigureAxis axis = FigureAxis.For(Columns.QuantityOf(id));
        return axis with { Title = axis.Title + Instrument(id) };
    }

    /// <summary>The quantities of which both instruments' values are kept.</summary>
    public IEnumerable<string> WithBothInstruments =>
        Quantities.Where(q => Has(q.Id + Origins.BottleSuffix) && Has(q.Id + Origins.CtdSuffix)).Select(q => q.Id);

    /// <summary>For each row, whether it holds a value whose flag is not accepted. Made once.</summary>
    public bool[] FlaggedRows()
    {
        if (_flagged is { } made)
        {
            return made;
        }

        bool[] flagged = new bool[Columns.RowCount];
        foreach ((int index, FigureCruise cruise) in Columns.Cruises.Index())
        {
            int first = Columns.FirstRow(index);
            foreach (SampleColumn column in cruise.Samples.Columns.Where(c => c.HasFlags))
            {
                for (int row = 0; row < column.Length; row++)
                {
                    flagged[first + row] |= !double.IsNaN(column.Values[row]) && !Accepted.Accepts(column.FlagAt(row), column.OriginAt(row));
                }
            }
        }

        return _flagged = flagged;
    }

    private static IEnumerable<QuantityChoice> Offered(IReadOnlyList<FigureCruise> tables)
    {
        var measured = new List<SampleColumn>();
        foreach (SampleColumn column in tables.SelectMany(t => t.Samples.Columns).Where(c => measured.All(m => m.Id != c.Id)))
        {
            measured.Add(column);
        }

        foreach (SampleColumn column in measured)
        {
            yield return new QuantityChoice(column.Id, Label(column.Quantity, Instrument(column.Id)), false);
        }

        foreach (Quantity quantity in Quantity.All.Where(q => SampleDerivation.CanDerive(q.Id) && measured.All(m => m.Id != q.Id)))
        {
            if (tables.Any(t => CanDerive(t.Samples, quantity)))
            {
                yield return new QuantityChoice(quantity.Id, Label(quantity, ""), true);
            }
        }
    }

    private static bool CanDerive(SampleTable table, Quantity quantity)
    {
        string[] inputs = [.. SampleDerivation.InputsOf([quantity.Id]).Where(id => id != quantity.Id)];
        return inputs.Length > 0
            ? inputs.All(id => table.Find(id) is not null)
            : quantity == Quantity.Pressure ? table.Find(Quantity.Depth) is not null : quantity == Quantity.Depth && table.Find(Quantity.Pressure) is not null;
    }

    private static string Label(Quantity quantity, string instrument)
    {
        string unit = FigureText.Unit(quantity.Unit);
        return FigureText.Sentence(quantity.Name) + instrument + (unit.Length > 0 ? $" ({unit})" : "");
    }

    private static string Instrument(string id) =>
        id.EndsWith(Origins.BottleSuffix, StringComparison.Ordinal) ? ", bottle" : id.EndsWith(Origins.CtdSuffix, StringComparison.Ordinal) ? ", CTD" : "";
}
