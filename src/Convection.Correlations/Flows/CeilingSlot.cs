namespace Convection.Correlations.Flows;

/// <summary>A ceiling slot along a façade, blowing towards or down the glazing.</summary>
/// <remarks>Correlations for it use the supply flow per length of that façade.</remarks>
public sealed record CeilingSlot : SupplyInlet
{
    /// <summary>Describes a perimeter ceiling slot.</summary>
    /// <param name="name">Name, unique in its room.</param>
    /// <exception cref="System.ArgumentException">The name is empty.</exception>
    public CeilingSlot(string name)
        : base(name)
    {
    }

    /// <summary>Length of the exterior wall that the slot serves [m], where known.</summary>
    /// <value>Null when not known.</value>
    /// <exception cref="System.ArgumentOutOfRangeException">The length is not positive, above 1000 m or not a number.</exception>
    public double? FacadeMetres
    {
        get;
        init => field = value is null
            ? null
            : Require.Positive(value.Value, 1000, "Façade length of device '" + Name + "'", "m", nameof(FacadeMetres));
    }

    /// <summary>Share of glazing in that wall [-], 0 to 1, where known.</summary>
    /// <value>Null when not known.</value>
    /// <exception cref="System.ArgumentOutOfRangeException">The share is outside 0 to 1 or not a number.</exception>
    public double? GlazedShare
    {
        get;
        init => field = value is null
            ? null
            : Require.Within(value.Value, 0, 1, "Glazed share of device '" + Name + "'", string.Empty, nameof(GlazedShare));
    }

    /// <summary>Where the window sits in that wall.</summary>
    public WindowHeight WindowHeight { get; init; }

    /// <inheritdoc/>
    public override FlowDriver Driver => FlowDriver.CeilingSlot;

    /// <inheritdoc/>
    public override string Description => "perimeter ceiling slot";

    private protected override StreamDirection HabitOnWalls => StreamDirection.Down;
}
