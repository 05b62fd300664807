namespace Convection.Correlations.Surfaces;

/// <summary>What a room-side surface is.</summary>
public enum SurfaceKind
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>An opaque wall, upright unless its tilt says otherwise.</summary>
    Wall = 1,

    /// <summary>A window or other glazing, upright unless its tilt says otherwise.</summary>
    Window = 2,

    /// <summary>A floor: the room is above it.</summary>
    Floor = 3,

    /// <summary>A ceiling: the room is below it.</summary>
    Ceiling = 4,
}
