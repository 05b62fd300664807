using System;
using System.Collections.Generic;
using System.Text;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Selection;

/// <summary>Writes a choice for a reader.</summary>
internal static class SelectionText
{
    private const int AlternativesShown = 3;

    public static string Write(RoomSelection selection)
    {
        var text = new StringBuilder();
        text.Append("Convection chosen for ").Append(selection.Room.Name).Append(": ")
            .Append(Count(selection.Surfaces.Count, "surface")).Append(", ").Append(Count(selection.Room.Devices.Count, "device"))
            .Append(", ").Append(InvariantText.Number(selection.Room.VolumeCubicMetres, "m³")).Append('\n')
            .Append("Literature data ").Append(selection.DataVersion).Append(". Out of range: ").Append(Rule(selection.Policy.OutOfRange)).Append(".\n")
            .Append(AirLine(selection)).Append('\n');
        foreach (SurfaceSelection surface in selection.Surfaces)
        {
            text.Append('\n');
            Write(text, surface, selection.Policy);
        }

        WriteSources(text, selection);
        return text.ToString();
    }

    private static string Count(int count, string what) => InvariantText.Number(count) + " " + what + (count == 1 ? string.Empty : "s");

    private static string Rule(OutOfRangeRule rule) => rule switch
    {
        OutOfRangeRule.HoldAtLimit => "held at the limit and flagged",
        OutOfRangeRule.Refuse => "refused, no number",
        _ => "extended and flagged",
    };

    private static string AirLine(RoomSelection selection)
    {
        Air.AirState air = selection.Room.Air;
        string text = "Air " + InvariantText.Fixed(air.Celsius, 1) + " °C, " + InvariantText.Fixed(air.Pascals / 1000, 2) + " kPa, "
            + InvariantText.Percent(air.RelativeHumidity, 0) + " humid; ";
        return text + (selection.IsScaledToAir
            ? "dimensional formulas are scaled to it from dry air of 22 °C at sea level by their property groups."
            : !air.Equals(Air.AirState.OfLaboratories)
                ? "dimensional formulas are not scaled to it, as the policy asks."
                : "dimensional formulas stand as printed.");
    }

    private static void Write(StringBuilder text, SurfaceSelection surface, ConvectionPolicy policy)
    {
        text.Append(surface.Surface).Append('\n');
        foreach (SelectedPart part in surface.Parts)
        {
            TextWrap.Line(text, "  ", Heading(part, surface.Surface, policy));
            for (int i = 0; i < part.Ladder.Count; i++)
            {
                WriteLaw(text, part.Ladder, i);
            }

            WriteAlternatives(text, part.Alternatives);
        }

        foreach (SelectionGap gap in surface.Gaps)
        {
            TextWrap.Line(text, "  ", "Gap: " + gap.Text);
        }
    }

    private static string Heading(SelectedPart part, SurfaceContext surface, ConvectionPolicy policy)
    {
        string side = part.Side switch
        {
            SurfaceSide.Warmer => ", surface warmer than the air",
            SurfaceSide.Cooler => ", surface cooler than the air",
            _ => string.Empty,
        };
        return part.Kind switch
        {
            PartKind.Heater => Capital(part.Device!.Description) + " '" + part.Device.Name + "'" + Place(part.Device, surface) + side
                + ": replaces still air, fully from " + InvariantText.Percent(policy.HeaterRamp, 0) + " of its output",
            PartKind.Forced => Capital(part.Device!.Description) + " '" + part.Device.Name + "'" + Place(part.Device, surface) + side
                + ": blended with still air by flux" + Stream(part.Device, surface),
            _ => "Still air" + side,
        };
    }

    private static string Capital(string words) => char.ToUpperInvariant(words[0]) + words.Substring(1);

    private static string Place(FlowDescriptor device, SurfaceContext surface) => device.PlacementOf(surface.Name) switch
    {
        Placement.Above => ", above it",
        Placement.Beside => ", beside it",
        Placement.Opposite => ", opposite it",
        Placement.BelowWindow => ", below the window",
        Placement.AboveWindow => ", above the window",
        Placement.InStream => ", in its stream",
        _ => string.Empty,
    };

    private static string Stream(FlowDescriptor device, SurfaceContext surface) => device.StreamAlong(surface) switch
    {
        StreamDirection.Up => ", stream upwards",
        StreamDirection.Down => ", stream downwards",
        _ => ", stream across",
    };

    private static void WriteLaw(StringBuilder text, LawLadder ladder, int i)
    {
        SelectedLaw law = ladder[i];
        TextWrap.Line(text, "    ", law.Correlation.Id + ": " + string.Join("; ", law.Reasons));
        if (law.Violations.Count > 0)
        {
            TextWrap.Line(text, "      ", "The surface is outside: " + string.Join("; ", law.Violations));
        }

        if (i + 1 < ladder.Count)
        {
            (double low, double high) = ladder.Passage(i);
            text.Append("      passes into the next over ").Append(FormulaText.Symbol(law.Law.DrivenBy)).Append(' ')
                .Append(InvariantText.Span(low, high, FormulaText.Unit(law.Law.DrivenBy), InvariantText.Rounded)).Append('\n');
        }
    }

    private static void WriteAlternatives(StringBuilder text, IReadOnlyList<Alternative> alternatives)
    {
        for (int i = 0; i < Math.Min(alternatives.Count, AlternativesShown); i++)
        {
            TextWrap.Line(text, "      ", "rather than " + alternatives[i].Correlation.Id + ": " + alternatives[i].Reason);
        }

        if (alternatives.Count > AlternativesShown)
        {
            text.Append("      and ").Append(Count(alternatives.Count - AlternativesShown, "other")).Append('\n');
        }
    }

    private static void WriteSources(StringBuilder text, RoomSelection selection)
    {
        var seen = new SortedDictionary<CorrelationId, Correlation>();
        foreach (SurfaceSelection surface in selection.Surfaces)
        {
            foreach (SelectedPart part in surface.Parts)
            {
                foreach (SelectedLaw law in part.Chosen)
                {
                    seen[law.Correlation.Id] = law.Correlation;
                }
            }
        }

        text.Append("\nCorrelations chosen\n");
        foreach (Correlation c in seen.Values)
        {
            text.Append("  ").Append(c.Id).Append("   ").Append(c.Title).Append('\n');
            text.Append("    ").Append(c.Law.Formula).Append("   against ").Append(EvidenceText.Of(c.Reference)).Append('\n');
            TextWrap.Line(text, "    ", "tested over: " + c.Range + "; uncertainty " + c.Evidence.Uncertainty);
            TextWrap.Line(text, "    ", "evidence: " + c.Evidence.Setting + "; " + EvidenceText.Of(c.TextCheck));
            foreach (string doubt in c.Doubts)
            {
                TextWrap.Line(text, "    ", "doubt: " + doubt);
            }

            TextWrap.Line(text, "    ", "source: " + c.Publication.Citation);
        }
    }
}
