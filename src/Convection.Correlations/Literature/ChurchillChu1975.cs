using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// S.W. Churchill, H.H.S. Chu, "Correlating equations for laminar and turbulent free convection from a vertical plate",
/// International Journal of Heat and Mass Transfer 18(11), 1323–1329, 1975, doi:10.1016/0017-9310(75)90243-4.
/// </summary>
/// <remarks>
/// <para>Measured: pooled data of isolated isothermal vertical plates in still, unbounded fluid.</para>
/// <para>
/// Symbols: Nu = h·H/k, Ra = g·β·|ΔT|·H³·Pr/ν² with the height H; f = [1 + (0.492/Pr)^(9/16)]. All ranges:
/// Nu = {0.825 + 0.387·Ra^(1/6)/f^(8/27)}². Laminar: Nu = 0.68 + 0.670·Ra^(1/4)/f^(4/9).
/// </para>
/// <para>Range: Ra up to 1e12; laminar form 0.1–1e9. Reference: undisturbed air. Properties at film temperature.</para>
/// <para>
/// Check: both quoted in an encyclopaedia article; the full-range form also used in a worked solution (Çengel, Heat and Mass
/// Transfer, problem 9-19E). One set of course notes prints 0.663 and Ra up to 1e8 for the laminar form; 0.670 gives 0.514 for
/// air, the similarity value being 0.515.
/// </para>
/// </remarks>
internal static class ChurchillChu1975
{
    private const double WholeConstant = 0.825, WholeSlope = 0.387;
    private const double LaminarConstant = 0.68, LaminarSlope = 0.670;

    public static Publication Publication { get; } = new()
    {
        Key = "churchill-chu-1975",
        Authors = "S.W. Churchill, H.H.S. Chu",
        Year = 1975,
        Title = "Correlating equations for laminar and turbulent free convection from a vertical plate",
        Source = "International Journal of Heat and Mass Transfer 18(11), 1323-1329",
        Doi = "10.1016/0017-9310(75)90243-4",
        ShortName = "Churchill & Chu (1975)",
    };

    public static Correlation[] All { get; } =
    [
        Make(
            "vertical-all",
            "isolated vertical plate, laminar to turbulent",
            Interval.UpTo(1e12),
            RangeOrigin.Recalled,

            // A square of a sum is a join with exponent 1/2 of the two squares.
            new TwoAsymptoteLaw(
                new RayleighTerm(WholeConstant * WholeConstant, 0, CharacteristicLength.Height),
                new RayleighTerm(WholeSlope * WholeSlope, 1.0 / 3, CharacteristicLength.Height, b => 1 / Math.Pow(PrandtlFactor(b), 16.0 / 27)),
                0.5,
                "Nu = {0.825 + 0.387·Ra^(1/6)/[1 + (0.492/Pr)^(9/16)]^(8/27)}²")),
        Make(
            "vertical-laminar",
            "isolated vertical plate, laminar",
            new Interval(0.1, 1e9),
            RangeOrigin.Source,
            new TwoAsymptoteLaw(
                new RayleighTerm(LaminarConstant, 0, CharacteristicLength.Height),
                new RayleighTerm(LaminarSlope, 1.0 / 4, CharacteristicLength.Height, b => 1 / Math.Pow(PrandtlFactor(b), 4.0 / 9)),
                1,
                "Nu = 0.68 + 0.670·Ra^(1/4)/[1 + (0.492/Pr)^(9/16)]^(4/9)"),
            "One set of course notes prints 0.663 and Ra up to 1e8."),
    ];

    private static double PrandtlFactor(LawBinding binding) => 1 + Math.Pow(0.492 / binding.Air.Prandtl, 9.0 / 16);

    private static Correlation Make(string name, string title, Interval rayleigh, RangeOrigin origin, Law law, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Buoyant,
        Applies = new() { Surfaces = SurfaceSet.Wall, Sense = HeatFlowSense.Horizontal, Driver = FlowDriver.SelfHeated },
        Law = law,
        Reference = ReferenceTemperature.FreeStream,
        Length = CharacteristicLength.Height,
        Range = new(new RangeLimit(RangeVariable.Rayleigh, rayleigh, origin, CharacteristicLength.Height)),
        Evidence = new(EvidenceKind.Plate, "pooled data of isolated isothermal vertical plates in still, unbounded fluid"),
        TextCheck = TextCheck.Quoted,
        Doubts = [.. doubts, "An isolated plate knows no stratification, no neighbouring plumes and no circulation of a room."],
    };
}
