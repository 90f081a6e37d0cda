using WaterMix.Core.Samples;

namespace WaterMix.Formats.Reading;

/// <summary>Some consecutive samples of one file. All blocks of an opening have the same columns.</summary>
/// <param name="Table">The samples, at most <see cref="MostRows"/>.</param>
/// <param name="File">The file's name, as in <see cref="InputFile.Name"/>.</param>
/// <param name="FirstRow">The number of the first sample, 1-based, counting through all files.</param>
/// <param name="FirstFileRow">The number of the first sample within its file, 1-based.</param>
public sealed record SampleBlock(SampleTable Table, string File, long FirstRow, long FirstFileRow)
{
    /// <summary>The most samples in a block.</summary>
    public const int MostRows = 65_536;
}
