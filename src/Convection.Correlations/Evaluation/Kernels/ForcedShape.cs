using Convection.Correlations.Flows;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>A supply or stream device's laws on one surface.</summary>
internal sealed class ForcedShape(int slot, DrivingVariable drivenBy, int scale, StreamDirection stream, ForcedSide? warmer, ForcedSide? cooler)
{
    /// <summary>Place of the device among those that the surface needs.</summary>
    public int Slot { get; } = slot;

    public DrivingVariable DrivenBy { get; } = drivenBy;

    /// <summary>Index of the number that turns a flow into the driving variable.</summary>
    public int Scale { get; } = scale;

    public StreamDirection Stream { get; } = stream;

    public ForcedSide? Warmer { get; } = warmer;

    public ForcedSide? Cooler { get; } = cooler;
}
