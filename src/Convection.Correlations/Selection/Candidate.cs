using System;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Selection;

/// <summary>An admissible correlation, bound to the surface, with its score on each criterion of the ranking.</summary>
internal sealed class Candidate : IComparable<Candidate>
{
    private readonly int[] scores;

    public Candidate(Correlation correlation, LawBinding binding, double nominalDifference, int[] scores)
    {
        Correlation = correlation;
        Law = correlation.Bind(binding);
        Range = correlation.Range.Bind(binding, Law);
        this.scores = scores;
        NominalStanding = Law.DrivenBy is DrivingVariable.TemperatureDifference or DrivingVariable.None
            ? Range.StandingAt(nominalDifference)
            : Range.Violations.Count > 0 ? RangeStanding.SurfaceOutside
            : RangeStanding.NotEvaluated;
        scores[Ranking.InRange] = NominalStanding is RangeStanding.Below or RangeStanding.Above or RangeStanding.SurfaceOutside ? 1 : 0;
    }

    public Correlation Correlation { get; }

    public BoundLaw Law { get; }

    public BoundRange Range { get; }

    public RangeStanding NominalStanding { get; }

    public bool IsPinned { get; init; }

    public bool IsNearMatch => scores[Ranking.Surface] is 1 or Ranking.Misfit;

    public int Score(int criterion) => scores[criterion];

    public int CompareTo(Candidate? other)
    {
        for (int i = 0; i < scores.Length; i++)
        {
            int order = scores[i].CompareTo(other!.scores[i]);
            if (order != 0)
            {
                return order;
            }
        }

        return Correlation.Id.CompareTo(other!.Correlation.Id);
    }
}
