using WaterMix.SampleData;

// dotnet run --project tests/WaterMix.SampleData -- sample-data
if (args.Length != 1)
{
    Console.Error.WriteLine("Expected the folder to write to, such as sample-data.");
    return 2;
}

foreach ((string name, byte[] bytes) in SampleFiles.Make(Cruise.Seed))
{
    string path = Path.Combine(args[0], name);
    Directory.CreateDirectory(Path.GetDirectoryName(path)!);
    File.WriteAllBytes(path, bytes);
    Console.WriteLine($"{path} {bytes.Length} bytes");
}

return 0;
