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
    private readonly double a1, n1, a2, n2, m;

    public NormalForm(double a1, double n1)
        : this(a1, n1, 0, 0, 1)
    {
    }

    public NormalForm(double a1, double n1, double a2, double n2, double m)
    {
        this.a1 = a1;
        this.n1 = n1;
        this.a2 = a2;
        this.n2 = n2;
        this.m = m;
    }

    public NormalForm Times(double factor) => new(a1 * factor, n1, a2 * factor, n2, m);

    public LawValue Evaluate(double x)
    {
        double first = a1 * Math.Pow(x, n1);
        if (a2 == 0)
        {
            return new LawValue(first, n1 * first);
        }

        double second = a2 * Math.Pow(x, n2);
        if (m == 1)
        {
            return new LawValue(first + second, (n1 * first) + (n2 * second));
        }

        double larger = Math.Max(first, second);
        if (larger == 0)
        {
            return new LawValue(0, 0);
        }

        // Scaled by the larger term, so that a high power neither overflows nor vanishes.
        double p1 = Math.Pow(first / larger, m), p2 = Math.Pow(second / larger, m);
        double h = larger * Math.Pow(p1 + p2, 1 / m);
        return new LawValue(h, h * ((n1 * p1) + (n2 * p2)) / (p1 + p2));
    }
}
