namespace Convection.Correlations.Laws;

/// <summary>The variable that a law's coefficient depends on while a room runs.</summary>
public enum DrivingVariable
{
    /// <summary>Not given.</summary>
    Unspecified = 0,

    /// <summary>None: a fixed value.</summary>
    None = 1,

    /// <summary>Size of the temperature difference between surface and air [K].</summary>
    TemperatureDifference = 2,

    /// <summary>Air changes of supply air (recirculated air included) per hour [1/h].</summary>
    AirChangeRate = 3,

    /// <summary>Jet momentum number V̇·U0/(g·V) [-].</summary>
    JetMomentum = 4,

    /// <summary>Supply flow per length of façade [m³/(h·m)].</summary>
    FlowPerLength = 5,

    /// <summary>Speed of the stream along the surface [m/s].</summary>
    Speed = 6,

    /// <summary>Forced part over buoyant part h_f/h_n [-], of a rule that mixes two coefficients.</summary>
    PartRatio = 7,
}
