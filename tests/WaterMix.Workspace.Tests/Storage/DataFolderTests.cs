using System.ComponentModel;
using System.Diagnostics;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Tests.Storage;

public class DataFolderTests
{
    [Fact]
    public void Open_InUse_IsRefusedWithWhatToDo()
    {
        using var scratch = new Scratch();
        using DataFolder first = DataFolder.Open(scratch.Folder);

        DataFolderInUseException refusal = Assert.Throws<DataFolderInUseException>(() => DataFolder.Open(scratch.Folder));

        Assert.Equal($"The data folder {scratch.Folder} is in use by another WaterMix. Close that one, or set WATERMIX_DATA to another folder.", refusal.Message);
    }

    [Fact]
    public async Task StartOfASecondApp_OnTheSameFolder_IsRefused()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace first = await OpenWorkspace.AtAsync(scratch.Folder);

        await Assert.ThrowsAsync<DataFolderInUseException>(() => OpenWorkspace.AtAsync(scratch.Folder));
    }

    [Fact]
    public void Open_AfterDispose_Opens()
    {
        using var scratch = new Scratch();
        DataFolder.Open(scratch.Folder).Dispose();
        DataFolder.Open(scratch.Folder).Dispose();
    }

    // Agreement with the system's own lock: the flock command (util-linux) plays the other process.
    [Fact]
    public void Open_HeldByAProcessThatIsThenKilled_IsRefusedAndThenOpens()
    {
        using var scratch = new Scratch();
        using Process holder = HoldLock(scratch.Path("lock"));

        Assert.Throws<DataFolderInUseException>(() => DataFolder.Open(scratch.Folder));
        holder.Kill(entireProcessTree: true);
        holder.WaitForExit();

        using DataFolder opened = DataFolder.Open(scratch.Folder);
        Assert.True(File.Exists(scratch.Path("lock")));
    }

    [Fact]
    public void Open_WhatACrashLeftUnfinished_IsCleared()
    {
        using var scratch = new Scratch();
        DataFolder.Open(scratch.Folder).Dispose();
        string left = Path.Combine(scratch.Folder, "samples", "a" + NewFile.Unfinished);
        File.WriteAllText(left, "half");

        using DataFolder opened = DataFolder.Open(scratch.Folder);

        Assert.False(File.Exists(left));
    }

    [Fact]
    public void Open_AFileInThePlaceOfTheFolder_SaysWhatToDo()
    {
        using var scratch = new Scratch();
        File.WriteAllText(scratch.Path("taken"), "");

        IOException fault = Assert.Throws<IOException>(() => DataFolder.Open(scratch.Path("taken")));

        Assert.Contains("WATERMIX_DATA", fault.Message, StringComparison.Ordinal);
    }

    private static Process HoldLock(string path)
    {
        try
        {
            var process = Process.Start(new ProcessStartInfo("flock", ["--exclusive", "--no-fork", path, "sh", "-c", "echo held; exec sleep 60"]) { RedirectStandardOutput = true })!;
            Assert.Equal("held", process.StandardOutput.ReadLine());
            return process;
        }
        catch (Win32Exception)
        {
            Assert.Skip("The flock command is not here.");
            throw;
        }
    }
}
