using Convection.Correlations.Registry;

namespace Convection.Correlations.Selection;

/// <summary>A correlation that was not chosen, with the reason.</summary>
public sealed class Alternative
{
    internal Alternative(Correlation correlation, string reason)
    {
        Correlation = correlation;
        Reason = reason;
    }

    /// <summary>The correlation.</summary>
    public Correlation Correlation { get; }

    /// <summary>Why it stands behind the chosen one.</summary>
    public string Reason { get; }
}
