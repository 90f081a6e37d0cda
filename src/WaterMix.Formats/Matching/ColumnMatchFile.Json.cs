using System.Text.Json.Nodes;
using WaterMix.Core.Samples;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.Matching;

public sealed partial record ColumnMatchFile
{
    private static readonly (string Word, ValueOrigin Value)[] OriginWords = [("bottle", ValueOrigin.Bottle), ("ctd", ValueOrigin.Ctd)];

    private static readonly string[] Meanings = ["quantity", "identity", "ignore"];

    private static readonly string[] IdentityIds = [.. IdentityColumn.Ids, "date", "bottle_flag"];

    private static readonly (string Word, char Value)[] Delimiters = [(",", ','), (";", ';'), ("\t", '\t'), ("|", '|'), (" ", ' ')];

    private static readonly (string Word, char Value)[] DecimalMarks = [(".", '.'), (",", ',')];

    /// <summary>Reads a match file strictly: unknown keys, wrong types and contradictions are findings, all of them at once.</summary>
    /// <param name="utf8">The file's bytes.</param>
    /// <param name="fileName">The file's name for findings.</param>
    /// <returns>The match, or null where a finding is an error.</returns>
    public static Reading<ColumnMatchFile> Read(ReadOnlySpan<byte> utf8, string fileName)
    {
        StrictJsonDocument document = StrictJsonDocument.Parse(utf8, fileName);
        return document.Finish(document.Root is null ? null : OfRoot(document.Root));
    }

    /// <summary>Writes the match: UTF-8, lines ended by LF; what is absent in the match is absent in the file.</summary>
    public byte[] Write()
    {
        var root = new JsonObject { ["schema"] = Schema };
        Set(root, "delimiter", Delimiter?.ToString());
        Set(root, "decimalMark", DecimalMark == '.' ? null : DecimalMark.ToString());
        if (Missing.Count > 0)
        {
            root["missing"] = JsonValues.Array(Missing);
        }

        root["columns"] = new JsonArray([.. Columns.Select(ToJson)]);
        return PrettyJson.Write(root);
    }

    private static ColumnMatchFile? OfRoot(StrictJsonNode node)
    {
        if (node.Child("schema") is { } schema && !SchemaName.Check(schema, Schema))
        {
            return null;
        }

        if (node.AsObject("schema", "delimiter", "decimalMark", "missing", "columns") is not { } file)
        {
            return null;
        }

        file.Required("schema");
        char? delimiter = file.Optional("delimiter")?.AsChoice(Delimiters);
        char? decimalMark = file.Optional("decimalMark")?.AsChoice(DecimalMarks);
        if (decimalMark == ',' && (delimiter ?? ',') == ',')
        {
            file.Optional("decimalMark")!.Report("a decimal mark that is not the delimiter", "',' for both", "Declare the delimiter too, such as \";\".");
        }

        IReadOnlyList<StrictJsonNode> items = file.Required("columns")?.AsList() ?? [];
        var columns = new List<ColumnMatch>(items.Count);
        foreach (StrictJsonNode item in items)
        {
            if (OfColumn(item) is { } match)
            {
                if (columns.Exists(c => c.Column == match.Column))
                {
                    item.Report("every column once", $"\"{match.Column}\" a second time", "Delete one of the two.");
                }

                columns.Add(match);
            }
        }

        return new ColumnMatchFile(columns) { Delimiter = delimiter, DecimalMark = decimalMark ?? '.', Missing = JsonValues.Texts(file.Optional("missing")) };
    }

    private static ColumnMatch? OfColumn(StrictJsonNode node)
    {
        if (node.AsObject("column", "quantity", "identity", "ignore", "unit", "unitColumn", "flag", "origin", "source") is not { } item)
        {
            return null;
        }

        string? column = item.Required("column")?.AsText();
        string? quantity = item.Optional("quantity")?.AsText();
        int? identity = item.Optional("identity")?.AsChoice(IdentityIds.Select((id, i) => (id, i)).ToArray());
        bool? ignore = item.Optional("ignore")?.AsBoolean();
        int said = Meanings.Count(key => item.Optional(key) is not null);
        if (said != 1 || ignore == false)
        {
            node.Report("one of \"quantity\", \"identity\" and \"ignore\": true", said == 0 ? "none" : ignore == false ? "\"ignore\": false" : "several", "Say what the column is, once.");
        }

        if (quantity is not null && quantity.Trim().Length == 0)
        {
            item.Optional("quantity")!.Report("a quantity's id, or a name of your own", "an empty text", "Name the quantity, or ignore the column.");
        }

        if (quantity is null)
        {
            foreach (string key in (string[])["unit", "unitColumn", "flag", "origin", "source"])
            {
                item.Optional(key)?.Report("this key beside \"quantity\" only", $"\"{key}\" on another column", "Delete the key.");
            }
        }

        return column is null ? null : new ColumnMatch(column.Trim())
        {
            Quantity = quantity,
            Identity = identity is { } i ? IdentityIds[i] : null,
            Unit = item.Optional("unit")?.AsText(),
            UnitColumn = item.Optional("unitColumn")?.AsText(),
            Flag = item.Optional("flag")?.AsText(),
            Origin = item.Optional("origin")?.AsChoice(OriginWords),
            Source = item.Optional("source")?.AsText(),
        };
    }

    private static JsonObject ToJson(ColumnMatch match)
    {
        var item = new JsonObject { ["column"] = match.Column };
        Set(item, "quantity", match.Quantity);
        Set(item, "identity", match.Identity);
        if (match.Ignore)
        {
            item["ignore"] = true;
        }

        Set(item, "unit", match.Unit);
        Set(item, "unitColumn", match.UnitColumn);
        Set(item, "flag", match.Flag);
        Set(item, "origin", match.Origin is { } origin ? JsonValues.Word(OriginWords, origin) : null);
        Set(item, "source", match.Source);
        return item;
    }

    private static void Set(JsonObject item, string key, string? value)
    {
        if (value is not null)
        {
            item[key] = value;
        }
    }
}
