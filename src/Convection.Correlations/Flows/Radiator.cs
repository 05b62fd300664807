namespace Convection.Correlations.Flows;

/// <summary>A radiator or convector standing in the room; its plume stirs the room while it gives heat.</summary>
/// <remarks>Say which surfaces stand <see cref="Placement.Above"/> and <see cref="Placement.Beside"/> it.</remarks>
public sealed record Radiator : FlowDescriptor
{
    /// <summary>Describes a radiator or convector.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <exception cref="System.ArgumentException">The name is empty.</exception>
    public Radiator(string name)
        : base(name)
    {
    }

    /// <inheritdoc/>
    public override FlowDriver Driver => FlowDriver.Radiator;

    /// <inheritdoc/>
    public override StateNeed Needs => StateNeed.OutputFraction;

    /// <inheritdoc/>
    public override string Description => "radiator or convector";
}
