using WaterMix.Core.Samples;

namespace WaterMix.Formats.Reading;

/// <summary>The densities that turn amounts per litre into amounts per kilogram.</summary>
internal interface IWaterDensity
{
    /// <summary>1 + sigma0 / 1000, kg/L, one value per sample; NaN where it cannot be known.</summary>
    /// <param name="samples">Position, pressure or depth, temperature and salinity.</param>
    /// <param name="accepted">The flags with which these may be used.</param>
    double[] Potential(SampleTable samples, AcceptedFlags accepted);

    /// <summary>The density at the laboratory's temperature and the pressure of the atmosphere, kg/L, one value per sample; NaN where it cannot be known.</summary>
    /// <param name="samples">Position, pressure or depth, temperature and salinity.</param>
    /// <param name="accepted">The flags with which these may be used.</param>
    /// <param name="temperature">The laboratory's temperature, degC.</param>
    double[] Laboratory(SampleTable samples, AcceptedFlags accepted, double temperature);
}
