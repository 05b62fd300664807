using System.Runtime.CompilerServices;
#if !NET
using T = Convection.Correlations.Evaluation.Kernels.ScalarLane;
#endif

namespace Convection.Correlations.Evaluation.Kernels;

/// <content>
/// Roots and powers of numbers that are not negative. Roots start from a guess made on the bit pattern, which halves, thirds or fifths
/// the exponent, and take two steps of high order: y ← y·(1 + e/p + …), e = 1 − x·yᵖ, the series of (1 − e)^(−1/p).
/// </content>
#if NET
internal static partial class FluxKernel<T>
    where T : struct, ILane<T>
#else
internal static partial class FluxKernel
#endif
{
    /// <summary>xⁿ of x ≥ 0. Zero stays zero, except to the power of zero.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static T Power(T x, Exponent n)
    {
        switch (n.Kind)
        {
            case ExponentKind.Zero:
                return T.Of(1);
            case ExponentKind.One:
                return x;
            case ExponentKind.Two:
                return x * x;
            case ExponentKind.Three:
                return x * x * x;
            case ExponentKind.Half:
                return T.Sqrt(x);
            case ExponentKind.ThreeHalves:
                return x * T.Sqrt(x);
            case ExponentKind.Quarter:
                return T.Sqrt(T.Sqrt(x));
            case ExponentKind.Fifth:
            case ExponentKind.FourFifths:
                return FifthPower(x, n.Kind);
            case ExponentKind.Other:
                return AnyPower(x, T.Of(n.Value));
            default:
                return ThirdPower(x, n.Kind);
        }
    }

    /// <summary>x^(−1/3) of x above zero; large and finite at zero.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static T InverseCubeRoot(T x)
    {
        T y = T.FromHighWord(T.Of(1430186164) - (T.HighWord(x) * T.Of(1.0 / 3)));
        T e = T.Of(1) - (x * y * (y * y));
        T e2 = e * e;
        y += y * ((e * (T.Of(1.0 / 3) + (e * T.Of(2.0 / 9)))) + (e2 * e * (T.Of(14.0 / 81) + (e * T.Of(35.0 / 243)))));
        e = T.Of(1) - (x * y * (y * y));
        return y + (y * (e * (T.Of(1.0 / 3) + (e * T.Of(2.0 / 9)))));
    }

    /// <summary>x^(−1/5) of x above zero; large and finite at zero.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static T InverseFifthRoot(T x)
    {
        T y = T.FromHighWord(T.Of(1287166897) - (T.HighWord(x) * T.Of(1.0 / 5)));
        T y2 = y * y;
        T e = T.Of(1) - (x * y * (y2 * y2));
        T e2 = e * e;
        y += y * ((e * (T.Of(0.2) + (e * T.Of(0.12)))) + (e2 * e * (T.Of(0.088) + (e * T.Of(0.0704)))));
        y2 = y * y;
        e = T.Of(1) - (x * y * (y2 * y2));
        return y + (y * (e * (T.Of(0.2) + (e * (T.Of(0.12) + (e * T.Of(0.088)))))));
    }

    private static T ThirdPower(T x, ExponentKind kind)
    {
        T root = kind == ExponentKind.Sixth ? T.Sqrt(x) : x;
        T y = InverseCubeRoot(root), once = root * y;
        return kind == ExponentKind.TwoThirds ? once : once * y;
    }

    private static T FifthPower(T x, ExponentKind kind)
    {
        T y = InverseFifthRoot(x), once = x * y, y3 = y * (y * y);
        return kind == ExponentKind.FourFifths ? once : once * y3;
    }

    /// <summary>2^(n·log₂x): the logarithm by the series of the inverse hyperbolic tangent, the exponential by its own.</summary>
    private static T AnyPower(T x, T n)
    {
        T m = T.MantissaOf(x), exponent = T.ExponentOf(x);
        T large = m > T.Of(1.4142135623730951);
        m = T.Select(large, m * T.Of(0.5), m);
        exponent = T.Select(large, exponent + T.Of(1), exponent);

        T z = (m - T.Of(1)) / (m + T.Of(1)), z2 = z * z, z4 = z2 * z2, z8 = z4 * z4;
        T low = (T.Of(1.0 / 3) + (z2 * T.Of(1.0 / 5))) + (z4 * (T.Of(1.0 / 7) + (z2 * T.Of(1.0 / 9))));
        T high = (T.Of(1.0 / 11) + (z2 * T.Of(1.0 / 13))) + (z4 * (T.Of(1.0 / 15) + (z2 * T.Of(1.0 / 17)))) + (z8 * (T.Of(1.0 / 19) + (z2 * T.Of(1.0 / 21))));
        T logarithm = (z + z) + ((z + z) * z2 * (low + (z8 * high)));
        T power = n * (exponent + (logarithm * T.Of(1.4426950408889634)));

        // Beyond the exponents of normal numbers it ends at the smallest or largest of them.
        power = T.Min(T.Max(power, T.Of(-1021)), T.Of(1022));
        T whole = (power + T.Of(6755399441055744)) - T.Of(6755399441055744);
        T t = (power - whole) * T.Of(0.6931471805599453), t2 = t * t, t4 = t2 * t2, t8 = t4 * t4;
        T sum = (T.Of(1) + t) + (t2 * (T.Of(1.0 / 2) + (t * T.Of(1.0 / 6))))
            + (t4 * ((T.Of(1.0 / 24) + (t * T.Of(1.0 / 120))) + (t2 * (T.Of(1.0 / 720) + (t * T.Of(1.0 / 5040))))))
            + (t8 * ((T.Of(1.0 / 40320) + (t * T.Of(1.0 / 362880))) + (t2 * (T.Of(1.0 / 3628800) + (t * T.Of(1.0 / 39916800))))
                + (t4 * (T.Of(1.0 / 479001600) + (t * T.Of(1.0 / 6227020800))))));

        // Below the smallest normal number the pattern has no leading one to read, and zero has none at all.
        return T.Select(x < T.Of(2.2250738585072014e-308), T.Of(0), sum * T.TwoTo(whole));
    }
}
