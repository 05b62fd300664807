namespace Convection.Correlations.Selection;

/// <summary>The part that a correlation plays on a surface.</summary>
public enum PartKind
{
    /// <summary>Not given.</summary>
    Unspecified = 0,

    /// <summary>Buoyancy of the surface itself, whatever the devices do.</summary>
    StillAir = 1,

    /// <summary>A heater's room: replaces the still-air part as the heater's output rises.</summary>
    Heater = 2,

    /// <summary>Supply air or a stream: blended with the still-air part by flux.</summary>
    Forced = 3,
}
