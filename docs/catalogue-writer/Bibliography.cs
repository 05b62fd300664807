using System;
using System.Linq;
using System.Text;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Catalogue;

/// <summary>All publications in BibTeX.</summary>
internal static class Bibliography
{
    public static string Write(CorrelationRegistry registry)
    {
        var text = new StringBuilder();
        foreach (Publication p in registry.All.Select(c => c.Publication).DistinctBy(p => p.Key).OrderBy(p => p.Key, StringComparer.Ordinal))
        {
            bool thesis = p.Source.Contains("PhD thesis", StringComparison.Ordinal), article = p.Source.Any(char.IsAsciiDigit);
            text.Append('@').Append(thesis ? "phdthesis" : article ? "article" : "book").Append('{').Append(p.Key).Append(",\n")
                .Append("  author = {").Append(string.Join(" and ", p.Authors.Split(", "))).Append("},\n")
                .Append("  title = {").Append(Escape(p.Title)).Append("},\n")
                .Append("  ").Append(thesis ? "school" : article ? "journal" : "publisher").Append(" = {").Append(Escape(p.Source)).Append("},\n")
                .Append("  year = {").Append(p.Year).Append(p.Doi.Length == 0 ? "}\n" : "},\n  doi = {" + p.Doi + "}\n").Append("}\n\n");
        }

        return text.ToString();
    }

    private static string Escape(string text) => text.Replace("&", "\\&", StringComparison.Ordinal);
}
