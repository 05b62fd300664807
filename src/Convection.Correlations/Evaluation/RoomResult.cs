using System;
using System.Collections.Generic;
using System.Text;
using Convection.Correlations.Jets;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;
using UnitsNet;

namespace Convection.Correlations.Evaluation;

/// <summary>What convection does at every surface of a room at one step.</summary>
public sealed class RoomResult
{
    private readonly ConvectionResult[] surfaces;
    private readonly RoomClosure[] closures;
    private readonly JetFinding[] jets;

    internal RoomResult(RoomContext room, ConvectionResult[] surfaces, RoomClosure[] closures, JetFinding[] jets)
    {
        Room = room;
        this.surfaces = surfaces;
        this.closures = closures;
        this.jets = jets;
    }

    /// <summary>The room.</summary>
    public RoomContext Room { get; }

    /// <summary>One result for each surface, in the order of the room.</summary>
    public IReadOnlyList<ConvectionResult> Surfaces => surfaces;

    /// <summary>The energy closure of each running supply device whose forms refer to supply air.</summary>
    public IReadOnlyList<RoomClosure> Closures => closures;

    /// <summary>What is known of the jets of running devices whose terminal data are given.</summary>
    public IReadOnlyList<JetFinding> Jets => jets;

    /// <summary>Heat from all surfaces into the air [W], flux times area; NaN where a surface has no flux.</summary>
    public double HeatToAirWatts
    {
        get
        {
            double watts = 0;
            for (int i = 0; i < surfaces.Length; i++)
            {
                watts += surfaces[i].FluxWattsPerSquareMetre * Room.Surfaces[i].AreaSquareMetres;
            }

            return watts;
        }
    }

    /// <summary>Heat from all surfaces into the air; null where a surface has no flux.</summary>
    public Power? HeatToAir => double.IsNaN(HeatToAirWatts) ? null : Power.FromWatts(HeatToAirWatts);

    /// <summary>The result of a surface.</summary>
    /// <param name="surface">Name of the surface.</param>
    /// <exception cref="ArgumentException">The room has no such surface.</exception>
    public ConvectionResult this[string surface]
    {
        get
        {
            int index = Room.IndexOfSurface(Require.NotNull(surface, nameof(surface)));
            return index >= 0
                ? surfaces[index]
                : throw new ArgumentException("Room '" + Room.Name + "' has no surface '" + surface + "'. Its surfaces: " + Room.SurfaceNames + ".", nameof(surface));
        }
    }

    /// <summary>A table of the surfaces: flux, coefficient with its reference, regime, and what should be known.</summary>
    /// <returns>Several lines, the same in every culture.</returns>
    public string ToText()
    {
        int width = "surface".Length;
        foreach (Surfaces.SurfaceContext surface in Room.Surfaces)
        {
            width = Math.Max(width, surface.Name.Length);
        }

        var text = new StringBuilder();
        text.Append("surface".PadRight(width)).Append("   q W/m²   h W/(m²·K) against       regime                   remarks\n");
        for (int i = 0; i < surfaces.Length; i++)
        {
            ConvectionResult result = surfaces[i];
            text.Append(Room.Surfaces[i].Name.PadRight(width));
            if (!result.IsValid)
            {
                text.Append("   ").Append(ResultText.Of(result.Status)).Append('\n');
                continue;
            }

            string remarks = ResultText.Of(result.Flags);
            text.Append(InvariantText.Fixed(result.FluxWattsPerSquareMetre, 2).PadLeft(9))
                .Append(InvariantText.Fixed(result.CoefficientWattsPerSquareMetreKelvin, 2).PadLeft(12))
                .Append("  ").Append(EvidenceText.Of(result.Reference).PadRight(14))
                .Append(remarks.Length == 0 ? ResultText.Of(result.Regime) : ResultText.Of(result.Regime).PadRight(25) + remarks)
                .Append('\n');
        }

        foreach (RoomClosure closure in closures)
        {
            text.Append(closure).Append('\n');
        }

        foreach (JetFinding jet in jets)
        {
            text.Append(jet).Append('\n');
        }

        return text.ToString();
    }
}
