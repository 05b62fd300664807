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
            ? "dimensional formulas are scaled from dry air at sea level to it by their property groups."
            : air.Pascals != Air.AirState.StandardPascals || air.RelativeHumidity != 0
                ? "dimensional formulas are not scaled to it, as the policy asks."
                : "dimensional formulas stand as printed.");
    }

    private static void Write(StringBuilder text, SurfaceSelection surface, ConvectionPolicy policy)
    {
        text.Append(surface.Surface).Append('\n');
        foreach (SelectedPart part in surface.Parts)
        {
            text.Append("  ").Append(Heading(part, surface.Surface, policy)).Append('\n');
            for (int i = 0; i < part.Ladder.Count; i++)
            {
                WriteLaw(text, part.Ladder, i);
            }

            WriteAlternatives(text, part.Alternatives);
        }

        foreach (SelectionGap gap in surface.Gaps)
        {
            text.Append("  Gap: ").Append(gap.Text).Append('\n');
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
        Correlation c = law.Correlation;
        text.Append("    ").Append(c.Id).Append(":  ").Append(c.Law.Formula).Append("   [").Append(c.Publication.ShortName).Append("]\n");
        if (i > 0)
        {
            (double low, double high) = ladder.Passage(i - 1);
            text.Append("      takes over between ").Append(Symbol(law)).Append(' ')
                .Append(InvariantText.Span(low, high, FormulaText.Unit(law.Law.DrivenBy))).Append(" in this room\n");
        }

        text.Append("      against ").Append(EvidenceText.Of(c.Reference)).Append("; ").Append(c.Range).Append('\n');
        text.Append("      because: ").Append(string.Join("; ", law.Reasons)).Append('\n');
        if (law.Violations.Count > 0)
        {
            text.Append("      the surface is outside: ").Append(string.Join("; ", law.Violations)).Append('\n');
        }

        foreach (string doubt in c.Doubts)
        {
            text.Append("      doubt: ").Append(doubt).Append('\n');
        }
    }

    private static string Symbol(SelectedLaw law) => FormulaText.Symbol(law.Law.DrivenBy);

    private static void WriteAlternatives(StringBuilder text, IReadOnlyList<Alternative> alternatives)
    {
        for (int i = 0; i < Math.Min(alternatives.Count, AlternativesShown); i++)
        {
            text.Append("      not ").Append(alternatives[i].Correlation.Id).Append(": ").Append(alternatives[i].Reason).Append('\n');
        }

        if (alternatives.Count > AlternativesShown)
        {
            text.Append("      nor ").Append(Count(alternatives.Count - AlternativesShown, "other")).Append('\n');
        }
    }
}
