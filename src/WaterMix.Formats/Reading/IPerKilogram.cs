using WaterMix.Core.Samples;

namespace WaterMix.Formats.Reading;

/// <summary>The factors that turn amounts per litre into amounts per kilogram.</summary>
internal interface IPerKilogram
{
    /// <summary>Litres in a kilogram at the potential density of each sample; NaN where it cannot be known.</summary>
    /// <param name="samples">Position, pressure or depth, temperature and salinity.</param>
    /// <param name="accepted">The flags with which these may be used.</param>
    double[] AtPotentialDensity(SampleTable samples, AcceptedFlags accepted);

    /// <summary>Litres in a kilogram of each sample at the laboratory's temperature; NaN where it cannot be known.</summary>
    /// <param name="samples">Salinity.</param>
    /// <param name="accepted">The flags with which it may be used.</param>
    /// <param name="temperature">The laboratory's temperature, degC.</param>
    double[] InLaboratory(SampleTable samples, AcceptedFlags accepted, double temperature);
}
