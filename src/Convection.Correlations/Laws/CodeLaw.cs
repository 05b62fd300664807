using System;

namespace Convection.Correlations.Laws;

/// <summary>A law that none of the other shapes can hold: a pure function that also returns its derivative.</summary>
public sealed class CodeLaw : Law
{
    private readonly Func<LawBinding, Func<double, LawValue>> bind;

    /// <summary>A law given by code.</summary>
    /// <param name="drivenBy">What the coefficient depends on.</param>
    /// <param name="formula">The formula in text.</param>
    /// <param name="bind">
    /// Takes lengths, tilt and air, and returns a pure function from the driving variable (0 or more, finite) to h and
    /// x·dh/dx, both in W/(m²·K). It must be safe to call on any number of threads.
    /// </param>
    /// <exception cref="ArgumentNullException">The formula or the function is null.</exception>
    public CodeLaw(DrivingVariable drivenBy, string formula, Func<LawBinding, Func<double, LawValue>> bind)
    {
        DrivenBy = Require.Defined(drivenBy, DrivingVariable.Unspecified, "Driving variable", nameof(drivenBy));
        Formula = Require.NotNull(formula, nameof(formula));
        this.bind = Require.NotNull(bind, nameof(bind));
    }

    /// <inheritdoc/>
    public override DrivingVariable DrivenBy { get; }

    /// <inheritdoc/>
    public override string Formula { get; }

    internal override BoundLaw BindTo(LawBinding binding) => new(DrivenBy, bind(binding));
}
