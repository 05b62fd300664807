using Convection.Correlations.Flows;

namespace Convection.Correlations.Registry;

/// <summary>What to look for in a registry; a member left out matches everything.</summary>
public sealed record CorrelationQuery
{
    /// <summary>Surfaces of which the correlation must cover at least one.</summary>
    public SurfaceSet? Surfaces { get; init; }

    /// <summary>What drives the flow.</summary>
    public FlowDriver? Driver { get; init; }

    /// <summary>What the coefficient contains.</summary>
    public CorrelationFamily? Family { get; init; }

    /// <summary>Temperature that the difference is taken against.</summary>
    public ReferenceTemperature? Reference { get; init; }

    /// <summary>Key of the publication.</summary>
    public string? PublicationKey { get; init; }

    /// <summary>Weakest check of the text that is still wanted.</summary>
    public TextCheck? WeakestTextCheck { get; init; }

    internal bool Matches(Correlation c)
        => (Surfaces is null || (c.Applies.Surfaces & Surfaces.Value) != 0)
            && (Driver is null || c.Applies.Driver == Driver)
            && (Family is null || c.Family == Family)
            && (Reference is null || c.Reference == Reference)
            && (PublicationKey is null || c.Publication.Key == PublicationKey)
            && (WeakestTextCheck is null || c.TextCheck <= WeakestTextCheck);
}
