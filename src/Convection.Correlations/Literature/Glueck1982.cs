using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>B. Glück, Strahlungsheizung: Theorie und Praxis, C.F. Müller, 1982 (edition recalled), and later design notes.</summary>
/// <remarks>
/// <para>Basis: German practice of radiant design.</para>
/// <para>Symbols: |ΔT| surface against air [K], h = C·|ΔT|^0.31 in W/(m²·K), C 2.0, 1.6 and 0.54. Range and reference: not known.</para>
/// <para>Check: recalled (medium). One constant for warm ceilings and cool floors, which differ in rooms.</para>
/// </remarks>
internal static class Glueck1982
{
    private const string PracticeDoubt = "Design practice; range and reference temperature not known, room air is taken.";

    public static Publication Publication { get; } = new()
    {
        Key = "glueck-1982",
        Authors = "B. Glück",
        Year = 1982,
        Title = "Strahlungsheizung: Theorie und Praxis (edition recalled)",
        Source = "C.F. Müller, Karlsruhe",
        ShortName = "Glück (1982)",
    };

    public static Correlation[] All { get; } =
    [
        Make("floor-heated-or-ceiling-cooled", "heated floor or chilled ceiling, design practice", SurfaceSet.Horizontal, HeatFlowSense.Up, new PowerLaw(2.0, 0.31), TextCheck.RecalledMedium, PracticeDoubt),
        Make("wall", "heated or chilled wall, design practice", SurfaceSet.Wall, HeatFlowSense.Horizontal, new PowerLaw(1.6, 0.31), TextCheck.RecalledMedium, PracticeDoubt),
        Make("ceiling-heated-or-floor-cooled", "heated ceiling or chilled floor, design practice", SurfaceSet.Horizontal, HeatFlowSense.Down, new PowerLaw(0.54, 0.31), TextCheck.RecalledMedium, PracticeDoubt, "One constant for warm ceilings and cool floors, which differ in rooms."),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, Law law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Buoyant,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.Panel },
        Law = law,
        Reference = ReferenceTemperature.RoomAir,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.Handbook, "design practice of radiant heating"),
        TextCheck = check,
        IsUnconfirmed = check >= TextCheck.RecalledHigh,
        Doubts = doubts,
    };
}
