using UnitsNet;

namespace Convection.Correlations.Air;

/// <summary>Properties of still, dry or humid air at one state, as the correlations need them.</summary>
/// <remarks>
/// Made by <see cref="AirState.Properties"/>. The published formula behind each property is named there.
/// The default value is air of no substance: every property is zero, and no law can be bound to it.
/// </remarks>
public readonly record struct AirProperties
{
    internal AirProperties(double density, double viscosity, double conductivity, double heatCapacity, double expansion)
    {
        DensityKilogramsPerCubicMetre = density;
        ViscosityPascalSeconds = viscosity;
        ConductivityWattsPerMetreKelvin = conductivity;
        HeatCapacityJoulesPerKilogramKelvin = heatCapacity;
        ExpansionPerKelvin = expansion;
    }

    /// <summary>Density ρ [kg/m³].</summary>
    public double DensityKilogramsPerCubicMetre { get; }

    /// <summary>Dynamic viscosity μ [Pa·s].</summary>
    public double ViscosityPascalSeconds { get; }

    /// <summary>Thermal conductivity k [W/(m·K)].</summary>
    public double ConductivityWattsPerMetreKelvin { get; }

    /// <summary>Specific heat capacity at constant pressure c_p, per kilogram of moist air [J/(kg·K)].</summary>
    public double HeatCapacityJoulesPerKilogramKelvin { get; }

    /// <summary>Thermal expansion coefficient β [1/K].</summary>
    public double ExpansionPerKelvin { get; }

    /// <summary>Kinematic viscosity ν = μ/ρ [m²/s].</summary>
    public double KinematicViscositySquareMetresPerSecond => ViscosityPascalSeconds / DensityKilogramsPerCubicMetre;

    /// <summary>Prandtl number Pr = μ·c_p/k [-].</summary>
    public double Prandtl => ViscosityPascalSeconds * HeatCapacityJoulesPerKilogramKelvin / ConductivityWattsPerMetreKelvin;

    /// <summary>Heat capacity of a cubic metre, ρ·c_p [J/(m³·K)].</summary>
    public double VolumetricHeatCapacityJoulesPerCubicMetreKelvin => DensityKilogramsPerCubicMetre * HeatCapacityJoulesPerKilogramKelvin;

    /// <summary>Density ρ [kg/m³].</summary>
    public Density Density => Density.FromKilogramsPerCubicMeter(DensityKilogramsPerCubicMetre);

    /// <summary>Dynamic viscosity μ [Pa·s].</summary>
    public DynamicViscosity Viscosity => DynamicViscosity.FromPascalSeconds(ViscosityPascalSeconds);

    /// <summary>Thermal conductivity k [W/(m·K)].</summary>
    public ThermalConductivity Conductivity => ThermalConductivity.FromWattsPerMeterKelvin(ConductivityWattsPerMetreKelvin);

    /// <summary>Specific heat capacity c_p [J/(kg·K)].</summary>
    public SpecificEntropy HeatCapacity => SpecificEntropy.FromJoulesPerKilogramKelvin(HeatCapacityJoulesPerKilogramKelvin);

    /// <summary>Thermal expansion coefficient β [1/K].</summary>
    public CoefficientOfThermalExpansion Expansion => CoefficientOfThermalExpansion.FromPerKelvin(ExpansionPerKelvin);

    /// <summary>Kinematic viscosity ν [m²/s].</summary>
    public KinematicViscosity KinematicViscosity => KinematicViscosity.FromSquareMetersPerSecond(KinematicViscositySquareMetresPerSecond);

    /// <summary>Properties given by the caller, for instance from a textbook table.</summary>
    /// <param name="densityKilogramsPerCubicMetre">Density [kg/m³], in (0, 100].</param>
    /// <param name="viscosityPascalSeconds">Dynamic viscosity [Pa·s], in (0, 1].</param>
    /// <param name="conductivityWattsPerMetreKelvin">Thermal conductivity [W/(m·K)], in (0, 10].</param>
    /// <param name="heatCapacityJoulesPerKilogramKelvin">Specific heat capacity [J/(kg·K)], in (0, 100 000].</param>
    /// <param name="expansionPerKelvin">Expansion coefficient [1/K], in (0, 1].</param>
    /// <returns>The properties.</returns>
    /// <exception cref="System.ArgumentOutOfRangeException">A value is outside its interval or not a number.</exception>
    public static AirProperties FromValues(
        double densityKilogramsPerCubicMetre,
        double viscosityPascalSeconds,
        double conductivityWattsPerMetreKelvin,
        double heatCapacityJoulesPerKilogramKelvin,
        double expansionPerKelvin)
        => new(
            Require.Positive(densityKilogramsPerCubicMetre, 100, "Density", "kg/m³", nameof(densityKilogramsPerCubicMetre)),
            Require.Positive(viscosityPascalSeconds, 1, "Dynamic viscosity", "Pa·s", nameof(viscosityPascalSeconds)),
            Require.Positive(conductivityWattsPerMetreKelvin, 10, "Thermal conductivity", "W/(m·K)", nameof(conductivityWattsPerMetreKelvin)),
            Require.Positive(heatCapacityJoulesPerKilogramKelvin, 1e5, "Specific heat capacity", "J/(kg·K)", nameof(heatCapacityJoulesPerKilogramKelvin)),
            Require.Positive(expansionPerKelvin, 1, "Expansion coefficient", "1/K", nameof(expansionPerKelvin)));
}
