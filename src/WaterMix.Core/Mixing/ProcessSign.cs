namespace WaterMix.Core.Mixing;

/// <summary>The sign that a process's amount may have.</summary>
public enum ProcessSign
{
    /// <summary>amount >= 0.</summary>
    NonNegative,

    /// <summary>amount &lt;= 0.</summary>
    NonPositive,

    /// <summary>Any.</summary>
    Free,
}
