using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Core.Tests.Mixing;

public class MixingSolverTests
{
    private static readonly Condition[] Deep = [new("pressure", 1000, null)];

    [Fact]
    public void Solve_MissingTracer_DropsItsRow()
    {
        double[] sample = [.. Twin.Exact];
        sample[5] = double.NaN;

        MixingResult result = Twin.Solve(Twin.LeastSquares(EndMemberSpread.Iterated), sample);

        Assert.Equal(SolveStatus.Solved, result.Status[0]);
        Assert.Equal(5, result.TracerCount[0]);
        Assert.Equal(1, result.DegreesOfFreedom[0]);
        Assert.True(double.IsNaN(result.Residuals[5][0]));
        AssertTwin(result, 0);
    }

    [Fact]
    public void Solve_AsManyTracersAsUnknowns_IsSolvedWithoutDegreesOfFreedom()
    {
        double[] sample = [.. Twin.Exact];
        sample[5] = sample[0] = double.NaN;

        MixingResult result = Twin.Solve(Twin.LeastSquares(EndMemberSpread.Iterated), sample);

        Assert.Equal(SolveStatus.Solved, result.Status[0]);
        Assert.Equal(0, result.DegreesOfFreedom[0]);
        Assert.True(double.IsNaN(result.PValue[0]));
        AssertTwin(result, 0);
    }

    [Fact]
    public void Solve_TooFewTracers_LeavesFractionsEmptyAndNamesWhatIsMissing()
    {
        double[] sample = [.. Twin.Exact];
        sample[2] = sample[3] = sample[4] = double.NaN;

        MixingResult result = Twin.Solve(Twin.LeastSquares(EndMemberSpread.Iterated), sample);

        Assert.Equal(SolveStatus.TooFewTracers, result.Status[0]);
        Assert.All(result.Fractions, f => Assert.True(double.IsNaN(f[0])));
        Assert.True(double.IsNaN(result.FractionSum[0]));
        Assert.Equal(-1, result.DegreesOfFreedom[0]);
        Assert.Equal(3, result.TracerCount[0]);
        Assert.Equal("3 usable tracers for 4 unknowns; without a usable value: oxygen, nitrate, phosphate", result.Notes[0]);
    }

    [Fact]
    public void Solve_OneEndMember_NeedsOneTracer()
    {
        MixingModel model = Twin.LeastSquares(EndMemberSpread.None) with
        {
            Processes = [],
            Layers = [new Layer("one", ["b"], [])],
        };
        double[] empty = [.. Enumerable.Repeat(double.NaN, 6)];
        double[] single = [.. empty];
        single[0] = 3.5;

        MixingResult result = Twin.Solve(model, single, empty);

        Assert.Equal([SolveStatus.Solved, SolveStatus.TooFewTracers], result.Status);
        Assert.Equal(1, result.Fractions[1][0]);
        Assert.Equal(0.5, result.Residuals[0][0], 1e-12);
        Assert.Equal(10_000, result.Chi2[0], 1e-6);
        Assert.Equal(1, result.DegreesOfFreedom[0]);
    }

    [Fact]
    public void Solve_IdenticalEndMembers_IsNotUniqueWithTheFirstInOrder()
    {
        MixingModel twin = Twin.LeastSquares(EndMemberSpread.Iterated);
        EndMember copy = twin.EndMembers.EndMembers[1] with { Id = "copy" };
        MixingModel model = twin with { EndMembers = twin.EndMembers with { EndMembers = [.. twin.EndMembers.EndMembers, copy] } };

        MixingResult result = Twin.Solve(model, Twin.Exact);

        Assert.Equal(SolveStatus.NotUnique, result.Status[0]);
        Assert.Equal(0, result.Fractions[4][0]);
        Assert.Equal("dependent on those before: copy", result.Notes[0]);
        AssertTwin(result, 0);
    }

    [Fact]
    public void Solve_CollinearEndMember_IsNotUnique()
    {
        MixingModel twin = Twin.LeastSquares(EndMemberSpread.None);
        double[] between = [.. Twin.Tracers.Select(t => 0.5 * (twin.EndMembers.EndMembers[0].Values[t] + twin.EndMembers.EndMembers[1].Values[t]))];
        MixingModel model = twin with { EndMembers = twin.EndMembers with { EndMembers = [.. twin.EndMembers.EndMembers, Twin.Member("m", between)] } };

        MixingResult result = Twin.Solve(model, Twin.Exact);

        Assert.Equal(SolveStatus.NotUnique, result.Status[0]);
        Assert.Equal(1, result.FractionSum[0], 1e-12);
        Assert.All(result.Residuals, r => Assert.Equal(0, r[0], 1e-9));
    }

