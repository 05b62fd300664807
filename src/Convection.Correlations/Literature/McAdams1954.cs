using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>W.H. McAdams, Heat Transmission, 3rd edition, McGraw-Hill, 1954 (recalled; forms as later textbooks and tables give them).</summary>
/// <remarks>
/// <para>Basis: a handbook's fits to isolated isothermal plates in still, unbounded fluid.</para>
/// <para>
/// Symbols: Nu and Ra on the length given; |ΔT| surface against undisturbed air [K], h in W/(m²·K). The forms "for air" are
/// simplified near 1 atm and room temperature, lengths in metres (one engineering table prints millimetres, which is wrong); their
/// inch-pound constants 0.29, 0.19, 0.27, 0.22 and 0.12 convert to 1.417, 1.312, 1.319, 1.520 and 0.586.
/// </para>
/// <para>
/// Tilted: a/(b ∓ |cos θ|) between the end-points of turbulent air, 1.31 upright, 1.52 horizontal with heat flow up, 0.76 with heat
/// flow down. The interpolation over tilt is later and not McAdams'; no data at intermediate tilt stand behind it. 0.76 is half of
/// 1.52 and not confirmed as printed by him. The constants contain the three end-points and nothing else.
/// </para>
/// <para>
/// Range: as stated with each form, in Ra. Reference: undisturbed air; room air for the tilted forms. Check: the Nusselt forms are
/// quoted in course notes and textbooks; 0.59/0.10 jump by −5 % at Ra 1e9. A constant of 0.13 for the vertical turbulent form also
/// circulates and is held back: for air 0.10 agrees with Churchill and Chu.
/// </para>
/// </remarks>
internal static class McAdams1954
{
    private const string PlateDoubt = "An isolated plate knows no stratification, no neighbouring plumes and no circulation of a room.";
    private const string AirDoubt = "Simplified for air near 1 atm and room temperature.";
    private const string TiltDoubt = "The interpolation over tilt is not McAdams' and rests on no data between its end-points; turbulent range only.";

    public static Publication Publication { get; } = new()
    {
        Key = "mcadams-1954",
        Authors = "W.H. McAdams",
        Year = 1954,
        Title = "Heat Transmission, 3rd ed.",
        Source = "McGraw-Hill, New York",
        ShortName = "McAdams (1954)",
    };

    public static Correlation[] All { get; } =
    [
        Plate("vertical-laminar", "isolated vertical plate, laminar", SurfaceSet.Wall, HeatFlowSense.Horizontal, 0.59, 1.0 / 4, CharacteristicLength.Height, new(1e4, 1e9), TextCheck.Quoted),
        Plate("vertical-turbulent", "isolated vertical plate, turbulent", SurfaceSet.Wall, HeatFlowSense.Horizontal, 0.10, 1.0 / 3, CharacteristicLength.Height, new(1e9, 1e13), TextCheck.Quoted, "Steps down by 5 % from the laminar form at Ra 1e9."),
        Plate("horizontal-up-laminar", "isolated warm plate facing up or cool plate facing down, laminar", SurfaceSet.Horizontal, HeatFlowSense.Up, 0.54, 1.0 / 4, CharacteristicLength.AreaToPerimeter, new(1e4, 1e7), TextCheck.Quoted),
        Plate("horizontal-up-turbulent", "isolated warm plate facing up or cool plate facing down, turbulent", SurfaceSet.Horizontal, HeatFlowSense.Up, 0.14, 1.0 / 3, CharacteristicLength.MeanSide, new(2e7, 3e10), TextCheck.Quoted, "The length, the mean of the sides, cancels in the coefficient and serves the range only."),
        Plate("horizontal-down", "isolated warm plate facing down or cool plate facing up", SurfaceSet.Horizontal, HeatFlowSense.Down, 0.27, 1.0 / 4, CharacteristicLength.AreaToPerimeter, new(1e5, 1e10), TextCheck.Quoted, "Originally with the side as length and 3e5 to 3e10."),
        ForAir("air-vertical-laminar", "upright plate in air, laminar", SurfaceSet.Wall, HeatFlowSense.Horizontal, new PowerLaw(1.42, 1.0 / 4, CharacteristicLength.Height, -1.0 / 4), CharacteristicLength.Height, new(1e4, 1e9), TextCheck.Quoted, "1.37 also circulates (recalled, medium)."),
        ForAir("air-vertical-turbulent", "upright plate in air, turbulent", SurfaceSet.Wall, HeatFlowSense.Horizontal, new PowerLaw(1.31, 1.0 / 3), CharacteristicLength.Height, Interval.From(1e9), TextCheck.Reconstructed, "1.24 also circulates (recalled, medium)."),
        ForAir("air-horizontal-up-laminar", "warm plate facing up in air, laminar", SurfaceSet.Horizontal, HeatFlowSense.Up, new PowerLaw(1.32, 1.0 / 4, CharacteristicLength.HydraulicDiameter, -1.0 / 4), CharacteristicLength.HydraulicDiameter, new(1e4, 1e7), TextCheck.Quoted, "Range also printed as 1e5 to 2e7; length 4A/P or the side."),
        ForAir("air-horizontal-up-turbulent", "warm plate facing up in air, turbulent", SurfaceSet.Horizontal, HeatFlowSense.Up, new PowerLaw(1.52, 1.0 / 3), CharacteristicLength.HydraulicDiameter, new(2e7, 3e10), TextCheck.Reconstructed),
        ForAir("air-horizontal-down", "warm plate facing down in air", SurfaceSet.Horizontal, HeatFlowSense.Down, new PowerLaw(0.59, 1.0 / 4, CharacteristicLength.HydraulicDiameter, -1.0 / 4), CharacteristicLength.HydraulicDiameter, new(3e5, 3e10), TextCheck.Quoted, "Length 4A/P or the side."),
        Tilted("inclined-heat-up", "tilted surface, heat flow with an upward part", HeatFlowSense.Up, 9.482, 7.238, -1),
        Tilted("inclined-heat-down", "tilted surface, heat flow with a downward part", HeatFlowSense.Down, 1.810, 1.382, +1, "Not for heated ceilings: 4 to 6 times too high there."),
    ];

