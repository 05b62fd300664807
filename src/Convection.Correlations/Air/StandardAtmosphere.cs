using System;

namespace Convection.Correlations.Air;

/// <summary>Pressure at height, ISO 2533:1975 (lowest layer).</summary>
public static class StandardAtmosphere
{
    // ISO 2533:1975: 288.15 K at sea level, lapse rate 6.5 K per geopotential kilometre, R = 287.05287 J/(kg·K),
    // g = 9.80665 m/s². Geometric and geopotential height differ by less than 0.1 % here and are not told apart.
    private const double SeaLevelKelvins = 288.15;
    private const double LapseKelvinsPerMetre = 0.0065;
    private const double GravityOverGasConstantAndLapse = 9.80665 / (287.05287 * LapseKelvinsPerMetre);

    /// <summary>Pressure of the standard atmosphere at a height above sea level [Pa].</summary>
    /// <param name="altitudeMetres">Height above sea level [m], −1000 to 5500.</param>
    /// <returns>The pressure [Pa].</returns>
    /// <exception cref="ArgumentOutOfRangeException">The height is outside its interval or not a number.</exception>
    public static double Pascals(double altitudeMetres)
    {
        Require.Within(altitudeMetres, -1000, 5500, "Height above sea level", "m", nameof(altitudeMetres));
        return AirState.StandardPascals
            * Math.Pow(1 - (LapseKelvinsPerMetre * altitudeMetres / SeaLevelKelvins), GravityOverGasConstantAndLapse);
    }
}
