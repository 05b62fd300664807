using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>
/// T. Schulenberg, "Natural convection heat transfer below downward facing horizontal surfaces", International Journal of Heat and
/// Mass Transfer 28(2), 467–477, 1985.
/// </summary>
/// <remarks>
/// <para>Basis: boundary-layer theory of an infinite strip with the warm side down.</para>
/// <para>Symbols: Nu and Ra on R, half of the strip's width. Nu = 0.544·Ra^(1/5)/[1 + (0.785/Pr)^(3/5)]^(1/3).</para>
/// <para>Range: not stated. Reference: undisturbed fluid. Check: quoted in a technical note.</para>
/// </remarks>
internal static class Schulenberg1985
{
    public static Publication Publication { get; } = new()
    {
        Key = "schulenberg-1985",
        Authors = "T. Schulenberg",
        Year = 1985,
        Title = "Natural convection heat transfer below downward facing horizontal surfaces",
        Source = "International Journal of Heat and Mass Transfer 28(2), 467-477",
        ShortName = "Schulenberg (1985)",
    };

    public static Correlation[] All { get; } =
    [
        new()
        {
            Id = CorrelationId.Parse("schulenberg-1985/horizontal-down-strip"),
            Title = "infinite strip, warm side down",
            Publication = Publication,
            Family = CorrelationFamily.Buoyant,
            Applies = new() { Surfaces = SurfaceSet.Horizontal, Sense = HeatFlowSense.Down, Driver = FlowDriver.SelfHeated },
            Law = new PowerLaw(new RayleighTerm(
                0.544,
                1.0 / 5,
                CharacteristicLength.HalfShortSide,
                b => 1 / Math.Pow(1 + Math.Pow(0.785 / b.Air.Prandtl, 3.0 / 5), 1.0 / 3),
                "1/[1 + (0.785/Pr)^(3/5)]^(1/3)")),
            Reference = ReferenceTemperature.FreeStream,
            Length = CharacteristicLength.HalfShortSide,
            Range = ValidityRange.NotKnown,
            Evidence = new(EvidenceKind.Analytical, "boundary-layer theory of an infinite strip"),
            TextCheck = TextCheck.Quoted,
            Doubts = ["An infinite strip; the range is not stated where the formula is quoted."],
        },
    ];
}
