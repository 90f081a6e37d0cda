using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Core.Seawater;

/// <summary>Adds derived quantities to a table of samples: pressure, temperatures, salinities, densities and derived tracers.</summary>
/// <remarks>
/// Each value is computed from what was measured where that is there; the file's own value of a derived quantity is used where it is
/// not. Pressure comes from depth and latitude where it is missing. Without latitude, longitude or pressure, Absolute Salinity,
/// Conservative Temperature and densities are missing; potential temperature is still derived, with reference salinity. A derived
/// value carries the worst flag of its inputs and that input's origin, so that the right table of flags is applied later; where no
/// input has flags it has none. Rows do not depend on one another: a block gives the same bits as the whole file.
/// </remarks>
public static class SampleDerivation
{
    private static readonly Quantity[] Densities = [Quantity.Sigma0, Quantity.Sigma1, Quantity.Sigma2, Quantity.Sigma3, Quantity.Sigma4];

    /// <summary>Quantities that can be derived, and what each is computed from in the first place.</summary>
    private static readonly Dictionary<string, Quantity[]> Needs = NeedsByQuantity();

    /// <summary>The same samples with derived columns.</summary>
    /// <param name="table">The samples, in canonical units.</param>
    /// <param name="wanted">Quantity ids to derive. Ids of measured quantities are left as they are.</param>
    /// <param name="factors">The factors of NO, PO, N* and PO4*; null for the defaults.</param>
    /// <returns>The table and the notes. A wanted quantity for which the table has no columns at all is not added, and noted.</returns>
    public static DerivedSamples Derive(SampleTable table, IReadOnlyList<string> wanted, DerivedTracerFactors? factors = null)
    {
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(wanted);

        var derivation = new Derivation(table, factors ?? new DerivedTracerFactors());
        Quantity[] derivable = [.. wanted.Distinct(StringComparer.Ordinal).Where(Needs.ContainsKey).Select(Quantity.FindOrFurther)];
        SampleColumn[] columns = [.. derivable.Select(derivation.Column).OfType<SampleColumn>().Where(c => !ReferenceEquals(c, table.Find(c.Id)))];
        IEnumerable<Finding> lacking = Lacking(table, derivation, derivable);
        return new DerivedSamples(columns.Length == 0 ? table : table.With(columns), [.. derivation.Notes, .. lacking]);
    }

    /// <summary>True where a quantity can be derived from others.</summary>
    /// <param name="id">A quantity id.</param>
    public static bool CanDerive(string id) => Needs.ContainsKey(id);

    /// <summary>These quantities, and the measured ones that those which can be derived are computed from in the first place.</summary>
    /// <param name="ids">Quantity ids.</param>
    public static IReadOnlySet<string> InputsOf(IReadOnlyList<string> ids)
    {
        ArgumentNullException.ThrowIfNull(ids);
        return ids.Concat(ids.SelectMany(id => Needs.GetValueOrDefault(id, [])).Select(q => q.Id)).ToHashSet(StringComparer.Ordinal);
    }

    /// <summary>
    /// A potential density anomaly of EOS-80, for thresholds published in it. It has the id of TEOS-10's with the suffix <c>_eos80</c>.
    /// </summary>
    /// <param name="table">The samples, in canonical units.</param>
    /// <param name="sigma">Which: sigma0 to sigma4.</param>
    /// <returns>The column, kg/m3; NaN where salinity or both in-situ temperature with pressure and potential temperature are missing.</returns>
    /// <exception cref="ArgumentException">The quantity is none of sigma0 to sigma4.</exception>
    public static SampleColumn Eos80Anomaly(SampleTable table, Quantity sigma)
    {
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(sigma);
        int kilodecibars = Array.IndexOf(Densities, sigma);
        if (kilodecibars < 0)
        {
            throw new ArgumentException($"EOS-80 has sigma0, sigma1, sigma2, sigma3 and sigma4; {sigma.Id} is none of them.", nameof(sigma));
        }

        return new Derivation(table, new DerivedTracerFactors()).Eos80Anomaly(sigma, 1000 * kilodecibars);
    }

