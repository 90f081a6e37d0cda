using WaterMix.Web.Components.Common;

namespace WaterMix.Web.Tests.Components.Common;

public sealed class SentFilesTests
{
    private readonly SentFiles _files = new();

    [Fact]
    public void HandOver_EveryFileReceived_OnceOnly()
    {
        _files.Add([new SentFile(0, "a.csv", 10), new SentFile(1, "b.csv", 20)]);
        _files.Receive(0);
        Assert.Null(_files.HandOver());
        _files.Receive(1);

        Assert.Equal(_files.Upload, _files.HandOver());
        Assert.Null(_files.HandOver());
    }

    [Fact]
    public void HandOver_OneRefused_WaitsUntilItIsTakenOff()
    {
        _files.Add([new SentFile(0, "a.csv", 10), new SentFile(1, "b.csv", 20)]);
        _files.Receive(0);
        _files.Refuse(1, "Too large.");
        Assert.Null(_files.HandOver());

        _files.Remove(1);
        Assert.Equal(_files.Upload, _files.HandOver());
    }

    [Fact]
    public void HandOver_AllTakenOff_HandsNothingOver()
    {
        _files.Add([new SentFile(0, "a.csv", 10)]);
        _files.Remove(0);

        Assert.Null(_files.HandOver());
    }

    [Fact]
    public void Add_AfterHandingOver_StartsAnotherUpload()
    {
        _files.Add([new SentFile(0, "a.csv", 10)]);
        _files.Receive(0);
        Guid first = _files.HandOver()!.Value;

        _files.Add([new SentFile(1, "b.csv", 20)]);

        Assert.NotEqual(first, _files.Upload);
        Assert.Equal("b.csv", Assert.Single(_files.Files).Name);
    }

    [Fact]
    public void Begin_TakenOffMeanwhile_MustNotBeSent()
    {
        _files.Add([new SentFile(0, "a.csv", 10)]);
        _files.Remove(0);

        Assert.False(_files.Begin(0));
    }

    [Theory]
    [InlineData(999, "a.csv, 999 bytes, 41 % sent")]
    [InlineData(41_943_040, "a.csv, 41.9 MB, 41 % sent")]
    [InlineData(2_500_000_000, "a.csv, 2.50 GB, 41 % sent")]
    public void Words_OnTheWay_SayHowFar(long bytes, string expected)
    {
        _files.Add([new SentFile(0, "a.csv", bytes)]);
        _files.Begin(0);
        _files.Progress(0, 0.419);

        Assert.Equal(expected, _files.Files[0].Words);
    }
}
