namespace Convection.Correlations.Registry;

/// <summary>A variable whose range a source states.</summary>
public enum RangeVariable
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>Size of the temperature difference [K].</summary>
    TemperatureDifference = 1,

    /// <summary>Rayleigh number [-].</summary>
    Rayleigh = 2,

    /// <summary>Grashof number [-].</summary>
    Grashof = 3,

    /// <summary>Modified Rayleigh number, with the flux in place of the temperature difference [-].</summary>
    ModifiedRayleigh = 4,

    /// <summary>Reynolds number [-].</summary>
    Reynolds = 5,

    /// <summary>Prandtl number [-].</summary>
    Prandtl = 6,

    /// <summary>Air changes of supply air per hour [1/h].</summary>
    AirChangeRate = 7,

    /// <summary>Jet momentum number [-].</summary>
    JetMomentum = 8,

    /// <summary>Supply flow per length of façade [m³/(h·m)].</summary>
    FlowPerLength = 9,

    /// <summary>Tilt [°]: 0 faces up, 90 is upright, 180 faces down.</summary>
    Tilt = 10,

    /// <summary>Height of the surface [m].</summary>
    Height = 11,

    /// <summary>Archimedes number of the supply jet [-]; not checked, because the state does not hold it.</summary>
    Archimedes = 12,

    /// <summary>Tilt to the heat flow [°]: 0 warm air rises freely, 90 upright, 180 it is held at the surface.</summary>
    FlowTilt = 13,

    /// <summary>Rayleigh number times the sine of the tilt to the heat flow [-].</summary>
    TiltedRayleigh = 14,
}
