using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Registry;

/// <summary>What a correlation applies to: surface, heat-flow sense, what drives the flow, and where the surface stands.</summary>
public sealed record Applicability
{
    /// <summary>Surfaces that the source measured or means.</summary>
    public required SurfaceSet Surfaces { get; init; }

    /// <summary>Sense of the heat flow.</summary>
    public HeatFlowSense Sense { get; init; } = HeatFlowSense.Any;

    /// <summary>Whether only warmer or only cooler surfaces are meant.</summary>
    public SurfaceSide Side { get; init; }

    /// <summary>What drives the flow.</summary>
    public required FlowDriver Driver { get; init; }

    /// <summary>Where the surface must stand to the device; unspecified where it does not matter.</summary>
    public Placement Placement { get; init; }

    /// <summary>A further condition on surface and device; null for none.</summary>
    public Func<SurfaceContext, FlowDescriptor, bool>? Condition { get; init; }

    /// <summary>That condition in words.</summary>
    public string ConditionText { get; init; } = string.Empty;
}
