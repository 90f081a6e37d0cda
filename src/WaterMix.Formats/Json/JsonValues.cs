using System.Text.Json.Nodes;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Quantities;

namespace WaterMix.Formats.Json;

/// <summary>The values that sets and models share, from JSON and to JSON: numbers by tracer, matrices over tracers, words.</summary>
internal static class JsonValues
{
    private static readonly Dictionary<string, int> Order =
        Quantity.All.Select((q, i) => (q.Id, i)).ToDictionary(p => p.Id, p => p.i, StringComparer.Ordinal);

    /// <summary>An object of values by name; entries that could not be read are left out, and an absent object is empty.</summary>
    public static IReadOnlyDictionary<string, T> Map<T>(StrictJsonNode? node, Func<StrictJsonNode, T?> read)
        where T : class
    {
        var map = new Dictionary<string, T>(StringComparer.Ordinal);
        foreach (StrictJsonNode entry in node?.AsMap() ?? [])
        {
            if (read(entry) is { } value)
            {
                map.Add(entry.Key, value);
            }
        }

        return map;
    }

    /// <summary>An object of numbers by name; an entry that could not be read is NaN, and an absent object is empty.</summary>
    public static IReadOnlyDictionary<string, double> Numbers(StrictJsonNode? node)
    {
        var map = new Dictionary<string, double>(StringComparer.Ordinal);
        foreach (StrictJsonNode entry in node?.AsMap() ?? [])
        {
            map.Add(entry.Key, entry.AsNumber() ?? double.NaN);
        }

        return map;
    }

    /// <summary>A list of texts; an item that is no text is reported and takes its place as an empty one.</summary>
    public static IReadOnlyList<string> Texts(StrictJsonNode? node) => [.. (node?.AsList() ?? []).Select(item => item.AsText() ?? "")];

    /// <summary><c>{ "tracers": [...], "matrix": [[...]] }</c>; null where it is absent or could not be read.</summary>
    public static TracerMatrix? Matrix(StrictJsonNode? node)
    {
        if (node?.AsObject("tracers", "matrix") is not { } item)
        {
            return null;
        }

        StrictJsonNode? tracers = item.Required("tracers");
        StrictJsonNode? rows = item.Required("matrix");
        IReadOnlyList<double>[] matrix = [.. (rows?.AsList() ?? []).Select(row => (IReadOnlyList<double>)[.. (row.AsList() ?? []).Select(x => x.AsNumber() ?? 0)])];
        return tracers is null || rows is null ? null : new TracerMatrix(Texts(tracers), matrix);
    }

    /// <summary>Values by name in the order of the contract's quantities, further names after them in ordinal order.</summary>
    public static JsonObject Object<T>(IReadOnlyDictionary<string, T> map, Func<T, JsonNode?> write) =>
        new(map.OrderBy(p => Order.GetValueOrDefault(p.Key, int.MaxValue))
            .ThenBy(p => p.Key, StringComparer.Ordinal)
            .Select(p => KeyValuePair.Create(p.Key, write(p.Value))));

    /// <summary>Numbers by name, ordered likewise.</summary>
    public static JsonObject Object(IReadOnlyDictionary<string, double> map) => Object(map, value => JsonValue.Create(value));

    /// <summary>A list of texts.</summary>
    public static JsonArray Array(IEnumerable<string> texts) => [.. texts.Select(text => (JsonNode?)JsonValue.Create(text))];

    /// <summary>A list of numbers.</summary>
    public static JsonArray Array(IEnumerable<double> numbers) => [.. numbers.Select(number => (JsonNode?)JsonValue.Create(number))];

    /// <summary>A matrix over tracers.</summary>
    public static JsonObject Object(TracerMatrix matrix) => new()
    {
        ["tracers"] = Array(matrix.Tracers),
        ["matrix"] = new JsonArray([.. matrix.Matrix.Select(row => (JsonNode?)Array(row))]),
    };

    /// <summary>The word for a value.</summary>
    public static string Word<T>(IEnumerable<(string Word, T Value)> words, T value)
        where T : struct =>
        words.First(w => w.Value.Equals(value)).Word;
}
