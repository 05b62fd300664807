namespace Convection.Correlations.Evaluation;

/// <summary>What moves the air at a surface, judged by the shares of the fluxes.</summary>
/// <remarks>A forced share up to 20 % counts as buoyant, from 80 % as forced, between them as mixed.</remarks>
public enum FlowRegime
{
    /// <summary>Not evaluated, or not valid.</summary>
    None = 0,

    /// <summary>Buoyancy, a heater's plume included.</summary>
    Buoyant = 1,

    /// <summary>Supply air or a stream.</summary>
    Forced = 2,

    /// <summary>Both, the stream running with the buoyant flow.</summary>
    MixedAssisting = 3,

    /// <summary>Both, the stream running against the buoyant flow.</summary>
    MixedOpposing = 4,

    /// <summary>Both, the stream running across the buoyant flow.</summary>
    MixedTransverse = 5,

    /// <summary>Both, the heat flowing opposite ways because the surface is between room and supply temperature.</summary>
    MixedOppositeFluxes = 6,

    /// <summary>Both, contained in one measured coefficient.</summary>
    MixedAsMeasured = 7,
}
