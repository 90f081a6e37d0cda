using System.Buffers.Binary;
using System.Runtime.InteropServices;

namespace WaterMix.Web.State.Figures;

/// <summary>
/// What goes to the browser for a drawing: a description without numbers of samples, and all arrays behind one another as 4-byte
/// little-endian numbers. In the description an array is its offset in numbers.
/// </summary>
internal sealed class FigureDrawing
{
    /// <summary>Colours on a scale: enough that steps are not seen.</summary>
    private const int ScaleSteps = 64;

    private readonly List<float> _numbers = [];

    /// <summary>The arrays, little-endian single precision.</summary>
    public byte[] Bytes
    {
        get
        {
            ReadOnlySpan<float> numbers = CollectionsMarshal.AsSpan(_numbers);
            byte[] bytes = new byte[4 * numbers.Length];
            for (int i = 0; i < numbers.Length; i++)
            {
                BinaryPrimitives.WriteSingleLittleEndian(bytes.AsSpan(4 * i), numbers[i]);
            }

            return bytes;
        }
    }

    /// <summary>The description of a layer; its arrays are added.</summary>
    public object Layer(FigureLayer layer) => layer switch
    {
        PointLayer p => new { id = p.Id, kind = "points", n = p.X.Length, x = Add(p.X), y = Add(p.Y), colour = Colour(p.Colour, p.Shape), size = p.Size, canSelect = p.CanSelect },
        LineLayer l => new { id = l.Id, kind = "line", n = l.X.Length, x = Add(l.X), y = Add(l.Y), colour = Themes(l.Colour), width = l.Width, dashed = l.Dashed },
        PolygonLayer g => new { id = g.Id, kind = "polygon", n = g.X.Length, x = Add(g.X), y = Add(g.Y), colour = Themes(g.Colour), opacity = g.Opacity, dashed = g.Dashed },
        ArrowLayer a => new
        {
            id = a.Id,
            kind = "arrows",
            arrows = a.Arrows.Select(w => new { label = w.Label, x0 = w.FromX, y0 = w.FromY, x1 = w.ToX, y1 = w.ToY, colour = Themes(w.Colour) }),
        },
        MarkLayer m => new
        {
            id = m.Id,
            kind = "marks",
            draggable = m.Draggable,
            marks = m.Marks.Where(k => double.IsFinite(k.X) && double.IsFinite(k.Y)).Select(k => new
            {
                id = k.Id,
                label = k.Label,
                x = k.X,
                y = k.Y,
                colour = Themes(k.Colour),
                shape = Name(k.Shape),
                spread = k.Spread is { } s ? new[] { s.X, s.Y } : null,
            }),
        },
        _ => throw new ArgumentException($"No figure draws a {layer.GetType().Name}.", nameof(layer)),
    };

    /// <summary>The description of how points are coloured; its arrays are added.</summary>
    public object Colour(PointColour colour, PointShape shape) => colour switch
    {
        OneColour one => new { kind = "one", entries = new[] { new { colour = Themes(one.Colour), shape = Name(shape) } } },
        CategoryColour c => new
        {
            kind = "categories",
            values = Add(c.Codes),
            entries = c.Categories.Select(k => new { colour = Themes(k.Colour), shape = Name(k.Shape) }),
        },
        StrengthColour s => new { kind = "strength", values = Add(s.Fractions), from = 0.0, to = 1.0, colour = Themes(s.Colour), shape = Name(shape) },
        SequentialColour q => Scale(q.Values, ScaleRange.Of(q), shape, (t, _) => ColourScale.Cividis(t)),
        DivergingColour d => Scale(d.Values, new FigureRange(-ScaleRange.Of(d), ScaleRange.Of(d)), shape, ColourScale.Diverging),
        _ => throw new ArgumentException($"No figure draws a {colour.GetType().Name}.", nameof(colour)),
    };

    /// <summary>Adds an array and gives its offset.</summary>
    public int Add(double[] values)
    {
        int offset = _numbers.Count;
        CollectionsMarshal.SetCount(_numbers, offset + values.Length);
        Span<float> target = CollectionsMarshal.AsSpan(_numbers)[offset..];
        for (int i = 0; i < values.Length; i++)
        {
            target[i] = (float)values[i];
        }

        return offset;
    }

    /// <summary>An axis with the range that it shows at first.</summary>
    public static object Axis(FigureAxis axis, FigureRange range) => new { label = axis.Label, reversed = axis.Reversed, from = range.From, to = range.To };

    private int Add(int[] codes) => Add(Array.ConvertAll(codes, code => code < 0 ? double.NaN : code));

    private object Scale(double[] values, FigureRange range, PointShape shape, Func<double, bool, Rgb> at) => new
    {
        kind = "scale",
        values = Add(values),
        from = range.From,
        to = range.To,
        light = Steps(t => at(t, false)),
        dark = Steps(t => at(t, true)),
        shape = Name(shape),
    };

    private static string[] Steps(Func<double, Rgb> at) => [.. Enumerable.Range(0, ScaleSteps).Select(i => at(i / (ScaleSteps - 1.0)).Hex)];

    private static string[] Themes(string colour)
    {
        (string light, string dark) = FigureColour.InThemes(colour);
        return [light, dark];
    }

    private static string Name(PointShape shape) => shape switch
    {
        PointShape.Square => "square",
        PointShape.Diamond => "diamond",
        PointShape.Triangle => "triangle",
        PointShape.TriangleDown => "triangle-down",
        PointShape.Plus => "plus",
        _ => "circle",
    };
}
