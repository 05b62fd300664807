using System.Collections.Generic;
using System.IO;
using System.Linq;

namespace Convection.Correlations.Catalogue;

/// <summary>Numbers to check by hand: the tables that the tests use, worked out apart from this code.</summary>
internal static class WorkedValues
{
    public static ILookup<string, string> Read(string root)
        => Rows(root, "law-check-values.csv").Select(r => (Id: r[0], Text: Sentence(r)))
            .Concat(Rows(root, "mixing-check-values.csv").Select(r => (Id: r[0], Text: OfRule(r))))
            .ToLookup(r => r.Id, r => r.Text);

    private static IEnumerable<string[]> Rows(string root, string file)
        => File.ReadLines(Path.Combine(root, "tests", "Convection.Correlations.Tests", "Data", file)).Skip(1).Select(l => l.Split(','));

    private static string OfRule(string[] row) => row[1].Length > 0
        ? "h_n = " + row[1] + ", h_f = " + row[2] + " → h = " + row[8] + " W/(m²·K)"
        : "surface " + row[3] + " °C, room " + row[4] + " °C, supply " + row[5] + " °C, 6 air changes per hour, H 2.5 m or 4A/P 4 m, parts " + row[6] + " and "
            + row[7] + " → h = " + row[8] + " W/(m²·K)";

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
