using System;
using UnitsNet;

namespace Convection.Correlations.Surfaces;

/// <content>Construction from quantities.</content>
public sealed partial record SurfaceContext
{
    /// <summary>An upright wall.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <param name="width">Width, in (0, 1000] m.</param>
    /// <param name="height">Height, in (0, 1000] m.</param>
    /// <returns>The surface.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A length is outside its interval.</exception>
    public static SurfaceContext Wall(string name, Length width, Length height) => Create(name, SurfaceKind.Wall, width, height);

    /// <summary>An upright window.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <param name="width">Width, in (0, 1000] m.</param>
    /// <param name="height">Height, in (0, 1000] m.</param>
    /// <returns>The surface.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A length is outside its interval.</exception>
    public static SurfaceContext Window(string name, Length width, Length height) => Create(name, SurfaceKind.Window, width, height);

    /// <summary>A floor.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <param name="width">One side, in (0, 1000] m.</param>
    /// <param name="depth">Other side, in (0, 1000] m.</param>
    /// <returns>The surface.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A length is outside its interval.</exception>
    public static SurfaceContext Floor(string name, Length width, Length depth) => Create(name, SurfaceKind.Floor, width, depth);

    /// <summary>A ceiling.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <param name="width">One side, in (0, 1000] m.</param>
    /// <param name="depth">Other side, in (0, 1000] m.</param>
    /// <returns>The surface.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A length is outside its interval.</exception>
    public static SurfaceContext Ceiling(string name, Length width, Length depth) => Create(name, SurfaceKind.Ceiling, width, depth);

    /// <summary>The same surface with the area that is left of it, for instance around a window.</summary>
    /// <param name="netArea">Area that exchanges heat with the room, in (0, 1 000 000] m².</param>
    /// <returns>Another surface.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The area is outside its interval.</exception>
    public SurfaceContext WithArea(Area netArea) => this with { AreaSquareMetres = netArea.SquareMeters };

    /// <summary>The same surface, tilted.</summary>
    /// <param name="tilt">Angle between straight up and the direction the surface faces, 0° to 180°.</param>
    /// <returns>Another surface.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The angle is outside its interval.</exception>
    public SurfaceContext WithTilt(Angle tilt) => this with { TiltDegrees = tilt.Degrees };

    private static SurfaceContext Create(string name, SurfaceKind kind, Length width, Length height)
        => new(name, kind, width.Meters, height.Meters);
}
