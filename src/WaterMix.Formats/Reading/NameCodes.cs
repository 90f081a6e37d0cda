using WaterMix.Core.Samples;

namespace WaterMix.Formats.Reading;

/// <summary>Names as they come, coded into the distinct ones of a block; a name that repeats the row above costs a comparison.</summary>
/// <param name="id">The identity column's id.</param>
internal sealed class NameCodes(string id)
{
    private Dictionary<string, int> _codes = new(StringComparer.Ordinal);
    private List<string> _names = [];
    private int[] _rows = [];
    private byte[] _last = [];
    private int _lastLength = -1;
    private int _lastCode = -1;

    /// <summary>The identity column's id.</summary>
    public string Id => id;

    /// <summary>True where the name of the row set last could not be made.</summary>
    public bool Failed { get; private set; }

    /// <summary>Begins a block of at most this many rows.</summary>
    public void Begin(int capacity)
    {
        _codes = new Dictionary<string, int>(StringComparer.Ordinal);
        _names = [];
        _rows = new int[capacity];
        _lastLength = -1;
    }

    /// <summary>Makes room for more rows.</summary>
    public void Grow(int capacity) => Array.Resize(ref _rows, capacity);

    /// <summary>Sets one row to the text of a field.</summary>
    /// <param name="row">Index in the block.</param>
    /// <param name="key">The field's bytes, or whatever stands for them.</param>
    /// <param name="name">Makes the name from the bytes where they are not those of the row above; empty means none, null that the bytes cannot be read.</param>
    public void Set(int row, ReadOnlySpan<byte> key, NameOf name)
    {
        if (key.Length != _lastLength || !key.SequenceEqual(_last.AsSpan(0, _lastLength)))
        {
            if (_last.Length < key.Length)
            {
                _last = new byte[Math.Max(64, key.Length)];
            }

            key.CopyTo(_last);
            _lastLength = key.Length;
            string? made = name(key);
            Failed = made is null;
            _lastCode = CodeOf(made ?? "");
        }

        _rows[row] = _lastCode;
    }

    /// <summary>Forgets the row above, where equal bytes may now mean another name.</summary>
    public void Forget() => _lastLength = -1;

    /// <summary>Sets one row to nothing.</summary>
    public void SetNone(int row) => _rows[row] = -1;

    /// <summary>The block's column.</summary>
    public IdentityColumn End(int rows)
    {
        Array.Resize(ref _rows, rows);
        return new IdentityColumn(id, _rows, [.. _names]);
    }

    private int CodeOf(string name)
    {
        if (name.Length == 0)
        {
            return -1;
        }

        if (!_codes.TryGetValue(name, out int code))
        {
            code = _names.Count;
            _names.Add(name);
            _codes.Add(name, code);
        }

        return code;
    }
}

/// <summary>Makes a name from bytes.</summary>
internal delegate string? NameOf(ReadOnlySpan<byte> key);
