using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using Convection.Correlations.Rooms;

namespace Convection.Correlations.Quickstart;

/// <summary>Reads a day from CSV. Every fault is reported with line, column and reason; a file with a fault gives no steps.</summary>
internal static class DayFile
{
    private const int MostFaults = 20;
    private const double LowestCelsius = -50, HighestCelsius = 100, HighestFlow = 100_000;

    public static string[] Columns(RoomContext room) =>
    [
        "time [hh:mm]",
        "room air [°C]",
        .. room.Surfaces.Select(s => s.Name + " [°C]"),
        Office.Radiator + " output [0..1]",
        Office.Diffuser + " flow [m³/h]",
        Office.Diffuser + " supply [°C]",
    ];

    public static IReadOnlyList<DayStep> Read(string path, RoomContext room, List<string> faults)
    {
        string[] columns = Columns(room);
        string[] lines = File.ReadAllLines(path);
        if (lines.Length == 0)
        {
            faults.Add("line 1: the file is empty; it needs a header and at least one step.");
            return [];
        }

        CheckHeader(lines[0], columns, faults);
        if (faults.Count > 0)
        {
            return [];
        }

        var steps = new List<DayStep>();
        for (int i = 1; i < lines.Length && faults.Count < MostFaults; i++)
        {
            if (lines[i].Trim().Length > 0)
            {
                ReadStep(lines[i], i + 1, columns, steps, faults);
            }
        }

        if (steps.Count == 0 && faults.Count == 0)
        {
            faults.Add("line 2: the file has a header and no steps.");
        }

        return faults.Count == 0 ? steps : [];
    }

    private static void CheckHeader(string line, string[] columns, List<string> faults)
    {
        string[] cells = Split(line);
        if (cells.Length == 1 && line.Contains(';', StringComparison.Ordinal))
        {
            faults.Add("line 1: columns are separated by semicolons; use commas, and a point in numbers.");
            return;
        }

        for (int i = 0; i < columns.Length; i++)
        {
            if (i >= cells.Length || cells[i] != columns[i])
            {
                faults.Add("line 1, column " + Text(i + 1) + ": '" + (i < cells.Length ? cells[i] : string.Empty) + "' stands where '" + columns[i]
                    + "' is needed. The header is: " + string.Join(",", columns));
                return;
            }
        }

        if (cells.Length > columns.Length)
        {
            faults.Add("line 1, column " + Text(columns.Length + 1) + ": '" + cells[columns.Length] + "' is one column too many.");
        }
    }

    private static void ReadStep(string line, int number, string[] columns, List<DayStep> steps, List<string> faults)
    {
        string[] cells = Split(line);
        if (cells.Length != columns.Length)
        {
            faults.Add("line " + Text(number) + ": " + Text(cells.Length) + " cells, " + Text(columns.Length)
                + " are needed. Numbers take a decimal point, not a comma.");
            return;
        }

        int before = faults.Count;
        if (!TimeOnly.TryParseExact(cells[0], "HH:mm", CultureInfo.InvariantCulture, DateTimeStyles.None, out TimeOnly time))
        {
            faults.Add(Where(number, columns, 0) + "'" + cells[0] + "' is not a time such as 07:30.");
        }
        else if (steps.Count > 0 && time <= steps[^1].Time)
        {
            faults.Add(Where(number, columns, 0) + cells[0] + " does not come after " + steps[^1].Time.ToString("HH:mm", CultureInfo.InvariantCulture) + ".");
        }

        int last = columns.Length - 1;
        var temperatures = new double[last - 3];
        for (int i = 0; i < temperatures.Length; i++)
        {
            temperatures[i] = Number(cells[i + 1], LowestCelsius, HighestCelsius, "°C", Where(number, columns, i + 1), faults);
        }

        double output = Number(cells[last - 2], 0, 1, string.Empty, Where(number, columns, last - 2), faults);
        double flow = Number(cells[last - 1], 0, HighestFlow, "m³/h", Where(number, columns, last - 1), faults);
        bool noSupply = cells[last].Length == 0 && flow == 0;
        double supply = noSupply ? double.NaN : Number(cells[last], LowestCelsius, HighestCelsius, "°C", Where(number, columns, last), faults);
        if (faults.Count == before)
        {
            steps.Add(new DayStep(time, temperatures[0], temperatures[1..], output, flow, supply));
        }
    }

    private static double Number(string cell, double lowest, double highest, string unit, string where, List<string> faults)
    {
        string tail = unit.Length == 0 ? string.Empty : " " + unit;
        if (!double.TryParse(cell, NumberStyles.Float, CultureInfo.InvariantCulture, out double value) || !double.IsFinite(value))
        {
            faults.Add(where + (cell.Length == 0 ? "the cell is empty" : "'" + cell + "' is not a finite number") + "; from " + Text(lowest) + " to " + Text(highest) + tail + " is accepted.");
            return double.NaN;
        }

        if (value < lowest || value > highest)
        {
            faults.Add(where + cell + tail + " is outside " + Text(lowest) + " to " + Text(highest) + tail + ".");
        }

        return value;
    }

    private static string Where(int line, string[] columns, int column) => "line " + Text(line) + ", column " + Text(column + 1) + " (" + columns[column] + "): ";

    private static string[] Split(string line) => Array.ConvertAll(line.TrimStart('\uFEFF').Split(','), c => c.Trim());

    private static string Text(double value) => value.ToString("0.####", CultureInfo.InvariantCulture);
}
