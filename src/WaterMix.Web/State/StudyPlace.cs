namespace WaterMix.Web.State;

/// <summary>Where in a study a person is, as the address says.</summary>
/// <param name="Study">The study.</param>
/// <param name="Page">The last part of the page's path, such as <c>samples</c>; empty where there is none.</param>
public sealed record StudyPlace(Guid Study, string Page)
{
    /// <summary>The place that an address names, or null where it is outside any study.</summary>
    /// <param name="relativePath">The path without the base address, with or without a query: <c>studies/{id}/samples?cruise=...</c>.</param>
    public static StudyPlace? Of(string relativePath)
    {
        ArgumentNullException.ThrowIfNull(relativePath);
        string[] parts = relativePath.Split('?', '#')[0].Split('/', StringSplitOptions.RemoveEmptyEntries);
        return parts.Length >= 2 && parts[0] == "studies" && Guid.TryParse(parts[1], out Guid study)
            ? new StudyPlace(study, parts.Length > 2 ? parts[2] : "")
            : null;
    }
}
