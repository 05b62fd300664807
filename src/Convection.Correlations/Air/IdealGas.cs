using System;

namespace Convection.Correlations.Air;

/// <summary>The vibration term that the ideal-gas heat capacities of air and of water vapour share.</summary>
internal static class IdealGas
{
    /// <summary>Planck–Einstein function x² eˣ/(eˣ − 1)², written so that a large x cannot overflow.</summary>
    public static double Einstein(double x)
    {
        double e = Math.Exp(-x);
        return x * x * e / ((1 - e) * (1 - e));
    }
}
