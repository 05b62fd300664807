using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// EN ISO 6946:2017, "Building components and building elements. Thermal resistance and thermal transmittance. Calculation
/// methods", annex on surface resistances (edition recalled).
/// </summary>
/// <remarks>
/// <para>Basis: a convention for heat loss, not a measurement: fixed convective coefficients by direction of heat flow.</para>
/// <para>
/// Check: 2.5 is quoted (P. Michalak, Energies 14(18), 5953, 2021, where a wall in use averaged 1.15). 5.0 and 0.7 are
/// reconstructed: with a radiative coefficient of 0.9 · 5.7 W/(m²·K) they give the tabulated surface resistances 0.10 and
/// 0.17 m²·K/W, as 2.5 gives 0.13.
/// </para>
/// </remarks>
internal static class Iso6946
{
    public static Publication Publication { get; } = new()
    {
        Key = "iso-6946-2017",
        Authors = "ISO",
        Year = 2017,
        Title = "EN ISO 6946, Building components and building elements - Thermal resistance and thermal transmittance - Calculation methods",
        Source = "International Organization for Standardization, annex on surface resistances",
        ShortName = "ISO 6946 (2017)",
    };

    public static Correlation[] All { get; } =
    [
        Make("wall", "convention for horizontal heat flow", HeatFlowSense.Horizontal, 2.5, TextCheck.Quoted, "A wall in use averaged 1.15 W/(m2.K) in one study."),
        Make("heat-up", "convention for upward heat flow", HeatFlowSense.Up, 5.0, TextCheck.Reconstructed),
        Make("heat-down", "convention for downward heat flow", HeatFlowSense.Down, 0.7, TextCheck.Reconstructed),
    ];

    private static Correlation Make(string name, string title, HeatFlowSense sense, double value, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.FixedValue,
        Applies = new() { Surfaces = SurfaceSet.Any, Sense = sense, Driver = FlowDriver.StillAir },
        Law = new PowerLaw(value, 0),
        Reference = ReferenceTemperature.RoomAir,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.Standard, "a convention for heat loss through building elements"),
        TextCheck = check,
        Doubts = [.. doubts, "A fixed value knows neither temperature difference nor plant; the edition is recalled."],
    };
}
