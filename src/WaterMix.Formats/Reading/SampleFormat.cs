namespace WaterMix.Formats.Reading;

/// <summary>The kinds of sample file that are read here.</summary>
public enum SampleFormat
{
    /// <summary>WHP-Exchange bottle file, <c>WhpExchange</c>.</summary>
    ExchangeBottle,

    /// <summary>WHP-Exchange CTD cast, <c>WhpExchange</c>.</summary>
    ExchangeCtd,

    /// <summary>Any other CSV with one header line.</summary>
    Csv,
}
