namespace Convection.Correlations.Surfaces;

/// <summary>Whether a surface is heated or chilled on purpose.</summary>
public enum SurfaceRole
{
    /// <summary>Neither heated nor chilled by plant; the value of a surface that says nothing.</summary>
    Passive = 0,

    /// <summary>A heated panel, such as a heated floor.</summary>
    Heated = 1,

    /// <summary>A chilled panel, such as a chilled ceiling.</summary>
    Chilled = 2,
}
