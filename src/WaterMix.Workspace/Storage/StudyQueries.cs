using Microsoft.EntityFrameworkCore;

namespace WaterMix.Workspace.Storage;

/// <summary>What several services ask of the tables.</summary>
internal static class StudyQueries
{
    /// <summary>A study that is there and not deleted.</summary>
    /// <exception cref="ArgumentException">There is none.</exception>
    public static async Task<StudyRow> LivingAsync(this IQueryable<StudyRow> studies, Guid id) =>
        await studies.FirstOrDefaultAsync(s => s.Id == id && s.Deleted == null) ?? throw Missing.Of("study");

    /// <summary>Notes that something in a study has just changed.</summary>
    /// <exception cref="ArgumentException">There is no such study.</exception>
    public static async Task TouchAsync(this WorkspaceDbContext context, Guid study, TimeProvider clock) =>
        (await context.Studies.LivingAsync(study)).LastChange = clock.GetUtcNow();
}
