using System.Globalization;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Core.Seawater;

/// <summary>
/// Derived columns of one table. Each quantity has a list of paths; a sample takes the first that gives it a value. Columns are made
/// once, however many others need them.
/// </summary>
internal sealed class Derivation(SampleTable table, DerivedTracerFactors factors)
{
    private readonly Dictionary<string, SampleColumn?> _made = new(StringComparer.Ordinal);
    private readonly List<Finding> _notes = [];

    /// <summary>What the paths had to say so far.</summary>
    public IReadOnlyList<Finding> Notes => _notes;

    /// <summary>The best column for a quantity: derived where it can be, else the table's own; null where there is neither.</summary>
    public SampleColumn? Column(Quantity quantity)
    {
        if (!_made.TryGetValue(quantity.Id, out SampleColumn? column))
        {
            column = Make(quantity, Paths(quantity), Formula(quantity));
            _made.Add(quantity.Id, column);
        }

        return column;
    }

    /// <summary>The column that another is computed from: pressure and practical salinity as filled in, anything else as the table has it.</summary>
    public SampleColumn? Needed(Quantity quantity) =>
        quantity == Quantity.Pressure || quantity == Quantity.PracticalSalinity ? Column(quantity) : Own(quantity);

    /// <summary>The potential density anomaly of EOS-80, as a column of its own beside TEOS-10's.</summary>
    public SampleColumn Eos80Anomaly(Quantity sigma, double referencePressure)
    {
        SampleColumn? t = Own(Quantity.InSituTemperature);
        SampleColumn? p = Column(Quantity.Pressure);
        DerivationPath?[] paths =
        [
            DerivationPath.Over("EOS-80", [t, Column(Quantity.PracticalSalinity), p], c => row =>
                Eos80.PotentialAnomaly(c[1].Values[row], c[0].Values[row], c[2].Values[row], referencePressure)),
            DerivationPath.Over("EOS-80", [Column(Quantity.PotentialTemperature), Column(Quantity.PracticalSalinity)], c => row =>
                LacksOne(t, p, row) ? Eos80.PotentialAnomaly(c[1].Values[row], c[0].Values[row], 0, referencePressure) : double.NaN),
        ];
        string formula = string.Create(CultureInfo.InvariantCulture, $"EOS-80, reference {referencePressure} dbar");
        return Make(sigma, paths, formula, "_eos80")
            ?? new SampleColumn(sigma, Missing(table.RowCount)) { Suffix = "_eos80", Source = "nothing to derive it from", Conversion = formula };
    }

