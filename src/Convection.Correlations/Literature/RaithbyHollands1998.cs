using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// G.D. Raithby, K.G.T. Hollands, "Natural convection", chapter 4 in W.M. Rohsenow, J.P. Hartnett, Y.I. Cho (eds), Handbook of Heat
/// Transfer, 3rd ed., McGraw-Hill, 1998.
/// </summary>
/// <remarks>
/// <para>Basis: a handbook's synthesis of plate data; smooth over the whole range, which solvers like.</para>
/// <para>
/// Symbols: C_l = 0.671/[1 + (0.492/Pr)^(9/16)]^(4/9). Vertical (H): Nu_T = C_l·Ra^(1/4), Nu_l = 2.0/ln(1 + 2.0/Nu_T),
/// Nu_t = C_t·Ra^(1/3)/(1 + 1.4e9·Pr/Ra), C_t = 0.13·Pr^0.22/(1 + 0.61·Pr^0.81)^0.42, Nu = (Nu_l⁶ + Nu_t⁶)^(1/6). Unstable (A/P):
/// Nu_T = 0.835·C_l·Ra^(1/4), Nu_l = 1.4/ln(1 + 1.4/Nu_T), Nu_t = C_U·Ra^(1/3), C_U = 0.14·(1 + 0.0107·Pr)/(1 + 0.01·Pr), exponent 10.
/// Stable (A/P): Nu_T = 0.527·Ra^(1/5)/[1 + (1.9/Pr)^(9/10)]^(2/9), Nu = 2.45/ln(1 + 2.45/Nu_T).
/// </para>
/// <para>Range: Ra 0.1–1e12, 1–1e10, 1e3–1e10. Reference: undisturbed air.</para>
/// <para>Check: structure recalled (high), secondary constants and ranges recalled (medium).</para>
/// </remarks>
internal static class RaithbyHollands1998
{
    public static Publication Publication { get; } = new()
    {
        Key = "raithby-hollands-1998",
        Authors = "G.D. Raithby, K.G.T. Hollands",
        Year = 1998,
        Title = "Natural convection, chapter 4 in W.M. Rohsenow, J.P. Hartnett, Y.I. Cho (eds), Handbook of Heat Transfer, 3rd ed.",
        Source = "McGraw-Hill, New York",
        ShortName = "Raithby & Hollands (1998)",
    };

    public static Correlation[] All { get; } =
    [
        Make(
            "vertical",
            "isolated vertical plate, all flows",
            SurfaceSet.Wall,
            HeatFlowSense.Horizontal,
            CharacteristicLength.Height,
            new(0.1, 1e12),
            "Nu = (Nu_l^6 + Nu_t^6)^(1/6), Nu_l = 2.0/ln(1 + 2.0/(C_l·Ra^(1/4))), Nu_t = C_t·Ra^(1/3)/(1 + 1.4e9·Pr/Ra)",
            Vertical),
        Make(
            "horizontal-up",
            "isolated warm plate facing up or cool plate facing down, all flows",
            SurfaceSet.Horizontal,
            HeatFlowSense.Up,
            CharacteristicLength.AreaToPerimeter,
            new(1, 1e10),
            "Nu = (Nu_l^10 + Nu_t^10)^(1/10), Nu_l = 1.4/ln(1 + 1.4/(0.835·C_l·Ra^(1/4))), Nu_t = C_U·Ra^(1/3)",
            Unstable),
        Make(
            "horizontal-down",
            "isolated warm plate facing down or cool plate facing up",
            SurfaceSet.Horizontal,
            HeatFlowSense.Down,
            CharacteristicLength.AreaToPerimeter,
            new(1e3, 1e10),
            "Nu = 2.45/ln(1 + 2.45/Nu_T), Nu_T = 0.527·Ra^(1/5)/[1 + (1.9/Pr)^(9/10)]^(2/9)",
            Stable),
    ];

    private static Func<double, LawValue> Vertical(LawBinding b)
    {
        double pr = b.Air.Prandtl, perKelvin = b.RayleighPerKelvin(CharacteristicLength.Height);
        double turbulent = 0.13 * Math.Pow(pr, 0.22) / Math.Pow(1 + (0.61 * Math.Pow(pr, 0.81)), 0.42);
        double scale = b.Air.ConductivityWattsPerMetreKelvin / b.Metres(CharacteristicLength.Height);
        double laminar = Laminar(pr);
        return x =>
        {
            double ra = perKelvin * x;
            LawValue low = Thick(new LawValue(laminar * Math.Pow(ra, 0.25), 0.25 * laminar * Math.Pow(ra, 0.25)), 2.0);
            double late = ra == 0 ? 0 : ra / (ra + (1.4e9 * pr));
            double high = turbulent * Math.Pow(ra, 1.0 / 3) * late;
            return Join(low, new LawValue(high, high * ((1.0 / 3) + 1 - late)), 6, scale);
        };
    }

