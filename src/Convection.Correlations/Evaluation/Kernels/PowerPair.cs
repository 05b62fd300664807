namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>The exponents that a blend with exponent n needs.</summary>
internal sealed class PowerPair(double n)
{
    public double N { get; } = n;

    public Exponent Whole { get; } = new(n);

    public Exponent LessOne { get; } = new(n - 1);

    public Exponent LessTwo { get; } = new(n - 2);

    /// <summary>1/n.</summary>
    public Exponent Root { get; } = new(1 / n);
}
