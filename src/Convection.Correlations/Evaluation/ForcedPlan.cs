using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;

namespace Convection.Correlations.Evaluation;

/// <summary>A supply or stream device's laws on one surface.</summary>
internal sealed class ForcedPlan
{
    private readonly LawUse? warmer, cooler;
    private readonly DrivingVariable drivenBy;
    private readonly double scale;

    public ForcedPlan(int device, RoomContext room, DrivingVariable drivenBy, LawUse? warmer, LawUse? cooler, StreamDirection stream)
    {
        Device = device;
        Stream = stream;
        this.warmer = warmer;
        this.cooler = cooler;
        this.drivenBy = drivenBy;
        scale = Scale(drivenBy, room.Devices[device], room.VolumeCubicMetres);
    }

    public int Device { get; }

    public StreamDirection Stream { get; }

    public LawUse? On(bool isWarmer) => isWarmer ? warmer : cooler;

    /// <summary>The flow variable that the laws use, from the flow or speed of the state.</summary>
    public double DrivingValue(DeviceState state) => drivenBy switch
    {
        DrivingVariable.Speed => state.SpeedMetresPerSecond,
        DrivingVariable.JetMomentum => scale * state.FlowCubicMetresPerSecond * state.FlowCubicMetresPerSecond,
        _ => scale * state.FlowCubicMetresPerSecond,
    };

    /// <summary>The flow [m³/s] that gives a value of the flow variable.</summary>
    public double FlowAt(double driving) => drivenBy == DrivingVariable.JetMomentum ? Math.Sqrt(driving / scale) : driving / scale;

    private static double Scale(DrivingVariable drivenBy, FlowDescriptor device, double volume) => drivenBy switch
    {
        DrivingVariable.AirChangeRate => 3600 / volume,
        DrivingVariable.JetMomentum => 1 / (((SupplyInlet)device).OpeningSquareMetres!.Value * LawBinding.Gravity * volume),
        DrivingVariable.FlowPerLength => 3600 / ((CeilingSlot)device).FacadeMetres!.Value,
        _ => 1,
    };
}
