namespace WaterMix.Web.State;

/// <summary>A line of the list of studies, in words.</summary>
/// <param name="Id">The study.</param>
/// <param name="Name">Its name.</param>
/// <param name="Samples">Number of samples.</param>
/// <param name="Runs">Number of runs.</param>
/// <param name="Changed">When anything in it last changed.</param>
public sealed record StudyLine(Guid Id, string Name, string Samples, string Runs, string Changed)
{
    /// <summary>What <see cref="Samples"/> counts.</summary>
    public string SamplesWord => Samples == "1" ? "sample" : "samples";

    /// <summary>What <see cref="Runs"/> counts.</summary>
    public string RunsWord => Runs == "1" ? "run" : "runs";
}
