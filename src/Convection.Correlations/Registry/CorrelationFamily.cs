namespace Convection.Correlations.Registry;

/// <summary>What a correlation's coefficient contains.</summary>
public enum CorrelationFamily
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>Buoyancy alone, driven by the temperature difference.</summary>
    Buoyant = 1,

    /// <summary>Forced flow alone, driven by a flow or speed.</summary>
    Forced = 2,

    /// <summary>Buoyancy and forced flow together, as measured or as blended by the source; neither is added again.</summary>
    Mixed = 3,

    /// <summary>A fixed convective value.</summary>
    FixedValue = 4,

    /// <summary>Convection and radiation together. Kept apart; never selected as convective.</summary>
    Total = 5,
}
