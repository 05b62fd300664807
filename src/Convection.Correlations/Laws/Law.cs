namespace Convection.Correlations.Laws;

/// <summary>The shape and the printed numbers of a correlation, before geometry and air are known.</summary>
/// <remarks>Immutable and safe to share between threads.</remarks>
public abstract class Law
{
    private protected Law()
    {
    }

    /// <summary>What the coefficient depends on.</summary>
    public abstract DrivingVariable DrivenBy { get; }

    /// <summary>The law as a formula, starting with "h =" in W/(m²·K) or with "Nu =".</summary>
    public abstract string Formula { get; }

    /// <summary>True where the formula gives a Nusselt number and takes its numbers from the air itself.</summary>
    public bool IsDimensionless => Formula.StartsWith("Nu", System.StringComparison.Ordinal);

    /// <summary>Turns the law into the numbers for one surface and its air.</summary>
    /// <param name="binding">Lengths, tilt, volume and air.</param>
    /// <returns>The bound law.</returns>
    /// <exception cref="System.ArgumentNullException">The binding is null.</exception>
    public BoundLaw Bind(LawBinding binding) => BindTo(Require.NotNull(binding, nameof(binding)));

    internal abstract BoundLaw BindTo(LawBinding binding);
}
