using System;
using System.Globalization;

namespace Convection.Correlations;

/// <summary>Numbers as text, the same in every culture and on every runtime.</summary>
internal static class InvariantText
{
    /// <summary>Up to six significant digits.</summary>
    public static string Number(double value)
    {
        if (double.IsNaN(value))
        {
            return "NaN";
        }

        if (double.IsInfinity(value))
        {
            return value > 0 ? "infinity" : "-infinity";
        }

        double size = Math.Abs(value);
        if (size == 0)
        {
            return "0";
        }

        // Custom formats print the same digits on .NET and on .NET Framework; "G" and "R" do not.
        if (size < 1e-4 || size >= 1e6)
        {
            return value.ToString("0.#####E+0", CultureInfo.InvariantCulture);
        }

        int whole = size >= 1 ? (int)Math.Floor(Math.Log10(size)) + 1 : 0;
        int leadingZeros = size < 1 ? (int)Math.Floor(-Math.Log10(size)) : 0;
        int decimals = Math.Max(0, 6 - whole) + leadingZeros;
        string text = value.ToString("0." + new string('#', decimals), CultureInfo.InvariantCulture);
        return text == "-0" ? "0" : text;
    }

    public static string Number(double value, string unit) => unit.Length == 0 ? Number(value) : unit == "°" ? Number(value) + unit : Number(value) + " " + unit;

    /// <summary>Three significant digits, for texts where more would pretend.</summary>
    public static string Rounded(double value)
    {
        if (value == 0 || double.IsNaN(value) || double.IsInfinity(value))
        {
            return Number(value);
        }

        double unit = Math.Pow(10, Math.Floor(Math.Log10(Math.Abs(value))) - 2);
        return Number(Math.Round(value / unit) * unit);
    }

    /// <summary>Up to three digits with an exponent, for dimensionless groups.</summary>
    public static string Exponential(double value)
        => value.ToString("0.##e0", CultureInfo.InvariantCulture);

    /// <summary>A fixed number of decimals, without a minus sign on zero.</summary>
    public static string Fixed(double value, int decimals)
    {
        if (double.IsNaN(value) || double.IsInfinity(value))
        {
            return Number(value);
        }

        string format = "0." + new string('0', decimals);
        string text = value.ToString(format, CultureInfo.InvariantCulture);
        return text == "-" + 0.0.ToString(format, CultureInfo.InvariantCulture) ? text.Substring(1) : text;
    }

    public static string Percent(double fraction, int decimals) => Fixed(100 * fraction, decimals) + " %";

    public static string Interval(double lowest, double highest, string unit)
        => "[" + End(lowest, unit) + ", " + End(highest, unit) + "]";

    public static string OpenInterval(double lowest, double highest, string unit)
        => "(" + End(lowest, unit) + ", " + End(highest, unit) + "]";

    /// <summary>An interval in running text, open ends left out: "0.5 to 5 K", "from 3 1/h", "up to 9 K".</summary>
    public static string Span(double lowest, double highest, string unit) => Span(lowest, highest, unit, Number);

    public static string Span(double lowest, double highest, string unit, Func<double, string> write)
    {
        bool open = double.IsNegativeInfinity(lowest), endless = double.IsPositiveInfinity(highest);
        string tail = unit.Length == 0 ? string.Empty : unit == "°" ? unit : " " + unit;
        return open && endless ? "any"
            : open ? "up to " + write(highest) + tail
            : endless ? "from " + write(lowest) + tail
            : write(lowest) + " to " + write(highest) + tail;
    }

    private static string End(double value, string unit) => Number(value, unit);
}
