using WaterMix.Core.Quantities;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Mixing;

/// <summary>Which numbers a field takes.</summary>
/// <param name="What">What the number is, such as <c>oxygen</c>.</param>
/// <param name="Lowest">The lowest possible number.</param>
/// <param name="Highest">The highest possible number.</param>
public sealed record NumberRule(string What, double Lowest = double.MinValue, double Highest = double.MaxValue)
{
    /// <summary>The unit as people write it; empty where there is none.</summary>
    public string Unit { get; init; } = "";

    /// <summary>True where the field may be left empty.</summary>
    public bool MayBeEmpty { get; init; }

    /// <summary>True where <see cref="Lowest"/> itself is not possible.</summary>
    public bool LowestExcluded { get; init; }

    /// <summary>True where only whole numbers are possible.</summary>
    public bool IsWhole { get; init; }

    /// <summary>What is possible, in words: <c>oxygen, −10 to 1000 µmol/kg</c>.</summary>
    public string Range
    {
        get
        {
            string bounds = (Lowest > double.MinValue, Highest < double.MaxValue) switch
            {
                (true, true) => $", {Text(Lowest)} to {Text(Highest)}",
                (true, false) => LowestExcluded ? $", above {Text(Lowest)}" : $", {Text(Lowest)} or more",
                (false, true) => $", {Text(Highest)} at most",
                _ => "",
            };
            return What + bounds + (Unit.Length > 0 ? " " + Unit : "");
        }
    }

    /// <summary>A value of a quantity.</summary>
    /// <param name="quantity">The quantity.</param>
    public static NumberRule ValueOf(Quantity quantity)
    {
        ArgumentNullException.ThrowIfNull(quantity);
        return new NumberRule(quantity.Name, quantity.Lowest, quantity.Highest) { Unit = FigureText.Unit(quantity.Unit), MayBeEmpty = true };
    }

    /// <summary>A standard deviation or spread that may be left out.</summary>
    /// <param name="what">Of what.</param>
    /// <param name="unit">The unit as people write it.</param>
    public static NumberRule Spread(string what, string unit) => new(what, 0) { Unit = unit, MayBeEmpty = true };

    /// <summary>A number above 0 that is needed.</summary>
    /// <param name="what">What it is.</param>
    /// <param name="unit">The unit as people write it.</param>
    public static NumberRule Positive(string what, string unit = "") => new(what, 0) { Unit = unit, LowestExcluded = true };

    /// <summary>True where a number is possible.</summary>
    /// <param name="value">A finite number.</param>
    public bool Holds(double value) => (LowestExcluded ? value > Lowest : value >= Lowest) && value <= Highest;

    private static string Text(double value) => TypedNumber.Text(value);
}
