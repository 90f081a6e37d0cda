using System.CommandLine;

namespace WaterMix.Cli;

/// <summary>The option <c>--out</c>, which names a CSV file.</summary>
internal static class OutputOption
{
    /// <summary>The option.</summary>
    /// <param name="required">Whether it must be given; otherwise the results go to the standard output without it.</param>
    public static Option<string?> Create(bool required)
    {
        var option = new Option<string?>("--out")
        {
            Description = required ? "The file to write." : "The file to write; without it the results go to the standard output.",
            HelpName = "FILE.csv",
            Required = required,
        };
        option.Validators.Add(result =>
        {
            string? path = result.Tokens.Count > 0 ? result.Tokens[0].Value : null;
            if (path is not null && !path.EndsWith(".csv", StringComparison.OrdinalIgnoreCase))
            {
                result.AddError($"--out: expected a name that ends in .csv, the format that can be written; found '{path}'.");
            }
        });
        return option;
    }
}
