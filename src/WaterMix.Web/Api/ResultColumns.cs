using WaterMix.Core.Mixing;
using WaterMix.Workspace.Runs;

namespace WaterMix.Web.Api;

/// <summary>Finds the result columns of a run by their ids in files.</summary>
internal static class ResultColumns
{
    /// <summary>A column over all cruises, one after another; null where the run has none of that id.</summary>
    public static ColumnValues? Find(IReadOnlyList<CruiseResult> cruises, string id)
    {
        var parts = new List<(int First, ColumnValues Values)>(cruises.Count);
        int first = 0;
        foreach (CruiseResult cruise in cruises)
        {
            if (Find(cruise.Result, id) is not { } values)
            {
                return null;
            }

            parts.Add((first, values));
            first += cruise.Result.RowCount;
        }

        return row =>
        {
            int part = parts.FindLastIndex(p => p.First <= row);
            return parts[part].Values(row - parts[part].First);
        };
    }

    private static ColumnValues? Find(MixingResult result, string id)
    {
        MixingModel model = result.Model.Model;
        return id switch
        {
            "layer" => row => result.Layer[row],
            "status" => row => (int)result.Status[row],
            "tracers" => row => result.TracerCount[row],
            "fraction_sum" => row => result.FractionSum[row],
            "residual_mass" => row => result.ResidualMass[row],
            "misfit" => row => result.Misfit[row],
            "chi2" => row => result.Chi2[row],
            "dof" => row => result.DegreesOfFreedom[row] < 0 ? double.NaN : result.DegreesOfFreedom[row],
            "p_value" => row => result.PValue[row],
            _ => Named(id, "fraction_", model.EndMembers.EndMembers.Select(e => e.Id), result.Fractions)
                ?? Named(id, "amount_", model.Processes.Select(p => p.Id), result.Amounts)
                ?? Named(id, "residual_", model.Tracers, result.Residuals),
        };
    }

    private static ColumnValues? Named(string id, string prefix, IEnumerable<string> names, double[][] columns)
    {
        int index = id.StartsWith(prefix, StringComparison.Ordinal) ? names.ToList().IndexOf(id[prefix.Length..]) : -1;
        return index < 0 ? null : row => columns[index][row];
    }
}
