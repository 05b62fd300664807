using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>ASHRAE Handbook, Fundamentals, 2009, chapter 26, surface film coefficients (edition recalled).</summary>
/// <remarks>
/// <para>
/// Basis: totals of convection and radiation at an emittance of 0.9, air and surroundings at one temperature. A convective part by
/// subtraction depends on the mean temperature taken and is not given here.
/// </para>
/// <para>Check: recalled (high).</para>
/// </remarks>
internal static class Ashrae2009
{
    private const string TotalDoubt = "Radiation is contained (emittance 0.9, one temperature all round): never a convective coefficient.";

    public static Publication Publication { get; } = new()
    {
        Key = "ashrae-2009",
        Authors = "ASHRAE",
        Year = 2009,
        Title = "ASHRAE Handbook - Fundamentals, chapter 26, surface film coefficients (edition recalled)",
        Source = "American Society of Heating, Refrigerating and Air-Conditioning Engineers, Atlanta",
        ShortName = "ASHRAE Handbook (2009)",
    };

    public static Correlation[] All { get; } =
    [
        Film("still-air-wall-total", "total, upright surface in still air", SurfaceSet.Any, HeatFlowSense.Horizontal, 8.29),
        Film("still-air-heat-up-total", "total, horizontal surface, heat flow up", SurfaceSet.Any, HeatFlowSense.Up, 9.26),
        Film("still-air-heat-down-total", "total, horizontal surface, heat flow down", SurfaceSet.Any, HeatFlowSense.Down, 6.13),
        Film("still-air-tilt-45-heat-up-total", "total, surface at 45°, heat flow up", SurfaceSet.Inclined, HeatFlowSense.Up, 9.09),
        Film("still-air-tilt-45-heat-down-total", "total, surface at 45°, heat flow down", SurfaceSet.Inclined, HeatFlowSense.Down, 7.50),
    ];

    private static Correlation Film(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, double value) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Total,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.StillAir },
        Law = new PowerLaw(value, 0),
        Reference = ReferenceTemperature.RoomAir,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.Handbook, "a handbook's film coefficients"),
        TextCheck = TextCheck.RecalledHigh,
        IsUnconfirmed = true,
        Doubts = [TotalDoubt, "A convective part by subtraction depends on the mean temperature (radiative share 5.14 at 20 °C, 5.36 at 24 °C)."],
    };
}
