namespace Convection.Correlations.Flows;

/// <summary>Says that nothing but the surfaces themselves moves the air. A room without devices means the same.</summary>
public sealed record StillAir : FlowDescriptor
{
    /// <summary>States still air.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <exception cref="System.ArgumentException">The name is empty.</exception>
    public StillAir(string name = "still air")
        : base(name)
    {
    }

    /// <inheritdoc/>
    public override FlowDriver Driver => FlowDriver.StillAir;

    /// <inheritdoc/>
    public override StateNeed Needs => StateNeed.None;

    /// <inheritdoc/>
    public override string Description => "still air";
}
