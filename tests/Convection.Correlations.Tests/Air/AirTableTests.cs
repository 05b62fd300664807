using System;
using System.Collections.Generic;
using System.Linq;
using Convection.Correlations.Air;
using Xunit;

namespace Convection.Correlations.Tests.Air;

/// <summary>Air properties against published tables; Data/air-tables.csv names the source, its standing and the reason of each tolerance.</summary>
public class AirTableTests
{
    public static TheoryData<string, string, double, double, double, double, string> Cases()
    {
        var cases = new TheoryData<string, string, double, double, double, double, string>();
        foreach (Dictionary<string, string> r in TestData.Rows("air-tables.csv"))
        {
            cases.Add(
                r["id"],
                r["property"],
                TestData.Number(r["celsius"]),
                TestData.Number(r["pascals"]),
                TestData.Number(r["humidity"]),
                TestData.Number(r["expected"]),
                r["tolerance"]);
        }

        return cases;
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Property_PublishedTable_Agrees(string id, string property, double celsius, double pascals, double humidity, double expected, string tolerance)
    {
        Assert.NotEmpty(id);
        var state = new AirState(celsius, pascals, humidity);
        AirProperties air = state.Properties;
        double actual = property switch
        {
            "density" => air.DensityKilogramsPerCubicMetre,
            "viscosity" => air.ViscosityPascalSeconds,
            "conductivity" => air.ConductivityWattsPerMetreKelvin,
            "heatCapacity" => air.HeatCapacityJoulesPerKilogramKelvin,
            "prandtl" => air.Prandtl,
            "dewPoint" => state.DewPointCelsius,
            _ => throw new ArgumentOutOfRangeException(nameof(property)),
        };
        double allowed = tolerance.StartsWith("abs:", StringComparison.Ordinal)
            ? TestData.Number(tolerance.Substring(4))
            : TestData.Number(tolerance) * expected;

        // The expected values carry four to six digits: half a unit of the last one is granted on top.
        Assert.InRange(actual, expected - (allowed * 1.0001), expected + (allowed * 1.0001));
    }

    // E.W. Lemmon, R.T Jacobsen, Int. J. Thermophysics 25, 21-69, 2004, table of check values (from memory, high).
    [Theory]
    [InlineData(100, 0, 7.09559, 9.35902)]
    [InlineData(300, 0, 18.5230, 26.3529)]
    [InlineData(300, 5, 21.3241, 32.6062)]
    public void DryAir_CheckTable_AgreesToAllDigits(double kelvins, double molesPerLitre, double micropascalSeconds, double milliwatts)
    {
        Assert.Equal(micropascalSeconds, DryAir.ViscosityMicropascalSeconds(kelvins, molesPerLitre), 5e-6 * micropascalSeconds);
        Assert.Equal(milliwatts, DryAir.ConductivityMilliwattsPerMetreKelvin(kelvins, molesPerLitre), 5e-6 * milliwatts);
    }

    // ASHRAE Handbook, Fundamentals, chapter 1 (Hyland & Wexler 1983): saturation pressure (values from memory, high).
    [Theory]
    [InlineData(-10, 259.9, 2e-4)]
    [InlineData(20, 2338.8, 1e-4)]
    [InlineData(25, 3169.2, 1e-4)]
    [InlineData(30, 4246.0, 1e-4)]
    [InlineData(40, 7383.5, 1e-4)]
    [InlineData(0.01, 611.7, 1e-3)]
    [InlineData(10, 1228.0, 1e-3)]
    public void SaturationPressure_HylandWexler_Agrees(double celsius, double pascals, double tolerance)
        => Assert.Equal(pascals, WaterVapour.SaturationPascals(celsius), tolerance * pascals);

    // ISO 2533:1975, pressure at altitude, table of five digits (quoted); 2240 m from its formula (computed). The table is by
    // geometric height, our argument likewise within the table's digits up to 3000 m.
    [Theory]
    [InlineData(0, 101_325)]
    [InlineData(500, 95_460)]
    [InlineData(1000, 89_880)]
    [InlineData(1500, 84_560)]
    [InlineData(2000, 79_500)]
    [InlineData(2500, 74_690)]
    [InlineData(3000, 70_120)]
    [InlineData(2240, 77_155)]
    public void StandardAtmosphere_Table_Agrees(double metres, double pascals)
        => Assert.Equal(pascals, AirState.AtAltitude(20, metres).Pascals, 2.5e-4 * pascals);

    // Y.A. Cengel, example 7-2 (quoted): ν at 80 °C and 83.4 kPa is 2.548e-5 m²/s, from a table whose viscosity is within 1 % of the
    // reference equation.
    [Fact]
    public void KinematicViscosity_AtReducedPressure_Agrees()
        => Assert.Equal(2.548e-5, new AirState(80, 83_400).Properties.KinematicViscositySquareMetresPerSecond, 0.01 * 2.548e-5);

    [Fact]
    public void Properties_WholeDomain_AreFiniteAndPositive()
    {
        foreach (double celsius in Enumerable.Range(-20, 81).Select(t => (double)t))
        {
            foreach (double pascals in new double[] { 60_000, 80_000, 101_325, 110_000 })
            {
                foreach (double humidity in new[] { 0, 0.5, 1.0 })
                {
                    AirProperties air = new AirState(celsius, pascals, humidity).Properties;
                    Assert.InRange(air.DensityKilogramsPerCubicMetre, 0.5, 1.6);
                    Assert.InRange(air.ViscosityPascalSeconds, 1.5e-5, 2.1e-5);
                    Assert.InRange(air.ConductivityWattsPerMetreKelvin, 0.02, 0.03);
                    Assert.InRange(air.HeatCapacityJoulesPerKilogramKelvin, 1000, 1300);
                    Assert.InRange(air.Prandtl, 0.68, 0.85);
                    Assert.Equal(1 / (celsius + 273.15), air.ExpansionPerKelvin, 1e-12);
                }
            }
        }
    }

    [Theory]
    [InlineData(double.NaN, 101_325, 0, "Air temperature NaN °C")]
    [InlineData(120, 101_325, 0, "[-40 °C, 100 °C]")]
    [InlineData(20, 1_000, 0, "Air pressure 1000 Pa")]
    [InlineData(20, double.PositiveInfinity, 0, "Air pressure infinity Pa")]
    [InlineData(20, 101_325, 1.2, "Relative humidity 1.2")]
    public void AirState_ImpossibleValue_NamesQuantityValueUnitAndInterval(double celsius, double pascals, double humidity, string expected)
        => Assert.Contains(expected, Assert.Throws<ArgumentOutOfRangeException>(() => new AirState(celsius, pascals, humidity)).Message, StringComparison.Ordinal);
}
