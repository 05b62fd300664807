using System;
using UnitsNet;

namespace Convection.Correlations.Air;

/// <summary>Temperature, pressure and humidity of the air.</summary>
/// <remarks>
/// Accepted: −40 °C to 100 °C, 50 kPa to 120 kPa, 0 to 100 % relative humidity, and not more vapour than half of the
/// molecules. The default value stands for no state: its temperature is absolute zero and its properties are refused.
/// </remarks>
public readonly record struct AirState
{
    /// <summary>Pressure of the standard atmosphere at sea level [Pa] (ISO 2533).</summary>
    public const double StandardPascals = 101_325;

    internal const double LowestCelsius = -40, HighestCelsius = 100, LowestPascals = 50_000, HighestPascals = 120_000;
    private const double ZeroCelsius = 273.15;

    /// <summary>The air that dimensional formulas are taken to embed: dry, at sea level, 22 °C.</summary>
    internal static AirState OfLaboratories { get; } = new(22);

    private readonly double kelvins;

    /// <summary>Air of a given temperature, pressure and humidity.</summary>
    /// <param name="celsius">Temperature [°C], −40 to 100.</param>
    /// <param name="pascals">Absolute pressure [Pa], 50 000 to 120 000.</param>
    /// <param name="relativeHumidity">Relative humidity [-], 0 to 1; over ice below 0 °C.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its interval or not a number.</exception>
    public AirState(double celsius, double pascals = StandardPascals, double relativeHumidity = 0)
    {
        kelvins = Require.Within(celsius, LowestCelsius, HighestCelsius, "Air temperature", "°C", nameof(celsius)) + ZeroCelsius;
        Pascals = Require.Within(pascals, LowestPascals, HighestPascals, "Air pressure", "Pa", nameof(pascals));
        RelativeHumidity = Require.Within(relativeHumidity, 0, 1, "Relative humidity", string.Empty, nameof(relativeHumidity));
        VapourMoleFraction = relativeHumidity == 0 ? 0 : relativeHumidity * WaterVapour.SaturationPascals(celsius) / pascals;
        Require.Within(VapourMoleFraction, 0, 0.5, "Mole fraction of water vapour", string.Empty, nameof(relativeHumidity));
    }

    /// <summary>Temperature [°C].</summary>
    public double Celsius => kelvins - ZeroCelsius;

    /// <summary>Absolute pressure [Pa].</summary>
    public double Pascals { get; }

    /// <summary>Relative humidity [-], 0 to 1.</summary>
    public double RelativeHumidity { get; }

    /// <summary>Share of water vapour among the molecules [-].</summary>
    public double VapourMoleFraction { get; }

    /// <summary>Temperature.</summary>
    public Temperature Temperature => Temperature.FromDegreesCelsius(Celsius);

    /// <summary>Absolute pressure.</summary>
    public Pressure Pressure => Pressure.FromPascals(Pascals);

    /// <summary>
    /// Density, viscosity, conductivity, heat capacity and expansion coefficient at this state.
    /// </summary>
    /// <remarks>
    /// Density: CIPM-2007. Viscosity and conductivity of dry air: Lemmon &amp; Jacobsen 2004; of vapour: IAPWS 2008 and 2011,
    /// dilute gas; mixed by the rule of Wilke. Heat capacity: ideal-gas parts of Lemmon et al. 2000 and of IAPWS-95;
    /// the real-gas part, 0.16 % at 300 K and 1 atm, is left out.
    /// Expansion coefficient: ideal gas, 1/T. Each file in this folder names its publication.
    /// </remarks>
    public AirProperties Properties => MoistAir.At(this);

    /// <summary>Temperature below which this air gives off water on a surface [°C].</summary>
    /// <value>Minus infinity for dry air. Over ice below 0 °C (frost point).</value>
    public double DewPointCelsius => WaterVapour.SaturationCelsius(VapourMoleFraction * Pascals);

    internal double Kelvins => kelvins;

    /// <summary>Air from quantities.</summary>
    /// <param name="temperature">Temperature, −40 °C to 100 °C.</param>
    /// <param name="pressure">Absolute pressure, 50 kPa to 120 kPa.</param>
    /// <param name="relativeHumidity">Relative humidity, 0 to 100 %.</param>
    /// <returns>The state.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its interval.</exception>
    public static AirState From(Temperature temperature, Pressure pressure, RelativeHumidity relativeHumidity)
        => new(temperature.DegreesCelsius, pressure.Pascals, relativeHumidity.Percent / 100);

    /// <summary>Air at a height above sea level, at the pressure of the standard atmosphere there.</summary>
    /// <param name="celsius">Temperature [°C], −40 to 100. Not that of the standard atmosphere: the air is indoors.</param>
    /// <param name="altitudeMetres">Height above sea level [m], −1000 to 5500.</param>
    /// <param name="relativeHumidity">Relative humidity [-], 0 to 1.</param>
    /// <returns>The state.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its interval or not a number.</exception>
    public static AirState AtAltitude(double celsius, double altitudeMetres, double relativeHumidity = 0)
        => new(celsius, StandardAtmosphere.Pascals(altitudeMetres), relativeHumidity);
}
