#if NET
using System;
using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>A lane as wide as a 512-bit register.</summary>
internal readonly unsafe struct Lane512(Vector512<double> value) : ILane<Lane512>
{
    private const double Carrier = 4503599627370496, SignedCarrier = 6755399441055744;
    private const long CarrierBits = 0x4330000000000000;

    private readonly Vector512<double> value = value;

    public static int Width => Vector512<double>.Count;

    public static Lane512 operator +(Lane512 a, Lane512 b) => new(a.value + b.value);

    public static Lane512 operator -(Lane512 a, Lane512 b) => new(a.value - b.value);

    public static Lane512 operator -(Lane512 a) => new(-a.value);

    public static Lane512 operator *(Lane512 a, Lane512 b) => new(a.value * b.value);

    public static Lane512 operator /(Lane512 a, Lane512 b) => new(a.value / b.value);

    public static Lane512 operator &(Lane512 a, Lane512 b) => new(a.value & b.value);

    public static Lane512 operator |(Lane512 a, Lane512 b) => new(a.value | b.value);

    public static Lane512 operator ~(Lane512 a) => new(~a.value);

    public static Lane512 operator <(Lane512 a, Lane512 b) => new(Vector512.LessThan(a.value, b.value));

    public static Lane512 operator >(Lane512 a, Lane512 b) => new(Vector512.GreaterThan(a.value, b.value));

    public static Lane512 operator <=(Lane512 a, Lane512 b) => new(Vector512.LessThanOrEqual(a.value, b.value));

    public static Lane512 operator >=(Lane512 a, Lane512 b) => new(Vector512.GreaterThanOrEqual(a.value, b.value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 Of(double value) => new(Vector512.Create(value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 Load(double* from) => new(Vector512.Load(from));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void Store(Lane512 value, double* to) => value.value.Store(to);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 Abs(Lane512 a) => new(Vector512.Abs(a.value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 Sqrt(Lane512 a) => new(Vector512.Sqrt(a.value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 Max(Lane512 a, Lane512 b) => Select(a > b, a, b);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 Min(Lane512 a, Lane512 b) => Select(a < b, a, b);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 Select(Lane512 mask, Lane512 yes, Lane512 no) => new(Vector512.ConditionalSelect(mask.value, yes.value, no.value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static bool Any(Lane512 mask) => mask.value.AsInt64() != Vector512<long>.Zero;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 HighWord(Lane512 a) => Whole(Vector512.ShiftRightLogical(a.value.AsInt64(), 32));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 FromHighWord(Lane512 a)
        => new(Vector512.ShiftLeft((a.value + Vector512.Create(Carrier)).AsInt64(), 32).AsDouble());

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 ExponentOf(Lane512 a) => Whole(Vector512.ShiftRightLogical(a.value.AsInt64(), 52)) - Of(1023);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 MantissaOf(Lane512 a)
        => new(((a.value.AsInt64() & Vector512.Create(0x000FFFFFFFFFFFFF)) | Vector512.Create(0x3FF0000000000000)).AsDouble());

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane512 TwoTo(Lane512 n)
        => new(Vector512.ShiftLeft((n.value + Vector512.Create(SignedCarrier + 1023)).AsInt64(), 52).AsDouble());

    public static Lane512 Map(Func<double, LawValue> law, Lane512 x, out Lane512 sensitivity)
    {
        double* values = stackalloc double[2 * Width];
        Store(x, values);
        for (int i = 0; i < Width; i++)
        {
            LawValue value = law(values[i]);
            values[i] = value.Coefficient;
            values[Width + i] = value.Sensitivity;
        }

        sensitivity = Load(values + Width);
        return Load(values);
    }

    /// <summary>A whole number of up to 52 bits in the low bits of a pattern, as a number.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Lane512 Whole(Vector512<long> low) => new((low | Vector512.Create(CarrierBits)).AsDouble() - Vector512.Create(Carrier));
}
#endif
