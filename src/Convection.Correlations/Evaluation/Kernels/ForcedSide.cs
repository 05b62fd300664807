using Convection.Correlations.Registry;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>A forced law for one side.</summary>
internal sealed class ForcedSide(LawShape law, ReferenceTemperature reference, bool containsBuoyancy, bool fades)
{
    public LawShape Law { get; } = law;

    public ReferenceTemperature Reference { get; } = reference;

    public bool ContainsBuoyancy { get; } = containsBuoyancy;

    /// <summary>True where the law has a lowest value above zero, over which buoyancy gives way to a law that contains it.</summary>
    public bool Fades { get; } = fades;
}
