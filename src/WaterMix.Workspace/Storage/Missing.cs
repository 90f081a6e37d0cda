namespace WaterMix.Workspace.Storage;

/// <summary>What was asked for is not there.</summary>
internal static class Missing
{
    /// <summary>The exception that says so.</summary>
    /// <param name="what">What it is, such as "study".</param>
    public static ArgumentException Of(string what) =>
        new($"Expected a {what} that exists; this one does not, or was deleted. Go back to the list of studies.");
}
