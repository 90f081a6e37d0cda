namespace WaterMix.Web.Components.Common;

/// <summary>
/// The files of one upload. Files chosen while others are on their way join them; once all were received, the next choice starts a new
/// upload. A file that was refused holds the upload back until the person takes it off the list, so that none is left out unnoticed.
/// </summary>
public sealed class SentFiles
{
    private readonly List<SentFile> _files = [];
    private bool _isHandedOver;

    /// <summary>The upload's id.</summary>
    public Guid Upload { get; private set; } = Guid.NewGuid();

    /// <summary>The files, in the order in which they were chosen.</summary>
    public IReadOnlyList<SentFile> Files => _files;

    /// <summary>Adds files that were chosen.</summary>
    /// <param name="files">The files.</param>
    public void Add(IEnumerable<SentFile> files)
    {
        if (_isHandedOver)
        {
            _files.Clear();
            _isHandedOver = false;
            Upload = Guid.NewGuid();
        }

        _files.AddRange(files);
    }

    /// <summary>Marks a file as being sent.</summary>
    /// <param name="id">The file.</param>
    /// <returns>False where it was taken off the list meanwhile and must not be sent.</returns>
    public bool Begin(int id) => Change(id, f => f with { State = SendState.Sending });

    /// <summary>Says how far a file is.</summary>
    /// <param name="id">The file.</param>
    /// <param name="fraction">How far, 0 to 1.</param>
    public void Progress(int id, double fraction) => Change(id, f => f with { Fraction = Math.Clamp(fraction, 0, 1) });

    /// <summary>Marks a file as received whole.</summary>
    /// <param name="id">The file.</param>
    public void Receive(int id) => Change(id, f => f with { State = SendState.Received, Fraction = 1 });

    /// <summary>Marks a file as refused.</summary>
    /// <param name="id">The file.</param>
    /// <param name="problem">Why, and what to do.</param>
    public void Refuse(int id, string problem) => Change(id, f => f with { State = SendState.Refused, Problem = problem });

    /// <summary>Takes a file that was not received off the list.</summary>
    /// <param name="id">The file.</param>
    public void Remove(int id) => _files.RemoveAll(f => f.Id == id && f.State != SendState.Received);

    /// <summary>The upload's id, once: when every file on the list was received. Otherwise null.</summary>
    public Guid? HandOver()
    {
        if (_isHandedOver || _files.Count == 0 || _files.Any(f => f.State != SendState.Received))
        {
            return null;
        }

        _isHandedOver = true;
        return Upload;
    }

    private bool Change(int id, Func<SentFile, SentFile> change)
    {
        int index = _files.FindIndex(f => f.Id == id);
        if (index < 0)
        {
            return false;
        }

        _files[index] = change(_files[index]);
        return true;
    }
}
