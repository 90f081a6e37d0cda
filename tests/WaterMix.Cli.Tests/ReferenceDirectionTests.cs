using System.Xml.Linq;
using WaterMix.Testing;

namespace WaterMix.Cli.Tests;

/// <summary>References run one way, so that any formula can be tried without a file, a database or a page.</summary>
public class ReferenceDirectionTests
{
    // Every project of src, with the projects that it may refer to.
    private static readonly Dictionary<string, string[]> Permitted = new()
    {
        ["WaterMix.Core"] = [],
        ["WaterMix.Formats"] = ["WaterMix.Core"],
        ["WaterMix.Workspace"] = ["WaterMix.Core", "WaterMix.Formats"],
        ["WaterMix.Web"] = ["WaterMix.Core", "WaterMix.Formats", "WaterMix.Workspace"],
        ["WaterMix.Cli"] = ["WaterMix.Core", "WaterMix.Formats", "WaterMix.Workspace"],
    };

    public static TheoryData<string> Projects =>
        [.. Directory.GetFiles(Path.Combine(TestData.Root, "src"), "*.csproj", SearchOption.AllDirectories)];

    [Theory]
    [MemberData(nameof(Projects))]
    public void ProjectReferences_PointOneWay(string project)
    {
        string name = Path.GetFileNameWithoutExtension(project);
        Assert.True(Permitted.TryGetValue(name, out string[]? permitted), $"{name} is not among the projects of the design.");

        IEnumerable<string> references = Elements(project, "ProjectReference").Select(r => Path.GetFileNameWithoutExtension(r.Replace('\\', '/')));

        Assert.All(references, reference => Assert.Contains(reference, permitted!));
    }

    [Fact]
    public void Core_NeedsNothingButMathNet()
    {
        string project = Path.Combine(TestData.Root, "src", "WaterMix.Core", "WaterMix.Core.csproj");

        Assert.Equal(["MathNet.Numerics"], Elements(project, "PackageReference"));
        Assert.Empty(Elements(project, "FrameworkReference"));
    }

    [Fact]
    public void CompiledAssemblies_ReferToNoMoreThanTheirProjects()
    {
        foreach ((string name, string[] permitted) in Permitted)
        {
            if (Path.Combine(AppContext.BaseDirectory, name + ".dll") is var path && File.Exists(path))
            {
                IEnumerable<string> references = System.Reflection.Assembly.LoadFrom(path).GetReferencedAssemblies()
                    .Select(r => r.Name!).Where(r => r.StartsWith("WaterMix.", StringComparison.Ordinal));
                Assert.All(references, reference => Assert.Contains(reference, permitted));
            }
        }
    }

    private static IEnumerable<string> Elements(string project, string element) =>
        XDocument.Load(project).Descendants(element).Select(e => e.Attribute("Include")!.Value);
}