    [Fact]
    public void Solve_Layers_TakeTheFirstThatFits()
    {
        MixingModel model = Twin.LeastSquares(EndMemberSpread.Iterated) with
        {
            Layers =
            [
                new Layer("deep", ["a", "b", "c"], Deep),
                new Layer("rest", ["a", "b", "c", "e"], [new Condition("pressure", 150, null)]),
            ],
        };
        SampleTable table = WithPressure(1000, 999.9, 149, double.NaN);

        MixingResult result = Twin.Solve(model, table);

        Assert.Equal([0, 1, -1, -1], result.Layer);
        Assert.Equal([SolveStatus.Solved, SolveStatus.Solved, SolveStatus.OutsideLayers, SolveStatus.OutsideLayers], result.Status);
        Assert.True(double.IsNaN(result.Fractions[3][0]));
        Assert.Null(result.Notes[2]);
        Assert.Equal("no usable pressure for the layers' conditions", result.Notes[3]);
        AssertTwin(result, 1);
    }

    [Fact]
    public void Solve_ImpossibleValue_IsBadInputAndNamed()
    {
        SampleTable table = WithPressure(1000, 1000);
        table = table.With([new SampleColumn(Quantity.Latitude, [95.5, 45])]);

        MixingResult result = Twin.Solve(Twin.LeastSquares(EndMemberSpread.Iterated), table);

        Assert.Equal([SolveStatus.BadInput, SolveStatus.Solved], result.Status);
        Assert.Equal("latitude 95.5 is not possible: -90 to 90 degrees north is", result.Notes[0]);
        Assert.Equal(-1, result.Layer[0]);
    }

    [Fact]
    public void Solve_FlagNotAccepted_CountsAsMissing()
    {
        SampleTable table = Twin.Table(Twin.Exact, Twin.Exact, Twin.Exact);
        double[] oxygen = [Twin.Exact[2], Twin.Exact[2], Twin.Exact[2]];
        table = table.With([new SampleColumn(
            Quantity.Oxygen, oxygen, [3, 7, 7], [ValueOrigin.Bottle, ValueOrigin.Bottle, ValueOrigin.Ctd])]);

        MixingResult result = Twin.Solve(Twin.LeastSquares(EndMemberSpread.Iterated), table);
        MixingResult lenient = Twin.Solve(Twin.LeastSquares(EndMemberSpread.Iterated) with { AcceptFlags = [2, 3, 6, 7] }, table);

        Assert.Equal([5, 5, 6], result.TracerCount);
        Assert.Equal([6, 6, 6], lenient.TracerCount);
    }

    [Fact]
    public void Solve_ImpossibleValueWithABadFlag_IsMissingAndNotBadInput()
    {
        SampleTable table = Twin.Table(Twin.Exact);
        table = table.With([new SampleColumn(Quantity.Oxygen, [-999.9], [4])]);

        Assert.Equal(SolveStatus.Solved, Twin.Solve(Twin.LeastSquares(EndMemberSpread.Iterated), table).Status[0]);
    }

    [Theory]
    [InlineData(ProcessSign.NonNegative, 0.2, true)]
    [InlineData(ProcessSign.NonNegative, -0.2, false)]
    [InlineData(ProcessSign.NonPositive, -0.2, true)]
    [InlineData(ProcessSign.NonPositive, 0.2, false)]
    [InlineData(ProcessSign.Free, 0.2, true)]
    [InlineData(ProcessSign.Free, -0.2, true)]
    public void Solve_ProcessSign_BoundsTheAmount(ProcessSign sign, double amount, bool reachable)
    {
        MixingModel model = Twin.LeastSquares(EndMemberSpread.None) with { Processes = [Twin.Respiration with { Sign = sign }] };
        double[] sample = [.. Twin.Exact.Select((v, t) => v + ((amount - 0.2) * Twin.Respiration.Ratios.GetValueOrDefault(Twin.Tracers[t])))];

        MixingResult result = Twin.Solve(model, sample);

        Assert.Equal(reachable ? amount : 0, result.Amounts[0][0], 1e-9);
        Assert.Equal(reachable ? 2 : 3, result.DegreesOfFreedom[0] + (result.Fractions.Count(f => f[0] > 0) - 4));
        Assert.True(result.KktViolation![0] < 1e-9);
        Assert.False(double.IsNegative(result.Amounts[0][0]) && result.Amounts[0][0] == 0);
    }

