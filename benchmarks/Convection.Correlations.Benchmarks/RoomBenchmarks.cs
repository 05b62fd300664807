using System;
using BenchmarkDotNet.Attributes;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Flows;
using Convection.Correlations.Rooms;
using Convection.Correlations.Surfaces;
using UnitsNet;

namespace Convection.Correlations.Benchmarks;

/// <summary>One step of a six-surface room: the formula typed in by hand, the plain path, the typed path; and binding.</summary>
[MemoryDiagnoser]
public class RoomBenchmarks
{
    private static readonly string[] Names = ["north", "east", "south", "west", "floor", "ceiling"];

    private readonly double[] surfaces = [18.2, 20.1, 20.4, 20.3, 19.9, 21.4];
    private readonly DeviceState[] none = [];
    private readonly DeviceState[] supply = [DeviceState.Supply(0.1, 17)];
    private readonly ConvectionResult[] results = new ConvectionResult[6];
    private RoomContext still = null!;
    private RoomConvection stillBound = null!, suppliedBound = null!;

    /// <summary>Binds the rooms.</summary>
    [GlobalSetup]
    public void Setup()
    {
        still = Room([]);
        stillBound = RoomConvection.Bind(still);
        suppliedBound = RoomConvection.Bind(Room([new RadialCeilingDiffuser("diffuser")]));
    }

    /// <summary>What a modeller types in: one buoyancy formula for each surface, no slopes, no flags.</summary>
    /// <returns>The heat to the air.</returns>
    [Benchmark(Baseline = true)]
    public double FormulaByHand()
    {
        double sum = 0;
        for (int i = 0; i < surfaces.Length; i++)
        {
            double difference = surfaces[i] - 21, size = Math.Abs(difference);
            double h = i < 4
                ? Math.Pow(Math.Pow(1.50 * Math.Pow(size / 2.7, 0.25), 6) + Math.Pow(1.23 * Math.Pow(size, 1.0 / 3), 6), 1.0 / 6)
                : i == 4 == difference > 0
                    ? Math.Pow(Math.Pow(1.40 * Math.Pow(size / 4.44, 0.25), 6) + Math.Pow(1.63 * Math.Pow(size, 1.0 / 3), 6), 1.0 / 6)
                    : 0.60 * Math.Pow(size / (4.44 * 4.44), 0.2);
            sum += h * difference;
        }

        return sum;
    }

    /// <summary>The plain path, still air.</summary>
    /// <returns>One flux.</returns>
    [Benchmark]
    public double PlainStillAir()
    {
        stillBound.Evaluate(21, surfaces, none, results);
        return results[0].FluxWattsPerSquareMetre;
    }

    /// <summary>The plain path, supply air on.</summary>
    /// <returns>One flux.</returns>
    [Benchmark]
    public double PlainSupplyAir()
    {
        suppliedBound.Evaluate(21, surfaces, supply, results);
        return results[0].FluxWattsPerSquareMetre;
    }

    /// <summary>The typed path, still air.</summary>
    /// <returns>One result.</returns>
    [Benchmark]
    public RoomResult TypedStillAir()
    {
        RoomState state = RoomState.At(Temperature.FromDegreesCelsius(21));
        for (int i = 0; i < Names.Length; i++)
        {
            state = state.WithSurface(Names[i], Temperature.FromDegreesCelsius(surfaces[i]));
        }

        return stillBound.Evaluate(state);
    }

    /// <summary>Choosing and binding.</summary>
    /// <returns>The bound room.</returns>
    [Benchmark]
    public RoomConvection Bind() => RoomConvection.Bind(still);

    private static RoomContext Room(FlowDescriptor[] devices) => new(
        "six surfaces",
        60,
        [
            new SurfaceContext(Names[0], SurfaceKind.Wall, 5, 2.7),
            new SurfaceContext(Names[1], SurfaceKind.Wall, 4, 2.7),
            new SurfaceContext(Names[2], SurfaceKind.Wall, 5, 2.7),
            new SurfaceContext(Names[3], SurfaceKind.Wall, 4, 2.7),
            new SurfaceContext(Names[4], SurfaceKind.Floor, 5, 4),
            new SurfaceContext(Names[5], SurfaceKind.Ceiling, 5, 4),
        ],
        devices);
}
