namespace WaterMix.Workspace.Studies;

/// <summary>A line in the list of studies.</summary>
/// <param name="Id">The study.</param>
/// <param name="Name">Its name.</param>
/// <param name="Created">When it was created, UTC.</param>
/// <param name="LastChange">When anything in it last changed, UTC.</param>
/// <param name="CruiseCount">Number of cruises.</param>
/// <param name="SampleCount">Number of samples.</param>
/// <param name="RunCount">Number of runs.</param>
public sealed record StudySummary(Guid Id, string Name, DateTimeOffset Created, DateTimeOffset LastChange, int CruiseCount, long SampleCount, int RunCount);
