using System;

namespace Convection.Correlations.Evaluation;

/// <summary>Two fluxes on one surface made into one.</summary>
/// <remarks>
/// <para>Same direction of heat: sums of powers for assisting and transverse flow, their difference with a floor for opposing flow.</para>
/// <para>
/// Opposite directions: q = (a·|a|^(n−1) + b·|b|^(n−1)) / (|a|^(n−1) + |b|^(n−1)), the mean of the two weighted by their own size. No
/// published rule is known. This one is continuous in all temperatures, gives zero where the two balance and the larger one
/// alone where the other vanishes, and its slope to either flux lies between 0 and n/2.
/// </para>
/// </remarks>
internal static class FluxBlend
{
    private const double FloorHalfWidth = 0.04, EqualHalfWidth = 0.05;

    public static Flux Assisting(Flux a, Flux b, double n, double counter)
    {
        if (a.IsNothing || b.IsNothing)
        {
            return b.IsNothing ? a : b;
        }

        if (Opposite(a, b))
        {
            return Counter(a, b, counter);
        }

        double larger = Math.Max(Math.Abs(a.Value), Math.Abs(b.Value));
        if (larger == 0)
        {
            return AtRest(Assisting(a.Surface, b.Surface, n, counter), Assisting(a.Room, b.Room, n, counter), Assisting(a.Supply, b.Supply, n, counter));
        }

        double p = Math.Abs(a.Value) / larger, r = Math.Abs(b.Value) / larger;
        double sum = Power(p, n) + Power(r, n);
        double root = Math.Pow(sum, 1 / n), back = root / sum;
        return Flux.Chain(
            Math.Sign(a.Value + b.Value) * larger * root,
            Power(p, n - 1) * back,
            a,
            Power(r, n - 1) * back,
            b);
    }

    public static Flux Opposing(Flux a, Flux b, double n, double floor, bool isJoined)
    {
        if (a.IsNothing || b.IsNothing)
        {
            return b.IsNothing ? a : b;
        }

        if (Opposite(a, b))
        {
            return Counter(a, b, n);
        }

        if (Math.Abs(a.Value) < Math.Abs(b.Value))
        {
            (a, b) = (b, a);
        }

        if (a.Value == 0)
        {
            return AtRest(
                Opposing(a.Surface, b.Surface, n, floor, isJoined), Opposing(a.Room, b.Room, n, floor, isJoined), Opposing(a.Supply, b.Supply, n, floor, isJoined));
        }

        double ratio = b.Value / a.Value;
        (double share, double slope) = isJoined ? JoinedShare(ratio, n, floor) : PublishedShare(ratio, n, floor);
        return Flux.Chain(a.Value * share, share - (ratio * slope), a, slope, b);
    }

    public static Flux Counter(Flux a, Flux b, double n)
    {
        double larger = Math.Max(Math.Abs(a.Value), Math.Abs(b.Value));
        if (larger == 0)
        {
            return AtRest(Counter(a.Surface, b.Surface, n), Counter(a.Room, b.Room, n), Counter(a.Supply, b.Supply, n));
        }

        double p = Math.Abs(a.Value) / larger, r = Math.Abs(b.Value) / larger;
        double signA = Math.Sign(a.Value), signB = Math.Sign(b.Value);
        double weight = Power(p, n - 1) + Power(r, n - 1);
        double value = ((signA * Power(p, n)) + (signB * Power(r, n))) / weight;
        return Flux.Chain(larger * value, Slope(p, signA), a, Slope(r, signB), b);

        double Slope(double size, double sign)
            => ((n * Power(size, n - 1)) - (sign * value * (n - 1) * Power(size, n - 2))) / weight;
    }

    private static bool Opposite(Flux a, Flux b) => (a.Value > 0 && b.Value < 0) || (a.Value < 0 && b.Value > 0);

    /// <summary>Both fluxes are zero. Every rule scales with its arguments, so there it is the blend of the slopes.</summary>
    private static Flux AtRest(double surface, double room, double supply) => new(0, surface, room, supply);

    private static double Assisting(double a, double b, double n, double counter) => AreZero(a, b) ? 0 : Assisting(Of(a), Of(b), n, counter).Value;

    private static double Opposing(double a, double b, double n, double floor, bool isJoined)
        => AreZero(a, b) ? 0 : Opposing(Of(a), Of(b), n, floor, isJoined).Value;

    /// <summary>What is left of the larger part, and its slope over the ratio of the smaller to the larger: the rule as published.</summary>
    private static (double Share, double Slope) PublishedShare(double ratio, double n, double floor)
    {
        double rest = Math.Pow(1 - Power(ratio, n), 1 / n);
        return rest <= floor ? (floor, 0) : (rest, -Power(ratio, n - 1) * Math.Pow(rest, 1 - n));
    }

    /// <summary>The same with its two kinks joined: where the floor sets in by a cubic, and at equal parts by a parabola.</summary>
    private static (double Share, double Slope) JoinedShare(double ratio, double n, double floor)
    {
        double corner = Math.Pow(1 - Power(floor, n), 1 / n);
        double half = Math.Min(FloorHalfWidth, 0.5 * Math.Min(1 - corner, corner));
        double equal = Math.Min(EqualHalfWidth, 1 - corner - half);

        // Near equality the larger part gives way to a smooth maximum: mean + d²/(4w) + w/4 of the difference d, w = equal·mean.
        double mean = 0.5 * (1 + ratio), difference = 1 - ratio, width = equal * mean;
        if (difference < width)
        {
            double share = mean + (difference * difference / (4 * width)) + (width / 4);
            double slope = 0.5 - (difference / (2 * width)) - (difference * difference * equal / (8 * width * width)) + (equal / 8);
            return (floor * share, floor * slope);
        }

        if (ratio <= corner - half || ratio >= corner + half)
        {
            return PublishedShare(ratio, n, floor);
        }

        (double start, double startSlope) = PublishedShare(corner - half, n, floor);
        double u = (ratio - corner + half) / (2 * half);
        double low = (1 + (2 * u)) * (1 - u) * (1 - u), tangent = u * (1 - u) * (1 - u) * 2 * half;
        return (
            (low * start) + ((1 - low) * floor) + (tangent * startSlope),
            (6 * u * (u - 1) * (start - floor) / (2 * half)) + ((1 - u) * (1 - (3 * u)) * startSlope));
    }

    private static double Counter(double a, double b, double n) => AreZero(a, b) ? 0 : Counter(Of(a), Of(b), n).Value;

    private static bool AreZero(double a, double b) => a == 0 && b == 0;

    private static Flux Of(double value) => new(value, 0, 0, 0);

    private static double Power(double x, double n) => n == 3 ? x * x * x : n == 2 ? x * x : n == 1 ? x : Math.Pow(x, n);
}
