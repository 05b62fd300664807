using System.Collections.Generic;
using Convection.Correlations.Air;
using Convection.Correlations.Flows;
using Convection.Correlations.Rooms;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Tests;

/// <summary>Rooms with different equipment. Invented; nothing about them is a measured value.</summary>
internal static class TestRooms
{
    public static IReadOnlyList<RoomContext> All { get; } =
    [
        Make("still-bedroom", []),
        Make("radiator-office", [new Radiator("radiator") { Placements = [At("window", Placement.Above), At("facade", Placement.Beside)] }]),
        Make("fan-heater-workshop", [new FanHeater("fan heater") { Placements = [At("west", Placement.Opposite)] }]),
        Make("ceiling-diffuser-office", [new RadialCeilingDiffuser("diffuser")]),
        Make("side-jet-hotel-room", [new SideWallJet("grille") { OpeningSquareMetres = 0.02 }]),
        Make("slot-perimeter-office", [new CeilingSlot("slot") { FacadeMetres = 5, GlazedShare = 0.4 }]),
        Make("displacement-classroom", [new DisplacementInlet("inlet")]),
        Make("fan-gym", [new AirStream("fan") { Placements = [At("west", Placement.InStream, StreamDirection.Up), At("ceiling", Placement.InStream)] }]),
        Make("open-window-kitchen", [new WindowVentilation("sash")]),
        new RoomContext(
            "panel-room-at-altitude",
            48,
            [
                new SurfaceContext("floor", SurfaceKind.Floor, 5, 4) { Role = SurfaceRole.Heated },
                new SurfaceContext("ceiling", SurfaceKind.Ceiling, 5, 4) { Role = SurfaceRole.Chilled },
                new SurfaceContext("warm wall", SurfaceKind.Wall, 5, 2.4) { Role = SurfaceRole.Heated },
                new SurfaceContext("cool wall", SurfaceKind.Wall, 5, 2.4) { Role = SurfaceRole.Chilled },
                new SurfaceContext("cool floor strip", SurfaceKind.Floor, 4, 1) { Role = SurfaceRole.Chilled },
                new SurfaceContext("warm ceiling strip", SurfaceKind.Ceiling, 4, 1) { Role = SurfaceRole.Heated },
            ],
            [],
            AirState.AtAltitude(22, 2240, 0.4)),
        new RoomContext(
            "attic-with-everything",
            70,
            [
                new SurfaceContext("slope", SurfaceKind.Ceiling, 6, 4) { TiltDegrees = 135 },
                new SurfaceContext("steep slope", SurfaceKind.Wall, 6, 1.5) { TiltDegrees = 115 },
                new SurfaceContext("roof window", SurfaceKind.Window, 0.9, 1.2) { TiltDegrees = 145 },
                new SurfaceContext("gable", SurfaceKind.Wall, 5, 3),
                new SurfaceContext("floor", SurfaceKind.Floor, 6, 5),
            ],
            [
                new Radiator("radiator") { Placements = [At("roof window", Placement.Above), At("gable", Placement.Beside)] },
                new FanHeater("fan heater") { Placements = [At("gable", Placement.Opposite)] },
                new RadialCeilingDiffuser("diffuser"),
                new SideWallJet("grille") { Placements = [At("gable", Placement.Elsewhere, StreamDirection.Up)] },
                new AirStream("fan") { IsTurbulent = false, Placements = [At("gable", Placement.InStream, StreamDirection.Down), At("floor", Placement.InStream)] },
            ]),
    ];

    private static SurfacePlacement At(string surface, Placement placement, StreamDirection stream = StreamDirection.Unspecified)
        => new(surface, placement, stream);

    private static RoomContext Make(string name, FlowDescriptor[] devices) => new(
        name,
        60,
        [
            new SurfaceContext("facade", SurfaceKind.Wall, 5, 2.7) { AreaSquareMetres = 8 },
            new SurfaceContext("window", SurfaceKind.Window, 3, 1.8),
            new SurfaceContext("west", SurfaceKind.Wall, 4.4, 2.7),
            new SurfaceContext("floor", SurfaceKind.Floor, 5, 4.4),
            new SurfaceContext("ceiling", SurfaceKind.Ceiling, 5, 4.4),
        ],
        devices);
}
