using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// R.J. Goldstein, E.M. Sparrow, D.C. Jones, "Natural convection mass transfer adjacent to horizontal plates", International
/// Journal of Heat and Mass Transfer 16(5), 1025–1035, 1973.
/// </summary>
/// <remarks>
/// <para>Measured: naphthalene plates facing up (mass transfer).</para>
/// <para>Symbols: Nu and Ra on A/P. Nu = 0.96·Ra^(1/6) for 1–200, 0.59·Ra^(1/4) for 200–1e4 (recalled, high).</para>
/// <para>Reference: undisturbed air. Of no use at the size of a room.</para>
/// </remarks>
internal static class Goldstein1973
{
    public static Publication Publication { get; } = new()
    {
        Key = "goldstein-1973",
        Authors = "R.J. Goldstein, E.M. Sparrow, D.C. Jones",
        Year = 1973,
        Title = "Natural convection mass transfer adjacent to horizontal plates",
        Source = "International Journal of Heat and Mass Transfer 16(5), 1025-1035",
        ShortName = "Goldstein et al. (1973)",
    };

    public static Correlation[] All { get; } =
    [
        Make("horizontal-up-very-small", "very small plate facing up", 0.96, 1.0 / 6, new(1, 200)),
        Make("horizontal-up-small", "small plate facing up", 0.59, 1.0 / 4, new(200, 1e4)),
    ];

    private static Correlation Make(string name, string title, double c, double n, Interval rayleigh) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Buoyant,
        Applies = new() { Surfaces = SurfaceSet.Horizontal, Sense = HeatFlowSense.Up, Driver = FlowDriver.SelfHeated },
        Law = new PowerLaw(new RayleighTerm(c, n, CharacteristicLength.AreaToPerimeter)),
        Reference = ReferenceTemperature.FreeStream,
        Length = CharacteristicLength.AreaToPerimeter,
        Range = new(new RangeLimit(RangeVariable.Rayleigh, rayleigh, RangeOrigin.Recalled, CharacteristicLength.AreaToPerimeter)),
        Evidence = new(EvidenceKind.Plate, "mass transfer from small naphthalene plates facing up"),
        TextCheck = TextCheck.RecalledHigh,
        IsUnconfirmed = true,
        Doubts = ["Of no use at the size of a room."],
    };
}
