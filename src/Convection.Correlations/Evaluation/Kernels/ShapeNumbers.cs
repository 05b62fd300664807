using System;
using System.Collections.Generic;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>Takes a surface's plan apart while its shape is made: its own numbers, and the key of all that is not a number of its own.</summary>
internal sealed class ShapeNumbers
{
    private readonly List<double> numbers = [];
    private readonly List<object> key = [];

    /// <summary>Index of the number that comes next.</summary>
    public int Next => numbers.Count;

    public void Add(double number) => numbers.Add(number);

    public void Key(object part) => key.Add(part);

    public double[] ToNumbers() => [.. numbers];

    public ShapeKey ToKey() => new([.. key]);
}
