using Convection.Correlations.Registry;

namespace Convection.Correlations.Jets;

/// <summary>A published rule of jets with its source and how far its text was checked.</summary>
public sealed class JetRule
{
    internal JetRule(string name, string formula, string source, TextCheck textCheck, string doubt)
    {
        Name = name;
        Formula = formula;
        Source = source;
        TextCheck = textCheck;
        Doubt = doubt;
    }

    /// <summary>What it gives.</summary>
    public string Name { get; }

    /// <summary>The rule as a formula.</summary>
    public string Formula { get; }

    /// <summary>Where it was published.</summary>
    public string Source { get; }

    /// <summary>How its text was checked.</summary>
    public TextCheck TextCheck { get; }

    /// <summary>What is doubtful.</summary>
    public string Doubt { get; }
}
