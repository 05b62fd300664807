namespace Convection.Correlations.Registry;

/// <summary>Where a correlation was published.</summary>
public sealed record Publication
{
    /// <summary>Citation key, the first part of its correlations' ids, such as <c>churchill-chu-1975</c>.</summary>
    public required string Key { get; init; }

    /// <summary>Authors, or the body that issued a standard.</summary>
    public required string Authors { get; init; }

    /// <summary>Year.</summary>
    public required int Year { get; init; }

    /// <summary>Title.</summary>
    public required string Title { get; init; }

    /// <summary>Journal with volume and pages, university, or publisher.</summary>
    public required string Source { get; init; }

    /// <summary>Digital object identifier; empty where there is none or it is not known.</summary>
    public string Doi { get; init; } = string.Empty;

    /// <summary>Short form for running text, such as "Churchill &amp; Chu (1975)".</summary>
    public required string ShortName { get; init; }

    /// <summary>Full citation in one line.</summary>
    public string Citation
        => Authors + ", " + Title + ", " + Source + ", " + InvariantText.Number(Year) + (Doi.Length == 0 ? string.Empty : ", doi:" + Doi);
}
