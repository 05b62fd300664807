using System;
using System.Globalization;
using System.Linq;
using System.Text;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Quickstart;

/// <summary>The day as tables for a screen.</summary>
internal static class DayTable
{
    private const int Wide = 12;

    public static string Write(Day day)
    {
        var text = new StringBuilder();
        WriteHours(text, day);
        text.Append('\n');
        WriteSurfaces(text, day);
        return text.ToString();
    }

    private static void WriteHours(StringBuilder text, Day day)
    {
        text.Append("Convective flux at the full hours [W/m²], positive from the surface into the air\n\n");
        text.Append("time   room °C  radiator  supply 1/h");
        foreach (SurfaceContext surface in day.Room.Room.Surfaces)
        {
            text.Append(surface.Name.PadLeft(Wide));
        }

        text.Append('\n');
        for (int i = 0; i < day.Steps.Count; i++)
        {
            DayStep step = day.Steps[i];
            if (step.Time.Minute != 0)
            {
                continue;
            }

            text.Append(Format($"{step.Time:HH:mm}{step.Room,10:0.0}{100 * step.RadiatorOutput,8:0} %{day.AirChanges(i),12:0.0}"));
            foreach (ConvectionResult result in day.Results[i])
            {
                text.Append((result.IsValid ? Format($"{Math.Round(result.FluxWattsPerSquareMetre, 1) + 0.0:0.0}{Mark(result.Regime)}") : "none ").PadLeft(Wide));
            }

            text.Append('\n');
        }

        text.Append("\nUnmarked: buoyant.  m: mixed.  f: forced.\n");
    }

    private static void WriteSurfaces(StringBuilder text, Day day)
    {
        text.Append("Over the day\n\n");
        text.Append("surface       buoyant  mixed  forced   buoyant h, room air   forced h, supply air   steps with a remark\n");
        for (int s = 0; s < day.Room.Surfaces.Count; s++)
        {
            ConvectionResult[] results = [.. day.Results.Select(r => r[s]).Where(r => r.IsValid)];
            double[] forced = [.. results.Where(r => r.ForcedCoefficientWattsPerSquareMetreKelvin > 0).Select(r => r.ForcedCoefficientWattsPerSquareMetreKelvin)];
            text.Append(day.Room.Surfaces[s].Surface.Name.PadRight(Wide))
                .Append(Share(results, r => r.Regime == FlowRegime.Buoyant))
                .Append(Share(results, r => IsMixed(r.Regime)))
                .Append(Share(results, r => r.Regime == FlowRegime.Forced))
                .Append(Span([.. results.Select(r => r.BuoyantCoefficientWattsPerSquareMetreKelvin)]).PadLeft(22))
                .Append(Span(forced).PadLeft(23))
                .Append(Format($"{results.Count(r => r.Flags != ConvectionFlags.None),14} of {day.Steps.Count}"))
                .Append('\n');
        }

        text.Append("\nCoefficients in W/(m²·K). A remark is a flag such as a range left, a near match or fluxes that point opposite\n"
            + "ways; the CSV names them for each step. Coefficients against unlike temperatures are not comparable: fluxes are.\n");
    }

    public static bool IsMixed(FlowRegime regime) => regime is not (FlowRegime.None or FlowRegime.Buoyant or FlowRegime.Forced);

    private static string Mark(FlowRegime regime) => regime == FlowRegime.Forced ? " f" : IsMixed(regime) ? " m" : "  ";

    private static string Share(ConvectionResult[] results, Func<ConvectionResult, bool> counts)
        => Format($"{(results.Length == 0 ? 0 : 100.0 * results.Count(counts) / results.Length),5:0} %");

    private static string Span(double[] values) => values.Length == 0 ? "none" : Format($"{values.Min():0.00} to {values.Max():0.00}");

    private static string Format(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
