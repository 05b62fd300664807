using Convection.Correlations.Registry;

namespace Convection.Correlations.Selection;

/// <summary>A correlation fixed by hand for one surface.</summary>
/// <remarks>
/// It serves the parts of that surface that it fits: still air on the warm side, on the cool side, or a device. Where it fits
/// none, it serves the nearest ones, and the explanation and every result say that it was made for something else.
/// </remarks>
public sealed record SurfacePin
{
    /// <summary>Pins a correlation to a surface.</summary>
    /// <param name="surface">Name of the surface.</param>
    /// <param name="correlation">Id of the correlation.</param>
    /// <exception cref="System.ArgumentException">The name or the id is empty.</exception>
    public SurfacePin(string surface, CorrelationId correlation)
    {
        Surface = Require.Name(surface, nameof(surface));
        Correlation = correlation.IsNone
            ? throw new System.ArgumentException("The pin of surface '" + surface + "' names no correlation.", nameof(correlation))
            : correlation;
    }

    /// <summary>Name of the surface.</summary>
    public string Surface { get; }

    /// <summary>Id of the correlation.</summary>
    public CorrelationId Correlation { get; }
}
