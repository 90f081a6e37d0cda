using System.Globalization;

namespace WaterMix.Web.State.Results;

/// <summary>A range as it is typed, before it becomes a <see cref="RowCondition"/>.</summary>
public sealed class ConditionForm
{
    /// <summary>The id of the column.</summary>
    public string Column { get; set; } = "";

    /// <summary>The lower bound as typed; empty for none.</summary>
    public string AtLeast { get; set; } = "";

    /// <summary>The upper bound as typed; empty for none.</summary>
    public string LessThan { get; set; } = "";

    /// <summary>What is wrong with what was typed and what to do, or null.</summary>
    public string? Problem { get; private set; }

    /// <summary>The condition, after which the form is empty; null where what was typed is none, and <see cref="Problem"/> says why.</summary>
    public RowCondition? Take()
    {
        Problem = null;
        double? low = Bound(AtLeast);
        double? high = Bound(LessThan);
        if (Problem is null && low is null && high is null)
        {
            Problem = "Type at least one bound, such as 0.5.";
        }
        else if (low >= high)
        {
            Problem = "No value can be in this range: the lower bound is not below the upper one.";
        }

        if (Problem is not null || Column.Length == 0)
        {
            return null;
        }

        (AtLeast, LessThan) = ("", "");
        return new RowCondition(Column, low, high);
    }

    private double? Bound(string text)
    {
        string typed = text.Trim().Replace('−', '-');
        if (typed.Length == 0)
        {
            return null;
        }

        if (double.TryParse(typed, NumberStyles.Float, CultureInfo.InvariantCulture, out double value) && double.IsFinite(value))
        {
            return value;
        }

        Problem = $"“{text.Trim()}” is not a number. Type one such as 0.5, with a point.";
        return null;
    }
}
