using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// R. Karadağ, "The investigation of relation between radiative and convective heat transfer coefficients at the ceiling in a cooled
/// ceiling room", Energy Conversion and Management 50(1), 1–5, 2009.
/// </summary>
/// <remarks>
/// <para>Basis: a numerical study.</para>
/// <para>
/// Symbols: |ΔT| ceiling against room air [K] (the reference is not stated in what is recalled), h = 3.1·|ΔT|^0.22 in W/(m²·K).
/// </para>
/// <para>Check: recalled (medium). High against all experiments, by a factor of up to about 1.5.</para>
/// </remarks>
internal static class Karadag2009
{
    public static Publication Publication { get; } = new()
    {
        Key = "karadag-2009",
        Authors = "R. Karadağ",
        Year = 2009,
        Title = "The investigation of relation between radiative and convective heat transfer coefficients at the ceiling in a cooled ceiling room",
        Source = "Energy Conversion and Management 50(1), 1-5",
        ShortName = "Karadağ (2009)",
    };

    public static Correlation[] All { get; } =
    [
        Make("ceiling-cooled", "chilled ceiling", SurfaceSet.Ceiling, HeatFlowSense.Up, new PowerLaw(3.1, 0.22), TextCheck.RecalledMedium, "Numerical; high against all experiments, by up to a factor of about 1.5.", "Reference temperature not stated in what is recalled; room air is taken."),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, Law law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Buoyant,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.Panel },
        Law = law,
        Reference = ReferenceTemperature.RoomAir,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.Analytical, "numerical study of a room with a cooled ceiling"),
        TextCheck = check,
        IsUnconfirmed = check >= TextCheck.RecalledHigh,
        Doubts = doubts,
    };
}
