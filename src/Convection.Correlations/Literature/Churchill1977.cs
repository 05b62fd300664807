using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// S.W. Churchill, "A comprehensive correlating equation for laminar, assisting, forced and free convection", AIChE Journal 23(1), 10–16,
/// 1977.
/// </summary>
/// <remarks>
/// <para>Basis: theory and data of laminar boundary layers; a rule, not a coefficient.</para>
/// <para>
/// Symbols: Nuⁿ = Nu_Fⁿ ± Nu_Nⁿ, plus for assisting and transverse flow, minus for opposing flow; here h for Nu. Exponents 3 to 4 and the
/// three cases are quoted in an encyclopaedia-type article; 3 for vertical plates, 7/2 for horizontal ones and 4 for cylinders and
/// spheres are recalled (high).
/// </para>
/// <para>
/// Both parts must refer to one temperature. Subtraction cancels at equal parts and belongs to laminar flow: in turbulent flow in
/// vertical tubes assisting buoyancy first impairs the heat transfer and opposing buoyancy enhances it (Jackson, Cotton and Axcell,
/// 1989, recalled, high). Kept for comparison; <c>BlendRule</c> applies the rule to fluxes.
/// </para>
/// </remarks>
internal static class Churchill1977
{
    public static Publication Publication { get; } = new()
    {
        Key = "churchill-1977",
        Authors = "S.W. Churchill",
        Year = 1977,
        Title = "A comprehensive correlating equation for laminar, assisting, forced and free convection",
        Source = "AIChE Journal 23(1), 10-16",
        ShortName = "Churchill (1977)",
    };

    public static Correlation[] All { get; } =
    [
        Make("vertical-assisting", "rule for assisting flow along an upright plate", SurfaceSet.Wall, HeatFlowSense.Horizontal, new MixingLaw(3), TextCheck.Quoted, "The exponent 3 is recalled (high); 3 to 4 are quoted."),
        Make("vertical-opposing", "rule for opposing flow along an upright plate", SurfaceSet.Wall, HeatFlowSense.Horizontal, new MixingLaw(3, isOpposing: true), TextCheck.Quoted, "Cancels at equal parts; a rule for laminar flow."),
        Make("horizontal-transverse", "rule for flow across a horizontal plate", SurfaceSet.Horizontal, HeatFlowSense.Any, new MixingLaw(3.5), TextCheck.RecalledHigh, "7/2 is of the textbooks (recalled, high)."),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, MixingLaw law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Mixed,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.AirStream },
        Law = law,
        Reference = ReferenceTemperature.FreeStream,
        Range = ValidityRange.NotKnown,
        Evidence = surfaces == SurfaceSet.Horizontal
            ? new(EvidenceKind.Handbook, "a textbook's reading of the rule")
            : new(EvidenceKind.Analytical, "theory and data of laminar boundary layers"),
        TextCheck = check,
        IsUnconfirmed = check >= TextCheck.RecalledHigh || law.IsOpposing,
        ContainsBuoyancy = true,
        IsReferenceOnly = true,
        Doubts = [.. doubts, "Both parts must refer to one temperature."],
    };
}
