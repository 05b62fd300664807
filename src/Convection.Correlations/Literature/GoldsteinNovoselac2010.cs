using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// K. Goldstein, A. Novoselac, "Convective heat transfer in rooms with ceiling slot diffusers (RP-1416)", HVAC&amp;R Research 16(5),
/// 629–655, 2010 (last page recalled, medium).
/// </summary>
/// <remarks>
/// <para>Measured: over 100 full-scale tests of a perimeter zone with a ceiling slot; h found independent of the temperature difference (quoted).</para>
/// <para>
/// Symbols: q_L supply flow per length of exterior wall, taken as m³/(h·m); h = C·q_L^0.8 in W/(m²·K). Only the perimeter's surfaces;
/// buoyancy is not added.
/// </para>
/// <para>Range: not known; 25–200 m³/(h·m) is assumed for warnings. Reference: supply air (quoted).</para>
/// <para>
/// Check: coefficients recalled (high), the unit of the flow (medium): L/(s·m) would change h by a factor of 2.79; m³/(h·m) is judged
/// three times as credible. The form for windows with blinds is held back.
/// </para>
/// </remarks>
internal static class GoldsteinNovoselac2010
{
    private const string UnitDoubt = "The unit of the flow is recalled (medium): L/(s.m) in place of m3/(h.m) would change the coefficient by a factor of 2.79.";
    private const string RangeDoubt = "Range not known; 25 to 200 m3/(h.m) is assumed for warnings. Perimeter surfaces only.";

    public static Publication Publication { get; } = new()
    {
        Key = "goldstein-novoselac-2010",
        Authors = "K. Goldstein, A. Novoselac",
        Year = 2010,
        Title = "Convective heat transfer in rooms with ceiling slot diffusers (RP-1416)",
        Source = "HVAC&R Research 16(5), 629-655",
        ShortName = "Goldstein & Novoselac (2010)",
    };

    public static Correlation[] All { get; } =
    [
        Window("window-upper", "window in the upper part of the wall", 0.117, s => s.WindowHeight == WindowHeight.Upper && !(s.GlazedShare > 0.5), "the window is in the upper part of a wall glazed by half at most"),
        Window("window-lower", "window in the lower part of the wall", 0.093, s => s.WindowHeight == WindowHeight.Lower && !(s.GlazedShare > 0.5), "the window is in the lower part of a wall glazed by half at most"),
        Window("window-large", "large window", 0.103, s => s.GlazedShare > 0.5, "more than half of the wall is glazed"),
        Make("wall-below-window", "wall below the window under a ceiling slot", new() { Surfaces = SurfaceSet.Wall, Sense = HeatFlowSense.Horizontal, Driver = FlowDriver.CeilingSlot, Placement = Placement.BelowWindow }, 0.063),
        Make("wall-above-window", "wall above the window under a ceiling slot", new() { Surfaces = SurfaceSet.Wall, Sense = HeatFlowSense.Horizontal, Driver = FlowDriver.CeilingSlot, Placement = Placement.AboveWindow }, 0.093),
        Make("floor", "floor of a perimeter zone with a ceiling slot", new() { Surfaces = SurfaceSet.Floor, Driver = FlowDriver.CeilingSlot }, 0.048),
    ];

    private static Correlation Window(string name, string title, double coefficient, Func<CeilingSlot, bool> where, string words) => Make(
        name,
        title + " under a ceiling slot",
        new()
        {
            Surfaces = SurfaceSet.Window,
            Sense = HeatFlowSense.Horizontal,
            Driver = FlowDriver.CeilingSlot,
            Condition = (_, device) => device is CeilingSlot slot && where(slot),
            ConditionText = words,
        },
        coefficient);

    private static Correlation Make(string name, string title, Applicability applies, double coefficient) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Forced,
        Applies = applies,
        Law = new FlowLaw(DrivingVariable.FlowPerLength, 0, coefficient, 0.8),
        Reference = ReferenceTemperature.SupplyAir,
        Range = new(new RangeLimit(RangeVariable.FlowPerLength, new(25, 200), RangeOrigin.Assumed)),
        Evidence = new(EvidenceKind.FullScaleRoom, "over 100 full-scale tests of a perimeter zone with a ceiling slot"),
        TextCheck = TextCheck.RecalledMedium,
        IsUnconfirmed = true,
        ContainsBuoyancy = true,
        Doubts = [UnitDoubt, RangeDoubt],
    };
}
