using System;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>An exponent, and whether roots and products can serve it.</summary>
internal readonly struct Exponent
{
    private static readonly (double Value, ExponentKind Kind)[] Known =
    [
        (0, ExponentKind.Zero), (1, ExponentKind.One), (2, ExponentKind.Two), (3, ExponentKind.Three),
        (1.0 / 2, ExponentKind.Half), (3.0 / 2, ExponentKind.ThreeHalves), (1.0 / 4, ExponentKind.Quarter),
        (1.0 / 3, ExponentKind.Third), (2.0 / 3, ExponentKind.TwoThirds), (1.0 / 6, ExponentKind.Sixth),
        (1.0 / 5, ExponentKind.Fifth), (4.0 / 5, ExponentKind.FourFifths),
    ];

    public Exponent(double value)
    {
        // Exponents are products such as 6·(1/4): take them for the fraction they stand for.
        int known = Array.FindIndex(Known, k => Math.Abs(k.Value - value) < 1e-14);
        Kind = known < 0 ? ExponentKind.Other : Known[known].Kind;
        Value = known < 0 ? value : Known[known].Value;
    }

    public double Value { get; }

    public ExponentKind Kind { get; }
}
