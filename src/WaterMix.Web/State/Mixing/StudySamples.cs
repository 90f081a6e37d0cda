using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.State.Mixing;

/// <summary>The samples of a study as the model sees them: its flags decide what is usable. Columns are kept while flags and factors stay.</summary>
/// <param name="cruises">Where samples are kept.</param>
public sealed class StudySamples(ICruises cruises)
{
    private IReadOnlyList<string> _hashes = [];
    private FigureCruise[] _tables = [];
    private (IReadOnlyList<int> Water, IReadOnlyList<int> Ctd, DerivedTracerFactors Factors)? _key;
    private FigureColumns _columns = new([]);

    /// <summary>The tables, in the order of their rows.</summary>
    public IReadOnlyList<FigureCruise> Tables => _tables;

    /// <summary>Reads the samples of the study's cruises, unless they are the ones that were read before.</summary>
    /// <param name="study">The study.</param>
    /// <returns>True where they are others than before.</returns>
    public async Task<bool> ReadAsync(Study study)
    {
        ArgumentNullException.ThrowIfNull(study);
        string[] keys = [.. study.Cruises.Select(c => $"{c.SamplesHash} {c.Name}")];
        if (keys.SequenceEqual(_hashes))
        {
            return false;
        }

        var tables = new List<FigureCruise>();
        foreach (Cruise cruise in study.Cruises)
        {
            tables.Add(new FigureCruise(cruise.Name, await cruises.SamplesAsync(cruise.SamplesHash), null));
        }

        (_tables, _hashes, _key) = ([.. tables], keys, null);
        return true;
    }

    /// <summary>The columns under a model's flags and factors.</summary>
    /// <param name="model">The model.</param>
    public FigureColumns Columns(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        if (_key is not { } key || !key.Water.SequenceEqual(model.AcceptFlags) || !key.Ctd.SequenceEqual(model.AcceptCtdFlags) || key.Factors != model.Fit.Factors)
        {
            _key = (model.AcceptFlags, model.AcceptCtdFlags, model.Fit.Factors);
            _columns = new FigureColumns(_tables, new AcceptedFlags(model.AcceptFlags, model.AcceptCtdFlags), model.Fit.Factors);
        }

        return _columns;
    }

    /// <summary>The quantities that can be rows of a fit and that some sample has, in the contract's order; derived ones where their parents are there.</summary>
    /// <param name="model">The model.</param>
    public IReadOnlyList<string> Tracers(MixingModel model)
    {
        FigureColumns columns = Columns(model);
        IEnumerable<string> further = _tables.SelectMany(t => t.Samples.Columns)
            .Where(c => c.Suffix.Length == 0 && Quantity.Find(c.Id) is null && c.Quantity.Use == TracerUse.Row)
            .Select(c => c.Id);
        return TracerText.InOrder(Quantity.All.Where(q => q.Use != TracerUse.Never).Select(q => q.Id).Concat(further).Where(id => HasValues(columns.Values(id))));
    }

    private static bool HasValues(double[] values) => Array.Exists(values, double.IsFinite);
}
