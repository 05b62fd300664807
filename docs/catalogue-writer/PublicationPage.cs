using System;
using System.Collections.Generic;
using System.Linq;
using System.Text;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;
using Convection.Correlations.Selection;

namespace Convection.Correlations.Catalogue;

/// <summary>One publication: what it measured, its formulas with symbols, ranges, evidence and doubts, and a plot.</summary>
internal static class PublicationPage
{
    public static void Write(Correlation[] correlations, ILookup<string, string> worked, SortedDictionary<string, string> files)
    {
        Publication publication = correlations[0].Publication;
        var text = new StringBuilder();
        text.Append("# ").Append(publication.ShortName).Append("\n\n").Append(publication.Citation).Append(".\n\n[All correlations](README.md)\n\n");
        foreach (IGrouping<DrivingVariable, Correlation> group in correlations.GroupBy(c => c.Law.DrivenBy == DrivingVariable.None ? DrivingVariable.TemperatureDifference : c.Law.DrivenBy))
        {
            string picture = publication.Key + "-" + group.Key.ToString().ToLowerInvariant() + ".svg";
            files[picture] = new Chart(publication.ShortName, group.Key, [.. group.Select(c => (c.Id.Case, c, StandardCase.Binding(c)))]).Svg();
            text.Append("![Coefficients of ").Append(publication.ShortName).Append("](").Append(picture).Append(")\n\n");
        }

        text.Append("Drawn for ").Append(string.Join("; ", correlations.Select(c => StandardCase.SurfaceOf(c).Name).Distinct()))
            .Append("; air of a textbook table at 30 °C (k 0.02588 W/(m·K), ν 1.608·10⁻⁵ m²/s, Pr 0.7282), room of 34.4 m³ where a volume is needed.\n");
        foreach (Correlation c in correlations)
        {
            Write(text, c, worked);
        }

        files[publication.Key + ".md"] = text.ToString();
    }

    public static string Use(Correlation c) => c.Family == CorrelationFamily.Total ? "total, radiation contained; never chosen as convective"
        : c.IsReferenceOnly ? "kept for comparison; never chosen automatically"
        : c.Family switch
        {
            CorrelationFamily.Buoyant => "buoyant coefficient",
            CorrelationFamily.Forced => c.ContainsBuoyancy ? "forced coefficient, buoyancy not added" : "forced coefficient",
            CorrelationFamily.Mixed => "mixed coefficient, buoyancy contained",
            _ => "fixed convective value",
        };

    public static string Sense(HeatFlowSense sense) => sense switch
    {
        HeatFlowSense.Up => "upwards (warm floor, cool ceiling)",
        HeatFlowSense.Down => "downwards (cool floor, warm ceiling)",
        HeatFlowSense.Horizontal => "sideways",
        _ => "any",
    };

    private static void Write(StringBuilder text, Correlation c, ILookup<string, string> worked)
    {
        text.Append("\n## `").Append(c.Id).Append("`\n\n").Append(char.ToUpperInvariant(c.Title[0])).Append(c.Title.AsSpan(1)).Append(".\n\n    ").Append(c.Law.Formula).Append("\n\n");
        Row(text, "use", Use(c));
        Row(text, "surfaces", EvidenceText.Of(c.Applies.Surfaces) + (c.Applies.Side == SurfaceSide.Warmer ? ", warmer than the air" : string.Empty));
        Row(text, "heat flow", Sense(c.Applies.Sense));
        Row(text, "made for", Ranking.Words(c.Applies.Driver) + Place(c) + (c.Applies.ConditionText.Length == 0 ? string.Empty : ", where " + c.Applies.ConditionText));
        Row(text, "symbols", Symbols(c));
        Row(text, "against", EvidenceText.Of(c.Reference));
        Row(text, "range", c.Range.ToString());
        Row(text, "evidence", EvidenceText.Of(c.Evidence.Kind) + ": " + c.Evidence.Setting);
        Row(text, "uncertainty", c.Evidence.Uncertainty);
        Row(text, "text", EvidenceText.Of(c.TextCheck) + (c.IsUnconfirmed ? "; flagged in every result" : string.Empty));
        foreach (string doubt in c.Doubts)
        {
            Row(text, "doubt", doubt);
        }

        foreach (string value in worked[c.Id.ToString()])
        {
            Row(text, "by hand", value);
        }
    }

    private static void Row(StringBuilder text, string name, string value) => text.Append("- **").Append(name).Append("**: ").Append(value).Append('\n');

    private static string Place(Correlation c) => c.Applies.Placement switch
    {
        Placement.Above => ", surface above it",
        Placement.Beside => ", surface beside it",
        Placement.Opposite => ", surface opposite it",
        Placement.BelowWindow => ", surface below the window",
        Placement.AboveWindow => ", surface above the window",
        _ => string.Empty,
    };

    private static string Symbols(Correlation c)
    {
        string driving = c.Law.DrivenBy == DrivingVariable.None ? "x is not used" : "x = " + FormulaText.Symbol(c.Law.DrivenBy) + ", " + StandardCase.AxisTitle(c.Law.DrivenBy);
        string length = c.Length == CharacteristicLength.None ? "no length" : "length " + FormulaText.Symbol(c.Length) + ", " + RangeText.Name(c.Length) + " [m]";
        return driving + "; " + length + "; h [W/(m²·K)]"
            + (c.Law.IsDimensionless ? "; Nu = h·length/k, Ra = g·β·|ΔT|·length³·Pr/ν², Re = U·length/ν, Pr [-], k [W/(m·K)], ν [m²/s], β [1/K]" : string.Empty);
    }
}
