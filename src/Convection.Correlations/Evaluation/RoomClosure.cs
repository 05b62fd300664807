using System;
using Convection.Correlations.Flows;

namespace Convection.Correlations.Evaluation;

/// <summary>The energy closure of a supply device at one flow: ε = Σ h·A/(ρ·c_p·V̇) over the surfaces whose forms refer to supply air.</summary>
/// <remarks>
/// Forms that refer to supply air carry the heat balance of their test room. In a room with surfaces of one temperature, ε is
/// the share of the possible heat that the air takes up on its way through; 1 or more is impossible there, and makes the chosen
/// forms doubtful for this room and flow.
/// </remarks>
public sealed class RoomClosure
{
    internal RoomClosure(FlowDescriptor device, double flow, double airChanges, double ratio)
    {
        Device = device;
        FlowCubicMetresPerSecond = flow;
        AirChangesPerHour = airChanges;
        Ratio = ratio;
    }

    /// <summary>The device.</summary>
    public FlowDescriptor Device { get; }

    /// <summary>Flow [m³/s].</summary>
    public double FlowCubicMetresPerSecond { get; }

    /// <summary>The flow as air changes per hour [1/h].</summary>
    public double AirChangesPerHour { get; }

    /// <summary>ε [-].</summary>
    public double Ratio { get; }

    /// <summary>True where ε is 1 or more.</summary>
    public bool IsImpossible => Ratio >= 1;

    /// <summary>The finding in one sentence.</summary>
    /// <returns>The text, the same in every culture.</returns>
    public override string ToString()
        => "'" + Device.Name + "' at " + InvariantText.Fixed(AirChangesPerHour, 1) + " air changes per hour: closure ratio "
            + InvariantText.Fixed(Ratio, 2) + (IsImpossible
                ? ", impossible in the test room of these forms (1 or more): do not trust them for this room and flow."
                : ", possible (below 1).");
}
