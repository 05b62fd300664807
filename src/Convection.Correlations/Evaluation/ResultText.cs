using System.Collections.Generic;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Evaluation;

/// <summary>Words for results.</summary>
internal static class ResultText
{
    public static string Line(ConvectionResult result)
        => !result.IsValid
            ? Of(result.Status)
            : InvariantText.Fixed(result.FluxWattsPerSquareMetre, 2) + " W/m²; h "
                + InvariantText.Fixed(result.CoefficientWattsPerSquareMetreKelvin, 2) + " W/(m²·K) against " + EvidenceText.Of(result.Reference)
                + "; " + Of(result.Regime) + "; " + string.Join(" + ", result.Correlations)
                + (result.Flags == ConvectionFlags.None ? string.Empty : "; " + Of(result.Flags));

    public static string Of(ConvectionStatus status) => status switch
    {
        ConvectionStatus.Valid => "valid",
        ConvectionStatus.NotFinite => "no number: a temperature, flow, speed or output is not a finite number",
        ConvectionStatus.Unphysical => "no number: a temperature, flow, speed or output is impossible",
        ConvectionStatus.SupplyTemperatureMissing => "no number: supply air flows and its temperature is not given",
        ConvectionStatus.DeviceStateUnsuitable => "no number: a device got the state of another kind of device",
        ConvectionStatus.OutOfRangeRefused => "no number: out of range, which the policy refuses",
        ConvectionStatus.NoCorrelation => "no number: no correlation in the registry",
        _ => "not evaluated",
    };

    public static string Of(FlowRegime regime) => regime switch
    {
        FlowRegime.Buoyant => "buoyant",
        FlowRegime.Forced => "forced",
        FlowRegime.MixedAssisting => "mixed, assisting",
        FlowRegime.MixedOpposing => "mixed, opposing",
        FlowRegime.MixedTransverse => "mixed, transverse",
        FlowRegime.MixedOppositeFluxes => "mixed, fluxes opposite",
        FlowRegime.MixedAsMeasured => "mixed, as measured",
        _ => "none",
    };

    public static string Of(ConvectionFlags flags)
    {
        var words = new List<string>();
        for (var flag = ConvectionFlags.BelowTestedRange; flag <= ConvectionFlags.MinimumConductance; flag = (ConvectionFlags)((int)flag * 2))
        {
            if ((flags & flag) != 0)
            {
                words.Add(Word(flag));
            }
        }

        return string.Join(", ", words);
    }

    private static string Word(ConvectionFlags flag) => flag switch
    {
        ConvectionFlags.BelowTestedRange => "below the tested range",
        ConvectionFlags.AboveTestedRange => "above the tested range",
        ConvectionFlags.OutsideAdvisedRange => "outside the advised range",
        ConvectionFlags.InExtendedRange => "in the extended range",
        ConvectionFlags.SurfaceOutsideRange => "surface outside the range",
        ConvectionFlags.RangeAssumed => "range assumed",
        ConvectionFlags.RangeNotKnown => "range not known",
        ConvectionFlags.FlowFaded => "flow faded",
        ConvectionFlags.HeldAtLimit => "held at the limit",
        ConvectionFlags.OppositeFluxes => "opposite fluxes",
        ConvectionFlags.ReferenceSubstituted => "room air for another reference",
        ConvectionFlags.UnconfirmedText => "text unconfirmed",
        ConvectionFlags.NearMatch => "near match",
        ConvectionFlags.GapInEvidence => "gap in evidence",
        ConvectionFlags.ScaledToAir => "scaled to air",
        ConvectionFlags.Pinned => "pinned",
        ConvectionFlags.FixedValue => "fixed value",
        ConvectionFlags.MinimumConductance => "minimum conductance",
        _ => string.Empty,
    };
}
