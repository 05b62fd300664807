namespace Convection.Correlations.Laws;

/// <summary>A coefficient and how it reacts to its driving variable.</summary>
/// <remarks>The default value has a coefficient of zero; laws never return it for a state they cannot evaluate, they return NaN.</remarks>
public readonly record struct LawValue
{
    /// <summary>A coefficient with its sensitivity.</summary>
    /// <param name="coefficient">h [W/(m²·K)].</param>
    /// <param name="sensitivity">x·dh/dx [W/(m²·K)].</param>
    public LawValue(double coefficient, double sensitivity)
    {
        Coefficient = coefficient;
        Sensitivity = sensitivity;
    }

    /// <summary>Not a number: the law cannot be evaluated there.</summary>
    public static LawValue NotANumber => new(double.NaN, double.NaN);

    /// <summary>Coefficient h [W/(m²·K)].</summary>
    public double Coefficient { get; }

    /// <summary>
    /// Sensitivity x·dh/dx [W/(m²·K)], x being the driving variable. Unlike dh/dx it is finite at x = 0, and a buoyant
    /// flux h·ΔT has the slope h + x·dh/dx.
    /// </summary>
    public double Sensitivity { get; }
}
