namespace Convection.Correlations.Flows;

/// <summary>What moves the air along a surface.</summary>
public enum FlowDriver
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>The surface's own temperature difference, the source not distinguishing any further.</summary>
    StillAir = 1,

    /// <summary>The surface's own temperature difference, measured on a heated or cooled surface or plate by itself.</summary>
    SelfHeated = 2,

    /// <summary>A heated or chilled panel that is a surface of the room.</summary>
    Panel = 3,

    /// <summary>A radiator or convector in the room.</summary>
    Radiator = 4,

    /// <summary>A fan heater in the room.</summary>
    FanHeater = 5,

    /// <summary>Supply air from a radial ceiling diffuser.</summary>
    RadialCeilingDiffuser = 6,

    /// <summary>Supply air as a free jet from a side wall.</summary>
    SideWallJet = 7,

    /// <summary>Supply air from a ceiling slot along a façade.</summary>
    CeilingSlot = 8,

    /// <summary>Supply air from a displacement inlet.</summary>
    DisplacementInlet = 9,

    /// <summary>A stream of known speed along the surface.</summary>
    AirStream = 10,

    /// <summary>Air through an open window or through the room from side to side.</summary>
    WindowVentilation = 11,
}
