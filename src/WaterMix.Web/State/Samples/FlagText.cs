using System.Globalization;
using WaterMix.Core.Samples;

namespace WaterMix.Web.State.Samples;

/// <summary>WHP quality flags as people type and read them, <c>WhpExchange</c>.</summary>
public static class FlagText
{
    /// <summary>Reads a list such as <c>2, 6</c>.</summary>
    /// <param name="text">Digits 1 to 9, parted by commas or spaces.</param>
    /// <returns>The flags in rising order, each once; null where the text is something else or empty.</returns>
    public static IReadOnlyList<int>? Parse(string? text)
    {
        string[] parts = (text ?? "").Split([',', ' ', ';'], StringSplitOptions.RemoveEmptyEntries);
        return parts.Length > 0 && parts.All(p => p.Length == 1 && p[0] is >= '1' and <= '9')
            ? [.. parts.Select(p => p[0] - '0').Distinct().Order()]
            : null;
    }

    /// <summary>A list as it is typed: <c>2, 6</c>.</summary>
    /// <param name="flags">The flags.</param>
    public static string Of(IEnumerable<int> flags) => string.Join(", ", flags.Order().Select(f => f.ToString(CultureInfo.InvariantCulture)));

    /// <summary>What is wrong with a list that <see cref="Parse"/> does not take, and what to do.</summary>
    /// <param name="what">Which flags.</param>
    /// <param name="text">What was typed.</param>
    public static string Problem(string what, string? text) =>
        $"{what}: expected flags from 1 to 9 parted by commas, such as 2, 6; found “{text}”.";

    /// <summary>A flag in words.</summary>
    /// <param name="flag">The flag, 1 to 9.</param>
    /// <param name="origin">Which table it is read in; <see cref="ValueOrigin.None"/> for values of both kinds.</param>
    public static string Meaning(int flag, ValueOrigin origin) => (flag, origin) switch
    {
        (1, ValueOrigin.Ctd) => "not calibrated",
        (1, _) => "drawn, not analysed",
        (2, _) => "good",
        (3, _) => "questionable",
        (4, _) => "bad",
        (5, _) => "not reported",
        (6, ValueOrigin.Ctd) => "interpolated",
        (6, ValueOrigin.Bottle) => "mean of replicates",
        (6, _) => "mean or interpolated",
        (7, ValueOrigin.Ctd) => "despiked",
        (7, ValueOrigin.Bottle) => "peak measured by hand",
        (7, _) => "despiked or by hand",
        (8, ValueOrigin.Bottle) => "irregular chromatogram",
        (9, _) => "not sampled",
        _ => "not in use",
    };

    /// <summary>A bottle's flag in words.</summary>
    /// <param name="flag">The flag, 1 to 9.</param>
    public static string OfBottle(int flag) => flag switch
    {
        1 => "no information",
        2 => "no problems noted",
        3 => "leaking",
        4 => "did not trip correctly",
        5 => "not reported",
        6 => "significant difference between bottles",
        7 => "unknown problem",
        8 => "pair did not trip correctly",
        _ => "no samples drawn",
    };
}
