using WaterMix.Core.Seawater;
using WaterMix.Testing;

namespace WaterMix.Core.Tests.Seawater;

/// <summary>
/// Reference. Potential temperatures that were delivered with a cruise of 1994 (49K619940107, section P02; open data, bottle/btl_csv.csv),
/// computed by others with EOS-80 and printed to four decimals, as are the in-situ temperatures.
/// </summary>
public class PotentialTemperatureOpenDataTests
{
    [Fact]
    public void FromInSitu_CruiseOf1994_EqualsWhatWasDelivered()
    {
        ReferenceTable bottles = ReferenceTable.OpenFile(TestData.File("bottle/btl_csv.csv"));
        for (int row = 0; row < bottles.Count; row++)
        {
            double delivered = bottles[row, "THETA [DEG C]"];
            double t = bottles[row, "CTDTMP [ITS-90]"];
            double s = bottles[row, "CTDSAL [PSS-78]"];
            double p = bottles[row, "CTDPRS [DBAR]"];

            // Half of the last digit of both temperatures.
            Assert.Equal(delivered, Eos80.PotentialTemperature(s, t, p, 0), 0.0001);

            // The two standards differ by a few thousandths of a degree at depth, from memory.
            Assert.Equal(delivered, PotentialTemperature.FromInSitu(ReferenceSalinity.FromPractical(s), t, p), 0.003);
        }

        Assert.InRange(bottles.Count, 30, 40);
    }
}
