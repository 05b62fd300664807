using System;
using System.Linq;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Flows;
using Convection.Correlations.Rooms;
using Convection.Correlations.Surfaces;
using CsCheck;
using Xunit;

namespace Convection.Correlations.Tests.Evaluation;

/// <summary>What a heat balance needs: tangents, a solvable system, a conductance at equal temperatures.</summary>
public class SolverTests
{
    private const int GuardedSteps = 20;

    public static TheoryData<int> Rooms() => [.. Enumerable.Range(0, TestRooms.All.Count)];

    [Theory]
    [MemberData(nameof(Rooms))]
    public void Linearise_AnyState_TouchesTheFluxWithItsSlopes(int index)
    {
        RoomConvection bound = RoomConvection.Bind(TestRooms.All[index]);
        TestState.Of(bound.Room).Sample(
            state =>
            {
                ConvectionResult[] here = state.Evaluate(bound);
                for (int i = 0; i < here.Length; i++)
                {
                    LinearFlux tangent = here[i].Linearise(state.Surfaces[i], state.Room);
                    Assert.Equal(here[i].FluxWattsPerSquareMetre, tangent.At(state.Surfaces[i], state.Room), 1e-9);
                    Assert.Equal((here[i].FluxPerSurfaceKelvin, here[i].FluxPerRoomKelvin), (tangent.PerSurfaceKelvin, tangent.PerRoomKelvin));
                }
            },
            iter: 200);
    }

    /// <summary>
    /// Steady balance of a room: each surface to a boundary through a resistance, the air to its supply; Newton on the tangents, halving
    /// a step that does not lessen the residual, and guarding the slopes where that stalls.
    /// </summary>
    [Theory]
    [MemberData(nameof(Rooms))]
    public void Newton_RandomRoomsAndStates_AlwaysConverges(int index)
    {
        RoomConvection bound = RoomConvection.Bind(TestRooms.All[index]);
        int n = bound.Room.Surfaces.Count;
        Gen.Select(TestState.Of(bound.Room), Gen.Double[-10, 40].Array[n], Gen.Double[0.3, 8].Array[n], Gen.Double[0, 2000]).Sample(
            (start, outside, conductance, gain) =>
            {
                var balance = new Balance(bound, outside, conductance, gain);
                TestState state = start;
                double residual = balance.Residual(state);
                int guarded = 0;
                for (int iteration = 0; iteration < 400 && residual > 1e-7; iteration++)
                {
                    TestState full = balance.Newton(state, isGuarded: guarded > 0);
                    double share = 1;
                    TestState next = full;
                    while (guarded == 0 && share > 1e-3 && !(balance.Residual(next) < residual))
                    {
                        share /= 2;
                        next = TestState.Between(state, full, share);
                    }

                    // In opposing flow the published rule lets q fall as the surface warms, and a search can stall; guarded steps go on.
                    guarded = share > 1e-3 ? Math.Max(0, guarded - 1) : GuardedSteps;
                    state = next;
                    residual = balance.Residual(state);
                }

                Assert.True(residual <= 1e-7, "residual " + residual);
            },
            iter: 1000);
    }

    [Fact]
    public void MinimumConductance_AtEqualTemperatures_IsTheConductance_AndLeavesLargerOnesAlone()
    {
        var wall = new SurfaceContext("wall", SurfaceKind.Wall, 4, 2.5);
        SurfaceConvection With(double minimum) => SurfaceConvection.Bind(wall, null, 50, policy: new() { MinimumConductance = minimum });
        ConvectionResult equal = With(0.5).Evaluate(20, 20, DeviceState.Off);
        Assert.Equal(0.5, equal.FluxPerSurfaceKelvin, 1e-12);
        Assert.Equal(0.5, equal.RoomAirCoefficientWattsPerSquareMetreKelvin, 1e-12);
        Assert.True(equal.Flags.HasFlag(ConvectionFlags.MinimumConductance));

        ConvectionResult warm = With(0.5).Evaluate(25, 20, DeviceState.Off), bare = With(0).Evaluate(25, 20, DeviceState.Off);
        Assert.Equal(bare.FluxWattsPerSquareMetre, warm.FluxWattsPerSquareMetre, 1e-4 * bare.FluxWattsPerSquareMetre);
        Assert.Equal(ConvectionFlags.None, warm.Flags);
        Assert.Equal(0, With(0).Evaluate(20, 20, DeviceState.Off).FluxPerSurfaceKelvin);
        for (double surface = 20; surface < 21; surface += 0.01)
        {
            double step = 1e-6;
            double difference = (With(0.5).Evaluate(surface + step, 20, DeviceState.Off).FluxWattsPerSquareMetre - With(0.5).Evaluate(surface - step, 20, DeviceState.Off).FluxWattsPerSquareMetre) / (2 * step);
            Assert.Equal(With(0.5).Evaluate(surface, 20, DeviceState.Off).FluxPerSurfaceKelvin, difference, 1e-4);
        }

        Assert.Throws<ArgumentOutOfRangeException>(() => With(-1));
    }

    [Fact]
    public void Linearise_InvalidResult_IsNotANumber()
        => Assert.True(double.IsNaN(default(ConvectionResult).Linearise(20, 20).Constant));

    /// <summary>A steady heat balance with 20 W/K of ventilation at 15 °C.</summary>
    private sealed class Balance(RoomConvection bound, double[] outside, double[] conductance, double gain)
    {
        private const double Ventilation = 20, Fresh = 15;

        private double Area(int i) => bound.Room.Surfaces[i].AreaSquareMetres;

        /// <summary>Root of the sum of squares of all residuals [W].</summary>
        public double Residual(TestState state)
        {
            ConvectionResult[] results = state.Evaluate(bound);
            double air = (Ventilation * (Fresh - state.Room)) + gain, sum = 0;
            for (int i = 0; i < results.Length; i++)
            {
                double q = results[i].FluxWattsPerSquareMetre, rest = Area(i) * ((conductance[i] * (outside[i] - state.Surfaces[i])) - q);
                air += Area(i) * q;
                sum += rest * rest;
            }

            return Math.Sqrt(sum + (air * air));
        }

        /// <summary>The solution of the linear system of the tangents, or, guarded, of tangents whose slopes are made to rise.</summary>
        public TestState Newton(TestState state, bool isGuarded)
        {
            ConvectionResult[] results = state.Evaluate(bound);
            double diagonal = Ventilation, right = (Ventilation * Fresh) + gain;
            var fromRoom = new double[results.Length];
            var rest = new double[results.Length];
            for (int i = 0; i < results.Length; i++)
            {
                // Row of the surface: (a + U)·T + b·T_room = U·T_outside − c, eliminated into the row of the air.
                LinearFlux q = results[i].Linearise(state.Surfaces[i], state.Room);
                double a = isGuarded ? Math.Abs(q.PerSurfaceKelvin) + Math.Abs(q.PerRoomKelvin) : q.PerSurfaceKelvin, b = isGuarded ? -a : q.PerRoomKelvin;
                double c = results[i].FluxWattsPerSquareMetre - (a * state.Surfaces[i]) - (b * state.Room);
                double pivot = a + conductance[i];
                rest[i] = ((conductance[i] * outside[i]) - c) / pivot;
                fromRoom[i] = -b / pivot;
                diagonal -= Area(i) * ((a * fromRoom[i]) + b);
                right += Area(i) * ((a * rest[i]) + c);
            }

            double room = right / diagonal;
            return state with { Room = room, Surfaces = [.. Enumerable.Range(0, results.Length).Select(i => rest[i] + (fromRoom[i] * room))] };
        }
    }
}
