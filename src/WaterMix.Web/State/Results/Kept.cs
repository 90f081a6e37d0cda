namespace WaterMix.Web.State.Results;

/// <summary>The last value made, kept as long as it is asked for with an equal key.</summary>
/// <typeparam name="TKey">What the value depends on.</typeparam>
/// <typeparam name="TValue">The value.</typeparam>
internal sealed class Kept<TKey, TValue>
    where TKey : notnull
{
    private (TKey Key, TValue Value)? _last;

    /// <summary>The value for a key.</summary>
    /// <param name="key">What it depends on.</param>
    /// <param name="make">Makes it where the key is another one than the last time.</param>
    public TValue Get(TKey key, Func<TValue> make)
    {
        if (_last is not { } last || !EqualityComparer<TKey>.Default.Equals(last.Key, key))
        {
            _last = (key, make());
        }

        return _last.Value.Value;
    }
}
