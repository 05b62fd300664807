using System;
using UnitsNet;

namespace Convection.Correlations.Surfaces;

/// <summary>One room-side surface: what it is, how it is tilted, how large it is, and whether it is heated or chilled.</summary>
/// <remarks>
/// <para>
/// The outline (width and height) gives the lengths that correlations use. Where a window is cut out of a wall, give
/// <see cref="AreaSquareMetres"/> as the area that is left: it weighs the surface in sums over the room, and the lengths
/// stay those of the outline, because the boundary layer runs over the whole wall.
/// </para>
/// <para>Immutable and safe to share between threads. Temperatures are no part of it: they come with each step.</para>
/// </remarks>
public sealed partial record SurfaceContext
{
    private double? area;
    private double? perimeter;
    private double? flowLength;

    /// <summary>A surface with a rectangular outline, in metres and degrees.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <param name="kind">Wall, window, floor or ceiling.</param>
    /// <param name="widthMetres">Horizontal side [m], in (0, 1000]; for a floor or ceiling either side.</param>
    /// <param name="heightMetres">Other side [m], in (0, 1000]: the height of a wall, along the slope if tilted.</param>
    /// <exception cref="ArgumentException">The name is empty.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A length is outside its interval or not a number, or the kind is not given.</exception>
    public SurfaceContext(string name, SurfaceKind kind, double widthMetres, double heightMetres)
    {
        Name = Require.Name(name, nameof(name));
        Kind = Require.Defined(kind, SurfaceKind.Unspecified, "Kind of surface '" + name + "'", nameof(kind));
        WidthMetres = Length(widthMetres, "Width", nameof(widthMetres));
        HeightMetres = Length(heightMetres, "Height", nameof(heightMetres));
        TiltDegrees = kind switch { SurfaceKind.Floor => 0, SurfaceKind.Ceiling => 180, _ => 90 };
    }

    /// <summary>Name, unique in its room.</summary>
    public string Name { get; }

    /// <summary>What the surface is.</summary>
    public SurfaceKind Kind { get; }

    /// <summary>Whether it is heated or chilled on purpose. The default is passive.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is none of the named ones.</exception>
    public SurfaceRole Role
    {
        get;
        init => field = value == SurfaceRole.Passive ? value : Require.Defined(value, SurfaceRole.Passive, "Role of surface '" + Name + "'", nameof(Role));
    }

    /// <summary>Horizontal side of the outline [m].</summary>
    public double WidthMetres { get; }

    /// <summary>Height of the outline [m]: upright for a wall, along the slope if tilted, the other side of a floor or ceiling.</summary>
    public double HeightMetres { get; }

    /// <summary>
    /// Angle between straight up and the direction in which the surface faces [°], 0 to 180: 0 faces up (floor), 90 is
    /// upright, 180 faces down (ceiling).
    /// </summary>
    /// <remarks>The default follows from the kind. A floor faces up and a ceiling down: at most and at least 90°.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">The angle is outside its interval or not a number.</exception>
    public double TiltDegrees
    {
        get;
        init => field = Require.Within(
            value,
            Kind == SurfaceKind.Ceiling ? 90 : 0,
            Kind == SurfaceKind.Floor ? 90 : 180,
            "Tilt of surface '" + Name + "'",
            "°",
            nameof(TiltDegrees));
    }

    /// <summary>Area that exchanges heat with the room [m²]; that of the outline unless given.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The area is not positive, above 1 000 000 m² or not a number.</exception>
    public double AreaSquareMetres
    {
        get => area ?? WidthMetres * HeightMetres;
        init => area = Require.Positive(value, 1e6, "Area of surface '" + Name + "'", "m²", nameof(AreaSquareMetres));
    }

    /// <summary>Perimeter of the outline [m]; that of the rectangle unless given.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The perimeter is not positive, above 10 000 m or not a number.</exception>
    public double PerimeterMetres
    {
        get => perimeter ?? 2 * (WidthMetres + HeightMetres);
        init => perimeter = Require.Positive(value, 1e4, "Perimeter of surface '" + Name + "'", "m", nameof(PerimeterMetres));
    }

    /// <summary>Length along an air stream that sweeps the surface [m]; the height of a wall or slope, the shorter side of a floor or ceiling unless given.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The length is not positive, above 1000 m or not a number.</exception>
    public double FlowLengthMetres
    {
        get => flowLength ?? (IsHorizontal ? ShortSideMetres : HeightMetres);
        init => flowLength = Length(value, "Length along the flow", nameof(FlowLengthMetres));
    }

    /// <summary>Shorter side of the outline [m].</summary>
    public double ShortSideMetres => Math.Min(WidthMetres, HeightMetres);

    /// <summary>Hydraulic diameter 4A/P of the outline [m].</summary>
    public double HydraulicDiameterMetres => 4 * WidthMetres * HeightMetres / PerimeterMetres;

    /// <summary>Area over perimeter A/P of the outline [m], a quarter of the hydraulic diameter.</summary>
    public double AreaToPerimeterMetres => WidthMetres * HeightMetres / PerimeterMetres;

    /// <summary>Horizontal side of the outline.</summary>
    public Length Width => UnitsNet.Length.FromMeters(WidthMetres);

    /// <summary>Height of the outline.</summary>
    public Length Height => UnitsNet.Length.FromMeters(HeightMetres);

    /// <summary>Tilt.</summary>
    public Angle Tilt => Angle.FromDegrees(TiltDegrees);

    /// <summary>Area that exchanges heat with the room.</summary>
    public Area Area => UnitsNet.Area.FromSquareMeters(AreaSquareMetres);

    /// <summary>Perimeter of the outline.</summary>
    public Length Perimeter => UnitsNet.Length.FromMeters(PerimeterMetres);

    /// <summary>Hydraulic diameter 4A/P of the outline.</summary>
    public Length HydraulicDiameter => UnitsNet.Length.FromMeters(HydraulicDiameterMetres);

    /// <summary>True within 5° of upright.</summary>
    public bool IsUpright => Math.Abs(TiltDegrees - 90) <= HorizontalOrUprightToleranceDegrees;

    /// <summary>True within 5° of facing straight up or straight down.</summary>
    public bool IsHorizontal => TiltDegrees <= HorizontalOrUprightToleranceDegrees || TiltDegrees >= 180 - HorizontalOrUprightToleranceDegrees;

    /// <summary>Name, kind and outline in one line.</summary>
    /// <returns>The text, the same in every culture.</returns>
    public override string ToString()
        => Name + " (" + (Role == SurfaceRole.Passive ? string.Empty : Lower(Role.ToString()) + " ") + Lower(Kind.ToString())
            + (IsUpright || IsHorizontal ? string.Empty : " tilted " + InvariantText.Number(TiltDegrees, "°"))
            + ", " + InvariantText.Number(WidthMetres) + " m × " + InvariantText.Number(HeightMetres) + " m)";

    private const double HorizontalOrUprightToleranceDegrees = 5;

    private static string Lower(string word) => word.ToLowerInvariant();

    private double Length(double value, string what, string parameter)
        => Require.Positive(value, 1000, what + " of surface '" + Name + "'", "m", parameter);
}
