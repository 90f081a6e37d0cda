namespace WaterMix.Workspace.Cruises;

/// <summary>Consecutive samples of one file, so that a row of a cruise can be named by its file and its row there.</summary>
/// <param name="File">The file's name.</param>
/// <param name="First">Index of the first sample in the cruise, from 0.</param>
/// <param name="FirstFileRow">Number of that sample in its file, from 1.</param>
/// <param name="Count">Number of samples.</param>
public sealed record FileRows(string File, int First, long FirstFileRow, int Count);
