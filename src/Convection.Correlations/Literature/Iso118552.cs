using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>ISO 11855-2:2012, Building environment design. Embedded radiant heating and cooling systems, Part 2 (edition recalled).</summary>
/// <remarks>
/// <para>Basis: conventions for embedded systems: totals of radiation and convection against operative temperature.</para>
/// <para>
/// Check: 7 for the cooled floor is quoted (Olesen, 29th AIVC Conference, 2008: about 7, of which 5.5 radiant); the others are recalled
/// (high). EN 1264-5 has 6.5, 6.5 and 10.8.
/// </para>
/// </remarks>
internal static class Iso118552
{
    private const string TotalDoubt = "Radiation is contained, against operative temperature: never a convective coefficient.";

    public static Publication Publication { get; } = new()
    {
        Key = "iso-11855-2-2012",
        Authors = "ISO",
        Year = 2012,
        Title = "ISO 11855-2, Building environment design - Embedded radiant heating and cooling systems - Part 2 (edition recalled)",
        Source = "International Organization for Standardization, Geneva",
        ShortName = "ISO 11855-2 (2012)",
    };

    public static Correlation[] All { get; } =
    [
        Make("wall-total", "total, heated or chilled wall", SurfaceSet.Wall, HeatFlowSense.Horizontal, new PowerLaw(8, 0), TextCheck.RecalledHigh, TotalDoubt),
        Make("ceiling-heated-total", "total, heated ceiling", SurfaceSet.Ceiling, HeatFlowSense.Down, new PowerLaw(6, 0), TextCheck.RecalledHigh, TotalDoubt, "EN 1264-5 has 6.5."),
        Make("floor-cooled-total", "total, chilled floor", SurfaceSet.Floor, HeatFlowSense.Down, new PowerLaw(7, 0), TextCheck.Quoted, TotalDoubt, "EN 1264-5 has 6.5."),
        Make("ceiling-cooled-total", "total, chilled ceiling", SurfaceSet.Ceiling, HeatFlowSense.Up, new PowerLaw(8.92, 0.1), TextCheck.RecalledHigh, TotalDoubt, "EN 1264-5 has a constant 10.8."),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, Law law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Total,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.Panel },
        Law = law,
        Reference = ReferenceTemperature.Operative,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.Standard, "a convention for embedded systems"),
        TextCheck = check,
        IsUnconfirmed = check >= TextCheck.RecalledMedium,
        Doubts = doubts,
    };
}
