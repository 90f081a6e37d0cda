using System.Globalization;
using System.Text.Json;
using WaterMix.Core;

namespace WaterMix.Formats.Json;

/// <summary>
/// One value of a <see cref="StrictJsonDocument"/>. The <c>As...</c> methods give its content where it has the type asked for; otherwise
/// they add a finding to the document and give null, so that a reader can go on and find the next fault.
/// </summary>
public sealed class StrictJsonNode
{
    private readonly StrictJsonDocument _document;
    private readonly string _text;

    internal StrictJsonNode(StrictJsonDocument document, string path, string key, JsonValueKind kind, int line, string text, IReadOnlyList<StrictJsonNode> children)
    {
        _document = document;
        _text = text;
        Path = path;
        Key = key;
        Kind = kind;
        Line = line;
        Children = children;
    }

    /// <summary>The place as an RFC 6901 pointer; empty for the outermost value.</summary>
    public string Path { get; }

    /// <summary>The key that the value stands under in its object, or its index in its list; empty for the outermost value.</summary>
    public string Key { get; }

    /// <summary>The value's type; <see cref="JsonValueKind.Undefined"/> where the text has no value that could be used and a finding says so.</summary>
    public JsonValueKind Kind { get; }

    /// <summary>The line that the value begins in, 1-based.</summary>
    public int Line { get; }

    /// <summary>The values in an object (each key once: the first) or a list; empty for other types.</summary>
    public IReadOnlyList<StrictJsonNode> Children { get; }

    /// <summary>The value under a key, without a finding where there is none.</summary>
    /// <param name="key">The key.</param>
    public StrictJsonNode? Child(string key) =>
        Kind == JsonValueKind.Object ? Children.FirstOrDefault(child => child.Key == key) : null;

    /// <summary>An object of which every key is known; unknown ones are findings that suggest the nearest known key.</summary>
    /// <param name="knownKeys">The keys that mean something here.</param>
    public StrictJsonObject? AsObject(params IReadOnlyList<string> knownKeys)
    {
        ArgumentNullException.ThrowIfNull(knownKeys);
        if (!Is(JsonValueKind.Object, "an object { ... }"))
        {
            return null;
        }

        foreach (StrictJsonNode child in Children)
        {
            if (!knownKeys.Contains(child.Key))
            {
                child.Report(
                    $"one of the keys {string.Join(", ", knownKeys)}",
                    $"the unknown key \"{child.Key}\"",
                    NearestName.Suggestion(child.Key, knownKeys) + "Correct the key or take it out.");
            }
        }

        return new StrictJsonObject(this);
    }

    /// <summary>The values of an object whose keys are names (tracers, ...); each value's <see cref="Key"/> is the name.</summary>
    public IReadOnlyList<StrictJsonNode>? AsMap() => Is(JsonValueKind.Object, "an object { \"name\": value, ... }") ? Children : null;

    /// <summary>The values of a list.</summary>
    public IReadOnlyList<StrictJsonNode>? AsList() => Is(JsonValueKind.Array, "a list [ ... ]") ? Children : null;

    /// <summary>A text; it may be empty.</summary>
    public string? AsText() => Is(JsonValueKind.String, "text in double quotes") ? _text : null;

    /// <summary>True where the value is this very text.</summary>
    /// <param name="text">The text.</param>
    public bool IsText(string text) => Kind == JsonValueKind.String && _text == text;

    /// <summary>A finite number.</summary>
    public double? AsNumber()
    {
        if (!Is(JsonValueKind.Number, "a number"))
        {
            return null;
        }

        double value = double.Parse(_text, NumberStyles.Float, CultureInfo.InvariantCulture);
        if (double.IsFinite(value))
        {
            return value;
        }

        Report("a number that fits a double (up to 1.8e308)", Described(), "Correct the number or its exponent.");
        return null;
    }

