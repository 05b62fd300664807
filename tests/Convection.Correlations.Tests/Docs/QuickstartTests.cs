using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using System.Reflection;
using System.Threading.Tasks;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Quickstart;
using Convection.Correlations.Rooms;
using Xunit;

namespace Convection.Correlations.Tests.Docs;

public sealed class QuickstartTests : IDisposable
{
    private static readonly RoomContext Room = Office.Describe();
    private static readonly string Header = string.Join(",", DayFile.Columns(Room));
    private const string GoodStep = "00:00,20,18,15,19,19,19,19,19,0.5,100,17";

    private readonly string folder = Directory.CreateTempSubdirectory("quickstart-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public void ShippedDay_EverySurfaceAndStep_GetsAFluxAndACorrelation()
    {
        Day day = ShippedDay();
        Assert.Equal(144, day.Steps.Count);
        Assert.All(day.Results.SelectMany(r => r), r => Assert.True(r.IsValid && r.Correlations.Count > 0));

        // The day shows what it is there to show: every kind of regime, and night without plant.
        Assert.All(
            new[] { FlowRegime.Buoyant, FlowRegime.Forced, FlowRegime.MixedOppositeFluxes, FlowRegime.MixedTransverse },
            regime => Assert.Contains(day.Results.SelectMany(r => r), r => r.Regime == regime));
        Assert.All(day.Results[0], r => Assert.Equal(FlowRegime.Buoyant, r.Regime));
    }

    [Fact]
    public Task Table_OfTheShippedDay_IsStable() => Snapshot.Verify(EveryCulture.Of(() => DayTable.Write(ShippedDay())));

    [Fact]
    public void Picture_InTheRepository_IsTheOneThatIsDrawn()
    {
        string committed = Path.Combine(Repository("docs/quickstart"), "office-day.svg");
        string drawn = EveryCulture.Of(() => DayPicture.Write(ShippedDay()));
        if (Environment.GetEnvironmentVariable("UPDATE_SNAPSHOTS") == "1" && Environment.GetEnvironmentVariable("CI") != "true")
        {
            File.WriteAllText(committed, drawn);
        }

        Assert.Equal(File.ReadAllText(committed).ReplaceLineEndings("\n"), drawn.ReplaceLineEndings("\n"));
    }

    [Fact]
    public void Csv_OfTheShippedDay_HasALineForEveryStepAndSurface()
    {
        string[] lines = EveryCulture.Of(() => DayCsv.Write(ShippedDay())).TrimEnd('\n').Split('\n');
        Assert.Equal(1 + (144 * 7), lines.Length);
        Assert.All(lines, l => Assert.Equal(lines[0].Split(',').Length, l.Split(',').Length));
    }

    [Theory]
    [InlineData("", "line 1: the file is empty")]
    [InlineData("HEADER", "line 2: the file has a header and no steps")]
    [InlineData("time [hh:mm],room\n", "line 1, column 2: 'room' stands where 'room air [°C]' is needed")]
    [InlineData("time [hh:mm];room air [°C]\n", "line 1: columns are separated by semicolons")]
    [InlineData("HEADER,more\n", "line 1, column 13: 'more' is one column too many")]
    [InlineData("HEADER\n00:00,20,18\n", "line 2: 3 cells, 12 are needed")]
    [InlineData("HEADER\nSTEP\n00:10,20,abc,15,19,19,19,19,19,0.5,100,17", "line 3, column 3 (facade [°C]): 'abc' is not a finite number")]
    [InlineData("HEADER\n00:00,20,NaN,15,19,19,19,19,19,0.5,100,17", "line 2, column 3 (facade [°C]): 'NaN' is not a finite number")]
    [InlineData("HEADER\n00:00,20,1e999,15,19,19,19,19,19,0.5,100,17", "line 2, column 3 (facade [°C]): '1e999' is not a finite number")]
    [InlineData("HEADER\n00:00,20,,15,19,19,19,19,19,0.5,100,17", "line 2, column 3 (facade [°C]): the cell is empty")]
    [InlineData("HEADER\n00:00,293,18,15,19,19,19,19,19,0.5,100,17", "line 2, column 2 (room air [°C]): 293 °C is outside -50 to 100 °C")]
    [InlineData("HEADER\n00:00,20,18,15,19,19,19,19,19,50,100,17", "line 2, column 10 (radiator output [0..1]): 50 is outside 0 to 1")]
    [InlineData("HEADER\n00:00,20,18,15,19,19,19,19,19,0.5,-3,17", "line 2, column 11 (diffuser flow [m³/h]): -3 m³/h is outside")]
    [InlineData("HEADER\n00:00,20,18,15,19,19,19,19,19,0.5,100,", "line 2, column 12 (diffuser supply [°C]): the cell is empty")]
    [InlineData("HEADER\n25:00,20,18,15,19,19,19,19,19,0.5,100,17", "line 2, column 1 (time [hh:mm]): '25:00' is not a time")]
    [InlineData("HEADER\nSTEP\nSTEP", "line 3, column 1 (time [hh:mm]): 00:00 does not come after 00:00")]
    public void BadFile_GivesLineColumnAndReason_AndNoSteps(string content, string expected)
    {
        string text = content.Replace("HEADER", Header, StringComparison.Ordinal).Replace("STEP", GoodStep, StringComparison.Ordinal);
        EveryCulture.Of(() =>
        {
            (IReadOnlyList<DayStep> steps, List<string> faults) = Read(text);
            Assert.Empty(steps);
            Assert.Contains(faults, f => f.StartsWith(expected, StringComparison.Ordinal));
            return faults[0];
        });
    }

    [Fact]
    public void BadFile_WithSeveralFaults_NamesThemAll()
    {
        (_, List<string> faults) = Read(Header + "\n00:00,x,18,15,19,19,19,19,19,0.5,100,17\n" + GoodStep + "\n00:20,20,18,15,19,19,19,19,19,7,100,17");
        Assert.Equal(2, faults.Count);
        Assert.StartsWith("line 4", faults[1], StringComparison.Ordinal);
    }

    [Fact]
    public void GoodFile_WithDiffuserOffAndNoSupplyTemperature_IsRead()
    {
        (IReadOnlyList<DayStep> steps, List<string> faults) = Read(Header + "\r\n00:00,20,18,15,19,19,19,19,19,0,0,\r\n\r\n");
        Assert.Empty(faults);
        Assert.True(double.IsNaN(Assert.Single(steps).Supply));
    }

    private (IReadOnlyList<DayStep> Steps, List<string> Faults) Read(string text)
    {
        string path = Path.Combine(folder, "day.csv");
        File.WriteAllText(path, text);
        var faults = new List<string>();
        return (DayFile.Read(path, Room, faults), faults);
    }

    private static Day ShippedDay()
    {
        var faults = new List<string>();
        IReadOnlyList<DayStep> steps = DayFile.Read(Path.Combine(Repository("docs/quickstart"), "office-day.csv"), Room, faults);
        Assert.Empty(faults);
        return Day.Run(RoomConvection.Bind(Room), steps, _ => { });
    }

    internal static string Repository(string path) => Path.Combine(
        typeof(QuickstartTests).Assembly.GetCustomAttributes<AssemblyMetadataAttribute>().Single(a => a.Key == "RepositoryRoot").Value!, path);
}
