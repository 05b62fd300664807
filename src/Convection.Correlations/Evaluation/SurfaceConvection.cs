using System;
using System.Collections.Generic;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;
using Convection.Correlations.Selection;
using Convection.Correlations.Surfaces;
using UnitsNet;

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
    private const int MinimumExponent = 6;

    private readonly SurfacePlan plan;
    private readonly BlendRule blend;
    private readonly double heaterRamp, minimumConductance;

    internal SurfaceConvection(SurfacePlan plan, RoomSelection selection)
    {
        this.plan = plan;
        blend = selection.Policy.Blend;
        heaterRamp = selection.Policy.HeaterRamp;
        minimumConductance = selection.Policy.MinimumConductance;
    }

    /// <summary>The surface.</summary>
    public SurfaceContext Surface => plan.Surface;

    /// <summary>What was chosen for it, and what is missing.</summary>
    public SurfaceSelection Selection => plan.Selection;

    internal SurfacePlan Plan => plan;

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

    internal ConvectionResult Evaluate(double surfaceCelsius, double roomCelsius, DeviceStates devices)
    {
        ConvectionStatus status = Check(surfaceCelsius, LowestCelsius, HighestCelsius);
        status = Worse(status, Check(roomCelsius, LowestCelsius, HighestCelsius));
        foreach (int device in plan.Devices)
        {
            status = Worse(status, Check(plan.Room.Devices[device], devices[device]));
        }

        if (status != ConvectionStatus.Valid)
        {
            return new ConvectionResult(status);
        }

        double difference = surfaceCelsius - roomCelsius;
        bool isWarmer = difference >= 0;
        var sum = new FluxSum(difference);
        status = AddBuoyant(ref sum, isWarmer, devices);
        if (status == ConvectionStatus.Valid)
        {
            status = AddForced(ref sum, surfaceCelsius, roomCelsius, devices);
        }

        return status == ConvectionStatus.Valid ? Finish(sum, isWarmer, devices) : new ConvectionResult(status);
    }

    private static ConvectionStatus Worse(ConvectionStatus known, ConvectionStatus next) => known == ConvectionStatus.Valid ? next : known;

    private static ConvectionStatus Check(double value, double lowest, double highest)
        => double.IsNaN(value) || double.IsInfinity(value) ? ConvectionStatus.NotFinite
            : value < lowest || value > highest ? ConvectionStatus.Unphysical
            : ConvectionStatus.Valid;

    private static ConvectionStatus Check(FlowDescriptor device, DeviceState state)
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

    private static bool IsRunning(DeviceState state)
        => !(state.FlowCubicMetresPerSecond <= 0 && state.SpeedMetresPerSecond <= 0 && state.OutputFraction <= 0);

    /// <summary>Still air, giving way to heaters as their output rises.</summary>
    private ConvectionStatus AddBuoyant(ref FluxSum sum, bool isWarmer, DeviceStates devices)
    {
        double rest = 1, weights = 0;
        double heated = 0, heatedSensitivity = 0;
        foreach (HeaterPlan heater in plan.Heaters)
        {
            double weight = HeaterPlan.Weight(devices[heater.Device].OutputFraction, heaterRamp);
            if (weight == 0 || heater.On(isWarmer) is not { } use)
            {
                continue;
            }

            if (!sum.Use(use, Math.Abs(sum.Difference), out LawValue law))
            {
                return ConvectionStatus.OutOfRangeRefused;
            }

            rest *= 1 - weight;
            weights += weight;
            heated += weight * law.Coefficient;
            heatedSensitivity += weight * law.Sensitivity;
            sum.MixedWeight += use.IsMixed ? weight : 0;
        }

        var still = new LawValue(0, 0);
        if (rest > 0)
        {
            if (plan.StillAir(isWarmer) is not { } use)
            {
                return ConvectionStatus.NoCorrelation;
            }

            if (!sum.Use(use, Math.Abs(sum.Difference), out still))
            {
                return ConvectionStatus.OutOfRangeRefused;
            }
        }

        double share = weights == 0 ? 0 : (1 - rest) / weights;
        double coefficient = (rest * still.Coefficient) + (share * heated);
        double sensitivity = (rest * still.Sensitivity) + (share * heatedSensitivity);
        if (minimumConductance > 0)
        {
            double raised = WithMinimum(coefficient);
            sum.Flags |= raised > 1.001 * coefficient ? ConvectionFlags.MinimumConductance : ConvectionFlags.None;
            sensitivity *= Math.Pow(coefficient / raised, MinimumExponent - 1);
            coefficient = raised;
        }

        double slope = coefficient + sensitivity;
        sum.BuoyantCoefficient = coefficient;
        sum.Buoyant = new Flux(coefficient * sum.Difference, slope, -slope, 0);
        sum.MixedWeight = weights == 0 ? 0 : (1 - rest) * sum.MixedWeight / weights;
        return ConvectionStatus.Valid;
    }

    private double WithMinimum(double coefficient)
        => Math.Pow(Math.Pow(coefficient, MinimumExponent) + Math.Pow(minimumConductance, MinimumExponent), 1.0 / MinimumExponent);

    private ConvectionStatus AddForced(ref FluxSum sum, double surfaceCelsius, double roomCelsius, DeviceStates devices)
    {
        foreach (ForcedPlan forced in plan.Forced)
        {
            DeviceState state = devices[forced.Device];
            double driving = forced.DrivingValue(state);
            if (driving > 0
                && (!AddForced(ref sum, forced.Stream, forced.On(isWarmer: true), isWarmer: true, driving, state, surfaceCelsius, roomCelsius)
                    || !AddForced(ref sum, forced.Stream, forced.On(isWarmer: false), isWarmer: false, driving, state, surfaceCelsius, roomCelsius)))
            {
                return ConvectionStatus.OutOfRangeRefused;
            }
        }

        return ConvectionStatus.Valid;
    }

    /// <summary>One device's law for one side, where the surface is on that side of the law's own reference.</summary>
    private bool AddForced(
        ref FluxSum sum, StreamDirection stream, LawUse? use, bool isWarmer, double driving, DeviceState state, double surfaceCelsius, double roomCelsius)
    {
        if (use is null)
        {
            return true;
        }

        ReferenceTemperature reference = Effective(use.Reference, state);
        double difference = surfaceCelsius - (reference == ReferenceTemperature.RoomAir ? roomCelsius : state.AirCelsius);
        if (isWarmer != (difference >= 0))
        {
            return true;
        }

        if (!sum.Use(use, driving, out LawValue law))
        {
            return false;
        }

        double h = law.Coefficient;
        Flux flux = reference == ReferenceTemperature.RoomAir
            ? new Flux(h * difference, h, -h, 0)
            : new Flux(h * difference, h, 0, -h);
        sum.AddForced(flux, h, reference, stream, blend);
        sum.Flags |= reference == use.Reference ? ConvectionFlags.None : ConvectionFlags.ReferenceSubstituted;
        if (use.ContainsBuoyancy)
        {
            sum.GiveWay(use.Lowest > 0 ? Crossfade.Weight(driving, 0, use.Lowest) : 1);
        }

        return true;
    }

    /// <summary>The reference that the state can serve: room air where it holds neither local, outlet nor free-stream temperature.</summary>
    private static ReferenceTemperature Effective(ReferenceTemperature reference, DeviceState state)
        => reference == ReferenceTemperature.SupplyAir ? reference
            : reference == ReferenceTemperature.FreeStream && !double.IsNaN(state.AirCelsius) ? reference
            : ReferenceTemperature.RoomAir;

    private ConvectionResult Finish(FluxSum sum, bool isWarmer, DeviceStates devices)
    {
        Flux assisting = sum.Assisting(blend), opposing = sum.Opposing(blend), transverse = sum.Transverse(blend);
        Flux total = FluxBlend.Assisting(sum.Buoyant, assisting, blend.AssistingExponent, blend.OpposingExponent);
        total = FluxBlend.Opposing(total, opposing, blend.OpposingExponent, blend.OpposingFloor, blend.JoinsKinks);
        total = FluxBlend.Assisting(total, transverse, blend.TransverseExponent, blend.OpposingExponent);
        Flux forced = FluxSum.Pool(FluxSum.Pool(assisting, opposing, blend), transverse, blend);
        foreach (GapPlan gap in plan.Gaps)
        {
            sum.Flags |= gap.IsOn(isWarmer) && (gap.Device < 0 || IsRunning(devices[gap.Device])) ? ConvectionFlags.GapInEvidence : ConvectionFlags.None;
        }

        bool opposite = sum.Buoyant.Value * forced.Value < 0;
        sum.Flags |= opposite || sum.HasOppositeDevices ? ConvectionFlags.OppositeFluxes : ConvectionFlags.None;
        return new ConvectionResult(
            total,
            sum.Buoyant,
            forced,
            sum.Difference,
            sum.BuoyantCoefficient,
            sum.ForcedCoefficient,
            sum.ForcedReference,
            Regime(sum, forced.Value, assisting.Value, opposing.Value, transverse.Value),
            sum.Flags,
            plan.Ids,
            sum.Used);
    }

    private static FlowRegime Regime(FluxSum sum, double forced, double assisting, double opposing, double transverse)
    {
        double size = Math.Abs(sum.Buoyant.Value) + Math.Abs(forced);
        double share = size == 0 ? 0 : Math.Abs(forced) / size;
        double leader = Math.Max(Math.Abs(assisting), Math.Max(Math.Abs(opposing), Math.Abs(transverse)));
        return sum.MixedWeight > 0.5 ? FlowRegime.MixedAsMeasured
            : share <= BuoyantUpTo ? FlowRegime.Buoyant
            : share >= ForcedFrom ? FlowRegime.Forced
            : sum.Buoyant.Value * forced < 0 ? FlowRegime.MixedOppositeFluxes
            : leader == Math.Abs(transverse) ? FlowRegime.MixedTransverse
            : leader == Math.Abs(opposing) ? FlowRegime.MixedOpposing
            : FlowRegime.MixedAssisting;
    }
}
