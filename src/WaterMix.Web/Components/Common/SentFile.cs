using System.Globalization;

namespace WaterMix.Web.Components.Common;

/// <summary>What has become of a file that a person chose.</summary>
public enum SendState
{
    /// <summary>Waiting for those before it.</summary>
    Waiting,

    /// <summary>On its way.</summary>
    Sending,

    /// <summary>Received whole.</summary>
    Received,

    /// <summary>Not taken; <see cref="SentFile.Problem"/> says why.</summary>
    Refused,
}

/// <summary>A file that a person chose, and how far it is.</summary>
/// <param name="Id">Its number on this page.</param>
/// <param name="Name">Its name.</param>
/// <param name="Bytes">Its size.</param>
public sealed record SentFile(int Id, string Name, long Bytes)
{
    /// <summary>What has become of it.</summary>
    public SendState State { get; init; }

    /// <summary>How far, 0 to 1.</summary>
    public double Fraction { get; init; }

    /// <summary>Why it was not taken and what to do, or null.</summary>
    public string? Problem { get; init; }

    /// <summary>The file and how far it is, in words.</summary>
    public string Words => State switch
    {
        SendState.Waiting => $"{Name}, {Size}, waiting",
        SendState.Sending => string.Create(CultureInfo.InvariantCulture, $"{Name}, {Size}, {Math.Floor(100 * Fraction):0} % sent"),
        SendState.Received => $"{Name}, {Size}, received",
        _ => Name,
    };

    private string Size => Bytes switch
    {
        < 1000 => string.Create(CultureInfo.InvariantCulture, $"{Bytes} bytes"),
        < 1_000_000 => string.Create(CultureInfo.InvariantCulture, $"{Bytes / 1e3:0} kB"),
        < 1_000_000_000 => string.Create(CultureInfo.InvariantCulture, $"{Bytes / 1e6:0.0} MB"),
        _ => string.Create(CultureInfo.InvariantCulture, $"{Bytes / 1e9:0.00} GB"),
    };
}
