using System;

namespace Convection.Correlations.Laws;

/// <summary>Dimensionless buoyant term C·f(Pr)·Raʳ of a Nusselt number, Ra = g·β·|ΔT|·L³·Pr/ν².</summary>
public sealed class RayleighTerm : Term
{
    private readonly Func<LawBinding, double>? factor;
    private readonly string factorText;

    /// <summary>A power of the Rayleigh number.</summary>
    /// <param name="coefficient">C as printed; finite.</param>
    /// <param name="exponent">r; 0 to 1. Zero makes the term a fixed Nusselt number.</param>
    /// <param name="length">Length of the Nusselt and Rayleigh numbers.</param>
    /// <param name="factor">f, a function of Prandtl number or tilt; null for none.</param>
    /// <param name="factorText">f as a formula.</param>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval.</exception>
    public RayleighTerm(
        double coefficient,
        double exponent,
        CharacteristicLength length,
        Func<LawBinding, double>? factor = null,
        string factorText = "")
    {
        Coefficient = Require.Finite(coefficient, "Coefficient", string.Empty, nameof(coefficient));
        Exponent = Require.Within(exponent, 0, 1, "Exponent of the Rayleigh number", string.Empty, nameof(exponent));
        Length = length;
        this.factor = factor;
        this.factorText = factorText;
    }

    /// <summary>C as printed.</summary>
    public double Coefficient { get; }

    /// <summary>Length of the Nusselt and Rayleigh numbers.</summary>
    public CharacteristicLength Length { get; }

    /// <inheritdoc/>
    public override DrivingVariable DrivenBy => Exponent == 0 ? DrivingVariable.None : DrivingVariable.TemperatureDifference;

    /// <inheritdoc/>
    public override bool IsDimensionless => true;

    /// <inheritdoc/>
    public override string Formula
        => FormulaText.Product(InvariantText.Number(Coefficient), FormulaText.Power("Ra", Exponent), factorText);

    internal override double Exponent { get; }

    internal override double Amplitude(LawBinding binding)
        => Coefficient * (factor?.Invoke(binding) ?? 1) * Math.Pow(binding.RayleighPerKelvin(Length), Exponent)
            * binding.Air.ConductivityWattsPerMetreKelvin / binding.Metres(Length);
}
