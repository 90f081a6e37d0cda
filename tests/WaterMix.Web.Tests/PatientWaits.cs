using System.Runtime.CompilerServices;
using Bunit;

namespace WaterMix.Web.Tests;

/// <summary>Waits end as soon as what is waited for is there; a busy machine gets half a minute for it.</summary>
internal static class PatientWaits
{
    [ModuleInitializer]
    internal static void Set() => BunitContext.DefaultWaitTimeout = TimeSpan.FromSeconds(30);
}
