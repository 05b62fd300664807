using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// A. Novoselac, B.J. Burley, J. Srebric, "New convection correlations for cooled ceiling panels in room with mixed and stratified
/// airflow", HVAC&amp;R Research 12(2), 279–294, 2006.
/// </summary>
/// <remarks>
/// <para>Measured: cooled ceiling panels in a full-scale chamber; the buoyant part alone is here.</para>
/// <para>Symbols: |ΔT| panel against local air [K] (recalled, medium), h = 2.12·|ΔT|^0.33 in W/(m²·K). Range: not known.</para>
/// <para>
/// Check: recalled (medium); plausible, within 3 % of 2.13·|ΔT|^0.31 at 1–5 K and 30 % above Alamdari and Hammond. The forms for
/// displacement floors and for a ceiling with a mixing jet are held back: their constants are recalled in several ways.
/// </para>
/// </remarks>
internal static class Novoselac2006
{
    public static Publication Publication { get; } = new()
    {
        Key = "novoselac-2006",
        Authors = "A. Novoselac, B.J. Burley, J. Srebric",
        Year = 2006,
        Title = "New convection correlations for cooled ceiling panels in room with mixed and stratified airflow",
        Source = "HVAC&R Research 12(2), 279-294",
        ShortName = "Novoselac et al. (2006)",
    };

    public static Correlation[] All { get; } =
    [
        Make("ceiling-cooled", "chilled ceiling panel", SurfaceSet.Ceiling, HeatFlowSense.Up, new PowerLaw(2.12, 0.33), TextCheck.RecalledMedium, "Range not known; reference, local air, recalled (medium).", "30 % above Alamdari & Hammond, within 3 % of the handbook's panel form at 1 to 5 K."),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, Law law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Buoyant,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.Panel },
        Law = law,
        Reference = ReferenceTemperature.LocalAir,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.ClimateChamber, "cooled ceiling panels in a full-scale chamber, buoyant part"),
        TextCheck = check,
        IsUnconfirmed = check >= TextCheck.RecalledHigh,
        Doubts = doubts,
    };
}
