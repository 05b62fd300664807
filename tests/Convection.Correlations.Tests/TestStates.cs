using System.Linq;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Flows;
using Convection.Correlations.Rooms;
using CsCheck;

namespace Convection.Correlations.Tests;

/// <summary>A room's state as plain numbers, so that states can be drawn at random and walked between.</summary>
internal sealed record TestState(double Room, double[] Surfaces, double[] Drives, double[] AirTemperatures)
{
    /// <summary>Random states: temperatures of rooms, flows from none to far above the tested ones, all outputs.</summary>
    public static Gen<TestState> Of(RoomContext room)
        => Gen.Select(
            Gen.Double[12, 30],
            Gen.Double[5, 45].Array[room.Surfaces.Count],
            Gen.Frequency((1, Gen.Const(0.0)), (4, Gen.Double[0, 1])).Array[room.Devices.Count],
            Gen.Double[12, 40].Array[room.Devices.Count],
            (air, surfaces, drives, supply) => new TestState(air, surfaces, drives, supply));

    public static TestState Between(TestState a, TestState b, double t) => new(
        Mix(a.Room, b.Room, t),
        [.. a.Surfaces.Zip(b.Surfaces, (x, y) => Mix(x, y, t))],
        [.. a.Drives.Zip(b.Drives, (x, y) => Mix(x, y, t))],
        [.. a.AirTemperatures.Zip(b.AirTemperatures, (x, y) => Mix(x, y, t))]);

    /// <summary>The device states: a drive of 0 to 1 becomes up to 30 air changes per hour, 3 m/s, or full output.</summary>
    public DeviceState[] Devices(RoomContext room)
        => [.. room.Devices.Select((device, i) => Device(device, room.VolumeCubicMetres, Drives[i], AirTemperatures[i]))];

    public ConvectionResult[] Evaluate(RoomConvection bound)
    {
        var results = new ConvectionResult[Surfaces.Length];
        bound.Evaluate(Room, Surfaces, Devices(bound.Room), results);
        return results;
    }

    private static double Mix(double x, double y, double t) => ((1 - t) * x) + (t * y);

    private static DeviceState Device(FlowDescriptor device, double volume, double drive, double celsius) => device.Needs switch
    {
        StateNeed.OutputFraction => DeviceState.Heating(drive),
        StateNeed.Speed => DeviceState.Stream(3 * drive, celsius),
        _ => DeviceState.Supply(30 * volume / 3600 * drive, celsius),
    };
}
