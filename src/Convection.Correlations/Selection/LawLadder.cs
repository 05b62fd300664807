using System;
using System.Collections.Generic;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Selection;

/// <summary>Laws that follow each other as the driving variable rises, and the bands over which each passes into the next.</summary>
/// <remarks>
/// A better-ranked law keeps its whole interval; a lesser one serves outside. Where the two overlap, the passage lies in the
/// overlap next to the better law's limit and is at most a factor of 1.2 wide; across a gap it fills the gap; where they merely
/// touch it reaches 5 % to either side.
/// </remarks>
internal sealed class LawLadder
{
    private const double WidestOverlap = 1.2, TouchHalfWidth = 0.05;

    private readonly Rung[] rungs;

    private LawLadder(Rung[] rungs) => this.rungs = rungs;

    public IReadOnlyList<SelectedLaw> Laws => Array.ConvertAll(rungs, r => r.Law);

    public int Count => rungs.Length;

    public SelectedLaw this[int index] => rungs[index].Law;

    /// <summary>Lower end of the lowest law's interval.</summary>
    public double Lowest => rungs[0].Low;

    /// <summary>Upper end of the highest law's interval.</summary>
    public double Highest => rungs[rungs.Length - 1].High;

    public static LawLadder Of(SelectedLaw law) => new([new Rung(law, 0, law.Range.UsableLow, law.Range.UsableHigh)]);

    /// <summary>Takes laws in the order of their rank; a law that covers nothing new is left out.</summary>
    public static LawLadder Build(IReadOnlyList<SelectedLaw> ranked)
    {
        var rungs = new List<Rung>();
        for (int rank = 0; rank < ranked.Count; rank++)
        {
            var rung = new Rung(ranked[rank], rank, ranked[rank].Range.UsableLow, ranked[rank].Range.UsableHigh);
            if (rungs.Count == 0)
            {
                rungs.Add(rung);
            }
            else if (rung.Low < rungs[0].Low && rung.High <= rungs[rungs.Count - 1].High)
            {
                rungs.Insert(0, rung);
            }
            else if (rung.High > rungs[rungs.Count - 1].High && rung.Low >= rungs[0].Low)
            {
                rungs.Add(rung);
            }
        }

        return new LawLadder([.. rungs]);
    }

    /// <summary>Band over which law i passes into law i + 1.</summary>
    public (double Low, double High) Passage(int i)
    {
        Rung lower = rungs[i], upper = rungs[i + 1];
        double overlapLow = upper.Low, overlapHigh = lower.High;
        if (overlapHigh > overlapLow)
        {
            return lower.Rank < upper.Rank
                ? (Math.Max(overlapLow, overlapHigh / WidestOverlap), overlapHigh)
                : (overlapLow, Math.Min(overlapHigh, overlapLow * WidestOverlap));
        }

        return overlapLow > overlapHigh * (1 + (2 * TouchHalfWidth))
            ? (overlapHigh, overlapLow)
            : (overlapHigh * (1 - TouchHalfWidth), overlapLow * (1 + TouchHalfWidth));
    }

    /// <summary>The law at x, and which of the ladder's laws take part in it: the lower index, and the weight of the next one.</summary>
    public LawValue Evaluate(double x, out int lower, out double weightOfNext)
    {
        for (lower = 0; lower < rungs.Length - 1; lower++)
        {
            (double low, double high) = Passage(lower);
            if (x < high)
            {
                weightOfNext = Crossfade.Weight(x, low, high);
                LawValue below = rungs[lower].Law.Law.Evaluate(x);
                return weightOfNext == 0
                    ? below
                    : Crossfade.Between(below, rungs[lower + 1].Law.Law.Evaluate(x), x, low, high);
            }
        }

        weightOfNext = 0;
        return rungs[lower].Law.Law.Evaluate(x);
    }

    private sealed record Rung(SelectedLaw Law, int Rank, double Low, double High);
}
