using System.Buffers;
using System.Globalization;
using System.Text;
using System.Text.Json;
using System.Text.Unicode;
using WaterMix.Core;

namespace WaterMix.Formats.Json;

/// <summary>Turns bytes into the tree of a <see cref="StrictJsonDocument"/>, collecting what is not strict JSON.</summary>
internal sealed class StrictJsonParser(byte[] bytes, StrictJsonDocument document)
{
    private const int DeepestNesting = 64;

    // NaN and Infinity are blanked out and the text is parsed again, so that one pass lists them all; this many are enough for a message.
    private const int MostBlanked = 50;

    private readonly List<int> _lineStarts = [];
    private readonly List<(int Offset, Finding Finding)> _findings = [];
    private readonly SortedDictionary<int, Finding> _blanked = [];
    private int _start;

    public StrictJsonNode? Parse()
    {
        FindLines();
        Finding? notText = NotText();
        if (notText is not null)
        {
            document.Add(notText);
            return null;
        }

        StrictJsonNode? root = null;
        bool again = true;
        while (again)
        {
            _findings.Clear();
            (root, again) = ParseOnce();
        }

        _findings.AddRange(_blanked.Select(b => (b.Key, b.Value)));
        foreach ((_, Finding finding) in _findings.OrderBy(f => f.Offset))
        {
            document.Add(finding);
        }

        return root;
    }

    private static bool IsWordByte(byte b) => char.IsAsciiLetterOrDigit((char)b) || b is (byte)'-' or (byte)'+' or (byte)'.' or (byte)'_';

    private void FindLines()
    {
        _lineStarts.Add(0);
        for (int i = 0; i < bytes.Length; i++)
        {
            if (bytes[i] == '\n')
            {
                _lineStarts.Add(i + 1);
            }
        }
    }

    private Finding? NotText()
    {
        const string Expected = "a JSON text in UTF-8";
        if (bytes.AsSpan().StartsWith("\uFEFF"u8))
        {
            _start = 3;
        }

        if (bytes.AsSpan(_start).IndexOfAnyExcept(" \t\r\n"u8) < 0)
        {
            return new Finding(Severity.Error, Expected, "an empty file", "Give a file with content; this one may not have been saved or copied completely.");
        }

        if (bytes is [0xFF, 0xFE, ..] or [0xFE, 0xFF, ..])
        {
            return new Finding(Severity.Error, Expected, "UTF-16 (by its byte-order mark)", "Save the file as UTF-8.");
        }

        int zero = bytes.AsSpan().IndexOf((byte)0);
        if (zero >= 0)
        {
            return At(zero, Expected, "a zero byte: this is a binary file", "Give the JSON file itself, not a compressed or binary one.");
        }

        if (!Utf8.IsValid(bytes))
        {
            int i = 0;
            while (Rune.DecodeFromUtf8(bytes.AsSpan(i), out _, out int length) == OperationStatus.Done)
            {
                i += length;
            }

            return At(i, Expected, string.Create(CultureInfo.InvariantCulture, $"the byte 0x{bytes[i]:X2}, which is not UTF-8"), "Save the file as UTF-8.");
        }

        return null;
    }

    private (StrictJsonNode? Root, bool Again) ParseOnce()
    {
        var reader = new Utf8JsonReader(bytes.AsSpan(_start), new JsonReaderOptions
        {
            // Comments and trailing commas are let through here so that each becomes a finding of its own.
            AllowTrailingCommas = true,
            CommentHandling = JsonCommentHandling.Allow,
            MaxDepth = DeepestNesting,
        });
        try
        {
            Next(ref reader);
            StrictJsonNode root = Value(ref reader, "", "");
            while (reader.Read())
            {
                NoComment(ref reader);
            }

            return (root, false);
        }
        catch (JsonException fault)
        {
            return (null, Explain(fault, reader.CurrentDepth));
        }
    }

