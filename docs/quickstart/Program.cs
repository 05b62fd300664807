using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Text;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Quickstart;
using Convection.Correlations.Rooms;

Console.OutputEncoding = Encoding.UTF8;
string input = Path.Combine(AppContext.BaseDirectory, "office-day.csv");
string output = "quickstart-output";
for (int i = 0; i < args.Length; i += 2)
{
    if (args[i] is "--input" or "--output" && i + 1 < args.Length)
    {
        (input, output) = args[i] == "--input" ? (args[i + 1], output) : (input, args[i + 1]);
    }
    else
    {
        bool asked = args[i] is "--help" or "-h";
        (asked ? Console.Out : Console.Error).WriteLine(
            (asked ? string.Empty : "'" + args[i] + (args[i] is "--input" or "--output" ? "' needs a value.\n" : "' is not understood.\n"))
            + "quickstart [--input FILE] [--output FOLDER]\n"
            + "  FILE    a day as CSV; the one that ships with the quickstart if left out. Its header:\n"
            + "          " + string.Join(",", DayFile.Columns(Office.Describe())) + "\n"
            + "  FOLDER  where the CSV and the SVG go; quickstart-output if left out");
        return asked ? 0 : 2;
    }
}

RoomContext office = Office.Describe();
var faults = new List<string>();
IReadOnlyList<DayStep> steps;
try
{
    steps = DayFile.Read(input, office, faults);
}
catch (Exception unreadable) when (unreadable is IOException or UnauthorizedAccessException)
{
    Console.Error.WriteLine("The file '" + input + "' cannot be read: " + unreadable.Message);
    return 1;
}

if (faults.Count > 0)
{
    Console.Error.WriteLine("The file '" + input + "' cannot be used. Nothing was written.");
    faults.ForEach(Console.Error.WriteLine);
    return 1;
}

RoomConvection bound = RoomConvection.Bind(office);
Day day = Day.Run(bound, steps, Console.Error.WriteLine);
string table = DayTable.Write(day), explanation = bound.Explain();
Console.WriteLine(table);
Console.WriteLine(explanation);
try
{
    Directory.CreateDirectory(output);
    Save("day.csv", DayCsv.Write(day));
    Save("day.svg", DayPicture.Write(day));
    Save("explanation.txt", explanation);
}
catch (Exception unwritable) when (unwritable is IOException or UnauthorizedAccessException)
{
    Console.Error.WriteLine("The folder '" + output + "' cannot be written: " + unwritable.Message);
    return 1;
}

Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"Written to {Path.GetFullPath(output)}: day.csv ({steps.Count * bound.Surfaces.Count} lines), day.svg, explanation.txt"));
return 0;

void Save(string name, string text) => File.WriteAllText(Path.Combine(output, name), text, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false));
