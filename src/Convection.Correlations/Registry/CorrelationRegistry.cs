using System;
using System.Collections.Generic;
using System.Diagnostics.CodeAnalysis;

namespace Convection.Correlations.Registry;

/// <summary>An immutable set of correlations, each with an id of its own, in the order of the ids.</summary>
/// <remarks>
/// To change a registry is to make another: <see cref="With"/> and <see cref="Without"/>. Safe to share between threads.
/// The published set is <c>PublishedLiterature.Registry</c>.
/// </remarks>
public sealed class CorrelationRegistry
{
    private readonly Correlation[] sorted;

    internal CorrelationRegistry(IEnumerable<Correlation> correlations, string dataVersion)
    {
        sorted = [.. correlations];
        foreach (Correlation correlation in sorted)
        {
            CorrelationContract.Check(Require.NotNull(correlation, nameof(correlations)));
        }

        Array.Sort(sorted, (a, b) => a.Id.CompareTo(b.Id));
        for (int i = 1; i < sorted.Length; i++)
        {
            if (sorted[i].Id == sorted[i - 1].Id)
            {
                throw new CorrelationContractException(sorted[i].Id, "its id is taken. Take the other one out first, or give it another id.");
            }
        }

        DataVersion = dataVersion;
    }

    /// <summary>A registry without correlations.</summary>
    public static CorrelationRegistry Empty { get; } = new([], "empty");

    /// <summary>All correlations, in the order of their ids.</summary>
    public IReadOnlyList<Correlation> All => sorted;

    /// <summary>Number of correlations.</summary>
    public int Count => sorted.Length;

    /// <summary>Version of the data; results that are kept should carry it. A changed registry ends in "+changed".</summary>
    public string DataVersion { get; }

    /// <summary>The correlation of an id.</summary>
    /// <param name="id">The id.</param>
    /// <exception cref="KeyNotFoundException">The registry does not hold it.</exception>
    public Correlation this[CorrelationId id] => GetOrNull(id)
        ?? throw new KeyNotFoundException("No correlation '" + id + "' in this registry of " + Count + ". " + Suggestion(id));

    /// <summary>The correlation of an id.</summary>
    /// <param name="id">The id as text.</param>
    /// <exception cref="FormatException">The text is not an id.</exception>
    /// <exception cref="KeyNotFoundException">The registry does not hold it.</exception>
    public Correlation this[string id] => this[CorrelationId.Parse(id)];

    /// <summary>The correlation of an id, or null.</summary>
    /// <param name="id">The id.</param>
    /// <returns>Null where the registry does not hold it.</returns>
    public Correlation? GetOrNull(CorrelationId id)
    {
        int low = 0, high = sorted.Length - 1;
        while (low <= high)
        {
            int middle = (low + high) / 2;
            int order = sorted[middle].Id.CompareTo(id);
            if (order == 0)
            {
                return sorted[middle];
            }

            if (order < 0)
            {
                low = middle + 1;
            }
            else
            {
                high = middle - 1;
            }
        }

        return null;
    }

    /// <summary>The correlation of an id, where the registry holds it.</summary>
    /// <param name="id">The id.</param>
    /// <param name="correlation">The correlation, or null.</param>
    /// <returns>True where the registry holds it.</returns>
    public bool TryGet(CorrelationId id, [NotNullWhen(true)] out Correlation? correlation)
    {
        correlation = GetOrNull(id);
        return correlation is not null;
    }

    /// <summary>The correlations that match, in the order of their ids.</summary>
    /// <param name="query">What to look for.</param>
    /// <returns>None, one or more.</returns>
    /// <exception cref="ArgumentNullException">The query is null.</exception>
    public IReadOnlyList<Correlation> Query(CorrelationQuery query)
    {
        Require.NotNull(query, nameof(query));
        return Array.FindAll(sorted, query.Matches);
    }

    /// <summary>A registry that holds more.</summary>
    /// <param name="correlations">Correlations with ids that this registry does not hold.</param>
    /// <returns>Another registry.</returns>
    /// <exception cref="ArgumentNullException">The list or a member is null.</exception>
    /// <exception cref="CorrelationContractException">A correlation's parts do not fit together, or its id is taken.</exception>
    public CorrelationRegistry With(params Correlation[] correlations)
        => new([.. sorted, .. Require.NotNull(correlations, nameof(correlations))], Changed);

    /// <summary>A registry that holds less.</summary>
    /// <param name="ids">Ids that this registry holds.</param>
    /// <returns>Another registry.</returns>
    /// <exception cref="ArgumentNullException">The list is null.</exception>
    /// <exception cref="KeyNotFoundException">The registry does not hold one of them.</exception>
    public CorrelationRegistry Without(params CorrelationId[] ids)
    {
        Correlation[] removed = Array.ConvertAll(Require.NotNull(ids, nameof(ids)), id => this[id]);
        return new CorrelationRegistry(Array.FindAll(sorted, c => Array.IndexOf(removed, c) < 0), Changed);
    }

    private string Changed => DataVersion.EndsWith("+changed", StringComparison.Ordinal) ? DataVersion : DataVersion + "+changed";

    private string Suggestion(CorrelationId id)
    {
        string[] sisters = Array.ConvertAll(Array.FindAll(sorted, c => c.Publication.Key == id.PublicationKey), c => c.Id.ToString());
        return sisters.Length == 0
            ? "Nothing of that publication is in it."
            : "Of that publication it holds: " + string.Join(", ", sisters) + ".";
    }
}
