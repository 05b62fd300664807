namespace Convection.Correlations.Registry;

/// <summary>Which way the heat flows at a surface.</summary>
public enum HeatFlowSense
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>Any.</summary>
    Any = 1,

    /// <summary>Upwards: warm floor or cool ceiling, the unstable case.</summary>
    Up = 2,

    /// <summary>Downwards: cool floor or warm ceiling, the stable case.</summary>
    Down = 3,

    /// <summary>Sideways, at an upright surface.</summary>
    Horizontal = 4,
}
