using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>ASHRAE Handbook, HVAC Systems and Equipment, 2012, chapter 6, Panel heating and cooling (edition recalled).</summary>
/// <remarks>
/// <para>Basis: a handbook's forms for panels of usual size, after Min et al.</para>
/// <para>
/// Symbols: |ΔT| surface against room air [K], h = C·|ΔT|ⁿ in W/(m²·K). Size is frozen in: they equal the general forms of Min et al. at
/// 4A/P = 4.9 m and H = 2.7 m; prefer those elsewhere. Range: not known.
/// </para>
/// <para>
/// Check: reconstructed; inch-pound 0.31 converts to 2.11 (rounding). For the heated ceiling 0.14 and 0.138 also circulate; 0.134 agrees
/// with the general form. The cooled floor stands in later editions only and is recalled (medium).
/// </para>
/// </remarks>
internal static class Ashrae2012
{
    private const string FrozenSize = "The size is frozen: equal to the general form of Min et al. at 4A/P 4.9 m and H 2.7 m; prefer that elsewhere.";

    public static Publication Publication { get; } = new()
    {
        Key = "ashrae-2012",
        Authors = "ASHRAE",
        Year = 2012,
        Title = "ASHRAE Handbook - HVAC Systems and Equipment, chapter 6, Panel heating and cooling (edition recalled)",
        Source = "American Society of Heating, Refrigerating and Air-Conditioning Engineers, Atlanta",
        ShortName = "ASHRAE Handbook (2012)",
    };

    public static Correlation[] All { get; } =
    [
        Panel("panel-floor-heated-or-ceiling-cooled", "heated floor or chilled ceiling of usual size", SurfaceSet.Horizontal, HeatFlowSense.Up, 2.13, 0.31, TextCheck.Reconstructed, FrozenSize, "The inch-pound constant converts to 2.11 (rounding)."),
        Panel("panel-wall", "heated or chilled wall of usual size", SurfaceSet.Wall, HeatFlowSense.Horizontal, 1.78, 0.32, TextCheck.Reconstructed, FrozenSize),
        Panel("panel-ceiling-heated", "heated ceiling of usual size", SurfaceSet.Ceiling, HeatFlowSense.Down, 0.134, 0.25, TextCheck.Reconstructed, FrozenSize, "0.138 and 0.14 also circulate."),
        Panel("panel-floor-cooled", "chilled floor", SurfaceSet.Floor, HeatFlowSense.Down, 0.87, 0.25, TextCheck.RecalledMedium, "In later editions only.", "A cool floor is stirred by downdraughts: three to six times the value of a warm ceiling."),
    ];

    private static Correlation Panel(
        string name, string title, SurfaceSet surfaces, HeatFlowSense sense, double coefficient, double exponent, TextCheck check, params string[] doubts) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = CorrelationFamily.Buoyant,
            Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.Panel },
            Law = new PowerLaw(coefficient, exponent),
            Reference = ReferenceTemperature.RoomAir,
            Range = ValidityRange.NotKnown,
            Evidence = new(EvidenceKind.Handbook, "a handbook's form for panels of usual size, after Min et al."),
            TextCheck = check,
            IsUnconfirmed = check >= TextCheck.RecalledMedium,
            Doubts = doubts,
        };
}
