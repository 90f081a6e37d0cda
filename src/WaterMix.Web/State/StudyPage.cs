using Microsoft.AspNetCore.Components;

namespace WaterMix.Web.State;

/// <summary>A page of a study.</summary>
/// <param name="Slug">The last part of its path.</param>
/// <param name="Name">Its name in the navigation.</param>
public sealed record StudyPage(string Slug, string Name)
{
    private const string Template = "/studies/{id:guid}/";

    private static readonly StudyPage[] InOrder =
    [
        new("samples", "Samples"), new("end-members", "End-members"), new("mixing", "Mixing"), new("results", "Results"), new("cruise", "Cruise"),
    ];

    /// <summary>The pages that this build has, in the order of the work. The routes say which; a page that does not exist is not offered.</summary>
    public static IReadOnlyList<StudyPage> Existing { get; } = [.. InOrder.Where(page => Routes().Contains(Template + page.Slug))];

    /// <summary>The address of this page in a study, relative to the base address.</summary>
    /// <param name="study">The study.</param>
    public string AddressIn(Guid study) => $"studies/{study}/{Slug}";

    /// <summary>The address at which a study opens: its first page, or the list of studies where it has none.</summary>
    /// <param name="study">The study.</param>
    public static string FirstIn(Guid study) => Existing.Count == 0 ? "" : Existing[0].AddressIn(study);

    private static HashSet<string> Routes() => typeof(StudyPage).Assembly.GetTypes()
        .SelectMany(type => type.GetCustomAttributes(typeof(RouteAttribute), inherit: false).Cast<RouteAttribute>())
        .Select(route => route.Template)
        .ToHashSet(StringComparer.OrdinalIgnoreCase);
}
