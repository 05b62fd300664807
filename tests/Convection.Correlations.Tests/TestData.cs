using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text;

namespace Convection.Correlations.Tests;

/// <summary>Tables of check values that are embedded in the test assembly.</summary>
internal static class TestData
{
    public static IEnumerable<Dictionary<string, string>> Rows(string file)
    {
        using Stream stream = typeof(TestData).Assembly.GetManifestResourceStream("Convection.Correlations.Tests.Data." + file)
            ?? throw new FileNotFoundException(file);
        using var reader = new StreamReader(stream, Encoding.UTF8);
        string[] header = Split(reader.ReadLine()!);
        while (reader.ReadLine() is { Length: > 0 } line)
        {
            string[] cells = Split(line);
            if (cells.Length != header.Length)
            {
                throw new InvalidDataException(file + ": " + line);
            }

            yield return header.Zip(cells).ToDictionary(p => p.First, p => p.Second);
        }
    }

    public static double Number(string text) => double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);

    private static string[] Split(string line)
    {
        var cells = new List<string>();
        var cell = new StringBuilder();
        bool quoted = false;
        foreach (char c in line)
        {
            if (c == '"')
            {
                quoted = !quoted;
            }
            else if (c == ',' && !quoted)
            {
                cells.Add(cell.ToString());
                cell.Clear();
            }
            else
            {
                cell.Append(c);
            }
        }

        cells.Add(cell.ToString());
        return [.. cells];
    }
}
