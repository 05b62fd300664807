using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// F. Causone, S.P. Corgnati, M. Filippi, B.W. Olesen, "Experimental evaluation of heat transfer coefficients between radiant ceiling
/// and room", Energy and Buildings 41(6), 622–628, 2009.
/// </summary>
/// <remarks>
/// <para>Measured: a radiant ceiling in a climate chamber; constants over the range used.</para>
/// <para>
/// Values: convective 4.4 W/(m²·K) cooled, 0.3 heated, against room air. Range: not known. Check: recalled (medium); 0.3 agrees with Min et
/// al. at 15 K (0.28). The totals are held back: 13.2 does not equal 5.6 + 4.4.
/// </para>
/// </remarks>
internal static class Causone2009
{
    public static Publication Publication { get; } = new()
    {
        Key = "causone-2009",
        Authors = "F. Causone, S.P. Corgnati, M. Filippi, B.W. Olesen",
        Year = 2009,
        Title = "Experimental evaluation of heat transfer coefficients between radiant ceiling and room",
        Source = "Energy and Buildings 41(6), 622-628",
        ShortName = "Causone et al. (2009)",
    };

    public static Correlation[] All { get; } =
    [
        Make("ceiling-cooled-convective", "chilled ceiling, constant", SurfaceSet.Ceiling, HeatFlowSense.Up, new PowerLaw(4.4, 0), TextCheck.RecalledMedium, "A constant; the recalled totals of the same paper do not add up with it."),
        Make("ceiling-heated-convective", "heated ceiling, constant", SurfaceSet.Ceiling, HeatFlowSense.Down, new PowerLaw(0.3, 0), TextCheck.RecalledMedium, "A constant; agrees with Min et al. at 15 K (0.28)."),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, Law law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.FixedValue,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.Panel },
        Law = law,
        Reference = ReferenceTemperature.RoomAir,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.ClimateChamber, "radiant ceiling in a climate chamber"),
        TextCheck = check,
        IsUnconfirmed = check >= TextCheck.RecalledHigh,
        Doubts = doubts,
    };
}
