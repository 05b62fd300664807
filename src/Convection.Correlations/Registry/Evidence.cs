namespace Convection.Correlations.Registry;

/// <summary>What was measured, where, and how far it can be trusted.</summary>
public sealed record Evidence
{
    /// <summary>States the evidence.</summary>
    /// <param name="kind">What the correlation rests on.</param>
    /// <param name="setting">What was measured, where and over what, in words.</param>
    /// <param name="uncertainty">Published uncertainty in words, or "not stated".</param>
    /// <exception cref="System.ArgumentOutOfRangeException">The kind is not given.</exception>
    /// <exception cref="System.ArgumentException">A text is empty.</exception>
    public Evidence(EvidenceKind kind, string setting, string uncertainty = "not stated")
    {
        Kind = Require.Defined(kind, EvidenceKind.Unspecified, "Kind of evidence", nameof(kind));
        Setting = Require.Name(setting, nameof(setting));
        Uncertainty = Require.Name(uncertainty, nameof(uncertainty));
    }

    /// <summary>What the correlation rests on.</summary>
    public EvidenceKind Kind { get; }

    /// <summary>What was measured, where and over what.</summary>
    public string Setting { get; }

    /// <summary>Published uncertainty, or "not stated".</summary>
    public string Uncertainty { get; }
}
