using System.Globalization;

namespace WaterMix.Web.State.Figures;

/// <summary>A colour in sRGB, each part 0 to 255.</summary>
/// <param name="Red">Red.</param>
/// <param name="Green">Green.</param>
/// <param name="Blue">Blue.</param>
public readonly record struct Rgb(double Red, double Green, double Blue)
{
    /// <summary>The colour as <c>#rrggbb</c>.</summary>
    public string Hex => string.Create(CultureInfo.InvariantCulture, $"#{Part(Red):X2}{Part(Green):X2}{Part(Blue):X2}");

    /// <summary>Relative luminance, 0 to 1, as <c>Wcag22</c> defines it.</summary>
    public double Luminance => (0.2126 * Linear(Red)) + (0.7152 * Linear(Green)) + (0.0722 * Linear(Blue));

    /// <summary>A colour from <c>#rrggbb</c>.</summary>
    /// <param name="hex">Seven characters.</param>
    /// <exception cref="ArgumentException">It is not of that form.</exception>
    public static Rgb Parse(string hex)
    {
        ArgumentNullException.ThrowIfNull(hex);
        if (hex.Length != 7 || hex[0] != '#' || !int.TryParse(hex.AsSpan(1), NumberStyles.AllowHexSpecifier, CultureInfo.InvariantCulture, out int value))
        {
            throw new ArgumentException($"A colour is written #rrggbb, such as #0F6B73, but this is '{hex}'.", nameof(hex));
        }

        return new Rgb((value >> 16) & 255, (value >> 8) & 255, value & 255);
    }

    /// <summary>This colour mixed with another.</summary>
    /// <param name="other">The other.</param>
    /// <param name="share">The share of the other, 0 to 1.</param>
    public Rgb Mixed(Rgb other, double share) => new(Mix(Red, other.Red, share), Mix(Green, other.Green, share), Mix(Blue, other.Blue, share));

    /// <summary>The contrast of two colours, 1 to 21, as <c>Wcag22</c> defines it.</summary>
    /// <param name="other">The other.</param>
    public double ContrastTo(Rgb other)
    {
        double a = Luminance;
        double b = other.Luminance;
        return (Math.Max(a, b) + 0.05) / (Math.Min(a, b) + 0.05);
    }

    private static int Part(double value) => (int)Math.Round(Math.Clamp(value, 0, 255));

    private static double Mix(double a, double b, double share) => a + (share * (b - a));

    private static double Linear(double part)
    {
        double c = part / 255;
        return c <= 0.04045 ? c / 12.92 : Math.Pow((c + 0.055) / 1.055, 2.4);
    }
}
