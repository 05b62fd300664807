namespace Convection.Correlations.Flows;

/// <summary>Air through an open window, or through the room from one side to the other.</summary>
/// <remarks>No usable published correlation is known; ceiling-diffuser forms do not apply, because cool inflow drops to the floor.</remarks>
public sealed record WindowVentilation : SupplyInlet
{
    /// <summary>Describes window or cross ventilation.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <exception cref="System.ArgumentException">The name is empty.</exception>
    public WindowVentilation(string name)
        : base(name)
    {
    }

    /// <summary>True when the air crosses the room from one opening to another.</summary>
    public bool CrossesRoom { get; init; }

    /// <inheritdoc/>
    public override FlowDriver Driver => FlowDriver.WindowVentilation;

    /// <inheritdoc/>
    public override string Description => "window ventilation";
}
