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

    public ForcedPlan(int device, RoomContext room, DrivingVariable drivenBy, LawUse? warmer, LawUse? cooler, StreamDirection stream)
    {
        Device = device;
        Stream = stream;
        this.warmer = warmer;
        this.cooler = cooler;
        DrivenBy = drivenBy;
        ScaleOfFlow = Scale(drivenBy, room.Devices[device], room.VolumeCubicMetres);
    }

    public int Device { get; }

    public StreamDirection Stream { get; }

    public DrivingVariable DrivenBy { get; }

    /// <summary>Turns a flow, or for the jet momentum number its square, into the flow variable of the laws.</summary>
    public double ScaleOfFlow { get; }

    public LawUse? On(bool isWarmer) => isWarmer ? warmer : cooler;

    /// <summary>The flow variable that the laws use, from the flow or speed of the state.</summary>
    public double DrivingValue(DeviceState state) => DrivenBy switch
    {
        DrivingVariable.Speed => state.SpeedMetresPerSecond,
        DrivingVariable.JetMomentum => ScaleOfFlow * state.FlowCubicMetresPerSecond * state.FlowCubicMetresPerSecond,
        _ => ScaleOfFlow * state.FlowCubicMetresPerSecond,
    };

    /// <summary>The flow [m³/s] that gives a value of the flow variable.</summary>
    public double FlowAt(double driving) => DrivenBy == DrivingVariable.JetMomentum ? Math.Sqrt(driving / ScaleOfFlow) : driving / ScaleOfFlow;

    private static double Scale(DrivingVariable drivenBy, FlowDescriptor device, double volume) => drivenBy switch
    {
        DrivingVariable.AirChangeRate => 3600 / volume,
        DrivingVariable.JetMomentum => 1 / (((SupplyInlet)device).OpeningSquareMetres!.Value * LawBinding.Gravity * volume),
        DrivingVariable.FlowPerLength => 3600 / ((CeilingSlot)device).FacadeMetres!.Value,
        _ => 1,
    };
}
