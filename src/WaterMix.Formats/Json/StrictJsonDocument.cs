using System.Globalization;
using System.Text.Json;
using WaterMix.Core;

namespace WaterMix.Formats.Json;

/// <summary>
/// A JSON text (RFC 8259) taken strictly: UTF-8, no comments, no trailing commas, no NaN or Infinity, no key twice. Whatever is not so
/// is a finding with its line, and reading goes on where the rest can still be understood. Walk it from <see cref="Root"/>; what the walk
/// finds wrong is added to <see cref="Findings"/>.
/// </summary>
public sealed class StrictJsonDocument
{
    private readonly List<Finding> _findings = [];

    private StrictJsonDocument(string? fileName)
    {
        FileName = fileName;
    }

    /// <summary>The file's name as it appears in findings, or null.</summary>
    public string? FileName { get; }

    /// <summary>The outermost value, or null where the text is not JSON.</summary>
    public StrictJsonNode? Root { get; private set; }

    /// <summary>Everything found so far, in the order of discovery.</summary>
    public IReadOnlyList<Finding> Findings => _findings;

    /// <summary>True where a finding so far is an error.</summary>
    public bool HasErrors => _findings.Exists(f => f.Severity == Severity.Error);

    /// <summary>Takes a text apart.</summary>
    /// <param name="utf8">The file's bytes; a UTF-8 byte-order mark is skipped.</param>
    /// <param name="fileName">The file's name for findings, or null.</param>
    public static StrictJsonDocument Parse(ReadOnlySpan<byte> utf8, string? fileName)
    {
        var document = new StrictJsonDocument(fileName);
        document.Root = new StrictJsonParser(utf8.ToArray(), document).Parse();
        return document;
    }

    /// <summary>The value at a place, or the innermost one that encloses it where the place itself is absent.</summary>
    /// <param name="path">An RFC 6901 pointer.</param>
    /// <returns>The value, or null where the text is not JSON.</returns>
    public StrictJsonNode? Nearest(string path)
    {
        ArgumentNullException.ThrowIfNull(path);
        StrictJsonNode? at = Root;
        while (at is not null && at.Path.Length < path.Length)
        {
            int end = path.IndexOf('/', at.Path.Length + 1);
            string next = end < 0 ? path : path[..end];
            StrictJsonNode? inner = at.Kind == JsonValueKind.Array
                ? int.TryParse(next.AsSpan(at.Path.Length + 1), NumberStyles.None, CultureInfo.InvariantCulture, out int index) ? at.Children.ElementAtOrDefault(index) : null
                : at.Children.FirstOrDefault(child => child.Path == next);
            if (inner is null)
            {
                break;
            }

            at = inner;
        }

        return at;
    }

    /// <summary>A finding with the file's name, and with the line of its path where it has a path and no line.</summary>
    /// <param name="finding">A finding whose path, if any, points into this document.</param>
    public Finding Located(Finding finding)
    {
        ArgumentNullException.ThrowIfNull(finding);
        return finding with
        {
            File = finding.File ?? FileName,
            Line = finding.Line ?? (finding.Path is null ? null : Nearest(finding.Path)?.Line),
        };
    }

    /// <summary>Adds a finding, located as <see cref="Located"/> does.</summary>
    /// <param name="finding">The finding.</param>
    public void Add(Finding finding) => _findings.Add(Located(finding));

    /// <summary>
    /// Adds the findings of a check of the meaning, but none about a place (or within or around one) that already has an error: what
    /// could not be read would only be reported a second time.
    /// </summary>
    /// <param name="findings">Findings whose paths point into this document.</param>
    public void AddMeaning(IEnumerable<Finding> findings)
    {
        ArgumentNullException.ThrowIfNull(findings);
        string[] faulty = [.. _findings.Where(f => f.Severity == Severity.Error && f.Path is not null).Select(f => f.Path!)];
        foreach (Finding finding in findings)
        {
            if (!Array.Exists(faulty, at => JsonPointer.IsWithin(finding.Path ?? "", at) || JsonPointer.IsWithin(at, finding.Path ?? "")))
            {
                Add(finding);
            }
        }
    }

    /// <summary>The end of a reading: the findings in the order of their lines, and the value unless one of them is an error.</summary>
    /// <typeparam name="T">What the document holds.</typeparam>
    /// <param name="value">What was read from it, or null.</param>
    public Reading<T> Finish<T>(T? value)
        where T : class =>
        new(HasErrors ? null : value, [.. _findings.OrderBy(f => f.Line ?? long.MaxValue)]);
}