    private static Func<double, LawValue> Unstable(LawBinding b)
    {
        double pr = b.Air.Prandtl, perKelvin = b.RayleighPerKelvin(CharacteristicLength.AreaToPerimeter);
        double turbulent = 0.14 * (1 + (0.0107 * pr)) / (1 + (0.01 * pr));
        double scale = b.Air.ConductivityWattsPerMetreKelvin / b.Metres(CharacteristicLength.AreaToPerimeter);
        double laminar = 0.835 * Laminar(pr);
        return x =>
        {
            double ra = perKelvin * x, thin = laminar * Math.Pow(ra, 0.25), high = turbulent * Math.Pow(ra, 1.0 / 3);
            return Join(Thick(new LawValue(thin, 0.25 * thin), 1.4), new LawValue(high, high / 3), 10, scale);
        };
    }

    private static Func<double, LawValue> Stable(LawBinding b)
    {
        double perKelvin = b.RayleighPerKelvin(CharacteristicLength.AreaToPerimeter);
        double amplitude = 0.527 / Math.Pow(1 + Math.Pow(1.9 / b.Air.Prandtl, 0.9), 2.0 / 9);
        double scale = b.Air.ConductivityWattsPerMetreKelvin / b.Metres(CharacteristicLength.AreaToPerimeter);
        return x =>
        {
            double thin = amplitude * Math.Pow(perKelvin * x, 0.2);
            LawValue nusselt = Thick(new LawValue(thin, 0.2 * thin), 2.45);
            return new LawValue(scale * nusselt.Coefficient, scale * nusselt.Sensitivity);
        };
    }

    private static double Laminar(double pr) => 0.671 / Math.Pow(1 + Math.Pow(0.492 / pr, 9.0 / 16), 4.0 / 9);

    /// <summary>The thick-layer correction a/ln(1 + a/Nu_T).</summary>
    private static LawValue Thick(LawValue thin, double a)
    {
        if (thin.Coefficient == 0)
        {
            return new LawValue(0, 0);
        }

        double ratio = a / thin.Coefficient, log = Math.Log(1 + ratio);
        return new LawValue(a / log, a / (log * log) * ratio / (1 + ratio) * thin.Sensitivity / thin.Coefficient);
    }

    private static LawValue Join(LawValue low, LawValue high, double exponent, double scale)
    {
        double larger = Math.Max(low.Coefficient, high.Coefficient);
        if (larger == 0)
        {
            return new LawValue(0, 0);
        }

        double p = Math.Pow(low.Coefficient / larger, exponent), q = Math.Pow(high.Coefficient / larger, exponent), sum = p + q;
        double nusselt = larger * Math.Pow(sum, 1 / exponent);
        double slope = (Weighted(p, low) + Weighted(q, high)) / sum;
        return new LawValue(scale * nusselt, scale * nusselt * slope);
    }

    private static double Weighted(double weight, LawValue part) => weight == 0 ? 0 : weight * part.Sensitivity / part.Coefficient;

    private static Correlation Make(
        string name,
        string title,
        SurfaceSet surfaces,
        HeatFlowSense sense,
        CharacteristicLength length,
        Interval rayleigh,
        string formula,
        Func<LawBinding, Func<double, LawValue>> bind) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = CorrelationFamily.Buoyant,
            Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.SelfHeated },
            Law = new CodeLaw(DrivingVariable.TemperatureDifference, formula, bind),
            Reference = ReferenceTemperature.FreeStream,
            Length = length,
            Range = new(new RangeLimit(RangeVariable.Rayleigh, rayleigh, RangeOrigin.Recalled, length)),
            Evidence = new(EvidenceKind.Handbook, "a handbook's synthesis of plate data"),
            TextCheck = TextCheck.RecalledMedium,
            IsUnconfirmed = true,
            Doubts = ["Structure recalled (high), secondary constants and range recalled (medium)."],
        };
}
