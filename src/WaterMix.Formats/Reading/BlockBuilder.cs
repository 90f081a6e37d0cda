using WaterMix.Core;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>From a block's originals to its table: bottles that did not trip, litres, and the merging of bottle and CTD values.</summary>
internal sealed class BlockBuilder(string file, SourceColumn? bottleFlag, TableSchema schema, ColumnTarget[] targets, ReadingOptions options, IPerKilogram perKilogram, FindingList findings)
{
    private readonly Dictionary<(string Quantity, ValueOrigin Role), ColumnTarget> _targets = targets.ToDictionary(t => (t.Plan.Quantity.Id, t.Plan.Role));
    private long _leaking;
    private long _mistripped;

    /// <summary>The table of one block; the buffers' arrays become the table's.</summary>
    /// <param name="rows">Number of rows in the buffers.</param>
    /// <param name="identity">The identity columns.</param>
    /// <param name="bottleFlags">The file's bottle flags, at least that long, or empty.</param>
    public SampleTable Build(int rows, IdentityColumn[] identity, byte[] bottleFlags)
    {
        byte[]? bottles = schema.HasBottleFlags ? Fit(bottleFlags, rows) : null;
        _leaking += bottles?.LongCount(f => f == QualityFlags.Questionable) ?? 0;
        _mistripped += bottles?.LongCount(f => f == QualityFlags.Bad) ?? 0;
        var columns = new List<SampleColumn>();
        var litres = new LitresPerKilogram(this, rows, columns);
        foreach (SchemaQuantity quantity in schema.Quantities)
        {
            ColumnTarget? bottle = Original(quantity, ValueOrigin.Bottle, rows, litres);
            ColumnTarget? ctd = Original(quantity, ValueOrigin.Ctd, rows, litres);
            ColumnTarget? merged = Original(quantity, ValueOrigin.None, rows, litres);
            if (quantity.KeepsOriginals)
            {
                columns.Add(Merged(quantity, bottle, ctd, merged, bottles, rows));
                if (quantity.HasBottle)
                {
                    columns.Add(OriginalColumn(quantity, bottle, ValueOrigin.Bottle, rows));
                }

                if (quantity.HasCtd)
                {
                    columns.Add(OriginalColumn(quantity, ctd, ValueOrigin.Ctd, rows));
                }
            }
            else
            {
                columns.Add(Single(quantity, bottle ?? ctd, bottles, rows));
            }
        }

        return new SampleTable(rows, identity, columns, bottles);
    }

    /// <summary>Reports what was counted over the file's blocks.</summary>
    public void Close()
    {
        if (_leaking > 0)
        {
            findings.Fold("leaking", bottleFlag?.Name, () => new Finding(Severity.Warning, "bottles that closed well", "leaking bottles (flag 3)", "Their values were kept; look at them.") { File = file, Column = bottleFlag?.Name }, _leaking);
        }

        if (_mistripped > 0)
        {
            findings.Fold("mistripped", bottleFlag?.Name, () => new Finding(Severity.Warning, "bottles that tripped where they should", "bottles that did not (flag 4)", "The values of their water were made void; the report counts them by column.") { File = file, Column = bottleFlag?.Name }, _mistripped);
        }
    }

    // The original with the density applied, its arrays cut to the number of rows; null where this file has none.
    private ColumnTarget? Original(SchemaQuantity quantity, ValueOrigin role, int rows, LitresPerKilogram litres)
    {
        if (!_targets.TryGetValue((quantity.Quantity.Id, role), out ColumnTarget? target))
        {
            return null;
        }

        target.Buffer.Resize(rows, isNew: false);
        litres.Apply(target);
        return target;
    }

    private static SampleColumn OriginalColumn(SchemaQuantity quantity, ColumnTarget? target, ValueOrigin origin, int rows)
    {
        bool hasFlags = origin == ValueOrigin.Ctd ? quantity.CtdFlags : quantity.BottleFlags;
        return new SampleColumn(quantity.Quantity, target?.Buffer.Values ?? Missing(rows), hasFlags ? Fit(target?.Buffer.Flags ?? [], rows) : null, origin: origin)
        {
            Suffix = origin == ValueOrigin.Ctd ? Origins.CtdSuffix : Origins.BottleSuffix,
            Source = origin == ValueOrigin.Ctd ? quantity.CtdSource : quantity.BottleSource,
            Conversion = quantity.Conversion,
        };
    }

    // One original only: the main column is that one, with origins where the instrument is not the usual one.
    private static SampleColumn Single(SchemaQuantity quantity, ColumnTarget? target, byte[]? bottles, int rows)
    {
        double[] values = target?.Buffer.Values ?? Missing(rows);
        byte[]? flags = quantity.MainFlags ? Fit(target?.Buffer.Flags ?? [], rows) : null;
        if (bottles is not null && target is { Plan.IsWaterSample: true })
        {
            for (int i = 0; i < rows; i++)
            {
                Void(target, bottles[i], ref values[i], ref flags![i]);
            }
        }

        ValueOrigin origin = quantity.HasCtd ? ValueOrigin.Ctd : ValueOrigin.Bottle;
        ValueOrigin[]? origins = quantity.IsPlain ? null : [.. values.Select(v => double.IsNaN(v) ? ValueOrigin.None : origin)];
        return Main(quantity, values, flags, origins, origin);
    }

