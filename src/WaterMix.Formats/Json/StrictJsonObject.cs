namespace WaterMix.Formats.Json;

/// <summary>An object of a <see cref="StrictJsonDocument"/> whose keys have been checked; from <see cref="StrictJsonNode.AsObject"/>.</summary>
public sealed class StrictJsonObject
{
    internal StrictJsonObject(StrictJsonNode node)
    {
        Node = node;
    }

    /// <summary>The value that is the object.</summary>
    public StrictJsonNode Node { get; }

    /// <summary>The value under a key that may be absent.</summary>
    /// <param name="key">The key.</param>
    public StrictJsonNode? Optional(string key) => Node.Child(key);

    /// <summary>The value under a key that must be there; where it is not, a finding says so and this is null.</summary>
    /// <param name="key">The key.</param>
    public StrictJsonNode? Required(string key)
    {
        StrictJsonNode? child = Node.Child(key);
        if (child is null)
        {
            Node.ReportMissing(key);
        }

        return child;
    }
}
