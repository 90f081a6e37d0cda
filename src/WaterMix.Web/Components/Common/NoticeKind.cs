namespace WaterMix.Web.Components.Common;

/// <summary>How much a message on a page weighs.</summary>
public enum NoticeKind
{
    /// <summary>Something was done, or is worth knowing.</summary>
    Note,

    /// <summary>The work goes on, but something is affected.</summary>
    Warning,

    /// <summary>Something did not happen, and what to do.</summary>
    Error,
}
