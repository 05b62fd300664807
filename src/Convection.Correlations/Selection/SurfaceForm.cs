using System;
using Convection.Correlations.Registry;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Selection;

/// <summary>Which published form a surface takes, and the sense of heat flow on each of its sides of the air's temperature.</summary>
internal static class SurfaceForm
{
    private const double FloorLimitDegrees = 45, CeilingLimitDegrees = 135;

    /// <summary>Floor, ceiling, wall or window: by tilt first, then by kind.</summary>
    public static SurfaceSet Of(SurfaceContext surface)
        => surface.TiltDegrees <= FloorLimitDegrees ? SurfaceSet.Floor
            : surface.TiltDegrees >= CeilingLimitDegrees ? SurfaceSet.Ceiling
            : surface.Kind == SurfaceKind.Window ? SurfaceSet.Window
            : SurfaceSet.Wall;

    /// <summary>True where the surface is neither upright nor horizontal, so that its form is only the nearest one.</summary>
    public static bool IsInclined(SurfaceContext surface) => !surface.IsUpright && !surface.IsHorizontal;

    /// <summary>Sideways at an upright surface; else up where warm air can rise from the surface, down where it is held.</summary>
    public static HeatFlowSense Sense(SurfaceContext surface, SurfaceSide side)
        => surface.IsUpright ? HeatFlowSense.Horizontal
            : surface.TiltDegrees < 90 == (side == SurfaceSide.Warmer) ? HeatFlowSense.Up
            : HeatFlowSense.Down;

    /// <summary>True where a law for a sense of heat flow may serve: the surface's own, or sideways for a tilted surface that takes a wall's form.</summary>
    public static bool Fits(HeatFlowSense sense, SurfaceContext surface, SurfaceSide side)
        => sense == HeatFlowSense.Any
            || sense == Sense(surface, side)
            || (sense == HeatFlowSense.Horizontal && IsInclined(surface) && Of(surface) is SurfaceSet.Wall or SurfaceSet.Window);

    /// <summary>How well a correlation's surfaces cover this one: 0 exactly, 1 nearly, 3 as any; null not at all.</summary>
    public static int? Match(SurfaceSet covered, SurfaceContext surface)
    {
        SurfaceSet form = Of(surface);
        bool inclined = IsInclined(surface);
        bool near = (covered & form) != 0 || (form == SurfaceSet.Window && (covered & SurfaceSet.Wall) != 0);
        return covered == SurfaceSet.Any ? 3
            : (covered & SurfaceSet.Inclined) != 0 && (inclined || IsGlazing(covered, surface)) ? 0
            : !near ? null
            : inclined || (covered & form) == 0 ? 1
            : 0;
    }

    private static bool IsGlazing(SurfaceSet covered, SurfaceContext surface)
        => surface.Kind == SurfaceKind.Window && (covered & SurfaceSet.Window) != 0;

    public static string Word(SurfaceContext surface, SurfaceSide side)
    {
        string role = surface.Role == SurfaceRole.Passive ? string.Empty : surface.Role.ToString().ToLowerInvariant() + " ";
        string tilt = IsInclined(surface) ? " tilted " + InvariantText.Number(surface.TiltDegrees, "°") : string.Empty;
        return role + EvidenceText.Of(surface.Kind) + tilt + side switch
        {
            SurfaceSide.Warmer => " warmer than the air",
            SurfaceSide.Cooler => " cooler than the air",
            _ => string.Empty,
        };
    }

    public static string NearestWord(SurfaceContext surface) => Of(surface) switch
    {
        SurfaceSet.Floor => "floor",
        SurfaceSet.Ceiling => "ceiling",
        SurfaceSet.Window => "window",
        SurfaceSet.Wall => "wall",
        _ => throw new InvalidOperationException("A surface has one form."),
    };
}
