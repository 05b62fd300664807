namespace Convection.Correlations.Laws;

/// <summary>The variable over which a piecewise law changes from one piece to the next.</summary>
public enum SwitchVariable
{
    /// <summary>Not given.</summary>
    Unspecified = 0,

    /// <summary>The driving variable itself, in its own unit.</summary>
    Driving = 1,

    /// <summary>Rayleigh number g·β·|ΔT|·L³·Pr/ν².</summary>
    Rayleigh = 2,

    /// <summary>Modified Rayleigh number g·β·q·L⁴·Pr/(k·ν²), q being the convective flux of the lower piece.</summary>
    ModifiedRayleigh = 3,

    /// <summary>Reynolds number U·L/ν.</summary>
    Reynolds = 4,
}
