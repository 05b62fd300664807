using System;
using System.Collections.Generic;

namespace Convection.Correlations.Laws;

/// <summary>A law bound to one surface and its air: a few numbers, ready to evaluate.</summary>
/// <remarks>
/// Immutable, allocation-free to evaluate, safe on any number of threads. Where a piecewise law jumps, the pieces pass into
/// one another over 2 % of the driving variable to either side of the joint, less where joints are close; outside that band the law is as published.
/// </remarks>
public sealed class BoundLaw
{
    internal const double JointHalfWidth = 0.02;

    private readonly NormalForm[] pieces;
    private readonly (double Low, double High)[] bands;

    internal BoundLaw(DrivingVariable drivenBy, NormalForm piece)
        : this(drivenBy, [piece], [])
    {
    }

    internal BoundLaw(DrivingVariable drivenBy, NormalForm[] pieces, double[] joints)
    {
        DrivenBy = drivenBy;
        this.pieces = pieces;
        Joints = joints;
        bands = new (double Low, double High)[joints.Length];
        for (int i = 0; i < joints.Length; i++)
        {
            bands[i] = (
                Math.Max(joints[i] * (1 - JointHalfWidth), i == 0 ? 0 : Math.Sqrt(joints[i - 1] * joints[i])),
                Math.Min(joints[i] * (1 + JointHalfWidth), i + 1 == joints.Length ? double.PositiveInfinity : Math.Sqrt(joints[i] * joints[i + 1])));
        }
    }

    internal BoundLaw(DrivingVariable drivenBy, Func<double, LawValue> code)
        : this(drivenBy, [], [])
        => Code = code;

    /// <summary>What the coefficient depends on.</summary>
    public DrivingVariable DrivenBy { get; }

    /// <summary>Coefficient and sensitivity.</summary>
    /// <param name="x">Value of the driving variable, in its own unit; 0 or more.</param>
    /// <returns>h and x·dh/dx [W/(m²·K)]; NaN for a value that is negative or not finite.</returns>
    public LawValue Evaluate(double x)
    {
        if (!(x >= 0) || double.IsPositiveInfinity(x))
        {
            return LawValue.NotANumber;
        }

        if (Code is not null)
        {
            return Code(x);
        }

        for (int i = 0; i < bands.Length; i++)
        {
            (double low, double high) = bands[i];
            if (x < low)
            {
                return pieces[i].Evaluate(x);
            }

            if (x < high)
            {
                return Crossfade.Between(pieces[i].Evaluate(x), pieces[i + 1].Evaluate(x), x, low, high);
            }
        }

        return pieces[pieces.Length - 1].Evaluate(x);
    }

    internal IReadOnlyList<NormalForm> Pieces => pieces;

    /// <summary>Where the pieces meet, as published.</summary>
    internal double[] Joints { get; }

    /// <summary>Where each piece passes into the next.</summary>
    internal IReadOnlyList<(double Low, double High)> Bands => bands;

    /// <summary>The law as code; null for one of pieces.</summary>
    internal Func<double, LawValue>? Code { get; }

    internal NormalForm SinglePiece => pieces.Length == 1
        ? pieces[0]
        : throw new InvalidOperationException("A piece of a piecewise law must be a law of one piece.");
}
