using System.Globalization;
using Microsoft.AspNetCore.Components;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.Components.Figures;

/// <summary>One sample's full apportionment.</summary>
public sealed partial class SampleCard
{
    /// <summary>What the card says; from <see cref="SampleCardText.Of"/>.</summary>
    [Parameter, EditorRequired]
    public SampleCardText Text { get; set; } = null!;

    /// <summary>The card was closed; without a handler it has no close button.</summary>
    [Parameter]
    public EventCallback OnClose { get; set; }

    private IReadOnlyList<CardBar> _bars = [];

    /// <inheritdoc/>
    protected override void OnParametersSet() => _bars = [.. Text.Shares.Select(CardBar.Of)];

    private sealed record CardBar(CardShare Share, string Width, string Light, string Dark)
    {
        public static CardBar Of(CardShare share)
        {
            (string light, string dark) = FigureColour.InThemes(share.Colour);
            return new CardBar(share, (100 * share.Fraction).ToString("0.##", CultureInfo.InvariantCulture), light, dark);
        }
    }
}
