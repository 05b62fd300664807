namespace Convection.Correlations.Registry;

/// <summary>How a state stands to the range of a correlation.</summary>
public enum RangeStanding
{
    /// <summary>Not evaluated.</summary>
    NotEvaluated = 0,

    /// <summary>The range of the correlation is not known.</summary>
    NotKnown = 1,

    /// <summary>Inside the tested range.</summary>
    Within = 2,

    /// <summary>Inside the tested range, but where this library advises against it.</summary>
    OutsideAdvised = 3,

    /// <summary>Outside the tested range, inside a justified extension.</summary>
    Extended = 4,

    /// <summary>Below the tested range.</summary>
    Below = 5,

    /// <summary>Above the tested range.</summary>
    Above = 6,

    /// <summary>The surface itself is outside: its tilt, height or the like.</summary>
    SurfaceOutside = 7,
}
