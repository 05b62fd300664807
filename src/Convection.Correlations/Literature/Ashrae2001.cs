using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>ASHRAE Handbook, Fundamentals, chapter Fenestration, 2001 (edition recalled, low).</summary>
/// <remarks>
/// <para>
/// Basis: a handbook's form for vertical glazing in still air: 1.46·(|ΔT|/H)^(1/4) in W/(m²·K), |ΔT| against room air [K], H glazing height [m].
/// </para>
/// <para>Range: not known. Check: constant recalled (medium), within 2 % of the laminar form of ISO 15099 for room air (1.43).</para>
/// </remarks>
internal static class Ashrae2001
{
    public static Publication Publication { get; } = new()
    {
        Key = "ashrae-2001",
        Authors = "ASHRAE",
        Year = 2001,
        Title = "ASHRAE Handbook - Fundamentals, chapter Fenestration (edition recalled, low)",
        Source = "American Society of Heating, Refrigerating and Air-Conditioning Engineers, Atlanta",
        ShortName = "ASHRAE Handbook (2001)",
    };

    public static Correlation[] All { get; } =
    [
        Window("window-height", "vertical window", new PowerLaw(1.46, 1.0 / 4, CharacteristicLength.Height, -1.0 / 4), CharacteristicLength.Height, isUnconfirmed: false, "The constant is recalled (medium), within 2 % of the laminar form of ISO 15099 for room air."),
    ];

    private static Correlation Window(
        string name, string title, Law law, CharacteristicLength length, bool isUnconfirmed, string doubt) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = CorrelationFamily.Buoyant,
            Applies = new() { Surfaces = SurfaceSet.Window, Sense = HeatFlowSense.Horizontal, Driver = FlowDriver.StillAir },
            Law = law,
            Reference = ReferenceTemperature.RoomAir,
            Length = length,
            Range = ValidityRange.NotKnown,
            Evidence = new(EvidenceKind.Handbook, "a handbook's form for glazing in still air"),
            TextCheck = TextCheck.Reconstructed,
            IsUnconfirmed = isUnconfirmed,
            Doubts = [doubt],
        };
}
