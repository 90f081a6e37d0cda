using System.Diagnostics;
using System.Globalization;
using WaterMix.Core.Seawater;
using WaterMix.Testing;

namespace WaterMix.Core.Tests.Seawater;

/// <summary>
/// Reference. 2,960 points over the whole ocean against the Python package gsw 3.6.16: tests/Reference/seawater/gsw_reference.py, which
/// says how the points were drawn. Tolerances are a few units of the last place of each quantity's size;
/// heights and pressures differ by up to 5e-9, because the library's enthalpy of the standard ocean has its coefficients rounded
/// (h002 stands there as -3.03995719050e-5, half of v001 is -3.03995719045e-5); the published tolerance is 2.3e-8.
/// </summary>
public class GswReferenceTests
{
    private const string Python = "/usr/bin/python3";

    private static readonly ReferenceTable Points = ReferenceTable.Open("gsw_reference.csv.gz");

    private static readonly Dictionary<string, (Func<Point, double> Compute, double Tolerance)> Computed = new(StringComparer.Ordinal)
    {
        ["SA_from_SP"] = (x => AbsoluteSalinity.FromPractical(x.SP, x.P, x.Longitude, x.Latitude), 3e-14),
        ["SP_from_SA"] = (x => PracticalSalinity.FromAbsolute(x.SA, x.P, x.Longitude, x.Latitude), 3e-14),
        ["CT_from_t"] = (x => ConservativeTemperature.FromInSitu(x.SA, x.T, x.P), 1e-12),
        ["pt0_from_t"] = (x => PotentialTemperature.FromInSitu(x.SA, x.T, x.P), 1e-12),
        ["pt_from_t"] = (x => PotentialTemperature.FromInSitu(x.SA, x.T, x.P, x.Reference), 1e-12),
        ["CT_from_pt"] = (x => ConservativeTemperature.FromPotential(x.SA, x.Pt0), 1e-13),
        ["pt_from_CT"] = (x => PotentialTemperature.FromConservative(x.SA, x.CT), 1e-12),
        ["t_from_CT"] = (x => InSituTemperature.FromConservative(x.SA, x.CT, x.P), 1e-12),
        ["rho"] = (x => Density.FromConservative(x.SA, x.CT, x.P), 2e-12),
        ["rho_ref"] = (x => Density.PotentialAnomaly(x.SA, x.CT, x.Reference) + 1000, 2e-12),
        ["alpha"] = (x => Density.ThermalExpansion(x.SA, x.CT, x.P), 1e-17),
        ["beta"] = (x => Density.HalineContraction(x.SA, x.CT, x.P), 1e-17),
        ["z_from_p"] = (x => -Depth.FromPressure(x.P, x.Latitude), 1e-8),
        ["p_from_z"] = (x => SeaPressure.FromDepth(-x.Z, x.Latitude), 1e-8),
        ["grav"] = (x => Gravity.At(x.P, x.Latitude), 5e-14),
        ["O2sol"] = (x => OxygenSolubility.FromAbsolute(x.SA, x.CT, x.P, x.Longitude, x.Latitude), 1e-11),
        ["O2sol_SP_pt"] = (x => OxygenSolubility.FromPractical(x.SP, x.Pt0), 1e-11),
    };

    public static TheoryData<string> Quantities => [.. Computed.Keys];

    [Theory]
    [MemberData(nameof(Quantities))]
    public void EveryPoint_EqualsTheReferenceLibrary(string quantity)
    {
        (Func<Point, double> compute, double tolerance) = Computed[quantity];
        double worst = 0;
        for (int row = 0; row < Points.Count; row++)
        {
            double reference = Points[row, quantity];
            double computed = compute(new Point(row));
            double difference = Math.Abs(computed - reference);
            Assert.True(
                difference <= tolerance,
                $"{quantity} at {Points[row, "lon"]:R}E {Points[row, "lat"]:R}N {Points[row, "p"]:R} dbar, SP {Points[row, "SP"]:R}, t {Points[row, "t"]:R}: computed {computed:R}, reference {reference:R}.");
            worst = Math.Max(worst, difference);
        }

        Assert.Equal(2960, Points.Count);
        TestContext.Current.SendDiagnosticMessage(string.Create(CultureInfo.InvariantCulture, $"{quantity}: largest difference {worst}."));
    }

