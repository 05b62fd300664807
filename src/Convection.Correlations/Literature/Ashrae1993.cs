using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>ASHRAE Handbook, Fundamentals, chapter Fenestration, 1993 (edition recalled, low).</summary>
/// <remarks>
/// <para>Basis: a handbook's form for vertical glazing in still air: 1.77·|ΔT|^(1/4) in W/(m²·K), |ΔT| against room air [K].</para>
/// <para>
/// Range: not known. Check: inch-pound 0.27 converts to 1.776. It equals the form with the glazing height, of a later edition, at 0.46 m only.
/// </para>
/// </remarks>
internal static class Ashrae1993
{
    public static Publication Publication { get; } = new()
    {
        Key = "ashrae-1993",
        Authors = "ASHRAE",
        Year = 1993,
        Title = "ASHRAE Handbook - Fundamentals, chapter Fenestration (edition recalled, low)",
        Source = "American Society of Heating, Refrigerating and Air-Conditioning Engineers, Atlanta",
        ShortName = "ASHRAE Handbook (1993)",
    };

    public static Correlation[] All { get; } =
    [
        Window("window-length-free", "vertical window, without length", new PowerLaw(1.77, 1.0 / 4), CharacteristicLength.None, isUnconfirmed: true, "Equals the form with height at 0.46 m only; prefer that one."),
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
