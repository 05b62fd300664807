namespace Convection.Correlations.Laws;

/// <summary>The temperature difference at which a buoyant law gives a flux.</summary>
internal static class FluxInverse
{
    /// <summary>Solves h(ΔT)·ΔT = flux by bisection on a logarithmic scale; the flux of every law here rises with ΔT.</summary>
    public static double DifferenceAt(double fluxWattsPerSquareMetre, BoundLaw law)
    {
        double low = 1e-12, high = 1e6;
        for (int i = 0; i < 200; i++)
        {
            double middle = System.Math.Sqrt(low * high);
            if (law.Evaluate(middle).Coefficient * middle < fluxWattsPerSquareMetre)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return System.Math.Sqrt(low * high);
    }
}
