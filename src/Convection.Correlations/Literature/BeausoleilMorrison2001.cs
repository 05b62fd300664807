using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// I. Beausoleil-Morrison, "An algorithm for calculating convection coefficients for internal building surfaces for the case of mixed
/// flow in rooms", Energy and Buildings 33(4), 351–361, 2001, doi:10.1016/S0378-7788(00)00117-1.
/// </summary>
/// <remarks>
/// <para>Basis: no data of mixed flow; a blend of the forms of Alamdari and Hammond (buoyant) and of Fisher 1995 (forced).</para>
/// <para>
/// Symbols: h_n buoyant part, h_f forced part against supply air, R = (T_s − T_supply)/(T_s − T_room) carries it to room air;
/// h = (h_n³ + (R·h_f)³)^(1/3), for opposing flow the difference, never below 0.8 of the larger part. A jet that runs down a wall assists
/// where the wall is cooler than the room (recalled, medium).
/// </para>
/// <para>
/// Range: 3–12 air changes; R positive. Below zero, the surface between room and supply temperature, no published rule is known; h grows
/// without bound as the surface nears the room's temperature. This library therefore blends fluxes and keeps these for comparison.
/// </para>
/// <para>Check: exponent and floor recalled (high), the absolute value in opposing flow (medium).</para>
/// </remarks>
internal static class BeausoleilMorrison2001
{
    public static Publication Publication { get; } = new()
    {
        Key = "beausoleil-morrison-2001",
        Authors = "I. Beausoleil-Morrison",
        Year = 2001,
        Title = "An algorithm for calculating convection coefficients for internal building surfaces for the case of mixed flow in rooms",
        Source = "Energy and Buildings 33(4), 351-361",
        Doi = "10.1016/S0378-7788(00)00117-1",
        ShortName = "Beausoleil-Morrison (2001)",
    };

    public static Correlation[] All { get; } =
    [
        Make("wall-assisting", "wall cooler than the room under a ceiling diffuser's jet", SurfaceSet.Wall, HeatFlowSense.Horizontal, new MixingLaw(3), TextCheck.RecalledHigh),
        Make("wall-opposing", "wall warmer than the room under a ceiling diffuser's jet", SurfaceSet.Wall, HeatFlowSense.Horizontal, new MixingLaw(3, isOpposing: true, floor: 0.8), TextCheck.RecalledMedium, "The floor of 0.8 is recalled (high), the absolute value (medium)."),
        Make("floor-buoyant", "floor warmer than the room", SurfaceSet.Floor, HeatFlowSense.Up, new MixingLaw(3), TextCheck.RecalledHigh),
        Make("floor-stable", "floor cooler than the room", SurfaceSet.Floor, HeatFlowSense.Down, new MixingLaw(3), TextCheck.RecalledHigh),
        Make("ceiling-buoyant", "ceiling cooler than the room", SurfaceSet.Ceiling, HeatFlowSense.Up, new MixingLaw(3), TextCheck.RecalledHigh),
        Make("ceiling-stable", "ceiling warmer than the room", SurfaceSet.Ceiling, HeatFlowSense.Down, new MixingLaw(3), TextCheck.RecalledHigh),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, MixingLaw law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Mixed,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.RadialCeilingDiffuser },
        Law = law,
        Reference = ReferenceTemperature.RoomAir,
        Range = new(new RangeLimit(RangeVariable.AirChangeRate, new(3, 12), RangeOrigin.Recalled)),
        Evidence = new(EvidenceKind.Analytical, "a blend of two published sets, not fitted to mixed flow"),
        TextCheck = check,
        IsUnconfirmed = true,
        ContainsBuoyancy = true,
        IsReferenceOnly = true,
        Doubts = [.. doubts, "h_f is that of Fisher (1995) times R = (T_s - T_supply)/(T_s - T_room): it grows without bound where the surface nears the room's temperature, and no rule is known for R below 0."],
    };
}
