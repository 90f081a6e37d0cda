using CsCheck;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Json;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Workspace.Tests.Cruises;

/// <summary>Property: what is written to a column file comes back bit for bit.</summary>
public class SampleFileTests
{
    private static readonly Gen<double> Values = Gen.OneOf(
        Gen.Double,
        Gen.Const(double.NaN),
        Gen.Const(BitConverter.UInt64BitsToDouble(0x7FF800000000BEEF)),
        Gen.Const(-0.0),
        Gen.Const(double.PositiveInfinity),
        Gen.Const(double.Epsilon));

    private static readonly Gen<SampleTable> Tables =
        from rows in Gen.OneOf(Gen.Int[1, 300], Gen.Const(65_535), Gen.Const(65_536), Gen.Const(70_000))
        from kinds in Gen.Int[0, 7].Array[1, 4]
        from values in Values.Array[97]
        from names in Gen.String[0, 5].Array[7]
        from hasBottleFlags in Gen.Bool
        select Table(rows, kinds, values, names, hasBottleFlags);

    [Fact]
    public async Task WriteThenRead_AnyTable_ReturnsTheSameBits()
    {
        using var scratch = new Scratch();
        await Tables.SampleAsync(
            async table =>
            {
                string path = scratch.Path(Guid.NewGuid().ToString("N"));
                KeptSamples read = await RoundTripAsync(path, [new SampleBlock(table, "a.csv", 1, 1)], table);
                AssertSame(table, read.Table);
                File.Delete(path);
            },
            iter: 40,
            threads: 1);
    }

    [Fact]
    public async Task Write_InSeveralBlocks_GivesTheSameBytesAndHashAsInOne()
    {
        using var scratch = new Scratch();
        SampleTable table = Table(70_000, [7, 0, 3], [1, double.NaN, 3.5], ["a", "", "b"], true);
        SampleBlock[] several =
        [
            new(SampleRows.Slice(table, 0, 10), "a.csv", 1, 1),
            new(SampleRows.Slice(table, 10, 65_000), "a.csv", 11, 11),
            new(SampleRows.Slice(table, 65_010, 4_990), "a.csv", 65_011, 65_011),
        ];

        KeptSamples one = await RoundTripAsync(scratch.Path("one"), [new SampleBlock(table, "a.csv", 1, 1)], table);
        KeptSamples cut = await RoundTripAsync(scratch.Path("cut"), several, table);

        Assert.Equal(await File.ReadAllBytesAsync(scratch.Path("one"), TestContext.Current.CancellationToken), await File.ReadAllBytesAsync(scratch.Path("cut"), TestContext.Current.CancellationToken));
        Assert.Equal(ContentHash.OfSamples(table), ContentHash.OfSamples(cut.Table));
        Assert.Equal([new FileRows("a.csv", 0, 1, 70_000)], cut.Files);
        Assert.Equal(one.Files, cut.Files);
    }

    [Fact]
    public async Task Read_ADamagedFile_SaysWhatToDo()
    {
        using var scratch = new Scratch();
        await File.WriteAllTextAsync(scratch.Path("a.parquet"), "PAR1 and nothing more", TestContext.Current.CancellationToken);

        InvalidDataException fault = await Assert.ThrowsAsync<InvalidDataException>(() => SampleFileReader.ReadAsync(scratch.Path("a.parquet")));

        Assert.Contains("Put the data folder's file a.parquet back", fault.Message, StringComparison.Ordinal);
        await Assert.ThrowsAsync<InvalidDataException>(() => SampleFileReader.ReadAsync(scratch.Path("absent")));
    }

    private static async Task<KeptSamples> RoundTripAsync(string path, SampleBlock[] blocks, SampleTable schema)
    {
        await using (FileStream stream = File.Create(path))
        {
            await using SampleFileWriter writer = await SampleFileWriter.CreateAsync(stream, schema);
            foreach (SampleBlock block in blocks)
            {
                await writer.AddAsync(block);
            }

            Assert.Equal(ContentHash.OfSamples(schema), await writer.FinishAsync(false));
        }

        return await SampleFileReader.ReadAsync(path);
    }

    // A column's kind: bit 0 flags, bit 1 origins, bit 2 a further tracer.
    private static SampleTable Table(int rows, int[] kinds, double[] values, string[] names, bool hasBottleFlags)
    {
        Quantity[] known = [Quantity.Oxygen, Quantity.Nitrate, Quantity.PracticalSalinity, Quantity.Latitude];
        var columns = kinds.Select((kind, c) => new SampleColumn(
            (kind & 4) != 0 ? Quantity.Further($"tracer:{c} / ü", "nmol/kg") : known[c],
            [.. Enumerable.Range(0, rows).Select(i => values[(i + c) % values.Length])],
            (kind & 1) != 0 ? [.. Enumerable.Range(0, rows).Select(i => (byte)((i + c) % 10))] : null,
            (kind & 2) != 0 ? [.. Enumerable.Range(0, rows).Select(i => (ValueOrigin)((i + c) % 3))] : null,
            c % 2 == 0 ? ValueOrigin.Bottle : ValueOrigin.Ctd)
        {
            Suffix = c == 2 ? "_ctd" : "",
            Source = $"COLUMN {c}",
            Conversion = c == 1 ? "x 1.00024" : "",
        }).ToArray();
        string[] distinct = [.. names.Where(n => n.Length > 0).Distinct()];
        int[] codes = [.. Enumerable.Range(0, rows).Select(i => Array.IndexOf(distinct, names[i / 3 % names.Length]))];
        byte[]? bottleFlags = hasBottleFlags ? [.. Enumerable.Range(0, rows).Select(i => (byte)(i % 10))] : null;
        return new SampleTable(rows, [new IdentityColumn("station", codes, distinct), new IdentityColumn("time", [.. Enumerable.Repeat(-1, rows)], [])], columns, bottleFlags);
    }

    private static void AssertSame(SampleTable expected, SampleTable actual)
    {
        Assert.Equal(expected.RowCount, actual.RowCount);
        Assert.Equal(expected.BottleFlags, actual.BottleFlags);
        Assert.Equal(expected.HasBottleFlags, actual.HasBottleFlags);
        foreach ((IdentityColumn a, IdentityColumn b) in expected.Identity.Zip(actual.Identity))
        {
            Assert.Equal(a.Id, b.Id);
            Assert.Equal(Enumerable.Range(0, a.Length).Select(i => a[i]), Enumerable.Range(0, b.Length).Select(i => b[i]));
        }

        foreach ((SampleColumn a, SampleColumn b) in expected.Columns.Zip(actual.Columns, (a, b) => (a, b)))
        {
            Assert.Equal((a.Quantity, a.Suffix, a.Source, a.Conversion, a.Origin, a.HasFlags, a.IsMerged), (b.Quantity, b.Suffix, b.Source, b.Conversion, b.Origin, b.HasFlags, b.IsMerged));
            Assert.True(Bits(a).AsSpan().SequenceEqual(Bits(b)), a.Id);
            Assert.True(a.Flags.SequenceEqual(b.Flags), a.Id);
            Assert.Equal(Enumerable.Range(0, a.Length).Select(a.OriginAt), Enumerable.Range(0, b.Length).Select(b.OriginAt));
        }
    }

    private static ulong[] Bits(SampleColumn column) => [.. column.Values.ToArray().Select(BitConverter.DoubleToUInt64Bits)];
}