    private SampleColumn Merged(SchemaQuantity quantity, ColumnTarget? bottle, ColumnTarget? ctd, ColumnTarget? merged, byte[]? bottles, int rows)
    {
        double[] values = new double[rows];
        byte[]? flags = quantity.MainFlags ? new byte[rows] : null;
        var origins = new ValueOrigin[rows];
        for (int i = 0; i < rows; i++)
        {
            (double value, byte flag, ValueOrigin origin) = merged is not null
                ? At(merged, i, merged.Buffer.Origins[i], bottles)
                : Choose(At(bottle, i, ValueOrigin.Bottle, bottles), At(ctd, i, ValueOrigin.Ctd, bottles), bottle is not null, ctd is not null);
            values[i] = value;
            origins[i] = double.IsNaN(value) ? ValueOrigin.None : origin;
            if (flags is not null)
            {
                flags[i] = flag;
            }
        }

        return Main(quantity, values, flags, origins, ValueOrigin.Bottle);
    }

    private static SampleColumn Main(SchemaQuantity quantity, double[] values, byte[]? flags, ValueOrigin[]? origins, ValueOrigin origin) =>
        new(quantity.Quantity, values, flags, origins, origin) { Source = quantity.Source, Conversion = quantity.Conversion };

    // Bottle first (or the CTD, where that is preferred); the other where the first is missing or its flag is not accepted;
    // where neither is acceptable, the first that has a value, with its flag.
    private (double Value, byte Flag, ValueOrigin Origin) Choose(
        (double Value, byte Flag, ValueOrigin Origin) bottle, (double Value, byte Flag, ValueOrigin Origin) ctd, bool hasBottle, bool hasCtd)
    {
        bool ctdFirst = options.Prefer == ValueOrigin.Ctd;
        (double Value, byte Flag, ValueOrigin Origin) first = ctdFirst ? ctd : bottle;
        (double Value, byte Flag, ValueOrigin Origin) second = ctdFirst ? bottle : ctd;
        if (Accepts(first))
        {
            return first;
        }

        if (Accepts(second) || (double.IsNaN(first.Value) && !double.IsNaN(second.Value)))
        {
            return second;
        }

        return (ctdFirst ? hasCtd : hasBottle) ? first : second;
    }

    private bool Accepts((double Value, byte Flag, ValueOrigin Origin) one) =>
        !double.IsNaN(one.Value) && options.AcceptedFlags.Accepts(one.Flag, one.Origin);

    private static (double Value, byte Flag, ValueOrigin Origin) At(ColumnTarget? target, int row, ValueOrigin origin, byte[]? bottles)
    {
        if (target is null)
        {
            return (double.NaN, QualityFlags.NoFlag, origin);
        }

        double value = target.Buffer.Values[row];
        byte flag = target.Plan.Flag is null ? QualityFlags.NoFlag : target.Buffer.Flags[row];
        if (bottles is not null && origin != ValueOrigin.Ctd && target.Plan.IsWaterSample)
        {
            Void(target, bottles[row], ref value, ref flag);
        }

        return (value, flag, origin);
    }

    private static void Void(ColumnTarget target, byte bottle, ref double value, ref byte flag)
    {
        if (bottle == QualityFlags.Bad && !double.IsNaN(value))
        {
            value = double.NaN;
            flag = QualityFlags.Bad;
            target.Voided++;
        }
    }

    private static double[] Missing(int rows)
    {
        double[] values = new double[rows];
        Array.Fill(values, double.NaN);
        return values;
    }

    private static byte[] Fit(byte[] flags, int rows)
    {
        Array.Resize(ref flags, rows);
        return flags;
    }

    /// <summary>The factors of a block, each computed when the first column asks for it, from the columns that stand before it.</summary>
    private sealed class LitresPerKilogram(BlockBuilder builder, int rows, List<SampleColumn> columns)
    {
        private double[]? _potential;
        private double[]? _laboratory;

        public void Apply(ColumnTarget target)
        {
            double[] values = target.Buffer.Values;
            VolumeBasis[] bases = target.Buffer.Bases;
            if (bases.Length == 0 && target.Plan.Conversion.Basis == VolumeBasis.None)
            {
                return;
            }

            for (int i = 0; i < rows; i++)
            {
                VolumeBasis basis = bases.Length == 0 ? target.Plan.Conversion.Basis : bases[i];
                if (basis == VolumeBasis.None || double.IsNaN(values[i]))
                {
                    continue;
                }

                values[i] *= Of(basis)[i];
                if (double.IsNaN(values[i]))
                {
                    string file = builder.Name;
                    builder.Findings.Fold("density", target.Plan.Column.Name, () => new Finding(
                        Severity.Warning,
                        "position, pressure, temperature and salinity of every sample, to convert from amounts per litre",
                        "a sample without one of them",
                        "Its value counts as missing. Supply them, or the concentration per kilogram.")
                    { File = file, Column = target.Plan.Column.Name });
                }
            }
        }

        private double[] Of(VolumeBasis basis) => basis == VolumeBasis.PotentialDensity
            ? _potential ??= builder.PerKilogram.AtPotentialDensity(Table(), builder.Accepted)
            : _laboratory ??= builder.PerKilogram.InLaboratory(Table(), builder.Accepted, builder.LaboratoryTemperature);

        private SampleTable Table() => new(rows, [], [.. columns]);
    }

    private string Name => file;

    private FindingList Findings => findings;

    private IPerKilogram PerKilogram => perKilogram;

    private AcceptedFlags Accepted => options.AcceptedFlags;

    private double LaboratoryTemperature => options.LaboratoryTemperature;
}
