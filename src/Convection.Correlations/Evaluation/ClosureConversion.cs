using System;

namespace Convection.Correlations.Evaluation;

/// <summary>Carries the coefficients of a room between outlet and supply air as their reference.</summary>
/// <remarks>
/// In a room whose surfaces share one temperature and whose air is heated by them alone, T_s − T_supply = (T_s − T_outlet)·(1 + NTU)
/// with NTU = Σ h_outlet·A/(ρ·c_p·V̇), so that h_supply = h_outlet/(1 + NTU) and h_outlet = h_supply/(1 − ε) with
/// ε = Σ h_supply·A/(ρ·c_p·V̇) = NTU/(1 + NTU). The identity belongs to that condition: it carries numbers between publications, and
/// amplifies an error in h_supply by up to 1/(1 − ε). In a room with other gains convert fluxes, not coefficients.
/// </remarks>
public static class ClosureConversion
{
    /// <summary>Coefficients against supply air from such against outlet air.</summary>
    /// <param name="outletCoefficients">h against outlet air [W/(m²·K)], one for each surface, 0 or more.</param>
    /// <param name="areasSquareMetres">Areas [m²], one for each surface, above 0.</param>
    /// <param name="heatCapacityFlow">ρ·c_p·V̇ of the supply air [W/K], above 0.</param>
    /// <returns>h against supply air [W/(m²·K)].</returns>
    /// <exception cref="ArgumentNullException">A list is null.</exception>
    /// <exception cref="ArgumentException">The lists differ in length.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval.</exception>
    public static double[] ToSupply(double[] outletCoefficients, double[] areasSquareMetres, double heatCapacityFlow)
    {
        double ntu = Ratio(outletCoefficients, areasSquareMetres, heatCapacityFlow, nameof(outletCoefficients));
        return Array.ConvertAll(outletCoefficients, h => h / (1 + ntu));
    }

    /// <summary>Coefficients against outlet air from such against supply air.</summary>
    /// <param name="supplyCoefficients">h against supply air [W/(m²·K)], one for each surface, 0 or more.</param>
    /// <param name="areasSquareMetres">Areas [m²], one for each surface, above 0.</param>
    /// <param name="heatCapacityFlow">ρ·c_p·V̇ of the supply air [W/K], above 0.</param>
    /// <returns>h against outlet air [W/(m²·K)].</returns>
    /// <exception cref="ArgumentNullException">A list is null.</exception>
    /// <exception cref="ArgumentException">The lists differ in length.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval, or ε is 1 or more: impossible in the condition of the identity.</exception>
    public static double[] ToOutlet(double[] supplyCoefficients, double[] areasSquareMetres, double heatCapacityFlow)
    {
        double ratio = Ratio(supplyCoefficients, areasSquareMetres, heatCapacityFlow, nameof(supplyCoefficients));
        if (ratio >= 1)
        {
            throw new ArgumentOutOfRangeException(
                nameof(supplyCoefficients),
                ratio,
                "Closure ratio " + InvariantText.Number(ratio) + " is not accepted; it must be [0, 1): such coefficients against supply air are impossible.");
        }

        return Array.ConvertAll(supplyCoefficients, h => h / (1 - ratio));
    }

    private static double Ratio(double[] coefficients, double[] areas, double heatCapacityFlow, string name)
    {
        Require.NotNull(coefficients, name);
        Require.NotNull(areas, nameof(areas));
        Require.Positive(heatCapacityFlow, 1e12, "Heat capacity flow", "W/K", nameof(heatCapacityFlow));
        if (coefficients.Length != areas.Length)
        {
            throw new ArgumentException("There are " + coefficients.Length + " coefficients and " + areas.Length + " areas; one area is needed for each.", nameof(areas));
        }

        double conductance = 0;
        for (int i = 0; i < coefficients.Length; i++)
        {
            conductance += Require.Within(coefficients[i], 0, 1e6, "Coefficient", "W/(m²·K)", name) * Require.Positive(areas[i], 1e6, "Area", "m²", nameof(areas));
        }

        return conductance / heatCapacityFlow;
    }
}
