using Convection.Correlations.Flows;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Selection;

/// <summary>Something that no correlation of the registry covers on a surface.</summary>
public sealed class SelectionGap
{
    internal SelectionGap(PartKind part, SurfaceSide side, FlowDescriptor? device, string text)
    {
        Part = part;
        Side = side;
        Device = device;
        Text = text;
    }

    /// <summary>The part that is missing, or that a less fitting correlation serves.</summary>
    public PartKind Part { get; }

    /// <summary>Whether it is missing for the surface warmer than the air, cooler, or either.</summary>
    public SurfaceSide Side { get; }

    /// <summary>The device; null for still air.</summary>
    public FlowDescriptor? Device { get; }

    /// <summary>What is missing and what is used in its place, in one sentence.</summary>
    public string Text { get; }

    /// <summary>The sentence.</summary>
    /// <returns>The text, the same in every culture.</returns>
    public override string ToString() => Text;
}
