using Convection.Correlations.Flows;
using UnitsNet;

namespace Convection.Correlations.Evaluation;

/// <summary>What a device does at one step. The default value is a device that is off.</summary>
/// <remarks>
/// Values are not checked here, because a state is data of a running simulation: an impossible one marks the results of the
/// surfaces that need it.
/// </remarks>
public readonly record struct DeviceState
{
    private readonly double flow, temperature, speed, output;

    private DeviceState(StateNeed gives, double flow = 0, double temperature = double.NaN, double speed = 0, double output = 0)
    {
        Gives = gives;
        this.flow = flow;
        this.temperature = temperature;
        this.speed = speed;
        this.output = output;
    }

    /// <summary>A device that is off.</summary>
    public static DeviceState Off => default;

    /// <summary>What this state holds; nothing when off.</summary>
    public StateNeed Gives { get; }

    /// <summary>Volume flow of supply air [m³/s], 0 or more.</summary>
    public double FlowCubicMetresPerSecond => flow;

    /// <summary>Temperature of the supply air or the stream [°C]; NaN where not given.</summary>
    public double AirCelsius => Gives == StateNeed.None ? double.NaN : temperature;

    /// <summary>Speed of the stream along the surfaces [m/s], 0 or more.</summary>
    public double SpeedMetresPerSecond => speed;

    /// <summary>Output of a heater as a fraction of its full output [-], 0 to 1.</summary>
    public double OutputFraction => output;

    internal bool IsRunning => !(flow <= 0 && speed <= 0 && output <= 0);

    /// <summary>Supply air that flows.</summary>
    /// <param name="cubicMetresPerSecond">Volume flow [m³/s], 0 to 1 000 000, recirculated air included.</param>
    /// <param name="celsius">Supply temperature [°C]; NaN where not known, which only a flow of zero allows.</param>
    /// <returns>The state.</returns>
    public static DeviceState Supply(double cubicMetresPerSecond, double celsius)
        => new(StateNeed.Flow | StateNeed.SupplyTemperature, flow: cubicMetresPerSecond, temperature: celsius);

    /// <summary>Supply air that flows.</summary>
    /// <param name="flow">Volume flow, 0 to 1 000 000 m³/s, recirculated air included.</param>
    /// <param name="temperature">Supply temperature.</param>
    /// <returns>The state.</returns>
    public static DeviceState Supply(VolumeFlow flow, Temperature temperature) => Supply(flow.CubicMetersPerSecond, temperature.DegreesCelsius);

    /// <summary>A stream along surfaces, as warm as the room air.</summary>
    /// <param name="metresPerSecond">Speed [m/s], 0 to 1000.</param>
    /// <returns>The state.</returns>
    public static DeviceState Stream(double metresPerSecond) => Stream(metresPerSecond, double.NaN);

    /// <summary>A stream along surfaces.</summary>
    /// <param name="metresPerSecond">Speed [m/s], 0 to 1000.</param>
    /// <param name="celsius">Temperature of the stream [°C]; NaN where it has that of the room air.</param>
    /// <returns>The state.</returns>
    public static DeviceState Stream(double metresPerSecond, double celsius) => new(StateNeed.Speed, speed: metresPerSecond, temperature: celsius);

    /// <summary>A stream along surfaces, as warm as the room air.</summary>
    /// <param name="speed">Speed, 0 to 1000 m/s.</param>
    /// <returns>The state.</returns>
    public static DeviceState Stream(Speed speed) => Stream(speed.MetersPerSecond);

    /// <summary>A stream along surfaces.</summary>
    /// <param name="speed">Speed, 0 to 1000 m/s.</param>
    /// <param name="temperature">Temperature of the stream.</param>
    /// <returns>The state.</returns>
    public static DeviceState Stream(Speed speed, Temperature temperature) => Stream(speed.MetersPerSecond, temperature.DegreesCelsius);

    /// <summary>A heater that gives heat.</summary>
    /// <param name="outputFraction">Output as a fraction of full output [-], 0 to 1.</param>
    /// <returns>The state.</returns>
    public static DeviceState Heating(double outputFraction) => new(StateNeed.OutputFraction, output: outputFraction);

    /// <summary>A heater that gives heat.</summary>
    /// <param name="output">Output as a share of full output, 0 to 100 %.</param>
    /// <returns>The state.</returns>
    public static DeviceState Heating(Ratio output) => Heating(output.DecimalFractions);
}
