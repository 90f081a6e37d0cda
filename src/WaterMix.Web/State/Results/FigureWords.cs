using WaterMix.Core.Mixing;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>Names, titles and captions of the figures.</summary>
public static class FigureWords
{
    /// <summary>The figures of a model, in order; processes only where it has some.</summary>
    /// <param name="model">The model.</param>
    public static IReadOnlyList<(ResultsFigure Figure, string Name)> Choices(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return [.. Enum.GetValues<ResultsFigure>().Where(f => f != ResultsFigure.Processes || model.Processes.Count > 0).Select(f => (f, NameOf(f)))];
    }

    /// <summary>The figure's title.</summary>
    /// <param name="shown">What is shown.</param>
    public static string Title(ResultsShown shown)
    {
        ArgumentNullException.ThrowIfNull(shown);
        return shown.View.Figure switch
        {
            ResultsFigure.Fractions => "Fraction of each source along the section",
            ResultsFigure.Processes => "Amount of each process along the section",
            ResultsFigure.Residuals => "Residual of each tracer along the section",
            ResultsFigure.Fit => "How well the samples are fitted along the section",
            ResultsFigure.Profiles => $"Profiles at {shown.Profile?.Station.Label}",
            _ => $"{FigureText.Sentence(shown.Property?.Y.Title ?? "")} against {shown.Property?.X.Title}",
        };
    }

    /// <summary>One sentence under the figure, with the version of the set.</summary>
    /// <param name="shown">What is shown.</param>
    public static string Caption(ResultsShown shown)
    {
        ArgumentNullException.ThrowIfNull(shown);
        string set = $"{shown.Results.Model.EndMembers.Name}, version {PlainText.Count(shown.Results.Model.EndMembers.Version)}";
        return shown.View.Figure switch
        {
            ResultsFigure.Fractions => $"One dot per sample, nothing between them; hollow where there is no fraction. Sources: {set}.",
            ResultsFigure.Processes => $"One dot per sample; hollow where the process is off or there is no answer. Sources: {set}.",
            ResultsFigure.Residuals => $"Observed minus fitted, one dot per sample; hollow where the tracer was not used. Sources: {set}.",
            ResultsFigure.Fit => $"Misfit is the square root of what was minimised. Sources: {set}.",
            ResultsFigure.Profiles => $"Observed values, and fitted ones where the sample has an answer. Sources: {set}.",
            _ => $"Sources: {set}.",
        };
    }

    /// <summary>Why a figure has nothing to show.</summary>
    /// <param name="figure">The figure.</param>
    public static string Nothing(ResultsFigure figure) => figure switch
    {
        ResultsFigure.Processes => "The model has no process, so there are no amounts.",
        ResultsFigure.Profiles => "No sample names its station or has a position, so there is no profile.",
        _ => "The model has nothing to show here.",
    };

    private static string NameOf(ResultsFigure figure) => figure switch
    {
        ResultsFigure.Profiles => "Profiles at a station",
        ResultsFigure.Properties => "Properties",
        _ => figure.ToString(),
    };
}
