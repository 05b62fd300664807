using System;
using System.Collections.Generic;
using System.Linq;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Rooms;
using Convection.Correlations.Selection;
using Convection.Correlations.Surfaces;
using Xunit;

namespace Convection.Correlations.Tests.Selection;

/// <summary>Every tilt selects; where the coefficient steps with tilt, the steps are these and no others.</summary>
public class TiltTests
{
    [Theory]
    [InlineData(SurfaceKind.Wall)]
    [InlineData(SurfaceKind.Window)]
    public void EveryTilt_HasALawForBothSidesAndNoGap(SurfaceKind kind)
    {
        for (double tilt = 0; tilt <= 180; tilt += 0.5)
        {
            SurfaceSelection selection = RoomSelection.Choose(new RoomContext("r", 40, [Surface(kind, tilt)])).Surfaces[0];
            Assert.Empty(selection.Gaps);
            Assert.All(selection.Parts.SelectMany(p => p.Chosen), c => Assert.Empty(c.Violations));
        }
    }

    // The steps are a property of the published forms: measured here for 5 K on 4 m × 2.5 m and listed in the guide, not known from
    // elsewhere. Those of ISO 15099 where its bands meet are stated as −3 to 0 % at 15° and +13 to −17 % at 179° for Ra 1e8 to 5e10.
    [Theory]
    [InlineData(SurfaceKind.Wall, 25, new[] { 5.0, 85, 95, 175 }, new[] { -7.3, -2.2, -5.0, -59.4 })]
    [InlineData(SurfaceKind.Wall, 15, new[] { 5.0, 85, 95, 175 }, new[] { 146.5, 5.2, 2.3, 7.9 })]
    [InlineData(SurfaceKind.Window, 25, new[] { 15.0, 179 }, new[] { -0.8, -8.8 })]
    [InlineData(SurfaceKind.Window, 15, new[] { 1.0, 165 }, new[] { 9.6, 0.8 })]
    public void Coefficient_OverTilt_StepsWhereTheGuideSaysAndNowhereElse(SurfaceKind kind, double surfaceCelsius, double[] tilts, double[] percent)
    {
        double Coefficient(double tilt)
            => SurfaceConvection.Bind(Surface(kind, tilt), null, 40).Evaluate(surfaceCelsius, 20, DeviceState.Off).CoefficientWattsPerSquareMetreKelvin;

        var steps = new List<(double Tilt, double Percent)>();
        for (int i = 0; i < 360; i++)
        {
            (double low, double high) = (i / 2.0, (i + 1) / 2.0);
            if (Math.Abs((Coefficient(high) / Coefficient(low)) - 1) < 0.003)
            {
                continue;
            }

            for (int n = 0; n < 30; n++)
            {
                double middle = 0.5 * (low + high);
                (low, high) = Math.Abs(Coefficient(middle) - Coefficient(low)) > Math.Abs(Coefficient(high) - Coefficient(middle)) ? (low, middle) : (middle, high);
            }

            double step = 100 * ((Coefficient(high) / Coefficient(low)) - 1);
            if (Math.Abs(step) > 0.01)
            {
                steps.Add((low, step));
            }
        }

        Assert.Equal(tilts, steps.Select(s => Math.Round(s.Tilt, 3)));
        Assert.All(steps.Zip(percent), s => Assert.Equal(s.Second, s.First.Percent, 0.06));
    }

    private static SurfaceContext Surface(SurfaceKind kind, double tilt) => new("surface", kind, 4, 2.5) { TiltDegrees = tilt };
}
