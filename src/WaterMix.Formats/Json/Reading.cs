using WaterMix.Core;

namespace WaterMix.Formats.Json;

/// <summary>What a reader made of a file.</summary>
/// <typeparam name="T">What the file holds.</typeparam>
/// <param name="Value">The content, or null where a finding is an error.</param>
/// <param name="Findings">Everything found, by line; empty where there is nothing to say.</param>
public sealed record Reading<T>(T? Value, IReadOnlyList<Finding> Findings)
    where T : class;
