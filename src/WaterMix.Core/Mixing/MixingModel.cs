using WaterMix.Core.EndMembers;
using WaterMix.Core.Samples;

namespace WaterMix.Core.Mixing;

/// <summary>Everything that turns samples into fractions: sources, tracers, fit, mass conservation, processes, layers.</summary>
/// <param name="Name">The model's name.</param>
/// <param name="EndMembers">The end-member set.</param>
/// <param name="Tracers">Quantity ids of the rows of the fit, each once.</param>
/// <param name="Fit">How residuals are weighed.</param>
/// <param name="Mass">How mass is conserved.</param>
public sealed record MixingModel(
    string Name,
    EndMemberSet EndMembers,
    IReadOnlyList<string> Tracers,
    Fit Fit,
    MassConservation Mass)
{
    /// <summary>Where the set stands if the model names a file instead of holding it; relative to the model's file. Null: inline.</summary>
    public string? EndMembersFile { get; init; }

    /// <summary>The processes, in the order that results keep.</summary>
    public IReadOnlyList<Process> Processes { get; init; } = [];

    /// <summary>The layers; a sample belongs to the first that takes it. Empty: one layer <c>all</c> with every end-member.</summary>
    public IReadOnlyList<Layer> Layers { get; init; } = [];

    /// <summary>WHP water-sample flags that count as usable.</summary>
    public IReadOnlyList<int> AcceptFlags { get; init; } = [2, 6];

    /// <summary>WHP CTD flags that count as usable.</summary>
    public IReadOnlyList<int> AcceptCtdFlags { get; init; } = [2, 6, 7];

    /// <summary>Which value is preferred where a bottle's and a CTD's exist: bottle or CTD.</summary>
    public ValueOrigin Prefer { get; init; } = ValueOrigin.Bottle;
}

/// <summary>How residuals are weighed: <see cref="GeneralisedLeastSquares"/> or <see cref="WeightedRows"/>.</summary>
public abstract record Fit
{
    private protected Fit()
    {
    }

    /// <summary>Measurement error by quantity id (a parent quantity for a derived tracer). May be empty for weighted rows.</summary>
    public IReadOnlyDictionary<string, MeasurementError> MeasurementSd { get; init; } = new Dictionary<string, MeasurementError>();

    /// <summary>The factors of the derived tracers (NO, PO, N*, PO4*).</summary>
    public DerivedTracerFactors Factors { get; init; } = new();
}

/// <summary>One standard deviation of a measurement: variance = absolute^2 + (relative * observed)^2.</summary>
/// <param name="Absolute">In the quantity's unit, > 0.</param>
/// <param name="Relative">A fraction of the observed value, >= 0.</param>
public sealed record MeasurementError(double Absolute, double Relative = 0);

/// <summary>Minimise (d - Gx - By)' S^-1 (d - Gx - By), S from the errors of measurement and the spread within the sources.</summary>
public sealed record GeneralisedLeastSquares : Fit
{
    /// <summary>How the spread within the sources enters S.</summary>
    public EndMemberSpread Spread { get; init; } = EndMemberSpread.Iterated;

    /// <summary>A full measurement covariance over quantity ids, which takes the place of <see cref="Fit.MeasurementSd"/> for those; or null.</summary>
    public TracerMatrix? MeasurementCovariance { get; init; }
}

/// <summary>How the spread within the sources enters the covariance of a sample.</summary>
public enum EndMemberSpread
{
    /// <summary>Not at all: S is the measurement covariance.</summary>
    None,

    /// <summary>(1/n^2) sum V_i over the layer's n permitted end-members: one matrix for all samples of a layer.</summary>
    Fixed,

    /// <summary>sum x_i^2 V_i with the sample's own fractions, iterated to a fixed point.</summary>
    Iterated,
}

/// <summary>The published row-weighting recipes: standardise over the end-members, weigh, minimise the sum of squared rows.</summary>
/// <param name="Weights">Weight by tracer id, each > 0.</param>
public sealed record WeightedRows(IReadOnlyDictionary<string, double> Weights) : Fit
{
    /// <summary>What is done to a tracer row before it is weighed.</summary>
    public Standardisation Standardise { get; init; } = Standardisation.MeanAndSd;

    /// <summary>True: mean and sd are taken over the layer's permitted end-members; false: over the whole set.</summary>
    public StandardiseOver Over { get; init; } = StandardiseOver.Layer;

    /// <summary>The divisor of the variance.</summary>
    public SdDivisor SdOver { get; init; } = SdDivisor.N;

    /// <summary>Whether a weight multiplies the row or its square.</summary>
    public WeightMeaning WeightsAre { get; init; } = WeightMeaning.RowFactors;
}

/// <summary>What is done to a tracer row before it is weighed.</summary>
public enum Standardisation
{
    /// <summary>(value - mean) / sd over the end-members' values; process columns are divided by the sd only.</summary>
    MeanAndSd,

    /// <summary>value / sd.</summary>
    Sd,

