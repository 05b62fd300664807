using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using System.Text;
using Convection.Correlations.Evaluation;

namespace Convection.Correlations.Quickstart;

/// <summary>The day as one SVG: what the plant does, both coefficients, the flux, and the regime of every surface.</summary>
/// <remarks>Lines differ in dashes as well as in colour, and regimes in shade, so that the picture reads in grey.</remarks>
internal static class DayPicture
{
    private const double Width = 1060, Left = 78, Right = 850, PanelGap = 44, Top = 84;

    private static readonly (string Colour, string Dash)[] Pens =
    [
        ("#1b3a5c", "none"), ("#d1495b", "none"), ("#5b8e3e", "9 4"), ("#5b8e3e", "2 3"), ("#8a6fb0", "7 3 2 3"), ("#b5651d", "none"), ("#2a9d9d", "11 4"),
    ];

    private static readonly (string Name, string Fill, Func<FlowRegime, bool> Holds)[] Regimes =
    [
        ("buoyant", "#dfe6ec", r => r == FlowRegime.Buoyant),
        ("mixed, same direction of heat", "#8fb3c9", r => DayTable.IsMixed(r) && r != FlowRegime.MixedOppositeFluxes),
        ("mixed, fluxes opposite", "url(#opposite)", r => r == FlowRegime.MixedOppositeFluxes),
        ("forced", "#1f4e6b", r => r == FlowRegime.Forced),
    ];

    public static string Write(Day day)
    {
        string[] names = [.. day.Room.Surfaces.Select(s => s.Surface.Name)];
        var body = new StringBuilder();
        double top = Top;
        Panel(body, day, ref top, 90, "Plant: radiator output (solid, 0 to 1) and supply air changes per hour (dashed, a tenth)", string.Empty, [
            new Line("radiator output", Pens[1].Colour, "none", i => day.Steps[i].RadiatorOutput),
            new Line("air changes / 10", Pens[0].Colour, "6 3", i => day.AirChanges(i) / 10),
        ]);
        Panel(body, day, ref top, 170, "Coefficient of the buoyant part, against room air", "W/(m²·K)", Lines(day, names, r => r.BuoyantCoefficientWattsPerSquareMetreKelvin));
        Panel(body, day, ref top, 150, "Coefficient of the forced part, against supply air (none while the diffuser is off)", "W/(m²·K)", Lines(day, names, r => r.ForcedCoefficientWattsPerSquareMetreKelvin > 0 ? r.ForcedCoefficientWattsPerSquareMetreKelvin : double.NaN));
        Panel(body, day, ref top, 200, "Convective flux after blending, positive from the surface into the air", "W/m²", Lines(day, names, r => r.FluxWattsPerSquareMetre));
        Strips(body, day, names, ref top);
        return Format($"""
            <svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 {Width} {top}" width="{Width}" height="{top}" font-family="Helvetica, Arial, sans-serif" font-size="12" fill="#222">
            <defs><pattern id="opposite" width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(45)"><rect width="7" height="7" fill="#f4efe2"/><rect width="3" height="7" fill="#b5873a"/></pattern></defs>
            <rect width="{Width}" height="{top}" fill="#ffffff"/>
            <text x="{Left}" y="28" font-size="17" font-weight="bold">Convection in the {Escape(day.Room.Room.Name)} through the day</text>
            <text x="{Left}" y="46" fill="#555">Literature data {Escape(day.Room.Selection.DataVersion)}. Coefficients against unlike temperatures are not comparable; fluxes are.</text>

            """) + body + "</svg>\n";
    }

    private static Line[] Lines(Day day, string[] names, Func<ConvectionResult, double> value)
        => [.. names.Select((name, s) => new Line(name, Pens[s % Pens.Length].Colour, Pens[s % Pens.Length].Dash, i => value(day.Results[i][s])))];

