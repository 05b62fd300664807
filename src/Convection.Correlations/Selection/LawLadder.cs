using System;
using System.Collections.Generic;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Selection;

/// <summary>Laws that follow each other as the driving variable rises, and the bands over which each passes into the next.</summary>
/// <remarks>
/// The best-ranked law keeps its interval; lesser ones serve below and above it. Where two overlap, the passage lies in the
/// overlap next to the better law's limit and is at most a factor of 1.2 wide; across a gap it fills the gap; where they merely
/// touch it reaches 5 % to either side. A law is left out where its passages would run into each other.
/// </remarks>
internal sealed class LawLadder
{
    private const double WidestOverlap = 1.2, TouchHalfWidth = 0.05;

    private readonly Rung[] rungs;
    private readonly (double Low, double High)[] passages;

    private LawLadder(Rung[] rungs, (double Low, double High)[] passages)
    {
        this.rungs = rungs;
        this.passages = passages;
    }

    public IReadOnlyList<SelectedLaw> Laws => Array.ConvertAll(rungs, r => r.Law);

    public int Count => rungs.Length;

    public SelectedLaw this[int index] => rungs[index].Law;

    /// <summary>Upper end of the highest law's interval.</summary>
    public double Highest => rungs[rungs.Length - 1].High;

    /// <summary>Takes laws in the order of their rank, the best one first.</summary>
    public static LawLadder Build(IReadOnlyList<SelectedLaw> ranked)
    {
        var rungs = new List<Rung>();
        for (int rank = 0; rank < ranked.Count; rank++)
        {
            SelectedLaw law = ranked[rank];
            var rung = new Rung(law, rank, law.Range.UsableLow, law.Range.UsableHigh);
            if (rungs.Count == 0)
            {
                rungs.Add(rung);
                continue;
            }

            if (rung.Low < rungs[0].Low)
            {
                Try(rungs, [rung with { High = Math.Min(rung.High, rungs[0].High) }, .. rungs]);
            }

            Rung last = rungs[rungs.Count - 1];
            if (rung.High > last.High)
            {
                Try(rungs, [.. rungs, rung with { Low = Math.Max(rung.Low, last.Low) }]);
            }
        }

        return new LawLadder([.. rungs], Passages(rungs)!);
    }

    /// <summary>Band over which law i passes into law i + 1.</summary>
    public (double Low, double High) Passage(int i) => passages[i];

    /// <summary>Which of the ladder's laws take part at x: the index of the lower one, and the weight of the next.</summary>
    public int Find(double x, out double weightOfNext)
    {
        for (int lower = 0; lower < passages.Length; lower++)
        {
            (double low, double high) = passages[lower];
            if (x < high)
            {
                weightOfNext = Crossfade.Weight(x, low, high);
                return lower;
            }
        }

        weightOfNext = 0;
        return passages.Length;
    }

    private static void Try(List<Rung> rungs, List<Rung> longer)
    {
        if (Passages(longer) is not null)
        {
            rungs.Clear();
            rungs.AddRange(longer);
        }
    }

    /// <summary>The passages between neighbours, or null where two of them would overlap.</summary>
    private static (double Low, double High)[]? Passages(List<Rung> rungs)
    {
        var passages = new (double Low, double High)[rungs.Count - 1];
        for (int i = 0; i < passages.Length; i++)
        {
            passages[i] = Between(rungs[i], rungs[i + 1]);
            if (i > 0 && passages[i].Low < passages[i - 1].High)
            {
                return null;
            }
        }

        return passages;
    }

    private static (double Low, double High) Between(Rung lower, Rung upper)
        => lower.High > upper.Low
            ? lower.Rank < upper.Rank
                ? (Math.Max(upper.Low, lower.High / WidestOverlap), lower.High)
                : (upper.Low, Math.Min(lower.High, upper.Low * WidestOverlap))
            : upper.Low > lower.High * (1 + (2 * TouchHalfWidth))
                ? (lower.High, upper.Low)
                : (lower.High * (1 - TouchHalfWidth), upper.Low * (1 + TouchHalfWidth));

    private sealed record Rung(SelectedLaw Law, int Rank, double Low, double High);
}
