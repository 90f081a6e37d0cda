using System.IO.Compression;
using System.Text;

namespace WaterMix.Cli.Tests;

/// <summary>Which file a row came from, whatever way the file was given.</summary>
public sealed class InputNameTests : IDisposable
{
    private readonly Scratch _scratch = new();
    private readonly string _model;

    public InputNameTests() => _model = _scratch.Write("m.mixmodel.json", SmallModel.Json);

    public void Dispose() => _scratch.Dispose();

    [Fact]
    public void Solve_ZipOfOneEntry_NamesItWithItsPath()
    {
        CommandRun run = CommandRun.Of("solve", Zip("z.zip", "sub/B.csv"), "--model", _model);
        ResultTable table = ResultTable.Parse(run.Output);

        Assert.Equal(0, run.ExitCode);
        Assert.Equal(["file", "file_row", "row", "station"], table.Names.Take(4));
        Assert.Equal(("z.zip/sub/B.csv", 1.0, "solved"), (table.Text(0, "file"), table.Number(0, "file_row"), table.Text(0, "status")));
    }

    [Fact]
    public void Solve_ZipOfTwoEntriesOfOneName_TellsThemApart()
    {
        CommandRun run = CommandRun.Of("solve", Zip("z.zip", "b/cast.csv", "a/cast.csv"), "--model", _model);
        ResultTable table = ResultTable.Parse(run.Output);

        Assert.Equal(0, run.ExitCode);
        Assert.Equal(["z.zip/a/cast.csv", "z.zip/b/cast.csv"], [table.Text(0, "file"), table.Text(1, "file")]);
        Assert.Equal([1.0, 1.0], [table.Number(0, "file_row"), table.Number(1, "file_row")]);
        Assert.Equal([1.0, 2.0], [table.Number(0, "row"), table.Number(1, "row")]);
    }

    [Fact]
    public void Solve_FilesOfOneNameInTwoFolders_NamesThemAsGiven()
    {
        Directory.CreateDirectory(_scratch.Path("x"));
        Directory.CreateDirectory(_scratch.Path("y"));
        foreach (string name in (string[])["x/s.csv", "y/s.csv", "z.csv"])
        {
            _scratch.Write(name, SmallModel.Samples);
        }

        CommandRun run = CommandRun.In(_scratch.Path(""), "solve", "y/s.csv", "./x/s.csv", "x/../z.csv", "--model", _model);
        ResultTable table = ResultTable.Parse(run.Output);

        Assert.Equal(0, run.ExitCode);
        Assert.Equal(["./x/s.csv", "y/s.csv", "z.csv"], [table.Text(0, "file"), table.Text(1, "file"), table.Text(2, "file")]);
    }

    [Fact]
    public void Solve_OneFileGivenTwice_WarnsThatItsRowsCountTwice()
    {
        string samples = _scratch.Write("s.csv", SmallModel.Samples);
        string link = _scratch.Path("link.csv");
        File.CreateSymbolicLink(link, samples);

        CommandRun twice = CommandRun.Of("solve", samples, samples, "--model", _model);
        CommandRun linked = CommandRun.Of("solve", samples, link, "--model", _model);

        foreach (CommandRun run in (CommandRun[])[twice, linked])
        {
            Assert.Equal(0, run.ExitCode);
            Assert.Equal(2, ResultTable.Parse(run.Output).RowCount);
            Assert.Contains("Its rows are counted twice", run.Error, StringComparison.Ordinal);
        }
    }

    // Regression: the header was read from the pipe's beginning and the rows from wherever that had ended.
    [Theory]
    [InlineData(3)]
    [InlineData(5_000)]
    public void Solve_Pipe_GivesWhatTheFileGives(int rows)
    {
        Assert.SkipUnless(File.Exists("/dev/stdin"), "There is no /dev/stdin here.");
        string text = SmallModel.Header + "\n" + string.Concat(Enumerable.Range(0, rows).Select(i => $"{i}{SmallModel.Row[1..]}\n"));
        string samples = _scratch.Write("s.csv", text);

        CommandRun file = CommandRun.Of("solve", samples, "--model", _model);
        CommandRun pipe = CommandRun.WithInput(Encoding.UTF8.GetBytes(text), "solve", "/dev/stdin", "--model", _model);

        Assert.True(pipe.ExitCode == 0, pipe.Error);
        Assert.Equal(rows, ResultTable.Parse(pipe.Output).RowCount);
        Assert.Equal(file.Output, pipe.Output);
    }

    [Fact]
    public void Solve_PipeAmongFiles_IsNamedAsGiven()
    {
        Assert.SkipUnless(File.Exists("/dev/stdin"), "There is no /dev/stdin here.");
        string samples = _scratch.Write("a.csv", SmallModel.Samples);

        CommandRun run = CommandRun.WithInput(File.ReadAllBytes(Zip("z.zip", "sub/B.csv")), "solve", samples, "/dev/stdin", "--model", _model);
        ResultTable table = ResultTable.Parse(run.Output);

        Assert.True(run.ExitCode == 0, run.Error);
        Assert.Equal(["a.csv", "/dev/stdin/sub/B.csv"], [table.Text(0, "file"), table.Text(1, "file")]);
    }

    private string Zip(string name, params string[] entries)
    {
        using ZipArchive archive = ZipFile.Open(_scratch.Path(name), ZipArchiveMode.Create);
        foreach (string entry in entries)
        {
            using Stream stream = archive.CreateEntry(entry).Open();
            stream.Write(Encoding.UTF8.GetBytes(SmallModel.Samples));
        }

        return _scratch.Path(name);
    }
}
