using WaterMix.Core.Mixing;

namespace WaterMix.Workspace.Studies;

/// <summary>The studies of a data folder. Pages and the HTTP API use the same service.</summary>
public interface IStudies
{
    /// <summary>Raised with a study's id after anything in it changed, by whichever tab, request or job.</summary>
    event Action<Guid>? Changed;

    /// <summary>The studies that are not deleted, the last changed first.</summary>
    /// <param name="search">Part of the name, without case; null or empty for all.</param>
    Task<IReadOnlyList<StudySummary>> ListAsync(string? search = null);

    /// <summary>One study, or null where there is none (or it is deleted).</summary>
    Task<Study?> FindAsync(Guid id);

    /// <summary>Creates an empty study with a model that has no end-members yet.</summary>
    /// <param name="name">1 to 200 characters.</param>
    /// <exception cref="ArgumentException">The name is empty or too long.</exception>
    Task<Guid> CreateAsync(string name);

    /// <summary>Renames a study.</summary>
    Task RenameAsync(Guid id, string name);

    /// <summary>Copies a study with its cruises, draft and runs; the new one's id.</summary>
    Task<Guid> DuplicateAsync(Guid id, string name);

    /// <summary>Hides a study; <see cref="RestoreAsync"/> brings it back, nothing stored is lost.</summary>
    Task DeleteAsync(Guid id);

    /// <summary>Undoes <see cref="DeleteAsync"/>.</summary>
    Task RestoreAsync(Guid id);

    /// <summary>Saves the model that is being edited. The draft may be incomplete: <see cref="ModelCheck"/> says what it lacks.</summary>
    /// <param name="id">The study.</param>
    /// <param name="draft">The model with its set inline.</param>
    /// <param name="expectedRevision">The revision that the edit began from.</param>
    /// <returns>The new revision, or null where another tab has saved since; nothing is then written.</returns>
    Task<long?> SaveDraftAsync(Guid id, MixingModel draft, long expectedRevision);
}
