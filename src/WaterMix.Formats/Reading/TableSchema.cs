using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>One quantity of the table, and which originals the files have of it.</summary>
/// <param name="Quantity">What it is.</param>
internal sealed record SchemaQuantity(Quantity Quantity)
{
    /// <summary>Some file has it from the bottle.</summary>
    public bool HasBottle { get; init; }

    /// <summary>Some file has it from the CTD.</summary>
    public bool HasCtd { get; init; }

    /// <summary>Some file has it merged already.</summary>
    public bool HasMerged { get; init; }

    /// <summary>The bottle's original has flags.</summary>
    public bool BottleFlags { get; init; }

    /// <summary>The CTD's original has flags.</summary>
    public bool CtdFlags { get; init; }

    /// <summary>The main column has flags.</summary>
    public bool MainFlags { get; init; }

    /// <summary>The header names it was read from, in the order of the files.</summary>
    public string BottleSource { get; init; } = "";

    /// <summary>Likewise for the CTD's original.</summary>
    public string CtdSource { get; init; } = "";

    /// <summary>Likewise for a column that was merged already.</summary>
    public string MergedSource { get; init; } = "";

    /// <summary>The conversions made.</summary>
    public string Conversion { get; init; } = "";

    /// <summary>How the columns were matched, the first file's.</summary>
    public MatchedBy By { get; init; }

    /// <summary>True where every value comes from the usual instrument, so that the column needs no origins.</summary>
    public bool IsPlain => !HasMerged && (Origins.Usual(Quantity) == ValueOrigin.Ctd ? !HasBottle : !HasCtd);

    /// <summary>True where both originals stand beside the main column (or one, where a file was merged already).</summary>
    public bool KeepsOriginals => HasMerged || (HasBottle && HasCtd);

    /// <summary>The main column's sources in one text.</summary>
    public string Source => string.Join(", ", new[] { MergedSource, BottleSource, CtdSource }.Where(s => s.Length > 0));
}

/// <summary>The columns of every block of every file: the union over the headers.</summary>
internal sealed class TableSchema
{
    private TableSchema(IReadOnlyList<string> identity, IReadOnlyList<SchemaQuantity> quantities, bool hasBottleFlags)
    {
        Identity = identity;
        Quantities = quantities;
        HasBottleFlags = hasBottleFlags;
    }

    /// <summary>The identity columns, in the tidy table's order.</summary>
    public IReadOnlyList<string> Identity { get; }

    /// <summary>The quantities: those of the contract in its order, then further ones as they come.</summary>
    public IReadOnlyList<SchemaQuantity> Quantities { get; }

    /// <summary>Some file has bottle flags.</summary>
    public bool HasBottleFlags { get; }

    /// <summary>The union of what the plans read.</summary>
    public static TableSchema Union(IReadOnlyList<FilePlan> plans)
    {
        bool hasBottleFlags = plans.Any(p => p.BottleFlag is not null);
        var present = plans.SelectMany(p => p.Identity.Keys).Select(id => id == "date" ? "time" : id).ToHashSet(StringComparer.Ordinal);
        var byId = new Dictionary<string, SchemaQuantity>(StringComparer.Ordinal);
        var order = new List<string>();
        foreach (PlannedColumn column in plans.SelectMany(p => p.Columns))
        {
            if (!byId.TryGetValue(column.Quantity.Id, out SchemaQuantity? quantity))
            {
                quantity = new SchemaQuantity(column.Quantity) { By = column.By };
                order.Add(column.Quantity.Id);
            }

            byId[column.Quantity.Id] = With(quantity, column, hasBottleFlags);
        }

        var contract = Quantity.All.Select((q, i) => (q.Id, i)).ToDictionary(p => p.Id, p => p.i, StringComparer.Ordinal);
        return new TableSchema(
            [.. IdentityColumn.Ids.Where(present.Contains)],
            [.. order.OrderBy(id => contract.GetValueOrDefault(id, int.MaxValue)).Select(id => byId[id])],
            hasBottleFlags);
    }

    private static SchemaQuantity With(SchemaQuantity quantity, PlannedColumn column, bool hasBottleFlags)
    {
        bool flags = column.Flag is not null;
        SchemaQuantity with = quantity with
        {
            MainFlags = quantity.MainFlags || flags || (hasBottleFlags && column.IsWaterSample),
            Conversion = Join(quantity.Conversion, column.Conversion.Text),
        };
        return column.Role switch
        {
            ValueOrigin.Bottle => with with { HasBottle = true, BottleFlags = quantity.BottleFlags || flags, BottleSource = Join(quantity.BottleSource, column.Column.Name) },
            ValueOrigin.Ctd => with with { HasCtd = true, CtdFlags = quantity.CtdFlags || flags, CtdSource = Join(quantity.CtdSource, column.Column.Name) },
            _ => with with { HasMerged = true, MergedSource = Join(quantity.MergedSource, column.Column.Name) },
        };
    }

    private static string Join(string list, string item) =>
        item.Length == 0 || list.Split("; ").Contains(item) ? list : list.Length == 0 ? item : $"{list}; {item}";
}
