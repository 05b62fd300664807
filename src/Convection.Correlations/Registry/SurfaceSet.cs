using System;

namespace Convection.Correlations.Registry;

/// <summary>The surfaces that a correlation was made for.</summary>
[Flags]
public enum SurfaceSet
{
    /// <summary>None; refused.</summary>
    None = 0,

    /// <summary>Upright opaque walls, and upright plates.</summary>
    Wall = 1,

    /// <summary>Upright windows.</summary>
    Window = 2,

    /// <summary>Floors.</summary>
    Floor = 4,

    /// <summary>Ceilings.</summary>
    Ceiling = 8,

    /// <summary>Surfaces that are neither upright nor horizontal.</summary>
    Inclined = 16,

    /// <summary>Floors and ceilings alike, told apart by the sense of heat flow.</summary>
    Horizontal = Floor | Ceiling,

    /// <summary>Every surface.</summary>
    Any = Wall | Window | Floor | Ceiling | Inclined,
}
