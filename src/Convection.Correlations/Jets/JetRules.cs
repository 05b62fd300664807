using System;
using System.Collections.Generic;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Jets;

/// <summary>From a terminal to the speed near a surface, and whether a cool jet stays at the ceiling. Flow rules, not coefficients.</summary>
public static class JetRules
{
    /// <summary>The rules with their evidence.</summary>
    public static IReadOnlyList<JetRule> All { get; } =
    [
        new("speed of a round or radial jet", "U_x = K·U0·√A0/x", "general form of jets; K is the terminal's own", TextCheck.RecalledHigh, "K is product data: about 1 for radial ceiling jets, 4 to 7 for grilles (recalled, low)."),
        new("speed of a plane wall jet", "U_x = 3.5·U0·√(b/x)", "N. Rajaratnam (recalled)", TextCheck.RecalledHigh, "Beyond the core of the jet only; speed never above that at the terminal."),
        new("Archimedes number", "Ar = g·β·|ΔT0|·b/U0²", "definition", TextCheck.RecalledHigh, "Sources define it in several ways."),
        new("separation of a cool plane ceiling jet", "x_s = 3.6·b/Ar^0.64", "Stability analysis of the mechanism of jet attachment to walls, International Journal of Heat and Mass Transfer 45(13), 2769-2775, 2002", TextCheck.Quoted, "Quoted from the abstract; how the paper defines Ar is not known."),
    ];

    /// <summary>Speed of a round or radial jet at a distance [m/s].</summary>
    /// <param name="decayConstant">K [-], in (0, 20].</param>
    /// <param name="dischargeMetresPerSecond">Mean speed at the terminal U0 [m/s], 0 to 100.</param>
    /// <param name="openingSquareMetres">Effective area A0 [m²], in (0, 100].</param>
    /// <param name="distanceMetres">Distance x [m], in (0, 100].</param>
    /// <returns>Largest speed in the jet there, at most U0.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval.</exception>
    public static double RoundJetSpeed(double decayConstant, double dischargeMetresPerSecond, double openingSquareMetres, double distanceMetres)
    {
        double discharge = Discharge(dischargeMetresPerSecond);
        double ratio = Require.Positive(decayConstant, 20, "Decay constant", string.Empty, nameof(decayConstant))
            * Math.Sqrt(Require.Positive(openingSquareMetres, 100, "Opening", "m²", nameof(openingSquareMetres)))
            / Require.Positive(distanceMetres, 100, "Distance", "m", nameof(distanceMetres));
        return discharge * Math.Min(1, ratio);
    }

    /// <summary>Speed of a plane wall jet at a distance [m/s].</summary>
    /// <param name="dischargeMetresPerSecond">Mean speed at the slot U0 [m/s], 0 to 100.</param>
    /// <param name="slotHeightMetres">Slot height b [m], in (0, 1].</param>
    /// <param name="distanceMetres">Distance x [m], in (0, 100].</param>
    /// <returns>Largest speed in the jet there, at most U0.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval.</exception>
    public static double PlaneWallJetSpeed(double dischargeMetresPerSecond, double slotHeightMetres, double distanceMetres)
    {
        double discharge = Discharge(dischargeMetresPerSecond);
        double ratio = Require.Positive(slotHeightMetres, 1, "Slot height", "m", nameof(slotHeightMetres)) / Require.Positive(distanceMetres, 100, "Distance", "m", nameof(distanceMetres));
        return discharge * Math.Min(1, 3.5 * Math.Sqrt(ratio));
    }

    /// <summary>Archimedes number of a supply jet [-], of the size of the temperature difference.</summary>
    /// <param name="differenceKelvins">Supply less room temperature [K], −100 to 100.</param>
    /// <param name="slotHeightMetres">Slot height b [m], in (0, 1].</param>
    /// <param name="dischargeMetresPerSecond">Mean speed at the slot U0 [m/s], in (0, 100].</param>
    /// <param name="roomCelsius">Room temperature [°C], −40 to 100, for β = 1/T.</param>
    /// <returns>Ar.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval.</exception>
    public static double Archimedes(double differenceKelvins, double slotHeightMetres, double dischargeMetresPerSecond, double roomCelsius)
    {
        double difference = Math.Abs(Require.Within(differenceKelvins, -100, 100, "Temperature difference", "K", nameof(differenceKelvins)));
        double speed = Require.Positive(dischargeMetresPerSecond, 100, "Discharge speed", "m/s", nameof(dischargeMetresPerSecond));
        double kelvins = Require.Within(roomCelsius, -40, 100, "Room temperature", "°C", nameof(roomCelsius)) + 273.15;
        return LawBinding.Gravity * difference * Require.Positive(slotHeightMetres, 1, "Slot height", "m", nameof(slotHeightMetres)) / (kelvins * speed * speed);
    }

    /// <summary>Distance at which a cool plane jet leaves the ceiling [m].</summary>
    /// <param name="archimedes">Archimedes number [-], 0 or more.</param>
    /// <param name="slotHeightMetres">Slot height b [m], in (0, 1].</param>
    /// <returns>The distance; infinity without temperature difference.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A number is outside its interval.</exception>
    public static double SeparationMetres(double archimedes, double slotHeightMetres)
        => 3.6 * Require.Positive(slotHeightMetres, 1, "Slot height", "m", nameof(slotHeightMetres))
            / Math.Pow(Require.Within(archimedes, 0, 1e6, "Archimedes number", string.Empty, nameof(archimedes)), 0.64);

    private static double Discharge(double metresPerSecond) => Require.Within(metresPerSecond, 0, 100, "Discharge speed", "m/s", nameof(metresPerSecond));
}
