using System;

namespace Convection.Correlations.Air;

/// <summary>Viscosity, conductivity and heat capacity of dry air.</summary>
/// <remarks>
/// E.W. Lemmon, R.T. Jacobsen, "Viscosity and thermal conductivity equations for nitrogen, oxygen, argon, and air",
/// Int. J. Thermophysics 25(1), 21–69, 2004 (recalled, high; reproduces the check table of the paper). The critical
/// enhancement of the conductivity is left out: it vanishes at room conditions. Stated uncertainty about 1 % for the dilute
/// gas near room temperature.
/// Heat capacity: ideal gas part of E.W. Lemmon, R.T. Jacobsen, S.G. Penoncello, D.G. Friend, J. Phys. Chem. Ref. Data 29(3),
/// 331–385, 2000 (recalled, high); real air at 1 atm and 20 °C has 0.15 % more.
/// </remarks>
internal static class DryAir
{
    private const double CriticalKelvins = 132.6312;
    private const double CriticalMolesPerLitre = 10.4477;

    // Collision integral: ln Ω = Σ b_i (ln T*)^i.
    private static readonly double[] Collision = [0.431, -0.4623, 0.08406, 0.005341, -0.00331];

    // Residual viscosity: Σ N τ^t δ^d exp(−δ^l), no exponential where l is 0.
    private static readonly double[] ViscosityN = [10.72, 1.122, 0.002019, -8.876, -0.02916];
    private static readonly double[] ViscosityT = [0.2, 0.05, 2.4, 0.6, 3.6];
    private static readonly int[] ViscosityD = [1, 4, 9, 1, 8];
    private static readonly int[] ViscosityL = [0, 0, 0, 1, 1];

    // Residual conductivity, same shape.
    private static readonly double[] ConductivityN = [8.743, 14.76, -16.62, 3.793, -6.142, -0.3778];
    private static readonly double[] ConductivityT = [0.1, 0, 0.5, 2.7, 0.3, 1.3];
    private static readonly int[] ConductivityD = [1, 2, 3, 7, 7, 11];
    private static readonly int[] ConductivityL = [0, 0, 2, 2, 2, 2];

    /// <summary>Viscosity [μPa·s] at a molar density [mol/L].</summary>
    public static double ViscosityMicropascalSeconds(double kelvins, double molesPerLitre)
        => DiluteViscosity(kelvins)
            + Residual(kelvins, molesPerLitre, ViscosityN, ViscosityT, ViscosityD, ViscosityL);

    /// <summary>Conductivity [mW/(m·K)] at a molar density [mol/L].</summary>
    public static double ConductivityMilliwattsPerMetreKelvin(double kelvins, double molesPerLitre)
    {
        double tau = CriticalKelvins / kelvins;
        double dilute = (1.308 * DiluteViscosity(kelvins)) + (1.405 * Math.Pow(tau, -1.1)) - (1.036 * Math.Pow(tau, -0.3));
        return dilute + Residual(kelvins, molesPerLitre, ConductivityN, ConductivityT, ConductivityD, ConductivityL);
    }

    /// <summary>Molar heat capacity at constant pressure, ideal gas [J/(mol·K)].</summary>
    public static double MolarHeatCapacity(double kelvins)
    {
        const double molarGasConstant = 8.31451;
        double u = 3364.011 / kelvins, v = 2242.45 / kelvins, w = 11580.4 / kelvins;
        double reduced = 3.490888032 + (kelvins * (2.395525583e-6 + (kelvins * (7.172111248e-9 - (kelvins * 3.115413101e-13)))))
            + (0.223806688 * Math.Pow(kelvins, -1.5))
            + (0.791309509 * IdealGas.Einstein(u))
            + (0.212236768 * IdealGas.Einstein(v))
            + (0.197938904 * (2.0 / 3) * w * w * Math.Exp(-w) / Math.Pow(((2.0 / 3) * Math.Exp(-w)) + 1, 2));
        return molarGasConstant * reduced;
    }

    private static double DiluteViscosity(double kelvins)
    {
        const double molarMassGrams = 28.9586, sizeNanometres = 0.360, energyKelvins = 103.3;
        double reduced = Math.Log(kelvins / energyKelvins);
        double exponent = 0;
        for (int i = Collision.Length - 1; i >= 0; i--)
        {
            exponent = (exponent * reduced) + Collision[i];
        }

        return 0.0266958 * Math.Sqrt(molarMassGrams * kelvins) / (sizeNanometres * sizeNanometres * Math.Exp(exponent));
    }

    private static double Residual(double kelvins, double molesPerLitre, double[] n, double[] t, int[] d, int[] l)
    {
        double tau = CriticalKelvins / kelvins, delta = molesPerLitre / CriticalMolesPerLitre, sum = 0;
        for (int i = 0; i < n.Length; i++)
        {
            double damping = l[i] == 0 ? 1 : Math.Exp(-Math.Pow(delta, l[i]));
            sum += n[i] * Math.Pow(tau, t[i]) * Math.Pow(delta, d[i]) * damping;
        }

        return sum;
    }
}
