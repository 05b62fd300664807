using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// H.B. Awbi, A. Hatton, "Natural convection from heated room surfaces", Energy and Buildings 30(3), 233–244, 1999,
/// doi:10.1016/S0378-7788(99)00004-3 (recalled, high).
/// </summary>
/// <remarks>
/// <para>
/// Measured: a climate chamber of room size, about 2.78 m × 2.30 m × 2.78 m (recalled, medium), and a small box; one surface
/// heated, others cooled.
/// </para>
/// <para>Symbols: |ΔT| surface against local air [K], Dh = 4A/P of the heated surface [m], h in W/(m²·K).</para>
/// <para>
/// Range in Gr on Dh (recalled, high): wall 9e8–6e10, floor 9e8–7e10, ceiling 9e8–1e11. Reference: air just outside the
/// boundary layer, about 0.1 m from the surface (recalled, medium).
/// </para>
/// <para>
/// Check: the length exponents obey 3n − 1; for wall and floor the Nusselt form recalled apart agrees within 3 %. For the
/// ceiling it does not: 0.704 stands 28 % above what 1.78 Gr^0.133 gives. The dimensional form is kept, being the more widely
/// printed one, and flagged. As h goes with Dh^(−0.6) it must not be used for large ceilings.
/// </para>
/// </remarks>
internal static class AwbiHatton1999
{
    public static Publication Publication { get; } = new()
    {
        Key = "awbi-hatton-1999",
        Authors = "H.B. Awbi, A. Hatton",
        Year = 1999,
        Title = "Natural convection from heated room surfaces",
        Source = "Energy and Buildings 30(3), 233-244",
        Doi = "10.1016/S0378-7788(99)00004-3",
        ShortName = "Awbi & Hatton (1999)",
    };

    public static Correlation[] All { get; } =
    [
        Make("wall-heated", "heated wall", SurfaceSet.Wall, HeatFlowSense.Horizontal, 1.823, 0.293, -0.121, 6e10, TextCheck.Reconstructed),
        Make("floor-heated", "heated floor", SurfaceSet.Floor, HeatFlowSense.Up, 2.175, 0.308, -0.076, 7e10, TextCheck.Reconstructed),
        Make(
            "ceiling-heated",
            "heated ceiling",
            SurfaceSet.Ceiling,
            HeatFlowSense.Down,
            0.704,
            0.133,
            -0.601,
            1e11,
            TextCheck.RecalledMedium,
            "The constant is in conflict: the Nusselt form 1.78 Gr^0.133 gives 0.545 to 0.550 in its place, 22 % less.",
            "Not for large ceilings: the coefficient goes with Dh^(-0.6)."),
    ];

    private static Correlation Make(
        string name,
        string title,
        SurfaceSet surface,
        HeatFlowSense sense,
        double coefficient,
        double exponent,
        double lengthExponent,
        double highestGrashof,
        TextCheck check,
        params string[] doubts) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = CorrelationFamily.Buoyant,
            Applies = new() { Surfaces = surface, Sense = sense, Side = SurfaceSide.Warmer, Driver = FlowDriver.SelfHeated },
            Law = new PowerLaw(coefficient, exponent, CharacteristicLength.HydraulicDiameter, lengthExponent),
            Reference = ReferenceTemperature.LocalAir,
            Length = CharacteristicLength.HydraulicDiameter,
            Range = new(new RangeLimit(RangeVariable.Grashof, new(9e8, highestGrashof), RangeOrigin.Recalled, CharacteristicLength.HydraulicDiameter)),
            Evidence = new(EvidenceKind.ClimateChamber, "climate chamber of about 2.78 m x 2.30 m x 2.78 m (recalled, medium) and a small box; one surface heated, others cooled"),
            TextCheck = check,
            IsUnconfirmed = check >= TextCheck.RecalledMedium,
            Doubts = [.. doubts, "The reference, local air about 0.1 m from the surface, is recalled (medium)."],
        };
}
