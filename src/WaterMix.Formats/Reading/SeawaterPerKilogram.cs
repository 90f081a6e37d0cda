using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;

namespace WaterMix.Formats.Reading;

/// <summary>The factors by TEOS-10.</summary>
internal sealed class SeawaterPerKilogram : IPerKilogram
{
    /// <inheritdoc/>
    /// <remarks>Where a sample has no position, its sigma0 is that of reference salinity, which changes the factor by less than 1e-4 of itself.</remarks>
    public double[] AtPotentialDensity(SampleTable samples, AcceptedFlags accepted)
    {
        SampleTable derived = SampleDerivation.Derive(samples, [Quantity.Sigma0.Id, Quantity.PotentialTemperature.Id, Quantity.PracticalSalinity.Id]).Table;
        SampleColumn? sigma0 = derived.Find(Quantity.Sigma0);
        SampleColumn? theta = derived.Find(Quantity.PotentialTemperature);
        SampleColumn? salinity = derived.Find(Quantity.PracticalSalinity);
        double[] factors = new double[samples.RowCount];
        for (int i = 0; i < factors.Length; i++)
        {
            double sigma = At(sigma0, i, accepted);
            if (double.IsNaN(sigma))
            {
                double sr = ReferenceSalinity.FromPractical(At(salinity, i, accepted));
                sigma = Density.PotentialAnomaly(sr, ConservativeTemperature.FromPotential(sr, At(theta, i, accepted)), 0);
            }

            factors[i] = ConcentrationUnits.OxygenPerKilogram(1, sigma);
        }

        return factors;
    }

    /// <inheritdoc/>
    public double[] InLaboratory(SampleTable samples, AcceptedFlags accepted, double temperature)
    {
        SampleColumn? salinity = SampleDerivation.Derive(samples, [Quantity.PracticalSalinity.Id]).Table.Find(Quantity.PracticalSalinity);
        double[] factors = new double[samples.RowCount];
        for (int i = 0; i < factors.Length; i++)
        {
            factors[i] = ConcentrationUnits.NutrientPerKilogram(1, At(salinity, i, accepted), temperature);
        }

        return factors;
    }

    private static double At(SampleColumn? column, int row, AcceptedFlags accepted) => column?.UsableAt(row, accepted) ?? double.NaN;
}
