using System;

namespace Convection.Correlations.Laws;

/// <summary>Two terms joined as (t1^m + t2^m)^(1/m), the rule of Churchill and Usagi.</summary>
/// <remarks>
/// S.W. Churchill, R. Usagi, "A general expression for the correlation of rates of transfer and other phenomena", AIChE
/// Journal 18(6), 1121–1128, 1972. With m = 1 it is a plain sum; with m = 1/2 and a fixed first term it is the full-range
/// form of Churchill and Chu.
/// </remarks>
public sealed class TwoAsymptoteLaw : Law
{
    private readonly string? printedForm;

    /// <summary>Joins two terms.</summary>
    /// <param name="first">First term.</param>
    /// <param name="second">Second term, of the same kind (both h, or both Nu of one length).</param>
    /// <param name="joinExponent">m, in (0, 100].</param>
    /// <param name="printedForm">The formula as its source prints it, where it is shaped otherwise; null to derive it.</param>
    /// <exception cref="ArgumentNullException">A term is null.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The exponent is outside its interval.</exception>
    /// <exception cref="ArgumentException">The terms are of unlike kind.</exception>
    public TwoAsymptoteLaw(Term first, Term second, double joinExponent, string? printedForm = null)
    {
        First = Require.NotNull(first, nameof(first));
        Second = Require.NotNull(second, nameof(second));
        JoinExponent = Require.Positive(joinExponent, 100, "Join exponent", string.Empty, nameof(joinExponent));
        this.printedForm = printedForm;
        if (first.IsDimensionless != second.IsDimensionless
            || (first.DrivenBy != second.DrivenBy && first.DrivenBy != DrivingVariable.None && second.DrivenBy != DrivingVariable.None))
        {
            throw new ArgumentException("Both terms of a law must give the same quantity and depend on the same variable.", nameof(second));
        }
    }

    /// <summary>First term.</summary>
    public Term First { get; }

    /// <summary>Second term.</summary>
    public Term Second { get; }

    /// <summary>m.</summary>
    public double JoinExponent { get; }

    /// <inheritdoc/>
    public override DrivingVariable DrivenBy => First.DrivenBy == DrivingVariable.None ? Second.DrivenBy : First.DrivenBy;

    /// <inheritdoc/>
    public override string Formula => printedForm ?? ((First.IsDimensionless ? "Nu = " : "h = ") + (JoinExponent == 1
        ? First.Formula + " + " + Second.Formula
        : "[(" + First.Formula + ")^" + FormulaText.Exponent(JoinExponent) + " + (" + Second.Formula + ")^" + FormulaText.Exponent(JoinExponent) + "]^"
            + FormulaText.Exponent(1 / JoinExponent)));

    internal override BoundLaw BindTo(LawBinding binding)
        => new(DrivenBy, new NormalForm(First.Amplitude(binding), First.Exponent, Second.Amplitude(binding), Second.Exponent, JoinExponent));
}
