using System;
using System.Collections.Generic;
using System.Linq;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Rooms;
using Convection.Correlations.Surfaces;
using CsCheck;
using UnitsNet;
using Xunit;

namespace Convection.Correlations.Tests.Evaluation;

/// <summary>What must hold for every room in every state; identities, with nothing taken from our own output.</summary>
public class RoomPropertyTests
{
    private const int Draws = 400;

    public static TheoryData<int> Rooms() => [.. Enumerable.Range(0, TestRooms.All.Count)];

    [Theory]
    [MemberData(nameof(Rooms))]
    public void Flux_AnyState_IsFiniteAndNeverWithoutReason(int index)
    {
        RoomConvection bound = RoomConvection.Bind(TestRooms.All[index]);
        TestState.Of(bound.Room).Sample(
            state =>
            {
                foreach (ConvectionResult result in state.Evaluate(bound))
                {
                    Assert.Equal(ConvectionStatus.Valid, result.Status);
                    Assert.True(double.IsFinite(result.FluxWattsPerSquareMetre + result.FluxPerSurfaceKelvin + result.FluxPerRoomKelvin + result.FluxPerSupplyKelvin));
                    Assert.True(double.IsFinite(result.CoefficientWattsPerSquareMetreKelvin) && result.CoefficientWattsPerSquareMetreKelvin >= 0);
                    Assert.InRange(result.ForcedShare, 0, 1);
                    Assert.NotEqual(FlowRegime.None, result.Regime);
                    Assert.NotEmpty(result.Correlations);
                }
            },
            iter: Draws);
    }

    /// <summary>Walks along random lines through the space of states and bisects the steepest step: a jump would stay, a slope vanishes.</summary>
    [Theory]
    [MemberData(nameof(Rooms))]
    public void Flux_AlongAnyLine_HasNoJump(int index)
    {
        RoomConvection bound = RoomConvection.Bind(TestRooms.All[index]);
        Gen.Select(TestState.Of(bound.Room), TestState.Of(bound.Room)).Sample(
            (from, to) =>
            {
                for (int surface = 0; surface < bound.Room.Surfaces.Count; surface++)
                {
                    double At(double t) => TestState.Between(from, to, t).Evaluate(bound)[surface].FluxWattsPerSquareMetre;
                    (double low, double high) = SteepestStep(At, 120);
                    for (int i = 0; i < 45; i++)
                    {
                        double middle = 0.5 * (low + high);
                        (low, high) = Math.Abs(At(middle) - At(low)) > Math.Abs(At(high) - At(middle)) ? (low, middle) : (middle, high);
                    }

                    Assert.True(
                        Math.Abs(At(high) - At(low)) < 1e-6,
                        bound.Room.Name + ", " + bound.Room.Surfaces[surface].Name + ": flux jumps at " + low + " by " + (At(high) - At(low)));
                }
            },
            iter: 40);
    }

    [Theory]
    [MemberData(nameof(Rooms))]
    public void Derivatives_AnyState_AreCentralDifferences(int index)
    {
        RoomConvection bound = RoomConvection.Bind(TestRooms.All[index]);
        TestState.Of(bound.Room).Sample(
            state =>
            {
                ConvectionResult[] here = state.Evaluate(bound);
                for (int surface = 0; surface < here.Length; surface++)
                {
                    int s = surface;

                    // Next to zero difference |ΔT|^n, and the blend next to a vanishing part, bend too fast for any finite step; the slope
                    // there is analytic and finite.
                    if (state.AirTemperatures.Append(state.Room).Any(t => Math.Abs(state.Surfaces[s] - t) < 0.01))
                    {
                        continue;
                    }

                    Slope(here[s].FluxPerSurfaceKelvin, d => state with { Surfaces = [.. state.Surfaces.Select(t => t + d)] });
                    Slope(here[s].FluxPerRoomKelvin, d => state with { Room = state.Room + d });
                    Slope(here[s].FluxPerSupplyKelvin, d => state with { AirTemperatures = [.. state.AirTemperatures.Select(t => t + d)] });

                    void Slope(double analytic, Func<double, TestState> move)
                    {
                        const double Step = 1e-5;
                        double up = (move(Step).Evaluate(bound)[s].FluxWattsPerSquareMetre - here[s].FluxWattsPerSquareMetre) / Step;
                        double down = (here[s].FluxWattsPerSquareMetre - move(-Step).Evaluate(bound)[s].FluxWattsPerSquareMetre) / Step;

                        // No kink is left in the default blend: a kink would part the two sides by more than any bend over such a step.
                        Assert.Equal(analytic, 0.5 * (up + down), 2e-5 * (1 + Math.Abs(analytic)));
                        Assert.InRange(Math.Abs(up - down), 0, 4e-3 * (1 + Math.Abs(analytic)));
                    }
                }
            },
            iter: Draws);
    }

