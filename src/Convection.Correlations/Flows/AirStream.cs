namespace Convection.Correlations.Flows;

/// <summary>A stream of known speed along some surfaces: a circulating fan, or a measured near-surface speed.</summary>
/// <remarks>
/// Name each surface it sweeps with <see cref="Placement.InStream"/>; the others do not feel it. No published law leads from
/// a fan's setting to a coefficient: the speed along the surface has to be known or estimated.
/// </remarks>
public sealed record AirStream : FlowDescriptor
{
    /// <summary>Describes a stream along surfaces.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <exception cref="System.ArgumentException">The name is empty.</exception>
    public AirStream(string name)
        : base(name)
    {
    }

    /// <summary>
    /// True (the default) for the disturbed air of a fan or jet, whose boundary layer is turbulent from the edge; false for
    /// an undisturbed stream, laminar at first.
    /// </summary>
    public bool IsTurbulent { get; init; } = true;

    /// <inheritdoc/>
    public override FlowDriver Driver => FlowDriver.AirStream;

    /// <inheritdoc/>
    public override StateNeed Needs => StateNeed.Speed;

    /// <inheritdoc/>
    public override string Description => IsTurbulent ? "turbulent air stream" : "undisturbed air stream";
}
