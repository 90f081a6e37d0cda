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
        var output = new Option<string>("--out") { Description = "The set to write.", HelpName = "NEW.endmembers.json", Required = true };
        var command = new Command("convert-set", "Writes an end-member set in the other temperature and salinity pair.") { set, pair, output };
        command.SetAction(parse => Run(
            parse.GetRequiredValue(set),
            parse.GetRequiredValue(pair) == "conservative" ? TemperatureSalinityPair.ConservativeAndAbsolute : TemperatureSalinityPair.PotentialAndPractical,
            parse.GetRequiredValue(output)));
        return command;
    }

    private static int Run(string path, TemperatureSalinityPair pair, string outputPath)
    {
        Reading<EndMemberSet> reading = JsonFile.Read(path, "the end-member set", (bytes, name) => EndMemberSetFile.Read(bytes, name));
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
        output.Stream.Write(EndMemberSetFile.Write(converted.Set));
        output.Finish();
        Messages.Print(findings);
        return ExitStatus.Done;
    }
}
