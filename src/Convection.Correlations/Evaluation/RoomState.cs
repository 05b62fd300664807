using System;
using System.Collections.Generic;
using UnitsNet;

namespace Convection.Correlations.Evaluation;

/// <summary>Temperatures and device states of a room at one step.</summary>
/// <remarks>
/// Immutable: each <c>With</c> gives another state. Names are checked when a room evaluates it. A device that is not mentioned is
/// off; a surface without a temperature gets a result that says so.
/// </remarks>
public sealed class RoomState
{
    private readonly Dictionary<string, double> surfaces;
    private readonly Dictionary<string, DeviceState> devices;

    private RoomState(double roomCelsius, Dictionary<string, double> surfaces, Dictionary<string, DeviceState> devices)
    {
        RoomCelsius = roomCelsius;
        this.surfaces = surfaces;
        this.devices = devices;
    }

    /// <summary>Temperature of the room air [°C].</summary>
    public double RoomCelsius { get; }

    internal IEnumerable<KeyValuePair<string, double>> Surfaces => surfaces;

    internal IEnumerable<KeyValuePair<string, DeviceState>> Devices => devices;

    /// <summary>A state with nothing but the temperature of the room air.</summary>
    /// <param name="roomAir">Temperature of the room air.</param>
    /// <returns>The state.</returns>
    public static RoomState At(Temperature roomAir) => new(roomAir.DegreesCelsius, new(StringComparer.Ordinal), new(StringComparer.Ordinal));

    /// <summary>The same state with a surface's temperature.</summary>
    /// <param name="name">Name of the surface.</param>
    /// <param name="temperature">Its temperature.</param>
    /// <returns>Another state.</returns>
    /// <exception cref="ArgumentException">The name is empty.</exception>
    public RoomState WithSurface(string name, Temperature temperature)
        => new(RoomCelsius, With(surfaces, name, temperature.DegreesCelsius), devices);

    /// <summary>The same state with a device's state.</summary>
    /// <param name="name">Name of the device.</param>
    /// <param name="state">What it does.</param>
    /// <returns>Another state.</returns>
    /// <exception cref="ArgumentException">The name is empty.</exception>
    public RoomState WithDevice(string name, DeviceState state) => new(RoomCelsius, surfaces, With(devices, name, state));

    private static Dictionary<string, T> With<T>(Dictionary<string, T> known, string name, T value)
        => new(known, StringComparer.Ordinal) { [Require.Name(name, nameof(name))] = value };
}
