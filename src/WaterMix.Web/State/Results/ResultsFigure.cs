namespace WaterMix.Web.State.Results;

/// <summary>What the figure of the Results page shows.</summary>
public enum ResultsFigure
{
    /// <summary>A section of the fraction of each source.</summary>
    Fractions,

    /// <summary>A section of the amount of each process.</summary>
    Processes,

    /// <summary>A section of the residual of each tracer.</summary>
    Residuals,

    /// <summary>Sections of misfit, p and status.</summary>
    Fit,

    /// <summary>Fractions and tracers at one station against pressure.</summary>
    Profiles,

    /// <summary>One quantity against another, coloured by a result.</summary>
    Properties,
}
