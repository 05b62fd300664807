namespace Convection.Correlations.Laws;

/// <summary>One addend of a law: an amplitude times a power of the driving variable.</summary>
public abstract class Term
{
    private protected Term()
    {
    }

    /// <summary>What the term depends on.</summary>
    public abstract DrivingVariable DrivenBy { get; }

    /// <summary>The term as a formula.</summary>
    public abstract string Formula { get; }

    /// <summary>True where the formula gives a Nusselt number, false where it gives h in W/(m²·K).</summary>
    public abstract bool IsDimensionless { get; }

    internal abstract double Amplitude(LawBinding binding);

    internal abstract double Exponent { get; }
}
