using WaterMix.Core.Quantities;

namespace WaterMix.Web.State.Figures;

/// <summary>An axis of a figure: what it shows and which way it runs.</summary>
/// <param name="Title">What the values are, such as <c>oxygen</c>.</param>
/// <param name="Unit">Their unit as people write it, such as <c>µmol/kg</c>; empty where there is none.</param>
public sealed record FigureAxis(string Title, string Unit)
{
    /// <summary>True where values grow to the left or downwards, as pressure, depth and density do.</summary>
    public bool Reversed { get; init; }

    /// <summary>The values shown at first; null: what the layers reach, with a margin.</summary>
    public FigureRange? Range { get; init; }

    /// <summary>Title and unit, as they stand beside the axis: <c>Oxygen (µmol/kg)</c>.</summary>
    public string Label => FigureText.Sentence(Unit.Length == 0 ? Title : $"{Title} ({Unit})");

    /// <summary>The axis of a quantity; pressure, depth and densities are reversed.</summary>
    /// <param name="quantity">What the values are.</param>
    public static FigureAxis For(Quantity quantity)
    {
        ArgumentNullException.ThrowIfNull(quantity);
        bool downwards = quantity == Quantity.Pressure || quantity == Quantity.Depth || quantity.Unit == "kg/m3";
        return new FigureAxis(quantity.Name, FigureText.Unit(quantity.Unit)) { Reversed = downwards };
    }
}