    private static void Panel(StringBuilder svg, Day day, ref double top, double height, string title, string unit, IReadOnlyList<Line> lines)
    {
        double[] values = [.. lines.SelectMany(l => Enumerable.Range(0, day.Steps.Count).Select(l.Value)).Where(double.IsFinite)];
        (double low, double high, double step) = Scale(values);
        double panelTop = top;
        double Y(double v) => panelTop + (height * (high - v) / (high - low));
        svg.Append(Format($"<text x=\"{Left}\" y=\"{top - 8}\" font-weight=\"bold\">{Escape(title)}</text>\n"));
        for (double tick = Math.Ceiling(low / step) * step; tick <= high + (1e-9 * step); tick += step)
        {
            svg.Append(Format($"<line x1=\"{Left}\" x2=\"{Right}\" y1=\"{Y(tick):0.#}\" y2=\"{Y(tick):0.#}\" stroke=\"{(Math.Abs(tick) < 1e-9 ? "#888" : "#e3e3e3")}\"/>"));
            svg.Append(Format($"<text x=\"{Left - 8}\" y=\"{Y(tick) + 4:0.#}\" text-anchor=\"end\">{tick:0.##}</text>\n"));
        }

        if (unit.Length > 0)
        {
            double middle = top + (height / 2);
            svg.Append(Format($"<text x=\"22\" y=\"{middle}\" text-anchor=\"middle\" transform=\"rotate(-90 22 {middle})\">{unit}</text>\n"));
        }

        Hours(svg, day, top, height);
        foreach (Line line in lines)
        {
            svg.Append(Format($"<path d=\"{Path(day, line, Y)}\" fill=\"none\" stroke=\"{line.Colour}\" stroke-width=\"1.8\" stroke-dasharray=\"{line.Dash}\"/>\n"));
        }

        for (int i = 0; i < lines.Count; i++)
        {
            double y = top + 8 + (17 * i);
            svg.Append(Format($"<line x1=\"{Right + 14}\" x2=\"{Right + 48}\" y1=\"{y}\" y2=\"{y}\" stroke=\"{lines[i].Colour}\" stroke-width=\"2\" stroke-dasharray=\"{lines[i].Dash}\"/>"));
            svg.Append(Format($"<text x=\"{Right + 56}\" y=\"{y + 4}\">{Escape(lines[i].Name)}</text>\n"));
        }

        top += height + PanelGap;
    }

    private static void Strips(StringBuilder svg, Day day, string[] names, ref double top)
    {
        const double Row = 22;
        svg.Append(Format($"<text x=\"{Left}\" y=\"{top - 8}\" font-weight=\"bold\">Regime by share of the fluxes</text>\n"));
        for (int s = 0; s < names.Length; s++)
        {
            double y = top + (Row * s);
            svg.Append(Format($"<text x=\"{Left - 8}\" y=\"{y + 13}\" text-anchor=\"end\">{Escape(names[s])}</text>\n"));
            for (int start = 0, end; start < day.Steps.Count; start = end)
            {
                int kind = Kind(day.Results[start][s].Regime);
                for (end = start + 1; end < day.Steps.Count && Kind(day.Results[end][s].Regime) == kind; end++)
                {
                }

                double x = X(day, start), width = (end < day.Steps.Count ? X(day, end) : Right) - x;
                svg.Append(Format($"<rect x=\"{x:0.#}\" y=\"{y}\" width=\"{width:0.#}\" height=\"{Row - 5}\" fill=\"{(kind < 0 ? "#ffffff" : Regimes[kind].Fill)}\"/>\n"));
            }
        }

        double height = Row * names.Length;
        for (int i = 0; i < Regimes.Length; i++)
        {
            double y = top + (20 * i);
            svg.Append(Format($"<rect x=\"{Right + 14}\" y=\"{y}\" width=\"26\" height=\"13\" fill=\"{Regimes[i].Fill}\" stroke=\"#999\" stroke-width=\"0.5\"/>"));
            svg.Append(Format($"<text x=\"{Right + 46}\" y=\"{y + 11}\" font-size=\"11\">{Regimes[i].Name}</text>\n"));
        }

        Hours(svg, day, top, height);
        svg.Append(Format($"<text x=\"{(Left + Right) / 2}\" y=\"{top + height + 38}\" text-anchor=\"middle\">time of day [h]</text>\n"));
        top += height + 56;
    }

    private static int Kind(FlowRegime regime) => Array.FindIndex(Regimes, r => r.Holds(regime));

    private static void Hours(StringBuilder svg, Day day, double top, double height)
    {
        double first = Hour(day, 0), last = Hour(day, day.Steps.Count - 1);
        double every = last - first > 12 ? 2 : last - first > 3 ? 1 : 0.5;
        for (double hour = Math.Ceiling(first / every) * every; hour <= last + 1e-9; hour += every)
        {
            double x = Left + ((Right - Left) * (hour - first) / Math.Max(last - first, 1e-9));
            svg.Append(Format($"<line x1=\"{x:0.#}\" x2=\"{x:0.#}\" y1=\"{top + height}\" y2=\"{top + height + 4}\" stroke=\"#888\"/>"));
            svg.Append(Format($"<text x=\"{x:0.#}\" y=\"{top + height + 16}\" text-anchor=\"middle\" fill=\"#555\" font-size=\"11\">{hour:0.#}</text>\n"));
        }
    }

    private static string Path(Day day, Line line, Func<double, double> y)
    {
        var path = new StringBuilder();
        bool pen = false;
        for (int i = 0; i < day.Steps.Count; i++)
        {
            double value = line.Value(i);
            if (double.IsFinite(value))
            {
                path.Append(Format($"{(pen ? 'L' : 'M')}{X(day, i):0.#} {y(value):0.#}"));
            }

            pen = double.IsFinite(value);
        }

        return path.ToString();
    }

    private static double X(Day day, int step)
    {
        double first = Hour(day, 0), last = Hour(day, day.Steps.Count - 1);
        return Left + ((Right - Left) * (Hour(day, step) - first) / Math.Max(last - first, 1e-9));
    }

    private static double Hour(Day day, int step) => day.Steps[step].Time.ToTimeSpan().TotalHours;

    /// <summary>Ends and a step of 1, 2 or 5 times a power of ten that give about five ticks; zero is always in.</summary>
    private static (double Low, double High, double Step) Scale(double[] values)
    {
        double low = Math.Min(0, values.DefaultIfEmpty(0).Min()), high = Math.Max(0, values.DefaultIfEmpty(1).Max());
        double raw = Math.Max(high - low, 1e-6) / 5, power = Math.Pow(10, Math.Floor(Math.Log10(raw)));
        double step = power * (raw / power > 5 ? 10 : raw / power > 2 ? 5 : raw / power > 1 ? 2 : 1);
        return (Math.Floor(low / step) * step, Math.Ceiling(high / step) * step, step);
    }

    private static string Escape(string text) => text.Replace("&", "&amp;", StringComparison.Ordinal).Replace("<", "&lt;", StringComparison.Ordinal);

    private static string Format(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);

    private sealed record Line(string Name, string Colour, string Dash, Func<int, double> Value);
}
