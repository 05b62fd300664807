using Convection.Correlations.Flows;
using Convection.Correlations.Rooms;
using Convection.Correlations.Surfaces;
using UnitsNet;

namespace Convection.Correlations.Quickstart;

/// <summary>The invented office of the quickstart: one outside wall with a window, a radiator under it, a diffuser in the ceiling.</summary>
internal static class Office
{
    public const string Radiator = "radiator", Diffuser = "diffuser";

    public static RoomContext Describe() => RoomContext.Create(
        "corner office",
        Volume.FromCubicMeters(5.0 * 4.5 * 2.8),
        [
            SurfaceContext.Wall("facade", Metres(5.0), Metres(2.8)).WithArea(Area.FromSquareMeters(8.6)),
            SurfaceContext.Window("window", Metres(3.0), Metres(1.8)),
            SurfaceContext.Wall("left wall", Metres(4.5), Metres(2.8)),
            SurfaceContext.Wall("right wall", Metres(4.5), Metres(2.8)),
            SurfaceContext.Wall("inner wall", Metres(5.0), Metres(2.8)),
            SurfaceContext.Floor("floor", Metres(5.0), Metres(4.5)),
            SurfaceContext.Ceiling("ceiling", Metres(5.0), Metres(4.5)),
        ],
        [
            new Radiator(Radiator)
            {
                Placements = [new SurfacePlacement("window", Placement.Above), new SurfacePlacement("facade", Placement.Beside)],
            },
            new RadialCeilingDiffuser(Diffuser),
        ]);

    private static Length Metres(double metres) => Length.FromMeters(metres);
}
