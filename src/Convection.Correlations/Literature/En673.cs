using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>EN 673:2011, Glass in building. Determination of thermal transmittance; ISO 10292:1994.</summary>
/// <remarks>
/// <para>Basis: a convention for glazing: 3.6 W/(m²·K) for free convection on vertical glass, against room air.</para>
/// <para>Check: recalled (high); with the radiative part 4.1·ε/0.837 the total is 7.7 for plain glass.</para>
/// </remarks>
internal static class En673
{
    public static Publication Publication { get; } = new()
    {
        Key = "en-673-2011",
        Authors = "CEN",
        Year = 2011,
        Title = "EN 673, Glass in building - Determination of thermal transmittance (U value); ISO 10292:1994",
        Source = "European Committee for Standardization, Brussels",
        ShortName = "EN 673 (2011)",
    };

    public static Correlation[] All { get; } =
    [
        Make("glazing-vertical", "convention for vertical glazing", SurfaceSet.Window, HeatFlowSense.Horizontal, new PowerLaw(3.6, 0), TextCheck.RecalledHigh, "A convention for comparing glazings."),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, Law law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.FixedValue,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.StillAir },
        Law = law,
        Reference = ReferenceTemperature.RoomAir,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.Standard, "a convention for glazing"),
        TextCheck = check,
        IsUnconfirmed = check >= TextCheck.RecalledHigh,
        Doubts = doubts,
    };
}