    [Fact]
    public void Solve_ProcessMask_SwitchesTheProcessOff()
    {
        Process masked = Twin.Respiration with { Id = "masked", Where = [new Condition("oxygen", null, 10)] };
        Process byDepth = Twin.Respiration with { Id = "deep-only", Where = Deep };
        MixingModel model = Twin.LeastSquares(EndMemberSpread.None) with { Processes = [masked] };
        MixingModel byDepthModel = model with { Processes = [byDepth] };

        MixingResult off = Twin.Solve(model, Twin.Exact);
        MixingResult unknown = Twin.Solve(byDepthModel, Twin.Exact);
        MixingResult on = Twin.Solve(byDepthModel, WithPressure(2000));

        Assert.True(double.IsNaN(off.Amounts[0][0]));
        Assert.Null(off.Notes[0]);
        Assert.Equal("deep-only is off: no usable pressure", unknown.Notes[0]);
        AssertTwin(on, 0);
    }

    [Fact]
    public void Solve_ProcessThatChangesNoneOfTheTracersUsed_IsOffAndNotCounted()
    {
        var opal = new Process("opal", "silicate", new Dictionary<string, double> { ["silicate"] = 1 });
        MixingModel model = Twin.LeastSquares(EndMemberSpread.None) with { Processes = [Twin.Respiration, opal] };
        double[] sample = [.. Twin.Exact];
        sample[5] = double.NaN;

        MixingResult result = Twin.Solve(model, sample);

        Assert.Equal(SolveStatus.Solved, result.Status[0]);
        Assert.Equal("opal is off: it changes none of the tracers used", result.Notes[0]);
        Assert.True(double.IsNaN(result.Amounts[1][0]));
        Assert.Equal(1, result.DegreesOfFreedom[0]);
    }

    [Fact]
    public void Solve_WeightedMass_ReportsFractionsAsSolved()
    {
        double[] sample = [.. Twin.Exact];
        sample[1] += 0.5;
        MixingModel light = Twin.LeastSquares(EndMemberSpread.None) with { Mass = new MassConservation(1) };
        MixingModel heavy = light with { Mass = new MassConservation(1e7) };

        MixingResult lightResult = Twin.Solve(light, sample);
        MixingResult heavyResult = Twin.Solve(heavy, sample);
        MixingResult exact = Twin.Solve(Twin.LeastSquares(EndMemberSpread.None), sample);

        Assert.True(lightResult.FractionSum[0] > 1.001);
        Assert.Equal(1 - lightResult.FractionSum[0], lightResult.ResidualMass[0], 1e-15);
        Assert.Equal(1, heavyResult.FractionSum[0], 1e-8);
        Assert.Equal(exact.Fractions[1][0], heavyResult.Fractions[1][0], 1e-5);

        // The mass row counts in chi-square and in the degrees of freedom.
        double chi2 = lightResult.Residuals.Select((r, t) => Math.Pow(r[0] / Twin.MeasurementSd[t], 2)).Sum() + Math.Pow(lightResult.ResidualMass[0], 2);
        Assert.Equal(chi2, lightResult.Chi2[0], 1e-6 * chi2);
        Assert.Equal(6 + 1 - lightResult.Fractions.Count(f => f[0] > 0) - (lightResult.Amounts[0][0] > 0 ? 1 : 0), lightResult.DegreesOfFreedom[0]);
    }

    [Fact]
    public void Solve_WeightedRowsWithoutMeasurementErrors_HasNoChiSquare()
    {
        var fit = new WeightedRows(Twin.ByTracer([1, 1, 1, 1, 1, 1]));
        MixingResult without = Twin.Solve(Twin.Model(fit), Twin.Disturbed);
        MixingResult with = Twin.Solve(Twin.Model(fit with { MeasurementSd = Twin.Errors(Twin.MeasurementSd) }), Twin.Disturbed);

        Assert.True(double.IsNaN(without.Chi2[0]));
        Assert.True(double.IsNaN(without.PValue[0]));
        Assert.Equal(with.Residuals.Select((r, t) => Math.Pow(r[0] / Twin.MeasurementSd[t], 2)).Sum(), with.Chi2[0], 1e-8);
        Assert.Equal(without.Misfit[0], with.Misfit[0]);
        Assert.InRange(with.PValue[0], 0, 1);
    }

