using System;
using System.Collections.Generic;
using System.Linq;
using Convection.Correlations.Literature;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Catalogue;

/// <summary>Every file of the catalogue, by name.</summary>
internal static class CatalogueFiles
{
    public static SortedDictionary<string, string> Write(string root)
    {
        CorrelationRegistry registry = PublishedLiterature.Registry;
        var worked = WorkedValues.Read(root);
        var files = new SortedDictionary<string, string>(StringComparer.Ordinal)
        {
            ["README.md"] = IndexPage.Write(registry),
            ["references.bib"] = Bibliography.Write(registry),
            ["correlations.csv"] = CatalogueTable.Csv(registry),
            ["correlations.json"] = CatalogueTable.Json(registry),
            ["held-back.md"] = HeldBackPage.Write(),
        };
        foreach (IGrouping<string, Correlation> publication in registry.All.GroupBy(c => c.Publication.Key))
        {
            PublicationPage.Write([.. publication], worked, files);
        }

        foreach (Comparison comparison in Comparison.All)
        {
            comparison.Write(files);
        }

        return files;
    }
}
