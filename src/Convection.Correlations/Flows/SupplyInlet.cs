using UnitsNet;

namespace Convection.Correlations.Flows;

/// <summary>A device that brings supply air into the room: a flow rate and a supply temperature come with each step.</summary>
public abstract record SupplyInlet : FlowDescriptor
{
    private protected SupplyInlet(string name)
        : base(name)
    {
    }

    /// <summary>Effective area of the opening [m²], where known; correlations in jet momentum need it.</summary>
    /// <value>Null when not known.</value>
    /// <exception cref="System.ArgumentOutOfRangeException">The area is not positive, above 100 m² or not a number.</exception>
    public double? OpeningSquareMetres
    {
        get;
        init => field = value is null
            ? null
            : Require.Positive(value.Value, 100, "Opening of device '" + Name + "'", "m²", nameof(OpeningSquareMetres));
    }

    /// <summary>Effective area of the opening, where known.</summary>
    public Area? Opening => OpeningSquareMetres is { } squareMetres ? Area.FromSquareMeters(squareMetres) : null;

    /// <summary>Data of the terminal and its design state, where known; they tell whether a cool jet stays at the ceiling.</summary>
    /// <value>Null when not known.</value>
    public TerminalData? Terminal { get; init; }

    /// <inheritdoc/>
    public override StateNeed Needs => StateNeed.Flow | StateNeed.SupplyTemperature;
}
