namespace WaterMix.Web.State.Mixing;

/// <summary>A part of the model, as the pages show it.</summary>
public enum ModelPlace
{
    /// <summary>The end-member set, on its own page.</summary>
    Sources,

    /// <summary>The tracers.</summary>
    Tracers,

    /// <summary>How residuals are weighed, with weights and row factors.</summary>
    Fit,

    /// <summary>The errors of measurement.</summary>
    Errors,

    /// <summary>The conservation of mass.</summary>
    Mass,

    /// <summary>The processes.</summary>
    Processes,

    /// <summary>The layers and the mask of the winter mixed layer.</summary>
    Layers,

    /// <summary>Flags, and bottle or CTD.</summary>
    Samples,
}
