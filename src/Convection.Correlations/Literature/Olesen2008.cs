using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>B.W. Olesen, 29th AIVC Conference, Kyoto, 2008 (title not recorded).</summary>
/// <remarks>
/// <para>Basis: a cooled floor: total about 7, of which 5.5 radiant (both quoted); the difference is 1.5 W/(m²·K).</para>
/// <para>
/// The total refers to operative temperature, so that the convective part is indicative. It is kept for comparison and never chosen,
/// because a room's state holds no operative temperature.
/// </para>
/// </remarks>
internal static class Olesen2008
{
    public static Publication Publication { get; } = new()
    {
        Key = "olesen-2008",
        Authors = "B.W. Olesen",
        Year = 2008,
        Title = "(title not recorded)",
        Source = "29th AIVC Conference, Kyoto",
        ShortName = "Olesen (2008)",
    };

    public static Correlation[] All { get; } =
    [
        Make("floor-cooled-convective", "chilled floor, total less radiant part", SurfaceSet.Floor, HeatFlowSense.Down, new PowerLaw(7 - 5.5, 0), TextCheck.Quoted, "A difference of two quoted numbers, the total against operative temperature: indicative only."),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, Law law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.FixedValue,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.Panel },
        Law = law,
        Reference = ReferenceTemperature.Operative,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.ClimateChamber, "cooled floor; total and radiant part"),
        TextCheck = check,
        IsUnconfirmed = true,
        IsReferenceOnly = true,
        Doubts = doubts,
    };
}