    [Fact]
    public void Solve_WeightedRowsTracerAlikeInAllSources_IsLeftOut()
    {
        MixingModel model = Twin.Model(new WeightedRows(Twin.ByTracer([1, 1, 1, 1, 1, 1])));
        EndMember[] alike = [.. model.EndMembers.EndMembers.Select(e => e with
        {
            Values = e.Values.ToDictionary(p => p.Key, p => p.Key == "silicate" ? 20 : p.Value),
        })];

        MixingResult result = Twin.Solve(model with { EndMembers = model.EndMembers with { EndMembers = alike } }, Twin.Exact);

        Assert.Equal(5, result.TracerCount[0]);
        Assert.True(double.IsNaN(result.Residuals[5][0]));
    }

    // Regression: sources on a Redfield line have one N*, but not to the last bit; the rounding must not become a row.
    [Fact]
    public void Solve_WeightedRowsDerivedTracerAlikeWithinRounding_IsLeftOut()
    {
        string[] tracers = ["potential_temperature", "practical_salinity", "n_star", "silicate"];
        double[][] values = [[4, 34.2, 14.4, 0.9, 20], [3, 34.95, 16, 1.0, 18], [-0.5, 34.66, 17.6, 1.1, 120]];
        EndMember[] members = [.. values.Select((v, i) => Twin.Member($"m{i}", Twin.Exact) with
        {
            Values = new[] { "potential_temperature", "practical_salinity", "nitrate", "phosphate", "silicate" }.Zip(v).ToDictionary(p => p.First, p => p.Second),
        })];
        var model = new MixingModel(
            "redfield", new EndMemberSet("s", 1, members), tracers, new WeightedRows(tracers.ToDictionary(t => t, _ => 1.0)), MassConservation.Exact);

        MixingResult result = Twin.Solve(model, [2, 34.7, 200, 16.1, 1.005, 50]);

        Assert.Equal(3, result.TracerCount[0]);
        Assert.True(double.IsNaN(result.Residuals[2][0]));
        Assert.InRange(result.Misfit[0], 0, 10);
        Assert.Contains(ModelCheck.Findings(model), f => f.Remedy.Contains("n_star is left out", StringComparison.Ordinal));
    }

    // Regression: respiration in the ratios that PO is defined with changes neither PO nor N*; what is left by rounding is no process.
    [Fact]
    public void Solve_ProcessThatCancelsInDerivedTracers_IsOff()
    {
        var respiration = new Process("respiration", "phosphate", new Dictionary<string, double> { ["phosphate"] = 1, ["nitrate"] = 16, ["oxygen"] = -170.1 });
        MixingModel model = Twin.LeastSquares(EndMemberSpread.None) with
        {
            Tracers = ["potential_temperature", "practical_salinity", "po", "n_star", "silicate"],
            Processes = [respiration],
        };
        model = model with { Fit = model.Fit with { Factors = new DerivedTracerFactors { PoOxygenPerPhosphate = 170.1 } } };

        MixingResult result = Twin.Solve(model, Twin.Exact);

        Assert.True(double.IsNaN(result.Amounts[0][0]));
        Assert.Equal("respiration is off: it changes none of the tracers used", result.Notes[0]);
        Assert.Contains(ModelCheck.Findings(model), f => f.Remedy.Contains("off for every sample", StringComparison.Ordinal));
    }

    [Fact]
    public void Solve_WeightedRowsOneSourceStandardised_SaysWhyNothingIsLeft()
    {
        MixingModel model = Twin.Model(new WeightedRows(Twin.ByTracer([1, 1, 1, 1, 1, 1]))) with
        {
            Processes = [],
            Layers = [new Layer("one", ["b"], [])],
        };

        MixingResult result = Twin.Solve(model, Twin.Exact);

        Assert.Equal(SolveStatus.TooFewTracers, result.Status[0]);
        Assert.StartsWith("0 usable tracers for 0 unknowns; left out of the layer, its end-members do not differ: potential_temperature", result.Notes[0], StringComparison.Ordinal);
        Assert.Contains(ModelCheck.Findings(model), f => f.Remedy.Contains("no sample can be solved", StringComparison.Ordinal));
    }

