namespace Convection.Correlations.Registry;

/// <summary>Whether a surface is warmer or cooler than the air.</summary>
public enum SurfaceSide
{
    /// <summary>Either.</summary>
    Either = 0,

    /// <summary>Warmer: heat flows into the air.</summary>
    Warmer = 1,

    /// <summary>Cooler: heat flows out of the air.</summary>
    Cooler = 2,
}
