using System.Text;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.Json;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Tests.EndMemberSets;
using WaterMix.Formats.Tests.MixingModels;

namespace WaterMix.Formats.Tests.Json;

public class ContentHashTests
{
    // Agreement with Python 3.11's json and hashlib on the contract's example, whose numbers both languages spell alike:
    // hashlib.sha256(json.dumps(document, sort_keys=True, separators=(",", ":"), ensure_ascii=False).encode()).hexdigest()
    [Fact]
    public void OfSet_ContractExample_AgreesWithPython() =>
        Assert.Equal("9dad36d1815b0ced43fcdedd2d5051da7167a146380a7b979aa056dac686c9fe", ContentHash.OfSet(Set(HalcyonSet.Json)));

    // Agreement with Python 3.11's struct and hashlib, over the bytes that SampleHash documents:
    // h = lambda b: hashlib.sha256(b).digest(); V = h of struct.pack("<d", v), or struct.pack("<Q", 0x7FF8000000000000) for NaN; F = h(bytes(flags));
    // column = h(id + b"\0" + unit + b"\0" + V + F); the hash is that of both columns one after the other.
    [Fact]
    public void OfSamples_TwoColumns_AgreesWithPython() =>
        Assert.Equal("38a5c7cd471b5cc66036563cd0cfccc9c19c646b1bf29f278620560e35e965d5", ContentHash.OfSamples(Samples([200.5, double.NaN, -0.1], [2, 9, 6], [35, 34.9, 34.8])));

    [Fact]
    public void OfSet_LayoutAndKeyOrder_DoNotMatter()
    {
        EndMemberSet set = Set(HalcyonSet.Json);

        Assert.Equal(ContentHash.OfSet(set), ContentHash.OfSet(EndMemberSetFile.Read(EndMemberSetFile.Write(set), "").Value!));
        Assert.NotEqual(ContentHash.OfSet(set), ContentHash.OfSet(Set(HalcyonSet.Json.Replace("1.08", "1.0800000000000003", StringComparison.Ordinal))));
        Assert.NotEqual(ContentHash.OfSet(set), ContentHash.OfSet(set with { Version = 4 }));
    }

    [Fact]
    public void OfModel_SetInlineOrInAFile_IsTheSame()
    {
        MixingModel model = MixingModelFile.Read(Encoding.UTF8.GetBytes(HalcyonModel.Json), "", HalcyonModel.OpenSet).Value!;

        Assert.Equal(ContentHash.OfModel(model), ContentHash.OfModel(model with { EndMembersFile = null }));
        Assert.NotEqual(ContentHash.OfModel(model), ContentHash.OfModel(model with { EndMembers = model.EndMembers with { Version = 9 } }));
        Assert.NotEqual(ContentHash.OfModel(model), ContentHash.OfModel(model with { Prefer = ValueOrigin.Ctd }));
        Assert.Matches("^[0-9a-f]{64}$", ContentHash.OfModel(model));
    }

    [Fact]
    public void OfSamples_AnyNaNAndFlagsAbsentOrZero_AreTheSame()
    {
        double otherNaN = BitConverter.UInt64BitsToDouble(0xFFF8000000000001);
        string hash = ContentHash.OfSamples(Samples([1, double.NaN, 3], [0, 0, 0], [4, 5, 6]));

        Assert.Equal(hash, ContentHash.OfSamples(Samples([1, otherNaN, 3], null, [4, 5, 6])));
        Assert.NotEqual(hash, ContentHash.OfSamples(Samples([1, double.NaN, 3], [0, 2, 0], [4, 5, 6])));
        Assert.NotEqual(hash, ContentHash.OfSamples(Samples([1, double.NaN, 3.0000000000000004], null, [4, 5, 6])));
    }

    [Fact]
    public void Add_RowsInBlocks_HashAsOneTable()
    {
        double[] values = [.. Enumerable.Range(0, 3000).Select(i => i % 7 == 0 ? double.NaN : i / 3.0)];
        byte[] flags = [.. Enumerable.Range(0, 3000).Select(i => (byte)(i % 10))];
        string whole = ContentHash.OfSamples(Samples(values, flags, values));

        using var hash = new SampleHash();
        foreach ((int start, int end) in new[] { (0, 1), (1, 1), (1, 1025), (1025, 3000) })
        {
            hash.Add(Samples(values[start..end], flags[start..end], values[start..end]));
        }

        Assert.Equal(whole, hash.Finish());
        Assert.Throws<ArgumentException>(() => hash.Add(new SampleTable(0, [], [new SampleColumn(Quantity.Oxygen, [])])));
    }

    private static EndMemberSet Set(string json) => EndMemberSetFile.Read(Encoding.UTF8.GetBytes(json), "").Value!;

    private static SampleTable Samples(double[] oxygen, byte[]? flags, double[] salinity) => new(
        oxygen.Length,
        [],
        [new SampleColumn(Quantity.Oxygen, oxygen, flags), new SampleColumn(Quantity.PracticalSalinity, salinity)]);
}