    private StrictJsonNode Value(ref Utf8JsonReader reader, string path, string key)
    {
        int offset = Offset(ref reader);
        int line = LineOf(offset);
        switch (reader.TokenType)
        {
            case JsonTokenType.StartObject:
                return new StrictJsonNode(document, path, key, JsonValueKind.Object, line, "", Properties(ref reader, path));
            case JsonTokenType.StartArray:
                return new StrictJsonNode(document, path, key, JsonValueKind.Array, line, "", Items(ref reader, path));
            case JsonTokenType.String:
                string? text = Text(ref reader, path);
                return new StrictJsonNode(document, path, key, text is null ? JsonValueKind.Undefined : JsonValueKind.String, line, text ?? "", []);
            case JsonTokenType.Number when _blanked.TryGetValue(offset, out Finding? finding):
                _blanked[offset] = finding with { Path = path };
                return new StrictJsonNode(document, path, key, JsonValueKind.Undefined, line, "", []);
            case JsonTokenType.Number:
                return new StrictJsonNode(document, path, key, JsonValueKind.Number, line, Encoding.ASCII.GetString(reader.ValueSpan), []);
            case JsonTokenType.True:
                return new StrictJsonNode(document, path, key, JsonValueKind.True, line, "", []);
            case JsonTokenType.False:
                return new StrictJsonNode(document, path, key, JsonValueKind.False, line, "", []);
            default:
                return new StrictJsonNode(document, path, key, JsonValueKind.Null, line, "", []);
        }
    }

    private List<StrictJsonNode> Properties(ref Utf8JsonReader reader, string path)
    {
        var children = new List<StrictJsonNode>();
        var firstLine = new Dictionary<string, int>(StringComparer.Ordinal);
        while (Next(ref reader) && reader.TokenType != JsonTokenType.EndObject)
        {
            int offset = Offset(ref reader);
            string key = Text(ref reader, path: null) ?? "";
            string childPath = JsonPointer.Append(path, key);
            bool isNew = firstLine.TryAdd(key, LineOf(offset));
            if (!isNew)
            {
                Found(offset, "each key once", $"\"{key}\" a second time (first in line {firstLine[key]})", "Keep one of the two.", childPath);
            }

            Next(ref reader);
            StrictJsonNode child = Value(ref reader, childPath, key);
            if (isNew)
            {
                children.Add(child);
            }
        }

        return children;
    }

    private List<StrictJsonNode> Items(ref Utf8JsonReader reader, string path)
    {
        var children = new List<StrictJsonNode>();
        while (Next(ref reader) && reader.TokenType != JsonTokenType.EndArray)
        {
            string index = children.Count.ToString(CultureInfo.InvariantCulture);
            children.Add(Value(ref reader, JsonPointer.Append(path, index), index));
        }

        return children;
    }

    // Advances to the next token that is no comment; a comma just before a closing bracket is reported.
    private bool Next(ref Utf8JsonReader reader)
    {
        int comma = -1;
        while (true)
        {
            int end = _start + (int)reader.BytesConsumed;
            if (!reader.Read())
            {
                return false;
            }

            int start = Offset(ref reader);
            int found = bytes.AsSpan(end, start - end).IndexOf((byte)',');
            comma = found < 0 ? comma : end + found;
            if (NoComment(ref reader))
            {
                if (comma >= 0 && reader.TokenType is (JsonTokenType.EndObject or JsonTokenType.EndArray))
                {
                    Found(comma, "a value after the comma", "a closing bracket", "Take out the comma after the last value.", path: null);
                }

                return true;
            }
        }
    }

    private bool NoComment(ref Utf8JsonReader reader)
    {
        if (reader.TokenType != JsonTokenType.Comment)
        {
            return true;
        }

        Found(Offset(ref reader), "JSON, which has no comments", "a comment", "Take the comment out; notes have keys of their own.", path: null);
        return false;
    }

