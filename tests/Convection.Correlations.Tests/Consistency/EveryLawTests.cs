using System;
using System.Collections.Generic;
using System.Linq;
using Convection.Correlations.Air;
using Convection.Correlations.Laws;
using Convection.Correlations.Literature;
using Convection.Correlations.Registry;
using Convection.Correlations.Surfaces;
using Xunit;

namespace Convection.Correlations.Tests.Consistency;

/// <summary>Identities that every registered law obeys. What does not is in one list, with its reason.</summary>
public class EveryLawTests
{
    private const int Points = 200;
    private static readonly AirProperties Air = new AirState(22).Properties;
    private static readonly AirProperties TableAir = Convection.Correlations.Catalogue.StandardCase.Air;

    /// <summary>The exceptions: identity and id, with the reason.</summary>
    private static readonly Dictionary<(string Identity, string Id), string> Exceptions = new()
    {
        [("rises", "churchill-1977/vertical-opposing")] = "opposing parts cancel before the larger one wins",
        [("rises", "beausoleil-morrison-2001/wall-opposing")] = "opposing parts cancel before the larger one wins",
        [("positive", "churchill-1977/vertical-opposing")] = "the rule cancels at equal parts",
        [("smooth", "churchill-1977/vertical-opposing")] = "kink where the parts are equal",
        [("smooth", "beausoleil-morrison-2001/wall-opposing")] = "kinks where the floor sets in",
    };

    public static TheoryData<string> Ids()
    {
        var ids = new TheoryData<string>();
        foreach (Correlation c in PublishedLiterature.Registry.All)
        {
            ids.Add(c.Id.ToString());
        }

        return ids;
    }

    [Fact]
    public void Exceptions_NameLawsThatExist_AndGiveAReason()
        => Assert.All(Exceptions, e => Assert.True(PublishedLiterature.Registry[e.Key.Id] is not null && e.Value.Length > 0));

