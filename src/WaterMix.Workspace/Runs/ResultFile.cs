using System.Runtime.InteropServices;
using Parquet.Schema;
using WaterMix.Core.Mixing;
using WaterMix.Workspace.Storage;
using WaterMix.Workspace.Storage.Columns;

namespace WaterMix.Workspace.Runs;

/// <summary>Results as a column file: written and read back bit for bit, the same result always as the same bytes.</summary>
internal static class ResultFile
{
    private const string Kind = "watermix/result/1";

    /// <summary>Writes a result; the file appears whole or not at all.</summary>
    /// <param name="path">The file.</param>
    /// <param name="result">The result, without proof of optimality.</param>
    public static async Task WriteAsync(string path, MixingResult result)
    {
        await using NewFile file = NewFile.In(Path.GetDirectoryName(path)!);
        Column[] columns = [.. Columns(result.Model)];
        await using ColumnFileWriter writer = await ColumnFileWriter.CreateAsync(file.Stream, [.. columns.Select(c => c.Field)]);
        for (int from = 0; from < result.RowCount; from += ColumnFileWriter.GroupRows)
        {
            int rows = Math.Min(ColumnFileWriter.GroupRows, result.RowCount - from);
            await writer.WriteGroupAsync(rows, [.. columns.Select(c => Part(c.Of(result), from, rows))]);
        }

        await writer.FinishAsync(Kind, "{}");
        await file.MoveToAsync(path);
    }

    /// <summary>Reads a result into some rows of another.</summary>
    /// <param name="path">The file.</param>
    /// <param name="into">A result of the same model.</param>
    /// <param name="from">Index of the first row to fill.</param>
    /// <returns>The number of rows filled.</returns>
    /// <exception cref="InvalidDataException">The file is missing or damaged.</exception>
    public static async Task<int> ReadAsync(string path, MixingResult into, int from)
    {
        await using ColumnFileReader file = await ColumnFileReader.OpenAsync(path, "The results of a run");
        file.Description(Kind);
        int rows = file.RowCount;
        foreach (Column column in Columns(into.Model))
        {
            switch (column.Of(into))
            {
                case double[] values:
                    await file.FillAsync(column.Field.Name, values.AsMemory(from, rows));
                    break;
                case int[] values:
                    await file.FillAsync(column.Field.Name, values.AsMemory(from, rows));
                    break;
                case string?[] values:
                    await file.FillAsync(column.Field.Name, values.AsMemory(from, rows));
                    break;
                case SolveStatus[] values:
                    byte[] statuses = await file.NumbersAsync<byte>(column.Field.Name);
                    MemoryMarshal.Cast<byte, SolveStatus>(statuses).CopyTo(values.AsSpan(from));
                    break;
            }
        }

        return rows;
    }

    /// <summary>Bytes of a result in memory, for the cache.</summary>
    public static long Bytes(MixingResult result) =>
        (long)result.RowCount * (1 + 12 + (8 * (6 + result.Fractions.Length + result.Amounts.Length + result.Residuals.Length)));

    /// <summary>Some rows of a result.</summary>
    public static MixingResult Slice(MixingResult result, int from, int count)
    {
        var part = new MixingResult(result.Model, count, withProof: false);
        Copy(result, from, part, 0, count);
        return part;
    }

    /// <summary>Copies rows of a result into another of the same model.</summary>
    public static void Copy(MixingResult source, int from, MixingResult target, int to, int count)
    {
        foreach (Column column in Columns(source.Model))
        {
            Array.Copy(column.Of(source), from, column.Of(target), to, count);
        }
    }

    private static IEnumerable<Column> Columns(PreparedModel prepared)
    {
        MixingModel model = prepared.Model;
        yield return new(ColumnFileWriter.Field<byte>("status"), r => r.Status);
        yield return new(ColumnFileWriter.Field<int>("layer"), r => r.Layer);
        yield return new(ColumnFileWriter.Field<int>("tracers"), r => r.TracerCount);
        for (int i = 0; i < model.EndMembers.EndMembers.Count; i++)
        {
            int index = i;
            yield return new(ColumnFileWriter.Field<double>("fraction_" + model.EndMembers.EndMembers[i].Id), r => r.Fractions[index]);
        }

        yield return new(ColumnFileWriter.Field<double>("fraction:sum"), r => r.FractionSum);
        for (int i = 0; i < model.Processes.Count; i++)
        {
            int index = i;
            yield return new(ColumnFileWriter.Field<double>("amount_" + model.Processes[i].Id), r => r.Amounts[index]);
        }

        for (int i = 0; i < model.Tracers.Count; i++)
        {
            int index = i;
            yield return new(ColumnFileWriter.Field<double>("residual_" + model.Tracers[i]), r => r.Residuals[index]);
        }

        yield return new(ColumnFileWriter.Field<double>("residual:mass"), r => r.ResidualMass);
        yield return new(ColumnFileWriter.Field<double>("misfit"), r => r.Misfit);
        yield return new(ColumnFileWriter.Field<double>("chi2"), r => r.Chi2);
        yield return new(ColumnFileWriter.Field<int>("dof"), r => r.DegreesOfFreedom);
        yield return new(ColumnFileWriter.Field<double>("p_value"), r => r.PValue);
        yield return new(ColumnFileWriter.Field<string>("note"), r => r.Notes);
    }

    private static Array Part(Array column, int from, int rows)
    {
        Array part = column switch
        {
            SolveStatus[] => new byte[rows],
            double[] => new double[rows],
            int[] => new int[rows],
            _ => new string?[rows],
        };
        Array.Copy(column, from, part, 0, rows);
        return part;
    }

    private sealed record Column(DataField Field, Func<MixingResult, Array> Of);
}
