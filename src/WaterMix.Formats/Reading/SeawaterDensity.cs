using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;

namespace WaterMix.Formats.Reading;

/// <summary>Densities by TEOS-10.</summary>
internal sealed class SeawaterDensity : IWaterDensity
{
    /// <inheritdoc/>
    public double[] Potential(SampleTable samples, AcceptedFlags accepted)
    {
        SampleColumn? salinity = samples.Find(Quantity.PracticalSalinity);
        SampleColumn? temperature = samples.Find(Quantity.InSituTemperature);
        SampleColumn? pressure = samples.Find(Quantity.Pressure);
        SampleColumn? latitude = samples.Find(Quantity.Latitude);
        SampleColumn? longitude = samples.Find(Quantity.Longitude);
        double[] densities = new double[samples.RowCount];
        for (int i = 0; i < densities.Length; i++)
        {
            double p = At(pressure, i, accepted);
            double sa = AbsoluteSalinity.FromPractical(At(salinity, i, accepted), p, At(longitude, i, accepted), At(latitude, i, accepted));
            double ct = ConservativeTemperature.FromInSitu(sa, At(temperature, i, accepted), p);
            densities[i] = 1 + (Density.PotentialAnomaly(sa, ct, 0) / 1000);
        }

        return densities;
    }

    /// <inheritdoc/>
    public double[] Laboratory(SampleTable samples, AcceptedFlags accepted, double temperature)
    {
        SampleColumn? salinity = samples.Find(Quantity.PracticalSalinity);
        double[] densities = new double[samples.RowCount];
        for (int i = 0; i < densities.Length; i++)
        {
            double sa = ReferenceSalinity.FromPractical(At(salinity, i, accepted));
            densities[i] = Density.FromConservative(sa, ConservativeTemperature.FromPotential(sa, temperature), 0) / 1000;
        }

        return densities;
    }

    private static double At(SampleColumn? column, int row, AcceptedFlags accepted) => column?.UsableAt(row, accepted) ?? double.NaN;
}
