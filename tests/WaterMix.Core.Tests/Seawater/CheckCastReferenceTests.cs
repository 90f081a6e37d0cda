using WaterMix.Core.Seawater;

namespace WaterMix.Core.Tests.Seawater;

/// <summary>
/// Reference. The check casts that SCOR/IAPSO WG127 publishes with its TEOS-10 toolbox (three casts, the third in the Baltic) and the
/// absolute differences it allows: tests/Reference/seawater/gsw_check_casts.csv and gsw_check_tolerances.csv, unaltered; see NOTICE.
/// </summary>
public class CheckCastReferenceTests
{
    private static readonly ReferenceTable Casts = ReferenceTable.Open("gsw_check_casts.csv");

    private static readonly Dictionary<string, double> Tolerances = ReadTolerances();

    private static readonly Dictionary<string, Func<Level, double>> Computed = new(StringComparer.Ordinal)
    {
        ["SA_from_SP"] = l => AbsoluteSalinity.FromPractical(l.SP, l.P, l.Longitude, l.Latitude),
        ["SR_from_SP"] = l => ReferenceSalinity.FromPractical(l.SP),
        ["deltaSA_from_SP"] = l => l.SA - ReferenceSalinity.FromPractical(l.SP),
        ["SP_from_SA"] = l => PracticalSalinity.FromAbsolute(l.SA, l.P, l.Longitude, l.Latitude),
        ["CT_from_t"] = l => ConservativeTemperature.FromInSitu(l.SA, l.T, l.P),
        ["pt0_from_t"] = l => PotentialTemperature.FromInSitu(l.SA, l.T, l.P),
        ["pt_from_t"] = l => PotentialTemperature.FromInSitu(l.SA, l.T, l.P, 0),
        ["CT_from_pt"] = l => ConservativeTemperature.FromPotential(l.SA, l.Pt0),
        ["pt_from_CT"] = l => PotentialTemperature.FromConservative(l.SA, l.CT),
        ["t_from_CT"] = l => InSituTemperature.FromConservative(l.SA, l.CT, l.P),
        ["rho"] = l => Density.FromConservative(l.SA, l.CT, l.P),
        ["specvol"] = l => Density.SpecificVolume(l.SA, l.CT, l.P),
        ["alpha"] = l => Density.ThermalExpansion(l.SA, l.CT, l.P),
        ["beta"] = l => Density.HalineContraction(l.SA, l.CT, l.P),
        ["alpha_on_beta"] = l => Density.ThermalExpansion(l.SA, l.CT, l.P) / Density.HalineContraction(l.SA, l.CT, l.P),
        ["sigma0"] = l => Density.PotentialAnomaly(l.SA, l.CT, 0),
        ["sigma1"] = l => Density.PotentialAnomaly(l.SA, l.CT, 1000),
        ["sigma2"] = l => Density.PotentialAnomaly(l.SA, l.CT, 2000),
        ["sigma3"] = l => Density.PotentialAnomaly(l.SA, l.CT, 3000),
        ["sigma4"] = l => Density.PotentialAnomaly(l.SA, l.CT, 4000),
        ["z_from_p"] = l => -Depth.FromPressure(l.P, l.Latitude),
        ["p_from_z"] = l => SeaPressure.FromDepth(Depth.FromPressure(l.P, l.Latitude), l.Latitude),
        ["grav"] = l => Gravity.At(l.P, l.Latitude),
        ["O2sol"] = l => OxygenSolubility.FromAbsolute(l.SA, l.CT, l.P, l.Longitude, l.Latitude),
        ["O2sol_SP_pt"] = l => OxygenSolubility.FromPractical(l.SP, l.Pt0),
    };

    public static TheoryData<string> Quantities => [.. Computed.Keys];

    [Theory]
    [MemberData(nameof(Quantities))]
    public void EveryLevel_WithinPublishedTolerance(string quantity)
    {
        int levels = 0;
        for (int row = 0; row < Casts.Count; row++)
        {
            double published = Casts[row, quantity];
            if (double.IsNaN(published))
            {
                continue;
            }

            double computed = Computed[quantity](new Level(row));
            Assert.True(
                Math.Abs(computed - published) <= Tolerances[quantity],
                $"{quantity}, cast {Casts[row, "cast"]}, level {Casts[row, "level"]}: computed {computed:R}, published {published:R}.");
            levels++;
        }

        Assert.Equal(98, levels);
    }

    private static Dictionary<string, double> ReadTolerances()
    {
        ReferenceTable table = ReferenceTable.Open("gsw_check_tolerances.csv");
        return Enumerable.Range(0, table.Count)
            .ToDictionary(row => table.Text(row, "quantity"), row => table[row, "allowed_abs_difference"], StringComparer.Ordinal);
    }

    /// <summary>One level of the casts; like the published checks, each function takes the published values as its inputs.</summary>
    private readonly record struct Level(int Row)
    {
        public double Longitude => Casts[Row, "lon"];

        public double Latitude => Casts[Row, "lat"];

        public double SP => Casts[Row, "SP_chck_cast"];

        public double T => Casts[Row, "t_chck_cast"];

        public double P => Casts[Row, "p_chck_cast"];

        public double SA => Casts[Row, "SA_from_SP"];

        public double CT => Casts[Row, "CT_from_t"];

        public double Pt0 => Casts[Row, "pt0_from_t"];
    }
}
