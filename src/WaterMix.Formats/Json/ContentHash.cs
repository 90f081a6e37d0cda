using System.Security.Cryptography;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.MixingModels;

namespace WaterMix.Formats.Json;

/// <summary>SHA-256 of what something says, in 64 lower-case hexadecimal digits; never of a file's bytes, so layout and format do not matter.</summary>
public static class ContentHash
{
    /// <summary>The hash of a set: SHA-256 over its canonical JSON (<c>Rfc8785</c>), the document that <see cref="EndMemberSetFile.Write"/> lays out.</summary>
    /// <param name="set">The set.</param>
    /// <exception cref="ArgumentException">A number is not finite.</exception>
    public static string OfSet(EndMemberSet set)
    {
        ArgumentNullException.ThrowIfNull(set);
        return Hex(SHA256.HashData(CanonicalJson.Write(EndMemberSetWriter.ToJson(set))));
    }

    /// <summary>
    /// The hash of a model: SHA-256 over its canonical JSON (<c>Rfc8785</c>), the document that <see cref="MixingModelFile.Write"/> lays
    /// out, with the set inline even where the model names a file, and without what equals its default. So a model has one hash whether
    /// its set stands inline or in a file, and another one as soon as the set in the file changes.
    /// </summary>
    /// <param name="model">The model.</param>
    /// <exception cref="ArgumentException">A number is not finite.</exception>
    public static string OfModel(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return Hex(SHA256.HashData(CanonicalJson.Write(MixingModelWriter.ToJson(model, endMembersFile: null))));
    }

    /// <summary>The hash of samples; see <see cref="SampleHash"/> for what it is taken over.</summary>
    /// <param name="samples">All samples in one table.</param>
    public static string OfSamples(SampleTable samples)
    {
        using var hash = new SampleHash();
        hash.Add(samples);
        return hash.Finish();
    }

    internal static string Hex(ReadOnlySpan<byte> hash) => Convert.ToHexStringLower(hash);
}
