using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Literature;

/// <summary>
/// ISO 15099:2003, Thermal performance of windows, doors and shading devices. Detailed calculations, clause 8.3 (number recalled): room
/// side of glazing in still air.
/// </summary>
/// <remarks>
/// <para>Basis: a standard's reading of Fujii and Imura, in bands of the tilt γ.</para>
/// <para>
/// Symbols: Nu and Ra on the glazing height H along the slope; γ tilt to the heat flow: 0° where warm air rises freely (cold pane over the
/// room), 90° upright, 180° where it is held. 0–15°: 0.13·Ra^(1/3). 15–90°: 0.56·(Ra·sin γ)^(1/4) up to Ra_cv = 2.5e5·(e^(0.72γ)/sin γ)^(1/5), above
/// it 0.13·(Ra^(1/3) − Ra_cv^(1/3)) + 0.56·(Ra_cv·sin γ)^(1/4). 90–179°: 0.56·(Ra·sin γ)^(1/4). 179–180°: 0.58·Ra^(1/5).
/// </para>
/// <para>
/// Range: by band; 90–179° for Ra·sin γ 1e5–1e11, 179–180° to 1e11. Reference: room air. Properties at T_room + 0.25·(T_s − T_room); here at the film
/// temperature of the binding.
/// </para>
/// <para>
/// Check: recalled (high). Steps at the edges of the bands: −3 to 0 % at 15°, none at 90°, +13 to −17 % at 179° (Ra 1e8 to 5e10).
/// </para>
/// </remarks>
internal static class Iso15099
{
    private const string EdgeDoubt = "The bands do not meet: -3 to 0 % at 15°, none at 90°, +13 to -17 % at 179° for Ra 1e8 to 5e10.";
    private const string FilmDoubt = "The standard takes properties at a quarter of the way from room to pane; here the film temperature of the room is used.";

    public static Publication Publication { get; } = new()
    {
        Key = "iso-15099-2003",
        Authors = "ISO",
        Year = 2003,
        Title = "ISO 15099, Thermal performance of windows, doors and shading devices - Detailed calculations, clause 8.3 (number recalled)",
        Source = "International Organization for Standardization, Geneva",
        ShortName = "ISO 15099 (2003)",
    };

    public static Correlation[] All { get; } =
    [
        Make("window-tilt-0-15", "glazing, heat flow nearly straight up", new(0, 15), new PowerLaw(new RayleighTerm(0.13, 1.0 / 3, CharacteristicLength.Height))),
        Make(
            "window-tilt-15-90",
            "glazing, upright or with heat flow upwards",
            new(15, 90),
            new PiecewiseLaw(
                SwitchVariable.Rayleigh,
                CharacteristicLength.Height,
                [
                    new PowerLaw(Laminar()),
                    new TwoAsymptoteLaw(
                        new RayleighTerm(0.13, 1.0 / 3, CharacteristicLength.Height),
                        new RayleighTerm(1, 0, CharacteristicLength.Height, Rest),
                        1,
                        "Nu = 0.13·(Ra^(1/3) − Ra_cv^(1/3)) + 0.56·(Ra_cv·sin γ)^(1/4)"),
                ],
                [CriticalRayleigh])),
        Make("window-tilt-90-179", "glazing with heat flow downwards", new(90, 179), new PowerLaw(Laminar()), new RangeLimit(RangeVariable.TiltedRayleigh, new(1e5, 1e11), RangeOrigin.Recalled, CharacteristicLength.Height)),
        Make("window-tilt-179-180", "glazing, heat flow straight down", new(179, 180), new PowerLaw(new RayleighTerm(0.58, 1.0 / 5, CharacteristicLength.Height)), new RangeLimit(RangeVariable.Rayleigh, Interval.UpTo(1e11), RangeOrigin.Recalled, CharacteristicLength.Height)),
    ];

    private static RayleighTerm Laminar()
        => new(0.56, 1.0 / 4, CharacteristicLength.Height, b => Math.Pow(Sine(b), 1.0 / 4), "(sin γ)^(1/4)");

    private static double Sine(LawBinding b) => Math.Sin(b.FlowTiltDegrees * Math.PI / 180);

    private static double CriticalRayleigh(LawBinding b) => 2.5e5 * Math.Pow(Math.Exp(0.72 * b.FlowTiltDegrees) / Sine(b), 1.0 / 5);

    private static double Rest(LawBinding b)
    {
        double critical = CriticalRayleigh(b);
        return (0.56 * Math.Pow(critical * Sine(b), 1.0 / 4)) - (0.13 * Math.Pow(critical, 1.0 / 3));
    }

    private static Correlation Make(string name, string title, Interval band, Law law, params RangeLimit[] limits) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Buoyant,
        Applies = new() { Surfaces = SurfaceSet.Window | SurfaceSet.Inclined, Driver = FlowDriver.StillAir, Condition = (surface, _) => surface.Kind == SurfaceKind.Window, ConditionText = "the surface is glazing" },
        Law = law,
        Reference = ReferenceTemperature.RoomAir,
        Length = CharacteristicLength.Height,
        Range = new([new RangeLimit(RangeVariable.FlowTilt, band, RangeOrigin.Source), .. limits]),
        Evidence = new(EvidenceKind.Standard, "a standard's reading of Fujii and Imura"),
        TextCheck = TextCheck.RecalledHigh,
        Doubts = [EdgeDoubt, FilmDoubt],
    };
}
