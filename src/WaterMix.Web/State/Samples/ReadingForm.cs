using System.Globalization;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;

namespace WaterMix.Web.State.Samples;

/// <summary>How the files of an import are read, as a person types it.</summary>
public sealed record ReadingForm
{
    /// <summary>The delimiter; <c>,</c> unless said.</summary>
    public char Delimiter { get; set; } = ',';

    /// <summary>The decimal mark.</summary>
    public char DecimalMark { get; set; } = '.';

    /// <summary>Texts that mean missing, one to a line.</summary>
    public string Missing { get; set; } = "";

    /// <summary>The temperature at which nutrients per litre were measured, degC.</summary>
    public string LaboratoryTemperature { get; set; } = "20";

    /// <summary>Accepted water-sample flags.</summary>
    public string Flags { get; set; } = "2, 6";

    /// <summary>Accepted CTD flags.</summary>
    public string CtdFlags { get; set; } = "2, 6, 7";

    /// <summary>The instrument that comes first.</summary>
    public ValueOrigin Prefer { get; set; } = ValueOrigin.Bottle;

    /// <summary>The delimiters to choose from.</summary>
    public static IReadOnlyList<(char Mark, string Name)> Delimiters { get; } = [(',', "comma"), (';', "semicolon"), ('\t', "tab"), ('|', "bar |"), (' ', "space")];

    /// <summary>The form of options that were used before.</summary>
    /// <param name="options">The options.</param>
    public static ReadingForm Of(ReadingOptions options)
    {
        ArgumentNullException.ThrowIfNull(options);
        return new ReadingForm
        {
            Delimiter = options.Match?.Delimiter ?? ',',
            DecimalMark = options.Match?.DecimalMark ?? '.',
            Missing = string.Join('\n', options.Match?.Missing ?? []),
            LaboratoryTemperature = options.LaboratoryTemperature.ToString("R", CultureInfo.InvariantCulture),
            Flags = FlagText.Of(options.AcceptedFlags.WaterSample),
            CtdFlags = FlagText.Of(options.AcceptedFlags.Ctd),
            Prefer = options.Prefer,
        };
    }

    /// <summary>What cannot be used as typed and what to do, a sentence each; empty where all is well.</summary>
    public IReadOnlyList<string> Problems()
    {
        var problems = new List<string>();
        if (DecimalMark == ',' && Delimiter == ',')
        {
            problems.Add("Commas cannot be both the delimiter and the decimal mark. Choose the delimiter that the file has, such as the semicolon.");
        }

        if (!ValueRange.TryParse(LaboratoryTemperature, out double? temperature) || temperature is not (>= -5 and <= 50))
        {
            problems.Add($"Laboratory temperature: expected degrees Celsius from −5 to 50, such as 20; found “{LaboratoryTemperature}”.");
        }

        if (FlagText.Parse(Flags) is null)
        {
            problems.Add(FlagText.Problem("Water-sample flags", Flags));
        }

        if (FlagText.Parse(CtdFlags) is null)
        {
            problems.Add(FlagText.Problem("CTD flags", CtdFlags));
        }

        return problems;
    }

    /// <summary>The options, with a column match; only where there are no <see cref="Problems"/>.</summary>
    /// <param name="columns">What is said of columns.</param>
    public ReadingOptions Options(IReadOnlyList<ColumnMatch> columns)
    {
        ArgumentNullException.ThrowIfNull(columns);
        _ = ValueRange.TryParse(LaboratoryTemperature, out double? temperature);
        ColumnMatchFile match = Match(columns);
        bool saysNothing = columns.Count == 0 && match is { Delimiter: null, DecimalMark: '.', Missing.Count: 0 };
        return new ReadingOptions
        {
            AcceptedFlags = new AcceptedFlags([.. FlagText.Parse(Flags) ?? []], [.. FlagText.Parse(CtdFlags) ?? []]),
            Prefer = Prefer,
            LaboratoryTemperature = temperature ?? 20,
            Match = saysNothing ? null : match,
        };
    }

    /// <summary>A column match with this form's marks, as a file keeps it.</summary>
    /// <param name="columns">What is said of columns.</param>
    public ColumnMatchFile Match(IReadOnlyList<ColumnMatch> columns) => new(columns)
    {
        Delimiter = Delimiter == ',' ? null : Delimiter,
        DecimalMark = DecimalMark,
        Missing = [.. Missing.Split('\n', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries)],
    };
}
