namespace WaterMix.Web.Hosting;

/// <summary>What a page needs to send files.</summary>
/// <param name="Header">The header's name.</param>
/// <param name="Value">What it must hold.</param>
internal sealed record UploadToken(string Header, string Value);
