using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using System.Text;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Catalogue;

/// <summary>Coefficients over one driving variable as SVG.</summary>
/// <remarks>
/// Inside the tested range a line is full, where the range is not known it is dashed, outside it is a thin dotted line. Lines carry
/// a letter at their end and in the legend, so that the picture reads in grey.
/// </remarks>
internal sealed class Chart(string title, DrivingVariable variable, IReadOnlyList<(string Name, Correlation Correlation, LawBinding Binding)> curves)
{
    private const double Width = 900, Left = 64, Right = 560, Top = 46, Bottom = 372, Height = 420;
    private const int Steps = 240;

    private static readonly string[] Palette = ["#1b3a5c", "#c2452d", "#4c8c4a", "#8a6fb0", "#b5812a", "#2a8f9d", "#7a3b4e", "#5d6b78", "#9b9a2f", "#3f63b5", "#c06a9b"];

    public string Svg()
    {
        double highest = StandardCase.Highest(variable);
        double[] xs = [.. Enumerable.Range(0, Steps + 1).Select(i => highest * i / Steps)];
        double[][] values = [.. curves.Select(c => Values(c.Correlation, c.Binding, xs))];
        (double top, double step) = Scale(values.SelectMany(v => v.Skip(2)).Where(double.IsFinite).DefaultIfEmpty(1).Max());
        double X(double x) => Left + ((Right - Left) * x / highest);
        double Y(double y) => Bottom - ((Bottom - Top) * Math.Max(y, 0) / top);

        var svg = new StringBuilder();
        double legend = Top + (19 * curves.Count) + 70;
        double height = Math.Max(Height, legend);
        svg.Append(F($"<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 {Width} {height}\" width=\"{Width}\" height=\"{height}\" font-family=\"Helvetica, Arial, sans-serif\" font-size=\"12\" fill=\"#222\">\n"));
        svg.Append(F($"<rect width=\"{Width}\" height=\"{height}\" fill=\"#ffffff\"/>\n<text x=\"{Left}\" y=\"24\" font-size=\"15\" font-weight=\"bold\">{Escape(title)}</text>\n"));
        for (double y = 0; y <= top + (1e-9 * step); y += step)
        {
            svg.Append(F($"<line x1=\"{Left}\" x2=\"{Right}\" y1=\"{Y(y):0.#}\" y2=\"{Y(y):0.#}\" stroke=\"#e2e2e2\"/><text x=\"{Left - 8}\" y=\"{Y(y) + 4:0.#}\" text-anchor=\"end\">{y:0.####}</text>\n"));
        }

        (double end, double every) = Scale(highest);
        for (double x = 0; x <= Math.Min(end, highest) + (1e-9 * every); x += every)
        {
            svg.Append(F($"<line x1=\"{X(x):0.#}\" x2=\"{X(x):0.#}\" y1=\"{Bottom}\" y2=\"{Bottom + 5}\" stroke=\"#777\"/><text x=\"{X(x):0.#}\" y=\"{Bottom + 19}\" text-anchor=\"middle\">{x:0.####}</text>\n"));
        }

        svg.Append(F($"<line x1=\"{Left}\" x2=\"{Right}\" y1=\"{Bottom}\" y2=\"{Bottom}\" stroke=\"#777\"/><text x=\"{(Left + Right) / 2}\" y=\"{Bottom + 38}\" text-anchor=\"middle\">{Escape(StandardCase.AxisTitle(variable))}</text>\n"));
        svg.Append(F($"<text x=\"18\" y=\"{(Top + Bottom) / 2}\" text-anchor=\"middle\" transform=\"rotate(-90 18 {(Top + Bottom) / 2})\">coefficient h [W/(m²·K)]</text>\n"));
        double[] labels = Spread([.. values.Select(v => Y(v[^1]))]);
        for (int i = 0; i < curves.Count; i++)
        {
            string colour = Palette[i % Palette.Length];
            BoundRange range = curves[i].Correlation.Range.Bind(curves[i].Binding, curves[i].Correlation.Bind(curves[i].Binding));
            Draw(svg, xs, values[i], x => Style(range, x), colour, X, Y);
            svg.Append(F($"<text x=\"{Right + 5}\" y=\"{labels[i] + 4:0.#}\" font-weight=\"bold\" fill=\"{colour}\">{(char)('A' + i)}</text>\n"));
            double row = Top + 6 + (19 * i);
            svg.Append(F($"<line x1=\"{Right + 34}\" x2=\"{Right + 60}\" y1=\"{row}\" y2=\"{row}\" stroke=\"{colour}\" stroke-width=\"2.2\"/><text x=\"{Right + 68}\" y=\"{row + 4}\"><tspan font-weight=\"bold\">{(char)('A' + i)}</tspan> {Escape(curves[i].Name)}</text>\n"));
        }

        double key = Top + 6 + (19 * curves.Count) + 12;
        foreach ((string words, string style) in new[] { ("inside the tested range", Inside), ("range not known", Unknown), ("outside the tested range", Outside) })
        {
            svg.Append(F($"<line x1=\"{Right + 34}\" x2=\"{Right + 60}\" y1=\"{key}\" y2=\"{key}\" stroke=\"#555\" {style}/><text x=\"{Right + 68}\" y=\"{key + 4}\" fill=\"#555\">{words}</text>\n"));
            key += 17;
        }

        return svg.Append("</svg>\n").ToString();
    }

