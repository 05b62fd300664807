using System;
using Convection.Correlations.Evaluation.Kernels;
using Convection.Correlations.Flows;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;
using Convection.Correlations.Selection;
using Convection.Correlations.Surfaces;
using UnitsNet;
#if NET
using Kernel = Convection.Correlations.Evaluation.Kernels.FluxKernel<Convection.Correlations.Evaluation.Kernels.ScalarLane>;
#else
using Kernel = Convection.Correlations.Evaluation.Kernels.FluxKernel;
#endif

namespace Convection.Correlations.Evaluation;

/// <summary>Convection at one surface, bound and ready to evaluate.</summary>
/// <remarks>
/// Immutable, allocation-free to evaluate, safe on any number of threads. Bind it alone with <see cref="Bind"/>, or take it from
/// a bound room; both run the same code.
/// </remarks>
public sealed class SurfaceConvection
{
    private const double LowestCelsius = -273.15, HighestCelsius = 10_000, HighestFlow = 1e6, HighestSpeed = 1000;
    private const double BuoyantUpTo = 0.2, ForcedFrom = 0.8;

    // (1.001⁶/(1.001⁶ − 1))^(1/6): where h is raised by more than 0.1 %, the raised h is below this many times the minimum.
    private const double MinimumTells = 2.3462;

    private readonly SurfacePlan plan;
    private readonly SurfaceShape shape;

    internal SurfaceConvection(SurfacePlan plan, RoomSelection selection)
    {
        this.plan = plan;
        shape = new SurfaceShape(plan, selection.Policy);
    }

    /// <summary>The surface.</summary>
    public SurfaceContext Surface => plan.Surface;

    /// <summary>What was chosen for it, and what is missing.</summary>
    public SurfaceSelection Selection => plan.Selection;

    internal SurfacePlan Plan => plan;

    internal SurfaceShape Shape => shape;

    /// <summary>Binds one surface without describing the rest of its room.</summary>
    /// <param name="surface">The surface.</param>
    /// <param name="device">The device that moves the air; null for still air.</param>
    /// <param name="roomVolumeCubicMetres">Volume of the room [m³], in (0, 1 000 000]; forms in air changes need it.</param>
    /// <param name="air">Air for which laws are bound; standard pressure, dry, 22 °C where left out.</param>
    /// <param name="registry">Where to choose from; the published set where left out.</param>
    /// <param name="policy">What the user wants of the choice; the defaults where left out.</param>
    /// <returns>The bound surface.</returns>
    /// <exception cref="ArgumentException">As for a room.</exception>
    public static SurfaceConvection Bind(
        SurfaceContext surface,
        FlowDescriptor? device,
        double roomVolumeCubicMetres,
        Air.AirState? air = null,
        CorrelationRegistry? registry = null,
        ConvectionPolicy? policy = null)
    {
        Require.NotNull(surface, nameof(surface));
        var room = new RoomContext("the room of " + surface.Name, roomVolumeCubicMetres, [surface], device is null ? [] : [device], air);
        return RoomConvection.Bind(room, registry, policy).Surfaces[0];
    }

    /// <summary>Convection at one step.</summary>
    /// <param name="surface">Temperature of the surface.</param>
    /// <param name="room">Temperature of the room air.</param>
    /// <param name="device">State of the first device; any others are off.</param>
    /// <returns>The result. Impossible input gives a result that says so.</returns>
    public ConvectionResult Evaluate(Temperature surface, Temperature room, DeviceState device)
        => Evaluate(surface.DegreesCelsius, room.DegreesCelsius, device);

    /// <summary>Convection at one step.</summary>
    /// <param name="surfaceCelsius">Temperature of the surface [°C].</param>
    /// <param name="roomCelsius">Temperature of the room air [°C].</param>
    /// <param name="device">State of the first device; any others are off.</param>
    /// <returns>The result. Impossible input gives a result that says so.</returns>
    public ConvectionResult Evaluate(double surfaceCelsius, double roomCelsius, DeviceState device)
        => Evaluate(surfaceCelsius, roomCelsius, new DeviceStates(device));

    internal unsafe ConvectionResult Evaluate(double surfaceCelsius, double roomCelsius, DeviceStates devices)
    {
        ConvectionStatus status = Check(surfaceCelsius, LowestCelsius, HighestCelsius);
        status = Worse(status, Check(roomCelsius, LowestCelsius, HighestCelsius));
        double* lanes = stackalloc double[DeviceLanes.Count * plan.Devices.Length];
        for (int slot = 0; slot < plan.Devices.Length; slot++)
        {
            int device = plan.Devices[slot];
            DeviceState state = devices[device];
            status = Worse(status, Check(plan.Room.Devices[device], state));
            Write(state, lanes + (DeviceLanes.Count * slot));
        }

        if (status != ConvectionStatus.Valid)
        {
            return new ConvectionResult(status);
        }

        Remarks remarks = plan.Remark(surfaceCelsius, roomCelsius, devices, shape.HeaterRamp);
        if (remarks.Status != ConvectionStatus.Valid)
        {
            return new ConvectionResult(remarks.Status);
        }

        fixed (double* numbers = shape.Numbers)
        {
            Kernel.Surface(shape, new Kernel.Numbers(numbers), new(surfaceCelsius), new(roomCelsius), lanes, out Kernel.Outcome sum);
            return Result(sum, surfaceCelsius - roomCelsius, remarks);
        }
    }

