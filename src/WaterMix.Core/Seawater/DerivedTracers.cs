using WaterMix.Core.Mixing;

namespace WaterMix.Core.Seawater;

/// <summary>Combinations of measured tracers that respiration leaves nearly unchanged, and apparent oxygen utilisation; all in umol/kg.</summary>
/// <remarks>NaN in gives NaN out. Small negative nutrients are data and go through unchanged.</remarks>
public static class DerivedTracers
{
    /// <summary>AOU = O2 solubility(S_P, pt0) - O2; negative where the water is supersaturated.</summary>
    /// <param name="oxygen">Dissolved oxygen, umol/kg.</param>
    /// <param name="practicalSalinity">Practical Salinity (PSS-78), 0 to 42.</param>
    /// <param name="potentialTemperature">Potential temperature referred to 0 dbar, degC (ITS-90), freezing to 40.</param>
    public static double ApparentOxygenUtilisation(double oxygen, double practicalSalinity, double potentialTemperature) =>
        OxygenSolubility.FromPractical(practicalSalinity, potentialTemperature) - oxygen;

    /// <summary>NO = O2 + f NO3, <c>Broecker1974</c>.</summary>
    /// <param name="oxygen">Dissolved oxygen, umol/kg.</param>
    /// <param name="nitrate">Nitrate, umol/kg.</param>
    /// <param name="factors">The factors.</param>
    public static double No(double oxygen, double nitrate, DerivedTracerFactors factors) =>
        oxygen + (factors.NoOxygenPerNitrate * nitrate);

    /// <summary>PO = O2 + f PO4, <c>Broecker1974</c>.</summary>
    /// <param name="oxygen">Dissolved oxygen, umol/kg.</param>
    /// <param name="phosphate">Phosphate, umol/kg.</param>
    /// <param name="factors">The factors.</param>
    public static double Po(double oxygen, double phosphate, DerivedTracerFactors factors) =>
        oxygen + (factors.PoOxygenPerPhosphate * phosphate);

    /// <summary>N* = NO3 - f PO4 + offset, <c>GruberSarmiento1997</c>.</summary>
    /// <param name="nitrate">Nitrate, umol/kg.</param>
    /// <param name="phosphate">Phosphate, umol/kg.</param>
    /// <param name="factors">The factors.</param>
    public static double NStar(double nitrate, double phosphate, DerivedTracerFactors factors) =>
        nitrate - (factors.NStarNitratePerPhosphate * phosphate) + factors.NStarOffset;

    /// <summary>PO4* = PO4 + O2 / f + offset, <c>Broecker1998</c>.</summary>
    /// <param name="phosphate">Phosphate, umol/kg.</param>
    /// <param name="oxygen">Dissolved oxygen, umol/kg.</param>
    /// <param name="factors">The factors.</param>
    public static double Po4Star(double phosphate, double oxygen, DerivedTracerFactors factors) =>
        phosphate + (oxygen / factors.Po4StarOxygenPerPhosphate) + factors.Po4StarOffset;
}
