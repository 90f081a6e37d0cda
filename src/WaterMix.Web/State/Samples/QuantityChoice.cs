namespace WaterMix.Web.State.Samples;

/// <summary>A quantity that a figure can show.</summary>
/// <param name="Id">Its id, with a suffix where it is one instrument's original.</param>
/// <param name="Label">Its name for people, with its unit.</param>
/// <param name="IsDerived">True where it is computed from what was measured.</param>
public sealed record QuantityChoice(string Id, string Label, bool IsDerived);
