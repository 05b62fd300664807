using System;
using System.Collections.Generic;
using Convection.Correlations.Air;
using Convection.Correlations.Flows;
using Convection.Correlations.Surfaces;
using UnitsNet;

namespace Convection.Correlations.Rooms;

/// <summary>A room: its surfaces, its devices, its volume, and the air for which laws are bound.</summary>
/// <remarks>Static and immutable; temperatures, flows and outputs come with each step. Safe to share between threads.</remarks>
public sealed class RoomContext
{
    private readonly SurfaceContext[] surfaces;
    private readonly FlowDescriptor[] devices;

    /// <summary>Describes a room.</summary>
    /// <param name="name">Name for texts.</param>
    /// <param name="volumeCubicMetres">Air volume [m³], in (0, 1 000 000].</param>
    /// <param name="surfaces">Surfaces, at least one, each with a name of its own.</param>
    /// <param name="devices">Devices that move the air, each with a name of its own; empty means still air.</param>
    /// <param name="air">
    /// Air for which laws are bound: dimensionless laws take their properties at its temperature, as film temperature. Standard
    /// pressure, dry, 22 °C where left out.
    /// </param>
    /// <exception cref="ArgumentNullException">A list or member is null.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The volume is outside its interval or not a number.</exception>
    /// <exception cref="ArgumentException">
    /// There is no surface, two surfaces or two devices share a name, or a device places a surface that the room does not have.
    /// </exception>
    public RoomContext(
        string name,
        double volumeCubicMetres,
        IEnumerable<SurfaceContext> surfaces,
        IEnumerable<FlowDescriptor>? devices = null,
        AirState? air = null)
    {
        Name = Require.Name(name, nameof(name));
        VolumeCubicMetres = Require.Positive(volumeCubicMetres, 1e6, "Volume of room '" + name + "'", "m³", nameof(volumeCubicMetres));
        this.surfaces = [.. Require.NotNull(surfaces, nameof(surfaces))];
        this.devices = [.. devices ?? []];
        Air = air ?? new AirState(22);
        if (this.surfaces.Length == 0)
        {
            throw new ArgumentException("Room '" + name + "' has no surface; at least one is needed.", nameof(surfaces));
        }

        RefuseSharedNames(Array.ConvertAll(this.surfaces, s => Require.NotNull(s, nameof(surfaces)).Name), "surfaces", nameof(surfaces));
        RefuseSharedNames(Array.ConvertAll(this.devices, d => Require.NotNull(d, nameof(devices)).Name), "devices", nameof(devices));
        foreach (FlowDescriptor device in this.devices)
        {
            foreach (SurfacePlacement placement in device.Placements)
            {
                if (IndexOfSurface(placement.Surface) < 0)
                {
                    throw new ArgumentException(
                        "Device '" + device.Name + "' places the surface '" + placement.Surface + "', which room '" + name
                        + "' does not have. Its surfaces: " + SurfaceNames + ".",
                        nameof(devices));
                }
            }
        }
    }

    /// <summary>Name for texts.</summary>
    public string Name { get; }

    /// <summary>Air volume [m³].</summary>
    public double VolumeCubicMetres { get; }

    /// <summary>Air volume.</summary>
    public Volume Volume => Volume.FromCubicMeters(VolumeCubicMetres);

    /// <summary>Air for which laws are bound.</summary>
    public AirState Air { get; }

    /// <summary>The surfaces, in the order given; results come in this order.</summary>
    public IReadOnlyList<SurfaceContext> Surfaces => surfaces;

    /// <summary>The devices, in the order given; their states come in this order.</summary>
    public IReadOnlyList<FlowDescriptor> Devices => devices;

    internal string SurfaceNames => string.Join(", ", Array.ConvertAll(surfaces, s => "'" + s.Name + "'"));

    internal string DeviceNames => devices.Length == 0 ? "none" : string.Join(", ", Array.ConvertAll(devices, d => "'" + d.Name + "'"));

    /// <summary>A room from quantities.</summary>
    /// <param name="name">Name for texts.</param>
    /// <param name="volume">Air volume, in (0, 1 000 000] m³.</param>
    /// <param name="surfaces">Surfaces, at least one, each with a name of its own.</param>
    /// <param name="devices">Devices that move the air; empty means still air.</param>
    /// <param name="air">Air for which laws are bound; standard pressure, dry, 22 °C where left out.</param>
    /// <returns>The room.</returns>
    /// <exception cref="ArgumentException">As for the constructor.</exception>
    public static RoomContext Create(
        string name,
        Volume volume,
        IEnumerable<SurfaceContext> surfaces,
        IEnumerable<FlowDescriptor>? devices = null,
        AirState? air = null)
        => new(name, volume.CubicMeters, surfaces, devices, air);

    /// <summary>Place of a surface in <see cref="Surfaces"/>.</summary>
    /// <param name="name">Name of the surface.</param>
    /// <returns>The index, or −1 if the room has no such surface.</returns>
    public int IndexOfSurface(string name) => Array.FindIndex(surfaces, s => string.Equals(s.Name, name, StringComparison.Ordinal));

    /// <summary>Place of a device in <see cref="Devices"/>.</summary>
    /// <param name="name">Name of the device.</param>
    /// <returns>The index, or −1 if the room has no such device.</returns>
    public int IndexOfDevice(string name) => Array.FindIndex(devices, d => string.Equals(d.Name, name, StringComparison.Ordinal));

    private void RefuseSharedNames(string[] names, string what, string parameter)
    {
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (string name in names)
        {
            if (!seen.Add(name))
            {
                throw new ArgumentException("Room '" + Name + "' has two " + what + " named '" + name + "'; each needs a name of its own.", parameter);
            }
        }
    }
}