    [Theory]
    [MemberData(nameof(Rooms))]
    public void Flux_StillAir_RisesWithTheSurfaceAndVanishesAtRoomTemperature(int index)
    {
        RoomConvection bound = RoomConvection.Bind(TestRooms.All[index]);
        TestState.Of(bound.Room).Sample(
            state =>
            {
                TestState still = state with { Drives = new double[state.Drives.Length] };
                ConvectionResult[] results = still.Evaluate(bound);
                for (int i = 0; i < results.Length; i++)
                {
                    Assert.True(results[i].FluxPerSurfaceKelvin >= 0);
                    Assert.True(results[i].FluxWattsPerSquareMetre * (state.Surfaces[i] - state.Room) >= 0);
                    Assert.Equal(0, results[i].ForcedFluxWattsPerSquareMetre);
                    Assert.Equal(FlowRegime.Buoyant, results[i].Regime);
                }

                ConvectionResult[] level = (still with { Surfaces = [.. still.Surfaces.Select(_ => still.Room)] }).Evaluate(bound);
                Assert.All(level, r => Assert.Equal(0, r.FluxWattsPerSquareMetre));
                Assert.All(level, r => Assert.True(double.IsFinite(r.RoomAirCoefficientWattsPerSquareMetreKelvin)));
            },
            iter: Draws);
    }

    [Theory]
    [MemberData(nameof(Rooms))]
    public void Flux_SameDirectionOfHeat_StaysWithinTheLimitsOfTheBlend(int index)
    {
        RoomConvection bound = RoomConvection.Bind(TestRooms.All[index]);
        TestState.Of(bound.Room).Sample(
            state =>
            {
                foreach (ConvectionResult r in state.Evaluate(bound))
                {
                    double buoyant = Math.Abs(r.BuoyantFluxWattsPerSquareMetre), forced = Math.Abs(r.ForcedFluxWattsPerSquareMetre);
                    double larger = Math.Max(buoyant, forced), total = Math.Abs(r.FluxWattsPerSquareMetre), slack = 1e-9 * (1 + larger);
                    if (r.Flags.HasFlag(ConvectionFlags.OppositeFluxes))
                    {
                        // Several devices may oppose each other: the sum of all parts bounds the result in any case.
                        Assert.True(total <= buoyant + forced + slack || bound.Room.Devices.Count > 1);
                        continue;
                    }

                    Assert.True(total <= buoyant + forced + slack, "more than the sum of its parts");
                    Assert.True(total >= (0.8 * larger) - slack || bound.Room.Devices.Count > 1, "less than the published floor leaves");
                    if (r.Regime is FlowRegime.MixedAssisting or FlowRegime.MixedTransverse && bound.Room.Devices.Count == 1)
                    {
                        Assert.True(total >= larger - slack, "assisting or transverse flow takes something away");
                    }
                }
            },
            iter: Draws);
    }

    [Theory]
    [MemberData(nameof(Rooms))]
    public void Result_SurfacesInAnotherOrder_IsTheSame(int index)
    {
        RoomContext room = TestRooms.All[index];
        RoomConvection bound = RoomConvection.Bind(room);
        RoomConvection reversed = RoomConvection.Bind(new RoomContext(room.Name, room.VolumeCubicMetres, room.Surfaces.Reverse(), room.Devices, room.Air));
        TestState.Of(room).Sample(
            state =>
            {
                ConvectionResult[] forwards = state.Evaluate(bound);
                ConvectionResult[] backwards = (state with { Surfaces = [.. state.Surfaces.Reverse()] }).Evaluate(reversed);
                Assert.Equal(forwards, backwards.Reverse());
            },
            iter: 100);
    }

