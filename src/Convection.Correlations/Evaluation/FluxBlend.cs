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
    public static Flux Assisting(Flux a, Flux b, double n, double counter)
    {
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

    public static Flux Opposing(Flux a, Flux b, double n, double floor)
    {
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
            return AtRest(Opposing(a.Surface, b.Surface, n, floor), Opposing(a.Room, b.Room, n, floor), Opposing(a.Supply, b.Supply, n, floor));
        }

        double ratio = b.Value / a.Value;
        double rest = Math.Pow(1 - Power(ratio, n), 1 / n);
        return rest <= floor
            ? a.Times(floor)
            : Flux.Chain(a.Value * rest, Math.Pow(rest, 1 - n), a, -Power(ratio, n - 1) * Math.Pow(rest, 1 - n), b);
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

    private static double Opposing(double a, double b, double n, double floor) => AreZero(a, b) ? 0 : Opposing(Of(a), Of(b), n, floor).Value;

    private static double Counter(double a, double b, double n) => AreZero(a, b) ? 0 : Counter(Of(a), Of(b), n).Value;

    private static bool AreZero(double a, double b) => a == 0 && b == 0;

    private static Flux Of(double value) => new(value, 0, 0, 0);

    private static double Power(double x, double n) => n == 3 ? x * x * x : n == 2 ? x * x : n == 1 ? x : Math.Pow(x, n);
}