    /// <summary>Nothing.</summary>
    None,
}

/// <summary>Which end-members a tracer's mean and sd are taken over.</summary>
public enum StandardiseOver
{
    /// <summary>Those permitted in the layer.</summary>
    Layer,

    /// <summary>All of the set.</summary>
    Set,
}

/// <summary>The divisor of the variance of n values.</summary>
public enum SdDivisor
{
    /// <summary>n: population.</summary>
    N,

    /// <summary>n - 1: sample.</summary>
    NMinus1,
}

/// <summary>Whether a weight multiplies the row or the square of the row.</summary>
public enum WeightMeaning
{
    /// <summary>The weight multiplies the row.</summary>
    RowFactors,

    /// <summary>The weight multiplies the square of the row: the row factor is its square root.</summary>
    Squared,
}

/// <summary>How mass is conserved.</summary>
/// <param name="Weight">Null: exactly, sum(x) = 1. Otherwise the factor of a row weight * (sum(x) - 1), > 0.</param>
public sealed record MassConservation(double? Weight)
{
    /// <summary>sum(x) = 1.</summary>
    public static readonly MassConservation Exact = new((double?)null);

    /// <summary>True where sum(x) = 1 holds exactly.</summary>
    public bool IsExact => Weight is null;
}

/// <summary>A biogeochemical column of the fit; its amount is solved with the fractions.</summary>
/// <param name="Id">As an end-member's id, unique together with those.</param>
/// <param name="Per">The quantity id that the amount counts; its own ratio is 1. Need not be a tracer of the fit.</param>
/// <param name="Ratios">Change seen in the sample per 1 of <paramref name="Per"/>, by quantity id.</param>
public sealed record Process(string Id, string Per, IReadOnlyDictionary<string, double> Ratios)
{
    /// <summary>The sign that the amount may have.</summary>
    public ProcessSign Sign { get; init; } = ProcessSign.NonNegative;

    /// <summary>Where the process acts: all conditions hold. Empty: everywhere.</summary>
    public IReadOnlyList<Condition> Where { get; init; } = [];
}

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

/// <summary>A domain with the end-members permitted in it.</summary>
/// <param name="Id">The layer's id, unique in the model.</param>
/// <param name="EndMembers">Ids of the permitted end-members.</param>
/// <param name="Where">All conditions hold for a sample of this layer. Empty: every sample.</param>
public sealed record Layer(string Id, IReadOnlyList<string> EndMembers, IReadOnlyList<Condition> Where);

/// <summary>A half-open range of a quantity: atLeast &lt;= value &lt; lessThan. Either bound may be absent; a missing value never holds.</summary>
/// <param name="Quantity">The quantity id.</param>
/// <param name="AtLeast">Lower bound, included, or null.</param>
/// <param name="LessThan">Upper bound, excluded, or null.</param>
public sealed record Condition(string Quantity, double? AtLeast, double? LessThan)
{
    /// <summary>Which equation of state a sigma condition tests.</summary>
    public DensityScale Scale { get; init; } = DensityScale.Teos10;

    /// <summary>True where the value is in the range; a longitude range whose start exceeds its end wraps round.</summary>
    /// <param name="value">The sample's value in the quantity's unit; NaN is missing.</param>
    public bool Holds(double value)
    {
        if (double.IsNaN(value))
        {
            return false;
        }

        bool above = AtLeast is not { } low || value >= low;
        bool below = LessThan is not { } high || value < high;
        bool wraps = Quantity == "longitude" && AtLeast > LessThan;
        return wraps ? above || below : above && below;
    }
}

/// <summary>The equation of state that a density threshold was published in.</summary>
public enum DensityScale
{
    /// <summary>TEOS-10.</summary>
    Teos10,

    /// <summary>EOS-80.</summary>
    Eos80,
}

/// <summary>The factors of the derived tracers.</summary>
public sealed record DerivedTracerFactors
{
    /// <summary>NO = O2 + this * NO3. Default 170/16, <c>AndersonSarmiento1994</c>.</summary>
    public double NoOxygenPerNitrate { get; init; } = 170.0 / 16.0;

    /// <summary>PO = O2 + this * PO4. Default 170, <c>AndersonSarmiento1994</c>.</summary>
    public double PoOxygenPerPhosphate { get; init; } = 170;

    /// <summary>N* = NO3 - this * PO4 + offset. Default 16.</summary>
    public double NStarNitratePerPhosphate { get; init; } = 16;

    /// <summary>The offset of N*, umol/kg. Default 2.9, <c>GruberSarmiento1997</c>.</summary>
    public double NStarOffset { get; init; } = 2.9;

    /// <summary>PO4* = PO4 + O2 / this + offset. Default 175, <c>Broecker1998</c>.</summary>
    public double Po4StarOxygenPerPhosphate { get; init; } = 175;

    /// <summary>The offset of PO4*, umol/kg. Default -1.95, <c>Broecker1998</c>.</summary>
    public double Po4StarOffset { get; init; } = -1.95;
}