    [Theory]
    [MemberData(nameof(Rooms))]
    public void TypedPath_AnyState_EqualsThePlainPath(int index)
    {
        RoomConvection bound = RoomConvection.Bind(TestRooms.All[index]);
        TestState.Of(bound.Room).Sample(
            state =>
            {
                ConvectionResult[] plain = state.Evaluate(bound);
                RoomState typed = RoomState.At(Temperature.FromDegreesCelsius(state.Room));
                DeviceState[] devices = state.Devices(bound.Room);
                for (int i = 0; i < devices.Length; i++)
                {
                    typed = typed.WithDevice(bound.Room.Devices[i].Name, devices[i]);
                }

                for (int i = 0; i < plain.Length; i++)
                {
                    typed = typed.WithSurface(bound.Room.Surfaces[i].Name, Temperature.FromDegreesCelsius(state.Surfaces[i]));
                }

                RoomResult result = bound.Evaluate(typed);
                Assert.Equal(plain, result.Surfaces);
                Assert.Equal(plain[0].FluxWattsPerSquareMetre, result[bound.Room.Surfaces[0].Name].HeatFlux!.Value.WattsPerSquareMeter);
            },
            iter: 100);
    }

    [Theory]
    [MemberData(nameof(Rooms))]
    public void SurfaceAlone_AnyState_EqualsTheRoom(int index)
    {
        RoomContext room = TestRooms.All[index];
        if (room.Devices.Count > 1)
        {
            return;
        }

        RoomConvection bound = RoomConvection.Bind(room);
        SurfaceConvection[] alone = [.. room.Surfaces.Select(s => SurfaceConvection.Bind(s, Only(room, s), room.VolumeCubicMetres, room.Air))];
        TestState.Of(room).Sample(
            state =>
            {
                ConvectionResult[] together = state.Evaluate(bound);
                DeviceState device = state.Devices(room).FirstOrDefault();
                Assert.Equal(together, alone.Select((s, i) => s.Evaluate(state.Surfaces[i], state.Room, device)));
            },
            iter: 50);
    }

    [Theory]
    [MemberData(nameof(Rooms))]
    public void NotANumber_OneSurface_LeavesTheOthersBitForBit(int index)
    {
        RoomConvection bound = RoomConvection.Bind(TestRooms.All[index]);
        TestState.Of(bound.Room).Sample(
            state =>
            {
                ConvectionResult[] good = state.Evaluate(bound);
                double[] surfaces = [.. state.Surfaces];
                surfaces[1] = double.NaN;
                ConvectionResult[] bad = (state with { Surfaces = surfaces }).Evaluate(bound);
                Assert.Equal(ConvectionStatus.NotFinite, bad[1].Status);
                Assert.True(double.IsNaN(bad[1].FluxWattsPerSquareMetre));
                bad[1] = good[1];
                Assert.Equal(good, bad);
            },
            iter: 50);
    }

    [Fact]
    public void Evaluate_PlainPath_AllocatesNothing()
    {
        RoomConvection bound = RoomConvection.Bind(TestRooms.All[^1]);
        double[] surfaces = [18, 19, 12, 24, 22];
        DeviceState[] devices =
        [
            DeviceState.Heating(0.5), DeviceState.Heating(0.1), DeviceState.Supply(0.1, 16), DeviceState.Supply(0.05, 30), DeviceState.Stream(0.4),
        ];
        var results = new ConvectionResult[surfaces.Length];
        bound.Evaluate(21, surfaces, devices, results);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 100; i++)
        {
            bound.Evaluate(21, surfaces, devices, results);
        }

        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
    }

    private static Convection.Correlations.Flows.FlowDescriptor? Only(RoomContext room, SurfaceContext surface)
        => room.Devices.Count == 0 ? null : room.Devices[0] with { Placements = [.. room.Devices[0].Placements.Where(p => p.Surface == surface.Name)] };

    private static (double Low, double High) SteepestStep(Func<double, double> at, int steps)
    {
        double best = -1, low = 0, before = at(0);
        for (int i = 1; i <= steps; i++)
        {
            double value = at((double)i / steps);
            if (Math.Abs(value - before) > best)
            {
                (best, low) = (Math.Abs(value - before), (i - 1.0) / steps);
            }

            before = value;
        }

        return (low, low + (1.0 / steps));
    }
}
