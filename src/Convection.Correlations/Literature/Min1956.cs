using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// T.C. Min, L.F. Schutrum, G.V. Parmelee, J.D. Vouris, "Natural convection and radiation in a panel-heated room", ASHAE
/// Transactions 62, 337–358, 1956.
/// </summary>
/// <remarks>
/// <para>
/// Measured: an environmental test room of several sizes, about 3.6–7.35 m × 3.6 m × 2.4–3.6 m high (recalled, medium), with
/// heated floor or ceiling panels and cooled other surfaces.
/// </para>
/// <para>
/// Symbols: |ΔT| surface against room air [K], Dh = 4A/P of the panel or surface [m], H height of the wall [m], h in W/(m²·K).
/// Given here in SI; the originals are in inch-pound units (0.39, 0.29 and 0.041 with Btu/(h·ft²·°F), °F and ft).
/// </para>
/// <para>Range: not known; panels of room size, differences of the order of 1–30 K (recalled, low). Reference: air 1.5 m above the floor, centre of the room (recalled, medium).</para>
/// <para>Check: the inch-pound constants, recalled apart, convert to 2.416, 1.873 and 0.2004.</para>
/// </remarks>
internal static class Min1956
{
    public static Publication Publication { get; } = new()
    {
        Key = "min-1956",
        Authors = "T.C. Min, L.F. Schutrum, G.V. Parmelee, J.D. Vouris",
        Year = 1956,
        Title = "Natural convection and radiation in a panel-heated room",
        Source = "ASHAE Transactions 62, 337-358",
        ShortName = "Min et al. (1956)",
    };

    public static Correlation[] All { get; } =
    [
        Make(
            "floor-heated-or-ceiling-cooled",
            "heated floor or chilled ceiling",
            SurfaceSet.Horizontal,
            HeatFlowSense.Up,
            new PowerLaw(2.42, 0.31, CharacteristicLength.HydraulicDiameter, -0.08),
            CharacteristicLength.HydraulicDiameter),
        Make(
            "wall",
            "heated or chilled wall",
            SurfaceSet.Wall,
            HeatFlowSense.Horizontal,
            new PowerLaw(1.87, 0.32, CharacteristicLength.Height, -0.05),
            CharacteristicLength.Height),
        Make(
            "ceiling-heated",
            "heated ceiling",
            SurfaceSet.Ceiling,
            HeatFlowSense.Down,
            new PowerLaw(0.20, 0.25, CharacteristicLength.HydraulicDiameter, -0.25),
            CharacteristicLength.HydraulicDiameter),
    ];

    private static Correlation Make(
        string name, string title, SurfaceSet surfaces, HeatFlowSense sense, Law law, CharacteristicLength length) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = CorrelationFamily.Buoyant,
            Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.Panel },
            Law = law,
            Reference = ReferenceTemperature.RoomAir,
            Length = length,
            Range = ValidityRange.NotKnown,
            Evidence = new(EvidenceKind.ClimateChamber, "environmental test room of several sizes with heated floor or ceiling panels, other surfaces cooled"),
            TextCheck = TextCheck.Reconstructed,
            Doubts =
            [
                "Temperature-difference range not known; panels of room size, of the order of 1 to 30 K (recalled, low).",
                "The reference, room air 1.5 m above the floor at the centre, is recalled (medium).",
            ],
        };
}
