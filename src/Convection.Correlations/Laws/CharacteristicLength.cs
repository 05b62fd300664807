namespace Convection.Correlations.Laws;

/// <summary>The length of a source's formula.</summary>
public enum CharacteristicLength
{
    /// <summary>No length, or one that cancels.</summary>
    None = 0,

    /// <summary>Height H, along the slope for a tilted surface [m].</summary>
    Height = 1,

    /// <summary>Hydraulic diameter 4A/P [m].</summary>
    HydraulicDiameter = 2,

    /// <summary>Area over perimeter A/P, a quarter of the hydraulic diameter [m].</summary>
    AreaToPerimeter = 3,

    /// <summary>Length along the flow L [m].</summary>
    AlongFlow = 4,

    /// <summary>Half of the shorter side [m].</summary>
    HalfShortSide = 5,

    /// <summary>Cube root of the room volume [m].</summary>
    RoomCubeRoot = 6,

    /// <summary>Mean of the two sides [m].</summary>
    MeanSide = 7,
}
