using System;
using Convection.Correlations.Air;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Catalogue;

/// <summary>The surface and air for which a plot is drawn.</summary>
internal static class StandardCase
{
    /// <summary>Air of Cengel's table A-15 at 30 °C (quoted), the property set of the worked values.</summary>
    public static AirProperties Air { get; } = MakeAir();

    public static SurfaceContext Wall { get; } = new("wall 4 m × 2.5 m", SurfaceKind.Wall, 4, 2.5);

    public static SurfaceContext Square { get; } = new("floor or ceiling 4 m × 4 m", SurfaceKind.Floor, 4, 4);

    public static LawBinding Binding(Correlation c) => new(SurfaceOf(c), Air, 34.4);

    public static SurfaceContext SurfaceOf(Correlation c)
    {
        if ((c.Applies.Surfaces & SurfaceSet.Wall) != 0)
        {
            return Wall;
        }

        foreach (RangeLimit limit in c.Range.Limits)
        {
            if (limit.Variable == RangeVariable.FlowTilt)
            {
                double tilt = 0.5 * (limit.Tested.Lowest + limit.Tested.Highest);
                return new SurfaceContext("surface 4 m × 1.5 m, tilt to the heat flow " + InvariantText.Number(tilt, "°"), SurfaceKind.Window, 4, 1.5) { TiltDegrees = tilt };
            }
        }

        return (c.Applies.Surfaces & SurfaceSet.Window) != 0 ? new SurfaceContext("window 2 m × 1.5 m", SurfaceKind.Window, 2, 1.5)
            : c.Applies.Surfaces == SurfaceSet.Inclined ? new SurfaceContext("surface 4 m × 2.5 m at 45°", SurfaceKind.Wall, 4, 2.5) { TiltDegrees = 45 }
            : Square;
    }

    /// <summary>How far a plot runs over a driving variable.</summary>
    public static double Highest(DrivingVariable variable) => variable switch
    {
        DrivingVariable.AirChangeRate => 30,
        DrivingVariable.JetMomentum => 0.04,
        DrivingVariable.FlowPerLength => 250,
        DrivingVariable.Speed => 6,
        DrivingVariable.PartRatio => 3,
        _ => 15,
    };

    public static string AxisTitle(DrivingVariable variable) => variable switch
    {
        DrivingVariable.AirChangeRate => "supply air changes ACH [1/h]",
        DrivingVariable.JetMomentum => "jet momentum number J [-]",
        DrivingVariable.FlowPerLength => "supply flow per façade length [m³/(h·m)]",
        DrivingVariable.Speed => "speed along the surface U [m/s]",
        DrivingVariable.PartRatio => "forced part over buoyant part h_f/h_n [-]",
        _ => "temperature difference |ΔT| [K]",
    };

    /// <summary>Property fits usually paired with ISO 15099 (recalled, high), at a quarter of the way from room to a cooler pane.</summary>
    public static AirProperties Iso15099(double roomCelsius, double difference)
    {
        double kelvins = roomCelsius + 273.15 - (0.25 * difference);
        return AirProperties.FromValues(
            101_325 * 28.97 / (8314.47 * kelvins),
            3.7230e-6 + (4.940e-8 * kelvins),
            2.8733e-3 + (7.760e-5 * kelvins),
            1002.737 + (0.012324 * kelvins),
            1 / kelvins);
    }

    private static AirProperties MakeAir()
    {
        const double Density = 1.164, Kinematic = 1.608e-5, Conductivity = 0.02588, Prandtl = 0.7282;
        double viscosity = Kinematic * Density;
        return AirProperties.FromValues(Density, viscosity, Conductivity, Prandtl * Conductivity / viscosity, 1 / 303.15);
    }
}
