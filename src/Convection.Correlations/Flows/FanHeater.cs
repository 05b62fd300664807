namespace Convection.Correlations.Flows;

/// <summary>A fan heater standing in the room.</summary>
/// <remarks>Say which wall stands <see cref="Placement.Opposite"/> it.</remarks>
public sealed record FanHeater : FlowDescriptor
{
    /// <summary>Describes a fan heater.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <exception cref="System.ArgumentException">The name is empty.</exception>
    public FanHeater(string name)
        : base(name)
    {
    }

    /// <inheritdoc/>
    public override FlowDriver Driver => FlowDriver.FanHeater;

    /// <inheritdoc/>
    public override StateNeed Needs => StateNeed.OutputFraction;

    /// <inheritdoc/>
    public override string Description => "fan heater";
}
