namespace Convection.Correlations.Flows;

/// <summary>Where one surface stands to one device.</summary>
public sealed record SurfacePlacement
{
    /// <summary>States where a surface stands.</summary>
    /// <param name="surface">Name of the surface in the same room.</param>
    /// <param name="placement">Where it stands.</param>
    /// <param name="stream">How the device's air runs along it; unspecified leaves it to the device.</param>
    /// <exception cref="System.ArgumentException">The name is empty.</exception>
    /// <exception cref="System.ArgumentOutOfRangeException">The placement is not given.</exception>
    public SurfacePlacement(string surface, Placement placement, StreamDirection stream = StreamDirection.Unspecified)
    {
        Surface = Require.Name(surface, nameof(surface));
        Placement = Require.Defined(placement, Placement.Unspecified, "Placement of surface '" + surface + "'", nameof(placement));
        Stream = stream == StreamDirection.Unspecified
            ? stream
            : Require.Defined(stream, StreamDirection.Unspecified, "Stream direction along surface '" + surface + "'", nameof(stream));
    }

    /// <summary>Name of the surface.</summary>
    public string Surface { get; }

    /// <summary>Where it stands to the device.</summary>
    public Placement Placement { get; }

    /// <summary>How the device's air runs along it.</summary>
    public StreamDirection Stream { get; }
}
