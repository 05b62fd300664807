using System;

namespace Convection.Correlations.Laws;

/// <summary>How a buoyant and a forced flux on one surface make one.</summary>
/// <remarks>
/// S.W. Churchill, AIChE Journal 23(1), 10–16, 1977: Nuⁿ is the sum of the two parts' powers for assisting and transverse
/// flow, their difference for opposing flow; exponents 3 to 4 are quoted in an encyclopaedia article, and between those the
/// worst difference is 6 %. Here fluxes are blended, because the parts may refer to unlike temperatures. Subtraction belongs to
/// laminar flow: in turbulent flow along a wall, assisting buoyancy can impair and opposing buoyancy enhance the heat transfer
/// (known from vertical tubes; recalled, high). The lower bound of 0.8 times the larger part in opposing flow comes from
/// I. Beausoleil-Morrison, Energy and Buildings 33(4), 351–361, 2001 (recalled, high): a guard against cancellation, not a
/// measured minimum. Where the two fluxes point opposite ways, because the surface is between room and supply temperature,
/// no published rule is known; the library's own is documented with the room evaluation.
/// </remarks>
public sealed record BlendRule
{
    /// <summary>The defaults: exponent 3 throughout, floor 0.8.</summary>
    public static BlendRule Default { get; } = new();

    /// <summary>Exponent for assisting flow; 1 to 10. The default is 3.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Outside 1 to 10 or not a number.</exception>
    public double AssistingExponent { get; init => field = Exponent(value, nameof(AssistingExponent)); } = 3;

    /// <summary>Exponent for opposing flow, and for all fluxes that point opposite ways; 2 to 10. The default is 3; at 2 slopes have kinks.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Outside 2 to 10 or not a number.</exception>
    public double OpposingExponent
    {
        get;
        init => field = Require.Within(value, 2, 10, "Exponent of a blend", string.Empty, nameof(OpposingExponent));
    }
        = 3;

    /// <summary>Exponent for transverse flow; 1 to 10. The default is 3; 3.2 (walls) and 3.5 (horizontal plates) are published too.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Outside 1 to 10 or not a number.</exception>
    public double TransverseExponent { get; init => field = Exponent(value, nameof(TransverseExponent)); } = 3;

    /// <summary>Least share of the larger part that is left in opposing flow; 0.1 to 1. The default is 0.8.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Outside 0.1 to 1 or not a number.</exception>
    public double OpposingFloor
    {
        get;
        init => field = Require.Within(value, 0.1, 1, "Floor of opposing flow", string.Empty, nameof(OpposingFloor));
    }
        = 0.8;

    /// <summary>
    /// True (the default) joins the two kinks of opposing flow over narrow bands: where the floor sets in, 4 % of the ratio to
    /// either side, and where both parts are equal, 5 %. With the default floor the flux deviates from the published rule by at most
    /// 1.3 % (with a floor of 0.5 by 3.9 %), inside these
    /// bands alone. False gives the rule exactly as published.
    /// </summary>
    public bool JoinsKinks { get; init; } = true;

    private static double Exponent(double value, string name) => Require.Within(value, 1, 10, "Exponent of a blend", string.Empty, name);
}
