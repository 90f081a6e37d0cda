namespace WaterMix.Workspace.Storage;

/// <summary>
/// Values by key in memory, shared by everyone and bounded by bytes: the least recently used go first, the newest always stays. A value
/// that went but is still in somebody's hands is found again rather than loaded twice.
/// </summary>
/// <param name="mostBytes">Bytes to keep.</param>
internal sealed class ByteCache(long mostBytes)
{
    private readonly Lock _lock = new();
    private readonly Dictionary<string, LinkedListNode<Entry>> _entries = new(StringComparer.Ordinal);
    private readonly Dictionary<string, WeakReference<object>> _gone = new(StringComparer.Ordinal);
    private readonly LinkedList<Entry> _recent = [];
    private long _bytes;

    /// <summary>Bytes kept at present.</summary>
    public long Bytes
    {
        get
        {
            lock (_lock)
            {
                return _bytes;
            }
        }
    }

    /// <summary>The value under a key, loaded once where it is not there, however many ask at the same time.</summary>
    /// <typeparam name="T">The value's type, one for each key.</typeparam>
    /// <param name="key">The key.</param>
    /// <param name="load">Loads the value; it runs on the thread pool.</param>
    /// <param name="size">The value's bytes.</param>
    public async Task<T> GetAsync<T>(string key, Func<Task<T>> load, Func<T, long> size)
        where T : class
    {
        LinkedListNode<Entry> node;
        lock (_lock)
        {
            if (_entries.TryGetValue(key, out node!))
            {
                _recent.Remove(node);
                _recent.AddFirst(node);
            }
            else
            {
                Task<object> value = _gone.Remove(key, out WeakReference<object>? weak) && weak.TryGetTarget(out object? alive)
                    ? Task.FromResult(alive)
                    : Task.Run(async () => (object)await load());
                node = _recent.AddFirst(new Entry(key, value));
                _entries.Add(key, node);
            }
        }

        try
        {
            var loaded = (T)await node.Value.Value;
            Count(node, size(loaded));
            return loaded;
        }
        catch
        {
            lock (_lock)
            {
                if (node.List is not null && node.Value.Bytes == 0)
                {
                    Remove(node);
                }
            }

            throw;
        }
    }

    private void Count(LinkedListNode<Entry> node, long bytes)
    {
        lock (_lock)
        {
            if (node.List is null || node.Value.Bytes > 0)
            {
                return;
            }

            node.Value.Bytes = Math.Max(1, bytes);
            _bytes += node.Value.Bytes;
            LinkedListNode<Entry>? oldest = _recent.Last;
            while (_bytes > mostBytes && oldest is not null && oldest != _recent.First)
            {
                LinkedListNode<Entry>? next = oldest.Previous;
                if (oldest.Value.Bytes > 0)
                {
                    _gone[oldest.Value.Key] = new WeakReference<object>(oldest.Value.Value.Result);
                    Remove(oldest);
                }

                oldest = next;
            }

            foreach (string key in _gone.Where(g => !g.Value.TryGetTarget(out _)).Select(g => g.Key).ToList())
            {
                _gone.Remove(key);
            }
        }
    }

    private void Remove(LinkedListNode<Entry> node)
    {
        _bytes -= node.Value.Bytes;
        _recent.Remove(node);
        _entries.Remove(node.Value.Key);
    }

    private sealed class Entry(string key, Task<object> value)
    {
        public string Key => key;

        public Task<object> Value => value;

        /// <summary>0 while it is being loaded.</summary>
        public long Bytes { get; set; }
    }
}
