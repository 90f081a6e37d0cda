using System.Globalization;
using WaterMix.Core.Mixing;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Runs;

/// <summary>The results of runs: chunks while a run is at work, one file for each cruise when it has ended.</summary>
internal sealed class RunStore(DataFolder folder, ByteCache cache)
{
    /// <summary>The file of a chunk's result.</summary>
    public string ChunkPath(Guid run, int number) =>
        Path.Combine(ChunkFolder(run), number.ToString("D6", CultureInfo.InvariantCulture) + ".parquet");

    /// <summary>The file of a cruise's result.</summary>
    public string ResultPath(Guid run, int cruise) =>
        Path.Combine(FolderOf(run), "cruise-" + cruise.ToString("D3", CultureInfo.InvariantCulture) + ".parquet");

    /// <summary>The folder of a run.</summary>
    public string FolderOf(Guid run) => Path.Combine(folder.Runs, run.ToString("N"));

    /// <summary>The result of a cruise in a run that has ended, from the cache.</summary>
    /// <param name="run">The run's folder.</param>
    /// <param name="cruise">The cruise as the run took it.</param>
    /// <param name="model">The run's model.</param>
    public Task<MixingResult> FindAsync(Guid run, RunCruiseRow cruise, MixingModel model) => cache.GetAsync(
        string.Create(CultureInfo.InvariantCulture, $"result {run:N} {cruise.Position}"),
        async () =>
        {
            PreparedModel prepared = PreparedModel.From(CruiseModel.For(model, StoredJson.Errors(cruise.MeasurementSd)));
            var result = new MixingResult(prepared, (int)cruise.SampleCount, withProof: false);
            await ResultFile.ReadAsync(ResultPath(run, cruise.Position), result, 0);
            return result;
        },
        ResultFile.Bytes);

    /// <summary>Removes the chunks of a run that has ended.</summary>
    public void ClearChunks(Guid run)
    {
        if (Directory.Exists(ChunkFolder(run)))
        {
            Directory.Delete(ChunkFolder(run), recursive: true);
        }
    }

    private string ChunkFolder(Guid run) => Path.Combine(FolderOf(run), "chunks");
}
