using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>CIBSE Guide, Volume A, 1986 (edition recalled); later editions follow ISO 6946.</summary>
/// <remarks>
/// <para>Basis: fixed convective coefficients by direction of heat flow: 3.0, 4.3 and 1.5 W/(m²·K) against room air.</para>
/// <para>Check: recalled (high).</para>
/// </remarks>
internal static class Cibse1986
{
    public static Publication Publication { get; } = new()
    {
        Key = "cibse-1986",
        Authors = "CIBSE",
        Year = 1986,
        Title = "CIBSE Guide, Volume A (edition recalled)",
        Source = "Chartered Institution of Building Services Engineers, London",
        ShortName = "CIBSE Guide (1986)",
    };

    public static Correlation[] All { get; } =
    [
        Make("wall", "fixed value, horizontal heat flow", SurfaceSet.Any, HeatFlowSense.Horizontal, new PowerLaw(3.0, 0), TextCheck.RecalledHigh, "Older editions only; later ones follow ISO 6946."),
        Make("heat-up", "fixed value, upward heat flow", SurfaceSet.Any, HeatFlowSense.Up, new PowerLaw(4.3, 0), TextCheck.RecalledHigh, "Older editions only; later ones follow ISO 6946."),
        Make("heat-down", "fixed value, downward heat flow", SurfaceSet.Any, HeatFlowSense.Down, new PowerLaw(1.5, 0), TextCheck.RecalledHigh, "Older editions only; later ones follow ISO 6946."),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, Law law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.FixedValue,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.StillAir },
        Law = law,
        Reference = ReferenceTemperature.RoomAir,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.Handbook, "a handbook's fixed values"),
        TextCheck = check,
        IsUnconfirmed = check >= TextCheck.RecalledHigh,
        Doubts = doubts,
    };
}
