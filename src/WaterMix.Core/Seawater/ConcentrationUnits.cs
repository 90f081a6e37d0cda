namespace WaterMix.Core.Seawater;

/// <summary>Concentrations as laboratories report them, turned into umol/kg.</summary>
/// <remarks>NaN in gives NaN out. The factors of oxygen's older units are from memory and confirmed by the molar mass and volume of O2 in the tests.</remarks>
public static class ConcentrationUnits
{
    /// <summary>Oxygen: umol/L in 1 mL/L (gas at 0 degC and one atmosphere), from memory.</summary>
    public const double OxygenMicromolesPerMillilitre = 44.6596;

    /// <summary>Oxygen: umol/L in 1 mg/L, from memory.</summary>
    public const double OxygenMicromolesPerMilligram = 31.2512;

    /// <summary>Oxygen: umol O2/L in 1 ug-at O/L; nutrients have one atom of their element, and the factor 1. From memory.</summary>
    public const double OxygenMicromolesPerMicrogramAtom = 0.5;

    /// <summary>The temperature at which nutrients are taken to have been measured unless told otherwise, degC; common practice, no source.</summary>
    public const double DefaultLaboratoryTemperature = 20;

    /// <summary>
    /// Oxygen from umol/L to umol/kg: divided by 1 + sigma0 / 1000, since the sample is drawn and fixed at about its potential temperature.
    /// Common practice, no source.
    /// </summary>
    /// <param name="micromolesPerLitre">Oxygen, umol/L.</param>
    /// <param name="sigma0">Potential density anomaly of the sample referred to 0 dbar, kg/m3. Without a position, one from
    /// reference salinity serves: it changes the result by less than 1e-4 of itself.</param>
    public static double OxygenPerKilogram(double micromolesPerLitre, double sigma0) => micromolesPerLitre / (1 + (sigma0 / 1000));

    /// <summary>
    /// Nutrients from umol/L to umol/kg: divided by the density, kg/L, of the sample at the temperature of the laboratory and 0 dbar
    /// (TEOS-10, reference salinity). 5 degC in place of 20 changes the result by 0.28 %.
    /// </summary>
    /// <param name="micromolesPerLitre">Nutrient, umol/L.</param>
    /// <param name="practicalSalinity">Practical Salinity (PSS-78) of the sample, 0 to 42.</param>
    /// <param name="laboratoryTemperature">Temperature at which the volume was measured, degC (ITS-90), 0 to 40.</param>
    public static double NutrientPerKilogram(
        double micromolesPerLitre, double practicalSalinity, double laboratoryTemperature = DefaultLaboratoryTemperature)
    {
        double sa = ReferenceSalinity.FromPractical(practicalSalinity);
        double ct = ConservativeTemperature.FromPotential(sa, laboratoryTemperature);
        return micromolesPerLitre * 1000 / Density.FromConservative(sa, ct, 0);
    }
}
