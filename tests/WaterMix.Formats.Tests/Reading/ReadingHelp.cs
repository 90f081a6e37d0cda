using System.Text;
using WaterMix.Core;
using WaterMix.Core.Samples;
using WaterMix.Formats.Csv;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

/// <summary>Reads text as if it were files, whole, and compares tables bit for bit.</summary>
internal static class ReadingHelp
{
    public static InputFile File(string name, string text) => File(name, Encoding.UTF8.GetBytes(text));

    public static InputFile File(string name, byte[] bytes) => new(name, () => new MemoryStream(bytes));

    public static (List<SampleBlock> Blocks, ImportReport Report, OpenedSamples Opened) ReadAll(OpenedSamples opened)
    {
        List<SampleBlock> blocks = [.. opened.ReadBlocks(TestContext.Current.CancellationToken)];
        return (blocks, opened.Report, opened);
    }

    /// <summary>The one block of one text without errors.</summary>
    public static SampleTable Table(string text, ReadingOptions? options = null)
    {
        OpenedSamples opened = SampleReader.Open([File("a.csv", text)], options ?? new ReadingOptions());
        List<SampleBlock> blocks = [.. opened.ReadBlocks(TestContext.Current.CancellationToken)];
        Assert.False(opened.HasErrors, string.Join("\n", opened.Findings));
        return Assert.Single(blocks).Table;
    }

    /// <summary>All findings of one text.</summary>
    public static IReadOnlyList<Finding> Findings(string text, ReadingOptions? options = null) => Findings(Encoding.UTF8.GetBytes(text), options);

    public static IReadOnlyList<Finding> Findings(byte[] bytes, ReadingOptions? options = null)
    {
        OpenedSamples opened = SampleReader.Open([File("a.csv", bytes)], options ?? new ReadingOptions());
        foreach (SampleBlock block in opened.ReadBlocks(TestContext.Current.CancellationToken))
        {
            Assert.NotNull(block);
        }

        return opened.Findings;
    }

    /// <summary>The one error among the findings.</summary>
    public static Finding Error(IReadOnlyList<Finding> findings) => Assert.Single(findings, f => f.Severity == Severity.Error);

    public static byte[] Write(params IEnumerable<SampleTable> tables)
    {
        using var stream = new MemoryStream();
        using (var writer = new TidyCsvWriter(stream))
        {
            foreach (SampleTable table in tables)
            {
                writer.Write(table);
            }
        }

        return stream.ToArray();
    }

    public static void AssertSame(SampleTable expected, SampleTable actual)
    {
        Assert.Equal(expected.RowCount, actual.RowCount);
        Assert.Equal(expected.Identity.Select(i => i.Id), actual.Identity.Select(i => i.Id));
        foreach ((IdentityColumn e, IdentityColumn a) in expected.Identity.Zip(actual.Identity))
        {
            for (int i = 0; i < e.Length; i++)
            {
                Assert.Equal(e[i], a[i]);
            }
        }

        Assert.Equal(expected.HasBottleFlags, actual.HasBottleFlags);
        Assert.True(expected.BottleFlags.SequenceEqual(actual.BottleFlags));
        Assert.Equal(expected.Columns.Select(c => (c.Id, c.Quantity, c.HasFlags, c.IsMerged)), actual.Columns.Select(c => (c.Id, c.Quantity, c.HasFlags, c.IsMerged)));
        foreach ((SampleColumn e, SampleColumn a) in expected.Columns.Zip(actual.Columns))
        {
            for (int i = 0; i < e.Length; i++)
            {
                Assert.True(
                    BitConverter.DoubleToInt64Bits(e.Values[i]) == BitConverter.DoubleToInt64Bits(a.Values[i]) && e.FlagAt(i) == a.FlagAt(i) && e.OriginAt(i) == a.OriginAt(i),
                    $"{e.Id}, row {i}: {e.Values[i]:R}, flag {e.FlagAt(i)}, {e.OriginAt(i)} became {a.Values[i]:R}, flag {a.FlagAt(i)}, {a.OriginAt(i)}");
            }
        }
    }
}