    /// <summary>A whole number in a range; <c>3.0</c> counts as 3.</summary>
    /// <param name="lowest">The smallest allowed.</param>
    /// <param name="highest">The largest allowed.</param>
    public int? AsInteger(int lowest, int highest)
    {
        string expected = highest == int.MaxValue ? $"a whole number, {lowest} or more" : $"a whole number from {lowest} to {highest}";
        if (!Is(JsonValueKind.Number, expected))
        {
            return null;
        }

        double value = double.Parse(_text, NumberStyles.Float, CultureInfo.InvariantCulture);
        if (value >= lowest && value <= highest && value == Math.Floor(value))
        {
            return (int)value;
        }

        Report(expected, Described(), "Correct the number.");
        return null;
    }

    /// <summary>True or false.</summary>
    public bool? AsBoolean()
    {
        if (Kind is JsonValueKind.True or JsonValueKind.False)
        {
            return Kind == JsonValueKind.True;
        }

        Is(JsonValueKind.True, "true or false");
        return null;
    }

    /// <summary>One of a few words, as the value it stands for.</summary>
    /// <typeparam name="T">The type of that value.</typeparam>
    /// <param name="choices">The words and their values.</param>
    public T? AsChoice<T>(params IReadOnlyList<(string Word, T Value)> choices)
        where T : struct
    {
        ArgumentNullException.ThrowIfNull(choices);
        string expected = string.Join(" or ", choices.Select(c => $"\"{c.Word}\""));
        if (!Is(JsonValueKind.String, expected))
        {
            return null;
        }

        foreach ((string word, T value) in choices)
        {
            if (word == _text)
            {
                return value;
            }
        }

        Report(expected, Described(), NearestName.Suggestion(_text, choices.Select(c => c.Word)) + "Write one of these words.");
        return null;
    }

    /// <summary>Adds an error about this value to the document's findings.</summary>
    /// <param name="expected">What was needed, as a phrase.</param>
    /// <param name="found">What stands there, as a phrase; see <see cref="Described"/>.</param>
    /// <param name="remedy">What to do, as a sentence.</param>
    public void Report(string expected, string found, string remedy) =>
        _document.Add(new Finding(Severity.Error, expected, found, remedy) { Path = Path, Line = Line });

    /// <summary>Adds an error about a key that this object lacks; its place is where the key belongs.</summary>
    /// <param name="key">The key.</param>
    public void ReportMissing(string key) =>
        _document.Add(new Finding(Severity.Error, $"the key \"{key}\"", "none", $"Add \"{key}\" here.") { Path = JsonPointer.Append(Path, key), Line = Line });

    /// <summary>The value as a phrase for a finding: <c>the text "3,1"</c>, <c>the number 1e999</c>, <c>a list</c>, ...</summary>
    public string Described() => Kind switch
    {
        JsonValueKind.Object => "an object",
        JsonValueKind.Array => "a list",
        JsonValueKind.String => $"the text \"{Shortened()}\"",
        JsonValueKind.Number => $"the number {Shortened()}",
        JsonValueKind.True => "true",
        JsonValueKind.False => "false",
        _ => "null",
    };

    private string Shortened() => _text.Length <= 60 ? _text : string.Concat(_text.AsSpan(0, 57), "...");

    private bool Is(JsonValueKind kind, string expected)
    {
        // An undefined value was reported where it was parsed.
        if (Kind != kind && Kind != JsonValueKind.Undefined)
        {
            Report(expected, Described(), RemedyFor(kind));
        }

        return Kind == kind;
    }

    private string RemedyFor(JsonValueKind wanted)
    {
        if (Kind == JsonValueKind.Null)
        {
            return "Give a value, or leave the key out where it is optional.";
        }

        if (wanted == JsonValueKind.Number && Kind == JsonValueKind.String)
        {
            return "Write numbers without quotes and with '.' for decimals.";
        }

        return "Change the value to the expected type.";
    }
}
