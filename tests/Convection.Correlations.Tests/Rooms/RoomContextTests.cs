using System;
using System.Linq;
using Convection.Correlations.Flows;
using Convection.Correlations.Rooms;
using Convection.Correlations.Surfaces;
using UnitsNet;
using Xunit;

namespace Convection.Correlations.Tests.Rooms;

public class RoomContextTests
{
    private static readonly SurfaceContext Wall = new("wall", SurfaceKind.Wall, 4, 2.5);

    [Fact]
    public void Room_OfSurfacesAndDevices_KeepsTheirOrder()
    {
        var floor = new SurfaceContext("floor", SurfaceKind.Floor, 4, 4);
        RoomContext room = RoomContext.Create("r", Volume.FromCubicMeters(40), [Wall, floor], [new Radiator("a"), new FanHeater("b")]);
        Assert.Equal(40, room.Volume.CubicMeters);
        Assert.Equal([Wall, floor], room.Surfaces);
        Assert.Equal(1, room.IndexOfSurface("floor"));
        Assert.Equal(-1, room.IndexOfSurface("Floor"));
        Assert.Equal(1, room.IndexOfDevice("b"));
        Assert.Equal(-1, room.IndexOfDevice("c"));
        Assert.Equal(22, room.Air.Celsius, 1e-9);
    }

    [Theory]
    [InlineData(0, "Volume of room 'r' 0 m³ is not accepted; it must be (0 m³, 1E+6 m³].")]
    [InlineData(-5, "Volume of room 'r' -5 m³")]
    [InlineData(double.NaN, "Volume of room 'r' NaN m³")]
    public void Volume_Impossible_IsRefused(double volume, string expected)
        => Assert.Contains(expected, Assert.Throws<ArgumentOutOfRangeException>(() => new RoomContext("r", volume, [Wall])).Message, StringComparison.Ordinal);

    [Fact]
    public void Names_MissingTwiceOrUnknown_AreRefused()
    {
        Assert.Contains("has no surface; at least one", Assert.Throws<ArgumentException>(() => new RoomContext("r", 40, [])).Message, StringComparison.Ordinal);
        Assert.Contains("two surfaces named 'wall'", Assert.Throws<ArgumentException>(() => new RoomContext("r", 40, [Wall, Wall])).Message, StringComparison.Ordinal);
        Assert.Contains("two devices named 'a'", Assert.Throws<ArgumentException>(() => new RoomContext("r", 40, [Wall], [new Radiator("a"), new FanHeater("a")])).Message, StringComparison.Ordinal);
        var lost = new Radiator("a") { Placements = [new SurfacePlacement("windw", Placement.Above)] };
        Assert.Contains("places the surface 'windw', which room 'r' does not have. Its surfaces: 'wall'", Assert.Throws<ArgumentException>(() => new RoomContext("r", 40, [Wall], [lost])).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentNullException>(() => new RoomContext("r", 40, null!));
        Assert.Throws<ArgumentNullException>(() => new RoomContext("r", 40, [null!]));
        Assert.Throws<ArgumentException>(() => new RoomContext(string.Empty, 40, [Wall]));
    }

    [Fact]
    public void Placement_TwiceOrUnspecified_IsRefused()
    {
        Assert.Contains(
            "names the surface 'wall' twice",
            Assert.Throws<ArgumentException>(() => new Radiator("a") { Placements = [new SurfacePlacement("wall", Placement.Above), new SurfacePlacement("wall", Placement.Beside)] }).Message,
            StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => new SurfacePlacement("wall", Placement.Unspecified));
        Assert.Throws<ArgumentException>(() => new SurfacePlacement(string.Empty, Placement.Above));
        Assert.Throws<ArgumentNullException>(() => new Radiator("a") { Placements = null! });
    }

    [Fact]
    public void Devices_EachKind_SaysWhatItNeedsAndHowItsAirRuns()
    {
        (FlowDescriptor Device, StateNeed Needs, StreamDirection OnWalls)[] kinds =
        [
            (new StillAir("s"), StateNeed.None, StreamDirection.Across),
            (new Radiator("r"), StateNeed.OutputFraction, StreamDirection.Across),
            (new FanHeater("f"), StateNeed.OutputFraction, StreamDirection.Across),
            (new RadialCeilingDiffuser("d"), StateNeed.Flow | StateNeed.SupplyTemperature, StreamDirection.Down),
            (new SideWallJet("j"), StateNeed.Flow | StateNeed.SupplyTemperature, StreamDirection.Across),
            (new CeilingSlot("c"), StateNeed.Flow | StateNeed.SupplyTemperature, StreamDirection.Down),
            (new DisplacementInlet("i"), StateNeed.Flow | StateNeed.SupplyTemperature, StreamDirection.Across),
            (new AirStream("a"), StateNeed.Speed, StreamDirection.Across),
            (new WindowVentilation("w") { CrossesRoom = true }, StateNeed.Flow | StateNeed.SupplyTemperature, StreamDirection.Across),
        ];
        Assert.Equal(kinds.Length, kinds.Select(k => k.Device.Driver).Distinct().Count());
        Assert.Equal(kinds.Length, kinds.Select(k => k.Device.Description).Distinct().Count());
        var ceiling = new SurfaceContext("ceiling", SurfaceKind.Ceiling, 3, 3);
        foreach ((FlowDescriptor device, StateNeed needs, StreamDirection onWalls) in kinds)
        {
            Assert.Equal(needs, device.Needs);
            Assert.Equal(onWalls, device.StreamAlong(Wall));
            Assert.Equal(StreamDirection.Across, device.StreamAlong(ceiling));
            Assert.Equal(Placement.Elsewhere, device.PlacementOf("wall"));
            FlowDescriptor placed = device with { Placements = [new SurfacePlacement("wall", Placement.Opposite, StreamDirection.Up)] };
            Assert.Equal(StreamDirection.Up, placed.StreamAlong(Wall));
            Assert.Equal(Placement.Opposite, placed.PlacementOf("wall"));
            Assert.NotEqual(device, placed);
            Assert.Equal(placed, device with { Placements = [new SurfacePlacement("wall", Placement.Opposite, StreamDirection.Up)] });
            Assert.Equal(device.GetHashCode(), placed.GetHashCode());
        }
    }

    [Fact]
    public void Terminal_ImpossibleData_IsRefused()
    {
        Assert.Contains("Opening of device 'd' 0 m²", Assert.Throws<ArgumentOutOfRangeException>(() => new SideWallJet("d") { OpeningSquareMetres = 0 }).Message, StringComparison.Ordinal);
        Assert.Equal(0.02, new SideWallJet("d") { OpeningSquareMetres = 0.02 }.Opening!.Value.SquareMeters);
        Assert.Null(new SideWallJet("d").Opening);
        Assert.Throws<ArgumentOutOfRangeException>(() => new CeilingSlot("c") { FacadeMetres = double.NaN });
        Assert.Throws<ArgumentOutOfRangeException>(() => new CeilingSlot("c") { GlazedShare = 1.2 });
        Assert.Equal(0.4, new CeilingSlot("c") { GlazedShare = 0.4, FacadeMetres = 5, WindowHeight = default }.GlazedShare);
    }
}
