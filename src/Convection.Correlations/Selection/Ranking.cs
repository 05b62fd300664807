using System;
using System.Collections.Generic;
using Convection.Correlations.Flows;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Selection;

/// <summary>The criteria in their order, and the words for what they decide.</summary>
internal static class Ranking
{
    public const int Preferred = 0, Driver = 1, Specific = 2, Surface = 3, Place = 4, InRange = 5, Evidence = 6, Text = 7, KnownRange = 8;
    public const int Criteria = 9;

    /// <summary>Score of a pinned correlation on a criterion that it does not meet at all.</summary>
    public const int Misfit = 9;

    /// <summary>Why the best one was chosen.</summary>
    public static string[] Praise(Candidate best, string nominal)
    {
        Correlation c = best.Correlation;
        var reasons = new List<string>();
        if (best.IsPinned)
        {
            reasons.Add("fixed by hand for this surface");
        }
        else if (best.Score(Preferred) == 0)
        {
            reasons.Add("preferred by the policy");
        }

        reasons.Add("made for " + EvidenceText.Of(c.Applies.Surfaces) + Nearness(best)
            + " and for " + Words(c.Applies.Driver) + (best.Score(Place) == 0 ? ", in this place to it" : string.Empty)
            + (c.Applies.ConditionText.Length == 0 ? string.Empty : ", where " + c.Applies.ConditionText));

        if (best.NominalStanding is RangeStanding.Within or RangeStanding.Extended)
        {
            reasons.Add("in range at a nominal " + nominal);
        }
        else if (best.Score(InRange) == 1)
        {
            reasons.Add("out of range at a nominal " + nominal);
        }
        else if (!c.Range.IsKnown)
        {
            reasons.Add("its range is not known");
        }

        reasons.Add(EvidenceText.Of(c.Evidence.Kind));
        reasons.Add(EvidenceText.Of(c.TextCheck));
        return [.. reasons];
    }

    private static string Nearness(Candidate candidate) => candidate.Score(Surface) switch
    {
        1 => " (the nearest to this surface)",
        Misfit => " (not for this surface)",
        _ => string.Empty,
    };

    /// <summary>Why another stands behind the best one: the first criterion that tells them apart.</summary>
    public static string Shortfall(Candidate other, Candidate best, string nominal)
    {
        Correlation c = other.Correlation;
        for (int i = 0; i < Criteria; i++)
        {
            if (other.Score(i) > best.Score(i))
            {
                return i switch
                {
                    Preferred => best.IsPinned ? "another one is fixed by hand" : "another one is preferred by the policy",
                    Driver => c.Family == CorrelationFamily.FixedValue ? "a fixed value" : "made for " + Words(c.Applies.Driver),
                    Specific => "less specific to this device",
                    Surface => "made for " + EvidenceText.Of(c.Applies.Surfaces),
                    Place => "made for any place in the room, not for this one",
                    InRange => other.Range.Violations.Count > 0
                        ? "out of range: " + string.Join("; ", other.Range.Violations)
                        : "out of range at a nominal " + nominal,
                    Evidence => "weaker evidence: " + EvidenceText.Of(c.Evidence.Kind),
                    Text => EvidenceText.Of(c.TextCheck),
                    _ => "its range is not known",
                };
            }
        }

        return "of equal standing; its id comes later";
    }

    public static string Words(FlowDriver driver) => driver switch
    {
        FlowDriver.StillAir => "still air",
        FlowDriver.SelfHeated => "a heated surface by itself",
        FlowDriver.Panel => "a heated or chilled panel",
        FlowDriver.Radiator => "a room with a radiator or convector",
        FlowDriver.FanHeater => "a room with a fan heater",
        FlowDriver.RadialCeilingDiffuser => "a radial ceiling diffuser",
        FlowDriver.SideWallJet => "a free jet from a side wall",
        FlowDriver.CeilingSlot => "a perimeter ceiling slot",
        FlowDriver.DisplacementInlet => "a displacement inlet",
        FlowDriver.AirStream => "a stream of known speed along the surface",
        FlowDriver.WindowVentilation => "window ventilation",
        _ => throw new ArgumentOutOfRangeException(nameof(driver), driver, "Not a driver."),
    };
}
