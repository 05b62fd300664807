using System;
using System.Collections.Generic;

namespace Convection.Correlations.Laws;

/// <summary>Several laws, each over its own interval of a switch variable.</summary>
public sealed class PiecewiseLaw : Law
{
    private readonly Law[] pieces;
    private readonly Func<LawBinding, double>[] limits;
    private readonly SwitchVariable variable;
    private readonly CharacteristicLength length;

    /// <summary>Joins laws end to end.</summary>
    /// <param name="variable">What decides between them.</param>
    /// <param name="length">Length of that number; none where the driving variable itself decides.</param>
    /// <param name="pieces">At least two laws of one piece each, from the lowest interval to the highest.</param>
    /// <param name="limits">Upper limit of each piece but the last, rising; each may depend on tilt or Prandtl number.</param>
    /// <exception cref="ArgumentNullException">A list or member is null.</exception>
    /// <exception cref="ArgumentException">The counts do not match, or the pieces depend on unlike variables.</exception>
    public PiecewiseLaw(SwitchVariable variable, CharacteristicLength length, IReadOnlyList<Law> pieces, IReadOnlyList<Func<LawBinding, double>> limits)
    {
        this.variable = Require.Defined(variable, SwitchVariable.Unspecified, "Switch variable", nameof(variable));
        this.length = length;
        this.pieces = [.. Require.NotNull(pieces, nameof(pieces))];
        this.limits = [.. Require.NotNull(limits, nameof(limits))];
        if (this.pieces.Length < 2 || this.limits.Length != this.pieces.Length - 1)
        {
            throw new ArgumentException("A piecewise law needs at least two pieces and one limit fewer.", nameof(pieces));
        }

        DrivenBy = Require.NotNull(this.pieces[0], nameof(pieces)).DrivenBy;
        if (Array.Exists(this.pieces, p => Require.NotNull(p, nameof(pieces)).DrivenBy != DrivenBy))
        {
            throw new ArgumentException("All pieces of a law must depend on the same variable.", nameof(pieces));
        }
    }

    /// <inheritdoc/>
    public override DrivingVariable DrivenBy { get; }

    /// <inheritdoc/>
    public override string Formula => string.Join("; then ", Array.ConvertAll(pieces, p => p.Formula));

    /// <summary>Where the pieces meet, and by how much they miss each other.</summary>
    /// <param name="binding">Lengths, tilt and air.</param>
    /// <returns>One joint for each limit.</returns>
    /// <exception cref="ArgumentNullException">The binding is null.</exception>
    public IReadOnlyList<LawJoint> JointsIn(LawBinding binding)
    {
        Require.NotNull(binding, nameof(binding));
        var joints = new LawJoint[limits.Length];
        for (int i = 0; i < joints.Length; i++)
        {
            double at = Joint(i, binding);
            joints[i] = new LawJoint(at, pieces[i].Bind(binding).Evaluate(at).Coefficient, pieces[i + 1].Bind(binding).Evaluate(at).Coefficient);
        }

        return joints;
    }

    internal override BoundLaw BindTo(LawBinding binding)
    {
        var joints = new double[limits.Length];
        for (int i = 0; i < joints.Length; i++)
        {
            joints[i] = Joint(i, binding);
            if (!(joints[i] > (i == 0 ? 0 : joints[i - 1])))
            {
                throw new InvalidOperationException("The limits of a piecewise law must be positive and rise; limit " + (i + 1) + " does not.");
            }
        }

        return new BoundLaw(DrivenBy, Array.ConvertAll(pieces, p => p.Bind(binding).SinglePiece), joints);
    }

    private double Joint(int i, LawBinding binding)
    {
        double limit = limits[i](binding);
        switch (variable)
        {
            case SwitchVariable.Rayleigh:
                return limit / binding.RayleighPerKelvin(length);
            case SwitchVariable.Reynolds:
                return limit / binding.ReynoldsPerSpeed(length);
            case SwitchVariable.ModifiedRayleigh:
                double perFlux = binding.RayleighPerKelvin(length) * binding.Metres(length) / binding.Air.ConductivityWattsPerMetreKelvin;
                return FluxInverse.DifferenceAt(limit / perFlux, pieces[i].Bind(binding));
            default:
                return limit;
        }
    }
}
