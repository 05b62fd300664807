using System;
using System.Collections.Generic;

namespace Convection.Correlations.Registry;

/// <summary>A validity range turned into intervals of the driving variable, for one surface and its air.</summary>
internal sealed class BoundRange
{
    private readonly List<string> violations = [];
    private readonly List<string> unchecked_ = [];

    public BoundRange(bool isKnown, bool isAssumed)
    {
        IsKnown = isKnown;
        IsAssumed = isAssumed;
    }

    public bool IsKnown { get; }

    public bool IsAssumed { get; }

    public double TestedLow { get; private set; } = double.NegativeInfinity;

    public double TestedHigh { get; private set; } = double.PositiveInfinity;

    public double AdvisedLow { get; private set; } = double.NegativeInfinity;

    public double AdvisedHigh { get; private set; } = double.PositiveInfinity;

    public double ExtendedLow { get; private set; } = double.NegativeInfinity;

    public double ExtendedHigh { get; private set; } = double.PositiveInfinity;

    /// <summary>Lower end of where the law may serve: the extended limit where there is one, else the advised one.</summary>
    public double UsableLow => ExtendedLow < TestedLow ? ExtendedLow : AdvisedLow;

    /// <summary>Upper end of where the law may serve.</summary>
    public double UsableHigh => ExtendedHigh > TestedHigh ? ExtendedHigh : AdvisedHigh;

    /// <summary>Limits on tilt, height and the like that this surface breaks, in words.</summary>
    public IReadOnlyList<string> Violations => violations;

    /// <summary>Limits on variables that the state does not hold, in words.</summary>
    public IReadOnlyList<string> Unchecked => unchecked_;

    public RangeStanding StandingAt(double x)
    {
        if (violations.Count > 0)
        {
            return RangeStanding.SurfaceOutside;
        }

        if (!IsKnown)
        {
            return RangeStanding.NotKnown;
        }

        if (x < TestedLow)
        {
            return x >= ExtendedLow ? RangeStanding.Extended : RangeStanding.Below;
        }

        if (x > TestedHigh)
        {
            return x <= ExtendedHigh ? RangeStanding.Extended : RangeStanding.Above;
        }

        return x < AdvisedLow || x > AdvisedHigh ? RangeStanding.OutsideAdvised : RangeStanding.Within;
    }

    public void Narrow(RangeLimit limit, Func<double, double> toDriving)
    {
        (TestedLow, TestedHigh) = Cut(limit.Tested, toDriving, TestedLow, TestedHigh);
        (AdvisedLow, AdvisedHigh) = Cut(limit.Advised ?? limit.Tested, toDriving, AdvisedLow, AdvisedHigh);
        (ExtendedLow, ExtendedHigh) = Cut(limit.Extended ?? limit.Tested, toDriving, ExtendedLow, ExtendedHigh);
    }

    public void Check(RangeLimit limit, double value)
    {
        if (!(limit.Extended ?? limit.Tested).Contains(value))
        {
            violations.Add(RangeText.Symbol(limit.Variable) + " " + InvariantText.Number(value, RangeText.Unit(limit.Variable))
                + " is outside the tested " + InvariantText.Span(limit.Tested.Lowest, limit.Tested.Highest, RangeText.Unit(limit.Variable)));
        }
    }

    public void LeaveUnchecked(RangeLimit limit) => unchecked_.Add(limit.ToString());

    private static (double Low, double High) Cut(Interval interval, Func<double, double> toDriving, double low, double high)
        => (Math.Max(low, toDriving(interval.Lowest)), Math.Min(high, toDriving(interval.Highest)));
}
