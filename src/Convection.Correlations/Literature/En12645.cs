using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>EN 1264-5:2008, Water based surface embedded heating and cooling systems, Part 5 (edition recalled).</summary>
/// <remarks>
/// <para>Basis: conventions for embedded systems: totals of 6.5, 6.5 and 10.8 W/(m²·K) against operative temperature.</para>
/// <para>Check: recalled (high; the cooled ceiling medium). ISO 11855-2 has 6, 7 and 8.92·|ΔT|^0.1.</para>
/// </remarks>
internal static class En12645
{
    private const string TotalDoubt = "Radiation is contained, against operative temperature: never a convective coefficient.";

    public static Publication Publication { get; } = new()
    {
        Key = "en-1264-5-2008",
        Authors = "CEN",
        Year = 2008,
        Title = "EN 1264-5, Water based surface embedded heating and cooling systems - Part 5 (edition recalled)",
        Source = "European Committee for Standardization, Brussels",
        ShortName = "EN 1264-5 (2008)",
    };

    public static Correlation[] All { get; } =
    [
        Make("ceiling-heated-total", "total, heated ceiling", SurfaceSet.Ceiling, HeatFlowSense.Down, new PowerLaw(6.5, 0), TextCheck.RecalledHigh, TotalDoubt, "ISO 11855-2 has 6."),
        Make("floor-cooled-total", "total, chilled floor", SurfaceSet.Floor, HeatFlowSense.Down, new PowerLaw(6.5, 0), TextCheck.RecalledHigh, TotalDoubt, "ISO 11855-2 has 7."),
        Make("ceiling-cooled-total", "total, chilled ceiling", SurfaceSet.Ceiling, HeatFlowSense.Up, new PowerLaw(10.8, 0), TextCheck.RecalledMedium, TotalDoubt, "ISO 11855-2 has 8.92 dT^0.1."),
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
