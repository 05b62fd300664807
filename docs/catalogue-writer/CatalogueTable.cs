using System;
using System.Collections.Generic;
using System.Linq;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using Convection.Correlations.Literature;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Catalogue;

/// <summary>The whole registry as CSV and as JSON, names and units in full words.</summary>
internal static class CatalogueTable
{
    private static readonly JsonSerializerOptions Readable = new() { WriteIndented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    private static readonly (string Name, Func<Correlation, string> Value)[] Columns =
    [
        ("id", c => c.Id.ToString()),
        ("title", c => c.Title),
        ("use", PublicationPage.Use),
        ("surfaces", c => EvidenceText.Of(c.Applies.Surfaces)),
        ("heat flow", c => PublicationPage.Sense(c.Applies.Sense)),
        ("made for", c => Selection.Ranking.Words(c.Applies.Driver)),
        ("formula", c => c.Law.Formula),
        ("driving variable", c => c.Law.DrivenBy == Laws.DrivingVariable.None ? "none" : StandardCase.AxisTitle(c.Law.DrivenBy)),
        ("length", c => c.Length == Laws.CharacteristicLength.None ? "none" : RangeText.Name(c.Length)),
        ("reference temperature", c => EvidenceText.Of(c.Reference)),
        ("tested over", c => c.Range.ToString()),
        ("evidence", c => EvidenceText.Of(c.Evidence.Kind)),
        ("setting", c => c.Evidence.Setting),
        ("uncertainty", c => c.Evidence.Uncertainty),
        ("text", c => EvidenceText.Of(c.TextCheck)),
        ("flagged as unconfirmed", c => c.IsUnconfirmed ? "yes" : "no"),
        ("doubts", c => string.Join(" ", c.Doubts)),
        ("source", c => c.Publication.Citation),
    ];

    public static string Csv(CorrelationRegistry registry)
    {
        var text = new StringBuilder();
        text.AppendJoin(',', Columns.Select(c => c.Name)).Append('\n');
        foreach (Correlation correlation in registry.All)
        {
            text.AppendJoin(',', Columns.Select(c => Quote(c.Value(correlation)))).Append('\n');
        }

        return text.ToString();
    }

    public static string Json(CorrelationRegistry registry) => JsonSerializer.Serialize(
        new Dictionary<string, object>
        {
            ["literature data"] = PublishedLiterature.DataVersion,
            ["coefficient unit"] = "W/(m²·K)",
            ["correlations"] = registry.All.Select(c => Columns.Where(k => k.Name != "doubts").ToDictionary(k => k.Name, k => (object)k.Value(c))
                .Append(new("doubts", c.Doubts)).ToDictionary(p => p.Key, p => p.Value)).ToArray(),
        },
        Readable) + "\n";

    private static string Quote(string cell) => "\"" + cell.Replace("\"", "\"\"", StringComparison.Ordinal) + "\"";
}
