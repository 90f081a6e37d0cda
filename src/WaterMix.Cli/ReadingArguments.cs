using System.CommandLine;
using System.CommandLine.Parsing;
using System.Globalization;
using WaterMix.Core;
using WaterMix.Core.Samples;
using WaterMix.Formats.Json;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;

namespace WaterMix.Cli;

/// <summary>The sample files and the reading options, alike in every command that reads samples.</summary>
internal sealed class ReadingArguments
{
    private readonly Argument<string[]> _samples = new("SAMPLES")
    {
        Description = "Sample files: WHP-Exchange bottle or CTD files, zip files of casts, CSV.",
        Arity = ArgumentArity.OneOrMore,
    };

    private readonly Option<string?> _columns = new("--columns")
    {
        Description = "A saved column match; 'watermix inspect --save-columns' writes one to correct.",
        HelpName = "MATCH.json",
    };

    private readonly Option<int[]> _acceptFlags = new("--accept-flags")
    {
        Description = "Water-sample flags with which a bottle value is used where bottle and CTD values are merged. Default 2,6.",
        HelpName = "FLAGS",
        CustomParser = ParseFlags,
        DefaultValueFactory = _ => [2, 6],
    };

    private readonly Option<double> _laboratoryTemperature = new("--laboratory-temperature")
    {
        Description = "Temperature at which nutrients per litre were measured, degC. Default 20.",
        HelpName = "DEGC",
        CustomParser = ParseTemperature,
        DefaultValueFactory = _ => 20,
    };

    /// <summary>The arguments that name files to read.</summary>
    public IReadOnlyList<Symbol> Files => [_samples, _columns];

    /// <summary>Adds the arguments to a command.</summary>
    public void AddTo(Command command)
    {
        UnknownOption.Refuse(_samples);
        command.Add(_samples);
        command.Add(_columns);
        command.Add(_acceptFlags);
        command.Add(_laboratoryTemperature);
    }

    /// <summary>The sample files.</summary>
    public string[] Samples(ParseResult parse) => parse.GetRequiredValue(_samples);

    /// <summary>The reading options, or null where the column match is not usable; its findings are added.</summary>
    public ReadingOptions? Options(ParseResult parse, List<Finding> findings)
    {
        ColumnMatchFile? match = null;
        if (parse.GetValue(_columns) is { } path)
        {
            const string What = "the column match";
            Reading<ColumnMatchFile> reading = NamedDocument.Read(path, What, file => JsonFile.Read(file, What, (bytes, name) => ColumnMatchFile.Read(bytes, name)));
            findings.AddRange(reading.Findings);
            if (reading.Value is null)
            {
                return null;
            }

            match = reading.Value;
        }

        return new ReadingOptions
        {
            AcceptedFlags = new AcceptedFlags(parse.GetRequiredValue(_acceptFlags), AcceptedFlags.Default.Ctd),
            LaboratoryTemperature = parse.GetRequiredValue(_laboratoryTemperature),
            Match = match,
        };
    }

    private static int[] ParseFlags(ArgumentResult result)
    {
        string text = string.Join(',', result.Tokens.Select(t => t.Value));
        int[] flags = [.. text.Split(',', StringSplitOptions.TrimEntries).Select(part => part.Length == 1 && char.IsAsciiDigit(part[0]) ? part[0] - '0' : -1)];
        if (flags.Contains(-1))
        {
            result.AddError($"--accept-flags: expected flags 0 to 9 with commas between, such as 2,6; found '{text}'.");
        }

        return flags;
    }

    private static double ParseTemperature(ArgumentResult result)
    {
        string text = result.Tokens[0].Value;
        if (!double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out double value) || !(value is >= 0 and <= 40))
        {
            result.AddError($"--laboratory-temperature: expected degrees Celsius between 0 and 40, such as 20; found '{text}'.");
        }

        return value;
    }
}
