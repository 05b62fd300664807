using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>EN 1264-2:2008, Water based surface embedded heating and cooling systems, Part 2 (edition recalled).</summary>
/// <remarks>
/// <para>Basis: a convention for heated floors: q = 8.92·|ΔT|^1.1 W/m², radiation contained, against operative temperature.</para>
/// <para>
/// Range: surface up to 29 °C at 20 °C, 9 K (rim zone 35 °C, 15 K). Check: quoted in trade articles; 9 K gives 100 W/m².
/// </para>
/// </remarks>
internal static class En12642
{
    private const string TotalDoubt = "Radiation is contained, against operative temperature: never a convective coefficient.";

    public static Publication Publication { get; } = new()
    {
        Key = "en-1264-2-2008",
        Authors = "CEN",
        Year = 2008,
        Title = "EN 1264-2, Water based surface embedded heating and cooling systems - Part 2 (edition recalled)",
        Source = "European Committee for Standardization, Brussels",
        ShortName = "EN 1264-2 (2008)",
    };

    public static Correlation[] All { get; } =
    [
        Make("floor-heated-total", "total, heated floor", SurfaceSet.Floor, HeatFlowSense.Up, new PowerLaw(8.92, 0.1), TextCheck.Quoted, TotalDoubt, "Surface up to 29 °C at 20 °C, in rim zones 35 °C."),
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
        Range = new(new RangeLimit(RangeVariable.TemperatureDifference, new(0, 9), RangeOrigin.Source)),
        Evidence = new(EvidenceKind.Standard, "a convention for embedded systems"),
        TextCheck = check,
        IsUnconfirmed = check >= TextCheck.RecalledMedium,
        Doubts = doubts,
    };
}
