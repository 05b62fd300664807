using System.Collections.Generic;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Selection;

/// <summary>What was chosen for one surface, and what is missing.</summary>
public sealed class SurfaceSelection
{
    private readonly SelectedPart[] parts;
    private readonly SelectionGap[] gaps;

    internal SurfaceSelection(SurfaceContext surface, List<SelectedPart> parts, List<SelectionGap> gaps)
    {
        Surface = surface;
        this.parts = [.. parts];
        this.gaps = [.. gaps];
    }

    /// <summary>The surface.</summary>
    public SurfaceContext Surface { get; }

    /// <summary>The parts: still air first, then the devices in the order of the room.</summary>
    public IReadOnlyList<SelectedPart> Parts => parts;

    /// <summary>What no correlation covers.</summary>
    public IReadOnlyList<SelectionGap> Gaps => gaps;
}