    private string? Text(ref Utf8JsonReader reader, string? path)
    {
        try
        {
            return reader.GetString();
        }
        catch (InvalidOperationException)
        {
            Found(Offset(ref reader), "text of whole characters", "half of a surrogate pair (\\uD800 to \\uDFFF on its own)", "Write the whole character.", path);
            return null;
        }
    }

    // Returns true where the fault was a NaN or an Infinity that has been blanked out, so that parsing can be tried again.
    private bool Explain(JsonException fault, int depth)
    {
        int line = (int)(fault.LineNumber ?? 0);
        int lineStart = Math.Max(_lineStarts[Math.Min(line, _lineStarts.Count - 1)], _start);
        int offset = Math.Min(lineStart + (int)(fault.BytePositionInLine ?? 0), bytes.Length);
        if (depth >= DeepestNesting - 1 && offset < bytes.Length && bytes[offset] is (byte)'[' or (byte)'{')
        {
            Found(offset, $"at most {DeepestNesting} levels of brackets", "deeper nesting", "Give a file of the documented shape.", path: null);
            return false;
        }

        int start = offset;
        while (start > _start && offset < bytes.Length && IsWordByte(bytes[offset]) && IsWordByte(bytes[start - 1]))
        {
            start--;
        }

        int end = offset;
        while (end < bytes.Length && IsWordByte(bytes[end]))
        {
            end++;
        }

        string word = Encoding.ASCII.GetString(bytes, start, end - start);
        if (word.TrimStart('-', '+').ToUpperInvariant() is "NAN" or "INF" or "INFINITY" && _blanked.Count < MostBlanked)
        {
            _blanked.Add(start, At(start, "a finite number", word, "Leave a missing value out; give a number otherwise."));
            bytes.AsSpan(start, end - start).Fill((byte)' ');
            bytes[start] = (byte)'0';
            return true;
        }

        bool atEnd = bytes.AsSpan(offset).IndexOfAnyExcept(" \t\r\n"u8) < 0;
        if (atEnd)
        {
            Found(bytes.Length, "the rest of the document", "the end of the file", "The file is cut off or a bracket or quote is not closed; complete it.", path: null);
        }
        else if (offset == _start + bytes.AsSpan(_start).IndexOfAnyExcept(" \t\r\n"u8))
        {
            Found(offset, "a JSON text, beginning with '{'", Shown(word, offset), "Give a JSON file of the documented shape.", path: null);
        }
        else
        {
            Found(offset, "JSON as RFC 8259 has it", Shown(word, offset), "Look for a missing comma, quote or bracket at or just before this place; numbers have no leading zero or '+'.", path: null);
        }

        return false;
    }

    private string Shown(string word, int offset)
    {
        if (word.Length > 0)
        {
            return $"'{(word.Length <= 60 ? word : string.Concat(word.AsSpan(0, 57), "..."))}'";
        }

        Rune.DecodeFromUtf8(bytes.AsSpan(offset), out Rune rune, out _);
        return Rune.IsControl(rune)
            ? string.Create(CultureInfo.InvariantCulture, $"the control character U+{rune.Value:X4}")
            : $"'{rune}'";
    }

    private void Found(int offset, string expected, string found, string remedy, string? path) =>
        _findings.Add((offset, At(offset, expected, found, remedy) with { Path = path }));

    private Finding At(int offset, string expected, string found, string remedy)
    {
        int line = LineOf(offset);
        int lineStart = Math.Max(_lineStarts[line - 1], _start);
        int column = 1 + Encoding.UTF8.GetCharCount(bytes, lineStart, Math.Max(0, offset - lineStart));
        return new Finding(Severity.Error, expected, found, remedy)
        {
            Line = line,
            Column = column.ToString(CultureInfo.InvariantCulture),
        };
    }

    private int Offset(ref Utf8JsonReader reader) => _start + (int)reader.TokenStartIndex;

    private int LineOf(int offset)
    {
        int found = _lineStarts.BinarySearch(offset);
        return found >= 0 ? found + 1 : ~found;
    }
}
