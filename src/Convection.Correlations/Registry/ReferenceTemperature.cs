namespace Convection.Correlations.Registry;

/// <summary>The temperature that a coefficient's difference is taken against.</summary>
/// <remarks>Coefficients of unlike reference are never compared or blended; fluxes are.</remarks>
public enum ReferenceTemperature
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>Mean room air.</summary>
    RoomAir = 1,

    /// <summary>Air just outside the boundary layer, about 0.1 m from the surface.</summary>
    LocalAir = 2,

    /// <summary>Air leaving the room.</summary>
    OutletAir = 3,

    /// <summary>Supply air at the device.</summary>
    SupplyAir = 4,

    /// <summary>Undisturbed air far away, or the stream before it meets the surface.</summary>
    FreeStream = 5,

    /// <summary>Operative temperature; only coefficients that include radiation use it.</summary>
    Operative = 6,
}
