using System;
using System.Collections.Generic;
using System.Text;
using Convection.Correlations.Jets;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;
using Convection.Correlations.Selection;

namespace Convection.Correlations.Evaluation;

/// <summary>A room bound to its correlations: give it a state, get every surface's convective flux.</summary>
/// <remarks>
/// Choosing happens once, in <see cref="Bind"/>; evaluating is arithmetic. Immutable and safe on any number of threads. The plain
/// path allocates nothing.
/// </remarks>
public sealed class RoomConvection
{
    private const int ClosureSteps = 24;

    private readonly SurfaceConvection[] surfaces;
    private readonly double heatCapacity;

    private RoomConvection(RoomSelection selection)
    {
        Selection = selection;
        heatCapacity = Room.Air.Properties.VolumetricHeatCapacityJoulesPerCubicMetreKelvin;
        surfaces = new SurfaceConvection[Room.Surfaces.Count];
        for (int i = 0; i < surfaces.Length; i++)
        {
            surfaces[i] = new SurfaceConvection(new SurfacePlan(selection, selection.Surfaces[i]), selection);
        }
    }

    /// <summary>The room.</summary>
    public RoomContext Room => Selection.Room;

    /// <summary>What was chosen, why, and what is missing.</summary>
    public RoomSelection Selection { get; }

    /// <summary>The bound surfaces, in the order of the room.</summary>
    public IReadOnlyList<SurfaceConvection> Surfaces => surfaces;

    /// <summary>Chooses correlations for every surface of a room and makes it ready to evaluate.</summary>
    /// <param name="room">The room.</param>
    /// <param name="registry">Where to choose from; the published set where left out.</param>
    /// <param name="policy">What the user wants of the choice; the defaults where left out.</param>
    /// <returns>The bound room.</returns>
    /// <exception cref="ArgumentNullException">The room is null.</exception>
    /// <exception cref="ArgumentException">The policy speaks of what is not there; see <see cref="RoomSelection.Choose"/>.</exception>
    public static RoomConvection Bind(RoomContext room, CorrelationRegistry? registry = null, ConvectionPolicy? policy = null)
        => new(RoomSelection.Choose(room, registry, policy));

    /// <summary>Convection at every surface, in plain numbers.</summary>
    /// <param name="roomCelsius">Temperature of the room air [°C].</param>
    /// <param name="surfaceCelsius">Temperatures of the surfaces [°C], in the order of the room.</param>
    /// <param name="devices">States of the devices, in the order of the room.</param>
    /// <param name="results">Takes one result for each surface. Impossible input marks the results that need it, and no others.</param>
    /// <exception cref="ArgumentNullException">An array is null.</exception>
    /// <exception cref="ArgumentException">An array's length is not the room's number of surfaces or devices.</exception>
    public void Evaluate(double roomCelsius, double[] surfaceCelsius, DeviceState[] devices, ConvectionResult[] results)
    {
        Length(Require.NotNull(surfaceCelsius, nameof(surfaceCelsius)).Length, surfaces.Length, "surface temperatures", nameof(surfaceCelsius));
        Length(Require.NotNull(devices, nameof(devices)).Length, Room.Devices.Count, "device states", nameof(devices));
        Length(Require.NotNull(results, nameof(results)).Length, surfaces.Length, "results", nameof(results));
        var states = new DeviceStates(devices);
        for (int i = 0; i < surfaces.Length; i++)
        {
            results[i] = surfaces[i].Evaluate(surfaceCelsius[i], roomCelsius, states);
        }
    }

    /// <summary>Convection at every surface.</summary>
    /// <param name="state">Temperatures and device states.</param>
    /// <returns>The results.</returns>
    /// <exception cref="ArgumentNullException">The state is null.</exception>
    /// <exception cref="ArgumentException">The state names a surface or a device that the room does not have.</exception>
    public RoomResult Evaluate(RoomState state)
    {
        Require.NotNull(state, nameof(state));
        var temperatures = new double[surfaces.Length];
        for (int i = 0; i < temperatures.Length; i++)
        {
            temperatures[i] = double.NaN;
        }

        foreach (KeyValuePair<string, double> surface in state.Surfaces)
        {
            temperatures[Known(Room.IndexOfSurface(surface.Key), "surface", surface.Key, Room.SurfaceNames)] = surface.Value;
        }

        var devices = new DeviceState[Room.Devices.Count];
        foreach (KeyValuePair<string, DeviceState> device in state.Devices)
        {
            devices[Known(Room.IndexOfDevice(device.Key), "device", device.Key, Room.DeviceNames)] = device.Value;
        }

        var results = new ConvectionResult[surfaces.Length];
        Evaluate(state.RoomCelsius, temperatures, devices, results);
        var closures = new List<RoomClosure>();
        for (int device = 0; device < devices.Length; device++)
        {
            double flow = devices[device].FlowCubicMetresPerSecond;
            if (flow > 0 && Closure(device, flow) is { } closure)
            {
                closures.Add(closure);
            }
        }

        var jets = new List<JetFinding>();
        for (int device = 0; device < devices.Length; device++)
        {
            DeviceState s = devices[device];
            if (JetFinding.Judge(Room.Devices[device], s.FlowCubicMetresPerSecond, s.AirCelsius - state.RoomCelsius, state.RoomCelsius) is { } jet)
            {
                jets.Add(jet);
            }
        }

        return new RoomResult(Room, results, [.. closures], [.. jets]);
    }

