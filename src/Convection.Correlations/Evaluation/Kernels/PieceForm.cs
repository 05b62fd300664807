namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>How the numbers of a piece make a coefficient.</summary>
internal enum PieceForm
{
    /// <summary>a·xⁿ.</summary>
    Single,

    /// <summary>a1·x^n1 + a2·x^n2.</summary>
    Sum,

    /// <summary>(b1·x^(m·n1) + b2·x^(m·n2))^(1/m), b = aᵐ.</summary>
    Joined,

    /// <summary>The same scaled by the larger term, for powers that would leave the numbers' range.</summary>
    JoinedScaled,

    /// <summary>A law given by code.</summary>
    Code,
}
