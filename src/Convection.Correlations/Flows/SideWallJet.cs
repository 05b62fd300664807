namespace Convection.Correlations.Flows;

/// <summary>A free horizontal jet from an opening in a side wall.</summary>
/// <remarks>A jet that clings to the ceiling is another flow: published free-jet forms do not describe it.</remarks>
public sealed record SideWallJet : SupplyInlet
{
    /// <summary>Describes a free jet from a side wall.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <exception cref="System.ArgumentException">The name is empty.</exception>
    public SideWallJet(string name)
        : base(name)
    {
    }

    /// <inheritdoc/>
    public override FlowDriver Driver => FlowDriver.SideWallJet;

    /// <inheritdoc/>
    public override string Description => "free jet from a side wall";
}
