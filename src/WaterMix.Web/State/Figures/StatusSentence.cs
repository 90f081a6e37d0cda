using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Figures;

/// <summary>What became of a sample, as a sentence for people.</summary>
public static class StatusSentence
{
    /// <summary>The status with its reason.</summary>
    /// <param name="status">The status; null where there is no run.</param>
    /// <param name="note">The solver's remark on the sample, or null.</param>
    public static string Of(SolveStatus? status, string? note)
    {
        string sentence = status switch
        {
            null => "Not apportioned: there is no run yet.",
            SolveStatus.Solved => "Solved.",
            SolveStatus.BadInput => "Not apportioned: the sample holds an impossible value.",
            SolveStatus.OutsideLayers => "Not apportioned: no layer of the model takes this sample.",
            SolveStatus.TooFewTracers => "Not apportioned: too few tracers have a usable value.",
            SolveStatus.NotUnique => "Not unique: other mixtures fit as well; the fractions shown are one of them.",
            _ => "Not settled: the iteration ended before the fractions stopped changing; the last answer is shown.",
        };
        return string.IsNullOrEmpty(note) ? sentence : $"{sentence} {FigureText.Sentence(note)}{(note.EndsWith('.') ? "" : ".")}";
    }
}
