using System.Collections.Generic;
using System.IO;
using System.Linq;

namespace Convection.Correlations.Catalogue;

/// <summary>Numbers to check by hand: the table that the tests use, worked out apart from this code.</summary>
internal static class WorkedValues
{
    public const string Path = "tests/Convection.Correlations.Tests/Data/law-check-values.csv";

    public static ILookup<string, string> Read(string root)
    {
        IEnumerable<string[]> rows = File.ReadLines(System.IO.Path.Combine(root, Path)).Skip(1).Select(l => l.Split(','));
        return rows.ToLookup(r => r[0], Sentence);
    }

    private static string Sentence(string[] row)
    {
        var parts = new List<string>();
        void Add(string cell, string symbol, string unit)
        {
            if (cell.Length > 0)
            {
                parts.Add(symbol + " " + cell + unit);
            }
        }

        if (row[1] != "0")
        {
            parts.Add("x = " + row[1]);
        }

        Add(row[2], "H", " m");
        Add(row[3], "4A/P", " m (square)");
        Add(row[4], "L", " m");
        Add(row[5], "tilt to the heat flow", "°");
        return (parts.Count == 0 ? "h" : string.Join(", ", parts) + " → h") + " = " + row[7] + " W/(m²·K)";
    }
}
