using WaterMix.Core.Samples;

namespace WaterMix.Core.Seawater;

/// <summary>One way to a derived quantity: the columns that it reads and the value it gives for a row, NaN where it cannot.</summary>
/// <param name="How">What the value comes from, for the column's <see cref="SampleColumn.Source"/>.</param>
/// <param name="Inputs">The columns read; the derived value carries the worst of their flags.</param>
/// <param name="Value">The value for a row.</param>
/// <param name="Note">What to say where the path was used, or null where it goes without saying; its count is set then.</param>
internal sealed record DerivationPath(string How, SampleColumn[] Inputs, Func<int, double> Value, Finding? Note = null)
{
    /// <summary>A path that computes, or null where a column that it needs is absent.</summary>
    public static DerivationPath? Over(string how, SampleColumn?[] inputs, Func<SampleColumn[], Func<int, double>> value, Finding? note = null)
    {
        if (Array.IndexOf(inputs, null) >= 0)
        {
            return null;
        }

        SampleColumn[] present = inputs!;
        return new DerivationPath($"{how} from {string.Join(", ", present.Select(c => c.Id))}", present, value(present), note);
    }

    /// <summary>The file's own values, or null where it has none.</summary>
    public static DerivationPath? Own(SampleColumn? own, Finding? note = null)
    {
        if (own is null)
        {
            return null;
        }

        string name = own.Source.Length > 0 ? own.Source : own.Id;
        return new DerivationPath(own.Conversion.Length > 0 ? $"{name} ({own.Conversion})" : name, [own], row => own.Values[row], note);
    }

    /// <summary>The flag that the row's value carries: the worst of the inputs', with its origin; at a tie the water sample's, whose table is the stricter.</summary>
    public (byte Flag, ValueOrigin Origin) WorstFlag(int row)
    {
        byte flag = Inputs[0].FlagAt(row);
        ValueOrigin origin = Inputs[0].OriginAt(row);
        int rank = QualityFlags.Rank(flag);
        for (int i = 1; i < Inputs.Length; i++)
        {
            byte other = Inputs[i].FlagAt(row);
            int otherRank = QualityFlags.Rank(other);
            ValueOrigin otherOrigin = Inputs[i].OriginAt(row);
            if (otherRank > rank || (otherRank == rank && origin == ValueOrigin.Ctd && otherOrigin == ValueOrigin.Bottle))
            {
                flag = other;
                origin = otherOrigin;
                rank = otherRank;
            }
        }

        return (flag, origin);
    }
}
