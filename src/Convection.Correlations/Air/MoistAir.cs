using System;

namespace Convection.Correlations.Air;

/// <summary>Density and mixture rules for moist air.</summary>
/// <remarks>
/// Density: A. Picard, R.S. Davis, M. Gläser, K. Fujii, "Revised formula for the density of moist air (CIPM-2007)",
/// Metrologia 45, 149–155, 2008 (constants recalled, high; compared with the OIML R 111-1 approximation). Stated for
/// 15–27 °C and 60–110 kPa; outside that the compressibility factor still differs from 1 by less than 0.3 %.
/// Mixture: C.R. Wilke, "A viscosity equation for gas mixtures", J. Chem. Phys. 18, 517–519, 1950, for the viscosity, and
/// the same weights for the conductivity, as P.T. Tsilingiris, Energy Conversion and Management 49, 1098–1110, 2008, does.
/// </remarks>
internal static class MoistAir
{
    private const double GasConstant = 8.314472;            // J/(mol·K), the value CIPM-2007 was written with
    private const double DryMolarMass = 28.96546e-3;        // kg/mol, CIPM-2007 at 400 ppm carbon dioxide
    private const double VapourMolarMass = 18.01528e-3;     // kg/mol

    public static AirProperties At(AirState state)
    {
        double kelvins = Require.Within(
            state.Kelvins, AirState.LowestCelsius + 273.15, AirState.HighestCelsius + 273.15, "Air temperature", "K", nameof(state));
        double x = state.VapourMoleFraction;
        double density = Density(state.Celsius, kelvins, state.Pascals, x);
        double dryMolesPerLitre = (1 - x) * state.Pascals / (GasConstant * kelvins) / 1000;

        double dryViscosity = DryAir.ViscosityMicropascalSeconds(kelvins, dryMolesPerLitre) * 1e-6;
        double dryConductivity = DryAir.ConductivityMilliwattsPerMetreKelvin(kelvins, dryMolesPerLitre) * 1e-3;
        double viscosity = dryViscosity, conductivity = dryConductivity;
        if (x > 0)
        {
            double vapourViscosity = WaterVapour.ViscosityPascalSeconds(kelvins);
            double vapourConductivity = WaterVapour.ConductivityWattsPerMetreKelvin(kelvins);
            double dryWithVapour = Wilke(dryViscosity, vapourViscosity, DryMolarMass, VapourMolarMass);
            double vapourWithDry = Wilke(vapourViscosity, dryViscosity, VapourMolarMass, DryMolarMass);
            double dryWeight = (1 - x) / ((1 - x) + (x * dryWithVapour));
            double vapourWeight = x / (x + ((1 - x) * vapourWithDry));
            viscosity = (dryWeight * dryViscosity) + (vapourWeight * vapourViscosity);
            conductivity = (dryWeight * dryConductivity) + (vapourWeight * vapourConductivity);
        }

        double molarMass = ((1 - x) * DryMolarMass) + (x * VapourMolarMass);
        double molarHeatCapacity = ((1 - x) * DryAir.MolarHeatCapacity(kelvins)) + (x * WaterVapour.MolarHeatCapacity(kelvins));
        return new AirProperties(density, viscosity, conductivity, molarHeatCapacity / molarMass, 1 / kelvins);
    }

    private static double Density(double celsius, double kelvins, double pascals, double vapour)
    {
        const double a0 = 1.58123e-6, a1 = -2.9331e-8, a2 = 1.1043e-10;
        const double b0 = 5.707e-6, b1 = -2.051e-8, c0 = 1.9898e-4, c1 = -2.376e-6;
        const double d = 1.83e-11, e = -0.765e-8;

        // CIPM-2007's enhancement factor: real air at saturation holds a little more vapour than pure vapour would.
        double enhancement = 1.00062 + (3.14e-8 * pascals) + (5.6e-7 * celsius * celsius);
        double x = vapour * enhancement;
        double ratio = pascals / kelvins;
        double compressibility = 1
            - (ratio * (a0 + (celsius * (a1 + (a2 * celsius))) + ((b0 + (b1 * celsius)) * x) + ((c0 + (c1 * celsius)) * x * x)))
            + (ratio * ratio * (d + (e * x * x)));
        return pascals * DryMolarMass / (compressibility * GasConstant * kelvins) * (1 - (x * (1 - (VapourMolarMass / DryMolarMass))));
    }

    private static double Wilke(double viscosity, double other, double mass, double otherMass)
    {
        double root = 1 + (Math.Sqrt(viscosity / other) * Math.Pow(otherMass / mass, 0.25));
        return root * root / Math.Sqrt(8 * (1 + (mass / otherMass)));
    }
}
