using System.Collections.Generic;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Selection;

/// <summary>A chosen correlation with the reasons for it.</summary>
public sealed class SelectedLaw
{
    private readonly string[] reasons;

    internal SelectedLaw(Candidate candidate, string[] reasons)
    {
        Correlation = candidate.Correlation;
        Law = candidate.Law;
        Range = candidate.Range;
        NominalStanding = candidate.NominalStanding;
        IsPinned = candidate.IsPinned;
        IsNearMatch = candidate.IsNearMatch;
        this.reasons = reasons;
    }

    /// <summary>The correlation.</summary>
    public Correlation Correlation { get; }

    /// <summary>Why it was chosen, one reason each.</summary>
    public IReadOnlyList<string> Reasons => reasons;

    /// <summary>Where the nominal temperature difference of the choice stands to its range; not evaluated for flow laws.</summary>
    public RangeStanding NominalStanding { get; }

    /// <summary>True where it was fixed by hand.</summary>
    public bool IsPinned { get; }

    /// <summary>True where it was made for a like surface and not for this one, such as a wall's law on a window.</summary>
    public bool IsNearMatch { get; }

    /// <summary>Limits on the surface itself, such as its height or tilt, that are not met, in words.</summary>
    public IReadOnlyList<string> Violations => Range.Violations;

    internal BoundLaw Law { get; }

    internal BoundRange Range { get; }
}
