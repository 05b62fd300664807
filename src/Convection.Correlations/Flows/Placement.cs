namespace Convection.Correlations.Flows;

/// <summary>Where a surface stands to a device.</summary>
public enum Placement
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>Somewhere else in the same room; what a device assumes of every surface it does not name.</summary>
    Elsewhere = 1,

    /// <summary>Above the device and in its plume, such as the window over a radiator.</summary>
    Above = 2,

    /// <summary>Next to or behind the device.</summary>
    Beside = 3,

    /// <summary>Facing the device, such as the wall a fan heater blows at.</summary>
    Opposite = 4,

    /// <summary>Below the window that the device serves.</summary>
    BelowWindow = 5,

    /// <summary>Above the window that the device serves.</summary>
    AboveWindow = 6,

    /// <summary>Swept by the device's air stream at the speed that the state gives.</summary>
    InStream = 7,
}
