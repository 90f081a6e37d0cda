using System.Globalization;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;

namespace WaterMix.Web.State.Figures;

/// <summary>Everything known about one sample, as text ready to show.</summary>
public sealed record SampleCardText
{
    /// <summary>The sample in words.</summary>
    public required string Name { get; init; }

    /// <summary>Where and when it was taken, one fact each: label and value.</summary>
    public required IReadOnlyList<(string Label, string Value)> Place { get; init; }

    /// <summary>What became of it, as a sentence.</summary>
    public required string Status { get; init; }

    /// <summary>True where there are fractions to show.</summary>
    public bool HasFractions => Shares.Count > 0;

    /// <summary>The fractions of the sources, in the set's order; empty where the sample has none.</summary>
    public required IReadOnlyList<CardShare> Shares { get; init; }

    /// <summary>The sum of the fractions.</summary>
    public required string Sum { get; init; }

    /// <summary>The amounts of processes: name and amount with its unit.</summary>
    public required IReadOnlyList<(string Name, string Amount)> Amounts { get; init; }

    /// <summary>The measured values, those of the fit first.</summary>
    public required IReadOnlyList<CardTracer> Tracers { get; init; }

    /// <summary>How well the mixture fits: label and value.</summary>
    public required IReadOnlyList<(string Label, string Value)> Quality { get; init; }

    /// <summary>The card of a sample.</summary>
    /// <param name="columns">The samples and the results.</param>
    /// <param name="row">A row of all cruises, from 0.</param>
    public static SampleCardText Of(FigureColumns columns, int row)
    {
        ArgumentNullException.ThrowIfNull(columns);
        (int cruiseIndex, int own) = columns.Locate(row);
        FigureCruise cruise = columns.Cruises[cruiseIndex];
        MixingResult? result = cruise.Result;
        double[] fractions = result is null ? [] : [.. result.Fractions.Select(f => f[own])];
        bool solved = result is not null && !double.IsNaN(result.FractionSum[own]);
        return new SampleCardText
        {
            Name = FigureText.Sentence(columns.NameOf(row)),
            Place = [.. PlaceOf(columns, cruise, own, row)],
            Status = StatusSentence.Of(result?.Status[own], result?.Notes[own]),
            Shares = solved ? [.. SharesOf(result!.Model.Model.EndMembers, fractions)] : [],
            Sum = solved ? FigureText.Fixed(result!.FractionSum[own], 3) : "–",
            Amounts = result is null ? [] : [.. result.Model.Model.Processes.Select((p, k) => (p.Id, Amount(p, result.Amounts[k][own])))],
            Tracers = [.. TracersOf(columns, cruise, own, row, fractions)],
            Quality = result is null ? [] : [.. QualityOf(result, own)],
        };
    }

    private static IEnumerable<(string Label, string Value)> PlaceOf(FigureColumns columns, FigureCruise cruise, int own, int row)
    {
        double latitude = columns.Values(Quantity.Latitude.Id)[row];
        double longitude = columns.Values(Quantity.Longitude.Id)[row];
        yield return ("Position", $"{FigureText.Latitude(latitude)}, {FigureText.Longitude(longitude)}");
        yield return ("Pressure", FigureText.WithUnit(columns.Values(Quantity.Pressure.Id)[row], "dbar"));
        yield return ("Depth", FigureText.WithUnit(columns.Values(Quantity.Depth.Id)[row], "m"));
        foreach (IdentityColumn column in cruise.Samples.Identity.Where(c => c.Id is "time" or "expocode" or "section" && c[own].Length > 0))
        {
            yield return (FigureText.Sentence(column.Id), column[own]);
        }

        if (cruise.Result is { } result && result.Layer[own] >= 0)
        {
            yield return ("Layer", result.Model.LayerIds[result.Layer[own]]);
        }
    }

    private static IEnumerable<CardShare> SharesOf(EndMemberSet set, double[] fractions)
    {
        foreach ((int index, EndMember member) in set.EndMembers.Index())
        {
            double fraction = fractions[index];
            yield return new CardShare(
                member.Id,
                member.Name,
                SourceColours.At(index),
                double.IsNaN(fraction) ? 0 : Math.Clamp(fraction, 0, 1),
                double.IsNaN(fraction) ? "not permitted here" : FigureText.Fixed(fraction, 3));
        }
    }

    private static string Amount(Process process, double amount)
    {
        string unit = FigureText.Unit(Quantity.FindOrFurther(process.Per).Unit);
        return double.IsNaN(amount) ? "off" : $"{FigureText.WithUnit(amount, unit)} of {Quantity.FindOrFurther(process.Per).Name}";
    }

