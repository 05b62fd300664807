using System;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Registry;

/// <summary>The range of one variable: tested, and where they exist advised (narrower) and extended (wider).</summary>
public sealed record RangeLimit
{
    /// <summary>States a range.</summary>
    /// <param name="variable">The variable.</param>
    /// <param name="tested">Interval that the source tested or claims.</param>
    /// <param name="origin">Where the interval comes from.</param>
    /// <param name="length">Length of the number, for Rayleigh, Grashof and Reynolds numbers.</param>
    /// <exception cref="ArgumentOutOfRangeException">Variable or origin is not given.</exception>
    public RangeLimit(RangeVariable variable, Interval tested, RangeOrigin origin, CharacteristicLength length = CharacteristicLength.None)
    {
        Variable = Require.Defined(variable, RangeVariable.Unspecified, "Variable of a range", nameof(variable));
        Origin = Require.Defined(origin, RangeOrigin.Unspecified, "Origin of a range", nameof(origin));
        Tested = tested;
        Length = length;
    }

    /// <summary>The variable.</summary>
    public RangeVariable Variable { get; }

    /// <summary>Interval that the source tested or claims.</summary>
    public Interval Tested { get; }

    /// <summary>Where the interval comes from.</summary>
    public RangeOrigin Origin { get; }

    /// <summary>Length of the number.</summary>
    public CharacteristicLength Length { get; }

    /// <summary>Part of the tested interval where this library advises its use; null for all of it.</summary>
    /// <exception cref="ArgumentException">It reaches outside the tested interval.</exception>
    public Interval? Advised
    {
        get;
        init => field = value is { } advised && !Tested.Encloses(advised)
            ? throw new ArgumentException("The advised interval must lie inside the tested one.", nameof(Advised))
            : value;
    }

    /// <summary>Interval beyond the tested one over which use is justified; null for none.</summary>
    /// <exception cref="ArgumentException">It does not enclose the tested interval.</exception>
    public Interval? Extended
    {
        get;
        init => field = value is { } extended && !extended.Encloses(Tested)
            ? throw new ArgumentException("The extended interval must enclose the tested one.", nameof(Extended))
            : value;
    }

    /// <summary>Why and by whom the interval is narrowed or widened, or other remarks.</summary>
    public string Note { get; init; } = string.Empty;

    /// <summary>Name and interval in words, such as "Ra on 4A/P 1e4 to 1e12 (recalled)".</summary>
    /// <returns>The text, the same in every culture.</returns>
    public override string ToString()
    {
        string text = RangeText.Symbol(Variable)
            + (Length == CharacteristicLength.None ? string.Empty : " on " + RangeText.Name(Length))
            + " " + InvariantText.Span(Tested.Lowest, Tested.Highest, RangeText.Unit(Variable), RangeText.Writer(Variable));
        text += Advised is { } advised ? ", advised " + InvariantText.Span(advised.Lowest, advised.Highest, RangeText.Unit(Variable)) : string.Empty;
        text += Extended is { } extended
            ? ", used " + InvariantText.Span(extended.Lowest, extended.Highest, RangeText.Unit(Variable), RangeText.Writer(Variable))
            : string.Empty;
        return Origin switch
        {
            RangeOrigin.Recalled => text + " (recalled)",
            RangeOrigin.Assumed => text + " (assumed for warnings)",
            _ => text,
        };
    }
}
