using System;
using System.Diagnostics.CodeAnalysis;

namespace Convection.Correlations.Registry;

/// <summary>Permanent name of a correlation: <c>authors-year/case</c>, lower case, never reused.</summary>
/// <remarks>The default value names nothing: its text is empty and no registry holds it.</remarks>
public readonly struct CorrelationId : IEquatable<CorrelationId>, IComparable<CorrelationId>
{
    private readonly string? text;

    private CorrelationId(string text) => this.text = text;

    /// <summary>True for the default value, which names nothing.</summary>
    public bool IsNone => text is null;

    /// <summary>The part before the slash: the key of the publication.</summary>
    public string PublicationKey => text is null ? string.Empty : text.Substring(0, text.IndexOf('/'));

    /// <summary>The part after the slash: the case.</summary>
    public string Case => text is null ? string.Empty : text.Substring(text.IndexOf('/') + 1);

    /// <summary>Reads an id.</summary>
    /// <param name="text">Two parts joined by a slash, each of lower-case words and digits joined by hyphens.</param>
    /// <returns>The id.</returns>
    /// <exception cref="ArgumentNullException">The text is null.</exception>
    /// <exception cref="FormatException">The text is not such an id.</exception>
    public static CorrelationId Parse(string text)
        => TryParse(Require.NotNull(text, nameof(text)), out CorrelationId id)
            ? id
            : throw new FormatException(
                "'" + text + "' is not a correlation id. An id looks like 'author-year/case': lower-case letters, digits and hyphens, one slash.");

    /// <summary>Reads an id where possible.</summary>
    /// <param name="text">The text.</param>
    /// <param name="id">The id; the default value if the text is none.</param>
    /// <returns>True where the text is an id.</returns>
    public static bool TryParse([NotNullWhen(true)] string? text, out CorrelationId id)
    {
        id = default;
        if (text is null || !IsWellFormed(text))
        {
            return false;
        }

        id = new CorrelationId(text);
        return true;
    }

    /// <summary>Compares by ordinal text.</summary>
    /// <param name="left">One id.</param>
    /// <param name="right">Another.</param>
    /// <returns>True when equal.</returns>
    public static bool operator ==(CorrelationId left, CorrelationId right) => left.Equals(right);

    /// <summary>Compares by ordinal text.</summary>
    /// <param name="left">One id.</param>
    /// <param name="right">Another.</param>
    /// <returns>True when different.</returns>
    public static bool operator !=(CorrelationId left, CorrelationId right) => !left.Equals(right);

    /// <summary>Orders by ordinal text.</summary>
    /// <param name="left">One id.</param>
    /// <param name="right">Another.</param>
    /// <returns>True when left comes first.</returns>
    public static bool operator <(CorrelationId left, CorrelationId right) => left.CompareTo(right) < 0;

    /// <summary>Orders by ordinal text.</summary>
    /// <param name="left">One id.</param>
    /// <param name="right">Another.</param>
    /// <returns>True when left does not come after right.</returns>
    public static bool operator <=(CorrelationId left, CorrelationId right) => left.CompareTo(right) <= 0;

    /// <summary>Orders by ordinal text.</summary>
    /// <param name="left">One id.</param>
    /// <param name="right">Another.</param>
    /// <returns>True when left comes last.</returns>
    public static bool operator >(CorrelationId left, CorrelationId right) => left.CompareTo(right) > 0;

    /// <summary>Orders by ordinal text.</summary>
    /// <param name="left">One id.</param>
    /// <param name="right">Another.</param>
    /// <returns>True when left does not come before right.</returns>
    public static bool operator >=(CorrelationId left, CorrelationId right) => left.CompareTo(right) >= 0;

    /// <inheritdoc/>
    public bool Equals(CorrelationId other) => string.Equals(text, other.text, StringComparison.Ordinal);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is CorrelationId other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => text is null ? 0 : StringComparer.Ordinal.GetHashCode(text);

    /// <inheritdoc/>
    public int CompareTo(CorrelationId other) => string.CompareOrdinal(text, other.text);

    /// <summary>The id as text.</summary>
    /// <returns>The text; empty for the default value.</returns>
    public override string ToString() => text ?? string.Empty;

    private static bool IsWellFormed(string text)
    {
        int slash = text.IndexOf('/');
        return slash > 0 && slash == text.LastIndexOf('/') && IsWordList(text, 0, slash) && IsWordList(text, slash + 1, text.Length);
    }

    private static bool IsWordList(string text, int start, int end)
    {
        bool insideWord = false;
        for (int i = start; i < end; i++)
        {
            char c = text[i];
            if (c is (>= 'a' and <= 'z') or (>= '0' and <= '9'))
            {
                insideWord = true;
            }
            else if (c == '-' && insideWord)
            {
                insideWord = false;
            }
            else
            {
                return false;
            }
        }

        return insideWord;
    }
}
