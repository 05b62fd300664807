namespace Convection.Correlations.Laws;

/// <summary>A law of one term.</summary>
public sealed class PowerLaw : Law
{
    /// <summary>A law of one term.</summary>
    /// <param name="term">The term.</param>
    /// <exception cref="System.ArgumentNullException">The term is null.</exception>
    public PowerLaw(Term term) => Term = Require.NotNull(term, nameof(term));

    /// <summary>h = C·|ΔT|ⁿ·Lᵖ.</summary>
    /// <param name="coefficient">C as printed; finite.</param>
    /// <param name="exponent">n; 0 to 4. Zero makes it a fixed value.</param>
    /// <param name="length">Characteristic length.</param>
    /// <param name="lengthExponent">p; −4 to 4.</param>
    /// <exception cref="System.ArgumentOutOfRangeException">A number is outside its interval.</exception>
    public PowerLaw(double coefficient, double exponent, CharacteristicLength length = CharacteristicLength.None, double lengthExponent = 0)
        : this(new PowerTerm(coefficient, exponent, length, lengthExponent))
    {
    }

    /// <summary>The term.</summary>
    public Term Term { get; }

    /// <inheritdoc/>
    public override DrivingVariable DrivenBy => Term.DrivenBy;

    /// <inheritdoc/>
    public override string Formula => (Term.IsDimensionless ? "Nu = " : "h = ") + Term.Formula;

    internal override BoundLaw BindTo(LawBinding binding) => new(DrivenBy, new NormalForm(Term.Amplitude(binding), Term.Exponent));
}
