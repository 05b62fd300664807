using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// D.L. Siebers, R.G. Schwind, R.J. Moffat, "Experimental mixed convection heat transfer from a large, vertical surface in a horizontal
/// flow", Stanford University and Sandia National Laboratories, 1983.
/// </summary>
/// <remarks>
/// <para>Measured: a heated vertical plate of 3 m × 3 m swept horizontally, the largest data of mixed flow for a wall.</para>
/// <para>
/// Symbols: h = (h_n^3.2 + h_f^3.2)^(1/3.2) (recalled, high). Forced alone below Gr_H/Re_L² of about 0.7, natural alone above about 10 (recalled,
/// medium). Kept for comparison.
/// </para>
/// </remarks>
internal static class Siebers1983
{
    public static Publication Publication { get; } = new()
    {
        Key = "siebers-1983",
        Authors = "D.L. Siebers, R.G. Schwind, R.J. Moffat",
        Year = 1983,
        Title = "Experimental mixed convection heat transfer from a large, vertical surface in a horizontal flow",
        Source = "Stanford University and Sandia National Laboratories",
        ShortName = "Siebers et al. (1983)",
    };

    public static Correlation[] All { get; } =
    [
        Make("vertical-plate-cross-flow", "rule for horizontal flow along a large upright plate", SurfaceSet.Wall, HeatFlowSense.Horizontal, new MixingLaw(3.2), TextCheck.RecalledHigh, "Forced alone below Gr/Re^2 of about 0.7, natural alone above about 10 (recalled, medium)."),
    ];

    private static Correlation Make(string name, string title, SurfaceSet surfaces, HeatFlowSense sense, MixingLaw law, TextCheck check, params string[] doubts) => new()
    {
        Id = CorrelationId.Parse(Publication.Key + "/" + name),
        Title = title,
        Publication = Publication,
        Family = CorrelationFamily.Mixed,
        Applies = new() { Surfaces = surfaces, Sense = sense, Driver = FlowDriver.AirStream },
        Law = law,
        Reference = ReferenceTemperature.FreeStream,
        Range = ValidityRange.NotKnown,
        Evidence = new(EvidenceKind.Plate, "heated vertical plate of 3 m x 3 m in horizontal flow"),
        TextCheck = check,
        IsUnconfirmed = true,
        ContainsBuoyancy = true,
        IsReferenceOnly = true,
        Doubts = doubts,
    };
}
