using System;

namespace Convection.Correlations.Laws;

/// <summary>h = c0 + c1·Xʳ, X being the flow variable that the source used.</summary>
/// <remarks>
/// In air other than the laboratory's the whole law is scaled as k·Pr^(1/3)/νʳ (Reynolds scaling), with 2r in place of r for the jet
/// momentum number, which goes with the square of the flow.
/// </remarks>
public sealed class FlowLaw : Law
{
    /// <summary>A law in a flow variable.</summary>
    /// <param name="variable">Air changes per hour, jet momentum, or flow per length.</param>
    /// <param name="intercept">c0 as printed [W/(m²·K)]; finite.</param>
    /// <param name="slope">c1 as printed; finite.</param>
    /// <param name="exponent">r; 0 to 2.</param>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval.</exception>
    /// <exception cref="ArgumentException">The variable is not a flow variable.</exception>
    public FlowLaw(DrivingVariable variable, double intercept, double slope, double exponent)
    {
        if (variable is not (DrivingVariable.AirChangeRate or DrivingVariable.JetMomentum or DrivingVariable.FlowPerLength or DrivingVariable.Speed))
        {
            throw new ArgumentException("A flow law depends on a flow variable, not on " + variable + ".", nameof(variable));
        }

        DrivenBy = variable;
        Intercept = Require.Finite(intercept, "Intercept", "W/(m²·K)", nameof(intercept));
        Slope = Require.Finite(slope, "Slope", string.Empty, nameof(slope));
        Exponent = Require.Within(exponent, 0, 2, "Exponent of the flow", string.Empty, nameof(exponent));
    }

    /// <summary>c0 as printed [W/(m²·K)].</summary>
    public double Intercept { get; }

    /// <summary>c1 as printed.</summary>
    public double Slope { get; }

    /// <summary>r.</summary>
    public double Exponent { get; }

    /// <inheritdoc/>
    public override DrivingVariable DrivenBy { get; }

    /// <inheritdoc/>
    public override string Formula
        => "h = " + (Intercept == 0 ? string.Empty : InvariantText.Number(Intercept) + " + ")
            + FormulaText.Product(InvariantText.Number(Slope), FormulaText.Power(FormulaText.Symbol(DrivenBy), Exponent));

    internal override BoundLaw BindTo(LawBinding binding)
    {
        NormalForm printed = Intercept == 0 ? new NormalForm(Slope, Exponent) : new NormalForm(Intercept, 0, Slope, Exponent, 1);
        return new BoundLaw(DrivenBy, printed.Times(binding.ForcedScale(DrivenBy == DrivingVariable.JetMomentum ? 2 * Exponent : Exponent)));
    }
}
