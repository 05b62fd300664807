using System;

namespace Convection.Correlations.Registry;

/// <summary>A correlation whose parts do not fit together was offered to a registry.</summary>
public sealed class CorrelationContractException : ArgumentException
{
    internal CorrelationContractException(CorrelationId id, string problem)
        : base("Correlation '" + id + "' breaks its contract: " + problem)
        => Id = id;

    /// <summary>The correlation.</summary>
    public CorrelationId Id { get; }
}
