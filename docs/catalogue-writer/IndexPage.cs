using System.Linq;
using System.Text;
using Convection.Correlations.Literature;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Catalogue;

/// <summary>The list of everything.</summary>
internal static class IndexPage
{
    public static string Write(CorrelationRegistry registry)
    {
        var text = new StringBuilder();
        text.Append("# Catalogue of correlations\n\nLiterature data ").Append(PublishedLiterature.DataVersion).Append(": ").Append(registry.Count)
            .Append(" correlations of ").Append(registry.All.Select(c => c.Publication.Key).Distinct().Count())
            .Append(" publications. Written by `docs/catalogue-writer` from the registry; do not edit.\n\n")
            .Append("Compare before you choose: ").AppendJoin(", ", Comparison.All.Select(c => "[" + c.Title + "](" + c.File + ".md)")).Append(".\n\n")
            .Append("As data: [correlations.csv](correlations.csv), [correlations.json](correlations.json), [references.bib](references.bib). ")
            .Append("[What is held back, and how to add it](held-back.md).\n\n")
            .Append("| correlation | for | formula | against | text |\n|---|---|---|---|---|\n");
        foreach (Correlation c in registry.All)
        {
            text.Append("| [`").Append(c.Id).Append("`](").Append(c.Publication.Key).Append(".md) | ").Append(c.Title).Append(" | ")
                .Append(c.Law.Formula.Replace("|", "\\|", System.StringComparison.Ordinal)).Append(" | ")
                .Append(EvidenceText.Of(c.Reference)).Append(" | ").Append(EvidenceText.Of(c.TextCheck)).Append(" |\n");
        }

        return text.ToString();
    }
}
