namespace WaterMix.Formats.Json;

/// <summary>The <c>schema</c> of a file: <c>watermix/&lt;kind&gt;/&lt;version&gt;</c>.</summary>
internal static class SchemaName
{
    /// <summary>Checks the schema that a file names against the one that can be read.</summary>
    /// <returns>False where the rest of the file cannot be taken for what was asked; a finding then says so.</returns>
    public static bool Check(StrictJsonNode? schema, string readable)
    {
        if (schema is null || schema.AsText() is not { } found || found == readable)
        {
            return true;
        }

        string kind = readable[..readable.LastIndexOf('/')];
        string remedy = found.StartsWith(kind + "/", StringComparison.Ordinal)
            ? "This version of the program reads version 1; use a newer program, or save the file as version 1."
            : found.StartsWith("watermix/", StringComparison.Ordinal)
                ? "This is another kind of file; give the one that is asked for here."
                : $"Write \"{readable}\" if the file has that shape.";
        schema.Report($"the schema \"{readable}\"", $"\"{found}\"", remedy);
        return false;
    }
}
