using System;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>A blend rule with what its formulas need worked out once.</summary>
internal sealed class BlendShape
{
    private const double FloorHalfWidth = 0.04, EqualHalfWidth = 0.05;

    public BlendShape(BlendRule rule)
    {
        Assisting = new PowerPair(rule.AssistingExponent);
        Opposing = new PowerPair(rule.OpposingExponent);
        Transverse = new PowerPair(rule.TransverseExponent);
        Floor = rule.OpposingFloor;
        JoinsKinks = rule.JoinsKinks;

        double n = rule.OpposingExponent;
        Corner = Math.Pow(1 - Math.Pow(Floor, n), 1 / n);
        Half = Math.Min(FloorHalfWidth, 0.5 * Math.Min(1 - Corner, Corner));
        Equal = Math.Min(EqualHalfWidth, 1 - Corner - Half);
        double before = Corner - Half;
        Start = Math.Pow(1 - Math.Pow(before, n), 1 / n);
        StartSlope = -Math.Pow(before, n - 1) * Math.Pow(Start, 1 - n);
    }

    public PowerPair Assisting { get; }

    public PowerPair Opposing { get; }

    public PowerPair Transverse { get; }

    public double Floor { get; }

    public bool JoinsKinks { get; }

    /// <summary>Ratio of the smaller to the larger part where the floor sets in.</summary>
    public double Corner { get; }

    /// <summary>Half the width of the band that joins it.</summary>
    public double Half { get; }

    /// <summary>Width of the band where both parts are nearly equal.</summary>
    public double Equal { get; }

    /// <summary>Share of the larger part where the band begins.</summary>
    public double Start { get; }

    public double StartSlope { get; }
}
