using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// D.E. Fisher, "An experimental investigation of mixed convection heat transfer in a rectangular enclosure", PhD thesis,
/// University of Illinois at Urbana-Champaign, 1995.
/// </summary>
/// <remarks>
/// <para>
/// Measured: a full-scale room 4.57 m × 2.74 m × 2.74 m, 34.4 m³ (recalled, medium), all six surfaces heated panels; radial
/// ceiling diffuser, or a free horizontal jet from a side wall; 3 to 12 air changes per hour.
/// </para>
/// <para>
/// Symbols: ACH air changes of supply air (recirculated air included) per hour [1/h], h = c0 + c1·ACH^0.8 in W/(m²·K). The size
/// of the room is built in; the length of the dimensionless form is V^(1/3).
/// </para>
/// <para>Range: 3–12 ACH (quoted for the test programme), never below 3: some intercepts turn the form negative. Reference: supply air.</para>
/// <para>
/// Check: recalled (high) for the ceiling diffuser. Its set keeps the energy balance of its test room: Σ h·A/(ρ·c_p·V̇) is
/// 0.83, 0.81 and 0.75 at 3, 6 and 12 ACH; that supports the sum over the surfaces, not single digits. The side-jet rows are
/// recalled (medium). The side jet's ceiling, 0.064 + 0.00444·ACH^0.8, is implausibly small (a digit slip cannot be excluded)
/// and is held back, as are attached jets.
/// </para>
/// </remarks>
internal static class Fisher1995
{
    private const double Exponent = 0.8;

    private static readonly Interval Tested = new(3, 12);

    public static Publication Publication { get; } = new()
    {
        Key = "fisher-1995",
        Authors = "D.E. Fisher",
        Year = 1995,
        Title = "An experimental investigation of mixed convection heat transfer in a rectangular enclosure",
        Source = "PhD thesis, University of Illinois at Urbana-Champaign",
        ShortName = "Fisher (1995)",
    };

    public static Correlation[] All { get; } =
    [
        Diffuser("ceiling-diffuser-ceiling", "ceiling under a radial ceiling diffuser's jet", SurfaceSet.Ceiling, HeatFlowSense.Any, -0.166, 0.484, "Negative below 0.26 air changes per hour; never extended below 3."),
        Diffuser("ceiling-diffuser-wall", "walls of a room with a radial ceiling diffuser", SurfaceSet.Wall, HeatFlowSense.Horizontal, -0.199, 0.190, "Negative below 1.06 air changes per hour; never extended below 3."),
        Diffuser("ceiling-diffuser-floor", "floor of a room with a radial ceiling diffuser", SurfaceSet.Floor, HeatFlowSense.Any, 0.159, 0.116, "Never extended below 3 air changes per hour."),
        SideJet("side-free-jet-wall", "walls of a room with a free jet from a side wall", SurfaceSet.Wall, HeatFlowSense.Horizontal, -0.110, 0.132, "Negative below 0.80 air changes per hour; never extended below 3."),
        SideJet("side-free-jet-floor", "floor of a room with a free jet from a side wall", SurfaceSet.Floor, HeatFlowSense.Any, 0.704, 0.168, "Never extended below 3 air changes per hour."),
    ];

    private static Correlation Diffuser(string name, string title, SurfaceSet surface, HeatFlowSense sense, double c0, double c1, string doubt)
        => Make(name, title, surface, sense, FlowDriver.RadialCeilingDiffuser, c0, c1, TextCheck.RecalledHigh, doubt);

    private static Correlation SideJet(string name, string title, SurfaceSet surface, HeatFlowSense sense, double c0, double c1, string doubt)
        => Make(name, title, surface, sense, FlowDriver.SideWallJet, c0, c1, TextCheck.RecalledMedium, doubt);

    private static Correlation Make(
        string name,
        string title,
        SurfaceSet surface,
        HeatFlowSense sense,
        FlowDriver driver,
        double intercept,
        double slope,
        TextCheck check,
        string doubt) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = CorrelationFamily.Forced,
            Applies = new() { Surfaces = surface, Sense = sense, Driver = driver },
            Law = new FlowLaw(DrivingVariable.AirChangeRate, intercept, slope, Exponent),
            Reference = ReferenceTemperature.SupplyAir,
            Length = CharacteristicLength.RoomCubeRoot,
            Range = new(new RangeLimit(RangeVariable.AirChangeRate, Tested, RangeOrigin.Source)),
            Evidence = new(EvidenceKind.FullScaleRoom, "full-scale room of 34.4 m3, all six surfaces heated panels, isothermal, 3 to 12 air changes per hour"),
            TextCheck = check,
            IsUnconfirmed = check >= TextCheck.RecalledMedium,
            Doubts = [doubt, "Measured in an isothermal room of 34.4 m3 (recalled, medium), whose size is built in."],
        };
}
