using Convection.Correlations.Registry;

namespace Convection.Correlations.Evaluation;

/// <summary>When a gap is in force: on which side, and with which device running (−1 for none).</summary>
internal sealed class GapPlan(int device, SurfaceSide side)
{
    public int Device { get; } = device;

    public bool IsOn(bool isWarmer) => side == SurfaceSide.Either || (side == SurfaceSide.Warmer) == isWarmer;
}
