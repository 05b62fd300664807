using System;
using System.Collections.Generic;
using Convection.Correlations.Air;
using Convection.Correlations.Laws;
using Convection.Correlations.Literature;
using Convection.Correlations.Registry;
using Convection.Correlations.Surfaces;
using Xunit;

namespace Convection.Correlations.Tests.Laws;

public class LawTests
{
    private static readonly AirProperties Air = new AirState(22).Properties;
    private static readonly LawBinding Wall = new(new SurfaceContext("wall", SurfaceKind.Wall, 4, 2.5), Air);

    public static TheoryData<string> Ids()
    {
        var ids = new TheoryData<string>();
        foreach (Correlation c in PublishedLiterature.Registry.All)
        {
            ids.Add(c.Id.ToString());
        }

        return ids;
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void Sensitivity_EveryShippedLaw_IsTheCentralDifference(string id)
    {
        BoundLaw law = PublishedLiterature.Registry[id].Bind(Wall);
        foreach (double x in new[] { 0.01, 0.3, 1, 4, 11, 40 })
        {
            // A rule of opposing parts has a kink where both are equal.
            if (x == 1 && PublishedLiterature.Registry[id].Law is MixingLaw { IsOpposing: true })
            {
                continue;
            }

            LawValue value = law.Evaluate(x);
            double step = 1e-6 * x;
            double slope = (law.Evaluate(x + step).Coefficient - law.Evaluate(x - step).Coefficient) / (2 * step);
            Assert.Equal(x * slope, value.Sensitivity, 1e-6 * (1 + Math.Abs(value.Sensitivity)));
        }
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void Value_ImpossibleDriving_IsNotANumber(string id)
    {
        BoundLaw law = PublishedLiterature.Registry[id].Bind(Wall);
        foreach (double x in new[] { -1, double.NaN, double.PositiveInfinity })
        {
            Assert.True(double.IsNaN(law.Evaluate(x).Coefficient) && double.IsNaN(law.Evaluate(x).Sensitivity));
        }

        Assert.True(double.IsFinite(law.Evaluate(0).Coefficient + law.Evaluate(0).Sensitivity));
    }

    [Theory]
    [InlineData("alamdari-hammond-1983/horizontal-stable", "h = 0.6·|ΔT|^0.2·Dh^(-0.4)")]
    [InlineData("fisher-1995/ceiling-diffuser-wall", "h = -0.199 + 0.19·ACH^0.8")]
    [InlineData("pohlhausen-1921/plate-laminar", "Nu = 0.664·Re^0.5·Pr^(1/3)")]
    [InlineData("iso-6946-2017/wall", "h = 2.5")]
    public void Formula_IsWrittenAsAnEngineerWould(string id, string expected)
        => Assert.Equal(expected, EveryCulture.Of(() => PublishedLiterature.Registry[id].Law.Formula));

    // Shapes of laws that the registry will hold later, worked by hand from their printed forms: S. Fohanno, G. Polidori, Energy and
    // Buildings 38(5), 548-553, 2006, turbulent branch 1.235·exp(0.0467·H)·ΔT^0.316 at 5 K and 2.5 m; McAdams' end-points with cosine
    // interpolation over tilt, 9.482·ΔT^(1/3)/(7.238 − |cos θ|) at 5 K and 45°.
    [Fact]
    public void OddShapes_OfTheLiterature_FitTheAlgebra()
    {
        var turbulent = new PowerLaw(new PowerTerm(1.235, 0.316, factor: b => Math.Exp(0.0467 * b.Surface.HeightMetres), factorText: "exp(0.0467·H)"));
        Assert.Equal(2.30805, turbulent.Bind(Wall).Evaluate(5).Coefficient, 6e-6);

        var tilted = new PowerLaw(new PowerTerm(9.482, 1.0 / 3, factor: b => 1 / (7.238 - Math.Abs(Math.Cos(b.Surface.TiltDegrees * Math.PI / 180))), factorText: "1/(7.238 − |cos θ|)"));
        var slope = new LawBinding(new SurfaceContext("slope", SurfaceKind.Floor, 4, 3) { TiltDegrees = 45 }, Air);
        Assert.Equal(2.48266, tilted.Bind(slope).Evaluate(5).Coefficient, 6e-6);

        var code = new CodeLaw(DrivingVariable.TemperatureDifference, "h = ln(1 + ΔT)", _ => x => new LawValue(Math.Log(1 + x), x / (1 + x)));
        Assert.Equal(Math.Log(6), code.Bind(Wall).Evaluate(5).Coefficient, 1e-12);
        Assert.True(double.IsNaN(code.Bind(Wall).Evaluate(-1).Coefficient));
    }

    [Fact]
    public void Piecewise_OverModifiedRayleigh_SwitchesWhereTheFluxSays()
    {
        // Fohanno & Polidori (2006): the branches change at a modified Rayleigh number of 6.3e9.
        var law = new PiecewiseLaw(
            SwitchVariable.ModifiedRayleigh,
            CharacteristicLength.Height,
            [
                new PowerLaw(1.332, 0.25, CharacteristicLength.Height, -0.25),
                new PowerLaw(new PowerTerm(1.235, 0.316, factor: b => Math.Exp(0.0467 * b.Surface.HeightMetres), factorText: "exp(0.0467·H)")),
            ],
            [_ => 6.3e9]);
        var low = new LawBinding(new SurfaceContext("low wall", SurfaceKind.Wall, 2, 0.5), Air);
        LawJoint joint = Assert.Single(law.JointsIn(low));
        double flux = joint.Below * joint.At;
        double modified = LawBinding.Gravity * Air.ExpansionPerKelvin * flux * Math.Pow(0.5, 4) * Air.Prandtl
            / (Air.ConductivityWattsPerMetreKelvin * Air.KinematicViscositySquareMetresPerSecond * Air.KinematicViscositySquareMetresPerSecond);
        Assert.Equal(6.3e9, modified, 1e3);

        // The source's own step there is −7 % at 0.5 m (worked apart from this code, one digit).
        Assert.Equal(-0.07, joint.RelativeJump, 0.005);
        BoundLaw bound = law.Bind(low);
        Assert.Equal(joint.Below, bound.Evaluate(joint.At * 0.979).Coefficient, 0.01 * joint.Below);
        Assert.Equal(joint.Above, bound.Evaluate(joint.At * 1.021).Coefficient, 0.01 * joint.Above);
        double before = bound.Evaluate(joint.At * 0.97).Coefficient;
        for (double x = 0.97; x < 1.03; x += 1e-5)
        {
            double here = bound.Evaluate(joint.At * x).Coefficient;
            Assert.InRange(Math.Abs(here - before), 0, 2e-4);
            before = here;
        }
    }

    [Fact]
    public void Piecewise_CloseJoints_StayContinuous()
    {
        var law = new PiecewiseLaw(
            SwitchVariable.Driving, CharacteristicLength.None, [new PowerLaw(1, 0.1), new PowerLaw(2, 0.1), new PowerLaw(3, 0.1), new PowerLaw(2, 0.1)], [_ => 1, _ => 1.01, _ => 5]);
        BoundLaw bound = law.Bind(Wall);
        double before = bound.Evaluate(0.9).Coefficient;
        for (double x = 0.9; x < 6; x += 1e-5)
        {
            double here = bound.Evaluate(x).Coefficient;
            Assert.InRange(Math.Abs(here - before), 0, 0.02);
            before = here;
        }

        Assert.Equal(3, law.JointsIn(Wall).Count);
        Assert.Contains("1", law.Formula, StringComparison.Ordinal);
    }

    [Fact]
    public void Construction_OfImpossibleLaws_IsRefused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new PowerLaw(double.NaN, 0.3));
        Assert.Throws<ArgumentOutOfRangeException>(() => new PowerLaw(1, -0.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new FlowLaw(DrivingVariable.AirChangeRate, 0, 1, 3));
        Assert.Throws<ArgumentException>(() => new FlowLaw(DrivingVariable.TemperatureDifference, 0, 1, 0.8));
        Assert.Throws<ArgumentException>(() => new TwoAsymptoteLaw(new PowerTerm(1, 0.3), new RayleighTerm(1, 0.3, CharacteristicLength.Height), 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new TwoAsymptoteLaw(new PowerTerm(1, 0.3), new PowerTerm(1, 0.2), 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new LawBinding(Wall.Surface, default));
        Assert.Throws<ArgumentNullException>(() => new LawBinding(null!, Air));
        Assert.Throws<ArgumentOutOfRangeException>(() => new BlendRule { AssistingExponent = 0.5 });
        Assert.Throws<ArgumentOutOfRangeException>(() => new BlendRule { OpposingExponent = 1 });
        Assert.Throws<ArgumentOutOfRangeException>(() => new BlendRule { TransverseExponent = double.NaN });
        Assert.Throws<ArgumentOutOfRangeException>(() => new BlendRule { OpposingFloor = 0 });
        Assert.Throws<ArgumentOutOfRangeException>(() => AirProperties.FromValues(0, 1e-5, 0.026, 1006, 0.003));
        Assert.Throws<ArgumentNullException>(() => new CodeLaw(DrivingVariable.Speed, null!, _ => x => default));
    }

    [Fact]
    public void Length_EachKind_IsTheSurfacesOwn()
    {
        SurfaceContext s = new("s", SurfaceKind.Floor, 5, 4);
        var binding = new LawBinding(s, Air, 64);
        Assert.Equal(
            [1, 4, s.HydraulicDiameterMetres, s.AreaToPerimeterMetres, 4, 2, 4, 4.5],
            Array.ConvertAll(Enum.GetValues<CharacteristicLength>(), l => Math.Round(binding.Metres(l), 12)), new Near());
    }

    private sealed class Near : IEqualityComparer<double>
    {
        public bool Equals(double x, double y) => Math.Abs(x - y) < 1e-9;

        public int GetHashCode(double obj) => 0;
    }
}
