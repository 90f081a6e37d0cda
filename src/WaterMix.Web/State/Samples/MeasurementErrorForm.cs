using System.Globalization;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Web.State.Figures;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.State.Samples;

/// <summary>The measurement errors of one cruise as they are typed: an absolute part in the tracer's unit and a part in per cent of the value.</summary>
public sealed class MeasurementErrorForm
{
    /// <summary>The errors of a cruise, one line per tracer that it has.</summary>
    /// <param name="cruise">The cruise.</param>
    /// <param name="model">The model's errors, for comparison.</param>
    public MeasurementErrorForm(Cruise cruise, IReadOnlyDictionary<string, MeasurementError> model)
    {
        ArgumentNullException.ThrowIfNull(cruise);
        ArgumentNullException.ThrowIfNull(model);
        (Cruise, Name) = (cruise.Id, cruise.Name);
        string[] measured = [.. cruise.Report.Columns.Select(c => c.Id).Where(id => IsTracer(cruise, id))];
        Lines =
        [
            .. measured.Concat(model.Keys).Concat(cruise.MeasurementSd?.Keys ?? []).Distinct(StringComparer.Ordinal)
                .Select(id => new MeasurementErrorLine(id, LabelOf(cruise, id), OfModel(model, id))
                {
                    Absolute = cruise.MeasurementSd?.TryGetValue(id, out MeasurementError? own) == true ? own.Absolute.ToString("R", CultureInfo.InvariantCulture) : "",
                    PerCent = cruise.MeasurementSd?.TryGetValue(id, out own) == true && own.Relative > 0 ? PerCentText(own.Relative) : "",
                }),
        ];
    }

    /// <summary>The cruise.</summary>
    public Guid Cruise { get; }

    /// <summary>Its name.</summary>
    public string Name { get; }

    /// <summary>The lines, in the order of the samples' columns.</summary>
    public IReadOnlyList<MeasurementErrorLine> Lines { get; }

    /// <summary>Reads what was typed; each line that cannot be read says why.</summary>
    /// <param name="errors">The errors of the lines that are filled; null where none is: the model's hold.</param>
    /// <returns>False where a line cannot be read.</returns>
    public bool TryRead(out IReadOnlyDictionary<string, MeasurementError>? errors)
    {
        var read = new Dictionary<string, MeasurementError>(StringComparer.Ordinal);
        foreach (MeasurementErrorLine line in Lines)
        {
            line.Problem = null;
            bool isNumber = ValueRange.TryParse(line.Absolute, out double? absolute) & ValueRange.TryParse(line.PerCent, out double? perCent);
            if (!isNumber)
            {
                line.Problem = "Type numbers with a decimal point, such as 0.5, or leave both empty for the model’s.";
            }
            else if (absolute is null && perCent is null)
            {
                continue;
            }
            else if (absolute is not > 0 || perCent < 0)
            {
                line.Problem = "The absolute part must be above 0 and the per cent part 0 or more; or leave both empty for the model’s.";
            }
            else
            {
                read[line.Id] = new MeasurementError(absolute.Value, (perCent ?? 0) / 100);
            }
        }

        errors = read.Count == 0 ? null : read;
        return Lines.All(l => l.Problem is null);
    }

    private static bool IsTracer(Cruise cruise, string id) =>
        (Quantity.Find(id) ?? Quantity.Further(id, "")) is { Use: TracerUse.Row } && !id.EndsWith("_bottle", StringComparison.Ordinal) && !id.EndsWith("_ctd", StringComparison.Ordinal)
        && cruise.Report.Columns.Any(c => c.Id == id && c.Values > 0);

    private static string LabelOf(Cruise cruise, string id)
    {
        string unit = FigureText.Unit(Quantity.Find(id)?.Unit ?? cruise.Report.Columns.FirstOrDefault(c => c.Id == id)?.Unit ?? "");
        return FigureText.Sentence(Quantity.FindOrFurther(id).Name) + (unit.Length > 0 ? $" ({unit})" : "");
    }

    private static string OfModel(IReadOnlyDictionary<string, MeasurementError> model, string id) =>
        !model.TryGetValue(id, out MeasurementError? error) ? "none"
        : error.Relative > 0 ? $"{FigureText.Number(error.Absolute, 3)} and {PerCentText(error.Relative)} %" : FigureText.Number(error.Absolute, 3);

    private static string PerCentText(double share) => (share * 100).ToString("0.######", CultureInfo.InvariantCulture);
}

/// <summary>The measurement error of one tracer as it is typed.</summary>
/// <param name="id">The tracer.</param>
/// <param name="label">Its name for people, with its unit.</param>
/// <param name="ofModel">The model's error in words.</param>
public sealed class MeasurementErrorLine(string id, string label, string ofModel)
{
    /// <summary>The tracer.</summary>
    public string Id { get; } = id;

    /// <summary>Its name for people, with its unit.</summary>
    public string Label { get; } = label;

    /// <summary>The model's error in words.</summary>
    public string OfModel { get; } = ofModel;

    /// <summary>The absolute part as typed, in the tracer's unit.</summary>
    public string Absolute { get; set; } = "";

    /// <summary>The part in per cent of the value, as typed.</summary>
    public string PerCent { get; set; } = "";

    /// <summary>Why it was not taken and what to do, or null.</summary>
    public string? Problem { get; set; }
}
