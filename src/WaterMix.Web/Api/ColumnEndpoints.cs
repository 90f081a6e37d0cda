using System.Globalization;
using WaterMix.Core.Samples;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;

namespace WaterMix.Web.Api;

/// <summary>
/// Columns for figures, as binary: little-endian 32-bit floats, column after column in the order asked for, one value per sample, NaN where
/// there is none. The header <c>X-WaterMix-Rows</c> is the number of samples.
/// </summary>
internal static class ColumnEndpoints
{
    private const string Rows = "X-WaterMix-Rows";
    private const int MostColumns = 64;

    /// <summary>Adds the endpoints.</summary>
    public static void MapColumns(this RouteGroupBuilder api)
    {
        const string Binary = "application/octet-stream";
        const string Shape = "Little-endian 32-bit floats, column after column, NaN where there is no value; the header X-WaterMix-Rows is the number of samples.";
        api.MapGet("/samples/{hash}/columns", OfSamplesAsync).WithName("sampleColumns").WithTags("Columns").WithSummary("Measured and derived quantities of a cruise")
            .WithDescription(Shape + " With acceptFlags (water samples) or acceptCtdFlags, values with other flags are missing; without either, every value is given. <id>_flag is a column's flags.")
            .Produces(200, contentType: Binary).ProducesProblem(400).ProducesProblem(404);
        api.MapGet("/runs/{id:guid}/columns", OfRunAsync).WithName("runColumns").WithTags("Columns").WithSummary("Results of a run")
            .WithDescription(Shape + " The ids are those of the result columns, without identity and note; layer and status are numbers: the layer's place in the model from 0 (-1 for none), and 0 bad-input, "
                + "1 outside-layers, 2 too-few-tracers, 3 not-unique, 4 not-converged, 5 solved. Several cruises run on in the study's order; cruise picks one.")
            .Produces(200, contentType: Binary).ProducesProblem(400).ProducesProblem(404).ProducesProblem(409);
    }

    /// <summary>Columns of a cruise's samples.</summary>
    /// <param name="hash">The cruise's <c>samplesHash</c>.</param>
    /// <param name="ids">Quantity ids with commas between; what the samples lack is derived.</param>
    /// <param name="cruises">The samples.</param>
    /// <param name="context">The request.</param>
    /// <param name="acceptFlags">Water-sample flags with commas between.</param>
    /// <param name="acceptCtdFlags">CTD flags with commas between.</param>
    public static async Task<IResult> OfSamplesAsync(
        string hash, string ids, ICruises cruises, HttpContext context, string? acceptFlags = null, string? acceptCtdFlags = null)
    {
        SampleTable samples;
        try
        {
            samples = await cruises.SamplesAsync(hash);
        }
        catch (Exception fault) when (fault is ArgumentException or { InnerException: FileNotFoundException })
        {
            return Problems.NotFound($"There are no samples {hash}. GET /api/studies/{{id}} gives the samplesHash of each cruise.");
        }

        AcceptedFlags? accepted = null;
        if (acceptFlags is not null || acceptCtdFlags is not null)
        {
            int[]? water = acceptFlags is null ? [.. AcceptedFlags.Default.WaterSample] : ReadingQuery.Flags(acceptFlags);
            int[]? ctd = acceptCtdFlags is null ? [.. AcceptedFlags.Default.Ctd] : ReadingQuery.Flags(acceptCtdFlags);
            if (water is null || ctd is null)
            {
                return Problems.BadRequest(ReadingQuery.NotFlags(water is null ? "acceptFlags" : "acceptCtdFlags", (water is null ? acceptFlags : acceptCtdFlags)!).ToString());
            }

            accepted = new AcceptedFlags(water, ctd);
        }

        // The key is made of the content: what it names never changes.
        context.Response.Headers.CacheControl = "private, max-age=31536000, immutable";
        return Answer(context, Split(ids), samples.RowCount, new SampleColumnSource(samples, accepted).Find);
    }

    /// <summary>Columns of a finished run.</summary>
    /// <param name="id">The run.</param>
    /// <param name="ids">Result columns with commas between.</param>
    /// <param name="runs">The runs.</param>
    /// <param name="context">The request.</param>
    /// <param name="cruise">One cruise of the run; all unless given.</param>
    public static async Task<IResult> OfRunAsync(Guid id, string ids, IRuns runs, HttpContext context, Guid? cruise = null)
    {
        if (await runs.FindAsync(id) is not { } run)
        {
            return RunEndpoints.Missing(id);
        }

        if (run.State != RunState.Finished)
        {
            return RunEndpoints.NotFinished(run);
        }

        CruiseResult[] results = [.. (await runs.ResultsAsync(id)).Where(r => cruise is null || r.Cruise == cruise)];
        return results.Length == 0
            ? Problems.NotFound($"The run has no cruise {cruise}.")
            : Answer(context, Split(ids), results.Sum(r => r.Result.RowCount), column => ResultColumns.Find(results, column));
    }

    private static string[] Split(string ids) => ids.Split(',', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries);

    private static IResult Answer(HttpContext context, string[] ids, int rows, Func<string, ColumnValues?> find)
    {
        if (ids.Length is 0 or > MostColumns)
        {
            context.Response.Headers.CacheControl = "no-store";
            return Problems.BadRequest($"Expected 1 to {MostColumns} column ids in ids, with commas between; found {ids.Length}.");
        }

        var columns = new List<ColumnValues>(ids.Length);
        foreach (string id in ids)
        {
            if (find(id) is not { } column)
            {
                context.Response.Headers.CacheControl = "no-store";
                return Problems.BadRequest($"There is no column '{id}' here, and it cannot be derived. Correct ids.");
            }

            columns.Add(column);
        }

        context.Response.Headers[Rows] = rows.ToString(CultureInfo.InvariantCulture);
        return TypedResults.Stream(output => FloatColumns.WriteAsync(output, columns, rows, context.RequestAborted), "application/octet-stream");
    }
}
