namespace Convection.Correlations.Selection;

/// <summary>What happens where a state leaves the tested range of a correlation.</summary>
public enum OutOfRangeRule
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>The formula is extended and the result is flagged.</summary>
    Extend = 1,

    /// <summary>The coefficient stays what it is at the limit, and the result is flagged.</summary>
    HoldAtLimit = 2,

    /// <summary>The surface gets no flux: its result says so and its numbers are NaN.</summary>
    Refuse = 3,
}
