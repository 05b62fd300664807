#if !NET
using T = Convection.Correlations.Evaluation.Kernels.ScalarLane;
#endif

namespace Convection.Correlations.Evaluation.Kernels;

/// <content>
/// <para>Two fluxes on one surface made into one.</para>
/// <para>Same direction of heat: sums of powers for assisting and transverse flow, their difference with a floor for opposing flow.</para>
/// <para>
/// Opposite directions: q = (a·|a|^(n−1) + b·|b|^(n−1)) / (|a|^(n−1) + |b|^(n−1)), the mean of the two weighted by their own size. No
/// published rule is known. This one is continuous in all temperatures, gives zero where the two balance and the larger one
/// alone where the other vanishes, and its slope to either flux lies between 0 and n/2.
/// </para>
/// <para>Every rule scales with its arguments. Where both fluxes are zero, the slopes of the result are therefore the blend of their slopes.</para>
/// </content>
#if NET
internal static partial class FluxKernel<T>
#else
internal static partial class FluxKernel
#endif
{
    /// <summary>Assisting or transverse flow.</summary>
    public static Flux Add(Flux a, Flux b, PowerPair n, BlendShape rule) => Blend(a, b, n, rule, isOpposing: false);

    /// <summary>Opposing flow.</summary>
    public static Flux Oppose(Flux a, Flux b, BlendShape rule) => Blend(a, b, rule.Opposing, rule, isOpposing: true);

    private static Flux Blend(Flux a, Flux b, PowerPair n, BlendShape rule, bool isOpposing)
    {
        // Where there is only one flux, it stands as it is.
        T both = a.IsSomething & b.IsSomething;
        Flux alone = a.Plus(b);
        if (!T.Any(both))
        {
            return alone;
        }

        T value = Combine(a.Value, b.Value, n, rule, isOpposing, out T perA, out T perB);
        var blended = new Flux(
            value,
            (perA * a.Surface) + (perB * b.Surface),
            (perA * a.Room) + (perB * b.Room),
            (perA * a.Supply) + (perB * b.Supply));
        T atRest = both & (T.Abs(a.Value | b.Value) <= T.Of(0));
        if (T.Any(atRest))
        {
            blended = Flux.Select(
                atRest,
                new Flux(
                    T.Of(0),
                    Combine(a.Surface, b.Surface, n, rule, isOpposing, out _, out _),
                    Combine(a.Room, b.Room, n, rule, isOpposing, out _, out _),
                    Combine(a.Supply, b.Supply, n, rule, isOpposing, out _, out _)),
                blended);
        }

        return Flux.Select(both, blended, alone);
    }

    /// <summary>Two numbers blended, and the slope to either. Zero and zero give zero.</summary>
    private static T Combine(T a, T b, PowerPair n, BlendShape rule, bool isOpposing, out T perA, out T perB)
    {
        T sizeA = T.Abs(a), sizeB = T.Abs(b);
        T swapped = sizeA < sizeB;
        T larger = T.Select(swapped, b, a), size = T.Max(sizeA, sizeB), smaller = T.Min(sizeA, sizeB);
        T ratio = smaller / T.Select(size > T.Of(0), size, T.Of(1));
        T opposite = (a * b) < T.Of(0);

        T share = T.Of(1), perLarger = T.Of(1), perSmaller = T.Of(0);
        if (T.Any(~opposite))
        {
            if (isOpposing)
            {
                Rest(ratio, rule, out share, out perSmaller);
                perLarger = share - (ratio * perSmaller);
            }
            else
            {
                RootOfSum(ratio, n, out share, out perLarger, out perSmaller);
            }
        }

        if (T.Any(opposite))
        {
            Mean(ratio, rule.Opposing, out T mean, out T meanPerLarger, out T meanPerSmaller);
            share = T.Select(opposite, mean, share);
            perLarger = T.Select(opposite, meanPerLarger, perLarger);
            perSmaller = T.Select(opposite, meanPerSmaller, perSmaller);
        }

        perA = T.Select(swapped, perSmaller, perLarger);
        perB = T.Select(swapped, perLarger, perSmaller);
        return larger * share;
    }

    /// <summary>(1 + rⁿ)^(1/n).</summary>
    private static void RootOfSum(T ratio, PowerPair n, out T share, out T perLarger, out T perSmaller)
    {
        T sum = T.Of(1) + Power(ratio, n.Whole);
        if (n.Root.Kind == ExponentKind.Third)
        {
            T y = InverseCubeRoot(sum);
            perLarger = y * y;
            share = sum * perLarger;
        }
        else
        {
            share = Power(sum, n.Root);
            perLarger = share / sum;
        }

        perSmaller = Power(ratio, n.LessOne) * perLarger;
    }

    /// <summary>What the smaller part leaves of the larger one: the published rule, its two kinks joined where that is asked for.</summary>
    private static void Rest(T ratio, BlendShape rule, out T share, out T slope)
    {
        T floor = T.Of(rule.Floor);
        PowerPair n = rule.Opposing;
        share = floor;
        slope = T.Of(0);
        T above = ratio < T.Of(rule.JoinsKinks ? rule.Corner - rule.Half : rule.Corner);
        if (T.Any(above))
        {
            T rest = T.Of(1) - Power(ratio, n.Whole), left, back;
            if (n.Root.Kind == ExponentKind.Third)
            {
                T y = InverseCubeRoot(rest);
                back = y * y;
                left = rest * back;
            }
            else
            {
                left = Power(rest, n.Root);
                back = left / rest;
            }

            share = T.Select(above, left, share);
            slope = T.Select(above, -(Power(ratio, n.LessOne) * back), slope);
        }

        if (rule.JoinsKinks)
        {
            Join(ratio, rule, above, ref share, ref slope);
        }
    }

    /// <summary>Where the floor sets in a cubic, at equal parts a parabola.</summary>
    private static void Join(T ratio, BlendShape rule, T above, ref T share, ref T slope)
    {
        T inBand = ~above & (ratio < T.Of(rule.Corner + rule.Half));
        if (T.Any(inBand))
        {
            double width = 2 * rule.Half;
            T u = (ratio - T.Of(rule.Corner - rule.Half)) * T.Of(1 / width), v = T.Of(1) - u;
            T low = (T.Of(1) + u + u) * v * v;
            T cubic = (low * T.Of(rule.Start - rule.Floor)) + T.Of(rule.Floor) + (u * v * v * T.Of(width * rule.StartSlope));
            T cubicSlope = (T.Of(-6) * u * v * T.Of((rule.Start - rule.Floor) / width)) + (v * (T.Of(1) - (T.Of(3) * u)) * T.Of(rule.StartSlope));
            share = T.Select(inBand, cubic, share);
            slope = T.Select(inBand, cubicSlope, slope);
        }

        // Near equality the larger part gives way to a smooth maximum: mean + d²/(4w) + w/4 of the difference d, w = equal·mean.
        T mean = T.Of(0.5) * (T.Of(1) + ratio), difference = T.Of(1) - ratio, band = T.Of(rule.Equal) * mean;
        T nearEqual = difference < band;
        if (T.Any(nearEqual))
        {
            T half = difference / (band + band);
            T maximum = mean + (T.Of(0.5) * difference * half) + (T.Of(0.25) * band);
            T maximumSlope = T.Of(0.5) - half - (T.Of(0.5 * rule.Equal) * half * half) + T.Of(rule.Equal / 8);
            share = T.Select(nearEqual, T.Of(rule.Floor) * maximum, share);
            slope = T.Select(nearEqual, T.Of(rule.Floor) * maximumSlope, slope);
        }
    }

    /// <summary>The mean of two fluxes of opposite direction, weighted by their own size.</summary>
    private static void Mean(T ratio, PowerPair n, out T share, out T perLarger, out T perSmaller)
    {
        T power = Power(ratio, n.LessOne), perWeight = T.Of(1) / (T.Of(1) + power);
        share = (T.Of(1) - (power * ratio)) * perWeight;
        perLarger = (T.Of(n.N) - (share * T.Of(n.N - 1))) * perWeight;
        perSmaller = ((T.Of(n.N) * power) + (share * T.Of(n.N - 1) * Power(ratio, n.LessTwo))) * perWeight;
    }
}
