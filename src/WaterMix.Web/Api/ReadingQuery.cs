using System.Globalization;
using WaterMix.Core;
using WaterMix.Core.Samples;
using WaterMix.Formats.Json;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;

namespace WaterMix.Web.Api;

/// <summary>The reading options of a request: the column match from the form, the rest from the address.</summary>
internal static class ReadingQuery
{
    /// <summary>The form field of the column match.</summary>
    public const string Columns = "columns";

    private const double HottestLaboratory = 40;

    /// <summary>The options, or null where one is not usable; its findings are added.</summary>
    /// <param name="acceptFlags">Water-sample flags with commas between, or null for 2,6.</param>
    /// <param name="laboratoryTemperature">Where nutrients per litre were measured, degC; null for 20.</param>
    /// <param name="form">May hold a column match.</param>
    /// <param name="findings">Where problems go.</param>
    public static ReadingOptions? Read(string? acceptFlags, double? laboratoryTemperature, ReceivedForm form, List<Finding> findings)
    {
        int before = findings.Count;
        AcceptedFlags flags = AcceptedFlags.Default;
        if (acceptFlags is not null)
        {
            if (Flags(acceptFlags) is { } given)
            {
                flags = new AcceptedFlags(given, flags.Ctd);
            }
            else
            {
                findings.Add(NotFlags("acceptFlags", acceptFlags));
            }
        }

        if (laboratoryTemperature is not (null or (>= 0 and <= HottestLaboratory)))
        {
            findings.Add(new Finding(
                Severity.Error,
                "laboratoryTemperature from 0 to 40 degC",
                laboratoryTemperature.Value.ToString(CultureInfo.InvariantCulture),
                "Give the temperature of the laboratory."));
        }

        ColumnMatchFile? match = null;
        foreach (StoredFile file in form[Columns].Take(1))
        {
            Reading<ColumnMatchFile> reading = ColumnMatchFile.Read(File.ReadAllBytes(file.Path), file.Name);
            findings.AddRange(reading.Findings);
            match = reading.Value;
        }

        return findings.Skip(before).Any(f => f.Severity == Severity.Error)
            ? null
            : new ReadingOptions { AcceptedFlags = flags, LaboratoryTemperature = laboratoryTemperature ?? 20, Match = match };
    }

    /// <summary>Flags such as <c>2,6</c>, or null where the text is none.</summary>
    public static int[]? Flags(string text)
    {
        int[] flags = [.. text.Split(',', StringSplitOptions.TrimEntries).Select(part => part.Length == 1 && char.IsAsciiDigit(part[0]) ? part[0] - '0' : -1)];
        return flags.Contains(-1) ? null : flags;
    }

    /// <summary>The finding for a text that is no list of flags.</summary>
    public static Finding NotFlags(string name, string text) =>
        new(Severity.Error, $"{name}: flags 0 to 9 with commas between, such as 2,6", $"'{text}'", "Correct the flags.");
}
