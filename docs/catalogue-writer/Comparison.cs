using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using System.Text;
using Convection.Correlations.Laws;
using Convection.Correlations.Literature;
using Convection.Correlations.Registry;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Catalogue;

/// <summary>Laws that a designer would choose between, on one surface, as a plot and as a table with their spread.</summary>
internal sealed record Comparison(string File, string Title, string Introduction, DrivingVariable Variable, double[] At, SurfaceContext Surface, (string Name, string Id)[] Laws)
{
    private static readonly double[] Differences = [0.5, 1, 2, 5, 10];

    public static IReadOnlyList<Comparison> All { get; } =
    [
        new("compare-vertical", "upright walls", "Wall 4 m wide and 2.5 m high (4A/P 3.08 m). Laws differ by a factor of about 2, partly because they refer to unlike air temperatures.", DrivingVariable.TemperatureDifference, Differences, StandardCase.Wall,
        [
            ("Alamdari & Hammond", "alamdari-hammond-1983/vertical"),
            ("Khalifa & Marshall 2.07, fan heater", "khalifa-marshall-1990/wall-fan-heater-room"),
            ("Khalifa & Marshall 2.30, radiator", "khalifa-marshall-1990/wall-radiator-room"),
            ("Awbi & Hatton, heated", "awbi-hatton-1999/wall-heated"),
            ("Min et al.", "min-1956/wall"),
            ("McAdams 1.31, air", "mcadams-1954/air-vertical-turbulent"),
            ("Fohanno & Polidori", "fohanno-polidori-2006/vertical-turbulent"),
            ("Churchill & Chu", "churchill-chu-1975/vertical-all"),
            ("Raithby & Hollands", "raithby-hollands-1998/vertical"),
            ("ISO 15099, glazing", "iso-15099-2003/window-tilt-15-90"),
        ]),
        new("compare-unstable", "warm floors and cool ceilings", "Floor or ceiling 4 m × 4 m, heat flow upwards. Laws differ by a factor of 1.6 to 2.3.", DrivingVariable.TemperatureDifference, Differences, StandardCase.Square,
        [
            ("Alamdari & Hammond", "alamdari-hammond-1983/horizontal-unstable"),
            ("Awbi & Hatton, heated floor", "awbi-hatton-1999/floor-heated"),
            ("Min et al.", "min-1956/floor-heated-or-ceiling-cooled"),
            ("ASHRAE panel 2.13", "ashrae-2012/panel-floor-heated-or-ceiling-cooled"),
            ("McAdams 1.52, air", "mcadams-1954/air-horizontal-up-turbulent"),
            ("Lloyd & Moran 0.15", "lloyd-moran-1974/horizontal-up-turbulent-wide"),
            ("Khalifa & Marshall 3.10, radiator", "khalifa-marshall-1990/ceiling-radiator-room"),
            ("Khalifa & Marshall 2.72, fan heater", "khalifa-marshall-1990/ceiling-fan-heater-room"),
            ("Novoselac et al., chilled ceiling", "novoselac-2006/ceiling-cooled"),
            ("Karadağ, chilled ceiling", "karadag-2009/ceiling-cooled"),
            ("Raithby & Hollands", "raithby-hollands-1998/horizontal-up"),
        ]),
        new("compare-stable", "cool floors and warm ceilings", "Floor or ceiling 4 m × 4 m, heat flow downwards. Laws differ by a factor of about 6: a cool floor is stirred by downdraughts, a warm ceiling lies under a stagnant layer.", DrivingVariable.TemperatureDifference, Differences, StandardCase.Square,
        [
            ("Alamdari & Hammond", "alamdari-hammond-1983/horizontal-stable"),
            ("Awbi & Hatton, heated ceiling", "awbi-hatton-1999/ceiling-heated"),
            ("Min et al., heated ceiling", "min-1956/ceiling-heated"),
            ("ASHRAE panel 0.87, chilled floor", "ashrae-2012/panel-floor-cooled"),
            ("McAdams end-point 0.76", "mcadams-1954/inclined-heat-down"),
            ("McAdams 0.27", "mcadams-1954/horizontal-down"),
            ("Radziemska & Lewandowski 0.52", "radziemska-lewandowski-2001/horizontal-down"),
            ("Raithby & Hollands", "raithby-hollands-1998/horizontal-down"),
        ]),
        new("compare-jets", "supply air from ceiling diffusers", "All against supply air: never compare these with coefficients against room air. Radial ceiling diffuser; the slot forms use another flow variable and stand on their own page.", DrivingVariable.AirChangeRate, [3, 6, 10, 12, 20], StandardCase.Wall,
        [
            ("Fisher 1995, ceiling", "fisher-1995/ceiling-diffuser-ceiling"),
            ("Fisher & Pedersen 1997, ceiling", "fisher-pedersen-1997/ceiling-diffuser-ceiling"),
            ("Fisher 1995, wall", "fisher-1995/ceiling-diffuser-wall"),
            ("Fisher & Pedersen 1997, wall", "fisher-pedersen-1997/ceiling-diffuser-wall"),
            ("Fisher 1995, floor", "fisher-1995/ceiling-diffuser-floor"),
            ("Fisher & Pedersen 1997, floor", "fisher-pedersen-1997/ceiling-diffuser-floor"),
            ("Fisher 1995, side jet, wall", "fisher-1995/side-free-jet-wall"),
            ("Fisher 1995, side jet, floor", "fisher-1995/side-free-jet-floor"),
        ]),
    ];

