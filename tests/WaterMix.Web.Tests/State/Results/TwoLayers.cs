using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Web.State.Results;
using WaterMix.Workspace.Runs;

namespace WaterMix.Web.Tests.State.Results;

/// <summary>
/// A small run whose results are written by hand: three sources A, B, C; the layer "upper" permits A and B, "deep" B and C; two stations
/// of four samples each.
/// </summary>
internal static class TwoLayers
{
    public static readonly Guid RunId = new("5f3c1f0e-0000-4000-8000-000000000001");

    public static readonly MixingModel Model = new(
        "Two layers",
        new EndMemberSet("Three sources", 2, [Member("A", 10, 36), Member("B", 4, 35), Member("C", 1, 34.7)]),
        ["potential_temperature", "practical_salinity"],
        new GeneralisedLeastSquares
        {
            MeasurementSd = new Dictionary<string, MeasurementError> { ["potential_temperature"] = new(0.01), ["practical_salinity"] = new(0.005) },
        },
        MassConservation.Exact)
    {
        Layers = [new Layer("upper", ["A", "B"], [new Condition("pressure", null, 1000)]), new Layer("deep", ["B", "C"], [new Condition("pressure", 1000, null)])],
    };

    /// <summary>Rows 0 to 3 are station S2, rows 4 to 7 station S10; row 3 has too few tracers, row 7 is outside the layers.</summary>
    public static RunResults Results(int cruises = 1)
    {
        CruiseResult[] results = [.. Enumerable.Range(1, cruises).Select(k => new CruiseResult(Guid.NewGuid(), $"Cruise {k}", "hash", Filled()))];
        return new RunResults(Run(), results, [.. results.Select(_ => Samples())]);
    }

    public static Run Run(RunState state = RunState.Finished, Guid? id = null, string name = "First run") =>
        new(id ?? RunId, name, new DateTimeOffset(2026, 5, 4, 10, 30, 0, TimeSpan.Zero), state, 8, 8, Model, "3f2a9c0d11223344", new Dictionary<SolveStatus, long>(), null);

    public static SampleTable Samples() => new(
        8,
        [
            new IdentityColumn("station", [0, 0, 0, 0, 1, 1, 1, 1], ["S2", "S10"]),
            new IdentityColumn("sample", [0, 1, 2, 3, 0, 1, 2, 3], ["1", "2", "3", "4"]),
        ],
        [
            Column(Quantity.Latitude, 10, 10, 10, 10, 11, 11, 11, 11),
            Column(Quantity.Longitude, -30, -30, -30, -30, -30, -30, -30, -30),
            Column(Quantity.Pressure, 100, 500, 1500, 2500, 200, 600, 1600, 2600),
            Column(Quantity.PotentialTemperature, 8, 6, 3, double.NaN, 7, 5, 2, 1.5),
            Column(Quantity.PracticalSalinity, 35.7, 35.3, 34.9, 34.8, 35.5, 35.2, 34.8, 34.7),
        ]);

    public static MixingResult Filled()
    {
        var result = new MixingResult(PreparedModel.From(Model), 8, withProof: false);
        double[] a = [0.7, 0.3, double.NaN, double.NaN, 0.5, 0.1, double.NaN, double.NaN];
        double[] b = [0.3, 0.7, 0.6, double.NaN, 0.5, 0.9, 0.2, double.NaN];
        double[] c = [double.NaN, double.NaN, 0.4, double.NaN, double.NaN, double.NaN, 0.8, double.NaN];
        int[] layers = [0, 0, 1, 1, 0, 0, 1, -1];
        a.CopyTo(result.Fractions[0], 0);
        b.CopyTo(result.Fractions[1], 0);
        c.CopyTo(result.Fractions[2], 0);
        layers.CopyTo(result.Layer, 0);
        new double[] { 0.02, -0.02, 0.04, double.NaN, 0.06, -0.02, 0.00, double.NaN }.CopyTo(result.Residuals[0], 0);
        new double[] { 1, 4, 2, double.NaN, 3, 10, 5, double.NaN }.CopyTo(result.Chi2, 0);
        new double[] { 0.3, 0.04, 0.2, double.NaN, 0.08, 0.001, 0.03, double.NaN }.CopyTo(result.PValue, 0);
        for (int row = 0; row < 8; row++)
        {
            bool answered = row is not (3 or 7);
            result.Status[row] = answered ? SolveStatus.Solved : row == 3 ? SolveStatus.TooFewTracers : SolveStatus.OutsideLayers;
            result.TracerCount[row] = row == 3 ? 1 : 2;
            result.FractionSum[row] = answered ? 1 : double.NaN;
            result.ResidualMass[row] = answered ? (row == 6 ? -0.002 : 0) : double.NaN;
            result.DegreesOfFreedom[row] = answered ? 1 : -1;
            result.Misfit[row] = Math.Sqrt(result.Chi2[row]);
        }

        result.Notes[3] = "1 usable tracers for 1 unknowns; without a usable value: potential_temperature";
        return result;
    }

    private static EndMember Member(string id, double temperature, double salinity) => new(
        id, "", new Dictionary<string, double> { ["potential_temperature"] = temperature, ["practical_salinity"] = salinity }, new Provenance(ProvenanceKind.Manual));

    private static SampleColumn Column(Quantity quantity, params double[] values) => new(quantity, values);
}
