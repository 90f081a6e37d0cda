using CsvHelper;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Results;

/// <summary>Writes mixing results as CSV, block after block: UTF-8, LF, empty for missing, numbers that read back to the same double.</summary>
/// <remarks>The columns and their order are a contract (<c>docs/results.md</c>); they depend only on the model, the options and the input's headers.</remarks>
public sealed class ResultCsvWriter : IDisposable
{
    private static readonly string[] PlaceIds = [Quantity.Latitude.Id, Quantity.Longitude.Id, Quantity.Pressure.Id];

    private readonly CsvWriter _csv;
    private readonly PreparedModel _model;
    private readonly bool _namesFiles;
    private readonly bool _withProof;
    private bool _headerWritten;

    /// <summary>A writer to a stream, which stays open.</summary>
    /// <param name="stream">Where the text goes.</param>
    /// <param name="model">The model that makes the results.</param>
    /// <param name="namesFiles">True where the rows name their file (<see cref="OpenedSamples.NamesFiles"/>): <c>file, file_row</c> come first.</param>
    /// <param name="withProof">True to add <c>kkt_violation</c>.</param>
    public ResultCsvWriter(Stream stream, PreparedModel model, bool namesFiles, bool withProof)
    {
        ArgumentNullException.ThrowIfNull(model);
        _csv = CsvWriter.Create(stream, new CsvWriterOptions { NewLine = "\n" }, true);
        _model = model;
        _namesFiles = namesFiles;
        _withProof = withProof;
    }

    /// <summary>Writes one block; the first also writes the header.</summary>
    /// <param name="block">The samples.</param>
    /// <param name="result">Their results.</param>
    public void Write(SampleBlock block, MixingResult result)
    {
        ArgumentNullException.ThrowIfNull(block);
        ArgumentNullException.ThrowIfNull(result);
        if (!_headerWritten)
        {
            WriteHeader(block.Table);
            _headerWritten = true;
        }

        SampleColumn?[] places = [.. PlaceIds.Select(block.Table.Find)];
        for (int row = 0; row < result.RowCount; row++)
        {
            WriteRow(block, result, places, row);
        }
    }

    /// <summary>Writes what is still buffered; the stream stays open.</summary>
    public void Dispose() => _csv.Dispose();

    private void WriteHeader(SampleTable samples)
    {
        MixingModel model = _model.Model;
        List<string> names = _namesFiles ? ["file", "file_row", "row"] : ["row"];
        names.AddRange(samples.Identity.Select(c => c.Id));
        names.AddRange(PlaceIds);
        names.AddRange(["layer", "status", "tracers"]);
        names.AddRange(model.EndMembers.EndMembers.Select(e => "fraction_" + e.Id));
        names.Add("fraction_sum");
        names.AddRange(model.Processes.Select(p => "amount_" + p.Id));
        names.AddRange(model.Tracers.Select(t => "residual_" + t));
        names.AddRange(["residual_mass", "misfit", "chi2", "dof", "p_value"]);
        if (_withProof)
        {
            names.Add("kkt_violation");
        }

        names.Add("note");
        foreach (string name in names)
        {
            _csv.WriteField(name);
        }

        _csv.EndRecord();
    }

    private void WriteRow(SampleBlock block, MixingResult result, SampleColumn?[] places, int row)
    {
        if (_namesFiles)
        {
            _csv.WriteField(block.File);
            _csv.WriteField(block.FirstFileRow + row);
        }

        _csv.WriteField(block.FirstRow + row);
        foreach (IdentityColumn column in block.Table.Identity)
        {
            _csv.WriteField(column[row]);
        }

        foreach (SampleColumn? column in places)
        {
            WriteNumber(column is null ? double.NaN : column.Values[row]);
        }

        int layer = result.Layer[row];
        _csv.WriteField(layer < 0 ? "" : _model.LayerIds[layer]);
        _csv.WriteField(result.Status[row].Name());
        _csv.WriteField(result.TracerCount[row]);
        WriteNumbers(result.Fractions, row);
        WriteNumber(result.FractionSum[row]);
        WriteNumbers(result.Amounts, row);
        WriteNumbers(result.Residuals, row);
        WriteNumber(result.ResidualMass[row]);
        WriteNumber(result.Misfit[row]);
        WriteNumber(result.Chi2[row]);
        int degrees = result.DegreesOfFreedom[row];
        WriteNumber(degrees < 0 ? double.NaN : degrees);
        WriteNumber(result.PValue[row]);
        if (result.KktViolation is { } violation)
        {
            WriteNumber(violation[row]);
        }

        _csv.WriteField(result.Notes[row] ?? "");
        _csv.EndRecord();
    }

    private void WriteNumbers(double[][] columns, int row)
    {
        foreach (double[] column in columns)
        {
            WriteNumber(column[row]);
        }
    }

    private void WriteNumber(double value)
    {
        if (double.IsNaN(value))
        {
            _csv.WriteField("");
        }
        else
        {
            _csv.WriteField(value, default);
        }
    }
}
