using System;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Flows;
using Convection.Correlations.Rooms;
using Convection.Correlations.Surfaces;
using UnitsNet;

// Once: describe the room, and let it choose its correlations.
RoomContext office = RoomContext.Create(
    "corner office",
    Volume.FromCubicMeters(63),
    [
        SurfaceContext.Wall("facade", Length.FromMeters(5), Length.FromMeters(2.8)).WithArea(Area.FromSquareMeters(8.6)),
        SurfaceContext.Window("window", Length.FromMeters(3), Length.FromMeters(1.8)),
        SurfaceContext.Floor("floor", Length.FromMeters(5), Length.FromMeters(4.5)),
        SurfaceContext.Ceiling("ceiling", Length.FromMeters(5), Length.FromMeters(4.5)),
    ],
    [
        new Radiator("radiator") { Placements = [new("window", Placement.Above), new("facade", Placement.Beside)] },
        new RadialCeilingDiffuser("diffuser"),
    ]);
RoomConvection convection = RoomConvection.Bind(office);

// Every step: give temperatures and what the devices do, get every surface's flux with its slopes and its flags.
RoomState still = RoomState.At(Temperature.FromDegreesCelsius(22))
    .WithSurface("facade", Temperature.FromDegreesCelsius(20))
    .WithSurface("window", Temperature.FromDegreesCelsius(17))
    .WithSurface("floor", Temperature.FromDegreesCelsius(21.5))
    .WithSurface("ceiling", Temperature.FromDegreesCelsius(21));
RoomState heated = still.WithDevice("radiator", DeviceState.Heating(0.6));
RoomState supplied = still.WithDevice("diffuser", DeviceState.Supply(VolumeFlow.FromCubicMetersPerHour(500), Temperature.FromDegreesCelsius(17)));

Console.WriteLine("Still air\n" + convection.Evaluate(still).ToText());
Console.WriteLine("Radiator on\n" + convection.Evaluate(heated).ToText());
Console.WriteLine("Supply air on\n" + convection.Evaluate(supplied).ToText());
Console.WriteLine("The ceiling: " + convection.Evaluate(supplied)["ceiling"]);
