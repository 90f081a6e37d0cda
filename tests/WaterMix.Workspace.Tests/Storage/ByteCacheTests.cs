using System.Runtime.CompilerServices;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Tests.Storage;

public class ByteCacheTests
{
    [Fact]
    public async Task Get_ManyAtOnce_LoadsOnce()
    {
        var cache = new ByteCache(1000);
        int loads = 0;

        byte[][] values = await Task.WhenAll(Enumerable.Range(0, 50).Select(_ => cache.GetAsync("a", () => LoadAsync(10, () => Interlocked.Increment(ref loads)), v => v.Length)));

        Assert.Equal(1, loads);
        Assert.All(values, v => Assert.Same(values[0], v));
        Assert.Equal(10, cache.Bytes);
    }

    [Fact]
    public async Task Get_BeyondTheBound_LetsTheLeastRecentGo()
    {
        var cache = new ByteCache(100);
        await FillAsync(cache);
        GC.Collect();
        int loads = 0;
        Task<byte[]> Get(string key) => cache.GetAsync(key, () => LoadAsync(40, () => loads++), v => v.Length);

        await Get("a");
        await Get("c");
        Assert.Equal(0, loads);
        await Get("b");

        Assert.Equal(1, loads);
        Assert.Equal(80, cache.Bytes);
    }

    [Fact]
    public async Task Get_WhatWentButIsStillHeld_IsTheSame()
    {
        var cache = new ByteCache(50);
        byte[] held = await cache.GetAsync("a", () => LoadAsync(40, () => { }), v => v.Length);
        await cache.GetAsync("b", () => LoadAsync(40, () => { }), v => v.Length);

        byte[] again = await cache.GetAsync("a", () => LoadAsync(40, () => Assert.Fail("loaded twice")), v => v.Length);

        Assert.Same(held, again);
        Assert.Equal(40, cache.Bytes);
    }

    [Fact]
    public async Task Get_AValueLargerThanTheBound_IsKeptUntilTheNext()
    {
        var cache = new ByteCache(50);

        await cache.GetAsync("a", () => LoadAsync(200, () => { }), v => v.Length);
        await cache.GetAsync("a", () => LoadAsync(200, () => Assert.Fail("loaded twice")), v => v.Length);

        Assert.Equal(200, cache.Bytes);
    }

    [Fact]
    public async Task Get_AfterALoadThatFailed_LoadsAgain()
    {
        var cache = new ByteCache(50);
        await Assert.ThrowsAsync<InvalidDataException>(() => cache.GetAsync<byte[]>("a", () => throw new InvalidDataException(), v => v.Length));

        Assert.Equal(3, (await cache.GetAsync("a", () => LoadAsync(3, () => { }), v => v.Length)).Length);
    }

    // "a" is asked for again before "c" comes, so "b" goes. In a method of its own, so that nothing holds the values.
    [MethodImpl(MethodImplOptions.NoInlining)]
    private static async Task FillAsync(ByteCache cache)
    {
        foreach (string key in (string[])["a", "b", "a", "c"])
        {
            await cache.GetAsync(key, () => LoadAsync(40, () => { }), v => v.Length);
        }
    }

    private static async Task<byte[]> LoadAsync(int bytes, Action loading)
    {
        loading();
        await Task.Yield();
        return new byte[bytes];
    }
}
