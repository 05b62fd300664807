namespace Convection.Correlations.Flows;

/// <summary>A radial diffuser in the ceiling: the jet runs along the ceiling and comes down the walls.</summary>
/// <remarks>Not for swirl or perforated diffusers, whose jets behave differently.</remarks>
public sealed record RadialCeilingDiffuser : SupplyInlet
{
    /// <summary>Describes a radial ceiling diffuser.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <exception cref="System.ArgumentException">The name is empty.</exception>
    public RadialCeilingDiffuser(string name)
        : base(name)
    {
    }

    /// <inheritdoc/>
    public override FlowDriver Driver => FlowDriver.RadialCeilingDiffuser;

    /// <inheritdoc/>
    public override string Description => "radial ceiling diffuser";

    private protected override StreamDirection HabitOnWalls => StreamDirection.Down;
}
