using System;

namespace Convection.Correlations.Laws;

/// <summary>Dimensional term C·|ΔT|ⁿ·Lᵖ [W/(m²·K)].</summary>
public sealed class PowerTerm : Term
{
    private readonly Func<LawBinding, double>? factor;
    private readonly string factorText;

    /// <summary>A power of the temperature difference.</summary>
    /// <param name="coefficient">C as printed, in the unit that makes the term come out in W/(m²·K); finite.</param>
    /// <param name="exponent">n; 0 to 4. Zero makes the term a fixed value.</param>
    /// <param name="length">Characteristic length L.</param>
    /// <param name="lengthExponent">p; −4 to 4.</param>
    /// <param name="factor">Further factor from geometry, such as one for tilt; null for none.</param>
    /// <param name="factorText">That factor as a formula.</param>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval.</exception>
    public PowerTerm(
        double coefficient,
        double exponent,
        CharacteristicLength length = CharacteristicLength.None,
        double lengthExponent = 0,
        Func<LawBinding, double>? factor = null,
        string factorText = "")
    {
        Coefficient = Require.Finite(coefficient, "Coefficient", string.Empty, nameof(coefficient));
        Exponent = Require.Within(exponent, 0, 4, "Exponent of the temperature difference", string.Empty, nameof(exponent));
        LengthExponent = Require.Within(lengthExponent, -4, 4, "Exponent of the length", string.Empty, nameof(lengthExponent));
        Length = length;
        this.factor = factor;
        this.factorText = factorText;
    }

    /// <summary>C as printed.</summary>
    public double Coefficient { get; }

    /// <summary>Characteristic length L.</summary>
    public CharacteristicLength Length { get; }

    /// <summary>p.</summary>
    public double LengthExponent { get; }

    /// <inheritdoc/>
    public override DrivingVariable DrivenBy => Exponent == 0 ? DrivingVariable.None : DrivingVariable.TemperatureDifference;

    /// <inheritdoc/>
    public override bool IsDimensionless => false;

    /// <inheritdoc/>
    public override string Formula
        => FormulaText.Product(
            InvariantText.Number(Coefficient),
            FormulaText.Power("|ΔT|", Exponent),
            FormulaText.Power(FormulaText.Symbol(Length), LengthExponent),
            factorText);

    internal override double Exponent { get; }

    // A fixed value (exponent 0) is a convention, not a measurement in some air: it is not scaled.
    internal override double Amplitude(LawBinding binding)
        => Coefficient * Math.Pow(binding.Metres(Length), LengthExponent) * (factor?.Invoke(binding) ?? 1)
            * (Exponent == 0 ? 1 : binding.BuoyantScale(Exponent));
}