    private static Dictionary<string, Quantity[]> NeedsByQuantity()
    {
        Quantity[] salinity = [Quantity.PracticalSalinity, Quantity.Pressure, Quantity.Longitude, Quantity.Latitude];
        Quantity[] inSitu = [Quantity.InSituTemperature, Quantity.PracticalSalinity, Quantity.Pressure];
        var needs = new Dictionary<string, Quantity[]>(StringComparer.Ordinal)
        {
            [Quantity.Pressure.Id] = [],
            [Quantity.Depth.Id] = [],
            [Quantity.PracticalSalinity.Id] = [],
            [Quantity.AbsoluteSalinity.Id] = salinity,
            [Quantity.ConservativeTemperature.Id] = [Quantity.InSituTemperature, .. salinity],
            [Quantity.PotentialTemperature.Id] = inSitu,
            [Quantity.ApparentOxygenUtilisation.Id] = [Quantity.Oxygen, .. inSitu],
            [Quantity.No.Id] = [Quantity.Oxygen, Quantity.Nitrate],
            [Quantity.Po.Id] = [Quantity.Oxygen, Quantity.Phosphate],
            [Quantity.NStar.Id] = [Quantity.Nitrate, Quantity.Phosphate],
            [Quantity.Po4Star.Id] = [Quantity.Phosphate, Quantity.Oxygen],
        };
        foreach (Quantity density in Densities)
        {
            needs.Add(density.Id, [Quantity.InSituTemperature, .. salinity]);
        }

        return needs;
    }

    /// <summary>Why values are missing: one finding for each needed quantity that samples lack, naming what is missing for it.</summary>
    private static IEnumerable<Finding> Lacking(SampleTable table, Derivation derivation, IReadOnlyList<Quantity> derivable)
    {
        var lacking = new Dictionary<Quantity, (List<string> Derived, long Count)>();
        var outside = new List<string>();
        long outsideCount = 0;
        foreach (Quantity quantity in derivable.Where(q => Needs[q.Id].Length > 0))
        {
            Quantity[] needs = Needs[quantity.Id];
            long[] counts = CountLacking(table.RowCount, derivation.Column(quantity), [.. needs.Select(derivation.Needed)]);
            for (int i = 0; i < needs.Length; i++)
            {
                if (counts[i] > 0)
                {
                    (List<string> derived, long most) = lacking.GetValueOrDefault(needs[i], ([], 0));
                    derived.Add(quantity.Id);
                    lacking[needs[i]] = (derived, Math.Max(most, counts[i]));
                }
            }

            if (counts[^1] > 0)
            {
                outside.Add(quantity.Id);
                outsideCount = Math.Max(outsideCount, counts[^1]);
            }
        }

        IEnumerable<Finding> findings = lacking.Select(l => DerivationNotes.Lacking(l.Key, l.Value.Derived, l.Value.Count));
        return outside.Count == 0 ? findings : findings.Append(DerivationNotes.OutsideRange(outside, outsideCount));
    }

    /// <summary>How many of the missing values lack each of the inputs; in the last place, how many lack none of them.</summary>
    private static long[] CountLacking(int rowCount, SampleColumn? derived, SampleColumn?[] inputs)
    {
        var counts = new long[inputs.Length + 1];
        for (int row = 0; row < rowCount; row++)
        {
            if (derived is not null && !double.IsNaN(derived.Values[row]))
            {
                continue;
            }

            bool complete = true;
            for (int i = 0; i < inputs.Length; i++)
            {
                if (inputs[i] is not { } input || double.IsNaN(input.Values[row]))
                {
                    counts[i]++;
                    complete = false;
                }
            }

            counts[^1] += complete ? 1 : 0;
        }

        return counts;
    }
}