    private DerivationPath?[] Paths(Quantity quantity) => quantity.Id switch
    {
        "pressure" =>
        [
            DerivationPath.Own(Own(Quantity.Pressure)),
            DerivationPath.Over(
                "TEOS-10",
                [Own(Quantity.Depth), Own(Quantity.Latitude)],
                c => row => SeaPressure.FromDepth(c[0].Values[row], c[1].Values[row]),
                DerivationNotes.PressureFromDepth),
        ],
        "depth" =>
        [
            DerivationPath.Own(Own(Quantity.Depth)),
            DerivationPath.Over(
                "TEOS-10",
                [Own(Quantity.Pressure), Own(Quantity.Latitude)],
                c => row => Depth.FromPressure(c[0].Values[row], c[1].Values[row])),
        ],
        "practical_salinity" =>
        [
            DerivationPath.Own(Own(Quantity.PracticalSalinity)),
            DerivationPath.Over("TEOS-10", [Own(Quantity.AbsoluteSalinity), .. Place()], c => row =>
                PracticalSalinity.FromAbsolute(c[0].Values[row], c[1].Values[row], c[2].Values[row], c[3].Values[row])),
        ],
        "absolute_salinity" =>
        [
            DerivationPath.Over("TEOS-10", [Own(Quantity.PracticalSalinity), .. Place()], c => row =>
                AbsoluteSalinity.FromPractical(c[0].Values[row], c[1].Values[row], c[2].Values[row], c[3].Values[row])),
            DerivationPath.Own(Own(Quantity.AbsoluteSalinity), DerivationNotes.OwnValues(quantity)),
        ],
        "conservative_temperature" =>
        [
            DerivationPath.Over("TEOS-10", InSitu(Quantity.AbsoluteSalinity), c => row =>
                ConservativeTemperature.FromInSitu(c[1].Values[row], c[0].Values[row], c[2].Values[row])),
            DerivationPath.Own(Own(Quantity.ConservativeTemperature), DerivationNotes.OwnValues(quantity)),
            DerivationPath.Over(
                "TEOS-10",
                [Own(Quantity.PotentialTemperature), Column(Quantity.AbsoluteSalinity)],
                c => row => ConservativeTemperature.FromPotential(c[1].Values[row], c[0].Values[row]),
                DerivationNotes.FromOtherTemperature(quantity, Quantity.PotentialTemperature)),
        ],
        "potential_temperature" => PotentialTemperaturePaths(quantity),
        "sigma0" => DensityPaths(quantity, 0),
        "sigma1" => DensityPaths(quantity, 1000),
        "sigma2" => DensityPaths(quantity, 2000),
        "sigma3" => DensityPaths(quantity, 3000),
        "sigma4" => DensityPaths(quantity, 4000),
        "apparent_oxygen_utilisation" =>
        [
            DerivationPath.Over(
                "derived",
                [Own(Quantity.Oxygen), Column(Quantity.PracticalSalinity), Column(Quantity.PotentialTemperature)],
                c => row => DerivedTracers.ApparentOxygenUtilisation(c[0].Values[row], c[1].Values[row], c[2].Values[row])),
            DerivationPath.Own(Own(quantity), DerivationNotes.OwnValues(quantity)),
        ],
        "no" => TracerPaths(quantity, Quantity.Oxygen, Quantity.Nitrate, DerivedTracers.No),
        "po" => TracerPaths(quantity, Quantity.Oxygen, Quantity.Phosphate, DerivedTracers.Po),
        "n_star" => TracerPaths(quantity, Quantity.Nitrate, Quantity.Phosphate, DerivedTracers.NStar),
        "po4_star" => TracerPaths(quantity, Quantity.Phosphate, Quantity.Oxygen, DerivedTracers.Po4Star),
        _ => [DerivationPath.Own(Own(quantity))],
    };

    /// <summary>A file's own potential temperature is used only where in-situ temperature or pressure is missing, and so is its Conservative Temperature.</summary>
    private DerivationPath?[] PotentialTemperaturePaths(Quantity quantity)
    {
        SampleColumn? t = Own(Quantity.InSituTemperature);
        SampleColumn? p = Column(Quantity.Pressure);
        SampleColumn? own = Own(quantity);
        return
        [
            DerivationPath.Over("TEOS-10", InSitu(Quantity.AbsoluteSalinity), c => row =>
                PotentialTemperature.FromInSitu(c[1].Values[row], c[0].Values[row], c[2].Values[row])),
            DerivationPath.Over(
                "TEOS-10, reference salinity,",
                InSitu(Quantity.PracticalSalinity),
                c => row => PotentialTemperature.FromInSitu(
                    ReferenceSalinity.FromPractical(c[1].Values[row]), c[0].Values[row], c[2].Values[row]),
                DerivationNotes.ReferenceSalinityStoodIn),
            DerivationPath.Own(own, DerivationNotes.OwnValues(quantity)) is { } path
                ? path with { Value = row => LacksOne(t, p, row) ? own!.Values[row] : double.NaN }
                : null,
            DerivationPath.Over(
                "TEOS-10",
                [Own(Quantity.ConservativeTemperature), Column(Quantity.AbsoluteSalinity)],
                c => row => LacksOne(t, p, row)
                    ? PotentialTemperature.FromConservative(c[1].Values[row], c[0].Values[row])
                    : double.NaN,
                DerivationNotes.FromOtherTemperature(quantity, Quantity.ConservativeTemperature)),
        ];
    }

    private DerivationPath?[] DensityPaths(Quantity quantity, double referencePressure) =>
    [
        DerivationPath.Over(
            "TEOS-10",
            [Column(Quantity.AbsoluteSalinity), Column(Quantity.ConservativeTemperature)],
            c => row => Density.PotentialAnomaly(c[0].Values[row], c[1].Values[row], referencePressure)),
        DerivationPath.Own(Own(quantity), DerivationNotes.OwnValues(quantity)),
    ];

