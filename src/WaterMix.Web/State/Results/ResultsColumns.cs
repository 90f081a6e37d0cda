namespace WaterMix.Web.State.Results;

/// <summary>Which columns the table of samples shows beside those that say which sample it is.</summary>
public enum ResultsColumns
{
    /// <summary>Fractions, their sum, amounts of processes.</summary>
    Fractions,

    /// <summary>Residuals of the tracers.</summary>
    Residuals,

    /// <summary>How well the mixture fits.</summary>
    Fit,

    /// <summary>Every column.</summary>
    All,
}
