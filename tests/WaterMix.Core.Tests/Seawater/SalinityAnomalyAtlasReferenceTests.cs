using WaterMix.Core.Seawater;
using WaterMix.Testing;

namespace WaterMix.Core.Tests.Seawater;

/// <summary>Reference. The embedded atlas holds the values of the TEOS-10 atlas bit for bit.</summary>
public class SalinityAnomalyAtlasReferenceTests
{
    [Fact]
    public void ColumnAt_EveryNode_EqualsTheAtlasBitForBit()
    {
        ReferenceTable atlas = ReferenceTable.OpenFile(TestData.File("teos10/saar_grid.csv"));
        var seen = new HashSet<(int, int)>();
        for (int row = 0; row < atlas.Count; row++)
        {
            int i = SalinityAnomalyAtlas.Longitudes.IndexOf(atlas[row, "lon"]);
            int j = SalinityAnomalyAtlas.Latitudes.IndexOf(atlas[row, "lat"]);
            Assert.True(seen.Add((i, j)));
            Assert.Equal(double.IsNaN(atlas[row, "ndepth"]) ? 0 : (int)atlas[row, "ndepth"], SalinityAnomalyAtlas.LevelsAt(i, j));
            ReadOnlySpan<double> column = SalinityAnomalyAtlas.ColumnAt(i, j);
            for (int k = 0; k < column.Length; k++)
            {
                double published = atlas[row, FormattableString.Invariant($"p{SalinityAnomalyAtlas.Pressures[k]}")];
                Assert.True(double.IsNaN(published)
                    ? double.IsNaN(column[k])
                    : BitConverter.DoubleToInt64Bits(published) == BitConverter.DoubleToInt64Bits(column[k]));
            }
        }

        Assert.Equal(3243, seen.Count);
        for (int i = 0; i < SalinityAnomalyAtlas.Longitudes.Length; i++)
        {
            for (int j = 0; j < SalinityAnomalyAtlas.Latitudes.Length; j++)
            {
                if (!seen.Contains((i, j)))
                {
                    Assert.Equal(0, SalinityAnomalyAtlas.LevelsAt(i, j));
                    Assert.All(SalinityAnomalyAtlas.ColumnAt(i, j).ToArray(), value => Assert.True(double.IsNaN(value)));
                }
            }
        }
    }
}