    private const string Inside = "stroke-width=\"2.2\"", Unknown = "stroke-width=\"1.8\" stroke-dasharray=\"8 4\"", Outside = "stroke-width=\"1.1\" stroke-dasharray=\"2 3\"";

    private static double[] Values(Correlation c, LawBinding binding, double[] xs)
    {
        BoundLaw law = c.Bind(binding);
        return [.. xs.Select(x => law.Evaluate(x).Coefficient)];
    }

    private static string Style(BoundRange range, double x) => range.StandingAt(x) switch
    {
        RangeStanding.NotKnown => Unknown,
        RangeStanding.Within or RangeStanding.OutsideAdvised or RangeStanding.Extended => Inside,
        _ => Outside,
    };

    private static void Draw(StringBuilder svg, double[] xs, double[] values, Func<double, string> styleOf, string colour, Func<double, double> x, Func<double, double> y)
    {
        for (int start = 0, end; start < xs.Length - 1; start = end)
        {
            string style = styleOf(0.5 * (xs[start] + xs[start + 1]));
            var path = new StringBuilder(F($"M{x(xs[start]):0.#} {y(values[start]):0.#}"));
            for (end = start; end < xs.Length - 1 && styleOf(0.5 * (xs[end] + xs[end + 1])) == style; end++)
            {
                path.Append(F($"L{x(xs[end + 1]):0.#} {y(values[end + 1]):0.#}"));
            }

            svg.Append(F($"<path d=\"{path}\" fill=\"none\" stroke=\"{colour}\" {style}/>\n"));
        }
    }

    /// <summary>Moves labels apart until none covers its neighbour.</summary>
    private static double[] Spread(double[] labels)
    {
        const double Apart = 11;
        int[] order = [.. Enumerable.Range(0, labels.Length).OrderBy(i => labels[i])];
        double[] places = [.. order.Select(i => labels[i])];
        for (int pass = 0; pass < 200; pass++)
        {
            for (int i = 1; i < places.Length; i++)
            {
                double lacking = Math.Max(0, Apart - (places[i] - places[i - 1])) / 2;
                places[i - 1] -= lacking;
                places[i] += lacking;
            }
        }

        for (int i = 0; i < order.Length; i++)
        {
            labels[order[i]] = places[i];
        }

        return labels;
    }

    private static (double Top, double Step) Scale(double highest)
    {
        double raw = Math.Max(highest, 1e-6) / 5, power = Math.Pow(10, Math.Floor(Math.Log10(raw)));
        double step = power * (raw / power > 5 ? 10 : raw / power > 2 ? 5 : raw / power > 1 ? 2 : 1);
        return (Math.Ceiling((highest / step) - 1e-9) * step, step);
    }

    private static string Escape(string text) => text.Replace("&", "&amp;", StringComparison.Ordinal).Replace("<", "&lt;", StringComparison.Ordinal);

    private static string F(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
