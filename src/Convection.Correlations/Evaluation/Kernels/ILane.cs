#if NET
using System;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>One number for each of several surfaces that are evaluated side by side.</summary>
/// <remarks>
/// Kernels are written once, against this interface. Every operation is rounded as IEEE 754 says, and none is fused, so a surface has
/// the same bits in a lane of any width, on any machine and on both targets. A mask is a lane whose members have all bits set or none.
/// </remarks>
internal unsafe interface ILane<T>
    where T : struct, ILane<T>
{
    /// <summary>How many surfaces stand side by side.</summary>
    static abstract int Width { get; }

    static abstract T operator +(T a, T b);

    static abstract T operator -(T a, T b);

    static abstract T operator -(T a);

    static abstract T operator *(T a, T b);

    static abstract T operator /(T a, T b);

    static abstract T operator &(T a, T b);

    static abstract T operator |(T a, T b);

    static abstract T operator ~(T a);

    static abstract T operator <(T a, T b);

    static abstract T operator >(T a, T b);

    static abstract T operator <=(T a, T b);

    static abstract T operator >=(T a, T b);

    static abstract T Of(double value);

    static abstract T Load(double* from);

    static abstract void Store(T value, double* to);

    static abstract T Abs(T a);

    static abstract T Sqrt(T a);

    static abstract T Max(T a, T b);

    static abstract T Min(T a, T b);

    static abstract T Select(T mask, T yes, T no);

    static abstract bool Any(T mask);

    /// <summary>The upper 32 bits of a number's pattern, as a number.</summary>
    static abstract T HighWord(T a);

    /// <summary>The number whose pattern has these upper 32 bits, and zeros below.</summary>
    static abstract T FromHighWord(T a);

    /// <summary>The exponent e of a normal number m·2ᵉ, 1 ≤ m &lt; 2.</summary>
    static abstract T ExponentOf(T a);

    /// <summary>The m of a normal number m·2ᵉ, 1 ≤ m &lt; 2.</summary>
    static abstract T MantissaOf(T a);

    /// <summary>2ⁿ of a whole n, −1022 to 1023.</summary>
    static abstract T TwoTo(T n);

    /// <summary>A law given by code, surface after surface.</summary>
    static abstract T Map(Func<double, LawValue> law, T x, out T sensitivity);
}
#endif
