using System;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Evaluation.Kernels;
using Convection.Correlations.Laws;
using CsCheck;
using Xunit;
using Kernel = Convection.Correlations.Evaluation.Kernels.FluxKernel<Convection.Correlations.Evaluation.Kernels.ScalarLane>;

namespace Convection.Correlations.Tests.Evaluation;

public class BlendTests
{
    private static readonly Gen<Flux> AnyFlux = Gen.Select(
        Gen.Int[-5000, 5000].Select(hundredths => hundredths / 100.0), Gen.Double[0, 10], (q, slope) => new Flux(q, slope, -slope, 0.3 * slope));

    // Y.A. Cengel, A.J. Ghajar, Heat and Mass Transfer, problem 9-109 (data quoted, answers from memory): Nusselt numbers 34.67
    // forced and 22.42 natural, assisting, exponent 3, make 37.55.
    [Fact]
    public void Assisting_TextbookExample_Agrees()
        => Assert.Equal(37.55, Assisting(Part(34.67), Part(22.42), 3, 3).Value, 0.02);

    // Worked apart from this code for parts of 2 and 3: S.W. Churchill, AIChE Journal 23(1), 10-16, 1977 (quoted): exponents 3 and 4,
    // assisting; 7/2 for transverse flow over horizontal plates (recalled, high); D.L. Siebers et al., 1983: 3.2 (recalled, high).
    [Theory]
    [InlineData(3, 3.27107)]
    [InlineData(4, 3.13829)]
    [InlineData(3.5, 3.19158)]
    [InlineData(3.2, 3.23522)]
    public void Assisting_PublishedExponents_Agree(double n, double expected)
    {
        Assert.Equal(expected, Assisting(Part(2), Part(3), n, 3).Value, 6e-6);
        Assert.Equal(-expected, Assisting(Part(-3), Part(-2), n, 3).Value, 6e-6);
    }

    // Churchill (1977): the cubes subtract in opposing flow (the value worked apart from this code).
    [Fact]
    public void Opposing_FarApart_CubesSubtract()
        => Assert.Equal(2.66840, Opposing(Part(2), Part(3), 3, 0.8, isJoined: false).Value, 6e-6);

    // I. Beausoleil-Morrison, Energy and Buildings 33(4), 351-361, 2001 (recalled, high): never below 0.8 of the larger part.
    [Theory]
    [InlineData(10, 10)]
    [InlineData(10, 9)]
    [InlineData(-9, -10)]
    public void Opposing_NearlyEqual_LeavesTheFloor(double a, double b)
        => Assert.Equal(0.8 * 10 * Math.Sign(a), Opposing(Part(a), Part(b), 3, 0.8, isJoined: false).Value, 1e-12);

    [Fact]
    public void OppositeHeat_Equal_Balances_AndUnequal_LeavesLessThanTheLarger()
    {
        Assert.Equal(0, Counter(Part(7), Part(-7), 3).Value, 1e-12);
        Assert.InRange(Counter(Part(7), Part(-3), 3).Value, 0, 7);
        Assert.Equal(7, Counter(Part(7), Part(0), 3).Value, 1e-12);
    }

