using System;
using System.Collections.Generic;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Registry;

/// <summary>Over what a correlation was tested; without limits, what its range is is not known.</summary>
public sealed class ValidityRange
{
    private readonly RangeLimit[] limits;

    /// <summary>A range of several variables.</summary>
    /// <param name="limits">One limit for each variable that the source bounds; none where its range is not known.</param>
    /// <exception cref="ArgumentNullException">A limit is null.</exception>
    public ValidityRange(params RangeLimit[] limits)
        => this.limits = Array.ConvertAll(Require.NotNull(limits, nameof(limits)), l => Require.NotNull(l, nameof(limits)));

    /// <summary>The range is not known: no bound is invented.</summary>
    public static ValidityRange NotKnown { get; } = new();

    /// <summary>The limits.</summary>
    public IReadOnlyList<RangeLimit> Limits => limits;

    /// <summary>False where the range is not known.</summary>
    public bool IsKnown => limits.Length > 0;

    /// <summary>The limits in words.</summary>
    /// <returns>The text, the same in every culture.</returns>
    public override string ToString() => IsKnown ? string.Join("; ", Array.ConvertAll(limits, l => l.ToString())) : "range not known";

    internal BoundRange Bind(LawBinding binding, BoundLaw law)
    {
        var range = new BoundRange(IsKnown, Array.Exists(limits, l => l.Origin == RangeOrigin.Assumed));
        foreach (RangeLimit limit in limits)
        {
            double? perDriving = NumberPerDrivingUnit(limit, binding, law.DrivenBy);
            if (limit.Variable == RangeVariable.ModifiedRayleigh && DrivenByDifference(law.DrivenBy))
            {
                double perFlux = binding.RayleighPerKelvin(limit.Length) * binding.Metres(limit.Length) / binding.Air.ConductivityWattsPerMetreKelvin;
                range.Narrow(limit, end => end is > 0 and < double.PositiveInfinity ? FluxInverse.DifferenceAt(end / perFlux, law) : end);
            }
            else if (perDriving is { } number)
            {
                range.Narrow(limit, end => end / number);
            }
            else if (FixedValue(limit.Variable, binding) is { } value)
            {
                range.Check(limit, value);
            }
            else
            {
                range.LeaveUnchecked(limit);
            }
        }

        return range;
    }

    private static bool DrivenByDifference(DrivingVariable drivenBy) => drivenBy is DrivingVariable.TemperatureDifference or DrivingVariable.None;

    private static double? NumberPerDrivingUnit(RangeLimit limit, LawBinding binding, DrivingVariable drivenBy) => (limit.Variable, drivenBy) switch
    {
        (RangeVariable.TemperatureDifference, _) when DrivenByDifference(drivenBy) => 1,
        (RangeVariable.Rayleigh, _) when DrivenByDifference(drivenBy) => binding.RayleighPerKelvin(limit.Length),
        (RangeVariable.TiltedRayleigh, _) when DrivenByDifference(drivenBy)
            => binding.RayleighPerKelvin(limit.Length) * Math.Max(Math.Sin(binding.FlowTiltDegrees * Math.PI / 180), 1e-9),
        (RangeVariable.Grashof, _) when DrivenByDifference(drivenBy) => binding.GrashofPerKelvin(limit.Length),
        (RangeVariable.Reynolds, DrivingVariable.Speed) => binding.ReynoldsPerSpeed(limit.Length),
        (RangeVariable.AirChangeRate, DrivingVariable.AirChangeRate) => 1,
        (RangeVariable.JetMomentum, DrivingVariable.JetMomentum) => 1,
        (RangeVariable.FlowPerLength, DrivingVariable.FlowPerLength) => 1,
        _ => null,
    };

    private static double? FixedValue(RangeVariable variable, LawBinding binding) => variable switch
    {
        RangeVariable.Prandtl => binding.Air.Prandtl,
        RangeVariable.Tilt => binding.Surface.TiltDegrees,
        RangeVariable.FlowTilt => binding.FlowTiltDegrees,
        RangeVariable.Height => binding.Surface.HeightMetres,
        _ => null,
    };
}