    private static IEnumerable<CardTracer> TracersOf(FigureColumns columns, FigureCruise cruise, int own, int row, double[] fractions)
    {
        MixingModel? model = cruise.Result?.Model.Model;
        IReadOnlyList<string> tracers = model?.Tracers ?? [];
        var observed = (cruise.Result?.Model.ParentIds ?? []).ToDictionary(id => id, id => columns.Values(id)[row], StringComparer.Ordinal);
        foreach ((int index, string tracer) in tracers.Index())
        {
            double residual = cruise.Result!.Residuals[index][own];
            double scale = double.IsNaN(residual) ? double.NaN : ResidualScale.Of(model!, tracer, observed, fractions);
            yield return Tracer(columns, cruise, tracer, own, row) with { Residual = Signed(residual, DecimalsOf(scale)), ResidualInSd = Signed(residual / scale, 1) };
        }

        foreach (SampleColumn column in cruise.Samples.Columns.Where(c => !tracers.Contains(c.Id) && !IsPlace(c.Quantity) && !double.IsNaN(c.Values[own])))
        {
            yield return Tracer(columns, cruise, column.Id, own, row);
        }
    }

    private static CardTracer Tracer(FigureColumns columns, FigureCruise cruise, string id, int own, int row)
    {
        SampleColumn? column = cruise.Samples.Find(id);
        Quantity quantity = columns.QuantityOf(id);
        double value = column is null ? columns.Values(id)[row] : column.Values[own];
        string origin = column is null
            ? (SampleDerivation.CanDerive(id) ? "derived" : "")
            : column.OriginAt(own) switch { ValueOrigin.Ctd => "CTD", ValueOrigin.Bottle => "bottle", _ => "" };
        string suffix = column is { Suffix.Length: > 0 } ? $" ({column.Suffix.TrimStart('_').Replace("ctd", "CTD", StringComparison.Ordinal)})" : "";
        string flag = column is null || column.FlagAt(own) == QualityFlags.NoFlag ? "" : column.FlagAt(own).ToString(CultureInfo.InvariantCulture);
        return new CardTracer(quantity.Name + suffix, FigureText.Unit(quantity.Unit), FigureText.Measured(value), flag, origin);
    }

    private static bool IsPlace(Quantity quantity) => quantity.Use == TracerUse.Never && quantity.Unit is "degrees north" or "degrees east" or "dbar" or "m";

    private static IEnumerable<(string Label, string Value)> QualityOf(MixingResult result, int own)
    {
        int freedom = result.DegreesOfFreedom[own];
        yield return ("Misfit", FigureText.Number(result.Misfit[own]));
        yield return ("χ²", FigureText.Number(result.Chi2[own]));
        yield return ("Degrees of freedom", freedom < 0 ? "–" : freedom.ToString(CultureInfo.InvariantCulture));
        yield return ("p", FigureText.Number(result.PValue[own], 2));
        yield return ("Mass residual", FigureText.Fixed(result.ResidualMass[own], 3));
        yield return ("Tracers used", result.TracerCount[own].ToString(CultureInfo.InvariantCulture));
    }

    /// <summary>Decimals that show two digits of a standard deviation; what is smaller than that says nothing.</summary>
    private static int DecimalsOf(double scale) => scale > 0 ? Math.Clamp(1 - (int)Math.Floor(Math.Log10(scale)), 0, 9) : 4;

    private static string Signed(double value, int decimals)
    {
        string text = FigureText.Fixed(value, decimals);
        return value > 0 && text.AsSpan().IndexOfAnyInRange('1', '9') >= 0 ? $"+{text}" : text;
    }
}

/// <summary>The fraction of one source on a card.</summary>
/// <param name="Id">The source's id.</param>
/// <param name="Name">Its name; may be empty.</param>
/// <param name="Colour">Its colour.</param>
/// <param name="Fraction">The length of its bar, 0 to 1.</param>
/// <param name="Text">The fraction, or that the source is not permitted.</param>
public sealed record CardShare(string Id, string Name, string Colour, double Fraction, string Text);

/// <summary>A measured value on a card.</summary>
/// <param name="Name">The quantity.</param>
/// <param name="Unit">Its unit; may be empty.</param>
/// <param name="Value">The value as measured, whatever its flag.</param>
/// <param name="Flag">Its quality flag; empty where it has none.</param>
/// <param name="Origin">bottle, CTD or derived.</param>
public sealed record CardTracer(string Name, string Unit, string Value, string Flag, string Origin)
{
    /// <summary>Observed minus fitted, in the unit; empty for what is not in the fit.</summary>
    public string Residual { get; init; } = "";

    /// <summary>The residual in standard deviations, <see cref="ResidualScale"/>; empty for what is not in the fit.</summary>
    public string ResidualInSd { get; init; } = "";
}
