using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>Everything that the figures of the page show, ready to draw.</summary>
/// <param name="Rows">The rows on screen, of all cruises.</param>
/// <param name="Stations">The stations with samples on screen.</param>
/// <param name="Facts">Where and when they were taken: what it is and its value.</param>
/// <param name="Section">The casts of one cruise as a section.</param>
/// <param name="Property">The property plot.</param>
/// <param name="Profiles">The profiles at one station.</param>
/// <param name="Difference">Bottle against CTD; null where no quantity has both.</param>
public sealed record SampleFigures(
    int[] Rows, IReadOnlyList<MapStation> Stations, IReadOnlyList<(string Label, string Value)> Facts, SectionOfCasts Section, PropertyPlot Property, StationProfiles Profiles, InstrumentDifference? Difference);
