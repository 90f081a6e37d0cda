namespace WaterMix.Web.Hosting;

/// <summary>Why the app does not start, in one sentence that says what to do.</summary>
/// <param name="message">The sentence.</param>
public sealed class StartException(string message) : Exception(message);
