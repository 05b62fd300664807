using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// J.H. Lienhard, "Heat transfer in flat-plate boundary layers: a correlation for laminar, transitional, and turbulent flow", Journal
/// of Heat Transfer 142(6), 061805, 2020.
/// </summary>
/// <remarks>
/// <para>Basis: a synthesis of data of flat plates; LOCAL value at the distance x from the edge.</para>
/// <para>
/// Symbols: Nu = h·x/k, Re = U·x/ν. Nu = [Nu_l⁵ + (Nu_tr^(−10) + Nu_t^(−10))^(−1/2)]^(1/5), Nu_l = 0.332·Re^(1/2)·Pr^(1/3),
/// Nu_t = 0.0296·Re^0.8·Pr^0.6 (gases), Nu_tr = Nu_l(Re_l)·(Re/Re_l)^c, c = 0.9922·log10(Re_l) − 3.013. Re_l, where transition begins, depends
/// on the stream; 6e4 is taken here.
/// </para>
/// <para>
/// Range: Re 4e3–4.3e6, Pr 0.7–257, scatter 11 % in turbulent air (quoted from the abstract). Reference: undisturbed stream. Check: formula
/// recalled (high). Kept for comparison, because a surface needs a mean value.
/// </para>
/// </remarks>
internal static class Lienhard2020
{
    private const double TransitionReynolds = 6e4;

    public static Publication Publication { get; } = new()
    {
        Key = "lienhard-2020",
        Authors = "J.H. Lienhard",
        Year = 2020,
        Title = "Heat transfer in flat-plate boundary layers: a correlation for laminar, transitional, and turbulent flow",
        Source = "Journal of Heat Transfer 142(6), 061805",
        ShortName = "Lienhard (2020)",
    };

    public static Correlation[] All { get; } =
    [
        new()
        {
            Id = CorrelationId.Parse("lienhard-2020/plate-local"),
            Title = "flat plate, local value, laminar to turbulent",
            Publication = Publication,
            Family = CorrelationFamily.Forced,
            Applies = new() { Surfaces = SurfaceSet.Any, Driver = FlowDriver.AirStream },
            Law = new CodeLaw(
                DrivingVariable.Speed,
                "Nu_x = [Nu_l^5 + (Nu_tr^(-10) + Nu_t^(-10))^(-1/2)]^(1/5), Nu_l = 0.332·Re^0.5·Pr^(1/3), Nu_t = 0.0296·Re^0.8·Pr^0.6, Re_l = 6e4",
                Bind),
            Reference = ReferenceTemperature.FreeStream,
            Length = CharacteristicLength.AlongFlow,
            Range = new(
                new RangeLimit(RangeVariable.Reynolds, new(4e3, 4.3e6), RangeOrigin.Source, CharacteristicLength.AlongFlow),
                new RangeLimit(RangeVariable.Prandtl, new(0.7, 257), RangeOrigin.Source)),
            Evidence = new(EvidenceKind.Plate, "synthesis of data of flat plates", "11 % for turbulent air (quoted from the abstract)"),
            TextCheck = TextCheck.RecalledHigh,
            IsUnconfirmed = true,
            IsReferenceOnly = true,
            Doubts = ["A local value at the end of the length, not a mean.", "Re_l depends on the stream; 6e4 is taken here."],
        },
    ];

    private static Func<double, LawValue> Bind(LawBinding b)
    {
        double pr = b.Air.Prandtl, perSpeed = b.ReynoldsPerSpeed(CharacteristicLength.AlongFlow);
        double scale = b.Air.ConductivityWattsPerMetreKelvin / b.Metres(CharacteristicLength.AlongFlow);
        double c = (0.9922 * Math.Log10(TransitionReynolds)) - 3.013;
        double laminar = 0.332 * Math.Pow(pr, 1.0 / 3), start = laminar * Math.Sqrt(TransitionReynolds);
        return speed =>
        {
            double re = perSpeed * speed;
            if (re == 0)
            {
                return new LawValue(0, 0);
            }

            double low = laminar * Math.Sqrt(re), turbulent = 0.0296 * Math.Pow(re, 0.8) * Math.Pow(pr, 0.6), transition = start * Math.Pow(re / TransitionReynolds, c);
            double p = Math.Pow(transition, -10), q = Math.Pow(turbulent, -10), late = Math.Pow(p + q, -0.5), early = Math.Pow(low, 5);
            double lateSlope = 5 * ((c * p) + (0.8 * q)) / (p + q);
            double h = scale * Math.Pow(early + late, 0.2);
            return new LawValue(h, h * 0.2 * ((2.5 * early) + (lateSlope * late)) / (early + late));
        };
    }
}
