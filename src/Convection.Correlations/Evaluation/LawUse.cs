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

    /// <summary>Highest value of the driving variable that the laws cover.</summary>
    public double Highest => highest;

    public LawLadder Ladder => ladder;

    /// <summary>What has to be said about the laws at x.</summary>
    /// <returns>False where the policy refuses.</returns>
    public bool Remark(double x, ref Remarks remarks)
    {
        double at = x;
        if (x < lowest && fadesBelow)
        {
            at = lowest;
            remarks.Flags |= ConvectionFlags.FlowFaded;
        }
        else if (rule == OutOfRangeRule.HoldAtLimit && (x < lowest || x > highest))
        {
            at = x < lowest ? lowest : highest;
            remarks.Flags |= ConvectionFlags.HeldAtLimit;
        }

        int lower = ladder.Find(at, out double weightOfNext);
        remarks.Used |= 1UL << (firstBit + lower);
        remarks.Flags |= always[lower];
        if (weightOfNext > 0)
        {
            remarks.Used |= 1UL << (firstBit + lower + 1);
            remarks.Flags |= always[lower + 1];
        }

        RangeStanding where = ladder[weightOfNext > 0.5 ? lower + 1 : lower].Range.StandingAt(x);
        remarks.Flags |= Flag(where);
        return rule != OutOfRangeRule.Refuse || x <= 0 || where is not (RangeStanding.Below or RangeStanding.Above or RangeStanding.SurfaceOutside);
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
