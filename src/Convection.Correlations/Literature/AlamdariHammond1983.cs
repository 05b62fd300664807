using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// F. Alamdari, G.P. Hammond, "Improved data correlations for buoyancy-driven convection in rooms", Building Services
/// Engineering Research &amp; Technology 4(3), 106–112, 1983, doi:10.1177/014362448300400304 (recalled, high).
/// </summary>
/// <remarks>
/// <para>
/// Measured: no full-scale room of the authors' own. Published laboratory data, pooled, and joined by the rule of Churchill
/// and Usagi with exponent 6, so that one expression runs from laminar to turbulent flow.
/// </para>
/// <para>Symbols: |ΔT| surface against room air [K], H height [m], Dh = 4A/P hydraulic diameter [m], h in W/(m²·K).</para>
/// <para>Range: 1e4 &lt; Ra &lt; 1e12 on H or Dh (recalled, medium). Reference: mean room air (recalled, medium).</para>
/// <para>
/// Check: the constants agree with the textbook pairs 0.59/0.10, 0.54/0.14 and with 0.58 Ra^(1/5) in room air within about
/// 6 %. The Nusselt constants sometimes given as the authors' are not used here. No tilt treatment in the paper
/// (recalled, high): any use on inclined surfaces is an extension by others.
/// </para>
/// </remarks>
internal static class AlamdariHammond1983
{
    private const double VerticalLaminar = 1.50, VerticalTurbulent = 1.23;
    private const double UnstableLaminar = 1.40, UnstableTurbulent = 1.63;
    private const double Stable = 0.60;
    private const double JoinExponent = 6;

    public static Publication Publication { get; } = new()
    {
        Key = "alamdari-hammond-1983",
        Authors = "F. Alamdari, G.P. Hammond",
        Year = 1983,
        Title = "Improved data correlations for buoyancy-driven convection in rooms",
        Source = "Building Services Engineering Research & Technology 4(3), 106-112",
        Doi = "10.1177/014362448300400304",
        ShortName = "Alamdari & Hammond (1983)",
    };

    public static Correlation[] All { get; } =
    [
        Make(
            "vertical",
            "upright surface in still air",
            SurfaceSet.Wall,
            HeatFlowSense.Horizontal,
            CharacteristicLength.Height,
            new TwoAsymptoteLaw(
                new PowerTerm(VerticalLaminar, 1.0 / 4, CharacteristicLength.Height, -1.0 / 4),
                new PowerTerm(VerticalTurbulent, 1.0 / 3),
                JoinExponent)),
        Make(
            "horizontal-unstable",
            "warm floor or cool ceiling in still air",
            SurfaceSet.Horizontal,
            HeatFlowSense.Up,
            CharacteristicLength.HydraulicDiameter,
            new TwoAsymptoteLaw(
                new PowerTerm(UnstableLaminar, 1.0 / 4, CharacteristicLength.HydraulicDiameter, -1.0 / 4),
                new PowerTerm(UnstableTurbulent, 1.0 / 3),
                JoinExponent)),
        Make(
            "horizontal-stable",
            "cool floor or warm ceiling in still air",
            SurfaceSet.Horizontal,
            HeatFlowSense.Down,
            CharacteristicLength.HydraulicDiameter,
            new PowerLaw(Stable, 1.0 / 5, CharacteristicLength.HydraulicDiameter, -2.0 / 5),
            "Published laws for this case differ by a factor of about 6: a cool floor is stirred by downdraughts, a warm ceiling lies under a stagnant layer."),
    ];

    private static Correlation Make(
        string name, string title, SurfaceSet surfaces, HeatFlowSense sense, CharacteristicLength length, Law law, params string[] doubts) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = CorrelationFamily.Buoyant,
            Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.StillAir },
            Law = law,
            Reference = ReferenceTemperature.RoomAir,
            Length = length,
            Range = new(new RangeLimit(RangeVariable.Rayleigh, new(1e4, 1e12), RangeOrigin.Recalled, length)),
            Evidence = new(EvidenceKind.Plate, "pooled laboratory data, joined by the rule of Churchill and Usagi; not a room experiment"),
            TextCheck = TextCheck.Reconstructed,
            Doubts = [.. doubts, "Range and reference temperature are recalled (medium), not compared with print.", "The paper does not treat tilted surfaces (recalled, high)."],
        };
}
