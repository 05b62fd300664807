using System.Runtime.CompilerServices;
#if !NET
using T = Convection.Correlations.Evaluation.Kernels.ScalarLane;
#endif

namespace Convection.Correlations.Evaluation.Kernels;

/// <content>Laws: coefficient h and sensitivity x·dh/dx.</content>
#if NET
internal static partial class FluxKernel<T>
#else
internal static partial class FluxKernel
#endif
{
    /// <summary>The law at x ≥ 0, its limits heeded.</summary>
    public static void Law(LawShape shape, Numbers numbers, T x, out T h, out T sensitivity)
    {
        T at = x;
        if (shape.Limits != LimitRule.None)
        {
            at = T.Max(at, numbers[shape.FirstLimit]);
            at = shape.Limits == LimitRule.Fade ? at : T.Min(at, numbers[shape.FirstLimit + 1]);
        }

        Chain(shape.Rungs[0], numbers, at, out h, out sensitivity);
        for (int i = 1; i < shape.Rungs.Length; i++)
        {
            int band = shape.FirstPassage + (2 * i) - 2;
            T low = numbers[band];
            if (!T.Any(at > low))
            {
                break;
            }

            Chain(shape.Rungs[i], numbers, at, out T next, out T nextSensitivity);
            Pass(ref h, ref sensitivity, next, nextSensitivity, at, low, numbers[band + 1]);
        }

        if (shape.Limits != LimitRule.None)
        {
            Limit(shape, numbers, x, at, ref h, ref sensitivity);
        }
    }

    private static void Limit(LawShape shape, Numbers numbers, T x, T at, ref T h, ref T sensitivity)
    {
        T lowest = numbers[shape.FirstLimit];
        T below = x < lowest;
        if (shape.Limits != LimitRule.Hold && T.Any(below))
        {
            // From h = 0 with no slope at no flow to the law's own value and slope at its lowest flow. A steeper slope than 3h
            // would let the cubic dip below zero.
            T u = x / lowest, slope = T.Min(sensitivity, T.Of(3) * h), u2 = u * u;
            T faded = (h * u2 * (T.Of(3) - (u + u))) + (slope * u2 * (u - T.Of(1)));
            T fadedSensitivity = (h * T.Of(6) * u2 * (T.Of(1) - u)) + (slope * u2 * ((T.Of(3) * u) - T.Of(2)));
            h = T.Select(below, faded, h);
            sensitivity = T.Select(below, fadedSensitivity, sensitivity);
        }

        if (shape.Limits == LimitRule.Hold)
        {
            sensitivity = T.Select((x < at) | (x > at), T.Of(0), sensitivity);
        }
        else if (shape.Limits == LimitRule.FadeAndHold)
        {
            sensitivity = T.Select(x > at, T.Of(0), sensitivity);
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Chain(LawShape.Chain chain, Numbers numbers, T x, out T h, out T sensitivity)
    {
        Piece(chain.Pieces[0], numbers, x, out h, out sensitivity);
        if (chain.Pieces.Length > 1)
        {
            Further(chain, numbers, x, ref h, ref sensitivity);
        }
    }

    private static void Further(LawShape.Chain chain, Numbers numbers, T x, ref T h, ref T sensitivity)
    {
        for (int i = 1; i < chain.Pieces.Length; i++)
        {
            int band = chain.FirstBand + (2 * i) - 2;
            T low = numbers[band];
            if (!T.Any(x > low))
            {
                break;
            }

            Piece(chain.Pieces[i], numbers, x, out T next, out T nextSensitivity);
            Pass(ref h, ref sensitivity, next, nextSensitivity, x, low, numbers[band + 1]);
        }
    }

    /// <summary>Passage from a law to the next, with a continuous slope; either law's own bits outside the band.</summary>
    private static void Pass(ref T h, ref T sensitivity, T next, T nextSensitivity, T x, T low, T perWidth)
    {
        T u = (x - low) * perWidth;
        T isPast = u >= T.Of(1), isIn = (u > T.Of(0)) & ~isPast;
        T weight = u * u * (T.Of(3) - (u + u)), rise = next - h;
        T between = sensitivity + (weight * (nextSensitivity - sensitivity)) + (x * (T.Of(6) * u * (T.Of(1) - u) * perWidth) * rise);
        sensitivity = T.Select(isPast, nextSensitivity, T.Select(isIn, between, sensitivity));
        h = T.Select(isPast, next, T.Select(isIn, h + (weight * rise), h));
    }

    private static void Piece(PieceShape piece, Numbers numbers, T x, out T h, out T sensitivity)
    {
        switch (piece.Form)
        {
            case PieceForm.Single:
                h = numbers[piece.First] * Power(x, piece.FirstExponent);
                sensitivity = T.Of(piece.FirstExponent.Value) * h;
                break;
            case PieceForm.Sum:
                T one = numbers[piece.First] * Power(x, piece.FirstExponent), two = numbers[piece.First + 1] * Power(x, piece.SecondExponent);
                h = one + two;
                sensitivity = (T.Of(piece.FirstExponent.Value) * one) + (T.Of(piece.SecondExponent.Value) * two);
                break;
            case PieceForm.Joined:
                Joined(piece, numbers[piece.First] * Power(x, piece.FirstExponent), numbers[piece.First + 1] * Power(x, piece.SecondExponent), out h, out sensitivity);
                break;
            case PieceForm.JoinedScaled:
                JoinedScaled(piece, numbers[piece.First] * Power(x, piece.FirstExponent), numbers[piece.First + 1] * Power(x, piece.SecondExponent), out h, out sensitivity);
                break;
            default:
                h = T.Map(piece.Code!, x, out sensitivity);
                break;
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Joined(PieceShape piece, T one, T two, out T h, out T sensitivity)
    {
        T sum = one + two;
        T slope = ((T.Of(piece.FirstExponent.Value) * one) + (T.Of(piece.SecondExponent.Value) * two)) * T.Of(1 / piece.JoinPower);
        if (piece.Root.Kind == ExponentKind.Sixth)
        {
            // y = sum^(−1/6) gives the root as √sum·y² and 1/sum as y⁶, without a division.
            T root = T.Sqrt(sum), y = InverseCubeRoot(root), y3 = y * y * y;
            h = root * (y * y);
            sensitivity = h * (slope * (y3 * y3));
        }
        else
        {
            h = Power(sum, piece.Root);
            sensitivity = h * (slope / sum);
        }

        sensitivity = T.Select(sum > T.Of(1e-290), sensitivity, T.Of(0));
    }

    private static void JoinedScaled(PieceShape piece, T one, T two, out T h, out T sensitivity)
    {
        T larger = T.Max(one, two), any = larger > T.Of(0);
        T divisor = T.Select(any, larger, T.Of(1));
        var m = new Exponent(piece.JoinPower);
        T p1 = Power(one / divisor, m), p2 = Power(two / divisor, m), sum = T.Select(any, p1 + p2, T.Of(1));
        h = larger * Power(sum, piece.Root);
        sensitivity = h * (((T.Of(piece.FirstExponent.Value) * p1) + (T.Of(piece.SecondExponent.Value) * p2)) / sum);
    }
}
