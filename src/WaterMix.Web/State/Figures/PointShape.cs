namespace WaterMix.Web.State.Figures;

/// <summary>The shape of a mark, so that colour is never the only carrier.</summary>
public enum PointShape
{
    /// <summary>A disc.</summary>
    Circle,

    /// <summary>A square.</summary>
    Square,

    /// <summary>A square on its corner.</summary>
    Diamond,

    /// <summary>A triangle that points up.</summary>
    Triangle,

    /// <summary>A triangle that points down.</summary>
    TriangleDown,

    /// <summary>An upright cross.</summary>
    Plus,
}
