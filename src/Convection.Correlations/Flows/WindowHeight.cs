namespace Convection.Correlations.Flows;

/// <summary>Where a window sits in its wall.</summary>
public enum WindowHeight
{
    /// <summary>Not given.</summary>
    Unspecified = 0,

    /// <summary>In the upper part of the wall.</summary>
    Upper = 1,

    /// <summary>In the lower part of the wall.</summary>
    Lower = 2,
}
