namespace Convection.Correlations.Flows;

/// <summary>A displacement inlet: cool air spreads slowly over the floor and rises where heat is.</summary>
/// <remarks>No published correlation for it is in the registry yet; the explanation says so.</remarks>
public sealed record DisplacementInlet : SupplyInlet
{
    /// <summary>Describes a displacement inlet.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <exception cref="System.ArgumentException">The name is empty.</exception>
    public DisplacementInlet(string name)
        : base(name)
    {
    }

    /// <inheritdoc/>
    public override FlowDriver Driver => FlowDriver.DisplacementInlet;

    /// <inheritdoc/>
    public override string Description => "displacement inlet";
}
