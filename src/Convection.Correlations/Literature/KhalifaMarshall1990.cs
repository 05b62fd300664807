using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// A.J.N. Khalifa, R.H. Marshall, "Validation of heat transfer coefficients on interior building surfaces using a real-sized
/// indoor test cell", International Journal of Heat and Mass Transfer 33(10), 2219–2236, 1990,
/// doi:10.1016/0017-9310(90)90122-B (recalled, high).
/// </summary>
/// <remarks>
/// <para>
/// Measured: a guarded full-scale test cell, about 2.95 m × 2.35 m × 2.08 m high (recalled, medium), in nine heating
/// arrangements that were regrouped into ten equations. Eight are here; two are not known.
/// </para>
/// <para>
/// Symbols: |ΔT| surface against cell air [K], h = C·|ΔT|ⁿ in W/(m²·K). No length: the size of the cell is built in, so do not
/// carry the forms to tall or large rooms. The wall forms stand 1.3–1.75 times above those of Alamdari and Hammond.
/// </para>
/// <para>Range: not known; 0.5–5 K is assumed for warnings. Reference: air of the cell, position not known.</para>
/// <para>
/// Check: coefficients recalled with high confidence, and no independent calculation can confirm them. Which arrangement some
/// of them belong to is recalled in two ways that differ; the doubt travels with every use.
/// </para>
/// </remarks>
internal static class KhalifaMarshall1990
{
    private const string AssignmentDoubt =
        "Which arrangement some pairs belong to is recalled in two ways: 2.30/3.10 to a radiator room or one with a heated panel, 2.07/2.72 "
        + "to a fan-heater room or perhaps a radiator room too, 7.61 to a fan-heater room or a radiator elsewhere. The alternatives differ "
        + "by about 12 to 20 % (walls 10-13 %, ceilings 11-22 %, windows 2-15 % over 0.5-5 K).";

    private const string RangeDoubt = "Temperature-difference range not known; 0.5 to 5 K is assumed for warnings.";
    private const string SizeDoubt = "The size of the test cell (about 2.95 m x 2.35 m x 2.08 m high; recalled, medium) is built in: not for tall or large rooms.";
    private const string WindowDoubt = "Never for a window in a room without a heat emitter: at 2 to 10 K the value is 3 to 5 times a boundary-layer value.";
    private const string FanDoubt = "Fan and buoyancy are contained together; one heater in one cell of 14 m3, the state of the fan is no variable.";
    private const string BasisDoubt =
        "No independent calculation can confirm these forms, and where the air temperature was measured is not known: the weakest-founded room data here.";

    private const string SenseDoubt = "Heat flow at the ceiling is taken as upwards; this is inferred.";

    public static Publication Publication { get; } = new()
    {
        Key = "khalifa-marshall-1990",
        Authors = "A.J.N. Khalifa, R.H. Marshall",
        Year = 1990,
        Title = "Validation of heat transfer coefficients on interior building surfaces using a real-sized indoor test cell",
        Source = "International Journal of Heat and Mass Transfer 33(10), 2219-2236",
        Doi = "10.1016/0017-9310(90)90122-B",
        ShortName = "Khalifa & Marshall (1990)",
    };

    public static Correlation[] All { get; } =
    [
        Radiator("wall-beside-radiator", "wall beside or behind the radiator", SurfaceSet.Wall, Placement.Beside, 1.98, 0.32, TextCheck.RecalledHigh),
        Radiator("window-above-radiator", "window with the radiator under it", SurfaceSet.Window, Placement.Above, 8.07, 0.11, TextCheck.RecalledHigh, WindowDoubt),
        Radiator("wall-radiator-room", "other walls of a room with a radiator", SurfaceSet.Wall, Placement.Unspecified, 2.30, 0.24, TextCheck.RecalledMedium),
        Radiator("ceiling-radiator-room", "ceiling of a room with a radiator", SurfaceSet.Ceiling, Placement.Unspecified, 3.10, 0.17, TextCheck.RecalledMedium, SenseDoubt),
        FanHeater("wall-opposite-fan-heater", "wall opposite a fan heater", SurfaceSet.Wall, Placement.Opposite, 2.92, 0.25, TextCheck.RecalledHigh),
        FanHeater("wall-fan-heater-room", "other walls of a room with a fan heater", SurfaceSet.Wall, Placement.Unspecified, 2.07, 0.23, TextCheck.RecalledMedium),
        FanHeater("ceiling-fan-heater-room", "ceiling of a room with a fan heater", SurfaceSet.Ceiling, Placement.Unspecified, 2.72, 0.13, TextCheck.RecalledMedium, SenseDoubt),
        FanHeater("window-fan-heater-room", "window of a room with a fan heater", SurfaceSet.Window, Placement.Unspecified, 7.61, 0.06, TextCheck.RecalledMedium, WindowDoubt),
    ];

    private static Correlation Radiator(
        string name, string title, SurfaceSet surface, Placement placement, double c, double n, TextCheck check, params string[] doubts)
        => Make(name, title, surface, FlowDriver.Radiator, placement, CorrelationFamily.Buoyant, c, n, check, doubts);

    private static Correlation FanHeater(
        string name, string title, SurfaceSet surface, Placement placement, double c, double n, TextCheck check, params string[] doubts)
        => Make(name, title, surface, FlowDriver.FanHeater, placement, CorrelationFamily.Mixed, c, n, check, [FanDoubt, .. doubts]);

    private static Correlation Make(
        string name,
        string title,
        SurfaceSet surface,
        FlowDriver driver,
        Placement placement,
        CorrelationFamily family,
        double coefficient,
        double exponent,
        TextCheck check,
        string[] doubts) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = family,
            Applies = new()
            {
                Surfaces = surface,
                Sense = surface == SurfaceSet.Ceiling ? HeatFlowSense.Up : HeatFlowSense.Horizontal,
                Driver = driver,
                Placement = placement,
            },
            Law = new PowerLaw(coefficient, exponent),
            Reference = ReferenceTemperature.RoomAir,
            Range = new(new RangeLimit(RangeVariable.TemperatureDifference, new(0.5, 5), RangeOrigin.Assumed)),
            Evidence = new(EvidenceKind.FullScaleRoom, "guarded full-scale test cell of about 14 m3, nine heating arrangements"),
            TextCheck = check,
            IsUnconfirmed = true,
            ContainsBuoyancy = true,
            Doubts = [AssignmentDoubt, .. doubts, RangeDoubt, SizeDoubt, BasisDoubt],
        };
}
