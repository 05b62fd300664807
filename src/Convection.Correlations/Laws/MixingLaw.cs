using System;

namespace Convection.Correlations.Laws;

/// <summary>A rule that makes one coefficient of a buoyant part h_n and a forced part h_f: |h_n^n ± h_f^n|^(1/n).</summary>
/// <remarks>
/// Both parts must refer to one temperature; this library blends fluxes instead (<see cref="BlendRule"/>) and keeps these rules
/// as published. Bound, it is the law of the ratio h_f/h_n for a buoyant part of 1 W/(m²·K).
/// </remarks>
public sealed class MixingLaw : Law
{
    /// <summary>A mixing rule.</summary>
    /// <param name="exponent">n; 1 to 10.</param>
    /// <param name="isOpposing">True where the parts subtract.</param>
    /// <param name="floor">Least share of the larger part that is left in opposing flow; 0 for none, up to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval.</exception>
    public MixingLaw(double exponent, bool isOpposing = false, double floor = 0)
    {
        JoinExponent = Require.Within(exponent, 1, 10, "Exponent of a blend", string.Empty, nameof(exponent));
        IsOpposing = isOpposing;
        Floor = Require.Within(floor, 0, 1, "Floor of opposing flow", string.Empty, nameof(floor));
    }

    /// <summary>n.</summary>
    public double JoinExponent { get; }

    /// <summary>True where the parts subtract.</summary>
    public bool IsOpposing { get; }

    /// <summary>Least share of the larger part that is left in opposing flow.</summary>
    public double Floor { get; }

    /// <inheritdoc/>
    public override DrivingVariable DrivenBy => DrivingVariable.PartRatio;

    /// <inheritdoc/>
    public override string Formula
    {
        get
        {
            string n = FormulaText.Exponent(JoinExponent), root = FormulaText.Exponent(1 / JoinExponent);
            string rule = IsOpposing ? "|h_f^" + n + " - h_n^" + n + "|^" + root : "(h_n^" + n + " + h_f^" + n + ")^" + root;
            return Floor > 0
                ? "h = max[" + rule + ", " + InvariantText.Number(Floor) + "·h_n, " + InvariantText.Number(Floor) + "·h_f]"
                : "h = " + rule;
        }
    }

    /// <summary>The coefficient of two parts.</summary>
    /// <param name="buoyant">h_n [W/(m²·K)], 0 or more.</param>
    /// <param name="forced">h_f [W/(m²·K)], 0 or more, against the same temperature.</param>
    /// <returns>h [W/(m²·K)]; NaN for a part that is negative or not a number.</returns>
    public double Mix(double buoyant, double forced)
        => !(buoyant >= 0 && forced >= 0) ? double.NaN : buoyant == 0 ? forced : buoyant * OfRatio(forced / buoyant).Coefficient;

    internal override BoundLaw BindTo(LawBinding binding) => new(DrivenBy, OfRatio);

    private LawValue OfRatio(double ratio)
    {
        double power = Math.Pow(ratio, JoinExponent);
        if (!IsOpposing)
        {
            double sum = Math.Pow(1 + power, 1 / JoinExponent);
            return new LawValue(sum, sum * power / (1 + power));
        }

        double larger = Math.Max(1, ratio), size = Math.Abs(power - 1), rest = Math.Pow(size, 1 / JoinExponent);
        return rest <= Floor * larger
            ? new LawValue(Floor * larger, ratio > 1 ? Floor * ratio : 0)
            : new LawValue(rest, rest * power / (power - 1));
    }
}
