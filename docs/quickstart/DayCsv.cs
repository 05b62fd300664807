using System;
using System.Globalization;
using System.Linq;
using System.Text;
using Convection.Correlations.Evaluation;

namespace Convection.Correlations.Quickstart;

/// <summary>Every step and surface as a line of CSV.</summary>
internal static class DayCsv
{
    public static string Write(Day day)
    {
        var text = new StringBuilder();
        text.Append("time [hh:mm],surface,flux [W/m²],flux per surface kelvin [W/(m²·K)],flux per room kelvin [W/(m²·K)],flux per supply kelvin [W/(m²·K)],"
            + "coefficient [W/(m²·K)],reference,coefficient against room air [W/(m²·K)],buoyant flux [W/m²],forced flux [W/m²],forced share [0..1],regime,status,remarks,correlations\n");
        for (int i = 0; i < day.Steps.Count; i++)
        {
            for (int s = 0; s < day.Results[i].Length; s++)
            {
                ConvectionResult r = day.Results[i][s];
                text.AppendJoin(',', [
                    day.Steps[i].Time.ToString("HH:mm", CultureInfo.InvariantCulture),
                    day.Room.Surfaces[s].Surface.Name,
                    Number(r.FluxWattsPerSquareMetre),
                    Number(r.FluxPerSurfaceKelvin),
                    Number(r.FluxPerRoomKelvin),
                    Number(r.FluxPerSupplyKelvin),
                    Number(r.CoefficientWattsPerSquareMetreKelvin),
                    r.Reference.ToString(),
                    Number(r.RoomAirCoefficientWattsPerSquareMetreKelvin),
                    Number(r.BuoyantFluxWattsPerSquareMetre),
                    Number(r.ForcedFluxWattsPerSquareMetre),
                    Number(r.ForcedShare),
                    r.Regime.ToString(),
                    r.Status.ToString(),
                    r.Flags.ToString().Replace(", ", "; ", StringComparison.Ordinal),
                    string.Join("; ", r.Correlations.Select(c => c.ToString())),
                ]).Append('\n');
            }
        }

        return text.ToString();
    }

    private static string Number(double value) => double.IsFinite(value) ? value.ToString("0.######", CultureInfo.InvariantCulture) : string.Empty;
}
