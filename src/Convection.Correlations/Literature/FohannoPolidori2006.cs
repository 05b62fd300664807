using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// S. Fohanno, G. Polidori, "Modelling of natural convective heat transfer at an internal surface", Energy and Buildings 38(5),
/// 548–553, 2006, doi:10.1016/j.enbuild.2005.09.003.
/// </summary>
/// <remarks>
/// <para>Basis: an integral boundary-layer model of a heated wall at constant flux, checked on room data.</para>
/// <para>
/// Symbols: |ΔT| surface against air outside the boundary layer [K], H height [m], h in W/(m²·K); Ra* = g·β·q·H⁴·Pr/(k·ν²) with the
/// flux q = h·|ΔT|. Laminar 1.332·(|ΔT|/H)^(1/4), turbulent 1.235·exp(0.0467·H)·|ΔT|^0.316.
/// </para>
/// <para>
/// Range: the branches change at Ra* = 6.3e9 (recalled, high), H up to 3 m (recalled, medium). They do not join: turbulent stands
/// −7 % (H 0.5 m) to +11 % (2.5 m) off the laminar one there. Walls of room height are always turbulent.
/// </para>
/// <para>Check: the laminar branch equals Nu = 0.52·Ra^(1/4) within 2 % (reconstructed); the turbulent one is recalled (high).</para>
/// </remarks>
internal static class FohannoPolidori2006
{
    private const double Switch = 6.3e9;
    private const string JointDoubt = "The branches do not join at Ra* = 6.3e9: turbulent over laminar is -7 % at 0.5 m and +11 % at 2.5 m.";

    public static Publication Publication { get; } = new()
    {
        Key = "fohanno-polidori-2006",
        Authors = "S. Fohanno, G. Polidori",
        Year = 2006,
        Title = "Modelling of natural convective heat transfer at an internal surface",
        Source = "Energy and Buildings 38(5), 548-553",
        Doi = "10.1016/j.enbuild.2005.09.003",
        ShortName = "Fohanno & Polidori (2006)",
    };

    public static Correlation[] All { get; } =
    [
        Make(
            "vertical-laminar",
            "heated wall, laminar",
            new PowerLaw(1.332, 1.0 / 4, CharacteristicLength.Height, -1.0 / 4),
            TextCheck.Reconstructed,
            [new RangeLimit(RangeVariable.ModifiedRayleigh, Interval.UpTo(Switch), RangeOrigin.Recalled, CharacteristicLength.Height)],
            JointDoubt),
        Make(
            "vertical-turbulent",
            "heated wall, turbulent",
            new PowerLaw(new PowerTerm(1.235, 0.316, factor: b => Math.Exp(0.0467 * b.Surface.HeightMetres), factorText: "exp(0.0467·H)")),
            TextCheck.RecalledHigh,
            [
                new RangeLimit(RangeVariable.ModifiedRayleigh, Interval.From(Switch), RangeOrigin.Recalled, CharacteristicLength.Height),
                new RangeLimit(RangeVariable.Height, Interval.UpTo(3), RangeOrigin.Recalled),
            ],
            JointDoubt,
            "The limit of 3 m in height is recalled (medium)."),
    ];

    private static Correlation Make(string name, string title, Law law, TextCheck check, RangeLimit[] limits, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Buoyant,
        Applies = new() { Surfaces = SurfaceSet.Wall, Sense = HeatFlowSense.Horizontal, Driver = FlowDriver.SelfHeated },
        Law = law,
        Reference = ReferenceTemperature.LocalAir,
        Length = CharacteristicLength.Height,
        Range = new(limits),
        Evidence = new(EvidenceKind.Analytical, "integral boundary-layer model of a wall at constant flux, checked on room data"),
        TextCheck = check,
        Doubts = doubts,
    };
}
