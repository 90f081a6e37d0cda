using System.Text;
using Microsoft.AspNetCore.Http.HttpResults;
using WaterMix.Formats.Csv;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Demo;

namespace WaterMix.Web.Api;

/// <summary><c>GET /api/examples/{format}</c>: a small file of each sample format, cut from the invented cruise.</summary>
internal static class ExampleEndpoints
{
    private const string Bottle = "halcyon_hy1.csv";
    private const string Cast = "casts/halcyon_00012_00001_ct1.csv";
    private const int RowsOfBottle = 48;
    private const int RowsOfCast = 60;

    /// <summary>Adds the endpoint.</summary>
    public static void MapExamples(this RouteGroupBuilder api) => api.MapGet("/examples/{format}", Example)
        .WithName("example")
        .WithTags("Examples")
        .WithSummary("A small example of a sample format")
        .WithDescription("exchange-bottle (WHP-Exchange bottle file), exchange-ctd (WHP-Exchange CTD cast) or csv (the tidy table). The ocean is invented.")
        .Produces(200, contentType: "text/csv")
        .ProducesProblem(404);

    /// <summary>An example file.</summary>
    /// <param name="format">Its format.</param>
    public static Results<FileContentHttpResult, ProblemHttpResult> Example(string format) => format switch
    {
        "exchange-bottle" => Csv(Start(Bottle, RowsOfBottle), "example_hy1.csv"),
        "exchange-ctd" => Csv(Start(Cast, RowsOfCast), "example_ct1.csv"),
        "csv" => Csv(Tidy(), "example.csv"),
        _ => Problems.NotFound($"There is no example of '{format}'. There are exchange-bottle, exchange-ctd and csv."),
    };

    private static FileContentHttpResult Csv(byte[] bytes, string name) => TypedResults.File(bytes, "text/csv; charset=utf-8", name);

    /// <summary>The beginning of an Exchange file: everything up to the units, this many rows, and the line that ends the data.</summary>
    private static byte[] Start(string file, int rows)
    {
        using var reader = new StreamReader(InventedOcean.Open(file));
        var text = new StringBuilder();
        int left = int.MaxValue;
        while (left > 0 && reader.ReadLine() is { } line)
        {
            text.Append(line).Append('\n');

            // The line of units is the first without a name before its first comma, or the CTD file's line with DBAR.
            left = left < int.MaxValue ? left - 1 : line.StartsWith(',') || line.Contains("DBAR", StringComparison.Ordinal) ? rows : left;
        }

        return Encoding.UTF8.GetBytes(text.Append("END_DATA\n").ToString());
    }

    private static byte[] Tidy()
    {
        byte[] bottle = Start(Bottle, RowsOfBottle);
        using OpenedSamples samples = SampleReader.Open([new InputFile("example_hy1.csv", () => new MemoryStream(bottle))], new ReadingOptions());
        using var output = new MemoryStream();
        using (var csv = new TidyCsvWriter(output))
        {
            foreach (SampleBlock block in samples.ReadBlocks())
            {
                csv.Write(block.Table);
            }
        }

        return output.ToArray();
    }
}
