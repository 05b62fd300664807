using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// J.R. Lloyd, W.R. Moran, "Natural convection adjacent to horizontal surface of various planforms", Journal of Heat Transfer
/// 96(4), 443–447, 1974.
/// </summary>
/// <remarks>
/// <para>Measured: mass transfer from small plates of several shapes facing up, an analogue of heat transfer.</para>
/// <para>Symbols: Nu and Ra on A/P, area over perimeter, a quarter of 4A/P. Nu = 0.54·Ra^(1/4), then 0.15·Ra^(1/3).</para>
/// <para>
/// Range: 2.2e4–8e6 and 8e6–1.6e9 (also recalled as 2.6e4, 1e7 and 1.5e9). The wide range 1e7–1e11 is what most textbooks print.
/// Reference: undisturbed fluid. Check: the wide form is quoted in course notes and by a worked number in Çengel, Cimbala and
/// Turner, problem 20-34; it steps up by 6 % from the laminar one at 1e7.
/// </para>
/// </remarks>
internal static class LloydMoran1974
{
    public static Publication Publication { get; } = new()
    {
        Key = "lloyd-moran-1974",
        Authors = "J.R. Lloyd, W.R. Moran",
        Year = 1974,
        Title = "Natural convection adjacent to horizontal surface of various planforms",
        Source = "Journal of Heat Transfer 96(4), 443-447",
        ShortName = "Lloyd & Moran (1974)",
    };

    public static Correlation[] All { get; } =
    [
        Make("horizontal-up-turbulent-wide", "isolated warm plate facing up, turbulent, textbook range", 0.15, 1.0 / 3, new(1e7, 1e11), RangeOrigin.Source, TextCheck.Quoted, "Steps up by 6 % from 0.54 Ra^(1/4) at Ra 1e7."),
        Make("horizontal-up-laminar", "isolated warm plate facing up, laminar", 0.54, 1.0 / 4, new(2.2e4, 8e6), RangeOrigin.Recalled, TextCheck.RecalledHigh, "Limits also recalled as 2.6e4 and 1e7."),
        Make("horizontal-up-turbulent", "isolated warm plate facing up, turbulent", 0.15, 1.0 / 3, new(8e6, 1.6e9), RangeOrigin.Recalled, TextCheck.RecalledHigh, "Upper limit also recalled as 1.5e9."),
    ];

    private static Correlation Make(string name, string title, double c, double n, Interval rayleigh, RangeOrigin origin, TextCheck check, string doubt) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Buoyant,
        Applies = new() { Surfaces = SurfaceSet.Horizontal, Sense = HeatFlowSense.Up, Driver = FlowDriver.SelfHeated },
        Law = new PowerLaw(new RayleighTerm(c, n, CharacteristicLength.AreaToPerimeter)),
        Reference = ReferenceTemperature.FreeStream,
        Length = CharacteristicLength.AreaToPerimeter,
        Range = new(new RangeLimit(RangeVariable.Rayleigh, rayleigh, origin, CharacteristicLength.AreaToPerimeter)),
        Evidence = new(EvidenceKind.Plate, "mass transfer from small plates facing up, an analogue of heat transfer"),
        TextCheck = check,
        IsUnconfirmed = check >= TextCheck.RecalledHigh,
        Doubts = [doubt, "Mass transfer on small plates; the length is A/P, a quarter of 4A/P."],
    };
}
