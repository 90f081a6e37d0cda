using System.Globalization;
using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;
using WaterMix.Formats.Json;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Results;

/// <summary>Solves opened samples block by block and writes the results as they come, so that memory does not grow with the input.</summary>
public static class StreamedSolve
{
    /// <summary>The tracers that no input has a column for, as errors; to be asked before the rows are read.</summary>
    /// <param name="samples">The opened samples.</param>
    /// <param name="model">The model.</param>
    public static IReadOnlyList<Finding> MissingTracers(OpenedSamples samples, PreparedModel model)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(model);
        SampleTable derived = SampleDerivation.Derive(samples.Schema, model.QuantityIds).Table;
        return [.. model.ParentIds.Where(id => derived.Find(id) is null).Select(id => new Finding(
            Severity.Error,
            $"a column of {id}, which the model fits",
            $"none in the samples (their columns: {string.Join(", ", samples.Schema.Columns.Select(c => c.Id))})",
            $"Match a column to {id} (--columns), or take it out of the model's tracers."))];
    }

    /// <summary>Reads, solves and writes every sample.</summary>
    /// <param name="samples">The opened samples, without errors so far.</param>
    /// <param name="model">The model.</param>
    /// <param name="options">Threads, proof, cancellation.</param>
    /// <param name="output">Where the CSV goes; it stays open.</param>
    /// <param name="progress">Told the number of samples done after each block, or null.</param>
    /// <returns>The summary. Where it has errors, the output is not to be used.</returns>
    /// <exception cref="OperationCanceledException">The work was cancelled.</exception>
    public static SolveSummary Run(OpenedSamples samples, PreparedModel model, SolveOptions options, Stream output, IProgress<long>? progress)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(options);
        using var hash = new SampleHash();
        using var csv = new ResultCsvWriter(output, model, samples.NamesFiles, options.WithProof);
        long[] statuses = new long[Enum.GetValues<SolveStatus>().Length];
        long[] usable = new long[model.ParentIds.Count];
        var notes = new List<Finding>();
        double violation = options.WithProof ? 0 : double.NaN;
        long rows = 0;
        foreach (SampleBlock block in samples.ReadBlocks(options.Cancellation))
        {
            hash.Add(block.Table);
            SolvedBlock solved = MixingSolver.Solve(model, block.Table, options);
            csv.Write(block, solved.Result);
            Count(solved, statuses, usable);
            notes.AddFolded(solved.Notes);
            foreach (double ofSample in solved.Result.KktViolation ?? [])
            {
                violation = double.IsNaN(ofSample) ? violation : Math.Max(violation, ofSample);
            }

            rows += block.Table.RowCount;
            progress?.Report(rows);
        }

        IEnumerable<Finding> unusable = rows == 0 ? [] : model.ParentIds.Where((_, k) => usable[k] == 0).Select(id => NothingUsable(id, model));
        return new SolveSummary(
            rows,
            Enum.GetValues<SolveStatus>().Where(s => statuses[(int)s] > 0).ToDictionary(s => s, s => statuses[(int)s]),
            [.. samples.Findings, .. UntestableConditions(samples, model), .. notes, .. unusable],
            hash.Finish(),
            violation);
    }

    // A condition on what no input can tell is false for every sample: a whole layer stays empty, or a process is off, and no row says why.
    private static IEnumerable<Finding> UntestableConditions(OpenedSamples samples, PreparedModel model)
    {
        string[] eos80 = [Quantity.PotentialTemperature.Id, Quantity.PracticalSalinity.Id];
        SampleTable derived = SampleDerivation.Derive(samples.Schema, [.. model.QuantityIds, .. eos80]).Table;
        IEnumerable<(Condition Condition, string Of)> uses = model.Model.LayersOrAll.SelectMany(l => l.Where.Select(c => (c, $"layer {l.Id}")))
            .Concat(model.Model.Processes.SelectMany(p => p.Where.Select(c => (c, $"process {p.Id}"))));
        return uses.GroupBy(use => (use.Condition.Quantity, use.Condition.Scale), use => use.Of)
            .Where(g => (g.Key.Scale == DensityScale.Eos80 ? eos80 : [g.Key.Quantity]).Any(id => derived.Find(id) is null))
            .Select(g => new Finding(
                Severity.Warning,
                $"a column of {g.Key.Quantity}, which the conditions of {string.Join(", ", g.Distinct())} test",
                "none in the samples, nor what it could be derived from",
                $"Such a condition never holds: no sample is in the layer, and the process is off. Match a column to {g.Key.Quantity} (--columns), or take the condition out of the model."));
    }

    private static void Count(SolvedBlock solved, long[] statuses, long[] usable)
    {
        foreach (SolveStatus status in solved.Result.Status)
        {
            statuses[(int)status]++;
        }

        for (int k = 0; k < usable.Length; k++)
        {
            usable[k] += solved.UsableCounts[k];
        }
    }

    private static Finding NothingUsable(string id, PreparedModel model) => new(
        Severity.Error,
        $"at least one usable value of {id}, which the model fits",
        string.Create(CultureInfo.InvariantCulture, $"none with an accepted flag (water samples {string.Join(", ", model.Model.AcceptFlags)}; CTD {string.Join(", ", model.Model.AcceptCtdFlags)})"),
        $"Look at the flags and at what {id} is derived from with 'watermix inspect', or take it out of the model's tracers.");
}
