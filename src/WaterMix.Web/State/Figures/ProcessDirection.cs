using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Figures;

/// <summary>Which way a process moves a sample in the plane of a property plot.</summary>
/// <param name="Id">The process.</param>
/// <param name="Dx">Change along x per unit of its amount.</param>
/// <param name="Dy">Change along y per unit of its amount.</param>
/// <param name="Sign">The sign that its amount may have.</param>
public sealed record ProcessDirection(string Id, double Dx, double Dy, ProcessSign Sign)
{
    /// <summary>The processes of a model in the plane of two tracers; those that move neither are left out.</summary>
    /// <param name="processes">The processes.</param>
    /// <param name="x">Quantity id along x; may be a derived tracer.</param>
    /// <param name="y">Quantity id along y.</param>
    /// <param name="factors">The factors of derived tracers.</param>
    public static IReadOnlyList<ProcessDirection> Of(IReadOnlyList<Process> processes, string x, string y, DerivedTracerFactors factors)
    {
        ArgumentNullException.ThrowIfNull(processes);
        ArgumentNullException.ThrowIfNull(factors);
        return
        [
            .. processes
                .Select(p => new ProcessDirection(p.Id, Change(p, x, factors), Change(p, y, factors), p.Sign))
                .Where(d => d.Dx != 0 || d.Dy != 0),
        ];
    }

    private static double Change(Process process, string tracer, DerivedTracerFactors factors) =>
        factors.FormOf(tracer).Terms.Sum(term => term.Factor * process.Ratios.GetValueOrDefault(term.Parent));
}