    [Fact]
    public void Solve_ErrorsBeyondWeighing_SaysSo()
    {
        MixingModel model = Twin.LeastSquares(EndMemberSpread.None, [1e-200, 0.003, 1.5, 0.2, 0.02, 0.6]);

        MixingResult result = Twin.Solve(model, Twin.Exact);

        Assert.Equal(SolveStatus.NotConverged, result.Status[0]);
        Assert.True(double.IsNaN(result.Fractions[0][0]));
        Assert.Contains("too many orders of magnitude", result.Notes[0], StringComparison.Ordinal);
    }

    // Thresholds published in the older equation of state act on its values: sigma2 of EOS-80 and TEOS-10 differ by about 0.01 here.
    [Fact]
    public void Solve_LayerInEos80_TestsTheOlderDensity()
    {
        SampleTable table = WithPressure(3000).With(
        [
            new SampleColumn(Quantity.Latitude, [30]),
            new SampleColumn(Quantity.Longitude, [-40]),
        ]);
        double teos10 = Core.Seawater.SampleDerivation.Derive(table, ["sigma2"]).Table.Find("sigma2")!.Values[0];
        double eos80 = Core.Seawater.SampleDerivation.Eos80Anomaly(table, Quantity.Sigma2).Values[0];
        Assert.InRange(Math.Abs(teos10 - eos80), 0.002, 0.03);
        double between = 0.5 * (teos10 + eos80);
        string[] all = ["a", "b", "c", "e"];
        MixingModel model = Twin.LeastSquares(EndMemberSpread.None) with
        {
            Layers =
            [
                new Layer("older", all, [new Condition("sigma2", between, null) { Scale = DensityScale.Eos80 }]),
                new Layer("newer", all, [new Condition("sigma2", between, null)]),
            ],
        };

        Assert.Equal(eos80 > teos10 ? 0 : 1, Twin.Solve(model, table).Layer[0]);
    }

    [Fact]
    public void Solve_ImpossibleValueThatTheModelDoesNotRead_IsNoMatter()
    {
        SampleTable table = Twin.Table(Twin.Exact).With([new SampleColumn(Quantity.InSituTemperature, [-99])]);
        MixingModel model = Twin.LeastSquares(EndMemberSpread.None) with { Tracers = ["practical_salinity", "oxygen", "nitrate", "phosphate", "silicate"] };

        Assert.Equal(SolveStatus.Solved, Twin.Solve(model, table).Status[0]);
    }

    // Algebra: NO and PO take the respired part out, so solving with them and no process gives the mixture again.
    [Fact]
    public void Solve_DerivedTracers_FollowFromTheirParents()
    {
        MixingModel model = Twin.LeastSquares(EndMemberSpread.Iterated) with
        {
            Tracers = ["potential_temperature", "practical_salinity", "no", "po", "n_star", "po4_star"],
            Processes = [],
        };
        MixingModel regular = model with { Tracers = ["potential_temperature", "practical_salinity", "no", "po", "silicate"] };
        double[] sample = [.. Twin.Exact];
        sample[5] -= 0.2 * 15;

        MixingResult result = Twin.Solve(regular, sample);

        Assert.Equal(SolveStatus.Solved, result.Status[0]);
        for (int i = 0; i < 4; i++)
        {
            Assert.Equal(Twin.Fractions[i], result.Fractions[i][0], 1e-9);
        }

        // NO, PO, N* and PO4* are four combinations of three measured quantities: not four tracers.
        Assert.Throws<ArgumentException>(() => PreparedModel.From(model));
    }

    // A full-rank change of tracers with its covariance carried along changes nothing: GLS is invariant.
    [Fact]
    public void Solve_OxygenNitrateAgainstNoNitrate_GivesTheSameFractions()
    {
        MixingModel plain = Twin.LeastSquares(EndMemberSpread.Iterated);
        MixingModel changed = plain with { Tracers = ["potential_temperature", "practical_salinity", "no", "nitrate", "po4_star", "silicate"] };

        MixingResult a = Twin.Solve(plain, Twin.Disturbed);
        MixingResult b = Twin.Solve(changed, Twin.Disturbed);

        for (int i = 0; i < 4; i++)
        {
            Assert.Equal(a.Fractions[i][0], b.Fractions[i][0], 1e-8);
        }

        Assert.Equal(a.Chi2[0], b.Chi2[0], 1e-8);
    }

