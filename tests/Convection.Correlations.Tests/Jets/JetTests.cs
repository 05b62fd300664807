using System;
using System.Linq;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Flows;
using Convection.Correlations.Jets;
using Convection.Correlations.Rooms;
using Convection.Correlations.Selection;
using Convection.Correlations.Surfaces;
using UnitsNet;
using Xunit;

namespace Convection.Correlations.Tests.Jets;

public class JetTests
{
    // Worked apart from this code: K 5, 3 m/s, 0.05 m² at 2 m gives 1.67705 m/s; N. Rajaratnam (recalled, high), 2 m/s, 0.02 m at 2 m: 0.7 m/s.
    [Fact]
    public void Speeds_WorkedValues_Agree()
    {
        Assert.Equal(1.67705, JetRules.RoundJetSpeed(5, 3, 0.05, 2), 1e-5);
        Assert.Equal(0.7, JetRules.PlaneWallJetSpeed(2, 0.02, 2), 1e-9);
        Assert.Equal(3, JetRules.RoundJetSpeed(5, 3, 0.05, 0.1));
    }

    // Int. J. Heat Mass Transfer 45(13), 2769-2775, 2002 (abstract quoted): x_s/b = 3.6/Ar^0.64; Ar 0.001 gives 299.435; slot 0.02 m, 2 m/s,
    // 8 K at 295 K: Ar 0.00133, x_s 4.99 m (worked apart from this code).
    [Fact]
    public void Separation_WorkedValues_Agree()
    {
        Assert.Equal(299.435, JetRules.SeparationMetres(0.001, 1), 1e-3);
        double archimedes = JetRules.Archimedes(-8, 0.02, 2, 295 - 273.15);
        Assert.Equal(0.00133, archimedes, 5e-6);
        Assert.Equal(4.99, JetRules.SeparationMetres(archimedes, 0.02), 0.005);
        Assert.True(double.IsPositiveInfinity(JetRules.SeparationMetres(0, 0.02)));
    }

    [Fact]
    public void Rules_EachHasItsEvidence()
        => Assert.All(JetRules.All, r => Assert.True(r.Name.Length > 0 && r.Formula.Length > 0 && r.Source.Length > 0 && r.Doubt.Length > 0 && r.TextCheck != default));

    [Theory]
    [InlineData(-4, 4.0, true)]
    [InlineData(-14, 8.0, false)]
    [InlineData(5, 8.0, true)]
    public void Design_DecidesWhetherTheCeilingIsSwept(double difference, double reach, bool attached)
    {
        var slot = new RadialCeilingDiffuser("diffuser")
        {
            OpeningSquareMetres = 0.05,
            Terminal = new() { SlotHeightMetres = 0.02, ReachMetres = reach, DesignCubicMetresPerSecond = 0.1, DesignDifferenceKelvins = difference },
        };
        var room = new RoomContext("r", 60, [new("ceiling", SurfaceKind.Ceiling, 5, 4), new("wall", SurfaceKind.Wall, 5, 3)], [slot]);
        RoomSelection selection = RoomSelection.Choose(room);
        Assert.Equal(attached, selection.Surfaces[0].Parts.Any(p => p.Kind == PartKind.Forced));
        Assert.Equal(!attached, selection.Surfaces[0].Gaps.Any(g => g.Text.Contains("leaves the ceiling after", StringComparison.Ordinal)));
        Assert.Contains(selection.Surfaces[1].Parts, p => p.Kind == PartKind.Forced);

        RoomResult result = RoomConvection.Bind(room).Evaluate(RoomState.At(Temperature.FromDegreesCelsius(22))
            .WithSurface("ceiling", Temperature.FromDegreesCelsius(23))
            .WithSurface("wall", Temperature.FromDegreesCelsius(23))
            .WithDevice("diffuser", DeviceState.Supply(0.1, 22 + difference)));
        JetFinding finding = Assert.Single(result.Jets);
        Assert.Equal(attached, finding.IsAttached);
        Assert.Equal(2, finding.DischargeMetresPerSecond, 1e-12);
        Assert.Contains(attached ? "follows the ceiling" : "leaves the ceiling", result.ToText(), StringComparison.Ordinal);
    }

    [Fact]
    public void Judge_WithoutTerminalDataOrFlow_IsNull()
    {
        var known = new CeilingSlot("slot") { OpeningSquareMetres = 0.05, Terminal = new() { SlotHeightMetres = 0.02, ReachMetres = 4, DecayConstant = 1 } };
        Assert.NotNull(JetFinding.Judge(known, 0.1, -5, 22));
        Assert.Null(JetFinding.Judge(known, 0, -5, 22));
        Assert.Null(JetFinding.Judge(known, 0.1, double.NaN, 22));
        Assert.Null(JetFinding.Judge(new CeilingSlot("slot"), 0.1, -5, 22));
        Assert.Null(JetFinding.Judge(new Radiator("r"), 0.1, -5, 22));
        Assert.Throws<ArgumentOutOfRangeException>(() => new TerminalData { SlotHeightMetres = 0 });
        Assert.Throws<ArgumentOutOfRangeException>(() => new TerminalData { DesignDifferenceKelvins = double.NaN });
        Assert.Throws<ArgumentOutOfRangeException>(() => JetRules.Archimedes(5, 0.02, 0, 22));
    }
}