    /// <summary>The coefficients at one value of the driving variable, in the order of the laws.</summary>
    public double[] Row(double at) => [.. Laws.Select(l => PublishedLiterature.Registry[l.Id].Bind(Binding(l.Id, at)).Evaluate(at).Coefficient)];

    public void Write(SortedDictionary<string, string> files)
    {
        files[File + ".svg"] = new Chart("Comparison: " + Title, Variable, [.. Laws.Select(l => (l.Name, PublishedLiterature.Registry[l.Id], Binding(l.Id)))]).Svg();
        var text = new StringBuilder();
        text.Append("# Comparison: ").Append(Title).Append("\n\n").Append(Introduction).Append("\n\n![Comparison](").Append(File).Append(".svg)\n\n")
            .Append("Coefficients in W/(m²·K); air of a textbook table at 30 °C (ISO 15099: its own fits, room at 20 °C).\n\n| ").Append(Variable == DrivingVariable.AirChangeRate ? "ACH [1/h]" : "\\|ΔT\\| [K]");
        foreach ((string name, string id) in Laws)
        {
            text.Append(" | [").Append(name).Append("](").Append(CorrelationId.Parse(id).PublicationKey).Append(".md)");
        }

        text.Append(" | largest/smallest |\n|---").Append(string.Concat(Enumerable.Repeat("|---", Laws.Length + 1))).Append("|\n");
        foreach (double at in At)
        {
            double[] row = Row(at);
            text.Append("| ").Append(InvariantText.Number(at));
            foreach (double h in row)
            {
                text.Append(" | ").Append(h.ToString(row.Max() < 2 ? "0.000" : "0.00", CultureInfo.InvariantCulture));
            }

            text.Append(" | ").Append((row.Max() / row.Min()).ToString("0.00", CultureInfo.InvariantCulture)).Append(" |\n");
        }

        text.Append("\nReferences: ").AppendJoin("; ", Laws.GroupBy(l => PublishedLiterature.Registry[l.Id].Reference).Select(g => EvidenceText.Of(g.Key) + ": " + string.Join(", ", g.Select(l => l.Name))))
            .Append(".\n\n[All correlations](README.md)\n");
        files[File + ".md"] = text.ToString();
    }

    private LawBinding Binding(string id, double at = 5) => new(
        Surface,
        id.StartsWith("iso-15099", StringComparison.Ordinal) ? StandardCase.Iso15099(20, at) : StandardCase.Air,
        34.4,
        isWarmer: id != "mcadams-1954/inclined-heat-down");
}
