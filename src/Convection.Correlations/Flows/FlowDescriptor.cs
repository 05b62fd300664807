using System;
using System.Collections.Generic;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Flows;

/// <summary>A device that moves the air of a room: what it is and where the surfaces stand to it.</summary>
/// <remarks>
/// A descriptor is static. Flow rate, supply temperature, speed and heater output change from step to step and belong to
/// the state, as does switching off: a variable-flow system is one descriptor. Immutable and safe to share between threads.
/// </remarks>
public abstract record FlowDescriptor
{
    private readonly SurfacePlacement[] placements = [];

    private protected FlowDescriptor(string name) => Name = Require.Name(name, nameof(name));

    /// <summary>Name, unique in its room.</summary>
    public string Name { get; }

    /// <summary>Where surfaces stand to the device. A surface that is not named here stands elsewhere.</summary>
    /// <exception cref="ArgumentNullException">The list or a member is null.</exception>
    /// <exception cref="ArgumentException">A surface is named twice.</exception>
    public IReadOnlyList<SurfacePlacement> Placements
    {
        get => placements;
        init
        {
            placements = [.. Require.NotNull(value, nameof(Placements))];
            var seen = new HashSet<string>(StringComparer.Ordinal);
            foreach (SurfacePlacement placement in placements)
            {
                if (!seen.Add(Require.NotNull(placement, nameof(Placements)).Surface))
                {
                    throw new ArgumentException(
                        "Device '" + Name + "' names the surface '" + placement.Surface + "' twice; a surface has one place to a device.",
                        nameof(Placements));
                }
            }
        }
    }

    /// <summary>What the device does to the air.</summary>
    public abstract FlowDriver Driver { get; }

    /// <summary>What the state of this device must hold while it runs.</summary>
    public abstract StateNeed Needs { get; }

    /// <summary>The device in an engineer's words, such as "radial ceiling diffuser".</summary>
    public abstract string Description { get; }

    /// <summary>Where a surface stands to this device.</summary>
    /// <param name="surface">Name of the surface.</param>
    /// <returns>The placement; elsewhere if the device does not name the surface.</returns>
    public Placement PlacementOf(string surface) => Find(surface)?.Placement ?? Placement.Elsewhere;

    /// <summary>How the device's air runs along a surface: as stated, else the habit of the device.</summary>
    /// <param name="surface">The surface.</param>
    /// <returns>Up, down or across.</returns>
    /// <exception cref="ArgumentNullException">The surface is null.</exception>
    public StreamDirection StreamAlong(SurfaceContext surface)
    {
        Require.NotNull(surface, nameof(surface));
        StreamDirection stated = Find(surface.Name)?.Stream ?? StreamDirection.Unspecified;
        bool steep = surface.TiltDegrees is > 45 and < 135;
        return !steep ? StreamDirection.Across
            : stated != StreamDirection.Unspecified ? stated
            : HabitOnWalls;
    }

    /// <summary>Equal when every member is equal, the placements in the same order.</summary>
    /// <param name="other">Another descriptor.</param>
    /// <returns>True when equal.</returns>
    public virtual bool Equals(FlowDescriptor? other)
    {
        if (other is null || EqualityContract != other.EqualityContract || Name != other.Name || placements.Length != other.placements.Length)
        {
            return false;
        }

        for (int i = 0; i < placements.Length; i++)
        {
            if (!placements[i].Equals(other.placements[i]))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>Hash code of name and type.</summary>
    /// <returns>The hash code.</returns>
    public override int GetHashCode() => unchecked((StringComparer.Ordinal.GetHashCode(Name) * 31) + EqualityContract.GetHashCode());

    /// <summary>How the air of such a device usually runs along a wall.</summary>
    private protected virtual StreamDirection HabitOnWalls => StreamDirection.Across;

    private SurfacePlacement? Find(string surface) => Array.Find(placements, p => string.Equals(p.Surface, surface, StringComparison.Ordinal));
}
