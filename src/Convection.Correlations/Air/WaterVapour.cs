using System;

namespace Convection.Correlations.Air;

/// <summary>Saturation pressure, and properties of dilute water vapour.</summary>
/// <remarks>
/// Saturation: R.W. Hyland, A. Wexler, ASHRAE Transactions 89(2A), 500–519, 1983, over water and over ice (constants quoted
/// in the pack behind this library from an instrument manual). Viscosity: IAPWS R12-08, dilute gas part. Conductivity: IAPWS
/// R15-11, dilute gas part. Heat capacity: ideal gas part of IAPWS-95 (all three recalled, high).
/// </remarks>
internal static class WaterVapour
{
    private const double CriticalKelvins = 647.096;
    private static readonly double[] ViscosityH = [1.67752, 2.20462, 0.6366564, -0.241605];
    private static readonly double[] ConductivityL = [2.443221e-3, 1.323095e-2, 6.770357e-3, -3.454586e-3, 4.096266e-4];
    private static readonly double[] EinsteinN = [0.012436, 0.97315, 1.27950, 0.96956, 0.24873];
    private static readonly double[] EinsteinGamma = [1.28728967, 3.53734222, 7.74073708, 9.24437796, 27.5075105];

    /// <summary>Saturation pressure [Pa]; over ice below 0 °C, over water from there on.</summary>
    public static double SaturationPascals(double celsius)
    {
        double t = celsius + 273.15;
        return celsius < 0
            ? Math.Exp((-5.6745359e3 / t) + 6.3925247 + (t * (-9.6778430e-3 + (t * (6.2215701e-7 + (t * (2.0747825e-9 - (t * 9.4840240e-13)))))))
                + (4.1635019 * Math.Log(t)))
            : Math.Exp((-5.8002206e3 / t) + 1.3914993 + (t * (-4.8640239e-2 + (t * (4.1764768e-5 - (t * 1.4452093e-8)))))
                + (6.5459673 * Math.Log(t)));
    }

    /// <summary>Temperature at which a vapour pressure saturates [°C]; bisection between −100 and 150 °C.</summary>
    public static double SaturationCelsius(double pascals)
    {
        if (!(pascals > 0))
        {
            return double.NegativeInfinity;
        }

        double low = -100, high = 150;
        for (int i = 0; i < 60; i++)
        {
            double middle = 0.5 * (low + high);
            if (SaturationPascals(middle) < pascals)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return 0.5 * (low + high);
    }

    public static double ViscosityPascalSeconds(double kelvins)
    {
        double reduced = kelvins / CriticalKelvins;
        return 100e-6 * Math.Sqrt(reduced) / InversePowers(ViscosityH, reduced);
    }

    public static double ConductivityWattsPerMetreKelvin(double kelvins)
    {
        double reduced = kelvins / CriticalKelvins;
        return 1e-3 * Math.Sqrt(reduced) / InversePowers(ConductivityL, reduced);
    }

    /// <summary>Molar heat capacity at constant pressure, ideal gas [J/(mol·K)].</summary>
    public static double MolarHeatCapacity(double kelvins)
    {
        double sum = 4.00632, tau = CriticalKelvins / kelvins;
        for (int i = 0; i < EinsteinN.Length; i++)
        {
            sum += EinsteinN[i] * IdealGas.Einstein(EinsteinGamma[i] * tau);
        }

        return 8.314472 * sum;
    }

    private static double InversePowers(double[] coefficients, double reduced)
    {
        double sum = 0;
        for (int i = coefficients.Length - 1; i >= 0; i--)
        {
            sum = (sum / reduced) + coefficients[i];
        }

        return sum;
    }
}
