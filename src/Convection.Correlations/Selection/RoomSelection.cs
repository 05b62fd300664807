using System.Collections.Generic;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Selection;

/// <summary>The correlations chosen for a room, with the reasons, the alternatives and the gaps.</summary>
/// <remarks>Immutable and safe to share between threads.</remarks>
public sealed class RoomSelection
{
    private readonly SurfaceSelection[] surfaces;

    internal RoomSelection(RoomContext room, CorrelationRegistry registry, ConvectionPolicy policy, SurfaceSelection[] surfaces)
    {
        Room = room;
        DataVersion = registry.DataVersion;
        Policy = policy;
        this.surfaces = surfaces;
    }

    /// <summary>The room.</summary>
    public RoomContext Room { get; }

    /// <summary>The policy that was followed.</summary>
    public ConvectionPolicy Policy { get; }

    /// <summary>Version of the registry's data.</summary>
    public string DataVersion { get; }

    /// <summary>The surfaces, in the order of the room.</summary>
    public IReadOnlyList<SurfaceSelection> Surfaces => surfaces;

    /// <summary>True where dimensional formulas are scaled because the room's air is not dry air of 22 °C at sea level.</summary>
    public bool IsScaledToAir => Policy.ScaleToAir && !Room.Air.Equals(Air.AirState.OfLaboratories);

    /// <summary>Chooses for every surface of a room.</summary>
    /// <param name="room">The room.</param>
    /// <param name="registry">Where to choose from; the published set where left out.</param>
    /// <param name="policy">What the user wants of the choice; the defaults where left out.</param>
    /// <returns>The choice.</returns>
    /// <exception cref="System.ArgumentNullException">The room is null.</exception>
    /// <exception cref="System.ArgumentException">
    /// The policy names a correlation that the registry does not hold or a surface that the room does not have, pins a total
    /// coefficient, or pins a correlation whose driving variable no device gives.
    /// </exception>
    public static RoomSelection Choose(RoomContext room, CorrelationRegistry? registry = null, ConvectionPolicy? policy = null)
    {
        Require.NotNull(room, nameof(room));
        registry ??= Literature.PublishedLiterature.Registry;
        policy ??= ConvectionPolicy.Default;
        PolicyCheck.Against(policy, room, registry);
        Air.AirProperties properties = room.Air.Properties;
        Air.AirProperties? laboratory = policy.ScaleToAir ? Air.AirState.OfLaboratories.Properties : null;
        var chosen = new SurfaceSelection[room.Surfaces.Count];
        for (int i = 0; i < chosen.Length; i++)
        {
            SurfaceContext surface = room.Surfaces[i];
            LawBinding Bind(bool isWarmer) => new(surface, properties, room.VolumeCubicMetres, laboratory, isWarmer);
            chosen[i] = new SurfaceSelector(room, surface, registry, policy, Bind(isWarmer: true), Bind(isWarmer: false)).Select();
        }

        return new RoomSelection(room, registry, policy, chosen);
    }

    /// <summary>The choice as a text that an engineer can put in a report.</summary>
    /// <returns>Several lines, the same in every culture.</returns>
    public string ToText() => SelectionText.Write(this);
}