    // Property: bits do not depend on the number of threads, nor on the other samples of the table.
    [Fact]
    public void Solve_ThreadsAndNeighbours_ChangeNoBit()
    {
        var random = new Random(5);
        double[][] samples = [.. Enumerable.Range(0, 5000).Select(_ => RandomSample(random))];
        MixingModel model = Twin.LeastSquares(EndMemberSpread.Iterated);

        MixingResult one = Twin.Solve(model, Twin.Table(samples), threads: 1);
        MixingResult four = Twin.Solve(model, Twin.Table(samples), threads: 4);
        MixingResult tail = Twin.Solve(model, Twin.Table(samples[3000..]), threads: 2);

        for (int i = 0; i < 4; i++)
        {
            Assert.Equal(one.Fractions[i], four.Fractions[i]);
            Assert.Equal(one.Fractions[i][3000..], tail.Fractions[i]);
        }

        Assert.Equal(one.PValue, four.PValue);
        Assert.All(one.KktViolation!, v => Assert.True(double.IsNaN(v) || v < 1e-9));
        Assert.Contains(SolveStatus.TooFewTracers, one.Status);
        Assert.Contains(SolveStatus.Solved, one.Status);
    }

    // One sample in some 20,000 random ones with spreads over four orders of magnitude: the iteration goes to and fro.
    [Fact]
    public void Solve_IterationThatDoesNotSettle_GivesTheLastAnswerAndSaysSo()
    {
        MixingModel twin = Twin.LeastSquares(EndMemberSpread.Iterated);
        double[] scale = [10, 0.1, 0.01, 1];
        EndMember[] members = [.. twin.EndMembers.EndMembers.Select((e, i) => e with { Sd = e.Sd.ToDictionary(p => p.Key, p => p.Value * scale[i]) })];
        double[] sample = [3.087162506865413, 34.91166352918705, 200.0660351821296, 22.120963166151647, 1.4699506906617668, 43.47124995699676];

        MixingResult result = Twin.Solve(twin with { EndMembers = twin.EndMembers with { EndMembers = members } }, sample);

        Assert.Equal(SolveStatus.NotConverged, result.Status[0]);
        Assert.Equal(1, result.FractionSum[0], 1e-12);
        Assert.All(result.Fractions, f => Assert.InRange(f[0], 0, 1));
        Assert.All(result.Residuals, r => Assert.True(double.IsFinite(r[0])));
        Assert.True(result.KktViolation![0] < 1e-9);
        Assert.StartsWith("the fractions still changed by ", result.Notes[0], StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_Cancelled_Throws()
    {
        using var cancellation = new CancellationTokenSource();
        cancellation.Cancel();

        Assert.ThrowsAny<OperationCanceledException>(() => MixingSolver.Solve(
            PreparedModel.From(Twin.LeastSquares(EndMemberSpread.Iterated)), Twin.Table(Twin.Exact), new SolveOptions { Cancellation = cancellation.Token }));
    }

    private static double[] RandomSample(Random random)
    {
        double[] shares = [.. Enumerable.Range(0, 4).Select(_ => -Math.Log(random.NextDouble()))];
        double sum = shares.Sum();
        return [.. Twin.Tracers.Select((tracer, t) => random.Next(8) == 0
            ? double.NaN
            : Twin.Set.EndMembers.Select((e, i) => e.Values[tracer] * shares[i] / sum).Sum() + (Twin.SourceSd[t] * (random.NextDouble() - 0.5)))];
    }

    private static SampleTable WithPressure(params double[] pressures) =>
        Twin.Table([.. pressures.Select(_ => Twin.Exact)]).With([new SampleColumn(Quantity.Pressure, pressures)]);

    private static void AssertTwin(MixingResult result, int row)
    {
        for (int i = 0; i < Twin.Fractions.Length; i++)
        {
            Assert.Equal(Twin.Fractions[i], result.Fractions[i][row], 1e-9);
        }

        Assert.Equal(Twin.Amount, result.Amounts[0][row], 1e-9);
    }
}
