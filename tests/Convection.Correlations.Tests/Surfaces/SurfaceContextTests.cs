using System;
using Convection.Correlations.Surfaces;
using UnitsNet;
using Xunit;

namespace Convection.Correlations.Tests.Surfaces;

public class SurfaceContextTests
{
    // Geometry by definition: 4A/P of 5 m × 4 m is 80/18 m, A/P a quarter of it.
    [Fact]
    public void Extent_Rectangle_GivesEveryCharacteristicLength()
    {
        SurfaceContext floor = SurfaceContext.Floor("floor", Length.FromMeters(5), Length.FromMeters(4));
        Assert.Equal(80.0 / 18, floor.HydraulicDiameterMetres, 1e-12);
        Assert.Equal(20.0 / 18, floor.AreaToPerimeterMetres, 1e-12);
        Assert.Equal(20, floor.AreaSquareMetres);
        Assert.Equal(18, floor.PerimeterMetres);
        Assert.Equal(4, floor.FlowLengthMetres);
        Assert.Equal(4, floor.ShortSideMetres);
        Assert.Equal(0, floor.TiltDegrees);
        Assert.True(floor.IsHorizontal && !floor.IsUpright);
        Assert.Equal(20, floor.Area.SquareMeters);
        Assert.Equal(18, floor.Perimeter.Meters);
        Assert.Equal(80.0 / 18, floor.HydraulicDiameter.Meters, 1e-12);
    }

    [Fact]
    public void NetArea_OfAWallWithAWindow_LeavesTheLengths()
    {
        SurfaceContext whole = SurfaceContext.Wall("w", Length.FromMeters(5), Length.FromMeters(2.7));
        SurfaceContext net = whole.WithArea(Area.FromSquareMeters(8));
        Assert.Equal(8, net.AreaSquareMetres);
        Assert.Equal(whole.HydraulicDiameterMetres, net.HydraulicDiameterMetres);
        Assert.Equal(2.7, net.FlowLengthMetres);
        Assert.Equal(5, net.Width.Meters);
        Assert.Equal(2.7, net.Height.Meters);
    }

    [Theory]
    [InlineData(SurfaceKind.Wall, 90)]
    [InlineData(SurfaceKind.Window, 90)]
    [InlineData(SurfaceKind.Floor, 0)]
    [InlineData(SurfaceKind.Ceiling, 180)]
    public void Tilt_NotGiven_FollowsFromTheKind(SurfaceKind kind, double degrees)
        => Assert.Equal(degrees, new SurfaceContext("s", kind, 2, 2).TiltDegrees);

    [Fact]
    public void Tilt_Given_IsKept()
    {
        SurfaceContext slope = SurfaceContext.Ceiling("slope", Length.FromMeters(4), Length.FromMeters(3)).WithTilt(Angle.FromDegrees(140));
        Assert.Equal(140, slope.Tilt.Degrees);
        Assert.Equal("slope (ceiling tilted 140°, 4 m × 3 m)", slope.ToString());
        Assert.False(slope.IsHorizontal || slope.IsUpright);
        Assert.Equal("pane (window, 1 m × 1.2 m)", SurfaceContext.Window("pane", Length.FromMeters(1), Length.FromCentimeters(120)).ToString());
    }

    [Theory]
    [InlineData(0, 2, "Width of surface 'w' 0 m is not accepted; it must be (0 m, 1000 m].")]
    [InlineData(-1, 2, "Width of surface 'w' -1 m")]
    [InlineData(double.NaN, 2, "Width of surface 'w' NaN m")]
    [InlineData(2, double.PositiveInfinity, "Height of surface 'w' infinity m")]
    [InlineData(2, 1e7, "Height of surface 'w' 1E+7 m")]
    public void Extent_Impossible_NamesQuantityValueUnitAndInterval(double width, double height, string expected)
        => Assert.Contains(
            expected,
            Assert.Throws<ArgumentOutOfRangeException>(() => new SurfaceContext("w", SurfaceKind.Wall, width, height)).Message,
            StringComparison.Ordinal);

    [Fact]
    public void OtherMembers_Impossible_AreRefused()
    {
        Assert.Throws<ArgumentException>(() => new SurfaceContext(" ", SurfaceKind.Wall, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new SurfaceContext("w", SurfaceKind.Unspecified, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new SurfaceContext("w", (SurfaceKind)99, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new SurfaceContext("w", SurfaceKind.Wall, 1, 1) { Role = (SurfaceRole)9 });
        Assert.Contains("[0°, 90°]", Assert.Throws<ArgumentOutOfRangeException>(() => new SurfaceContext("f", SurfaceKind.Floor, 1, 1) { TiltDegrees = 120 }).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => new SurfaceContext("w", SurfaceKind.Wall, 1, 1) { AreaSquareMetres = -1 });
        Assert.Throws<ArgumentOutOfRangeException>(() => new SurfaceContext("w", SurfaceKind.Wall, 1, 1) { PerimeterMetres = double.NaN });
        Assert.Throws<ArgumentOutOfRangeException>(() => new SurfaceContext("w", SurfaceKind.Wall, 1, 1) { FlowLengthMetres = 0 });
    }
}
