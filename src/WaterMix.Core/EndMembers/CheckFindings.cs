namespace WaterMix.Core.EndMembers;

/// <summary>Findings of a check, collected with their places.</summary>
internal sealed class CheckFindings
{
    private readonly List<Finding> _items = [];

    public IReadOnlyList<Finding> Items => _items;

    public void Error(string path, string expected, string found, string remedy) => Add(Severity.Error, path, expected, found, remedy);

    public void Warning(string path, string expected, string found, string remedy) => Add(Severity.Warning, path, expected, found, remedy);

    public void Note(string path, string expected, string found, string remedy) => Add(Severity.Note, path, expected, found, remedy);

    private void Add(Severity severity, string path, string expected, string found, string remedy) =>
        _items.Add(new Finding(severity, expected, found, remedy) { Path = path });
}
