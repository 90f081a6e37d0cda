/// <summary>
/// A fault put into the command from outside (the runtime calls this first where DOTNET_STARTUP_HOOKS names this assembly): its standard
/// output throws what nobody foresees.
/// </summary>
#pragma warning disable CA1050 // The runtime asks for this name without a namespace.
internal static class StartupHook
{
    public static void Initialize() => Console.SetOut(new FaultyWriter());

    private sealed class FaultyWriter : StringWriter
    {
        public override void Write(string? value) => throw new InvalidOperationException("No writer today.\nNor tomorrow.");
    }
}
