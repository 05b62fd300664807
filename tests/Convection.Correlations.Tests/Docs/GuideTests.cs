using System;
using System.Globalization;
using System.IO;
using System.Linq;
using Convection.Correlations.Air;
using Convection.Correlations.Laws;
using Convection.Correlations.Literature;
using Convection.Correlations.Surfaces;
using Xunit;

namespace Convection.Correlations.Tests.Docs;

/// <summary>The tables of the guides hold what the library gives.</summary>
public class GuideTests
{
    private static readonly SurfaceContext Wall = new("wall", SurfaceKind.Wall, 4, 2.5);

    [Theory]
    [InlineData("Alamdari & Hammond, wall, 5 K", "alamdari-hammond-1983/vertical", 5)]
    [InlineData("Awbi & Hatton, heated floor, 5 K", "awbi-hatton-1999/floor-heated", 5)]
    [InlineData("Churchill & Chu, 5 K", "churchill-chu-1975/vertical-all", 5)]
    [InlineData("Fisher, wall, 6 air changes", "fisher-1995/ceiling-diffuser-wall", 6)]
    [InlineData("flat plate, laminar, 0.5 m/s", "pohlhausen-1921/plate-laminar", 0.5)]
    [InlineData("flat plate, turbulent, 0.5 m/s", "colburn-1933/plate-turbulent", 0.5)]
    public void AirTable_OfTheGuide_IsUpToDate(string name, string id, double x)
    {
        AirState[] states =
        [
            AirState.AtAltitude(22, 500), AirState.AtAltitude(22, 1609), AirState.AtAltitude(22, 2240), AirState.AtAltitude(22, 3000),
            new(0), new(10), new(30), new(40), new(22, relativeHumidity: 0.5),
        ];
        string row = "| " + name + " | 0 % | " + string.Join(" | ", states.Select(s => Change(id, x, s))) + " |";
        Assert.Contains(row, File.ReadAllText(QuickstartTests.Repository("docs/guides/how-the-numbers-are-made.md")), StringComparison.Ordinal);
    }

    private static string Change(string id, double x, AirState state)
    {
        AirProperties laboratory = new AirState(22).Properties;
        double Coefficient(AirProperties air) => PublishedLiterature.Registry[id].Bind(new LawBinding(Wall, air, 50, laboratory)).Evaluate(x).Coefficient;
        double percent = 100 * ((Coefficient(state.Properties) / Coefficient(laboratory)) - 1);
        return percent.ToString("+0.0;−0.0;0.0", CultureInfo.InvariantCulture) + " %";
    }
}
