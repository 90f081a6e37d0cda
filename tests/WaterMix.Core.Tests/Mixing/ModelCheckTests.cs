using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Seawater;

namespace WaterMix.Core.Tests.Mixing;

// What each check asks comes from the file contract; numbers are invented.
public class ModelCheckTests
{
    private static readonly string[] SixTracers = ["potential_temperature", "practical_salinity", "oxygen", "nitrate", "phosphate", "silicate"];

    [Fact]
    public void Findings_SoundModel_AreNone() => Assert.Empty(ModelCheck.Findings(Model()));

    [Theory]
    [InlineData("in_situ_temperature", "Use potential_temperature or conservative_temperature")]
    [InlineData("sigma2", "density in a layer's \"where\"")]
    [InlineData("neutral_density", "density in a layer's \"where\"")]
    [InlineData("apparent_oxygen_utilisation", "Use oxygen, with a process for respiration")]
    [InlineData("pressure", "Use it in a layer's \"where\" instead")]
    [InlineData("longitude", "Use it in a layer's \"where\" instead")]
    [InlineData("oxigen", "Did you mean \"oxygen\"?")]
    [InlineData("dye", "give its unit under \"units\"")]
    [InlineData("", "Correct the name")]
    public void Findings_TracerThatIsNoRow_AreOneErrorThatSaysWhatToDo(string tracer, string remedy)
    {
        Finding finding = Assert.Single(Errors(Model() with { Tracers = [.. SixTracers, tracer] }));

        Assert.Equal("/tracers/6", finding.Path);
        Assert.Contains(remedy, finding.Remedy, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("conservative_temperature", "practical_salinity")]
    [InlineData("potential_temperature", "absolute_salinity")]
    [InlineData("potential_temperature", "conservative_temperature")]
    [InlineData("absolute_salinity", "practical_salinity")]
    public void Findings_MixedTemperatureAndSalinityPairs_AreRefused(string one, string other)
    {
        MixingModel model = Model(tracers: [one, "oxygen", other], everyValue: 20);

        Finding finding = Assert.Single(Errors(model));

        Assert.Equal("/tracers/2", finding.Path);
        Assert.Contains("can be converted", finding.Remedy, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("potential_temperature", "practical_salinity")]
    [InlineData("conservative_temperature", "absolute_salinity")]
    [InlineData("conservative_temperature", "oxygen")]
    public void Findings_OnePairOrOneOfIt_AreNoErrors(string one, string other) =>
        Assert.Empty(Errors(Model(tracers: [one, other], everyValue: 20)));

    [Theory]
    [InlineData(new[] { "oxygen", "phosphate", "po" }, 2)]
    [InlineData(new[] { "po", "oxygen", "silicate", "phosphate" }, 3)]
    [InlineData(new[] { "no", "po", "n_star" }, 2)]
    [InlineData(new[] { "oxygen", "po", "po4_star" }, 2)]
    [InlineData(new[] { "nitrate", "phosphate", "n_star" }, 2)]
    public void Findings_TracersThatFollowFromOthers_AreAnError(string[] tracers, int index)
    {
        Finding finding = Assert.Single(Errors(Model(tracers: tracers)), f => f.Path == $"/tracers/{index}");

        Assert.Contains("a combination of tracers", finding.Found, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("no", "phosphate")]
    [InlineData("po", "nitrate")]
    [InlineData("no", "po")]
    [InlineData("n_star", "po4_star")]
    public void Findings_IndependentDerivedTracers_AreNoErrors(string one, string other) => Assert.Empty(Errors(Model(tracers: [one, other])));

    [Fact]
    public void Findings_TracerTwice_AreOneError()
    {
        Finding finding = Assert.Single(Errors(Model() with { Tracers = [.. SixTracers, "oxygen"] }));

        Assert.Equal("/tracers/6", finding.Path);
        Assert.Contains("second time", finding.Found, StringComparison.Ordinal);
    }

    [Fact]
    public void Findings_NoTracers_AreAnError() => Assert.Contains(Errors(Model() with { Tracers = [] }), f => f.Path == "/tracers");

    [Theory]
    [InlineData("no", "nitrate", "/endMembers/endMembers/1/values/nitrate")]
    [InlineData("po", "phosphate", "/endMembers/endMembers/1/values/phosphate")]
    [InlineData("n_star", "phosphate", "/endMembers/endMembers/1/values/phosphate")]
    [InlineData("po4_star", "oxygen", "/endMembers/endMembers/1/values/oxygen")]
    [InlineData("silicate", "silicate", "/endMembers/endMembers/1/values/silicate")]
    public void Findings_PermittedEndMemberWithoutAParentsValue_AreAnErrorAtThatValue(string tracer, string parent, string path)
    {
        MixingModel model = Model(tracers: [tracer]);
        EndMember lacking = Without(model.EndMembers.EndMembers[1], parent);
        MixingModel broken = model with { EndMembers = model.EndMembers with { EndMembers = [model.EndMembers.EndMembers[0], lacking, model.EndMembers.EndMembers[2]] } };

        Assert.Equal(path, Assert.Single(Errors(broken)).Path);

        // An end-member that no layer permits needs no values.
        Assert.Empty(Errors(broken with { Layers = [new Layer("l", ["A", "C"], [])] }));
    }

    [Fact]
    public void Findings_TracerThatNoEndMemberHas_AreOneErrorAtTheTracer()
    {
        MixingModel model = Model();
        MixingModel broken = model with { EndMembers = model.EndMembers with { EndMembers = [.. model.EndMembers.EndMembers.Select(e => Without(e, "silicate"))] } };

        Assert.Equal("/tracers/5", Assert.Single(Errors(broken)).Path);
    }

    [Fact]
    public void Findings_UserDefinedTracerWithUnit_AreNone()
    {
        MixingModel model = Model();
        EndMember[] with = [.. model.EndMembers.EndMembers.Select((e, i) => e with
        {
            Values = new Dictionary<string, double>(e.Values) { ["dye"] = i },
            Sd = new Dictionary<string, double>(e.Sd) { ["dye"] = 1 },
        })];
        EndMemberSet set = model.EndMembers with { EndMembers = with, Units = new Dictionary<string, string> { ["dye"] = "nmol/kg" } };

        Assert.Empty(ModelCheck.Findings(model with { Tracers = [.. SixTracers, "dye"], EndMembers = set, Fit = Gls([.. SixTracers, "dye"]) }));
    }

    [Theory]
    [InlineData(0.0)]
    [InlineData(-1.0)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Findings_ErrorsAndWeightsThatAreNotPositive_AreErrors(double value)
    {
        var sd = new Dictionary<string, MeasurementError>(Gls(SixTracers).MeasurementSd) { ["oxygen"] = new MeasurementError(value) };
        var weights = new Dictionary<string, double>(Rows(SixTracers).Weights) { ["oxygen"] = value };

        Assert.Equal("/fit/measurementSd/oxygen", Assert.Single(Errors(Model() with { Fit = new GeneralisedLeastSquares { MeasurementSd = sd } })).Path);
        Assert.Equal("/fit/weights/oxygen", Assert.Single(Errors(Model() with { Fit = new WeightedRows(weights) })).Path);
        Assert.Equal("/massConservation/weight", Assert.Single(Errors(Model() with { Mass = new MassConservation(value) })).Path);
    }

    [Fact]
    public void Findings_MissingErrorOrWeight_AreErrorsAtTheirPlace()
    {
        string[] five = [.. SixTracers.Where(t => t != "nitrate")];

        Assert.Equal("/fit/measurementSd/nitrate", Assert.Single(Errors(Model() with { Fit = Gls(five) })).Path);
        Assert.Equal("/fit/weights/nitrate", Assert.Single(Errors(Model() with { Fit = Rows(five) })).Path);
        Assert.Empty(Errors(Model() with
        {
            Fit = new GeneralisedLeastSquares { MeasurementSd = Gls(five).MeasurementSd, MeasurementCovariance = new TracerMatrix(["nitrate"], [[0.04]]) },
        }));
    }

    [Fact]
    public void Findings_DerivedTracerUnderLeastSquares_NeedsTheErrorsOfItsParents()
    {
        MixingModel model = Model(tracers: ["no"]);

        Assert.Empty(Errors(model));
        Assert.Equal(
            ["/fit/measurementSd/oxygen", "/fit/measurementSd/nitrate"],
            Errors(model with { Fit = new GeneralisedLeastSquares() }).Select(f => f.Path));
        Assert.Empty(Errors(model with { Fit = Rows(["no"]) }));
    }

    // Agreement: the linear form that end-members and errors go through, and the formulas that samples go through.
    [Fact]
    public void Findings_DerivedTracers_HaveTheValuesThatSamplesHave()
    {
        var factors = new DerivedTracerFactors { NoOxygenPerNitrate = 9.5, NStarOffset = 3, Po4StarOxygenPerPhosphate = 165 };
        var values = new Dictionary<string, double> { ["oxygen"] = 231.5, ["nitrate"] = 17.25, ["phosphate"] = 1.375 };

        Assert.Equal(DerivedTracers.No(231.5, 17.25, factors), factors.ValueOf("no", values), 1e-12);
        Assert.Equal(DerivedTracers.Po(231.5, 1.375, factors), factors.ValueOf("po", values), 1e-12);
        Assert.Equal(DerivedTracers.NStar(17.25, 1.375, factors), factors.ValueOf("n_star", values), 1e-12);
        Assert.Equal(DerivedTracers.Po4Star(1.375, 231.5, factors), factors.ValueOf("po4_star", values), 1e-12);
        Assert.Equal(17.25, factors.ValueOf("nitrate", values));
        Assert.Equal(double.NaN, factors.ValueOf("silicate", values));
    }

    [Fact]
    public void Findings_WhatIsAssumed_IsNoted()
    {
        EndMember[] bare = [.. Model().EndMembers.EndMembers.Select(e => e with { Sd = new Dictionary<string, double> { ["oxygen"] = 1 }, Observations = null, Provenance = new Provenance(ProvenanceKind.Samples) })];
        MixingModel model = Model() with { EndMembers = new EndMemberSet("x", 1, bare) };

        IReadOnlyList<Finding> findings = ModelCheck.Findings(model);

        Assert.All(findings, f => Assert.Equal(Severity.Note, f.Severity));
        Assert.Equal(
            ["/endMembers/endMembers/0/sd", "/endMembers/endMembers/0/observations", "/endMembers/endMembers/0/correlations"],
            findings.Select(f => f.Path).Where(p => p!.Contains("/0/", StringComparison.Ordinal)));
        Assert.DoesNotContain(
            ModelCheck.Findings(model with { Fit = new GeneralisedLeastSquares { MeasurementSd = model.Fit.MeasurementSd, Spread = EndMemberSpread.None } }),
            f => f.Path!.EndsWith("/sd", StringComparison.Ordinal));
    }

    [Fact]
    public void Findings_Layers_NameAbsentSourcesDuplicatesAndEmptiness()
    {
        MixingModel model = Model() with
        {
            Layers =
            [
                new Layer("one", ["A", "D", "A"], [new Condition("pressure", 0, 500)]),
                new Layer("one", [], [new Condition("pressure", 500, null)]),
                new Layer("", ["B"], []),
            ],
        };

        Assert.Equal(
            ["/layers/0/endMembers/1", "/layers/0/endMembers/2", "/layers/1/id", "/layers/1/endMembers", "/layers/2/id"],
            Errors(model).Select(f => f.Path));
    }

    [Fact]
    public void Findings_LayerWithoutConditionsBeforeOthers_WarnsThatTheOthersGetNothing()
    {
        MixingModel model = Model() with { Layers = [new Layer("one", ["A", "B"], []), new Layer("two", ["B", "C"], [])] };

        Assert.Equal("/layers/0", Assert.Single(ModelCheck.Findings(model)).Path);
    }

    [Theory]
    [InlineData("pressure", 10.0, 10.0, false)]
    [InlineData("pressure", 20.0, 10.0, false)]
    [InlineData("pressure", null, null, false)]
    [InlineData("presure", 1.0, null, false)]
    [InlineData("pressure", double.NaN, null, false)]
    [InlineData("longitude", 170.0, -170.0, true)]
    [InlineData("longitude", 350.0, 10.0, true)]
    [InlineData("longitude", 10.0, 10.0, false)]
    [InlineData("longitude", -200.0, 10.0, false)]
    [InlineData("longitude", 190.0, null, false)]
    [InlineData("longitude", null, 190.0, false)]
    [InlineData("longitude", 180.0, -180.0, false)]
    [InlineData("longitude", 360.0, 0.0, false)]
    [InlineData("longitude", 0.0, 360.0, true)]
    [InlineData("in_situ_temperature", 1.0, 2.0, true)]
    public void Findings_Conditions_AreRangesOfKnownQuantities(string quantity, double? atLeast, double? lessThan, bool isSound)
    {
        Condition condition = new(quantity, atLeast, lessThan);
        Process process = new("p", "silicate", new Dictionary<string, double> { ["silicate"] = 1 }) { Where = [condition] };

        Finding[] ofLayer = Errors(Model() with { Layers = [new Layer("l", ["A", "B"], [condition])] });
        Finding[] ofProcess = Errors(Model() with { Processes = [process] });

        Assert.Equal(isSound ? 0 : 1, ofLayer.Length);
        Assert.All(ofLayer, f => Assert.StartsWith("/layers/0/where/0", f.Path, StringComparison.Ordinal));
        Assert.Equal(isSound ? 0 : 1, ofProcess.Length);
        Assert.All(ofProcess, f => Assert.StartsWith("/processes/0/where/0", f.Path, StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("sigma0", true)]
    [InlineData("sigma4", true)]
    [InlineData("neutral_density", false)]
    [InlineData("pressure", false)]
    public void Findings_OlderEquationOfState_IsForSigmasOnly(string quantity, bool isSound)
    {
        var condition = new Condition(quantity, 27, null) { Scale = DensityScale.Eos80 };

        Assert.Equal(isSound, Errors(Model() with { Layers = [new Layer("l", ["A", "B"], [condition])] }).Length == 0);
    }

    [Fact]
    public void Findings_Processes_CheckIdsOwnRatiosAndEffects()
    {
        Process Make(string id, string per, params (string, double)[] ratios) => new(id, per, ratios.ToDictionary(r => r.Item1, r => r.Item2));
        MixingModel model = Model() with
        {
            Processes =
            [
                Make("a", "silicate", ("silicate", 1)),
                Make("p", "phosphate", ("phosphate", 2), ("oxygen", -170)),
                Make("q", "nitrate", ("oxygen", -10)),
                Make("r", "phosphat", ("phosphat", 1), ("oxygen", double.NaN)),
                Make("s", "total_alkalinity", ("total_alkalinity", 1), ("dissolved_inorganic_carbon", 0.5)),
                Make("t", "silicate"),
            ],
        };

        IReadOnlyList<Finding> findings = ModelCheck.Findings(model);

        Assert.Equal(
            ["/processes/0/id", "/processes/1/ratios/phosphate", "/processes/2/ratios/nitrate", "/processes/3/per", "/processes/3/ratios/phosphat", "/processes/3/ratios/oxygen", "/processes/5/ratios/silicate"],
            findings.Where(f => f.Severity == Severity.Error).Select(f => f.Path));
        Assert.Equal(["/processes/4/ratios/dissolved_inorganic_carbon"], findings.Where(f => f.Severity == Severity.Note).Select(f => f.Path));
        Assert.Contains(findings, f => f.Severity == Severity.Warning && f.Path == "/processes/4/ratios");
    }

    [Fact]
    public void Findings_RatiosThatCancelInADerivedTracer_SayThatTheProcessIsOff()
    {
        // 170 oxygen for 16 nitrate is the very ratio that makes NO conservative.
        MixingModel model = Model(tracers: ["no"]) with
        {
            Processes = [new Process("respiration", "nitrate", new Dictionary<string, double> { ["nitrate"] = 1, ["oxygen"] = -170.0 / 16 })],
        };

        Assert.Contains(ModelCheck.Findings(model), f => f.Severity == Severity.Warning && f.Path == "/processes/0/ratios");
    }

    [Fact]
    public void Findings_SilicateWithoutAProcess_WarnOfTheBias()
    {
        Finding finding = Assert.Single(ModelCheck.Findings(Model() with { Processes = [] }));

        Assert.Equal((Severity.Warning, "/tracers/5"), (finding.Severity, finding.Path));
        Assert.Contains("silicate-rich", finding.Remedy, StringComparison.Ordinal);
    }

    [Fact]
    public void Findings_IdenticalEndMembers_WarnThatFractionsAreNotUnique()
    {
        MixingModel model = Model();
        EndMember twin = model.EndMembers.EndMembers[0] with { Id = "Twin" };
        MixingModel with = model with { EndMembers = model.EndMembers with { EndMembers = [.. model.EndMembers.EndMembers, twin] } };

        Finding finding = Assert.Single(ModelCheck.Findings(with));

        Assert.Equal((Severity.Warning, "/endMembers/endMembers/3"), (finding.Severity, finding.Path));
        Assert.Empty(ModelCheck.Findings(with with { Layers = [new Layer("l", ["A", "B"], [new Condition("pressure", 0, 9)]), new Layer("m", ["B", "Twin"], [])] }));
    }

    [Theory]
    [InlineData(2, false)]
    [InlineData(1, true)]
    public void Findings_MoreUnknownsThanTracers_WarnOnceForTheLayer(int tracers, bool warns)
    {
        MixingModel model = Model(tracers: SixTracers[..tracers]) with { Processes = [] };

        Assert.Equal(warns ? ["/tracers"] : [], ModelCheck.Findings(model).Where(f => f.Severity == Severity.Warning).Select(f => f.Path));
    }

    [Fact]
    public void Findings_WeightedRowsWithoutOrWithLittleSpread_WarnPerLayer()
    {
        MixingModel model = Model(everyValue: null) with { Fit = Rows(SixTracers) with { MeasurementSd = new Dictionary<string, MeasurementError> { ["oxygen"] = new(50) } } };
        EndMember[] flat = [.. model.EndMembers.EndMembers.Select(e => e with { Values = new Dictionary<string, double>(e.Values) { ["silicate"] = 7 } })];
        MixingModel with = model with { EndMembers = model.EndMembers with { EndMembers = flat } };

        Assert.Equal(["/tracers/2", "/tracers/5"], ModelCheck.Findings(with).Where(f => f.Severity == Severity.Warning).Select(f => f.Path));
        Assert.DoesNotContain(
            ModelCheck.Findings(with with { Fit = Rows(SixTracers) with { Standardise = Standardisation.None } }),
            f => f.Severity == Severity.Warning);
    }

    [Fact]
    public void Findings_FlagsOutsideTheTables_AreErrors() => Assert.Equal(
        ["/acceptFlags/1", "/acceptCtdFlags/0"],
        Errors(Model() with { AcceptFlags = [2, 10], AcceptCtdFlags = [-1] }).Select(f => f.Path));

    [Fact]
    public void Findings_FaultsOfTheSet_HavePathsInTheModel()
    {
        MixingModel model = Model();
        EndMember broken = model.EndMembers.EndMembers[0] with { Observations = 0, Id = "b" };

        Assert.Equal(
            ["/endMembers/endMembers/0/observations", "/endMembers/endMembers/1/id"],
            Errors(model with { EndMembers = model.EndMembers with { EndMembers = [broken, .. model.EndMembers.EndMembers.Skip(1)] } }).Select(f => f.Path));
    }

    private static Finding[] Errors(MixingModel model) => [.. ModelCheck.Findings(model).Where(f => f.Severity == Severity.Error)];

    private static GeneralisedLeastSquares Gls(IReadOnlyList<string> quantities) => new() { MeasurementSd = quantities.ToDictionary(q => q, _ => new MeasurementError(0.01)) };

    private static WeightedRows Rows(IReadOnlyList<string> tracers) => new(tracers.ToDictionary(t => t, _ => 2.0));

    private static EndMember Without(EndMember endMember, string quantity) => endMember with
    {
        Values = endMember.Values.Where(v => v.Key != quantity).ToDictionary(),
        Sd = endMember.Sd.Where(v => v.Key != quantity).ToDictionary(),
    };

    // Three end-members; with everyValue the tracers themselves have values near it.
    private static MixingModel Model(string[]? tracers = null, double? everyValue = null)
    {
        string[] fitted = tracers ?? SixTracers;
        string[] quantities = everyValue is null ? SixTracers : fitted;
        double[][] values = [[3, 35, 280, 16, 1.1, 10], [-0.4, 34.7, 240, 32, 2.2, 120], [12, 36.5, 200, 10, 0.7, 7.5]];
        EndMember[] endMembers = [.. new[] { "A", "B", "C" }.Select((id, i) => new EndMember(
            id,
            "",
            quantities.Select((q, j) => (q, everyValue is null ? values[i][j] : everyValue.Value + i + (j * i * i))).ToDictionary(),
            new Provenance(ProvenanceKind.Manual))
        {
            Sd = quantities.ToDictionary(q => q, _ => 0.1),
            Observations = 4,
        })];
        Process[] processes = fitted.Contains("silicate") ? [new Process("opal", "silicate", new Dictionary<string, double> { ["silicate"] = 1 })] : [];
        return new MixingModel("m", new EndMemberSet("s", 1, endMembers), fitted, Gls(quantities), MassConservation.Exact) { Processes = processes };
    }
}
