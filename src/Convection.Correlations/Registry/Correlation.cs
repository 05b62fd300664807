using System;
using System.Collections.Generic;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Registry;

/// <summary>A published relation for a convective coefficient, with all that is known about it.</summary>
/// <remarks>
/// Immutable, and safe to share between threads. Identity is the <see cref="Id"/>; a registry holds one correlation for each.
/// Whether the parts fit together is checked when a registry takes it.
/// </remarks>
public sealed class Correlation
{
    private readonly string[] doubts = [];

    /// <summary>Permanent name.</summary>
    public required CorrelationId Id { get; init; }

    /// <summary>What it is for, in a few words, such as "wall beside the radiator".</summary>
    public required string Title { get; init; }

    /// <summary>Where it was published.</summary>
    public required Publication Publication { get; init; }

    /// <summary>What the coefficient contains.</summary>
    public required CorrelationFamily Family { get; init; }

    /// <summary>What it applies to.</summary>
    public required Applicability Applies { get; init; }

    /// <summary>Shape and printed numbers.</summary>
    public required Law Law { get; init; }

    /// <summary>Temperature that the difference is taken against.</summary>
    public required ReferenceTemperature Reference { get; init; }

    /// <summary>Characteristic length of the formula; none where the size of the test room is built in.</summary>
    public CharacteristicLength Length { get; init; }

    /// <summary>Over what it was tested.</summary>
    public required ValidityRange Range { get; init; }

    /// <summary>What was measured, where, and how far it can be trusted.</summary>
    public required Evidence Evidence { get; init; }

    /// <summary>How the text was checked.</summary>
    public required TextCheck TextCheck { get; init; }

    /// <summary>True where the text, or a part of it that matters, is unconfirmed; every result says so.</summary>
    public bool IsUnconfirmed { get; init; }

    /// <summary>True where buoyancy is contained in a forced or mixed coefficient and must not be added again.</summary>
    public bool ContainsBuoyancy { get; init; }

    /// <summary>
    /// True where it is kept for comparison and never chosen automatically: a local value, a rule that mixes two parts, a value
    /// against a temperature that a room's state does not hold.
    /// </summary>
    public bool IsReferenceOnly { get; init; }

    /// <summary>Known doubts and remarks, one sentence each.</summary>
    /// <exception cref="ArgumentNullException">The list is null.</exception>
    public IReadOnlyList<string> Doubts { get => doubts; init => doubts = [.. Require.NotNull(value, nameof(Doubts))]; }

    /// <summary>Binds the law to one surface and its air.</summary>
    /// <param name="binding">Lengths, tilt, volume and air.</param>
    /// <returns>The bound law; its value is the coefficient against <see cref="Reference"/>.</returns>
    /// <exception cref="ArgumentNullException">The binding is null.</exception>
    public BoundLaw Bind(LawBinding binding) => Law.Bind(binding);

    /// <summary>Where a value of the driving variable stands to the tested range, for one surface and its air.</summary>
    /// <param name="binding">Lengths, tilt, volume and air.</param>
    /// <param name="x">Value of the driving variable in its own unit.</param>
    /// <returns>The standing.</returns>
    /// <exception cref="ArgumentNullException">The binding is null.</exception>
    public RangeStanding StandingAt(LawBinding binding, double x)
        => Range.Bind(Require.NotNull(binding, nameof(binding)), Bind(binding)).StandingAt(x);

    /// <summary>Id and formula.</summary>
    /// <returns>The text, the same in every culture.</returns>
    public override string ToString() => Id + ": " + Law.Formula;
}
