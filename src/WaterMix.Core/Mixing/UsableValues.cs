using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;

namespace WaterMix.Core.Mixing;

/// <summary>The values of a table that a model may use: derived where the table lacks them, and missing where their flag is not accepted.</summary>
internal sealed class UsableValues
{
    // Position and pressure stand in every result, so they count as used whatever the model reads.
    private static readonly string[] Places = [Quantity.Latitude.Id, Quantity.Longitude.Id, Quantity.Pressure.Id];

    private readonly AcceptedFlags _accepted;
    private readonly Dictionary<(string, DensityScale), SampleColumn?> _conditions = [];
    private readonly SampleColumn[] _checked;

    /// <summary>Derives what the model needs and looks its columns up.</summary>
    public UsableValues(PreparedModel model, SampleTable table)
    {
        _accepted = model.Accepted;
        (SampleTable derived, Notes) = SampleDerivation.Derive(table, model.QuantityIds, model.Model.Fit.Factors);
        Parents = [.. model.Transform.Parents.Select(derived.Find)];
        foreach (Condition condition in model.AllConditions)
        {
            _conditions[(condition.Quantity, condition.Scale)] = condition.Scale == DensityScale.Eos80
                ? SampleDerivation.Eos80Anomaly(derived, Quantity.FindOrFurther(condition.Quantity))
                : derived.Find(condition.Quantity);
        }

        _checked = [.. Places.Concat(model.InputIds).Select(derived.Find).Concat(Parents).Concat(_conditions.Values).OfType<SampleColumn>().Distinct()];
    }

    /// <summary>The column of each parent quantity, or null where there is none.</summary>
    public SampleColumn?[] Parents { get; }

    /// <summary>What the derivation noted.</summary>
    public IReadOnlyList<Finding> Notes { get; }

    /// <summary>The value of a parent quantity, NaN where it is missing or its flag is not accepted.</summary>
    public double Parent(int parent, int row) => Parents[parent]?.UsableAt(row, _accepted) ?? double.NaN;

    /// <summary>For each parent quantity, the number of samples with a usable value.</summary>
    /// <param name="rows">Number of samples.</param>
    public long[] CountUsable(int rows) =>
        [.. Parents.Select((_, parent) => Enumerable.Range(0, rows).LongCount(row => !double.IsNaN(Parent(parent, row))))];

    /// <summary>True where every condition holds for the sample.</summary>
    public bool Holds(IReadOnlyList<Condition> conditions, int row)
    {
        foreach (Condition condition in conditions)
        {
            if (!condition.Holds(Value(condition, row)))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>The value that a condition tests.</summary>
    public double Value(Condition condition, int row) =>
        _conditions[(condition.Quantity, condition.Scale)]?.UsableAt(row, _accepted) ?? double.NaN;

    /// <summary>The first column whose usable value is impossible in this row, or null.</summary>
    public SampleColumn? Impossible(int row)
    {
        foreach (SampleColumn column in _checked)
        {
            if (!column.Quantity.IsPossible(column.UsableAt(row, _accepted)))
            {
                return column;
            }
        }

        return null;
    }
}
