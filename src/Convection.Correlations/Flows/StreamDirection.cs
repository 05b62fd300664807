namespace Convection.Correlations.Flows;

/// <summary>How a device's air runs along a surface, which decides whether buoyancy helps or hinders it.</summary>
public enum StreamDirection
{
    /// <summary>Not given: the device's own habit applies.</summary>
    Unspecified = 0,

    /// <summary>Up the surface.</summary>
    Up = 1,

    /// <summary>Down the surface.</summary>
    Down = 2,

    /// <summary>Across it: sideways on a wall, any direction on a floor or ceiling. Buoyancy neither helps nor hinders.</summary>
    Across = 3,
}
