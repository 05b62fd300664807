namespace Convection.Correlations.Registry;

/// <summary>How the text of a correlation was checked; the weakest part that matters decides.</summary>
public enum TextCheck
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>The numbers are one's own: measured or fitted by whoever registered them.</summary>
    FirstHand = 1,

    /// <summary>Compared with a publication that prints it.</summary>
    Quoted = 2,

    /// <summary>Not compared with print, but confirmed by an independent calculation.</summary>
    Reconstructed = 3,

    /// <summary>From memory, not yet compared with print; high confidence.</summary>
    RecalledHigh = 4,

    /// <summary>From memory, not yet compared with print; medium confidence.</summary>
    RecalledMedium = 5,

    /// <summary>From memory, not yet compared with print; low confidence.</summary>
    RecalledLow = 6,
}