    /// <summary>The coefficient that a device's forms have at a flow, against supply air [W/(m²·K)]; zero for forms with another reference.</summary>
    internal unsafe double SupplyCoefficient(int device, double flowCubicMetresPerSecond)
    {
        double coefficient = 0;
        for (int i = 0; i < plan.Forced.Length; i++)
        {
            ForcedPlan forced = plan.Forced[i];
            if (forced.Device == device && shape.Forced[i].Warmer is { Reference: ReferenceTemperature.SupplyAir } side)
            {
                fixed (double* numbers = shape.Numbers)
                {
                    double driving = forced.DrivingValue(DeviceState.Supply(flowCubicMetresPerSecond, double.NaN));
                    Kernel.Law(side.Law, new Kernel.Numbers(numbers), new(driving), out ScalarLane h, out _);
                    coefficient += h.Value;
                }
            }
        }

        return coefficient;
    }

    /// <summary>Whether a device's state can be used.</summary>
    internal static ConvectionStatus Check(FlowDescriptor device, DeviceState state)
    {
        if (state.Gives == StateNeed.None)
        {
            return ConvectionStatus.Valid;
        }

        if ((device.Needs & ~state.Gives) != 0)
        {
            return ConvectionStatus.DeviceStateUnsuitable;
        }

        ConvectionStatus status = Check(state.FlowCubicMetresPerSecond, 0, HighestFlow);
        status = Worse(status, Check(state.SpeedMetresPerSecond, 0, HighestSpeed));
        status = Worse(status, Check(state.OutputFraction, 0, 1));
        if (status == ConvectionStatus.Valid && !double.IsNaN(state.AirCelsius))
        {
            status = Check(state.AirCelsius, LowestCelsius, HighestCelsius);
        }

        bool needsTemperature = (device.Needs & StateNeed.SupplyTemperature) != 0 && state.FlowCubicMetresPerSecond > 0;
        return Worse(status, needsTemperature && double.IsNaN(state.AirCelsius) ? ConvectionStatus.SupplyTemperatureMissing : ConvectionStatus.Valid);
    }

    /// <summary>Writes what a kernel reads of a device.</summary>
    internal static unsafe void Write(DeviceState state, double* lanes)
    {
        lanes[DeviceLanes.Flow] = state.FlowCubicMetresPerSecond;
        lanes[DeviceLanes.Speed] = state.SpeedMetresPerSecond;
        lanes[DeviceLanes.Air] = state.AirCelsius;
        lanes[DeviceLanes.Output] = state.OutputFraction;
    }

    private static ConvectionStatus Worse(ConvectionStatus known, ConvectionStatus next) => known == ConvectionStatus.Valid ? next : known;

    private static ConvectionStatus Check(double value, double lowest, double highest)
        => double.IsNaN(value) || double.IsInfinity(value) ? ConvectionStatus.NotFinite
            : value < lowest || value > highest ? ConvectionStatus.Unphysical
            : ConvectionStatus.Valid;

    private static FlowRegime Regime(in Kernel.Outcome sum)
    {
        double buoyant = sum.Buoyant.Value.Value, forced = sum.Forced.Value;
        double size = Math.Abs(buoyant) + Math.Abs(forced);
        double share = size == 0 ? 0 : Math.Abs(forced) / size;
        double opposing = Math.Abs(sum.Opposing.Value), transverse = Math.Abs(sum.Transverse.Value);
        double leader = Math.Max(Math.Abs(sum.Assisting.Value), Math.Max(opposing, transverse));
        return sum.MixedWeight.Value > 0.5 ? FlowRegime.MixedAsMeasured
            : share <= BuoyantUpTo ? FlowRegime.Buoyant
            : share >= ForcedFrom ? FlowRegime.Forced
            : buoyant * forced < 0 ? FlowRegime.MixedOppositeFluxes
            : leader == transverse ? FlowRegime.MixedTransverse
            : leader == opposing ? FlowRegime.MixedOpposing
            : FlowRegime.MixedAssisting;
    }

    private ConvectionResult Result(in Kernel.Outcome sum, double difference, Remarks remarks)
    {
        double buoyant = sum.Buoyant.Value.Value, forced = sum.Forced.Value;
        ConvectionFlags flags = remarks.Flags;
        flags |= buoyant * forced < 0 || ScalarLane.Any(sum.HasOppositeDevices) ? ConvectionFlags.OppositeFluxes : ConvectionFlags.None;
        flags |= sum.CoefficientBeforeForced.Value < MinimumTells * shape.MinimumConductance ? ConvectionFlags.MinimumConductance : ConvectionFlags.None;
        return new ConvectionResult(
            new Flux(sum.Total.Value.Value, sum.Total.Surface.Value, sum.Total.Room.Value, sum.Total.Supply.Value),
            buoyant,
            forced,
            difference,
            sum.BuoyantCoefficient.Value,
            sum.ForcedCoefficient.Value,
            (ReferenceTemperature)(int)sum.ForcedReference.Value,
            Regime(sum),
            flags,
            plan.Ids,
            remarks.Used);
    }
}
