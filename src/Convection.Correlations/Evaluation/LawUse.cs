using System;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;
using Convection.Correlations.Selection;

namespace Convection.Correlations.Evaluation;

/// <summary>Laws of one part on one side, ready to run, with what every use of them must say.</summary>
internal sealed class LawUse
{
    private readonly LawLadder ladder;
    private readonly OutOfRangeRule rule;
    private readonly bool fadesBelow;
    private readonly ConvectionFlags[] always;
    private readonly int firstBit;
    private readonly double lowest, highest;

    public LawUse(LawLadder ladder, OutOfRangeRule rule, bool fadesBelow, bool isScaled, int firstBit)
    {
        this.ladder = ladder;
        this.rule = rule;
        this.fadesBelow = fadesBelow;
        this.firstBit = firstBit;
        always = new ConvectionFlags[ladder.Count];
        for (int i = 0; i < always.Length; i++)
        {
            always[i] = FlagsOf(ladder[i], isScaled, fadesBelow);
        }

        BoundRange low = ladder[0].Range, high = ladder[ladder.Count - 1].Range;
        lowest = fadesBelow ? Math.Max(0, low.ExtendedLow) : low.ExtendedLow;
        highest = high.ExtendedHigh;
        Reference = ladder[0].Correlation.Reference;
        ContainsBuoyancy = ladder[0].Correlation.ContainsBuoyancy;
        IsMixed = ladder[0].Correlation.Family == CorrelationFamily.Mixed;
    }

    public ReferenceTemperature Reference { get; }

    public bool ContainsBuoyancy { get; }

    public bool IsMixed { get; }

    /// <summary>Lowest value of the driving variable that the laws cover; a forced flux fades below it.</summary>
    public double Lowest => lowest;

    public int Count => ladder.Count;

    public LawLadder Ladder => ladder;

    /// <summary>Coefficient and sensitivity at x, and what has to be said about them.</summary>
    /// <returns>False where the policy refuses.</returns>
    public bool TryEvaluate(double x, out LawValue law, out ConvectionFlags flags, out ulong used)
    {
        flags = ConvectionFlags.None;
        double at = x;
        if (x < lowest && fadesBelow)
        {
            at = lowest;
            flags |= ConvectionFlags.FlowFaded;
        }
        else if (rule == OutOfRangeRule.HoldAtLimit && (x < lowest || x > highest))
        {
            at = x < lowest ? lowest : highest;
            flags |= ConvectionFlags.HeldAtLimit;
        }

        law = ladder.Evaluate(at, out int lower, out double weightOfNext);
        used = 1UL << (firstBit + lower);
        flags |= always[lower];
        if (weightOfNext > 0)
        {
            used |= 1UL << (firstBit + lower + 1);
            flags |= always[lower + 1];
        }

        RangeStanding where = ladder[weightOfNext > 0.5 ? lower + 1 : lower].Range.StandingAt(x);
        flags |= Flag(where);
        if (rule == OutOfRangeRule.Refuse && x > 0 && (where is RangeStanding.Below or RangeStanding.Above or RangeStanding.SurfaceOutside))
        {
            return false;
        }

        law = at == x ? law : (flags & ConvectionFlags.FlowFaded) != 0 ? Fade(law, x / lowest) : new LawValue(law.Coefficient, 0);
        return true;
    }

    /// <summary>From h = 0 with no slope at no flow to the law's own value and slope at its lowest flow.</summary>
    private static LawValue Fade(LawValue atLowest, double u)
    {
        // A steeper slope than 3h would let the cubic dip below zero.
        double h = atLowest.Coefficient, slope = Math.Min(atLowest.Sensitivity, 3 * h);
        return new LawValue(
            (h * u * u * (3 - (2 * u))) + (slope * u * u * (u - 1)),
            (h * 6 * u * u * (1 - u)) + (slope * u * u * ((3 * u) - 2)));
    }

    private static ConvectionFlags Flag(RangeStanding where) => where switch
    {
        RangeStanding.Below => ConvectionFlags.BelowTestedRange,
        RangeStanding.Above => ConvectionFlags.AboveTestedRange,
        RangeStanding.OutsideAdvised => ConvectionFlags.OutsideAdvisedRange,
        RangeStanding.Extended => ConvectionFlags.InExtendedRange,
        RangeStanding.SurfaceOutside => ConvectionFlags.SurfaceOutsideRange,
        _ => ConvectionFlags.None,
    };

    private static ConvectionFlags FlagsOf(SelectedLaw law, bool isScaled, bool isForced)
    {
        Correlation c = law.Correlation;
        ConvectionFlags flags = ConvectionFlags.None;
        flags |= c.IsUnconfirmed ? ConvectionFlags.UnconfirmedText : ConvectionFlags.None;
        flags |= law.IsNearMatch ? ConvectionFlags.NearMatch : ConvectionFlags.None;
        flags |= law.IsPinned ? ConvectionFlags.Pinned : ConvectionFlags.None;
        flags |= c.Family == CorrelationFamily.FixedValue ? ConvectionFlags.FixedValue : ConvectionFlags.None;
        flags |= !isForced && c.Reference != ReferenceTemperature.RoomAir ? ConvectionFlags.ReferenceSubstituted : ConvectionFlags.None;
        flags |= law.Range.IsAssumed ? ConvectionFlags.RangeAssumed : ConvectionFlags.None;
        flags |= law.Range.IsKnown ? ConvectionFlags.None : ConvectionFlags.RangeNotKnown;
        flags |= isScaled && !c.Law.IsDimensionless && c.Law.DrivenBy != DrivingVariable.None ? ConvectionFlags.ScaledToAir : ConvectionFlags.None;
        return flags;
    }
}
