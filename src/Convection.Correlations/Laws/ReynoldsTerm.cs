using System;

namespace Convection.Correlations.Laws;

/// <summary>Dimensionless forced term C·Reʳ·Prˢ of a Nusselt number, Re = U·L/ν.</summary>
public sealed class ReynoldsTerm : Term
{
    /// <summary>A power of the Reynolds number.</summary>
    /// <param name="coefficient">C as printed; finite.</param>
    /// <param name="exponent">r; 0 to 1. Zero makes the term a fixed Nusselt number.</param>
    /// <param name="prandtlExponent">s; 0 to 1.</param>
    /// <param name="length">Length of the Nusselt and Reynolds numbers.</param>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval.</exception>
    public ReynoldsTerm(double coefficient, double exponent, double prandtlExponent, CharacteristicLength length = CharacteristicLength.AlongFlow)
    {
        Coefficient = Require.Finite(coefficient, "Coefficient", string.Empty, nameof(coefficient));
        Exponent = Require.Within(exponent, 0, 1, "Exponent of the Reynolds number", string.Empty, nameof(exponent));
        PrandtlExponent = Require.Within(prandtlExponent, 0, 1, "Exponent of the Prandtl number", string.Empty, nameof(prandtlExponent));
        Length = length;
    }

    /// <summary>C as printed.</summary>
    public double Coefficient { get; }

    /// <summary>s.</summary>
    public double PrandtlExponent { get; }

    /// <summary>Length of the Nusselt and Reynolds numbers.</summary>
    public CharacteristicLength Length { get; }

    /// <inheritdoc/>
    public override DrivingVariable DrivenBy => Exponent == 0 ? DrivingVariable.None : DrivingVariable.Speed;

    /// <inheritdoc/>
    public override bool IsDimensionless => true;

    /// <inheritdoc/>
    public override string Formula
        => FormulaText.Product(InvariantText.Number(Coefficient), FormulaText.Power("Re", Exponent), FormulaText.Power("Pr", PrandtlExponent));

    internal override double Exponent { get; }

    internal override double Amplitude(LawBinding binding)
        => Coefficient * Math.Pow(binding.ReynoldsPerSpeed(Length), Exponent) * Math.Pow(binding.Air.Prandtl, PrandtlExponent)
            * binding.Air.ConductivityWattsPerMetreKelvin / binding.Metres(Length);
}
