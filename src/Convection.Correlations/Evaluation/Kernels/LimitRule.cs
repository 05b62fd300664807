namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>What becomes of a law below its lowest and above its highest value.</summary>
internal enum LimitRule
{
    /// <summary>It goes on.</summary>
    None,

    /// <summary>Below the lowest value it fades to nothing; above the highest it goes on.</summary>
    Fade,

    /// <summary>Its coefficient is held at either limit.</summary>
    Hold,

    /// <summary>It fades below and is held above.</summary>
    FadeAndHold,
}