    private static Correlation Plate(
        string name, string title, SurfaceSet surfaces, HeatFlowSense sense, double c, double n, CharacteristicLength length, Interval rayleigh, TextCheck check, params string[] doubts)
        => Make(name, title, surfaces, sense, FlowDriver.SelfHeated, new PowerLaw(new RayleighTerm(c, n, length)), ReferenceTemperature.FreeStream, length, [new RangeLimit(RangeVariable.Rayleigh, rayleigh, RangeOrigin.Source, length)], check, [.. doubts, PlateDoubt]);

    private static Correlation ForAir(
        string name, string title, SurfaceSet surfaces, HeatFlowSense sense, PowerLaw law, CharacteristicLength rangeLength, Interval rayleigh, TextCheck check, params string[] doubts)
        => Make(name, title, surfaces, sense, FlowDriver.SelfHeated, law, ReferenceTemperature.FreeStream, ((PowerTerm)law.Term).Length, [new RangeLimit(RangeVariable.Rayleigh, rayleigh, RangeOrigin.Source, rangeLength)], check, [.. doubts, AirDoubt, PlateDoubt]);

    private static Correlation Tilted(string name, string title, HeatFlowSense sense, double a, double b, int sign, params string[] doubts)
        => Make(
            name,
            title,
            SurfaceSet.Inclined,
            sense,
            FlowDriver.StillAir,
            new PowerLaw(new PowerTerm(
                a,
                1.0 / 3,
                factor: binding => 1 / (b + (sign * Math.Abs(Math.Cos(binding.FlowTiltDegrees * Math.PI / 180)))),
                factorText: "1/(" + InvariantText.Number(b) + (sign < 0 ? " − " : " + ") + "|cos θ|)")),
            ReferenceTemperature.RoomAir,
            CharacteristicLength.None,
            [
                new RangeLimit(RangeVariable.Rayleigh, Interval.From(1e9), RangeOrigin.Source, CharacteristicLength.Height),
                new RangeLimit(RangeVariable.FlowTilt, sense == HeatFlowSense.Up ? new Interval(0, 90) : new Interval(90, 180), RangeOrigin.Source),
            ],
            TextCheck.Reconstructed,
            [TiltDoubt, .. doubts]);

    private static Correlation Make(
        string name,
        string title,
        SurfaceSet surfaces,
        HeatFlowSense sense,
        FlowDriver driver,
        Law law,
        ReferenceTemperature reference,
        CharacteristicLength length,
        RangeLimit[] limits,
        TextCheck check,
        string[] doubts) => new()
        {
            Id = CorrelationId.Parse(Publication.Key + "/" + name),
            Title = title,
            Publication = Publication,
            Family = CorrelationFamily.Buoyant,
            Applies = new() { Surfaces = surfaces, Sense = sense, Driver = driver },
            Law = law,
            Reference = reference,
            Length = length,
            Range = new(limits),
            Evidence = new(EvidenceKind.Handbook, driver == FlowDriver.StillAir ? "end-points of turbulent air, interpolated over tilt" : "a handbook's fit to isolated isothermal plates"),
            TextCheck = check,
            Doubts = doubts,
        };
}
