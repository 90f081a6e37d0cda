using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Mixing;

/// <summary>A process with published ratios, to begin with.</summary>
/// <param name="Name">What it is, for people.</param>
/// <param name="Source">Where the ratios come from, in words.</param>
/// <param name="Process">The process with all its ratios.</param>
public sealed record ProcessPreset(string Name, string Source, Process Process)
{
    private static readonly string[] AlwaysKept = ["oxygen", "nitrate", "phosphate"];

    /// <summary>
    /// The presets. Ratios are changes seen in the sample. All from memory, not compared with the papers; the alkalinity of a process
    /// follows from its nitrate and phosphate (<c>WolfGladrow2007</c>).
    /// </summary>
    public static IReadOnlyList<ProcessPreset> All { get; } =
    [
        new("Respiration, oxygen 170 per phosphate", "Anderson and Sarmiento 1994, from memory", Of(
            "respiration", "phosphate", ("phosphate", 1), ("nitrate", 16), ("oxygen", -170), ("dissolved_inorganic_carbon", 117), ("total_alkalinity", -17))),
        new("Respiration, oxygen 138 per phosphate", "classic Redfield ratios, from memory", Of(
            "respiration", "phosphate", ("phosphate", 1), ("nitrate", 16), ("oxygen", -138), ("dissolved_inorganic_carbon", 106), ("total_alkalinity", -17))),
        new("Denitrification, where oxygen is below 10 \u00b5mol/kg", "Gruber and Sarmiento 1997, from memory; the oxygen limit is common practice, no source", Of(
            "denitrification", "phosphate", ("phosphate", 1), ("nitrate", -104), ("dissolved_inorganic_carbon", 106), ("total_alkalinity", 103)) with
        {
            Where = [new Condition("oxygen", null, 10)],
        }),
        new("Dissolution of opal", "by definition: silicate only", Of("opal", "silicate", ("silicate", 1))),
        new("Dissolution of calcium carbonate", "by definition: one carbon, two alkalinity", Of(
            "carbonate", "dissolved_inorganic_carbon", ("dissolved_inorganic_carbon", 1), ("total_alkalinity", 2))),
    ];

    /// <summary>The process for a model: what it counts, oxygen, nitrate and phosphate always; carbon and alkalinity only where they are fitted.</summary>
    /// <param name="model">The model.</param>
    public Process For(MixingModel model)
    {
        IReadOnlyList<string> parents = ModelEdits.Parents(model);
        return Process with
        {
            Ratios = Process.Ratios.Where(r => r.Key == Process.Per || AlwaysKept.Contains(r.Key) || parents.Contains(r.Key)).ToDictionary(StringComparer.Ordinal),
        };
    }

    /// <summary>The preset that a process's ratios equal, in what both have; null where there is none.</summary>
    /// <param name="process">The process.</param>
    public static ProcessPreset? Like(Process process)
    {
        ArgumentNullException.ThrowIfNull(process);
        return All.FirstOrDefault(p => p.Process.Per == process.Per
            && process.Ratios.Count > 0
            && process.Ratios.All(r => p.Process.Ratios.TryGetValue(r.Key, out double ratio) ? ratio == r.Value : r.Value == 0)
            && AlwaysKept.All(id => process.Ratios.GetValueOrDefault(id) == p.Process.Ratios.GetValueOrDefault(id)));
    }

    private static Process Of(string id, string per, params (string Quantity, double Ratio)[] ratios) =>
        new(id, per, ratios.ToDictionary(r => r.Quantity, r => r.Ratio, StringComparer.Ordinal));
}
