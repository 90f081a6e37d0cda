using System.CommandLine;
using WaterMix.Core;
using WaterMix.Core.EndMembers;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.Json;

namespace WaterMix.Cli;

/// <summary><c>watermix convert-set SET.json --pair conservative --out NEW.json</c>: an end-member set in the other temperature and salinity pair.</summary>
internal static class ConvertSetCommand
{
    /// <summary>The command.</summary>
    public static Command Create()
    {
        var set = new Argument<string>("SET") { Description = "The end-member set; every end-member needs its position.", HelpName = "SET.endmembers.json" };
        var pair = new Option<string>("--pair") { Description = "conservative: Conservative Temperature and Absolute Salinity. potential: potential temperature and Practical Salinity.", HelpName = "PAIR", Required = true };
        pair.AcceptOnlyFromAmong("conservative", "potential");
        Option<string?> output = OutputOption.Create("--out", "The set to write.", "NEW.endmembers.json", required: true);
        var command = new Command("convert-set", "Writes an end-member set in the other temperature and salinity pair.") { set, pair, output };
        UnknownOption.Refuse(set);
        OutputOption.MustNotBeRead(command, output, set);
        command.SetAction(parse => Run(
            parse.GetRequiredValue(set),
            parse.GetRequiredValue(pair) == "conservative" ? TemperatureSalinityPair.ConservativeAndAbsolute : TemperatureSalinityPair.PotentialAndPractical,
            parse.GetRequiredValue(output)!));
        return command;
    }

    private static int Run(string path, TemperatureSalinityPair pair, string outputPath)
    {
        const string What = "the end-member set";
        Reading<EndMemberSet> reading = NamedDocument.Read(path, What, file => JsonFile.Read(file, What, (bytes, name) => EndMemberSetFile.Read(bytes, name)));
        if (reading.Value is null)
        {
            return Messages.NotUsable(reading.Findings);
        }

        ConvertedSet converted = TemperatureSalinityConversion.Convert(reading.Value, pair);
        IReadOnlyList<Finding> findings = [.. reading.Findings, .. converted.Findings.Select(f => f with { File = path })];
        if (converted.Set is null)
        {
            return Messages.NotUsable(findings);
        }

        using var output = new OutputFile(outputPath);
        output.WriteBytes(EndMemberSetFile.Write(converted.Set));
        output.Finish();
        Messages.Print(findings);
        return ExitStatus.Done;
    }
}
