using System;
using System.Runtime.CompilerServices;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>A lane of one surface.</summary>
#if NET
internal readonly unsafe struct ScalarLane(double value) : ILane<ScalarLane>
#else
internal readonly unsafe struct ScalarLane(double value)
#endif
{
    /// <summary>2⁵²: added to a small whole number, it puts that number into the low bits of the pattern.</summary>
    private const double Carrier = 4503599627370496, SignedCarrier = 6755399441055744;
    private const long CarrierBits = 0x4330000000000000;

    public readonly double Value = value;

    public static int Width => 1;

    public static ScalarLane operator +(ScalarLane a, ScalarLane b) => new(a.Value + b.Value);

    public static ScalarLane operator -(ScalarLane a, ScalarLane b) => new(a.Value - b.Value);

    public static ScalarLane operator -(ScalarLane a) => new(-a.Value);

    public static ScalarLane operator *(ScalarLane a, ScalarLane b) => new(a.Value * b.Value);

    public static ScalarLane operator /(ScalarLane a, ScalarLane b) => new(a.Value / b.Value);

    public static ScalarLane operator &(ScalarLane a, ScalarLane b) => Pattern(Bits(a) & Bits(b));

    public static ScalarLane operator |(ScalarLane a, ScalarLane b) => Pattern(Bits(a) | Bits(b));

    public static ScalarLane operator ~(ScalarLane a) => Pattern(~Bits(a));

    public static ScalarLane operator <(ScalarLane a, ScalarLane b) => Mask(a.Value < b.Value);

    public static ScalarLane operator >(ScalarLane a, ScalarLane b) => Mask(a.Value > b.Value);

    public static ScalarLane operator <=(ScalarLane a, ScalarLane b) => Mask(a.Value <= b.Value);

    public static ScalarLane operator >=(ScalarLane a, ScalarLane b) => Mask(a.Value >= b.Value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane Of(double value) => new(value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane Load(double* from) => new(*from);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void Store(ScalarLane value, double* to) => *to = value.Value;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane Abs(ScalarLane a) => new(Math.Abs(a.Value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane Sqrt(ScalarLane a) => new(Math.Sqrt(a.Value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane Max(ScalarLane a, ScalarLane b) => a.Value > b.Value ? a : b;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane Min(ScalarLane a, ScalarLane b) => a.Value < b.Value ? a : b;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane Select(ScalarLane mask, ScalarLane yes, ScalarLane no) => Bits(mask) != 0 ? yes : no;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static bool Any(ScalarLane mask) => Bits(mask) != 0;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane HighWord(ScalarLane a) => new((int)(Bits(a) >> 32));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane FromHighWord(ScalarLane a) => Pattern(Bits(new(a.Value + Carrier)) << 32);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane ExponentOf(ScalarLane a) => Pattern((Bits(a) >> 52) | CarrierBits) - new ScalarLane(Carrier + 1023);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane MantissaOf(ScalarLane a) => Pattern((Bits(a) & 0x000FFFFFFFFFFFFF) | 0x3FF0000000000000);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ScalarLane TwoTo(ScalarLane n) => Pattern(Bits(new(n.Value + (SignedCarrier + 1023))) << 52);

    public static ScalarLane Map(Func<double, LawValue> law, ScalarLane x, out ScalarLane sensitivity)
    {
        LawValue value = law(x.Value);
        sensitivity = new(value.Sensitivity);
        return new(value.Coefficient);
    }

    private static long Bits(ScalarLane a) => BitConverter.DoubleToInt64Bits(a.Value);

    private static ScalarLane Pattern(long bits) => new(BitConverter.Int64BitsToDouble(bits));

    private static ScalarLane Mask(bool holds) => Pattern(holds ? -1 : 0);
}
