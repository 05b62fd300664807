using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Registry;

/// <summary>Words for evidence, text check, reference and surfaces.</summary>
internal static class EvidenceText
{
    public static string Of(EvidenceKind kind) => kind switch
    {
        EvidenceKind.FullScaleRoom => "full-scale room",
        EvidenceKind.ClimateChamber => "climate chamber",
        EvidenceKind.Plate => "plate data",
        EvidenceKind.Analytical => "theory or computation",
        EvidenceKind.Handbook => "handbook",
        EvidenceKind.Standard => "convention of a standard",
        _ => kind.ToString(),
    };

    public static string Of(TextCheck check) => check switch
    {
        TextCheck.FirstHand => "first-hand numbers",
        TextCheck.Quoted => "text compared with print",
        TextCheck.Reconstructed => "text confirmed by independent calculation",
        TextCheck.RecalledHigh => "text recalled, high confidence",
        TextCheck.RecalledMedium => "text recalled, medium confidence",
        TextCheck.RecalledLow => "text recalled, low confidence",
        _ => check.ToString(),
    };

    public static string Of(ReferenceTemperature reference) => reference switch
    {
        ReferenceTemperature.RoomAir => "room air",
        ReferenceTemperature.LocalAir => "local air",
        ReferenceTemperature.OutletAir => "outlet air",
        ReferenceTemperature.SupplyAir => "supply air",
        ReferenceTemperature.FreeStream => "undisturbed air",
        ReferenceTemperature.Operative => "operative temperature",
        _ => "no reference",
    };

    public static string Of(SurfaceSet surfaces) => surfaces switch
    {
        SurfaceSet.Any => "any surface",
        SurfaceSet.Horizontal => "floors and ceilings",
        SurfaceSet.Wall | SurfaceSet.Window => "upright surfaces",
        SurfaceSet.Wall => "walls",
        SurfaceSet.Window => "windows",
        SurfaceSet.Floor => "floors",
        SurfaceSet.Ceiling => "ceilings",
        SurfaceSet.Inclined => "inclined surfaces",
        SurfaceSet.Window | SurfaceSet.Inclined => "windows at any tilt",
        _ => surfaces.ToString(),
    };

    public static string Of(SurfaceKind kind) => kind.ToString().ToLowerInvariant();
}
