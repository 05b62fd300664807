namespace Convection.Correlations.Laws;

/// <summary>A place where one piece of a piecewise law ends and the next begins, with the jump between them.</summary>
/// <remarks>The default value is a joint at zero between two zero coefficients and stands for none.</remarks>
public readonly record struct LawJoint
{
    internal LawJoint(double at, double below, double above)
    {
        At = at;
        Below = below;
        Above = above;
    }

    /// <summary>Value of the driving variable, in its own unit.</summary>
    public double At { get; }

    /// <summary>Coefficient of the lower piece there [W/(m²·K)].</summary>
    public double Below { get; }

    /// <summary>Coefficient of the upper piece there [W/(m²·K)].</summary>
    public double Above { get; }

    /// <summary>Jump as a fraction of the lower piece [-]; positive when the upper piece is larger.</summary>
    public double RelativeJump => (Above - Below) / Below;
}
