using CsCheck;
using WaterMix.Core.Mixing;
using WaterMix.Web.State.Results;

namespace WaterMix.Web.Tests.State.Results;

public class RowSelectionTests
{
    private static readonly RunResults Results = TwoLayers.Results(cruises: 2);

    public static TheoryData<RowFilter, int[]> Filters => new()
    {
        { new RowFilter { Status = SolveStatus.TooFewTracers }, [3, 11] },
        { new RowFilter { Layer = "deep", Cruise = 2 }, [10, 11, 14] },
        { new RowFilter { Conditions = [new RowCondition("fraction_B", 0.3, 0.7)] }, [0, 2, 4, 8, 10, 12] },
        { new RowFilter { Conditions = [new RowCondition("pressure", 2500, null)], Cruise = 1 }, [3, 7] },
        { new RowFilter { Layer = "middle" }, [] },
        { new RowFilter { Cruise = 3 }, [] },
        { new RowFilter { Conditions = [new RowCondition("no_such_column", 0, null)] }, [] },
    };

    [Theory]
    [MemberData(nameof(Filters))]
    public void Of_Filter_LetsTheRowsPassInTheirOrder(RowFilter filter, int[] expected) => Assert.Equal(expected, RowSelection.Of(Results, filter));

    [Fact]
    public void Of_NoFilter_IsNullForEveryRow() => Assert.Null(RowSelection.Of(Results, RowFilter.None));

    // Agreement: the sort over arrays against the obvious one of the library, with ties and missing values.
    [Fact]
    public void Sorted_AnyKeys_AgreesWithAStableSortThatPutsMissingLast() =>
        Gen.Select(Gen.OneOf(Gen.Int[-3, 3].Select(i => (double)i), Gen.Const(double.NaN)).Array[0, 60], Gen.Bool).Sample((keys, descending) =>
        {
            int[] rows = [.. Enumerable.Range(0, keys.Length).Where(r => r % 5 != 4)];
            IEnumerable<int> present = rows.Where(r => !double.IsNaN(keys[r]));
            IEnumerable<int> expected = (descending ? present.OrderByDescending(r => keys[r]) : present.OrderBy(r => keys[r])).Concat(rows.Where(r => double.IsNaN(keys[r])));
            Assert.Equal(expected, RowSelection.Sorted(rows, keys, descending));
        });

    [Fact]
    public void Sorted_ByStation_ReadsNumbersInNamesByValue()
    {
        ResultColumn station = Results.Table.Single(c => c.Id == "station");

        int[] sorted = RowSelection.Sorted([4, 0, 5, 1], station.Keys, descending: false);

        Assert.Equal(["S2", "S2", "S10", "S10"], sorted.Select(station.Text));
    }
}