    [Fact]
    public void SalinityAnomalyAtlas_LandPoints_GiveZeroAsTheLibraryDoes()
    {
        int land = 0;
        for (int row = 0; row < Points.Count; row++)
        {
            var x = new Point(row);
            if (x.SA == ReferenceSalinity.FromPractical(x.SP))
            {
                Assert.Equal(0, SalinityAnomalyAtlas.Ratio(x.P, x.Longitude, x.Latitude));
                land++;
            }
        }

        Assert.InRange(land, 100, 2000);
    }

    [Fact]
    public void Squared_CheckCasts_EqualsTheReferenceLibrary()
    {
        // gsw_nsquared.csv, by the same script; tolerance: the published one for n2, gsw_check_tolerances.csv.
        ReferenceTable casts = ReferenceTable.Open("gsw_check_casts.csv");
        ReferenceTable reference = ReferenceTable.Open("gsw_nsquared.csv");
        int row = 0;
        foreach (IGrouping<double, int> cast in Enumerable.Range(0, casts.Count).GroupBy(r => casts[r, "cast"]))
        {
            int[] levels = [.. cast];
            double[] n2 = new double[levels.Length - 1];
            double[] middle = new double[levels.Length - 1];
            BuoyancyFrequency.Squared(
                Array.ConvertAll(levels, r => casts[r, "SA_from_SP"]),
                Array.ConvertAll(levels, r => casts[r, "CT_from_t"]),
                Array.ConvertAll(levels, r => casts[r, "p_chck_cast"]),
                casts[levels[0], "lat"],
                n2,
                middle);
            for (int i = 0; i < n2.Length; i++, row++)
            {
                Assert.Equal(reference[row, "p_mid"], middle[i]);
                Assert.Equal(reference[row, "n2"], n2[i], 1.5894187008202998e-14);
            }
        }

        Assert.Equal(reference.Count, row);
    }

    [Theory]
    [InlineData("gsw_reference.csv.gz", "points", "37")]
    [InlineData("gsw_nsquared.csv", "nsquared", "1")]
    public async Task Script_RunAgain_GivesTheStoredValues(string stored, string mode, string step)
    {
        ReferenceTable again = ReferenceTable.Parse(await RunScript(mode == "points" ? [mode, step] : [mode]));
        ReferenceTable table = ReferenceTable.Open(stored);
        int stride = int.Parse(step, CultureInfo.InvariantCulture);
        string[] columns = mode == "points" ? [.. Computed.Keys] : ["p_mid", "n2"];
        Assert.Equal((table.Count + stride - 1) / stride, again.Count);
        for (int row = 0; row < again.Count; row++)
        {
            foreach (string column in columns)
            {
                // Another machine's mathematics library may differ in the last places.
                double expected = table[row * stride, column];
                Assert.Equal(expected, again[row, column], Math.Abs(expected) * 1e-12);
            }
        }
    }

    private static async Task<string> RunScript(string[] arguments)
    {
        Assert.SkipUnless(File.Exists(Python), $"{Python} is not here; the stored reference values stay unchecked against a fresh run.");
        (int status, _) = await Run(["-c", "import gsw"]);
        Assert.SkipUnless(status == 0, $"{Python} has no package gsw (Debian: python3-gsw); the stored reference values stay unchecked against a fresh run.");
        (status, string output) = await Run([Path.Combine(TestData.Root, "tests", "Reference", "seawater", "gsw_reference.py"), .. arguments]);
        Assert.Equal(0, status);
        return output;
    }

    private static async Task<(int Status, string Output)> Run(string[] arguments)
    {
        using Process process = Process.Start(new ProcessStartInfo(Python, arguments) { RedirectStandardOutput = true, RedirectStandardError = true })!;
        Task<string> errors = process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        string output = await process.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken);
        await errors;
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
        return (process.ExitCode, output);
    }

    private readonly record struct Point(int Row)
    {
        public double Longitude => Points[Row, "lon"];

        public double Latitude => Points[Row, "lat"];

        public double P => Points[Row, "p"];

        public double Reference => Points[Row, "p_ref"];

        public double SP => Points[Row, "SP"];

        public double T => Points[Row, "t"];

        public double SA => Points[Row, "SA_from_SP"];

        public double CT => Points[Row, "CT_from_t"];

        public double Pt0 => Points[Row, "pt0_from_t"];

        public double Z => Points[Row, "z_from_p"];
    }
}