    private DerivationPath?[] TracerPaths(Quantity quantity, Quantity first, Quantity second, Func<double, double, DerivedTracerFactors, double> formula) =>
    [
        DerivationPath.Over("derived", [Own(first), Own(second)], c => row => formula(c[0].Values[row], c[1].Values[row], factors)),
        DerivationPath.Own(Own(quantity), DerivationNotes.OwnValues(quantity)),
    ];

    private string Formula(Quantity quantity) => quantity.Id switch
    {
        "apparent_oxygen_utilisation" => "AOU = O2 solubility at practical salinity and potential temperature - O2",
        "no" => string.Create(CultureInfo.InvariantCulture, $"NO = O2 + {factors.NoOxygenPerNitrate} NO3"),
        "po" => string.Create(CultureInfo.InvariantCulture, $"PO = O2 + {factors.PoOxygenPerPhosphate} PO4"),
        "n_star" => string.Create(CultureInfo.InvariantCulture, $"N* = NO3 - {factors.NStarNitratePerPhosphate} PO4 + ({factors.NStarOffset})"),
        "po4_star" => string.Create(CultureInfo.InvariantCulture, $"PO4* = PO4 + O2 / {factors.Po4StarOxygenPerPhosphate} + ({factors.Po4StarOffset})"),
        _ => "",
    };

    private SampleColumn? Own(Quantity quantity) => table.Find(quantity);

    private SampleColumn?[] InSitu(Quantity salinity) =>
        [Own(Quantity.InSituTemperature), Column(salinity), Column(Quantity.Pressure)];

    private SampleColumn?[] Place() => [Column(Quantity.Pressure), Own(Quantity.Longitude), Own(Quantity.Latitude)];

    private static bool LacksOne(SampleColumn? a, SampleColumn? b, int row) =>
        a is null || b is null || double.IsNaN(a.Values[row]) || double.IsNaN(b.Values[row]);

    /// <summary>The column by the first path that gives a value, row by row; null where there is no path. The table's own column itself if that is all there is.</summary>
    private SampleColumn? Make(Quantity quantity, DerivationPath?[] candidates, string formula, string suffix = "")
    {
        DerivationPath[] paths = [.. candidates.OfType<DerivationPath>()];
        if (paths.Length == 0)
        {
            return null;
        }

        if (paths.Length == 1 && paths[0].Inputs is [SampleColumn only] && ReferenceEquals(only, Own(quantity)))
        {
            return only;
        }

        int n = table.RowCount;
        bool flagged = paths.Any(path => path.Inputs.Any(input => input.HasFlags));
        double[] values = Missing(n);
        byte[]? flags = flagged ? new byte[n] : null;
        ValueOrigin[]? origins = flagged ? new ValueOrigin[n] : null;
        var used = new long[paths.Length];
        for (int row = 0; row < n; row++)
        {
            int taken = 0;
            double value = paths[0].Value(row);
            while (double.IsNaN(value) && ++taken < paths.Length)
            {
                value = paths[taken].Value(row);
            }

            if (taken < paths.Length)
            {
                values[row] = value;
                used[taken]++;
            }

            if (flagged)
            {
                (flags![row], origins![row]) = taken < paths.Length ? paths[taken].WorstFlag(row) : (QualityFlags.NotSampled, ValueOrigin.None);
            }
        }

        for (int i = 0; i < paths.Length; i++)
        {
            if (used[i] > 0 && paths[i].Note is { } note)
            {
                _notes.Add(note with { Count = used[i] });
            }
        }

        return new SampleColumn(quantity, values, flags, origins, paths[0].Inputs[0].Origin)
        {
            Suffix = suffix,
            Source = string.Join("; else ", paths.Select(path => path.How)),
            Conversion = formula,
        };
    }

    private static double[] Missing(int count)
    {
        var values = new double[count];
        Array.Fill(values, double.NaN);
        return values;
    }
}
