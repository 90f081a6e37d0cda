namespace WaterMix.Web.Hosting;

/// <summary>A part of a multipart body.</summary>
/// <param name="Field">The form field's name.</param>
/// <param name="Name">The file's name, without folders; empty where the part is a plain field.</param>
/// <param name="Content">The bytes, readable until the next part is asked for.</param>
internal sealed record MultipartFile(string Field, string Name, Stream Content);
