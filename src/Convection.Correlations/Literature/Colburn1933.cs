using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// A.P. Colburn, "A method of correlating forced convection heat transfer data", Transactions of the American Institute of
/// Chemical Engineers 29, 174–210, 1933 (recalled): the analogy; the forms are those of the textbooks.
/// </summary>
/// <remarks>
/// <para>Basis: turbulent friction on a flat plate and the analogy of heat and momentum transfer; mean value over the plate.</para>
/// <para>
/// Symbols: Nu = h·L/k, Re = U·L/ν, L along the flow. Turbulent from the edge: Nu = 0.037·Re^0.8·Pr^(1/3). Laminar first, then
/// turbulent: Nu = (0.037·Re^0.8 − 871)·Pr^(1/3).
/// </para>
/// <para>
/// Range: Re 5e5–1e7 and 5e5–1e8. Room-height walls at 0.05–0.5 m/s have Re 8e3–8e4: laminar by number, turbulent in practice. The
/// turbulent form is used lower for such disturbed air; this library lets it reach down to 1.5e4, where it crosses the laminar law. Reference: air outside the boundary layer. Properties at film
/// temperature.
/// </para>
/// <para>Check: turbulent form recalled (high); the mixed form meets the laminar law at Re 5e5 within 0.1 %.</para>
/// </remarks>
internal static class Colburn1933
{
    private static readonly PowerLaw TurbulentFromTheEdge = new(new ReynoldsTerm(0.037, 0.8, 1.0 / 3));

    private static readonly TwoAsymptoteLaw LaminarThenTurbulent = new(
        new ReynoldsTerm(-871, 0, 1.0 / 3),
        new ReynoldsTerm(0.037, 0.8, 1.0 / 3),
        1,
        "Nu = (0.037·Re^0.8 − 871)·Pr^(1/3)");

    public static Publication Publication { get; } = new()
    {
        Key = "colburn-1933",
        Authors = "A.P. Colburn",
        Year = 1933,
        Title = "A method of correlating forced convection heat transfer data",
        Source = "Transactions of the American Institute of Chemical Engineers 29, 174-210",
        ShortName = "Colburn (1933), textbook form",
    };

    public static Correlation[] All { get; } =
    [
        new()
        {
            Id = CorrelationId.Parse("colburn-1933/plate-turbulent"),
            Title = "flat plate, turbulent from the edge",
            Publication = Publication,
            Family = CorrelationFamily.Forced,
            Applies = new()
            {
                Surfaces = SurfaceSet.Any,
                Driver = FlowDriver.AirStream,
                Condition = (_, device) => device is AirStream { IsTurbulent: true },
                ConditionText = "the stream is disturbed, as from a fan or jet",
            },
            Law = TurbulentFromTheEdge,
            Reference = ReferenceTemperature.FreeStream,
            Length = CharacteristicLength.AlongFlow,
            Range = new(new RangeLimit(RangeVariable.Reynolds, new(5e5, 1e7), RangeOrigin.Recalled, CharacteristicLength.AlongFlow)
            {
                Extended = new Interval(1.5e4, 1e7),
                Note = "Used below its range for surfaces swept by disturbed air, down to where it crosses the laminar law (a choice of this library).",
            }),
            Evidence = new(EvidenceKind.Plate, "friction of flat plates and the analogy of heat and momentum transfer"),
            TextCheck = TextCheck.RecalledHigh,
            IsUnconfirmed = true,
            Doubts = ["Below Re 5e5 its use for surfaces swept by disturbed air is an engineering habit; along 2.5 m at 0.5 m/s it is 1.6 times the laminar law."],
        },
        new()
        {
            Id = CorrelationId.Parse("colburn-1933/plate-mixed-boundary-layer"),
            Title = "flat plate, laminar then turbulent",
            Publication = Publication,
            Family = CorrelationFamily.Forced,
            Applies = new() { Surfaces = SurfaceSet.Any, Driver = FlowDriver.AirStream },
            Law = LaminarThenTurbulent,
            Reference = ReferenceTemperature.FreeStream,
            Length = CharacteristicLength.AlongFlow,
            Range = new(new RangeLimit(RangeVariable.Reynolds, new(5e5, 1e8), RangeOrigin.Recalled, CharacteristicLength.AlongFlow)),
            Evidence = new(EvidenceKind.Plate, "friction of flat plates and the analogy of heat and momentum transfer"),
            TextCheck = TextCheck.Reconstructed,
            Doubts = ["Below Re 5e5 the laminar law applies; the constant 871 belongs to a transition there."],
        },
    ];
}
