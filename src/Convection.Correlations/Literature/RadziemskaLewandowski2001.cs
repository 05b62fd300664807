using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>E. Radziemska, W.M. Lewandowski, Applied Energy 68(4), 347–366, 2001 (title not recorded).</summary>
/// <remarks>
/// <para>Measured: plates with the warm side down (recalled).</para>
/// <para>Symbols: Nu and Ra on A/P. Nu = 0.52·Ra^(1/5).</para>
/// <para>
/// Range: Ra 1e4–1e9, Pr from 0.7 (recalled, high); course notes that quote the formula print 1e5–1e10, which looks copied from
/// another row. Reference: undisturbed fluid.
/// </para>
/// </remarks>
internal static class RadziemskaLewandowski2001
{
    public static Publication Publication { get; } = new()
    {
        Key = "radziemska-lewandowski-2001",
        Authors = "E. Radziemska, W.M. Lewandowski",
        Year = 2001,
        Title = "(title not recorded)",
        Source = "Applied Energy 68(4), 347-366",
        ShortName = "Radziemska & Lewandowski (2001)",
    };

    public static Correlation[] All { get; } =
    [
        new()
        {
            Id = CorrelationId.Parse("radziemska-lewandowski-2001/horizontal-down"),
            Title = "isolated warm plate facing down or cool plate facing up",
            Publication = Publication,
            Family = CorrelationFamily.Buoyant,
            Applies = new() { Surfaces = SurfaceSet.Horizontal, Sense = HeatFlowSense.Down, Driver = FlowDriver.SelfHeated },
            Law = new PowerLaw(new RayleighTerm(0.52, 1.0 / 5, CharacteristicLength.AreaToPerimeter)),
            Reference = ReferenceTemperature.FreeStream,
            Length = CharacteristicLength.AreaToPerimeter,
            Range = new(
                new RangeLimit(RangeVariable.Rayleigh, new(1e4, 1e9), RangeOrigin.Recalled, CharacteristicLength.AreaToPerimeter),
                new RangeLimit(RangeVariable.Prandtl, Interval.From(0.7), RangeOrigin.Recalled)),
            Evidence = new(EvidenceKind.Plate, "isolated plates with the warm side down"),
            TextCheck = TextCheck.Quoted,
            Doubts = ["Course notes print the range as 1e5 to 1e10, which looks copied from another form; 1e4 to 1e9 is recalled (high)."],
        },
    ];
}
