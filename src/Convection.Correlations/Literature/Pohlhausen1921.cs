using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// E. Pohlhausen, "Der Wärmeaustausch zwischen festen Körpern und Flüssigkeiten mit kleiner Reibung und kleiner
/// Wärmeleitung", Zeitschrift für Angewandte Mathematik und Mechanik 1, 115–121, 1921 (recalled).
/// </summary>
/// <remarks>
/// <para>Basis: theory of the laminar boundary layer on a flat plate; mean value over the plate.</para>
/// <para>Symbols: Nu = h·L/k, Re = U·L/ν, L along the flow. Nu = 0.664·Re^(1/2)·Pr^(1/3).</para>
/// <para>Range: Re up to 5e5, Pr from 0.6. Reference: air outside the boundary layer. Properties at film temperature.</para>
/// <para>Check: quoted in Çengel &amp; Ghajar, Heat and Mass Transfer, problem 7-17.</para>
/// </remarks>
internal static class Pohlhausen1921
{
    public static Publication Publication { get; } = new()
    {
        Key = "pohlhausen-1921",
        Authors = "E. Pohlhausen",
        Year = 1921,
        Title = "Der Wärmeaustausch zwischen festen Körpern und Flüssigkeiten mit kleiner Reibung und kleiner Wärmeleitung",
        Source = "Zeitschrift für Angewandte Mathematik und Mechanik 1, 115-121",
        ShortName = "Pohlhausen (1921)",
    };

    public static Correlation[] All { get; } =
    [
        new()
        {
            Id = CorrelationId.Parse("pohlhausen-1921/plate-laminar"),
            Title = "flat plate, laminar boundary layer",
            Publication = Publication,
            Family = CorrelationFamily.Forced,
            Applies = new() { Surfaces = SurfaceSet.Any, Driver = FlowDriver.AirStream },
            Law = new PowerLaw(new ReynoldsTerm(0.664, 1.0 / 2, 1.0 / 3)),
            Reference = ReferenceTemperature.FreeStream,
            Length = CharacteristicLength.AlongFlow,
            Range = new(
                new RangeLimit(RangeVariable.Reynolds, Interval.UpTo(5e5), RangeOrigin.Source, CharacteristicLength.AlongFlow),
                new RangeLimit(RangeVariable.Prandtl, Interval.From(0.6), RangeOrigin.Source)),
            Evidence = new(EvidenceKind.Analytical, "theory of the laminar boundary layer on a flat plate"),
            TextCheck = TextCheck.Quoted,
            Doubts = ["At room speeds the number says laminar, yet supply air is disturbed: for a stream from a fan or jet the turbulent form is nearer."],
        },
    ];
}
