using System;

namespace Convection.Correlations.Laws;

/// <summary>
/// The numbers that a bound law comes down to: h = ((a1·x^n1)^m + (a2·x^n2)^m)^(1/m), x ≥ 0 being the driving variable.
/// </summary>
/// <remarks>
/// One term: a2 = 0. A sum: m = 1, and only then may an amplitude be negative. The default value is h = 0 and never leaves
/// this folder.
/// </remarks>
internal readonly struct NormalForm
{
    public NormalForm(double a1, double n1)
        : this(a1, n1, 0, 0, 1)
    {
    }

    public NormalForm(double a1, double n1, double a2, double n2, double m)
    {
        A1 = a1;
        N1 = n1;
        A2 = a2;
        N2 = n2;
        M = m;
    }

    public double A1 { get; }

    public double N1 { get; }

    public double A2 { get; }

    public double N2 { get; }

    public double M { get; }

    public NormalForm Times(double factor) => new(A1 * factor, N1, A2 * factor, N2, M);

    public LawValue Evaluate(double x)
    {
        double first = A1 * Math.Pow(x, N1);
        if (A2 == 0)
        {
            return new LawValue(first, N1 * first);
        }

        double second = A2 * Math.Pow(x, N2);
        if (M == 1)
        {
            return new LawValue(first + second, (N1 * first) + (N2 * second));
        }

        double larger = Math.Max(first, second);
        if (larger == 0)
        {
            return new LawValue(0, 0);
        }

        // Scaled by the larger term, so that a high power neither overflows nor vanishes.
        double p1 = Math.Pow(first / larger, M), p2 = Math.Pow(second / larger, M);
        double h = larger * Math.Pow(p1 + p2, 1 / M);
        return new LawValue(h, h * ((N1 * p1) + (N2 * p2)) / (p1 + p2));
    }
}
