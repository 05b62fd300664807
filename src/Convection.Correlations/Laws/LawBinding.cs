using System;
using Convection.Correlations.Air;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Laws;

/// <summary>All that a law needs to become numbers: lengths, tilt, room volume, and the air.</summary>
/// <remarks>Immutable and safe to share between threads.</remarks>
public sealed class LawBinding
{
    /// <summary>Standard gravity used in Rayleigh and Grashof numbers [m/s²].</summary>
    public const double Gravity = 9.81;

    /// <summary>Binds to a surface and its air.</summary>
    /// <param name="surface">The surface.</param>
    /// <param name="air">Properties at film temperature.</param>
    /// <param name="roomVolumeCubicMetres">Volume of the room [m³], in (0, 1 000 000]; only room-scale laws use it.</param>
    /// <param name="laboratoryAir">
    /// Air that dimensional formulas embed: each such formula is then scaled by its own property group. Null leaves dimensional
    /// formulas as printed.
    /// </param>
    /// <param name="isWarmer">True (the default) where the surface is warmer than the air; only laws for tilted surfaces ask.</param>
    /// <exception cref="ArgumentNullException">The surface is null.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The volume is outside its interval, or the air is no air.</exception>
    public LawBinding(SurfaceContext surface, AirProperties air, double roomVolumeCubicMetres = 50, AirProperties? laboratoryAir = null, bool isWarmer = true)
    {
        Surface = Require.NotNull(surface, nameof(surface));
        Require.Positive(air.DensityKilogramsPerCubicMetre, 100, "Density of the air", "kg/m³", nameof(air));
        Air = air;
        RoomVolumeCubicMetres = Require.Positive(roomVolumeCubicMetres, 1e6, "Room volume", "m³", nameof(roomVolumeCubicMetres));
        LaboratoryAir = laboratoryAir;
        IsWarmer = isWarmer;
    }

    /// <summary>The surface.</summary>
    public SurfaceContext Surface { get; }

    /// <summary>Properties of the air at film temperature.</summary>
    public AirProperties Air { get; }

    /// <summary>Volume of the room [m³].</summary>
    public double RoomVolumeCubicMetres { get; }

    /// <summary>Air in which dimensional formulas were measured; null where they are taken as printed.</summary>
    public AirProperties? LaboratoryAir { get; }

    /// <summary>True where the surface is warmer than the air.</summary>
    public bool IsWarmer { get; }

    /// <summary>
    /// Tilt to the heat flow [°], 0 to 180: 0 where warm air rises freely (warm floor, cool ceiling), 90 upright, 180 where it is
    /// held under or over the surface (warm ceiling, cool floor).
    /// </summary>
    public double FlowTiltDegrees => IsWarmer ? Surface.TiltDegrees : 180 - Surface.TiltDegrees;

    /// <summary>Value of a characteristic length [m].</summary>
    /// <param name="length">Which length.</param>
    /// <returns>The length [m]; 1 for <see cref="CharacteristicLength.None"/>, so that it drops out of products.</returns>
    public double Metres(CharacteristicLength length) => length switch
    {
        CharacteristicLength.Height => Surface.HeightMetres,
        CharacteristicLength.HydraulicDiameter => Surface.HydraulicDiameterMetres,
        CharacteristicLength.AreaToPerimeter => Surface.AreaToPerimeterMetres,
        CharacteristicLength.AlongFlow => Surface.FlowLengthMetres,
        CharacteristicLength.HalfShortSide => 0.5 * Surface.ShortSideMetres,
        CharacteristicLength.MeanSide => 0.5 * (Surface.WidthMetres + Surface.HeightMetres),
        CharacteristicLength.RoomCubeRoot => Math.Pow(RoomVolumeCubicMetres, 1.0 / 3),
        _ => 1,
    };

    /// <summary>Grashof number per kelvin, g·β·L³/ν² [1/K].</summary>
    /// <param name="length">Length of the number.</param>
    /// <returns>The number per kelvin.</returns>
    public double GrashofPerKelvin(CharacteristicLength length)
    {
        double metres = Metres(length), viscosity = Air.KinematicViscositySquareMetresPerSecond;
        return Gravity * Air.ExpansionPerKelvin * metres * metres * metres / (viscosity * viscosity);
    }

    /// <summary>Rayleigh number per kelvin, Gr·Pr [1/K].</summary>
    /// <param name="length">Length of the number.</param>
    /// <returns>The number per kelvin.</returns>
    public double RayleighPerKelvin(CharacteristicLength length) => GrashofPerKelvin(length) * Air.Prandtl;

    /// <summary>Reynolds number per metre per second, L/ν [s/m].</summary>
    /// <param name="length">Length of the number.</param>
    /// <returns>The number per metre per second.</returns>
    public double ReynoldsPerSpeed(CharacteristicLength length) => Metres(length) / Air.KinematicViscositySquareMetresPerSecond;

    /// <summary>Factor for a dimensional buoyant term h ∝ |ΔT|ⁿ in this air: ratio of k·(g·β·ρ²·c_p/(μ·k))ⁿ.</summary>
    internal double BuoyantScale(double exponent) => Ratio(air => Conductivity(air) * Math.Pow(
        air.ExpansionPerKelvin * air.DensityKilogramsPerCubicMetre * air.DensityKilogramsPerCubicMetre * air.HeatCapacityJoulesPerKilogramKelvin
            / (air.ViscosityPascalSeconds * Conductivity(air)),
        exponent));

    /// <summary>Factor for a dimensional forced law h ∝ Xʳ in this air: ratio of k·Pr^(1/3)/νʳ.</summary>
    internal double ForcedScale(double exponent) => Ratio(air => Conductivity(air) * Math.Pow(air.Prandtl, 1.0 / 3)
        / Math.Pow(air.KinematicViscositySquareMetresPerSecond, exponent));

    private static double Conductivity(AirProperties air) => air.ConductivityWattsPerMetreKelvin;

    private double Ratio(Func<AirProperties, double> group)
        => LaboratoryAir is { } laboratory && !laboratory.Equals(Air) ? group(Air) / group(laboratory) : 1;
}