    /// <summary>The energy closure of a device at a flow.</summary>
    /// <param name="device">Index of the device in the room.</param>
    /// <param name="flowCubicMetresPerSecond">Flow [m³/s], above 0.</param>
    /// <returns>The closure; null where no surface's form refers to the device's supply air.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The room has no such device, or the flow is outside its interval.</exception>
    public RoomClosure? Closure(int device, double flowCubicMetresPerSecond)
    {
        if (device < 0 || device >= Room.Devices.Count)
        {
            throw new ArgumentOutOfRangeException(nameof(device), device, "Room '" + Room.Name + "' has " + Room.Devices.Count + " devices.");
        }

        double flow = Require.Positive(flowCubicMetresPerSecond, 1e6, "Supply flow", "m³/s", nameof(flowCubicMetresPerSecond));
        double conductance = 0;
        foreach (SurfaceConvection surface in surfaces)
        {
            conductance += surface.SupplyCoefficient(device, flow) * surface.Surface.AreaSquareMetres;
        }

        return conductance == 0
            ? null
            : new RoomClosure(Room.Devices[device], flow, 3600 * flow / Room.VolumeCubicMetres, conductance / (heatCapacity * flow));
    }

    /// <summary>The energy closure of every device over the flows that its chosen forms cover, from the lowest to the highest.</summary>
    /// <returns>One for each flow tried, or none where no form refers to supply air.</returns>
    public IReadOnlyList<RoomClosure> ClosuresOverTestedFlows()
    {
        var closures = new List<RoomClosure>();
        for (int device = 0; device < Room.Devices.Count; device++)
        {
            (double low, double high) = TestedFlows(device);
            for (int i = 0; i <= ClosureSteps && high > low; i++)
            {
                double flow = low * Math.Pow(high / low, (double)i / ClosureSteps);
                if (Closure(device, flow) is { } closure)
                {
                    closures.Add(closure);
                }
            }
        }

        return closures;
    }

    /// <summary>What was chosen, why, what is missing, and whether the chosen forms close their energy balance in this room.</summary>
    /// <returns>Several lines, the same in every culture.</returns>
    public string Explain()
    {
        var text = new StringBuilder(Selection.ToText());
        RoomClosure? first = null, last = null, worst = null;
        void Flush()
        {
            if (worst is not null)
            {
                text.Append('\n').Append("Energy closure of '").Append(worst.Device.Name).Append("' over ")
                    .Append(InvariantText.Fixed(first!.AirChangesPerHour, 1)).Append(" to ").Append(InvariantText.Fixed(last!.AirChangesPerHour, 1))
                    .Append(" air changes per hour: at most ").Append(InvariantText.Fixed(worst.Ratio, 2)).Append(" (at ")
                    .Append(InvariantText.Fixed(worst.AirChangesPerHour, 1)).Append(worst.IsImpossible
                        ? "); 1 or more is impossible in the test room of these forms.\n"
                        : "), possible throughout.\n");
            }
        }

        foreach (RoomClosure closure in ClosuresOverTestedFlows())
        {
            if (closure.Device != first?.Device)
            {
                Flush();
                first = closure;
                worst = null;
            }

            last = closure;
            worst = worst is null || closure.Ratio > worst.Ratio ? closure : worst;
        }

        Flush();
        return text.ToString();
    }

    private static void Length(int given, int needed, string what, string parameter)
    {
        if (given != needed)
        {
            throw new ArgumentException("The room needs " + needed + " " + what + "; " + given + " were given.", parameter);
        }
    }

    private int Known(int index, string what, string name, string names)
        => index >= 0
            ? index
            : throw new ArgumentException("Room '" + Room.Name + "' has no " + what + " '" + name + "'. Its " + what + "s: " + names + ".", nameof(name));

    private (double Low, double High) TestedFlows(int device)
    {
        double low = double.PositiveInfinity, high = 0;
        foreach (SurfaceConvection surface in surfaces)
        {
            foreach (ForcedPlan forced in surface.Plan.Forced)
            {
                if (forced.Device == device && forced.On(true) is { Reference: ReferenceTemperature.SupplyAir } use)
                {
                    low = Math.Min(low, forced.FlowAt(Math.Max(use.Lowest, 1e-3)));
                    high = Math.Max(high, forced.FlowAt(Math.Min(use.Ladder.Highest, 1e3)));
                }
            }
        }

        return (low, high);
    }
}
