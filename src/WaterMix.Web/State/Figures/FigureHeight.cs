namespace WaterMix.Web.State.Figures;

/// <summary>How tall a figure stands.</summary>
public enum FigureHeight
{
    /// <summary>The hero of a page: 480 px, 360 px on a narrow screen.</summary>
    Hero,

    /// <summary>One of several: 280 px.</summary>
    Small,

    /// <summary>A profile: 420 px.</summary>
    Tall,
}
