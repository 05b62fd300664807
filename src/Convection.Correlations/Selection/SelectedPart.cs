using System.Collections.Generic;
using Convection.Correlations.Flows;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Selection;

/// <summary>What was chosen for one part of a surface: still air, or one device.</summary>
public sealed class SelectedPart
{
    internal SelectedPart(PartKind kind, SurfaceSide side, FlowDescriptor? device, LawLadder ladder, IReadOnlyList<Alternative> alternatives)
    {
        Kind = kind;
        Side = side;
        Device = device;
        Ladder = ladder;
        Alternatives = alternatives;
    }

    /// <summary>The part.</summary>
    public PartKind Kind { get; }

    /// <summary>Whether it holds for the surface warmer than the air, cooler, or either.</summary>
    public SurfaceSide Side { get; }

    /// <summary>The device; null for still air.</summary>
    public FlowDescriptor? Device { get; }

    /// <summary>
    /// The chosen correlations. One, or for a flow several that follow each other as the flow rises, each passing smoothly into
    /// the next.
    /// </summary>
    public IReadOnlyList<SelectedLaw> Chosen => Ladder.Laws;

    /// <summary>Those that were not chosen, best first.</summary>
    public IReadOnlyList<Alternative> Alternatives { get; }

    internal LawLadder Ladder { get; }
}
