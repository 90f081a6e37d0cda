namespace WaterMix.Core.Samples;

/// <summary>Which instrument a value came from; it decides which table of quality flags its flag is read in.</summary>
public enum ValueOrigin : byte
{
    /// <summary>There is no value.</summary>
    None = 0,

    /// <summary>Water drawn from the bottle: WHP water-sample flags.</summary>
    Bottle = 1,

    /// <summary>The CTD's sensors: WHP CTD flags.</summary>
    Ctd = 2,
}