    [Theory]
    [MemberData(nameof(Ids))]
    public void coefficient_is_finite_over_twice_its_domain(string id)
    {
        (BoundLaw law, double[] xs) = Domain(id);
        Assert.All(xs.Append(2 * xs[^1]).Append(0), x => Assert.True(double.IsFinite(law.Evaluate(x).Coefficient + law.Evaluate(x).Sensitivity), "x = " + x));
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void coefficient_is_positive_inside_the_tested_range(string id)
    {
        (BoundLaw law, double[] xs) = Domain(id);
        bool holds = xs.All(x => law.Evaluate(x).Coefficient > 0);
        Assert.True(holds || Exceptions.ContainsKey(("positive", id)));
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void coefficient_never_falls_with_its_driving_variable(string id)
    {
        (BoundLaw law, double[] xs) = Domain(id);
        double[] h = [.. xs.Select(x => law.Evaluate(x).Coefficient)];
        bool holds = h.Zip(h.Skip(1)).All(p => p.Second >= p.First * (1 - 1e-12));
        Assert.True(holds != Exceptions.ContainsKey(("rises", id)), "holds: " + holds);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void sensitivity_is_the_central_difference(string id)
    {
        (BoundLaw law, double[] xs) = Domain(id);
        foreach (double x in xs)
        {
            double step = 1e-6 * x, difference = (law.Evaluate(x + step).Coefficient - law.Evaluate(x - step).Coefficient) * x / (2 * step);
            LawValue value = law.Evaluate(x);
            Assert.True(Math.Abs(difference - value.Sensitivity) < 3e-6 * (value.Coefficient + Math.Abs(value.Sensitivity)) || Exceptions.ContainsKey(("smooth", id)), "x = " + x);
        }
    }

    /// <summary>
    /// Dimensional closure: a Nusselt law gives the same Nu in any system of units that leaves g unchanged (length λ, time √λ); a
    /// dimensional one gives the same flux when its constant is converted by the exponents it declares, as in inch-pound units.
    /// </summary>
    [Theory]
    [MemberData(nameof(Ids))]
    public void law_is_dimensionally_closed(string id)
    {
        Correlation c = PublishedLiterature.Registry[id];
        (BoundLaw law, double[] xs) = Domain(id);
        if (c.Law.IsDimensionless)
        {
            // Feet for metres, and the time that keeps g at 9.81 of the new units.
            const double Foot = 0.3048;
            double time = Math.Sqrt(Foot);
            SurfaceContext si = SurfaceOf(c), feet = new SurfaceContext("in feet", si.Kind, si.WidthMetres / Foot, si.HeightMetres / Foot) { TiltDegrees = si.TiltDegrees };
            double viscosity = Air.KinematicViscositySquareMetresPerSecond * time / (Foot * Foot), density = Air.DensityKilogramsPerCubicMetre;
            AirProperties converted = AirProperties.FromValues(
                density, viscosity * density, 7 * Air.ConductivityWattsPerMetreKelvin, Air.Prandtl * 7 * Air.ConductivityWattsPerMetreKelvin / (viscosity * density), Air.ExpansionPerKelvin);
            BoundLaw other = c.Bind(new LawBinding(feet, converted));
            double speed = c.Law.DrivenBy == DrivingVariable.Speed ? time / Foot : 1;
            foreach (double x in xs)
            {
                // h·L/k is the number: L shrinks by a foot, k grows by the factor taken for it.
                Assert.Equal(law.Evaluate(x).Coefficient * 7 * Foot, other.Evaluate(x * speed).Coefficient, 1e-9 * law.Evaluate(x).Coefficient);
            }
        }
        else if (c.Law is PowerLaw { Term: PowerTerm term })
        {
            // °F for K and ft for m; tilt and exp(0.0467·H) factors carry no unit of their own or one in metres, and stay outside.
            double convert = 0.17611 * Math.Pow(5.0 / 9, term.Exponent) * Math.Pow(0.3048, term.LengthExponent);
            double metres = new LawBinding(SurfaceOf(c), Air).Metres(term.Length);
            foreach (double x in xs)
            {
                double si = term.Coefficient * Math.Pow(x, term.Exponent) * Math.Pow(metres, term.LengthExponent);
                double inchPound = term.Coefficient * convert * Math.Pow(1.8 * x, term.Exponent) * Math.Pow(metres / 0.3048, term.LengthExponent);
                Assert.Equal(si, inchPound / 0.17611, 1e-9 * si);
                double outside = law.Evaluate(x).Coefficient / si;
                Assert.Equal(law.Evaluate(xs[0]).Coefficient / (term.Coefficient * Math.Pow(xs[0], term.Exponent) * Math.Pow(metres, term.LengthExponent)), outside, 1e-9 * outside);
            }
        }
        else if (c.Law is FlowLaw flow)
        {
            // The flow variable is the source's own; its power and intercept alone make the unit.
            Assert.All(xs, x => Assert.Equal(flow.Intercept + (flow.Slope * Math.Pow(x, flow.Exponent)), law.Evaluate(x).Coefficient, 1e-12 * (1 + law.Evaluate(x).Coefficient)));
        }
        else
        {
            // What is left: joins of dimensional terms (each closed by its own exponents) and rules of ratios.
            Assert.True(c.Law is TwoAsymptoteLaw { First: PowerTerm, Second: PowerTerm } or MixingLaw);
        }
    }

    // Nusselt forms that stand beside a dimensional one, and the gaps that their sources leave (worked apart from this code), with
    // the air of a textbook table at 30 °C, in which they were worked.
    [Theory]
    [InlineData("awbi-hatton-1999/wall-heated", "Gr", 0.289, 0.293, 0.033)]
    [InlineData("awbi-hatton-1999/floor-heated", "Gr", 0.269, 0.308, 0.02)]
    [InlineData("fohanno-polidori-2006/vertical-laminar", "Ra", 0.52, 0.25, 0.02)]
    [InlineData("mcadams-1954/air-vertical-laminar", "Ra", 0.59, 0.25, 0.055)]
    [InlineData("mcadams-1954/air-vertical-turbulent", "Ra", 0.10, 1.0 / 3, 0.13)]
    public void nusselt_form_equals_the_dimensional_one_within_the_stated_gap(string id, string number, double constant, double exponent, double gap)
    {
        Correlation c = PublishedLiterature.Registry[id];
        var binding = new LawBinding(new SurfaceContext("s", SurfaceKind.Wall, 2.5, 2.5), TableAir);
        CharacteristicLength length = c.Length == CharacteristicLength.None ? CharacteristicLength.Height : c.Length;
        double group = 5 * (number == "Gr" ? binding.GrashofPerKelvin(length) : binding.RayleighPerKelvin(length));
        double h = constant * Math.Pow(group, exponent) * TableAir.ConductivityWattsPerMetreKelvin / binding.Metres(length);
        double dimensional = c.Bind(binding).Evaluate(5).Coefficient;
        Assert.Equal(dimensional, h, gap * dimensional);
    }

    // The one conflict: 1.78 Gr^0.133 gives a constant of 0.545 to 0.550 where the dimensional form has 0.704; both stand in its doubts.
    [Fact]
    public void nusselt_form_of_the_heated_ceiling_is_in_conflict_as_stated()
    {
        var binding = new LawBinding(new SurfaceContext("s", SurfaceKind.Ceiling, 2.5, 2.5), TableAir);
        double nusselt = 1.78 * Math.Pow(10 * binding.GrashofPerKelvin(CharacteristicLength.HydraulicDiameter), 0.133) * TableAir.ConductivityWattsPerMetreKelvin / 2.5;
        double printed = PublishedLiterature.Registry["awbi-hatton-1999/ceiling-heated"].Bind(binding).Evaluate(10).Coefficient;
        Assert.InRange(printed / nusselt, 1.26, 1.30);
        Assert.Contains(PublishedLiterature.Registry["awbi-hatton-1999/ceiling-heated"].Doubts, d => d.Contains("0.545 to 0.550", StringComparison.Ordinal));
    }

    /// <summary>Joints inside one law do not step; those between laws of one paper step as their pages say.</summary>
    [Fact]
    public void piecewise_joints_are_measured()
    {
        var piecewise = PublishedLiterature.Registry.All.Where(c => c.Law is PiecewiseLaw).ToArray();
        Assert.Equal(2, piecewise.Length);
        foreach (Correlation c in piecewise)
        {
            for (double tilt = 16; tilt < 90; tilt += 2)
            {
                var binding = new LawBinding(new SurfaceContext("s", SurfaceKind.Window, 2, 2) { TiltDegrees = tilt }, Air);
                Assert.All(((PiecewiseLaw)c.Law).JointsIn(binding), j => Assert.InRange(Math.Abs(j.RelativeJump), 0, 1e-12));
            }
        }

        // Worked apart from this code: turbulent over laminar at the switch of Fohanno & Polidori, and of McAdams' forms at Ra 1e9.
        Assert.Equal(-0.07, StepOfFohanno(0.5), 0.006);
        Assert.Equal(0.11, StepOfFohanno(2.5), 0.006);
        Assert.Equal(-0.05, (0.10 * Math.Pow(1e9, 1.0 / 3) / (0.59 * Math.Pow(1e9, 0.25))) - 1, 0.006);
    }

    private static double StepOfFohanno(double height)
    {
        var binding = new LawBinding(new SurfaceContext("s", SurfaceKind.Wall, 4, height), Air);
        Correlation laminar = PublishedLiterature.Registry["fohanno-polidori-2006/vertical-laminar"], turbulent = PublishedLiterature.Registry["fohanno-polidori-2006/vertical-turbulent"];
        double at = laminar.Range.Bind(binding, laminar.Bind(binding)).TestedHigh;
        return (turbulent.Bind(binding).Evaluate(at).Coefficient / laminar.Bind(binding).Evaluate(at).Coefficient) - 1;
    }

    /// <summary>The tested range of a law for a surface it is made for, in its own variable; a usual span where it is open or not known.</summary>
    private static (BoundLaw Law, double[] Xs) Domain(string id)
    {
        Correlation c = PublishedLiterature.Registry[id];
        var binding = new LawBinding(SurfaceOf(c), Air);
        BoundLaw law = c.Bind(binding);
        BoundRange range = c.Range.Bind(binding, law);
        (double usualLow, double usualHigh) = law.DrivenBy switch
        {
            DrivingVariable.AirChangeRate => (3, 30),
            DrivingVariable.JetMomentum => (0.001, 0.03),
            DrivingVariable.FlowPerLength => (20, 250),
            DrivingVariable.Speed => (0.05, 5),
            DrivingVariable.PartRatio => (0.05, 5),
            _ => (0.1, 30.0),
        };
        double high = double.IsInfinity(range.TestedHigh) ? Math.Max(usualHigh, 2 * range.TestedLow) : range.TestedHigh;
        double low = double.IsInfinity(range.TestedLow) ? Math.Min(usualLow, high / 20) : Math.Max(range.TestedLow, 1e-6 * high);
        return (law, [.. Enumerable.Range(0, Points).Select(i => low * Math.Pow(high / low, (i + 0.5) / Points))]);
    }

    private static SurfaceContext SurfaceOf(Correlation c)
    {
        double? tilt = c.Range.Limits.Where(l => l.Variable == RangeVariable.FlowTilt).Select(l => (double?)(0.5 * (l.Tested.Lowest + l.Tested.Highest))).FirstOrDefault();
        return tilt is { } degrees ? new SurfaceContext("s", SurfaceKind.Window, 4, 2.5) { TiltDegrees = degrees }
            : (c.Applies.Surfaces & SurfaceSet.Horizontal) != 0 && (c.Applies.Surfaces & SurfaceSet.Wall) == 0 ? new SurfaceContext("s", SurfaceKind.Floor, 4, 4)
            : new SurfaceContext("s", SurfaceKind.Wall, 4, 2.5);
    }
}