    [Theory]
    [InlineData(2.5)]
    [InlineData(3)]
    [InlineData(3.5)]
    public void EveryRule_AnyTwoFluxes_IsSymmetricBoundedAndDifferentiated(double exponent)
        => Gen.Select(AnyFlux, AnyFlux).Sample(
            (a, b) =>
            {
                double n = exponent, opposing = Math.Max(exponent, 2);
                foreach (Func<Flux, Flux, Flux> blend in new Func<Flux, Flux, Flux>[]
                {
                    (x, y) => Assisting(x, y, n, opposing),
                    (x, y) => Opposing(x, y, opposing, 0.8, isJoined: false),
                    (x, y) => Opposing(x, y, opposing, 0.8, isJoined: true),
                })
                {
                    double value = blend(a, b).Value;
                    Assert.Equal(value, blend(b, a).Value, 1e-12);
                    Assert.True(Math.Abs(value) <= Math.Abs(a.Value) + Math.Abs(b.Value) + 1e-12);
                    Assert.True(double.IsFinite(value + blend(a, b).Surface + blend(a, b).Room + blend(a, b).Supply));

                    // The slope to either flux alone, by finite differences on both sides (a kink has two).
                    Flux unit = new(a.Value, 1, 0, 0);
                    double analytic = blend(unit, new Flux(b.Value, 0, 0, 0)).Surface;
                    double up = (blend(Part(a.Value + 1e-6), b).Value - value) / 1e-6, down = (value - blend(Part(a.Value - 1e-6), b).Value) / 1e-6;
                    Assert.InRange(analytic, Math.Min(up, down) - 1e-4, Math.Max(up, down) + 1e-4);
                    Assert.InRange(analytic, -1.6, 1.9);
                }
            },
            iter: 3000);

    [Fact]
    public void Counter_CubicRule_SlopeStaysBelowTheStatedBound()
    {
        double steepest = 0;
        for (double a = -10; a <= 0; a += 0.001)
        {
            double slope = Counter(new Flux(a, 1, 0, 0), new Flux(1, 0, 0, 0), 3).Surface;
            Assert.True(slope >= 0);
            steepest = Math.Max(steepest, slope);
        }

        Assert.InRange(steepest, 1, 1.5 + 1e-9);
    }

    /// <summary>The joined rule is the published one outside its bands, deviates by no more than stated inside, and has no kink.</summary>
    [Theory]
    [InlineData(3, 0.8, 0.013)]
    [InlineData(3, 0.5, 0.039)]
    [InlineData(2, 0.8, 0.013)]
    [InlineData(4, 0.9, 0.013)]
    public void Opposing_Joined_StaysNearThePublishedRuleAndHasNoKink(double n, double floor, double allowed)
    {
        double corner = Math.Pow(1 - Math.Pow(floor, n), 1 / n), largest = 0, before = double.NaN;
        for (int i = 0; i <= 40_000; i++)
        {
            double b = i / 20_000.0;
            Flux joined = Opposing(new Flux(1, 0, 0, 0), new Flux(b, 1, 0, 0), n, floor, isJoined: true);
            double published = Opposing(Part(1), Part(b), n, floor, isJoined: false).Value;
            double ratio = Math.Min(b, 1 / b), deviation = Math.Abs((joined.Value / published) - 1);
            largest = Math.Max(largest, deviation);
            if (Math.Abs(ratio - corner) > 0.0401 && ratio < 0.951)
            {
                Assert.Equal(0, deviation, 1e-12);
            }

            // A kink would step by about 1; the steepest bend of the joins is 0.03 over one of these steps.
            Assert.True(double.IsNaN(before) || Math.Abs(joined.Surface - before) < 0.03, "slope steps at " + b);
            before = joined.Surface;
        }

        Assert.InRange(largest, 0.001, allowed);
    }

    private static Flux Part(double value) => new(value, 0, 0, 0);

    private static Flux Assisting(Flux a, Flux b, double n, double opposing)
        => From(Kernel.Add(To(a), To(b), new PowerPair(n), new BlendShape(new BlendRule { OpposingExponent = opposing })));

    private static Flux Opposing(Flux a, Flux b, double n, double floor, bool isJoined)
        => From(Kernel.Oppose(To(a), To(b), new BlendShape(new BlendRule { OpposingExponent = n, OpposingFloor = floor, JoinsKinks = isJoined })));

    /// <summary>Fluxes of opposite heat: every rule takes the same mean of them.</summary>
    private static Flux Counter(Flux a, Flux b, double n) => Assisting(a, b, 3, n);

    private static Kernel.Flux To(Flux f) => new(new(f.Value), new(f.Surface), new(f.Room), new(f.Supply));

    private static Flux From(Kernel.Flux f) => new(f.Value.Value, f.Surface.Value, f.Room.Value, f.Supply.Value);
}
