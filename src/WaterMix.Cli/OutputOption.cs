using System.CommandLine;
using System.CommandLine.Parsing;
using WaterMix.Formats.Reading;

namespace WaterMix.Cli;

/// <summary>Options that name a file to write.</summary>
internal static class OutputOption
{
    /// <summary>The option <c>--out</c> of a table, which is CSV.</summary>
    /// <param name="required">Whether it must be given; otherwise the results go to the standard output without it.</param>
    public static Option<string?> Table(bool required)
    {
        Option<string?> option = Create("--out", required ? "The file to write." : "The file to write; without it the results go to the standard output.", "FILE.csv", required);
        option.Validators.Add(result =>
        {
            foreach (string path in result.Tokens.Select(t => t.Value).Where(p => p.Length > 0 && !p.EndsWith(".csv", StringComparison.OrdinalIgnoreCase)))
            {
                result.AddError($"--out: expected a name that ends in .csv, the format that can be written; found '{path}'.");
            }
        });
        return option;
    }

    /// <summary>An option that names a file to write.</summary>
    /// <param name="name">The option's name.</param>
    /// <param name="description">What is written.</param>
    /// <param name="helpName">The file in the help.</param>
    /// <param name="required">Whether it must be given.</param>
    public static Option<string?> Create(string name, string description, string helpName, bool required)
    {
        var option = new Option<string?>(name) { Description = description, HelpName = helpName, Required = required };
        option.Validators.Add(result =>
        {
            foreach (string path in result.Tokens.Select(t => t.Value))
            {
                if (path.Length == 0)
                {
                    result.AddError($"{name}: expected the name of the file to write; found an empty name.");
                }
                else if (Directory.Exists(path))
                {
                    result.AddError($"{name}: expected the name of the file to write; found '{path}', which is a folder.");
                }
            }
        });
        return option;
    }

    /// <summary>Refuses an output that would replace a file which the command reads.</summary>
    /// <param name="command">The command.</param>
    /// <param name="output">Its output.</param>
    /// <param name="inputs">Its arguments and options that name files to read.</param>
    public static void MustNotBeRead(Command command, Symbol output, params IReadOnlyList<Symbol> inputs) =>
        command.Validators.Add(result =>
        {
            foreach (string written in Names(result, output))
            {
                string real = RealPath.Of(written);
                foreach (string read in inputs.SelectMany(input => Names(result, input)).Where(read => RealPath.Comparer.Equals(RealPath.Of(read), real)))
                {
                    result.AddError($"{output.Name}: expected the name of a file that the command does not read; found '{written}', which is the input '{read}'. Give the output another name.");
                }
            }
        });

    private static IEnumerable<string> Names(CommandResult result, Symbol symbol)
    {
        SymbolResult? given = symbol is Option option ? result.GetResult(option) : result.GetResult((Argument)symbol);
        return given?.Tokens.Select(t => t.Value).Where(path => path.Length > 0) ?? [];
    }
}
