using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;

namespace WaterMix.Web.Api;

/// <summary>Finds or derives the columns of samples that a figure asks for.</summary>
/// <param name="samples">The samples.</param>
/// <param name="accepted">Flags with which a value counts, or null for every value.</param>
internal sealed class SampleColumnSource(SampleTable samples, AcceptedFlags? accepted)
{
    private const string Flags = "_flag";

    /// <summary>A quantity's column, or its flags where the id ends in <c>_flag</c>; null where there is none.</summary>
    public ColumnValues? Find(string id)
    {
        if (Column(id) is { } column)
        {
            return accepted is null ? row => column.Values[row] : row => column.UsableAt(row, accepted);
        }

        return id.EndsWith(Flags, StringComparison.Ordinal) && Column(id[..^Flags.Length]) is { } flagged ? row => flagged.FlagAt(row) : null;
    }

    private SampleColumn? Column(string id) => SampleDerivation.Derive(samples, [id]).Table.Find(id);
}
