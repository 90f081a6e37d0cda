using System.IO.Pipes;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

public class SpooledInputTests
{
    [Fact]
    public void Open_AgainAndAgain_GivesTheBytesFromTheirBeginning()
    {
        byte[] bytes = new byte[300_000];
        new Random(1).NextBytes(bytes);
        using var spooled = new SpooledInput(new BoundedStream(new MemoryStream(bytes), bytes.Length), TestContext.Current.CancellationToken);

        using (Stream begun = spooled.Open())
        {
            begun.ReadExactly(new byte[1000]);
        }

        for (int i = 0; i < 2; i++)
        {
            using Stream stream = spooled.Open();
            var copy = new MemoryStream();
            stream.CopyTo(copy);
            Assert.Equal(bytes, copy.ToArray());
        }
    }

    [Fact]
    public async Task Spooling_OfAPipeThatSaysNothing_CanBeCancelled()
    {
        using var server = new AnonymousPipeServerStream(PipeDirection.Out);
        using var client = new AnonymousPipeClientStream(PipeDirection.In, server.ClientSafePipeHandle);
        using var source = new CancellationTokenSource();
        CancellationToken cancellation = source.Token;

        Task<SpooledInput> spooling = Task.Run(() => new SpooledInput(client, cancellation), TestContext.Current.CancellationToken);
        await source.CancelAsync();

        await Assert.ThrowsAnyAsync<OperationCanceledException>(() => spooling.WaitAsync(TimeSpan.FromSeconds(30), TestContext.Current.CancellationToken));
        server.WriteByte(0);
    }
}
