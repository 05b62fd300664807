using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// T. Fujii, H. Imura, "Natural-convection heat transfer from a plate with arbitrary inclination", International Journal of Heat
/// and Mass Transfer 15(4), 755–767, 1972, doi:10.1016/0017-9310(72)90118-4.
/// </summary>
/// <remarks>
/// <para>Measured: two plates, 0.30 m and 0.05 m high, in water.</para>
/// <para>
/// Symbols: Nu and Ra on the plate length L along the slope; θ from the vertical. Warm side down: 0.56·(Ra·cos θ)^(1/4). Warm side
/// up: the same up to Ra_c = Gr_c·Pr, above it 0.145·(Ra^(1/3) − Ra_c^(1/3)) + 0.56·(Ra_c·cos θ)^(1/4), Gr_c = 5e9, 2e9, 1e8 and 1e6 at
/// 15°, 30°, 60° and 75°. Horizontal, warm side down: 0.58·Ra^(1/5), L the short side.
/// </para>
/// <para>
/// Range: Ra·cos θ 1e5–1e11 and θ to 88° (recalled, high); θ 15–75° facing up; 1e6–1e11 horizontal (1e5 in a textbook table).
/// Properties at T_w − 0.25·(T_w − T∞), β at T∞ + 0.25·(T_w − T∞); one set is used here. Reference: undisturbed fluid.
/// </para>
/// <para>
/// Check: the horizontal form is quoted (Geankoplis, table 15.5-1); 0.145 is recalled (high), Gr_c (medium); between its four angles log
/// Gr_c is taken as linear in θ, which is this library's reading. Constants 0.13 and 0.16 for horizontal plates facing up circulate
/// in opposite order and are held back.
/// </para>
/// </remarks>
internal static class FujiiImura1972
{
    private const string WaterDoubt = "Measured on plates of 0.30 m and 0.05 m in water, with properties at T_w - 0.25 (T_w - T_inf); one property set is used here.";

    private static readonly double[] CriticalAngles = [15, 30, 60, 75];
    private static readonly double[] CriticalGrashof = [5e9, 2e9, 1e8, 1e6];

    public static Publication Publication { get; } = new()
    {
        Key = "fujii-imura-1972",
        Authors = "T. Fujii, H. Imura",
        Year = 1972,
        Title = "Natural-convection heat transfer from a plate with arbitrary inclination",
        Source = "International Journal of Heat and Mass Transfer 15(4), 755-767",
        Doi = "10.1016/0017-9310(72)90118-4",
        ShortName = "Fujii & Imura (1972)",
    };

    public static Correlation[] All { get; } =
    [
        Make(
            "horizontal-down",
            "isolated warm plate facing down or cool plate facing up",
            SurfaceSet.Horizontal,
            HeatFlowSense.Down,
            new PowerLaw(new RayleighTerm(0.58, 1.0 / 5, CharacteristicLength.AlongFlow)),
            TextCheck.Quoted,
            [new RangeLimit(RangeVariable.Rayleigh, new(1e6, 1e11), RangeOrigin.Source, CharacteristicLength.AlongFlow)],
            "A textbook table has a lower limit of 1e5."),
        Make(
            "inclined-down",
            "isolated tilted plate, warm side facing down",
            SurfaceSet.Inclined,
            HeatFlowSense.Down,
            new PowerLaw(Laminar()),
            TextCheck.RecalledHigh,
            [
                new RangeLimit(RangeVariable.TiltedRayleigh, new(1e5, 1e11), RangeOrigin.Recalled, CharacteristicLength.AlongFlow),
                new RangeLimit(RangeVariable.FlowTilt, new(90, 178), RangeOrigin.Recalled),
            ],
            "Range recalled (high)."),
        Make(
            "inclined-up",
            "isolated tilted plate, warm side facing up",
            SurfaceSet.Inclined,
            HeatFlowSense.Up,
            new PiecewiseLaw(
                SwitchVariable.Rayleigh,
                CharacteristicLength.AlongFlow,
                [
                    new PowerLaw(Laminar()),
                    new TwoAsymptoteLaw(
                        new RayleighTerm(0.145, 1.0 / 3, CharacteristicLength.AlongFlow),
                        new RayleighTerm(1, 0, CharacteristicLength.AlongFlow, Rest),
                        1,
                        "Nu = 0.145·(Ra^(1/3) − Ra_c^(1/3)) + 0.56·(Ra_c·cos θ)^(1/4)"),
                ],
                [CriticalRayleigh]),
            TextCheck.RecalledMedium,
            [new RangeLimit(RangeVariable.FlowTilt, new(15, 75), RangeOrigin.Recalled)],
            "0.145 is recalled (high), the critical Grashof numbers (medium); between their four angles their logarithm is taken as linear."),
    ];

    private static RayleighTerm Laminar()
        => new(0.56, 1.0 / 4, CharacteristicLength.AlongFlow, b => Math.Pow(CosineFromVertical(b), 1.0 / 4), "(cos θ)^(1/4)");

    private static double CosineFromVertical(LawBinding b) => Math.Sin(b.FlowTiltDegrees * Math.PI / 180);

    private static double CriticalRayleigh(LawBinding b)
    {
        double angle = Math.Min(Math.Max(90 - b.FlowTiltDegrees, CriticalAngles[0]), CriticalAngles[3]);
        int i = angle < CriticalAngles[1] ? 0 : angle < CriticalAngles[2] ? 1 : 2;
        double share = (angle - CriticalAngles[i]) / (CriticalAngles[i + 1] - CriticalAngles[i]);
        return Math.Exp(((1 - share) * Math.Log(CriticalGrashof[i])) + (share * Math.Log(CriticalGrashof[i + 1]))) * b.Air.Prandtl;
    }

    private static double Rest(LawBinding b)
    {
        double critical = CriticalRayleigh(b);
        return (0.56 * Math.Pow(critical * CosineFromVertical(b), 1.0 / 4)) - (0.145 * Math.Pow(critical, 1.0 / 3));
    }

    private static Correlation Make(
        string name, string title, SurfaceSet surfaces, HeatFlowSense sense, Law law, TextCheck check, RangeLimit[] limits, string doubt) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = CorrelationFamily.Buoyant,
            Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.SelfHeated },
            Law = law,
            Reference = ReferenceTemperature.FreeStream,
            Length = CharacteristicLength.AlongFlow,
            Range = new(limits),
            Evidence = new(EvidenceKind.Plate, "two plates, 0.30 m and 0.05 m high, in water"),
            TextCheck = check,
            IsUnconfirmed = check >= TextCheck.RecalledHigh,
            Doubts = [doubt, WaterDoubt],
        };
}
