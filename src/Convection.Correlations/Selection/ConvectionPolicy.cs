using System;
using System.Collections.Generic;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Selection;

/// <summary>What a user wants of the automatic choice. The default leaves it all to the ranking.</summary>
/// <remarks>Immutable and safe to share between threads. Ids and surface names are checked when a room is bound.</remarks>
public sealed record ConvectionPolicy
{
    private readonly CorrelationId[] prefer = [];
    private readonly CorrelationId[] exclude = [];
    private readonly SurfacePin[] pins = [];

    /// <summary>The defaults.</summary>
    public static ConvectionPolicy Default { get; } = new();

    /// <summary>Correlations that go before all others wherever they apply.</summary>
    /// <exception cref="ArgumentNullException">The list is null.</exception>
    public IReadOnlyList<CorrelationId> Prefer { get => prefer; init => prefer = [.. Require.NotNull(value, nameof(Prefer))]; }

    /// <summary>Correlations that are never chosen.</summary>
    /// <exception cref="ArgumentNullException">The list is null.</exception>
    public IReadOnlyList<CorrelationId> Exclude { get => exclude; init => exclude = [.. Require.NotNull(value, nameof(Exclude))]; }

    /// <summary>Correlations fixed by hand for single surfaces.</summary>
    /// <exception cref="ArgumentNullException">The list or a member is null.</exception>
    public IReadOnlyList<SurfacePin> Pins
    {
        get => pins;
        init => pins = Array.ConvertAll<SurfacePin, SurfacePin>([.. Require.NotNull(value, nameof(Pins))], p => Require.NotNull(p, nameof(Pins)));
    }

    /// <summary>Weakest check of the text that is accepted. The default accepts all that is shipped.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Not one of the named values.</exception>
    public TextCheck WeakestTextCheck
    {
        get;
        init => field = Require.Defined(value, TextCheck.Unspecified, "Weakest text check", nameof(WeakestTextCheck));
    }
        = TextCheck.RecalledLow;

    /// <summary>Weakest evidence that is accepted. The default accepts all, fixed values of standards included.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Not one of the named values.</exception>
    public EvidenceKind WeakestEvidence
    {
        get;
        init => field = Require.Defined(value, EvidenceKind.Unspecified, "Weakest evidence", nameof(WeakestEvidence));
    }
        = EvidenceKind.Standard;

    /// <summary>What happens out of range. The default extends the formula and flags the result.</summary>
    /// <remarks>
    /// Below the lowest tested flow of a forced law its flux always fades to zero with the flow, unless refused: an
    /// intercept may neither survive a standing fan nor turn the coefficient negative.
    /// </remarks>
    /// <exception cref="ArgumentOutOfRangeException">Not one of the named values.</exception>
    public OutOfRangeRule OutOfRange
    {
        get;
        init => field = Require.Defined(value, OutOfRangeRule.Unspecified, "Out-of-range rule", nameof(OutOfRange));
    }
        = OutOfRangeRule.Extend;

    /// <summary>How buoyant and forced fluxes are blended.</summary>
    /// <exception cref="ArgumentNullException">The rule is null.</exception>
    public BlendRule Blend { get; init => field = Require.NotNull(value, nameof(Blend)); } = BlendRule.Default;

    /// <summary>
    /// Output fraction of a heater over which its room's correlation replaces the still-air one, smoothly [-]; 0.001 to 1.
    /// The default is 0.2: no source describes the passage, and a heater at a fifth of its output already stirs its room.
    /// </summary>
    /// <exception cref="ArgumentOutOfRangeException">Outside its interval or not a number.</exception>
    public double HeaterRamp
    {
        get;
        init => field = Require.Within(value, 0.001, 1, "Heater ramp", string.Empty, nameof(HeaterRamp));
    }
        = 0.2;

    /// <summary>
    /// Least buoyant coefficient [W/(m²·K)], 0 to 5, for solvers that need a conductance where surface and air are equally warm. The
    /// default, 0, leaves the laws alone.
    /// </summary>
    /// <remarks>
    /// No source supplies one; it is a numerical aid. The coefficient becomes (h⁶ + h_min⁶)^(1/6): smooth, 12 % above h where both are equal,
    /// 0.3 % where h is twice as large. Results that it moves by more than 0.1 % say so.
    /// </remarks>
    /// <exception cref="ArgumentOutOfRangeException">Outside its interval or not a number.</exception>
    public double MinimumConductance
    {
        get;
        init => field = Require.Within(value, 0, 5, "Minimum conductance", "W/(m²·K)", nameof(MinimumConductance));
    }

    /// <summary>
    /// True (the default) passes the pieces of a piecewise law into one another over 2 % of the driving variable to either side of
    /// where they meet; less where two joints are close. False takes the law exactly as published, its jumps included.
    /// </summary>
    public bool JoinsPieces { get; init; } = true;

    /// <summary>
    /// True (the default) scales dimensional formulas, which are taken to embed dry air of 22 °C at sea level, to the temperature,
    /// pressure and humidity of the room's air by their property groups.
    /// </summary>
    public bool ScaleToAir { get; init; } = true;

    internal bool Prefers(CorrelationId id) => Array.IndexOf(prefer, id) >= 0;

    /// <summary>Why the policy does not accept a correlation; null where it does.</summary>
    internal string? Objection(Correlation c)
        => Array.IndexOf(exclude, c.Id) >= 0 ? "excluded by the policy"
            : c.TextCheck > WeakestTextCheck ? "its text is less well checked than the policy asks for (" + EvidenceText.Of(c.TextCheck) + ")"
            : c.Evidence.Kind > WeakestEvidence ? "its evidence is weaker than the policy asks for (" + EvidenceText.Of(c.Evidence.Kind) + ")"
            : null;
}
