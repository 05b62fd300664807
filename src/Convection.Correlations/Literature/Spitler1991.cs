using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// J.D. Spitler, C.O. Pedersen, D.E. Fisher, "Interior convective heat transfer in buildings with large ventilative flow rates", ASHRAE
/// Transactions 97(1), 505–515, 1991.
/// </summary>
/// <remarks>
/// <para>
/// Measured: a full-scale room of 34.4 m³ (recalled, medium), all six surfaces heated panels, nominally isothermal; radial ceiling inlet
/// and side-wall inlet, 15–100 air changes per hour.
/// </para>
/// <para>
/// Symbols: J = V̇·U0/(g·V), V̇ supply flow [m³/s], U0 inlet speed [m/s], V room volume [m³]; h = C1 + C2·√J in W/(m²·K).
/// </para>
/// <para>
/// Range: ceiling inlet 0.001 &lt; J &lt; 0.03 and Ar &lt; 0.3, side inlet 0.002 &lt; J &lt; 0.011 (recalled, high; the definition of Ar is not
/// recorded). Reference: air leaving the room (recalled, high).
/// </para>
/// <para>
/// Check: the ceiling set is reconstructed by energy closure with the air-change set of 1997: −6 to +7 % referred to supply, −18 to
/// +14 % referred to outlet. The side set is recalled (medium to high) and not confirmed; its flow is attached, another one than
/// the dropping jet at 3–12 air changes: the two are not to be bridged.
/// </para>
/// </remarks>
internal static class Spitler1991
{
    public static Publication Publication { get; } = new()
    {
        Key = "spitler-1991",
        Authors = "J.D. Spitler, C.O. Pedersen, D.E. Fisher",
        Year = 1991,
        Title = "Interior convective heat transfer in buildings with large ventilative flow rates",
        Source = "ASHRAE Transactions 97(1), 505-515",
        ShortName = "Spitler et al. (1991)",
    };

    public static Correlation[] All { get; } =
    [
        CeilingInlet("ceiling", SurfaceSet.Ceiling, HeatFlowSense.Any, 11.4, 209.7),
        CeilingInlet("wall", SurfaceSet.Wall, HeatFlowSense.Horizontal, 4.2, 81.3),
        CeilingInlet("floor", SurfaceSet.Floor, HeatFlowSense.Any, 3.5, 46.8),
        SideInlet("ceiling", SurfaceSet.Ceiling, HeatFlowSense.Any, 0.6, 59.4),
        SideInlet("wall", SurfaceSet.Wall, HeatFlowSense.Horizontal, 1.6, 92.7),
        SideInlet("floor", SurfaceSet.Floor, HeatFlowSense.Any, 3.2, 44.0),
    ];

    private static Correlation CeilingInlet(string surface, SurfaceSet surfaces, HeatFlowSense sense, double c1, double c2) => Make(
        "ceiling-inlet-" + surface,
        surface + " of a room with a radial ceiling inlet, large flows",
        surfaces,
        sense,
        FlowDriver.RadialCeilingDiffuser,
        new FlowLaw(DrivingVariable.JetMomentum, c1, c2, 0.5),
        [
            new RangeLimit(RangeVariable.JetMomentum, new(0.001, 0.03), RangeOrigin.Recalled),
            new RangeLimit(RangeVariable.AirChangeRate, new(15, 100), RangeOrigin.Recalled),
            new RangeLimit(RangeVariable.Archimedes, Interval.UpTo(0.3), RangeOrigin.Recalled),
        ],
        TextCheck.Reconstructed,
        "Level good to 15 to 20 %; closure with the set of 1997 gives -6 to +7 % by supply, -18 to +14 % by outlet temperature.",
        "The definition of the Archimedes number in its range is not recorded.");

    private static Correlation SideInlet(string surface, SurfaceSet surfaces, HeatFlowSense sense, double c1, double c2) => Make(
        "side-inlet-" + surface,
        surface + " of a room with a side-wall inlet, large flows",
        surfaces,
        sense,
        FlowDriver.SideWallJet,
        new FlowLaw(DrivingVariable.JetMomentum, c1, c2, 0.5),
        [
            new RangeLimit(RangeVariable.JetMomentum, new(0.002, 0.011), RangeOrigin.Recalled),
            new RangeLimit(RangeVariable.AirChangeRate, new(15, 100), RangeOrigin.Recalled),
        ],
        TextCheck.RecalledMedium,
        "Constants recalled (medium to high), not confirmed.",
        "An attached jet; not to be bridged to the dropping jet at 3 to 12 air changes per hour.");

    private static Correlation Make(
        string name, string title, SurfaceSet surfaces, HeatFlowSense sense, FlowDriver driver, Law law, RangeLimit[] limits, TextCheck check, params string[] doubts) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = CorrelationFamily.Forced,
            Applies = new() { Surfaces = surfaces, Sense = sense, Driver = driver },
            Law = law,
            Reference = ReferenceTemperature.OutletAir,
            Range = new(limits),
            Evidence = new(EvidenceKind.FullScaleRoom, "full-scale room of 34.4 m3, all six surfaces heated panels, 15 to 100 air changes per hour"),
            TextCheck = check,
            IsUnconfirmed = check >= TextCheck.RecalledMedium,
            Doubts = [.. doubts, "Measured in an isothermal room of 34.4 m3 (recalled, medium)."],
        };
}
