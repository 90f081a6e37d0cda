using WaterMix.Core;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>Sample files whose headers are read. The rows stream: no more than one block is held at a time.</summary>
public sealed class OpenedSamples : IDisposable
{
    private readonly IReadOnlyList<FilePlan> _plans;
    private readonly TableSchema _schema;
    private readonly ReadingOptions _options;
    private readonly IPerKilogram _perKilogram;
    private readonly FindingList _opening;
    private readonly IDisposable? _inputs;
    private FindingList _reading = new();
    private ImportTally _tally;

    internal OpenedSamples(IReadOnlyList<FilePlan> plans, TableSchema schema, ReadingOptions options, IPerKilogram perKilogram, FindingList findings, IDisposable? inputs)
    {
        _plans = plans;
        _schema = schema;
        _options = options;
        _perKilogram = perKilogram;
        _opening = findings;
        _inputs = inputs;
        Schema = new BlockBuilder("", null, schema, [], options, perKilogram, _reading).Build(0, [.. schema.Identity.Select(id => new IdentityColumn(id, [], []))], []);
        _tally = new ImportTally(Schema, options.AcceptedFlags);
    }

    /// <summary>The table's columns without rows: ids, sources and conversions. Every block has these, in this order.</summary>
    public SampleTable Schema { get; }

    /// <summary>What was found: on opening, and by the reading that was begun last, as far as it came.</summary>
    public IReadOnlyList<Finding> Findings => [.. _opening.All, .. _reading.All];

    /// <summary>True where the input is not usable. Only certain once every block was read: a file may be cut off.</summary>
    public bool HasErrors => _opening.HasErrors || _reading.HasErrors;

    /// <summary>The match of the first file's columns, as it was guessed or said: correct it and save it.</summary>
    public ColumnMatchFile Match => new(_plans.Count == 0 ? [] : _plans[0].Matches)
    {
        Delimiter = _options.Match?.Delimiter,
        DecimalMark = _options.Match?.DecimalMark ?? '.',
        Missing = _options.Match?.Missing ?? [],
    };

    /// <summary>True where results name the file of each row: the input is several files, or a zip file even of one entry.</summary>
    public bool NamesFiles => _plans.Count > 1 || _plans.Any(p => p.Header.File.IsZipEntry);

    /// <summary>The header names of the first file, in order.</summary>
    public IReadOnlyList<string> Headers => _plans.Count == 0 ? [] : [.. _plans[0].Header.Columns.Select(c => c.Name)];

    /// <summary>What was made of the files, as far as the reading that was begun last came.</summary>
    public ImportReport Report => _tally.Report(_plans, _schema, Findings);

    /// <summary>Reads the rows from the beginning. Files that cannot be read are passed over with a finding; look at <see cref="HasErrors"/> afterwards.</summary>
    /// <param name="cancellation">Stops the reading.</param>
    public IEnumerable<SampleBlock> ReadBlocks(CancellationToken cancellation = default)
    {
        _reading = new FindingList();
        _tally = new ImportTally(Schema, _options.AcceptedFlags);
        long rows = 0;
        foreach (FilePlan plan in _plans)
        {
            var file = new FileReader(plan, _schema, _options, _perKilogram, _reading);
            foreach (SampleBlock block in file.Blocks(rows, cancellation))
            {
                _tally.Count(block);
                yield return block;
            }

            rows += file.Rows;
            _tally.CountVoided(file.Voided);
        }
    }

    /// <inheritdoc/>
    public void Dispose() => _inputs?.Dispose();
}
